// The plain functions: those without a process behind them. One file each group, named as in the catalogue.
#pragma once

#include "functions/entry.hpp"
#include "functions/value.hpp"

#include <span>

namespace entropy_ledger::functions::plain {

// Sum of numbers and ranges of numbers, J/K. Compensated, so that the order of the items does not matter.
// Empty cells of a range count as nothing; a text is Err:502; an error passes through.
Result entropy_total(const Entry&, std::span<const Argument>);

// Sum of heats, J, and the imbalance |sum| / (half the sum of their sizes), side by side.
Result heat_closure(const Entry&, std::span<const Argument>);

// "can occur", "reversible", "cannot occur" or "undecided".
Result entropy_verdict(const Entry&, std::span<const Cell>);

// T_ambient * generation, J or W (Gouy 1889, Stodola 1905).
Result work_lost(const Entry&, std::span<const Cell>);

// Exergy change dH - T0 dS, J (Rant 1956, for heat and entropy at constant composition).
Result work_available(const Entry&, std::span<const Cell>);

// Least work |Q| |1 - T0/T|, J: of a reversible heat pump or refrigerator between T and T_ambient.
Result work_least(const Entry&, std::span<const Cell>);

// Q / dS, K; above 0.
Result temperature_mean(const Entry&, std::span<const Cell>);

// End temperature of a substance in equilibrium, K, after it took up a heat at constant pressure.
Result temperature_final(const Entry&, std::span<const Cell>);

// Common end temperature of bodies of constant heat capacity: sum(C T) / sum(C), or with entropy conserved
// exp(sum(C ln T) / sum(C)); K.
Result temperature_common(const Entry&, std::span<const Argument>);

// Equilibrium temperature of two phases, K.
Result temperature_balance(const Entry&, std::span<const Cell>);

Result data_list(const Entry&, std::span<const Cell>);
Result data_heatcapacity(const Entry&, std::span<const Cell>);
Result data_enthalpy(const Entry&, std::span<const Cell>);
Result data_entropy(const Entry&, std::span<const Cell>);
Result data_range(const Entry&, std::span<const Cell>);
Result data_source(const Entry&, std::span<const Cell>);

} // namespace entropy_ledger::functions::plain
