// A phase of a substance: its model, the temperatures for which that model holds, its uncertainty and its source.
#pragma once

#include "registry/models/model.hpp"
#include "registry/source.hpp"

#include <span>
#include <string_view>

namespace entropy_ledger::registry {

// State of aggregation, by the IUPAC state symbols (IUPAC Green Book, 3rd ed., 2.11.1 (vi)).
enum class Aggregation { crystal, liquid, gas };

// Where an uncertainty comes from.
enum class Origin {
    stated,   // by the source itself
    derived,  // from the scatter of a fit or of two sources
    assigned  // by this project, with the reason beside it
};

// Uncertainty of a phase's heat capacity.
struct Uncertainty {
    double relative;          // standard uncertainty of the heat capacity, relative, inside the fitted range
    double growth_below;      // added to it for each kelvin below the fitted range, 1/K
    double growth_above;      // added to it for each kelvin above the fitted range, 1/K
    Origin origin;
    std::string_view reason;  // the statement of the source, or the reason of the assignment
};

// One phase. All phases of a substance share one reference state for enthalpy and entropy, so that a difference
// between any two of them is a difference of their own functions.
struct Phase {
    std::string_view symbol;  // IUPAC state symbol without its parentheses: "l", "cr", "cr,alpha"
    Aggregation aggregation;
    Model model;
    Uncertainty uncertainty;
    std::string_view remark;  // what the source says of this record; may be empty
};

// Specific entropy, J/(kg K), at temperature T in K and pressure p in Pa.
// Beyond the fitted range the heat capacity of a condensed phase is held at its value at the end of the range.
// No check of range: ask limits_of() first. With T > 0 and p > 0 no operation is undefined.
template <class Number>
Number entropy(const Phase& phase, const Number& T, const Number& p);

// Specific enthalpy, J/kg; arguments as above.
template <class Number>
Number enthalpy(const Phase& phase, const Number& T, const Number& p);

// Specific heat capacity at constant pressure, J/(kg K); arguments as above.
template <class Number>
Number heat_capacity(const Phase& phase, const Number& T, const Number& p);

// Temperatures for which the phase has values at pressure p (Pa). Empty ranges when p itself is out of range.
Limits limits_of(const Phase& phase, double p);

// The source that answers at (T, p).
const Source& source_of(const Phase& phase, double T, double p);

// Whether the phase is an ideal gas at every pressure.
bool is_ideal_gas(const Phase& phase);

// Whether entropy depends on pressure in the phase's model.
bool depends_on_pressure(const Phase& phase);

// All the sources that may answer for the phase, each once.
std::span<const Source* const> sources_of(const Phase& phase);

// Which of several formulations answers at (T, p); empty for a phase that has only one.
std::string_view formulation_of(const Phase& phase, double T, double p);

} // namespace entropy_ledger::registry

#include "registry/phase_evaluation.hpp"
