// The phases of the registry that are records of the NASA Glenn set.
#pragma once

#include "registry/substance.hpp"

#include <string>
#include <variant>
#include <vector>

namespace entropy_ledger::testing {

inline constexpr double bar = 1e5; // Pa

struct NasaPhase {
    const registry::Substance* substance;
    const registry::Phase* phase;
    const registry::NasaPolynomial* model;

    std::string state() const { return std::string(substance->name) + "(" + std::string(phase->symbol) + ")"; }
};

inline std::vector<NasaPhase> nasa_phases()
{
    std::vector<NasaPhase> list;
    for (const registry::Substance& substance : registry::substances()) {
        for (const registry::Phase& phase : substance.phases) {
            const auto* model = std::get_if<registry::NasaPolynomial>(&phase.model);
            if (model && model->origin == &registry::sources::nasa_glenn)
                list.push_back({&substance, &phase, model});
        }
    }
    return list;
}

inline std::vector<std::string> fields_of(const std::string& line, char separator = '\t')
{
    std::vector<std::string> fields(1);
    for (const char c : line) {
        if (c == separator)
            fields.emplace_back();
        else
            fields.back() += c;
    }
    return fields;
}

} // namespace entropy_ledger::testing
