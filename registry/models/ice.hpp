// Ice Ih by R10-06.
//
// The release gives 0 K to 273.16 K at up to 210 MPa, where ice Ih is stable. `fit` ends at the melting curve, `trust`
// 5 K above it: the same equation, whose properties stay smooth there (cp rises by 7.5 J/(kg K) a kelvin throughout).
// The melting temperature is taken from a parabola through the curve of IAPWS R14-08 for ice Ih, 251.165 K to 273.16 K,
// which it follows within 0.0102 K; 0.011 K is added, so that the curve itself lies inside `fit`.
#pragma once

#include "registry/limits.hpp"
#include "registry/models/iapws_r10.hpp"
#include "registry/source.hpp"

#include <algorithm>
#include <span>

namespace entropy_ledger::registry {

struct IceIh {
    static constexpr bool holds_heat_capacity = false; // the equation goes on smoothly

    static constexpr double lowest_temperature = 1.0;     // K; the release begins at 0 K, where T = 0 has no logarithm
    static constexpr double greatest_pressure = 210.0e6;  // Pa, R10-06
    static constexpr double superheat_margin = 5.0;       // K, see above

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
        if (!(p > 0.0 && p <= greatest_pressure))
            return {empty_range, empty_range};
        const double melting = stable_to(p);
        return {{lowest_temperature, melting}, {lowest_temperature, melting + superheat_margin}};
    }

    const Source& source(double, double) const { return sources::iapws_r10; }
    std::span<const Source* const> sources() const { return answering; }

private:
    static constexpr const Source* answering[] = {&sources::iapws_r10};

    static double stable_to(double p)
    {
        const double megapascal = p * 1e-6;
        const double melting = iapws_r10::triple_point_temperature
                             - megapascal * (0.07476951 + 0.00014737 * megapascal) + 0.011;
        return std::min(iapws_r10::triple_point_temperature, melting);
    }
};

} // namespace entropy_ledger::registry
