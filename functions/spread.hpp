// Spreads ranges over a function of single cells, as native array formulas do.
#pragma once

#include "functions/entry.hpp"

namespace entropy_ledger::functions {

// More result cells than this are refused: no sheet asks for them, and memory stays bounded.
inline constexpr std::size_t most_results = std::size_t{1} << 24;

// Calls the entry's handler once for each cell of the result. A single row or column is repeated; where a range ends
// before the others, the result is #N/A.
Result spread(const Entry& entry, std::span<const Argument> arguments);

} // namespace entropy_ledger::functions
