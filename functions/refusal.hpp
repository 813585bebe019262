// Why a function gives no number.
#pragma once

#include "functions/value.hpp"

#include <string>

namespace entropy_ledger::functions {

struct Refusal {
    double error = 0.0;   // the number that stands for the error in the cell: see error_number()
    std::string reason;   // plain words that begin with the argument's name; filled only when words are wanted
};

} // namespace entropy_ledger::functions
