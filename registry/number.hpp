// The number types on which a model can be evaluated.
//
// Every model and process is a template over `Number`. Today that is `double`; a type that carries derivatives or
// one that records the expression can take its place without a second version of any model, if it offers
//   - the arithmetic operators, mixed with `double`;
//   - log, exp, sqrt, atan and pow(Number, int), found by argument-dependent look-up;
//   - construction from double and without argument;
//   - value_of(Number), the plain value at hand;
//   - choose(Number, bounds, branch), and clamp_to(Number, lower, upper), as below.
// A model must not decide with a bare `if` on a Number: a decision goes through `choose`, so that a number that
// records what it went through can keep every branch.
#pragma once

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <span>

namespace entropy_ledger::registry {

inline double value_of(double x) { return x; }

// Index of the interval that holds x: 0 below bounds[0], 1 from bounds[0] up to bounds[1], and so on.
// A bound belongs to the interval above it. Bounds ascend.
inline std::size_t interval_of(double x, std::span<const double> bounds)
{
    constexpr std::size_t few = 16; // up to here counting along is the faster way
    if (bounds.size() > few)
        return static_cast<std::size_t>(std::upper_bound(bounds.begin(), bounds.end(), x) - bounds.begin());
    std::size_t index = 0;
    while (index < bounds.size() && x >= bounds[index])
        ++index;
    return index;
}

// Evaluates branch(index) for the interval that holds x.
template <class Branch>
double choose(double x, std::span<const double> bounds, Branch&& branch)
{
    return branch(interval_of(x, bounds));
}

// x, but not outside [lower, upper].
inline double clamp_to(double x, double lower, double upper) { return std::min(std::max(x, lower), upper); }

// x^n by repeated squaring, for any Number and any n of either sign.
template <class Number>
constexpr Number integer_power(Number x, int n)
{
    const bool reciprocal = n < 0;
    unsigned exponent = reciprocal ? 0u - static_cast<unsigned>(n) : static_cast<unsigned>(n);
    Number result = 1.0;
    for (Number square = x; exponent != 0; square = square * square) {
        if (exponent & 1u)
            result = result * square;
        exponent >>= 1u;
        if (exponent == 0)
            break;
    }
    return reciprocal ? 1.0 / result : result;
}

} // namespace entropy_ledger::registry
