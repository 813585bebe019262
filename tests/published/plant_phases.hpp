// The phases of the registry whose heat capacity is given in J/(kg K) itself: the substances of plant practice.
#pragma once

#include "registry/substance.hpp"

#include <algorithm>
#include <string>
#include <variant>
#include <vector>

namespace entropy_ledger::testing {

inline constexpr double bar = 1e5;           // Pa
inline constexpr double zero_celsius = 273.15; // K

struct PlantPhase {
    const registry::Substance* substance;
    const registry::Phase* phase;
    const registry::NasaPolynomial* model;

    std::string state() const { return std::string(substance->name) + "(" + std::string(phase->symbol) + ")"; }
};

inline std::vector<PlantPhase> plant_phases()
{
    std::vector<PlantPhase> list;
    for (const registry::Substance& substance : registry::substances()) {
        for (const registry::Phase& phase : substance.phases) {
            const auto* model = std::get_if<registry::NasaPolynomial>(&phase.model);
            if (model && model->specific_gas_constant == 1.0)
                list.push_back({&substance, &phase, model});
        }
    }
    return list;
}

// Null when there is none.
inline const registry::Phase* phase_of(std::string_view name, std::string_view symbol)
{
    const registry::Substance* substance = registry::find_substance(name).substance;
    if (!substance)
        return nullptr;
    const auto found = std::find_if(substance->phases.begin(), substance->phases.end(),
                                    [&](const registry::Phase& phase) { return phase.symbol == symbol; });
    return found == substance->phases.end() ? nullptr : &*found;
}

inline double cp_of(std::string_view name, std::string_view symbol, double T)
{
    const registry::Phase* phase = phase_of(name, symbol);
    return phase ? registry::heat_capacity(*phase, T, bar) : std::nan("");
}

inline double enthalpy_of(std::string_view name, std::string_view symbol, double T)
{
    const registry::Phase* phase = phase_of(name, symbol);
    return phase ? registry::enthalpy(*phase, T, bar) : std::nan("");
}

} // namespace entropy_ledger::testing
