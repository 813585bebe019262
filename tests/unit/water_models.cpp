// The water models as models: seams, equilibria, thermodynamic consistency, limits, and evaluation on another Number.
#include "registry/models/ice.hpp"
#include "registry/models/liquid_water.hpp"
#include "registry/models/steam.hpp"

#include "support/dual.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <span>
#include <vector>

namespace {

using entropy_ledger::testing::Dual;
using namespace entropy_ledger::registry;

template <class Model>
double gibbs_energy(const Model& model, double T, double p)
{
    return model.enthalpy(T, p) - T * model.entropy(T, p);
}

// Temperature between lower and upper at which the two Gibbs energies are equal, by halving.
template <class Cold, class Hot>
double equilibrium(const Cold& cold, const Hot& hot, double p, double lower, double upper)
{
    for (int step = 0; step < 60; ++step) {
        const double middle = 0.5 * (lower + upper);
        (gibbs_energy(cold, middle, p) < gibbs_energy(hot, middle, p) ? lower : upper) = middle;
    }
    return 0.5 * (lower + upper);
}

std::vector<double> pressures(double from, double to, int count)
{
    std::vector<double> result;
    for (int k = 0; k < count; ++k)
        result.push_back(from * std::pow(to / from, static_cast<double>(k) / (count - 1)));
    result.back() = to;
    return result;
}

const double inside[] = {0.0, 1e-9, 0.02, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.98, 1.0 - 1e-9, 1.0};

double at(Range range, double fraction)
{
    return fraction == 1.0 ? range.upper : range.lower + fraction * (range.upper - range.lower);
}

TEST(LiquidWater, SeamAt27315IsBelowWhatADifferenceShows)
{
    const LiquidWater water;
    const double below = std::nextafter(273.15, 0.0);
    for (const double p : {611.657, 1e4, 1e5, 101325.0, 2e5, 3e5}) {
        ASSERT_EQ(water.formulation_at(below, p), LiquidWater::Formulation::sr6);
        ASSERT_EQ(water.formulation_at(273.15, p), LiquidWater::Formulation::region1);
        EXPECT_NEAR(water.enthalpy(273.15, p) - water.enthalpy(below, p), -0.15, 0.03) << p;       // J/kg
        EXPECT_NEAR(water.entropy(273.15, p) - water.entropy(below, p), -0.00065, 0.00007) << p;   // J/(kg K)
        EXPECT_NEAR(water.heat_capacity(273.15, p) - water.heat_capacity(below, p), 0.12, 0.01) << p;
        EXPECT_NEAR(gibbs_energy(water, 273.15, p) - gibbs_energy(water, below, p), 0.025, 0.01) << p;
    }
    const double most = std::nextafter(1e6, 0.0);
    EXPECT_NEAR(water.enthalpy(273.15, most) - water.enthalpy(below, most), -0.79, 0.01);
    EXPECT_NEAR(water.entropy(273.15, most) - water.entropy(below, most), -0.0022, 0.0001);
}

TEST(LiquidWater, HeldHeatCapacityJoinsSmoothly)
{
    const LiquidWater water;
    const double below = std::nextafter(253.15, 0.0);
    ASSERT_EQ(water.formulation_at(below, 1e5), LiquidWater::Formulation::sr6_held);
    EXPECT_NEAR(water.enthalpy(below, 1e5), water.enthalpy(253.15, 1e5), 1e-6);
    EXPECT_NEAR(water.entropy(below, 1e5), water.entropy(253.15, 1e5), 1e-9);
    EXPECT_NEAR(water.heat_capacity(250.15, 1e5), water.heat_capacity(253.15, 1e5), 1e-9);
    EXPECT_NEAR(water.enthalpy(253.15, 1e5) - water.enthalpy(250.15, 1e5), 3.0 * water.heat_capacity(253.15, 1e5),
                1e-6);
}

TEST(LiquidWater, SuperheatedAndSupercooledStatesOfEveryDay)
{
    const Limits limits = LiquidWater().limits(1e5);
    EXPECT_DOUBLE_EQ(limits.fit.lower, 253.15);
    EXPECT_NEAR(limits.fit.upper, 372.755919, 1e-6); // R7-97 Table 36
    EXPECT_FALSE(limits.fit.contains(500.0));
    EXPECT_TRUE(limits.trust.contains(500.0));
    EXPECT_TRUE(limits.trust.contains(251.0));
    EXPECT_FALSE(limits.trust.contains(245.0));
    EXPECT_FALSE(limits.trust.contains(580.0));
    EXPECT_TRUE(LiquidWater().limits(10e6).trust.contains(265.0));
    EXPECT_FALSE(LiquidWater().limits(10e6).trust.contains(255.0));
}

TEST(LiquidWater, NamesTheFormulation)
{
    const LiquidWater water;
    EXPECT_EQ(water.formulation(260.0, 1e5), "IAPWS SR6-08");
    EXPECT_EQ(&water.source(260.0, 1e5), &sources::iapws_sr6);
    EXPECT_EQ(water.formulation(300.0, 1e5), "IAPWS R7-97 region 1");
    EXPECT_EQ(&water.source(300.0, 1e5), &sources::iapws_r7);
    EXPECT_EQ(water.formulation(623.15, 20e6), "IAPWS R7-97 region 1");
    EXPECT_EQ(water.formulation(630.0, 20e6), "IAPWS R7-97 region 3");
    EXPECT_EQ(water.formulation(270.0, 5e6), "IAPWS R7-97 region 1");
    EXPECT_EQ(water.sources().size(), 2u);
}

TEST(Steam, NamesTheFormulation)
{
    const Steam steam;
    EXPECT_EQ(steam.formulation(400.0, 1e5), "IAPWS R7-97 region 2");
    EXPECT_EQ(steam.formulation(360.0, 1e5), "IAPWS R7-97 metastable vapour");
    EXPECT_EQ(steam.formulation(iapws_r7::saturation_temperature(1e5), 1e5), "IAPWS R7-97 region 2");
    EXPECT_EQ(steam.formulation(660.0, 20e6), "IAPWS R7-97 region 2");
    EXPECT_EQ(steam.formulation(640.0, 20e6), "IAPWS R7-97 region 3");
    EXPECT_EQ(steam.formulation(700.0, 50e6), "IAPWS R7-97 region 3");
    EXPECT_EQ(steam.formulation(1073.15, 1e5), "IAPWS R7-97 region 2");
    EXPECT_EQ(steam.formulation(1100.0, 1e5), "IAPWS R7-97 region 5");
}

// IAPWS-95 with R10-06 has the melting point at 273.152519 K (R10-06 Table 6) and the triple point at 273.16 K.
TEST(Equilibrium, IceAndLiquidMeetWhereTheReleasesSay)
{
    const IceIh ice;
    const LiquidWater water;
    EXPECT_NEAR(equilibrium(ice, water, 101325.0, 270.0, 276.0), 273.152519, 2e-5);
    EXPECT_NEAR(equilibrium(ice, water, 611.657, 270.0, 276.0), 273.16, 2e-5);
    EXPECT_NEAR(equilibrium(ice, water, 1e5, 270.0, 276.0), 273.152618, 2e-5);
    // from 1 MPa on the liquid is region 1 below its end: IAPWS-95 gives 272.935836 K at 3 MPa
    EXPECT_NEAR(equilibrium(ice, water, 3e6, 270.0, 276.0), 272.935836, 2e-5);
    EXPECT_NEAR(equilibrium(ice, water, 3e5, 270.0, 276.0), 273.137753, 2e-5);
}

TEST(Equilibrium, LiquidAndSteamMeetAtTheSaturationCurve)
{
    const LiquidWater water;
    const Steam steam;
    for (const double p : pressures(612.0, 22.06e6, 300)) {
        const double T = iapws_r7::saturation_temperature(p);
        const double lower = std::max(T - 0.05, steam.limits(p).trust.lower);
        const double upper = std::min(T + 0.05, water.limits(p).trust.upper);
        EXPECT_LT(lower, upper);
        const double found = equilibrium(water, steam, p, lower, upper);
        EXPECT_NEAR(found, T, 0.004) << p;
        // on one side of every seam, so that nothing is generated there
        EXPECT_NEAR(gibbs_energy(water, found, p), gibbs_energy(steam, found, p), 1e-4) << p;
    }
}

TEST(Equilibrium, SublimationOverIce)
{
    // IAPWS R14-08: 260 K at 195.80 Pa by its sublimation equation
    const double found = equilibrium(IceIh(), Steam(), 195.80, 255.0, 265.0);
    EXPECT_NEAR(found, 260.0, 0.01);
}

TEST(Supercritical, LiquidAndSteamAreOneFluid)
{
    const LiquidWater water;
    const Steam steam;
    for (const double p : {22.064e6, 22.1e6, 25e6, 50e6, 100e6})
        for (const double T : {623.2, 640.0, 647.0, 650.0})
            EXPECT_NEAR(water.entropy(T, p), steam.entropy(T, p), 1e-7) << T << ' ' << p;
}

TEST(Steam, SupersaturatedFitStaysInsideFivePercentMoisture)
{
    for (const double p : pressures(12e3, 10e6, 60)) {
        const double saturation = iapws_r7::saturation_temperature(p);
        const double vapour = Steam().enthalpy(saturation, p);
        const double moist = vapour - 0.05 * (vapour - LiquidWater().enthalpy(saturation, p));
        const double end = Steam().limits(p).fit.lower;
        EXPECT_LT(end, saturation);
        EXPECT_GE(Steam().enthalpy(end, p), moist) << p;
    }
}

TEST(Steam, StepToTheMetastableEquationIsAsStated)
{
    using Metastable = iapws_r7::metastable_vapour::Equation;
    using Region2 = iapws_r7::region2::Equation;
    for (const double p : pressures(611.657, 10e6, 60)) {
        const double T = iapws_r7::saturation_temperature(p);
        EXPECT_LE(std::abs(Metastable::enthalpy(T, p) - Region2::enthalpy(T, p)), 44.0) << p;
        EXPECT_LE(std::abs(Metastable::entropy(T, p) - Region2::entropy(T, p)), 0.082) << p;
        EXPECT_LE(std::abs(Metastable::gibbs_energy(T, p) - Region2::gibbs_energy(T, p)), 24.0) << p;
    }
}

// cp = dh/dT = T ds/dT by central differences wherever one formulation answers around T; everything finite in trust.
template <class Model, class SameFormulation>
void expect_consistent(const Model& model, double greatest_pressure, SameFormulation same)
{
    int compared = 0;
    for (const double p : pressures(1e-3, greatest_pressure, 120)) {
        const Limits limits = model.limits(p);
        ASSERT_FALSE(limits.fit.empty());
        ASSERT_LE(limits.trust.lower, limits.fit.lower);
        ASSERT_GE(limits.trust.upper, limits.fit.upper);
        for (const double fraction : inside) {
            const double T = at(limits.trust, fraction);
            const double cp = model.heat_capacity(T, p);
            ASSERT_TRUE(std::isfinite(model.entropy(T, p)) && std::isfinite(model.enthalpy(T, p)) && std::isfinite(cp))
                << T << " K " << p << " Pa";
            ASSERT_GT(cp, 0.0) << T << " K " << p << " Pa";
            const double step = 1e-4 * T;
            if (T - step < limits.trust.lower || T + step > limits.trust.upper || !same(T - step, T + step, p))
                continue;
            const double dh = (model.enthalpy(T + step, p) - model.enthalpy(T - step, p)) / (2.0 * step);
            const double ds = (model.entropy(T + step, p) - model.entropy(T - step, p)) / (2.0 * step);
            // beside the critical point the third derivative makes the difference quotient coarse
            const bool critical = std::abs(T - 647.096) < 10.0 && std::abs(p - 22.064e6) < 4e6;
            const double tolerance = (critical ? 3e-2 : 2e-4) * cp + 1e-5;
            EXPECT_NEAR(dh, cp, tolerance) << T << " K " << p << " Pa";
            EXPECT_NEAR(T * ds, cp, tolerance) << T << " K " << p << " Pa";
            ++compared;
        }
    }
    EXPECT_GT(compared, 800);
}

TEST(Consistency, LiquidWater)
{
    expect_consistent(LiquidWater(), 100e6, [](double a, double b, double p) {
        return LiquidWater::formulation_at(a, p) == LiquidWater::formulation_at(b, p);
    });
}

TEST(Consistency, IceIh)
{
    expect_consistent(IceIh(), 210e6, [](double, double, double) { return true; });
}

TEST(Consistency, Steam)
{
    expect_consistent(Steam(), 100e6, [](double a, double b, double p) {
        return Steam::formulation_at(a, p) == Steam::formulation_at(b, p);
    });
}

// ds/dp = -dv/dT and dg/dp = v
TEST(Consistency, VolumeBelongsToTheGibbsEnergy)
{
    const auto expect = [](auto gibbs, auto volume, double T, double p) {
        const double step = 1e-3 * p;
        const double slope = (gibbs(T, p + step) - gibbs(T, p - step)) / (2.0 * step);
        EXPECT_NEAR(slope / volume(T, p), 1.0, 1e-5) << T << ' ' << p;
    };
    for (const double p : {1e6, 20e6, 90e6})
        expect([](double T, double q) { return iapws_r7::region1::gibbs_energy(T, q); },
               [](double T, double q) { return iapws_r7::region1::volume(T, q); }, 400.0, p);
    for (const double p : {1e3, 1e5, 3e6})
        expect([](double T, double q) { return iapws_r7::region2::Equation::gibbs_energy(T, q); },
               [](double T, double q) { return iapws_r7::region2::Equation::volume(T, q); }, 700.0, p);
    for (const double p : {1e5, 40e6})
        expect([](double T, double q) { return iapws_r7::region5::gibbs_energy(T, q); },
               [](double T, double q) { return iapws_r7::region5::volume(T, q); }, 1500.0, p);
    for (const double p : {1e6, 200e6})
        expect([](double T, double q) { return iapws_r10::gibbs_energy(T, q); },
               [](double T, double q) { return iapws_r10::volume(T, q); }, 200.0, p);
    EXPECT_NEAR(iapws_sr6::gibbs_energy(263.0, 3e5) - iapws_sr6::gibbs_energy(263.0, 1e5),
                2e5 * iapws_sr6::volume(263.0), 1e-9);
    EXPECT_NEAR(iapws_sr6::entropy(263.0, 3e5) - iapws_sr6::entropy(263.0, 1e5),
                -2e5 * iapws_sr6::volume_slope(263.0), 1e-9);
}

TEST(Limits, PressureOutOfRangeIsRefused)
{
    const double infinity = std::numeric_limits<double>::infinity();
    for (const double p : {0.0, -1e5, std::nan(""), infinity, -infinity, 1e300, 211e6}) {
        EXPECT_TRUE(LiquidWater().limits(p).trust.empty()) << p;
        EXPECT_TRUE(IceIh().limits(p).trust.empty()) << p;
        EXPECT_TRUE(Steam().limits(p).trust.empty()) << p;
    }
    EXPECT_TRUE(LiquidWater().limits(101e6).trust.empty());
    EXPECT_TRUE(Steam().limits(101e6).trust.empty());
    EXPECT_FALSE(IceIh().limits(101e6).trust.empty());
}

// R7-97 and R10-06 share the reference state of IAPWS-95: u = s = 0 for the liquid at the triple point.
TEST(ReferenceState, LiquidAtTheTriplePoint)
{
    const LiquidWater water;
    const double T = 273.16;
    const double p = 611.657;
    EXPECT_NEAR(water.enthalpy(T, p) - p * iapws_r7::region1::volume(T, p), 0.0, 1e-6);
    EXPECT_NEAR(water.entropy(T, p), -6.16e-5, 1e-7);
    EXPECT_NEAR(gibbs_energy(IceIh(), T, p), gibbs_energy(water, T, p), 0.02); // J/kg
}

// Derivatives through the models: of h and T ds/dT against cp, and ds/dp, dh/dp against each other.
template <class Model>
void expect_derivatives(const Model& model, double T, double p, double tolerance)
{
    const Dual along_T(T, 1.0);
    const Dual along_p(p, 1.0);
    const double cp = model.heat_capacity(T, p);
    EXPECT_NEAR(model.enthalpy(along_T, Dual(p)).slope / cp, 1.0, tolerance) << T << ' ' << p;
    EXPECT_NEAR(T * model.entropy(along_T, Dual(p)).slope / cp, 1.0, tolerance) << T << ' ' << p;
    EXPECT_NEAR(model.heat_capacity(along_T, Dual(p)).value / cp, 1.0, 1e-12) << T << ' ' << p;
    // dh/dp - T ds/dp = v, which is (dg/dp)
    const double v = model.enthalpy(Dual(T), along_p).slope - T * model.entropy(Dual(T), along_p).slope;
    const double step = 1e-4 * p;
    const double dg = (gibbs_energy(model, T, p + step) - gibbs_energy(model, T, p - step)) / (2.0 * step);
    EXPECT_NEAR(v / dg, 1.0, 1e-3) << T << ' ' << p;
    EXPECT_DOUBLE_EQ(model.entropy(Dual(T), Dual(p)).value, model.entropy(T, p));
}

TEST(OtherNumber, CarriesDerivatives)
{
    expect_derivatives(LiquidWater(), 252.0, 1e5, 1e-12);
    expect_derivatives(LiquidWater(), 260.0, 2e5, 1e-9);
    expect_derivatives(LiquidWater(), 350.0, 5e6, 1e-9);
    expect_derivatives(LiquidWater(), 630.0, 20e6, 1e-9);
    expect_derivatives(IceIh(), 150.0, 10e6, 1e-9);
    expect_derivatives(Steam(), 355.0, 1e5, 1e-9);
    expect_derivatives(Steam(), 500.0, 1e5, 1e-9);
    expect_derivatives(Steam(), 660.0, 25e6, 1e-9);
    expect_derivatives(Steam(), 1500.0, 1e6, 1e-9);
}

} // namespace
