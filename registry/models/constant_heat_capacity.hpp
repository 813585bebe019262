// A condensed phase of constant heat capacity: h = h0 + cp (T - T0), s = s0 + cp ln(T / T0).
#pragma once

#include "registry/limits.hpp"
#include "registry/number.hpp"
#include "registry/source.hpp"

#include <cmath>
#include <span>

namespace entropy_ledger::registry {

struct ConstantHeatCapacity {
    double cp;                     // J/(kg K)
    double reference_temperature;  // K
    double reference_enthalpy;     // J/kg, at the reference temperature
    double reference_entropy;      // J/(kg K), at the reference temperature
    Range fit;                     // K
    Range trust;                   // K
    Source const* origin;

    static constexpr bool holds_heat_capacity = true; // of itself

    template <class Number>
    Number entropy(const Number& T, const Number&) const
    {
        using std::log;
        return reference_entropy + cp * log(T / reference_temperature);
    }

    template <class Number>
    Number enthalpy(const Number& T, const Number&) const
    {
        return reference_enthalpy + cp * (T - reference_temperature);
    }

    template <class Number>
    Number heat_capacity(const Number&, const Number&) const
    {
        return cp;
    }

    Limits limits(double p) const
    {
        if (!(p > 0.0))
            return {empty_range, empty_range};
        return {fit, trust};
    }

    const Source& source(double, double) const { return *origin; }
    std::span<const Source* const> sources() const { return {&origin, 1}; }
};

} // namespace entropy_ledger::registry
