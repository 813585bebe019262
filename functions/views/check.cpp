#include "functions/views/views.hpp"

#include <algorithm>
#include <cmath>

namespace entropy_ledger::functions::views {

namespace {

// A heat so small beside the enthalpies that it is the difference of is none: a throttled stream exchanges no heat.
constexpr double no_heat = 1e-4;

// Temperatures this close do not count as crossing: rounding of °C to K. K.
constexpr double touching = 0.02;

} // namespace

void remark_on_reservoir(Remarks& remarks, const TemperatureSpan& span, const Term<double>& entropy, const Term<double>& heat,
                         std::optional<double> T_reservoir)
{
    if (!T_reservoir)
        return;
    remarks.ask_about_celsius("T_reservoir", *T_reservoir);
    if (generation(entropy, heat, *T_reservoir) < 0.0) {
        remarks.reserve("the generation is negative: with this reservoir the duty cannot occur as specified");
        return;
    }
    // The sign of the total does not show that a part of the heat would have to pass from colder to warmer.
    const double hottest = std::max(span.start, span.end);
    const double coldest = std::min(span.start, span.end);
    if (std::abs(heat.value) <= no_heat * heat.magnitude)
        return;
    const bool too_hot = heat.value > 0.0 && hottest > *T_reservoir + touching;
    const bool too_cold = heat.value < 0.0 && coldest < *T_reservoir - touching;
    if (too_hot || too_cold)
        remarks.reserve("temperatures cross: the system is at " + shown_temperature(too_hot ? hottest : coldest)
                        + ", and heat does not pass by itself " + (too_hot ? "to it from" : "from it to")
                        + " the reservoir at " + shown_temperature(*T_reservoir)
                        + "; the sign of the total does not show that");
}

} // namespace entropy_ledger::functions::views
