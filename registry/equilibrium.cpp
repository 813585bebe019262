#include "registry/equilibrium.hpp"

#include "registry/root.hpp"

#include <algorithm>
#include <cmath>

namespace entropy_ledger::registry {

namespace {

std::optional<double> nominal_temperature(const Substance& substance, const Phase& first, const Phase& second)
{
    for (const Transition& t : substance.transitions) {
        const Phase* below = &substance.phases[t.from];
        const Phase* above = &substance.phases[t.to];
        if ((below == &first && above == &second) || (below == &second && above == &first))
            return t.nominal_temperature;
    }
    return std::nullopt;
}

} // namespace

bool are_one(const Phase& first, const Phase& second, double T, double p)
{
    const double s = entropy(first, T, p);
    return !(std::abs(entropy(second, T, p) - s) >= 1e-4 * std::abs(s));
}

std::optional<double> equilibrium_temperature(const Substance& substance, const Phase& first, const Phase& second,
                                              double p)
{
    if (&first == &second || !(p > 0.0))
        return std::nullopt;
    const Range a = limits_of(first, p).trust;
    const Range b = limits_of(second, p).trust;
    if (a.empty() || b.empty())
        return std::nullopt;
    const Range common{std::max(a.lower, b.lower), std::min(a.upper, b.upper)};
    if (common.empty())
        return std::nullopt;
    const auto difference = [&](double T) { return gibbs_energy(first, T, p) - gibbs_energy(second, T, p); };

    // Near the temperature at which the source lets the two meet.
    const auto nominal = nominal_temperature(substance, first, second);
    if (nominal && common.contains(*nominal)) {
        if (are_one(first, second, *nominal, p))
            return *nominal;
        for (double width = 1e-3; width <= 64.0; width *= 4.0) {
            const double lower = std::max(common.lower, *nominal - width);
            const double upper = std::min(common.upper, *nominal + width);
            const double at_lower = difference(lower);
            const double at_upper = difference(upper);
            if (at_lower * at_upper <= 0.0)
                return bracketed_root(difference, lower, upper, at_lower, at_upper).x;
        }
    }

    // Anywhere in the common range: the first change of sign on a grid of equal ratios.
    constexpr int cells = 96;
    const double ratio = std::pow(common.upper / common.lower, 1.0 / cells);
    double lower = common.lower;
    double at_lower = difference(lower);
    for (int i = 1; i <= cells; ++i) {
        const double upper = i == cells ? common.upper : common.lower * std::pow(ratio, i);
        const double at_upper = difference(upper);
        if (at_lower * at_upper <= 0.0) {
            // Above the critical pressure liquid and gas are one fluid: equal curves are no equilibrium of two phases.
            const double T = bracketed_root(difference, lower, upper, at_lower, at_upper).x;
            if (!are_one(first, second, T, p))
                return T;
        }
        lower = upper;
        at_lower = at_upper;
    }
    return std::nullopt;
}

std::optional<double> equilibrium_pressure(const Phase& liquid, const Phase& gas, double T)
{
    // The equilibrium temperature rises with pressure: above the wanted pressure it is above T, or there is none. So the
    // window in which both phases have values at T, however narrow, is found by halving.
    const auto gap = [&](double p) {
        const Range l = limits_of(liquid, p).trust;
        const Range g = limits_of(gas, p).trust;
        return l.contains(T) && g.contains(T) ? 0 : !g.empty() && T < g.lower ? 1 : -1;
    };
    const auto difference = [&](double logarithm) {
        const double p = std::exp(logarithm);
        return gibbs_energy(liquid, T, p) - gibbs_energy(gas, T, p);
    };
    double lower = 0.0, upper = std::log(1e8);
    for (int i = 0; i < 200 && upper - lower > 1e-12; ++i) {
        const double middle = 0.5 * (lower + upper);
        const int where = gap(std::exp(middle));
        // Above the critical pressure both are one fluid and the difference is zero.
        const bool too_high = where > 0 || (where == 0 && !(difference(middle) > 0.0));
        (too_high ? upper : lower) = middle;
    }
    const double p = std::exp(0.5 * (lower + upper));
    if (gap(p) != 0 || are_one(liquid, gas, T, p) || !(std::abs(difference(std::log(p))) <= 1e-6 * std::abs(enthalpy(gas, T, p))))
        return std::nullopt;
    return p;
}

} // namespace entropy_ledger::registry
