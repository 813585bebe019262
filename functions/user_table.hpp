// The user's own property table: a range of cells in place of a substance.
//
// Two or three columns, read from the top; the first holds a keyword or a temperature. Empty rows do not matter.
//
//     substance      | name
//     molar mass     | g/mol with its unit, or kg/mol as a number                  (optional)
//     source         | text                                                        (optional)
//     uncertainty    | relative standard uncertainty of cp: 0.02 or "2 %"          (optional)
//     interpolation  | linear (when left out) or smooth                            (optional)
//     state          | symbol of the phase that is meant where one state is wanted (optional)
//     phase          | state symbol: cr, l, ...; the phases in order of stability on heating
//     temperature, K | heat capacity, J/(kg K)      a heading; its units hold for the numbers below it   (optional)
//     280            | 1900                         at least two rows, temperatures ascending
//     transition     | temperature | enthalpy taken up on heating, J/kg           between two phases
//
// Temperatures and heat capacities are numbers in the heading's units (K and J/(kg K) without one) or texts with a unit. The
// enthalpy of a transition is a number in J/kg only while the heading above has SI units; else it says its unit. A
// gas is ideal when the molar mass is given; without it its pressure does not count, and CHECK says so.
#pragma once

#include "functions/refusal.hpp"
#include "functions/value.hpp"
#include "registry/tabulated_substance.hpp"

#include <memory>
#include <string>

namespace entropy_ledger::functions {

class UserTable {
public:
    // More rows than this are refused.
    static constexpr std::size_t most_rows = 100000;

    // True for a range of two columns or more and two rows or more with the keyword phase or substance in its first column.
    static bool looks_like_one(const Block& block);

    explicit UserTable(const Block& block);

    bool refused() const { return !substance_; }
    const Refusal& refusal() const { return refusal_; }             // names the row
    const registry::Substance& substance() const { return substance_->substance(); } // when not refused
    const std::string& state() const { return state_; }             // symbol of the phase that is meant; may be empty

private:
    std::unique_ptr<registry::TabulatedSubstance> substance_;
    std::string state_;
    Refusal refusal_;
};

} // namespace entropy_ledger::functions
