// Ice Ih by R10-06, up to the melting curve of R14-08 and a little beyond. Ranges: water_formulations.hpp.
#pragma once

#include "registry/limits.hpp"
#include "registry/models/iapws_r10.hpp"
#include "registry/models/iapws_r14.hpp"
#include "registry/models/water_formulations.hpp"
#include "registry/source.hpp"

#include <span>

namespace entropy_ledger::registry {

struct IceIh {
    using Bounds = IceBounds;

    static constexpr bool holds_heat_capacity = false; // the equation goes on smoothly

    template <class Number>
    Number entropy(const Number& T, const Number& p) const
    {
        return iapws_r10::entropy(T, p);
    }

    template <class Number>
    Number enthalpy(const Number& T, const Number& p) const
    {
        return iapws_r10::enthalpy(T, p);
    }

    template <class Number>
    Number heat_capacity(const Number& T, const Number& p) const
    {
        return iapws_r10::heat_capacity(T, p);
    }

    Limits limits(double p) const
    {
        if (!(p > 0.0 && p <= Bounds::greatest_pressure))
            return {empty_range, empty_range};
        const double melting = iapws_r14::melting_temperature(p) + Bounds::melting_allowance;
        return {{Bounds::lowest_temperature, melting},
                {Bounds::lowest_temperature, melting + Bounds::superheat_margin}};
    }

    const Source& source(double, double) const { return sources::iapws_r10; }
    std::span<const Source* const> sources() const { return answering; }

private:
    static constexpr const Source* answering[] = {&sources::iapws_r10};
};

} // namespace entropy_ledger::registry
