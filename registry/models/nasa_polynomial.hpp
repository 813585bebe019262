// NASA nine-coefficient polynomials in several temperature intervals, at the standard pressure of 1 bar.
//
// Source: B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002), equations (1) to (3):
//   Cp/R  = a1/T^2 + a2/T + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4
//   H/RT  = -a1/T^2 + a2 ln(T)/T + a3 + a4 T/2 + a5 T^2/3 + a6 T^3/4 + a7 T^4/5 + b1/T
//   S/R   = -a1/(2 T^2) - a2/T + a3 ln(T) + a4 T + a5 T^2/2 + a6 T^3/3 + a7 T^4/4 + b2
// with R = 8.314510 J/(mol K), the value with which the set was made.
//
// A gas is ideal: its entropy falls by (R/M) ln(p / 1 bar), its enthalpy does not depend on pressure.
// A condensed phase is taken as incompressible and its volume neglected: no dependence on pressure.
#pragma once

#include "registry/limits.hpp"
#include "registry/number.hpp"
#include "registry/source.hpp"

#include <cmath>
#include <span>
#include <cstddef>

namespace entropy_ledger::registry {

inline constexpr double nasa_gas_constant = 8.314510;      // J/(mol K), see above
inline constexpr double nasa_standard_pressure = 100000.0; // Pa, see above

// One temperature interval of a record.
struct NasaInterval {
    double lower;  // K
    double upper;  // K
    double a[7];   // a1 to a7
    double b1;     // integration constant of the enthalpy, K
    double b2;     // integration constant of the entropy, dimensionless
};

// A phase by such polynomials. Its pointers go to static data or to data that outlive the phase.
struct NasaPolynomial {
    const NasaInterval* intervals;  // ascending, each beginning where the one before ends
    const double* bounds;           // the temperatures at which one gives way to the next: count - 1 of them
    std::size_t count;              // intervals, at least 1
    double specific_gas_constant;   // J/(kg K), R over the molar mass; 1 where the coefficients are in J/(kg K) themselves
    bool gas;                       // ideal gas, else condensed
    Range trust;                    // K
    Source const* origin;

    static constexpr bool holds_heat_capacity = true;

    template <class Number>
    Number entropy(const Number& T, const Number& p) const
    {
        using std::log;
        const Number at_standard_pressure = in_interval(T, [&](const NasaInterval& i) -> Number {
            const auto& a = i.a;
            const Number inverse = 1.0 / T;
            return a[2] * log(T) + i.b2 - inverse * (a[1] + 0.5 * a[0] * inverse)
                 + T * (a[3] + T * (a[4] / 2.0 + T * (a[5] / 3.0 + T * (a[6] / 4.0))));
        });
        if (!gas)
            return specific_gas_constant * at_standard_pressure;
        return specific_gas_constant * (at_standard_pressure - log(p / nasa_standard_pressure));
    }

    template <class Number>
    Number enthalpy(const Number& T, const Number&) const
    {
        using std::log;
        return specific_gas_constant * in_interval(T, [&](const NasaInterval& i) -> Number {
            const auto& a = i.a;
            return i.b1 - a[0] / T + a[1] * log(T)
                 + T * (a[2] + T * (a[3] / 2.0 + T * (a[4] / 3.0 + T * (a[5] / 4.0 + T * (a[6] / 5.0)))));
        });
    }

    template <class Number>
    Number heat_capacity(const Number& T, const Number&) const
    {
        return specific_gas_constant * in_interval(T, [&](const NasaInterval& i) -> Number {
            const auto& a = i.a;
            const Number inverse = 1.0 / T;
            return inverse * (a[1] + a[0] * inverse)
                 + (a[2] + T * (a[3] + T * (a[4] + T * (a[5] + T * a[6]))));
        });
    }

    Limits limits(double p) const
    {
        if (!(p > 0.0))
            return {empty_range, empty_range};
        return {{intervals[0].lower, intervals[count - 1].upper}, trust};
    }

    const Source& source(double, double) const { return *origin; }
    std::span<const Source* const> sources() const { return {&origin, 1}; }

private:
    template <class Number, class Term>
    Number in_interval(const Number& T, Term&& term) const
    {
        return choose(T, std::span<const double>(bounds, count - 1),
                      [&](std::size_t index) -> Number { return term(intervals[index]); });
    }
};

} // namespace entropy_ledger::registry
