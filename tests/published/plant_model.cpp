// Whether the tables that compile_data.py makes of heat capacities hold together: enthalpy and entropy against a
// quadrature of the heat capacity, no step between the ranges of a phase, and at a transition its stated enthalpy.
#include "published/plant_phases.hpp"

#include "registry/equilibrium.hpp"

#include <boost/math/quadrature/gauss.hpp>
#include <gtest/gtest.h>

#include <cmath>

namespace entropy_ledger::testing {
namespace {

using registry::Phase;
using registry::Substance;

// Entropies are compared on the scale of the heat capacity, enthalpies on that of the heat capacity times T.
constexpr double agreement = 1e-12;

// The integral of f over a range in whose pieces it is a polynomial of low degree, or such a one over T.
template <class Function>
double integral(const Function& f, double lower, double upper, const registry::NasaPolynomial& model)
{
    double sum = 0.0, from = lower;
    const auto add = [&](double to) {
        if (to > from)
            sum += boost::math::quadrature::gauss<double, 30>::integrate(f, from, to);
        from = std::max(from, to);
    };
    add(std::clamp(model.intervals[0].lower, lower, upper));
    for (std::size_t i = 0; i < model.count; ++i)
        add(std::clamp(model.intervals[i].upper, lower, upper));
    add(upper);
    return sum;
}

TEST(PlantModel, EnthalpyAndEntropyAreTheIntegralsOfTheHeatCapacity)
{
    for (const PlantPhase& phase : plant_phases()) {
        SCOPED_TRACE(phase.state());
        const registry::Range trust = registry::limits_of(*phase.phase, bar).trust;
        const auto cp = [&](double T) { return registry::heat_capacity(*phase.phase, T, bar); };
        const auto cp_by_T = [&](double T) { return cp(T) / T; };
        const double h0 = registry::enthalpy(*phase.phase, trust.lower, bar);
        const double s0 = registry::entropy(*phase.phase, trust.lower, bar);
        for (int i = 1; i <= 20; ++i) {
            const double T = trust.lower + (trust.upper - trust.lower) * i / 20.0;
            const double h = registry::enthalpy(*phase.phase, T, bar) - h0;
            const double s = registry::entropy(*phase.phase, T, bar) - s0;
            EXPECT_NEAR(h, integral(cp, trust.lower, T, *phase.model), agreement * cp(T) * T) << T;
            EXPECT_NEAR(s, integral(cp_by_T, trust.lower, T, *phase.model), agreement * cp(T)) << T;
            EXPECT_GT(cp(T), 0.0) << T;
        }
    }
}

TEST(PlantModel, NoStepBetweenRanges)
{
    std::size_t seen = 0;
    for (const PlantPhase& phase : plant_phases()) {
        for (std::size_t i = 0; i + 1 < phase.model->count; ++i) {
            registry::NasaPolynomial below = *phase.model, above = *phase.model;
            below.intervals += i;
            above.intervals += i + 1;
            below.count = above.count = 1;
            const double T = phase.model->intervals[i].upper;
            ASSERT_EQ(T, phase.model->intervals[i + 1].lower) << phase.state();
            ASSERT_EQ(T, phase.model->bounds[i]) << phase.state();
            const double cp = above.heat_capacity(T, bar);
            EXPECT_NEAR(below.enthalpy(T, bar), above.enthalpy(T, bar), agreement * cp * T) << phase.state() << T;
            EXPECT_NEAR(below.entropy(T, bar), above.entropy(T, bar), agreement * cp) << phase.state() << T;
            ++seen;
        }
    }
    EXPECT_GE(seen, 60u);
}

TEST(PlantModel, TheFirstPhaseIsTheReference)
{
    for (const PlantPhase& phase : plant_phases()) {
        if (phase.phase != &phase.substance->phases.front())
            continue;
        const registry::Range fit = registry::limits_of(*phase.phase, bar).fit;
        const double T = std::clamp(298.15, fit.lower, fit.upper);
        const double cp = registry::heat_capacity(*phase.phase, T, bar);
        EXPECT_NEAR(registry::enthalpy(*phase.phase, T, bar), 0.0, agreement * cp * T) << phase.state();
        EXPECT_NEAR(registry::entropy(*phase.phase, T, bar), 0.0, agreement * cp) << phase.state();
    }
}

struct Melting {
    const char* name;
    double T;         // K
    double enthalpy;  // J/kg
};

// As in the data files, which cite them.
const Melting meltings[] = {
    {"hexadecane", 291.34, 235600.0},
    {"octadecane", 301.3, 242500.0},
    {"eicosane", 309.65, 247470.0},
    {"sodium sulfate decahydrate", 305.5, 252000.0},
    {"lithium nitrate trihydrate", 303.3, 287000.0},
    {"erythritol", 390.25, 310500.0},
    {"palmitic acid", 335.7, 208200.0},
    {"stearic acid", 342.5, 210800.0},
};

TEST(PlantModel, MeltingTakesUpItsEnthalpyAtItsTemperature)
{
    std::size_t transitions = 0;
    for (const PlantPhase& phase : plant_phases()) {
        if (phase.phase == &phase.substance->phases.front())
            transitions += phase.substance->transitions.size();
    }
    EXPECT_EQ(transitions, std::size(meltings));
    for (const Melting& melting : meltings) {
        SCOPED_TRACE(melting.name);
        const Substance* substance = registry::find_substance(melting.name).substance;
        ASSERT_NE(substance, nullptr);
        const Phase* solid = phase_of(melting.name, "cr");
        const Phase* liquid = phase_of(melting.name, "l");
        ASSERT_TRUE(solid && liquid);
        const double T = melting.T;
        EXPECT_NEAR(registry::enthalpy(*liquid, T, bar) - registry::enthalpy(*solid, T, bar), melting.enthalpy,
                    agreement * melting.enthalpy);
        EXPECT_NEAR(registry::entropy(*liquid, T, bar) - registry::entropy(*solid, T, bar), melting.enthalpy / T,
                    agreement * melting.enthalpy / T);
        const auto balance = registry::equilibrium_temperature(*substance, *solid, *liquid, bar);
        ASSERT_TRUE(balance);
        EXPECT_NEAR(*balance, T, 1e-9);
    }
}

TEST(PlantModel, ScalesAndTables)
{
    // A table: the knots themselves, and half way between two.
    EXPECT_NEAR(cp_of("propylene glycol 30 %", "l", zero_celsius + 20.0), 3850.0, 1e-9);
    EXPECT_NEAR(cp_of("propylene glycol 30 %", "l", zero_celsius + 35.0), 3890.0, 1e-9);
    EXPECT_NEAR(cp_of("brass", "cr", 500.0), 410.0, 1e-9);
    // A polynomial in °C: EN 1993-1-2, 3.4.1.2 by hand at 400 °C: 425 + 309.2 - 270.4 + 142.08.
    EXPECT_NEAR(cp_of("carbon steel", "cr", zero_celsius + 400.0), 605.88, 1e-9);
    EXPECT_NEAR(cp_of("dry wood", "cr", 300.0), 103.1 + 3.867 * 300.0, 1e-9);
    // Without a molar mass.
    EXPECT_EQ(registry::find_substance("concrete").substance->molar_mass, 0.0);
}

} // namespace
} // namespace entropy_ledger::testing
