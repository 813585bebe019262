// The path of a change of state, step by step, for STEPS.
#include "functions/processes/state_change.hpp"
#include "functions/wording.hpp"
#include "registry/equilibrium.hpp"
#include "registry/phase_sequence.hpp"

#include <algorithm>
#include <optional>

namespace entropy_ledger::functions {

namespace {

using registry::Aggregation;
using registry::Phase;
using registry::Substance;

// What a phase change is called, by the states of aggregation.
const char* name_of_change(Aggregation from, Aggregation to)
{
    if (from == to)
        return "change of modification";
    if (from == Aggregation::crystal)
        return to == Aggregation::liquid ? "melting" : "sublimation";
    if (from == Aggregation::liquid)
        return to == Aggregation::crystal ? "freezing" : "boiling";
    return to == Aggregation::liquid ? "condensation" : "deposition";
}

// "water(l)" or "water(l+g,x=0.85)"
std::string shown_point(const Substance& substance, const Point<double>& point)
{
    if (!point.vapour)
        return shown_state(substance, *point.phase);
    return std::string(substance.name) + "(l+g,x=" + shown(point.quality, 4) + ")";
}

// Visits the step from one point to the next, unless nothing happens.
class StepMaker {
public:
    StepMaker(const Substance& substance, double mass, const StepVisitor& visit)
        : substance_(substance), mass_(mass), visit_(visit) {}

    void operator()(const Point<double>& from, const Point<double>& to) const
    {
        if (from.phase == to.phase && from.T == to.T && from.p == to.p && from.vapour == to.vapour)
            return;
        Step step;
        step.T_start = from.T;
        step.T_end = to.T;
        step.p = to.p;
        step.heat = mass_ * (enthalpy_at(to) - enthalpy_at(from));
        step.entropy = mass_ * (entropy_at(to) - entropy_at(from));
        step.state = shown_point(substance_, from);
        if (from.vapour != to.vapour) {
            step.what = step.heat > 0.0 ? "boiling" : "condensation";
            step.state += " → " + shown_point(substance_, to);
        } else if (from.phase != to.phase) {
            // Above the critical pressure liquid and gas are one fluid under two names.
            step.what = from.T == to.T && from.phase->aggregation != to.phase->aggregation
                            && registry::are_one(*from.phase, *to.phase, to.T, to.p)
                          ? "no change (one fluid)"
                          : name_of_change(from.phase->aggregation, to.phase->aggregation);
            step.state += " → " + shown_point(substance_, to);
        } else if (from.T == to.T) {
            step.what = "change of pressure";
        } else {
            step.what = from.T < to.T ? "heating" : "cooling";
        }
        const std::string first{source_of(*from.phase, from.T, from.p).key};
        const std::string last{source_of(*to.phase, to.T, to.p).key};
        step.source = first == last ? first : first + "; " + last;
        visit_(step);
    }

private:
    const Substance& substance_;
    double mass_;
    const StepVisitor& visit_;
};

bool has_value(const Phase& phase, double T, double p) { return limits_of(phase, p).trust.contains(T); }

// A temperature at which both phases have the same properties: above the critical pressure, where the liquid's range ends.
std::optional<double> shared_temperature(const Point<double>& start, const Point<double>& end)
{
    const registry::Range a = limits_of(*start.phase, start.p).trust;
    const registry::Range b = limits_of(*end.phase, start.p).trust;
    const double T = std::min(a.upper, b.upper);
    const bool shared = a.contains(T) && b.contains(T) && registry::are_one(*start.phase, *end.phase, T, start.p);
    return shared ? std::optional(T) : std::nullopt;
}

// From one phase to another at one pressure.
void visit_phases(const StepMaker& step, const Substance& substance, const Point<double>& start,
                  const Point<double>& end, bool directly)
{
    const auto path = registry::phase_sequence(substance, *start.phase, *end.phase, start.p, directly);
    Point<double> here = start;
    if (path) {
        for (std::size_t k = 0; k < path->temperatures.size(); ++k) {
            const Point<double> before{path->phases[k], path->temperatures[k], start.p};
            const Point<double> after{path->phases[k + 1], path->temperatures[k], start.p};
            step(here, before);
            step(before, after);
            here = after;
        }
    } else if (const auto T = shared_temperature(start, end)) {
        const Point<double> before{start.phase, *T, start.p};
        const Point<double> after{end.phase, *T, start.p};
        step(here, before);
        step(before, after);
        here = after;
    } else if (has_value(*end.phase, start.T, start.p)) {
        const Point<double> after{end.phase, start.T, start.p};
        step(here, after);
        here = after;
    } else if (has_value(*start.phase, end.T, start.p)) {
        const Point<double> before{start.phase, end.T, start.p};
        step(here, before);
        here = before;
    }
    step(here, end);
}

// The part of a wet point that a path to or from `other` begins with: its vapour towards a gas, else its liquid.
Point<double> dry(const Point<double>& point, const Point<double>& other)
{
    if (!point.vapour)
        return point;
    return {other.phase->aggregation == Aggregation::gas ? point.vapour : point.phase, point.T, point.p};
}

} // namespace

void visit_path(const Substance& substance, const Point<double>& first, const Point<double>& last, double mass,
                const StepVisitor& visit)
{
    const StepMaker step(substance, mass, visit);
    const Point<double> start = dry(first, last);
    const Point<double> end = dry(last, first);
    step(first, start);
    // The change of pressure first, where the phase at the start has values at the final pressure, else last.
    const bool pressure_first = has_value(*start.phase, start.T, end.p);
    const Point<double> begin{start.phase, start.T, pressure_first ? end.p : start.p};
    const Point<double> finish{end.phase, end.T, begin.p};
    step(start, begin);
    if (start.phase == end.phase)
        step(begin, finish);
    else // a change at one temperature does not detour through a third phase
        visit_phases(step, substance, begin, finish, start.T == end.T);
    step(finish, end);
    step(end, last);
}

} // namespace entropy_ledger::functions
