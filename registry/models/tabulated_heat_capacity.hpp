// Heat capacity given at temperatures, with straight lines or smooth curves between them.
//
// Between two knots cp = y + m u + c2 u^2 + c3 u^3 with u = T - T_knot. Linear: c2 = c3 = 0. Smooth: piecewise cubic
// Hermite interpolation with the slopes of F. N. Fritsch and R. E. Carlson (SIAM J. Numer. Anal. 17 (1980) 238-246) in
// the harmonic-mean form of F. N. Fritsch and J. Butland (SIAM J. Sci. Stat. Comput. 5 (1984) 300-304): no overshoot.
//
// Enthalpy is the exact integral of cp. Entropy is that of cp/T by Gauss-Legendre quadrature with 7 points, whose
// relative error is below 2e-13 while a knot lies at most 1.5 times above the one before (checked in
// tests/unit/tabulated_heat_capacity.cpp); wider spacings are divided when the table is built. The closed form with a
// logarithm would lose up to eight digits where knots are a few millikelvin apart.
#pragma once

#include "registry/limits.hpp"
#include "registry/number.hpp"
#include "registry/source.hpp"

#include <cmath>
#include <cstddef>
#include <span>

namespace entropy_ledger::registry {

inline constexpr double table_pressure = 1e5; // Pa; at which a table holds

struct TableKnot {
    double T;           // K
    double y, m, c2, c3; // of cp from here to the next knot, J/(kg K^(1..4))
    double h;           // enthalpy here, J/kg
    double s;           // entropy here, J/(kg K)
};

struct TabulatedHeatCapacity {
    const TableKnot* knots;  // count of them, for as many intervals
    const double* bounds;    // inner ends of the intervals: count - 1 of them
    std::size_t count;       // at least 1
    double upper;            // K, end of the last interval
    double gas_constant;     // J/(kg K), R over the molar mass, of an ideal gas; 0 for a condensed phase
    Range trust;             // K
    Source const* origin;

    static constexpr bool holds_heat_capacity = true;

    template <class Number>
    Number entropy(const Number& T, const Number& p) const
    {
        const Number at_standard_pressure = in_interval(T, [&](const TableKnot& k) -> Number {
            return k.s + entropy_from_knot(k, T);
        });
        using std::log;
        return gas_constant > 0.0 ? at_standard_pressure - gas_constant * log(p / table_pressure) : at_standard_pressure;
    }

    template <class Number>
    Number enthalpy(const Number& T, const Number&) const
    {
        return in_interval(T, [&](const TableKnot& k) -> Number {
            const Number u = T - k.T;
            return k.h + u * (k.y + u * (k.m / 2.0 + u * (k.c2 / 3.0 + u * (k.c3 / 4.0))));
        });
    }

    template <class Number>
    Number heat_capacity(const Number& T, const Number&) const
    {
        return in_interval(T, [&](const TableKnot& k) -> Number {
            const Number u = T - k.T;
            return k.y + u * (k.m + u * (k.c2 + u * k.c3));
        });
    }

    Limits limits(double p) const
    {
        if (!(p > 0.0))
            return {empty_range, empty_range};
        return {{knots[0].T, upper}, trust};
    }

    const Source& source(double, double) const { return *origin; }
    std::span<const Source* const> sources() const { return {&origin, 1}; }

    // Integral of cp/T from the knot to T, by quadrature.
    template <class Number>
    static Number entropy_from_knot(const TableKnot& k, const Number& T)
    {
        // Nodes and weights of Gauss-Legendre quadrature, n = 7, on [-1, 1]: Abramowitz and Stegun, table 25.4.
        constexpr double node[4] = {0.0, 0.405845151377397166907, 0.741531185599394439864, 0.949107912342758524526};
        constexpr double weight[4] = {0.417959183673469387755, 0.381830050505118944950, 0.279705391489276667901,
                                      0.129484966168869693271};
        const Number half = 0.5 * (T - k.T);
        const auto integrand = [&](const Number& u) -> Number {
            return (k.y + u * (k.m + u * (k.c2 + u * k.c3))) / (k.T + u);
        };
        Number sum = weight[0] * integrand(half);
        for (int i = 1; i < 4; ++i)
            sum = sum + weight[i] * (integrand(half * (1.0 - node[i])) + integrand(half * (1.0 + node[i])));
        return half * sum;
    }

private:
    template <class Number, class Term>
    Number in_interval(const Number& T, Term&& term) const
    {
        return choose(T, std::span<const double>(bounds, count - 1),
                      [&](std::size_t index) -> Number { return term(knots[index]); });
    }
};

} // namespace entropy_ledger::registry
