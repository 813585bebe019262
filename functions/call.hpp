// The one door into the cell functions.
#pragma once

#include "functions/value.hpp"

#include <cstdint>
#include <span>

namespace entropy_ledger::functions {

// The functions, as the catalogue lists them (generated).
enum class FunctionId : std::uint16_t;

// Calls a function with its arguments in the catalogue's order; those left out at the end may be missing from the
// span. For a function with a repeated last argument ("items..."), each repetition is one more argument.
// Never throws: an internal fault (out of memory) comes back as Err:502.
Result call(FunctionId function, std::span<const Argument> arguments) noexcept;

} // namespace entropy_ledger::functions
