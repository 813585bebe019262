// Sums over numbers and ranges of numbers.
#pragma once

#include "functions/value.hpp"

#include <span>

namespace entropy_ledger::functions::plain {

// The sum of all items and the sum of their sizes. An empty cell of a range counts as nothing; a text is Err:502; an
// error passes through.
struct ItemSums {
    double error = 0.0; // the number that stands for the first error; 0 when there is none
    double sum = 0.0;
    double sizes = 0.0;
};

ItemSums sum_of_items(std::span<const Argument> arguments);

} // namespace entropy_ledger::functions::plain
