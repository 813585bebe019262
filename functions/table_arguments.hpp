// The arguments of a call in which ranges that are property tables have been read.
#pragma once

#include "functions/entry.hpp"
#include "functions/user_table.hpp"

#include <array>
#include <memory>
#include <span>

namespace entropy_ledger::functions {

class TableArguments {
public:
    // Reads each range that stands for a substance or state and looks like a table, once; equal ranges are one table,
    // so that they are one substance. `arguments` has at most most_arguments.
    TableArguments(const Entry& entry, std::span<const Argument> arguments);

    // As given, with the tables as single cells of kind `table`. Holds while this object does.
    std::span<const Argument> arguments() const { return arguments_; }

private:
    std::span<const Argument> arguments_;
    std::array<Argument, most_arguments> replaced_{};
    std::array<std::unique_ptr<UserTable>, most_arguments> tables_;
};

} // namespace entropy_ledger::functions
