// Calls cell functions by the names on screen, for tests.
#pragma once

#include "functions/call.hpp"
#include "functions/entry.hpp"
#include "functions/function_id.hpp"

#include <gtest/gtest.h>

#include <bit>
#include <cmath>
#include <deque>
#include <optional>
#include <stdexcept>
#include <string>
#include <vector>

namespace entropy_ledger::testing {

using functions::Argument;
using functions::Cell;
using functions::ErrorCode;
using functions::Result;

inline Cell number(double x) { return {Cell::Kind::number, x, {}}; }
inline Cell text(std::string_view t) { return {Cell::Kind::text, 0.0, t}; }
inline Cell error(ErrorCode code) { return {Cell::Kind::error, functions::error_number(code), {}}; }
inline Cell missing() { return {}; }
inline Cell empty() { return {Cell::Kind::empty, 0.0, {}}; }

// A range of cells.
class Range : public functions::Block {
public:
    Range(std::size_t rows, std::size_t columns, std::vector<Cell> cells)
        : rows_(rows), columns_(columns), cells_(std::move(cells)) {}
    static Range column(std::vector<Cell> cells) { return Range(cells.size(), 1, cells); }
    static Range row(std::vector<Cell> cells) { return Range(1, cells.size(), cells); }
    std::size_t rows() const override { return rows_; }
    std::size_t columns() const override { return columns_; }
    Cell at(std::size_t row, std::size_t column) const override { return cells_[row * columns_ + column]; }

private:
    std::size_t rows_, columns_;
    std::vector<Cell> cells_;
};

struct Input : Argument {
    Input(double x) : Argument{number(x), nullptr} {}
    Input(int x) : Argument{number(x), nullptr} {}
    Input(const char* t) : Argument{text(t), nullptr} {}
    Input(const std::string& t) : Argument{text(t), nullptr} {}
    Input(const Cell& c) : Argument{c, nullptr} {}
    Input(const Range& r) : Argument{{}, &r} {}
};

inline std::optional<functions::FunctionId> function_named(std::string_view name)
{
    for (std::size_t i = 0; i < functions::function_count; ++i) {
        if (functions::entry_of(i).name == name)
            return static_cast<functions::FunctionId>(i);
    }
    return std::nullopt;
}

inline Result call(std::string_view name, const std::vector<Input>& inputs)
{
    const auto function = function_named(name);
    if (!function)
        throw std::invalid_argument("no function " + std::string(name));
    std::vector<Argument> arguments(inputs.begin(), inputs.end());
    return functions::call(*function, arguments);
}

// The number of a result; fails the test when it is none or an error.
inline double value(const Result& result)
{
    const double* x = std::get_if<double>(&result);
    EXPECT_TRUE(x != nullptr && std::isfinite(*x)) << "not a number";
    return x ? *x : std::nan("");
}

inline double value(std::string_view name, const std::vector<Input>& inputs)
{
    SCOPED_TRACE(std::string(name));
    return value(call(name, inputs));
}

// The error code that a number stands for; 0 for a usual number.
inline int code_of(double x)
{
    return std::isfinite(x) ? 0 : static_cast<int>(std::bit_cast<std::uint64_t>(x) & 0xffffffffu);
}

inline int code_of(const Result& result)
{
    const double* x = std::get_if<double>(&result);
    return x ? code_of(*x) : 0;
}

inline std::string words(const Result& result)
{
    const std::string* t = std::get_if<std::string>(&result);
    EXPECT_NE(t, nullptr) << "not a text";
    return t ? *t : std::string();
}

inline std::string words(std::string_view name, const std::vector<Input>& inputs) { return words(call(name, inputs)); }

} // namespace entropy_ledger::testing
