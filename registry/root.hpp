// Roots of functions of one variable.
#pragma once

#include <boost/math/tools/toms748_solve.hpp>

#include <cmath>
#include <cstdint>

namespace entropy_ledger::registry {

struct Root {
    double x;
    double width; // of the bracket that holds it; 0 when it was met exactly
};

// The root of `function` between lower and upper, where it has the values at_lower and at_upper of unlike sign or zero,
// by the method of Alefeld, Potra and Shi (Boost.Math toms748_solve) to the resolution of double. Throws nothing of its own.
template <class Function>
Root bracketed_root(const Function& function, double lower, double upper, double at_lower, double at_upper)
{
    using Policy = boost::math::policies::policy<
        boost::math::policies::domain_error<boost::math::policies::ignore_error>,
        boost::math::policies::evaluation_error<boost::math::policies::ignore_error>>;
    if (at_lower == 0.0)
        return {lower, 0.0};
    if (at_upper == 0.0)
        return {upper, 0.0};
    std::uintmax_t steps = 200;
    const auto close = [](double a, double b) { return std::abs(b - a) <= 4e-16 * std::abs(a); };
    const auto bracket
        = boost::math::tools::toms748_solve(function, lower, upper, at_lower, at_upper, close, steps, Policy());
    return {0.5 * (bracket.first + bracket.second), std::abs(bracket.second - bracket.first)};
}

} // namespace entropy_ledger::registry
