// Where a substance comes to equilibrium after it has taken up a heat at constant pressure.
#include "functions/plain/plain.hpp"
#include "functions/reader.hpp"
#include "registry/equilibrium.hpp"
#include "registry/phase_sequence.hpp"
#include "registry/root.hpp"

#include <cmath>

namespace entropy_ledger::functions::plain {

namespace {

using registry::Phase;
using registry::PhaseSequence;
using registry::Range;

// The longest sequence of phases around `phase` that has equilibria at p: downwards as far as there are data, upwards
// as far as there are data.
PhaseSequence surroundings(const registry::Substance& substance, const Phase& phase, double p)
{
    const auto own = static_cast<std::size_t>(&phase - substance.phases.data());
    PhaseSequence sequence{{&phase}, {}};
    for (std::size_t first = 0; first < own; ++first) {
        if (auto below = registry::phase_sequence(substance, substance.phases[first], phase, p)) {
            sequence = std::move(*below);
            break;
        }
    }
    for (std::size_t last = substance.phases.size(); last-- > own + 1;) {
        if (const auto above = registry::phase_sequence(substance, phase, substance.phases[last], p)) {
            sequence.phases.insert(sequence.phases.end(), above->phases.begin() + 1, above->phases.end());
            sequence.temperatures.insert(sequence.temperatures.end(), above->temperatures.begin(),
                                         above->temperatures.end());
            break;
        }
    }
    // Above the critical pressure the gas goes on where the range of the liquid, the same fluid, ends.
    const Phase& highest = substance.phases.back();
    const Phase& last = *sequence.phases.back();
    const double end = registry::limits_of(last, p).trust.upper;
    if (&last != &highest && registry::limits_of(highest, p).trust.contains(end) && registry::are_one(last, highest, end, p)) {
        sequence.phases.push_back(&highest);
        sequence.temperatures.push_back(end);
    }
    return sequence;
}

enum class Search { found, out_of_range, not_converged };

// The temperature in `range` at which the phase has the enthalpy h.
Search temperature_of(const Phase& phase, double h, double p, Range range, double& T)
{
    const auto missing = [&](double t) { return registry::enthalpy(phase, t, p) - h; };
    const double at_lower = missing(range.lower);
    const double at_upper = missing(range.upper);
    if (!(at_lower <= 0.0 && at_upper >= 0.0))
        return Search::out_of_range;
    const registry::Root root = registry::bracketed_root(missing, range.lower, range.upper, at_lower, at_upper);
    T = root.x;
    return root.width <= 1e-9 * T ? Search::found : Search::not_converged;
}

// The temperature at which the sequence, each phase where it is stable, has the enthalpy h. Between the enthalpies of
// two phases at their equilibrium both are there, at that temperature.
Search equilibrium_at(const PhaseSequence& sequence, double h, double p, double& T)
{
    for (std::size_t k = 0; k < sequence.phases.size(); ++k) {
        const Phase& phase = *sequence.phases[k];
        const Range trust = registry::limits_of(phase, p).trust;
        const Range stable{k == 0 ? trust.lower : sequence.temperatures[k - 1],
                           k < sequence.temperatures.size() ? sequence.temperatures[k] : trust.upper};
        if (k > 0 && h <= registry::enthalpy(phase, stable.lower, p)) {
            T = stable.lower;
            return Search::found;
        }
        if (k + 1 == sequence.phases.size() || h <= registry::enthalpy(phase, stable.upper, p))
            return temperature_of(phase, h, p, stable, T);
    }
    return Search::out_of_range;
}

} // namespace

Result temperature_final(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const State state = reader.state(Key::state);
    const double T_start = reader.temperature(Key::T_start);
    const Flow<double> flow = reader.heat(Key::heat_balance);
    const double heat = flow.value;
    const Amount<double> amount = reader.amount(Key::amount, state.substance);
    reader.require_same_rate(Key::heat_balance, flow.rate, Key::amount, amount.rate);
    const double p = reader.pressure(Key::p, standard_pressure);
    if (reader.refused())
        return reader.refusal().error;
    const Phase& phase = state.at(T_start);
    reader.admit(state.substance, phase, T_start, p, Key::T_start);
    if (!(amount.mass > 0.0))
        reader.refuse(ErrorCode::unusable_argument, Key::amount, [] { return "is nothing"; });
    const double h = registry::enthalpy(phase, T_start, p) + heat / amount.mass;
    if (!std::isfinite(h))
        reader.refuse(ErrorCode::unusable_argument, Key::heat_balance, [] { return "is out of all bounds"; });
    if (reader.refused())
        return reader.refusal().error;

    double T = 0.0;
    switch (equilibrium_at(surroundings(*state.substance, phase, p), h, p, T)) {
    case Search::found: return T;
    case Search::out_of_range: return error_number(ErrorCode::not_available);
    case Search::not_converged: break;
    }
    return error_number(ErrorCode::no_convergence);
}

} // namespace entropy_ledger::functions::plain
