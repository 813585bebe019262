// A second number type for the tests of what is generic over it.
#pragma once

#include "registry/number.hpp"

#include <cmath>
#include <span>

namespace entropy_ledger::testing {

// A number that carries one derivative, as the second Number of the concept in number.hpp.
struct Dual {
    double value = 0.0;
    double slope = 0.0;

    Dual() = default;
    Dual(double v) : value(v) {}
    Dual(double v, double d) : value(v), slope(d) {}

    friend Dual operator+(Dual a, Dual b) { return {a.value + b.value, a.slope + b.slope}; }
    friend Dual operator-(Dual a, Dual b) { return {a.value - b.value, a.slope - b.slope}; }
    friend Dual operator-(Dual a) { return {-a.value, -a.slope}; }
    friend Dual operator*(Dual a, Dual b) { return {a.value * b.value, a.slope * b.value + a.value * b.slope}; }
    friend Dual operator/(Dual a, Dual b)
    {
        const double quotient = a.value / b.value;
        return {quotient, (a.slope - quotient * b.slope) / b.value};
    }
    friend Dual log(Dual a) { return {std::log(a.value), a.slope / a.value}; }
    friend Dual sqrt(Dual a) { return {std::sqrt(a.value), a.slope / (2.0 * std::sqrt(a.value))}; }
    friend Dual atan(Dual a) { return {std::atan(a.value), a.slope / (1.0 + a.value * a.value)}; }
    friend double value_of(Dual a) { return a.value; }

    template <class Branch>
    friend Dual choose(Dual x, std::span<const double> bounds, Branch&& branch)
    {
        return branch(registry::interval_of(x.value, bounds));
    }
    friend Dual clamp_to(Dual x, double lower, double upper)
    {
        return x.value < lower ? Dual(lower) : x.value > upper ? Dual(upper) : x;
    }
    friend Dual exp(Dual a) { return {std::exp(a.value), a.slope * std::exp(a.value)}; }
};

} // namespace entropy_ledger::testing
