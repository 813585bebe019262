#include "registry/tabulated_substance.hpp"

#include "registry/constants.hpp"

#include <algorithm>
#include <cmath>

namespace entropy_ledger::registry {

namespace {

constexpr double reference_temperature = 298.15; // K
constexpr double bar = table_pressure;
constexpr double widest_ratio = 1.5;             // of neighbouring knots: see TabulatedHeatCapacity

// Slopes at the knots: no overshoot, zero at an extremum (Fritsch and Butland 1984, equation for unequal spacing as in
// F. N. Fritsch, PCHIP, UCRL-ID-202); the ends by the three-point formula, limited to keep the shape.
std::vector<double> smooth_slopes(const std::vector<double>& T, const std::vector<double>& y)
{
    const std::size_t n = T.size();
    std::vector<double> width(n - 1), rise(n - 1), slope(n);
    for (std::size_t i = 0; i + 1 < n; ++i) {
        width[i] = T[i + 1] - T[i];
        rise[i] = (y[i + 1] - y[i]) / width[i];
    }
    if (n == 2)
        return {rise[0], rise[0]};
    for (std::size_t i = 1; i + 1 < n; ++i) {
        if (!(rise[i - 1] * rise[i] > 0.0))
            continue;
        const double w1 = 2.0 * width[i] + width[i - 1];
        const double w2 = width[i] + 2.0 * width[i - 1];
        slope[i] = (w1 + w2) / (w1 / rise[i - 1] + w2 / rise[i]);
    }
    const auto end_slope = [](double h0, double h1, double d0, double d1) {
        const double slope_at_end = ((2.0 * h0 + h1) * d0 - h0 * d1) / (h0 + h1);
        if (slope_at_end * d0 <= 0.0)
            return 0.0;
        return d0 * d1 < 0.0 && std::abs(slope_at_end) > 3.0 * std::abs(d0) ? 3.0 * d0 : slope_at_end;
    };
    slope[0] = end_slope(width[0], width[1], rise[0], rise[1]);
    slope[n - 1] = end_slope(width[n - 2], width[n - 3], rise[n - 2], rise[n - 3]);
    return slope;
}

// The same curve from a temperature `du` further on.
TableKnot moved(const TableKnot& k, double du)
{
    TableKnot next = k;
    next.T = k.T + du;
    next.y = k.y + du * (k.m + du * (k.c2 + du * k.c3));
    next.m = k.m + du * (2.0 * k.c2 + du * 3.0 * k.c3);
    next.c2 = k.c2 + 3.0 * k.c3 * du;
    return next;
}

// The knots with h = 0 and s = 0 at the first.
std::vector<TableKnot> make_knots(const TabulatedPhase& phase, bool smooth)
{
    const auto& T = phase.T;
    const auto& y = phase.cp;
    const std::vector<double> slope = smooth ? smooth_slopes(T, y) : std::vector<double>();
    std::vector<TableKnot> knots;
    knots.reserve(T.size() - 1);
    for (std::size_t i = 0; i + 1 < T.size(); ++i) {
        const double w = T[i + 1] - T[i];
        const double rise = (y[i + 1] - y[i]) / w;
        TableKnot knot{T[i], y[i], rise, 0.0, 0.0, 0.0, 0.0};
        if (smooth) {
            knot.m = slope[i];
            knot.c2 = (3.0 * rise - 2.0 * slope[i] - slope[i + 1]) / w;
            knot.c3 = (slope[i] + slope[i + 1] - 2.0 * rise) / (w * w);
        }
        knots.push_back(knot);
        // Division of a wide spacing, so that the quadrature of cp/T keeps its accuracy.
        while (T[i + 1] > widest_ratio * knots.back().T)
            knots.push_back(moved(knots.back(), (std::sqrt(widest_ratio) - 1.0) * knots.back().T));
    }
    for (std::size_t i = 1; i < knots.size(); ++i) {
        const TableKnot& k = knots[i - 1];
        const TabulatedHeatCapacity one{&k, nullptr, 1, knots[i].T, 0.0, {}, nullptr};
        knots[i].h = one.enthalpy(knots[i].T, bar);
        knots[i].s = one.entropy(knots[i].T, bar);
    }
    return knots;
}

void shift(std::vector<TableKnot>& knots, double dh, double ds)
{
    for (TableKnot& knot : knots) {
        knot.h += dh;
        knot.s += ds;
    }
}

} // namespace

Range trust_of_table(const TabulatedPhase& phase)
{
    const double lower = phase.T.front();
    const double upper = phase.T.back();
    if (phase.aggregation == Aggregation::liquid)
        return {0.9 * lower, 1.05 * upper};
    if (phase.aggregation == Aggregation::gas)
        return {0.97 * lower, upper};
    return {std::max(lower - std::max(0.03 * lower, 5.0), 0.5 * lower), upper + std::max(0.03 * upper, 5.0)};
}

TabulatedSubstance::TabulatedSubstance(SubstanceTable table)
    : table_(std::move(table)), source_{table_.citation, table_.citation}
{
    const Uncertainty uncertainty{table_.uncertainty, 0.0005, 0.0005,
                                  table_.uncertainty_given ? Origin::stated : Origin::assigned,
                                  table_.uncertainty_given ? "stated in the table"
                                                           : "assigned here, the table states none"};
    curves_.reserve(table_.phases.size());
    phases_.reserve(table_.phases.size());
    for (std::size_t i = 0; i < table_.phases.size(); ++i) {
        const TabulatedPhase& given = table_.phases[i];
        Curve& curve = curves_.emplace_back();
        curve.knots = make_knots(given, table_.smooth);
        for (std::size_t k = 1; k < curve.knots.size(); ++k)
            curve.bounds.push_back(curve.knots[k].T);
        const double gas_constant = given.aggregation == Aggregation::gas && table_.molar_mass > 0.0
                                      ? molar_gas_constant / table_.molar_mass
                                      : 0.0;
        const TabulatedHeatCapacity model{curve.knots.data(), curve.bounds.data(), curve.knots.size(), given.T.back(),
                                          gas_constant, trust_of_table(given), &source_};
        phases_.push_back({given.symbol, given.aggregation, model, uncertainty, {}});
        const double T = i == 0 ? std::clamp(reference_temperature, given.T.front(), given.T.back())
                                : given.transition_temperature;
        const double h = i == 0 ? 0.0 : enthalpy(phases_[i - 1], T, bar) + given.transition_enthalpy;
        const double s = i == 0 ? 0.0 : entropy(phases_[i - 1], T, bar) + given.transition_enthalpy / T;
        shift(curve.knots, h - enthalpy(phases_[i], T, bar), s - entropy(phases_[i], T, bar));
        if (i > 0)
            transitions_.push_back({i - 1, i, T});
    }
    substance_ = {table_.name, {}, {}, table_.molar_mass, phases_, transitions_};
}

} // namespace entropy_ledger::registry
