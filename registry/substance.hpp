// A substance: its phases in order of stability, and the look-up by name.
#pragma once

#include "registry/phase.hpp"

#include <optional>
#include <span>
#include <string_view>

namespace entropy_ledger::registry {

// Two neighbouring phases and the temperature at which the source lets them meet, at 1 bar.
// The equilibrium temperature itself is where their Gibbs energies are equal: see equilibrium.hpp.
struct Transition {
    std::size_t from;            // index into phases; stable below
    std::size_t to;              // index into phases; stable above
    double nominal_temperature;  // K
};

struct Substance {
    std::string_view name;       // as shown: "water", "Al", "NaNO3"
    std::string_view formula;    // "H2O"; empty when there is none
    std::string_view title;      // English name: "aluminium"; may be empty
    double molar_mass;           // kg/mol; 0 when unknown
    std::span<const Phase> phases;           // condensed phases in order of stability on heating, then the gas
    std::span<const Transition> transitions; // between condensed phases, ascending in temperature
};

// All substances of the registry, in alphabetical order of their names.
std::span<const Substance> substances();

struct Found {
    const Substance* substance;  // null when unknown or ambiguous
    bool ambiguous;              // the name fits several substances when case is ignored
};

// A substance by name, formula or alias: first as written, then without regard to (ASCII) case where that is
// unambiguous. Blanks around it are ignored. Cost does not depend on the number of substances.
Found find_substance(std::string_view name);

// Up to `count` names that differ little from `name`, for a helpful refusal.
// Searches all names: for messages only.
struct Suggestions { std::string_view names[3]; std::size_t count; };
Suggestions similar_names(std::string_view name);

} // namespace entropy_ledger::registry
