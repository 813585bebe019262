// Entropy generated when a system exchanges its heat with one reservoir: dS - Q / T_reservoir.
#pragma once

#include "functions/processes/step.hpp"
#include "registry/number.hpp"

#include <cmath>
#include <limits>
#include <span>

namespace entropy_ledger::functions {

// The system's entropy change, its heat, and the reservoir's temperature in K; result in J/K.
// A difference no larger than what rounding makes of its own parts is zero: at equilibrium nothing is generated.
template <class Number>
Number generation(const Term<Number>& entropy, const Term<Number>& heat, const Number& T_reservoir)
{
    using registry::choose;
    using registry::value_of;
    constexpr double rounding = 32.0 * std::numeric_limits<double>::epsilon();
    const Number difference = entropy.value - heat.value / T_reservoir;
    const double noise = rounding * (entropy.magnitude + heat.magnitude / value_of(T_reservoir));
    const double bounds[] = {-noise, noise};
    if (!(noise > 0.0 && std::isfinite(noise)))
        return difference;
    return choose(difference, std::span<const double>(bounds),
                            [&](std::size_t interval) -> Number { return interval == 1 ? Number(0.0) : difference; });
}

} // namespace entropy_ledger::functions
