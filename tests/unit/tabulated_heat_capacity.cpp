// The model behind users' tables: exact integrals, the stated accuracy of the quadrature, no overshoot.
#include "registry/equilibrium.hpp"
#include "registry/tabulated_substance.hpp"

#include <boost/math/quadrature/gauss_kronrod.hpp>
#include <gtest/gtest.h>

#include <cmath>
#include <random>

namespace entropy_ledger::registry {
namespace {

constexpr double bar = 1e5;

SubstanceTable one_phase(std::vector<double> T, std::vector<double> cp, bool smooth)
{
    SubstanceTable table;
    table.name = "example";
    table.citation = "made up for the test";
    table.smooth = smooth;
    table.phases.push_back({"l", Aggregation::liquid, std::move(T), std::move(cp), 0.0, 0.0});
    return table;
}

TEST(TabulatedHeatCapacity, IntegralsAgreeWithAdaptiveQuadrature)
{
    std::mt19937_64 random(17);
    for (const bool smooth : {false, true}) {
        for (int round = 0; round < 60; ++round) {
            // From hundredths of a kelvin to wide spacings, with a peak now and then.
            std::vector<double> T{std::uniform_real_distribution<double>(50.0, 400.0)(random)}, cp;
            const double ratio = std::pow(10.0, std::uniform_real_distribution<double>(-4.5, 0.3)(random));
            for (int i = 0; i < 8; ++i)
                T.push_back(T.back() * (1.0 + ratio * std::uniform_real_distribution<double>(0.3, 1.0)(random)));
            for (std::size_t i = 0; i < T.size(); ++i)
                cp.push_back(std::uniform_real_distribution<double>(500.0, i == 4 ? 50000.0 : 5000.0)(random));
            const TabulatedSubstance own(one_phase(T, cp, smooth));
            const Phase& phase = own.substance().phases[0];
            double s = 0.0, h = 0.0;
            for (std::size_t i = 0; i + 1 < T.size(); ++i) {
                using Rule = boost::math::quadrature::gauss_kronrod<double, 31>;
                h += Rule::integrate([&](double t) { return heat_capacity(phase, t, bar); }, T[i], T[i + 1], 8, 1e-14);
                s += Rule::integrate([&](double t) { return heat_capacity(phase, t, bar) / t; }, T[i], T[i + 1], 8, 1e-14);
            }
            const double dh = enthalpy(phase, T.back(), bar) - enthalpy(phase, T.front(), bar);
            const double ds = entropy(phase, T.back(), bar) - entropy(phase, T.front(), bar);
            const double size = std::abs(enthalpy(phase, T.front(), bar)) + std::abs(dh);
            EXPECT_NEAR(dh, h, 2e-13 * size) << (smooth ? "smooth" : "linear") << " ratio " << ratio;
            EXPECT_NEAR(ds, s, 2e-13 * (std::abs(entropy(phase, T.front(), bar)) + std::abs(ds))) << ratio;
        }
    }
}

TEST(TabulatedHeatCapacity, PassesThroughItsPointsAndDoesNotOvershoot)
{
    const std::vector<double> T{250, 260, 270, 280, 290, 300, 400}, cp{2000, 2000, 2100, 9000, 2300, 2300, 2310};
    for (const bool smooth : {false, true}) {
        const TabulatedSubstance own(one_phase(T, cp, smooth));
        const Phase& phase = own.substance().phases[0];
        for (std::size_t i = 0; i < T.size(); ++i)
            EXPECT_NEAR(heat_capacity(phase, T[i], bar), cp[i], 1e-9) << T[i];
        for (double t = 250.0; t <= 400.0; t += 0.25) {
            EXPECT_GE(heat_capacity(phase, t, bar), 2000.0 - 1e-9);
            EXPECT_LE(heat_capacity(phase, t, bar), 9000.0 + 1e-9);
        }
    }
}

TEST(TabulatedHeatCapacity, SmoothFollowsASmoothFunctionBetter)
{
    std::vector<double> T, cp;
    const auto law = [](double t) { return 1000.0 + 0.5 * t + 2e-3 * t * t; };
    for (double t = 200.0; t <= 500.0; t += 25.0) {
        T.push_back(t);
        cp.push_back(law(t));
    }
    const TabulatedSubstance linear(one_phase(T, cp, false)), smooth(one_phase(T, cp, true));
    double worst_linear = 0.0, worst_smooth = 0.0;
    for (double t = 226.0; t < 474.0; t += 1.0) {
        worst_linear = std::max(worst_linear, std::abs(heat_capacity(linear.substance().phases[0], t, bar) - law(t)));
        worst_smooth = std::max(worst_smooth, std::abs(heat_capacity(smooth.substance().phases[0], t, bar) - law(t)));
    }
    EXPECT_LT(worst_smooth, 0.1 * worst_linear);
}

TEST(TabulatedHeatCapacity, GibbsEnergiesMeetAtTheTransitions)
{
    SubstanceTable table = one_phase({280, 330}, {2200, 2400}, false);
    table.phases.insert(table.phases.begin(), {"cr", Aggregation::crystal, {200, 296}, {1500, 1900}, 0.0, 0.0});
    table.phases[1].transition_temperature = 300.5;
    table.phases[1].transition_enthalpy = 210e3;
    const TabulatedSubstance own(table);
    const Substance& substance = own.substance();
    const Phase& cr = substance.phases[0];
    const Phase& l = substance.phases[1];
    EXPECT_NEAR(enthalpy(l, 300.5, bar) - enthalpy(cr, 300.5, bar), 210e3, 1e-8);
    EXPECT_NEAR(gibbs_energy(l, 300.5, bar), gibbs_energy(cr, 300.5, bar), 1e-8);
    const auto T = equilibrium_temperature(substance, cr, l, bar);
    ASSERT_TRUE(T);
    EXPECT_NEAR(*T, 300.5, 1e-9);
    EXPECT_EQ(enthalpy(cr, 296.0, bar), 0.0) << "the reference: the end next to 298.15 K";
}

} // namespace
} // namespace entropy_ledger::registry
