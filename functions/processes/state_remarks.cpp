// What there is to say about a change of state: sources, states beyond a fitted range, states away from equilibrium,
// and the cautions for states that can hurt someone.
#include "functions/cautions.hpp"
#include "functions/processes/state_change.hpp"
#include "functions/wording.hpp"
#include "registry/equilibrium.hpp"

#include <cmath>

namespace entropy_ledger::functions {

namespace {

using registry::Aggregation;
using registry::Phase;
using registry::Substance;

// This close to equilibrium, in K, a state counts as at equilibrium: 0 °C is meant as the freezing point of water. It also
// covers the few millikelvin within which the Gibbs energies of the IAPWS R7-97 regions meet.
constexpr double at_equilibrium = 0.02;

// So far from equilibrium, in K, a liquid is called hazardous: common practice, no source.
constexpr double worth_a_caution = 1.0;

// Below this a pressure was perhaps meant in another unit: common practice, no source. Pa.
constexpr double lowest_usual_pressure = 50.0;

// Above this the ideal gas is spoken of: common practice, no source. Pa.
constexpr double highest_ideal_pressure = 1e6;

// The phase of lowest Gibbs energy at (T, p), if it is lower than that of `phase` by more than rounding; else null.
const Phase* more_stable(const Substance& substance, const Phase& phase, double T, double p)
{
    const double own = gibbs_energy(phase, T, p);
    double lowest = own - 1e-9 * (std::abs(enthalpy(phase, T, p)) + T * std::abs(entropy(phase, T, p)));
    const Phase* stable = nullptr;
    for (const Phase& other : substance.phases) {
        if (&other == &phase || !limits_of(other, p).trust.contains(T))
            continue;
        const double g = gibbs_energy(other, T, p);
        if (g < lowest) {
            lowest = g;
            stable = &other;
        }
    }
    return stable;
}

const char* kind_of_metastability(Aggregation phase, Aggregation stable)
{
    if (phase == Aggregation::liquid)
        return stable == Aggregation::crystal ? "undercooled liquid" : "superheated liquid";
    if (phase == Aggregation::crystal)
        return stable == Aggregation::crystal ? "modification outside its stable range" : "superheated solid";
    return "supersaturated vapour";
}

void remark_on_range(const Substance& substance, const Point<double>& point, Remarks& remarks)
{
    const registry::Limits limits = limits_of(*point.phase, point.p);
    if (limits.fit.contains(point.T))
        return;
    const bool below = point.T < limits.fit.lower;
    const double edge = below ? limits.fit.lower : limits.fit.upper;
    const registry::Uncertainty& u = point.phase->uncertainty;
    const double beyond = std::abs(point.T - edge);
    if (beyond <= at_equilibrium)
        return;
    const double grown = u.relative + beyond * (below ? u.growth_below : u.growth_above);
    const std::string usual = shown(100.0 * u.relative, 2), now = shown(100.0 * grown, 2);
    remarks.reserve(shown_state(substance, *point.phase) + " at " + shown_temperature(point.T) + " is "
                    + shown(beyond, 3) + " K " + (below ? "below" : "above") + " the range of its source ("
                    + shown_temperature(edge) + ")"
                    + (usual == now ? std::string()
                                    : "; the standard uncertainty of its heat capacity grows there from " + usual + " % to "
                                          + now + " %"));
}

void remark_on_stability(const Substance& substance, const Point<double>& point, Remarks& remarks)
{
    const Phase* stable = more_stable(substance, *point.phase, point.T, point.p);
    if (!stable)
        return;
    const Aggregation own = point.phase->aggregation;
    const auto T_equilibrium = equilibrium_temperature(substance, *point.phase, *stable, point.p);
    if (T_equilibrium && std::abs(point.T - *T_equilibrium) <= at_equilibrium)
        return;
    std::string text = shown_state(substance, *point.phase) + " at " + shown_temperature(point.T) + " and "
                     + shown_pressure(point.p) + ": " + kind_of_metastability(own, stable->aggregation);
    if (T_equilibrium)
        text += ", " + shown(std::abs(point.T - *T_equilibrium), 3) + " K away from equilibrium with "
              + shown_state(substance, *stable) + " at " + shown_temperature(*T_equilibrium);
    remarks.reserve(std::move(text));
    if (own == Aggregation::liquid && !(T_equilibrium && std::abs(point.T - *T_equilibrium) <= worth_a_caution))
        remarks.caution(stable->aggregation == Aggregation::crystal ? cautions::undercooled_liquid
                                                                    : cautions::superheated_liquid);
}

// A change of phase to one that is less stable there does not occur by itself, whatever the reservoir.
void remark_on_direction(const Substance& substance, const Point<double>& start, const Point<double>& end,
                         Remarks& remarks)
{
    const auto T = equilibrium_temperature(substance, *start.phase, *end.phase, start.p);
    if (T && std::abs(start.T - *T) <= at_equilibrium)
        return;
    if (gibbs_energy(*end.phase, end.T, end.p) > gibbs_energy(*start.phase, start.T, start.p))
        remarks.reserve("at " + shown_temperature(start.T) + " " + shown_state(substance, *start.phase)
                        + " is more stable than " + shown_state(substance, *end.phase)
                        + ": the change does not occur there by itself, whatever the reservoir");
}

void remark_on_point(const Substance& substance, const Point<double>& point, Remarks& remarks)
{
    const registry::Source& source = source_of(*point.phase, point.T, point.p);
    const std::string state = shown_state(substance, *point.phase);
    remarks.source(source, state, point.phase->remark);
    // The NASA set's remarks only name its own sources.
    if (&source != &registry::sources::nasa_glenn && !point.phase->remark.empty())
        remarks.note(state + ": " + std::string(point.phase->remark));
    remark_on_range(substance, point, remarks);
    remark_on_stability(substance, point, remarks);
    for (const char* caution : cautions::of_state(substance, *point.phase, point.T, point.p))
        remarks.caution(caution);
    if (point.p < lowest_usual_pressure)
        remarks.reserve("the pressure is " + shown_pressure(point.p) + "; was another unit meant?");
    if (is_ideal_gas(*point.phase) && point.p > highest_ideal_pressure)
        remarks.reserve(state + " is taken as an ideal gas, also at "
                        + shown_pressure(point.p) + "; what a real gas differs by is not included");
    if (const std::string_view which = formulation_of(*point.phase, point.T, point.p); !which.empty())
        remarks.note(state + " by " + std::string(which));
}

} // namespace

void remark_on_change(const Substance& substance, const Point<double>& start, const Point<double>& end,
                      Remarks& remarks)
{
    for (const Point<double>* point : {&start, &end}) {
        remark_on_point(substance, *point, remarks);
        if (point->vapour)
            remark_on_point(substance, {point->vapour, point->T, point->p}, remarks);
    }
    for (const Point<double>* point : {&start, &end}) {
        if (point->phase->aggregation == Aggregation::gas && !depends_on_pressure(*point->phase) && start.p != end.p)
            remarks.reserve(shown_state(substance, *point->phase) + ": without a molar mass the table's gas does not depend on "
                                                                    "pressure; the change of pressure is left out");
    }
    const bool to_or_from_gas = (start.phase->aggregation == Aggregation::gas) != (end.phase->aggregation == Aggregation::gas);
    const Phase& gas = start.phase->aggregation == Aggregation::gas ? *start.phase : *end.phase;
    if (to_or_from_gas && is_ideal_gas(gas))
        remarks.reserve("the vapour is taken as an ideal gas of single molecules, " + shown_state(substance, gas)
                        + "; vapours that associate or decompose (sulfur, salts, oxides) boil quite otherwise");
    if (!start.vapour && !end.vapour && start.phase != end.phase && start.T == end.T && start.p == end.p)
        remark_on_direction(substance, start, end, remarks);
}

} // namespace entropy_ledger::functions
