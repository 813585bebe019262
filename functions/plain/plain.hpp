// The plain functions: those without a process behind them. One file each group, named as in the catalogue.
#pragma once

#include "functions/entry.hpp"
#include "functions/value.hpp"

#include <span>

namespace entropy_ledger::functions::plain {

// Sum of numbers and ranges of numbers, J/K. Compensated, so that the order of the items does not matter.
// Empty cells of a range count as nothing; a text is Err:502; an error passes through.
Result entropy_total(const Entry&, std::span<const Argument>);

// "can occur", "reversible", "cannot occur" or "undecided".
Result entropy_verdict(const Entry&, std::span<const Cell>);

// T_ambient * generation, J or W (Gouy 1889, Stodola 1905).
Result work_lost(const Entry&, std::span<const Cell>);

Result temperature_balance(const Entry&, std::span<const Cell>);

Result data_list(const Entry&, std::span<const Cell>);
Result data_heatcapacity(const Entry&, std::span<const Cell>);
Result data_enthalpy(const Entry&, std::span<const Cell>);
Result data_entropy(const Entry&, std::span<const Cell>);
Result data_range(const Entry&, std::span<const Cell>);
Result data_source(const Entry&, std::span<const Cell>);

} // namespace entropy_ledger::functions::plain
