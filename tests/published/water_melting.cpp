// The melting and sublimation curves of IAPWS R14-08, and the equilibria of our phases against them.
#include "registry/equilibrium.hpp"
#include "registry/models/iapws_r14.hpp"
#include "support/calling.hpp"

#include <algorithm>
#include <limits>

namespace entropy_ledger::testing {
namespace {

namespace iapws_r14 = registry::iapws_r14;
using iapws_r14::Ice;
using iapws_r14::melting_pressure;
using iapws_r14::melting_temperature;
using iapws_r14::sublimation_pressure;
using iapws_r14::sublimation_temperature;

// The check values of R14-08, from memory; to the last digit printed.
TEST(IapwsR14, CheckValuesOfTheRelease)
{
    EXPECT_NEAR(melting_pressure(Ice::Ih, 260.0), 138.268e6, 0.0005e6);
    EXPECT_NEAR(melting_pressure(Ice::III, 254.0), 268.685e6, 0.0005e6);
    EXPECT_NEAR(melting_pressure(Ice::V, 265.0), 479.640e6, 0.0005e6);
    EXPECT_NEAR(melting_pressure(Ice::VI, 320.0), 1356.76e6, 0.005e6);
    EXPECT_NEAR(melting_pressure(Ice::VII, 550.0), 6308.71e6, 0.005e6);
    EXPECT_NEAR(sublimation_pressure(230.0), 8.94735, 0.000005);
}

// Fifteen digits by python3-iapws 1.5.3, _Melting_Pressure and _Sublimation_Pressure. A slip in the last digit of any
// coefficient would show: the terms are up to a million times their sum.
TEST(IapwsR14, MeltingPressuresByAnotherProgram)
{
    struct {
        double T; // K
        Ice ice;
        double p; // Pa
    } const table[] = {
        {251.165, Ice::Ih, 208566566.032977}, {252, Ice::Ih, 202370923.221418},   {255, Ice::Ih, 179413417.629178},
        {258.5, Ice::Ih, 151042181.441954},   {260, Ice::Ih, 138268113.002218},   {263, Ice::Ih, 111398053.447138},
        {266, Ice::Ih, 82402905.5636381},     {269, Ice::Ih, 50662812.1655809},   {271.5, Ice::Ih, 21387578.6765965},
        {273, Ice::Ih, 2145312.27411865},     {273.15, Ice::Ih, 135228.878963585}, {273.16, Ice::Ih, 611.657},
        {251.17, Ice::III, 208640766.437155}, {252.5, Ice::III, 231992546.307701}, {254, Ice::III, 268684646.633611},
        {255.5, Ice::III, 320668288.366999},  {256.164, Ice::III, 350100015.705813},
        {256.2, Ice::V, 350567528.051425},    {258, Ice::V, 374538694.546356},    {262, Ice::V, 432177923.230498},
        {265, Ice::V, 479640244.378799},      {268, Ice::V, 531016556.323095},    {271, Ice::V, 586580323.947069},
        {273.15, Ice::V, 629137348.615249},   {273.25, Ice::V, 631174530.668817}, {273.31, Ice::V, 632399347.384657},
        {273.32, Ice::VI, 632514402.171427},  {280, Ice::VI, 712374147.811984},   {290, Ice::VI, 845448928.842685},
        {300, Ice::VI, 996109507.127714},     {320, Ice::VI, 1356756517.86939},   {340, Ice::VI, 1808350012.28407},
        {355, Ice::VI, 2216002257.16023},     {355.1, Ice::VII, 2217254295.96179}, {400, Ice::VII, 2816642589.77184},
        {450, Ice::VII, 3618760993.27379},    {500, Ice::VII, 4695584945.13183},  {550, Ice::VII, 6308714243.54302},
        {600, Ice::VII, 8963998425.47582},    {650, Ice::VII, 13487653259.7864},  {715, Ice::VII, 20617812820.4493},
    };
    for (const auto& state : table) {
        // rounding: 1e6 times 611.657 Pa for ice Ih
        EXPECT_NEAR(melting_pressure(state.ice, state.T), state.p, 1e-13 * state.p + 1e-6) << state.T;
        const auto range = iapws_r14::melting_range(state.ice);
        EXPECT_TRUE(range.contains(state.T)) << state.T;
    }
}

TEST(IapwsR14, SublimationPressuresByAnotherProgram)
{
    struct {
        double T; // K
        double p; // Pa
    } const table[] = {
        {50, 1.93495848680889e-40}, {60, 6.51387385112494e-32},  {80, 3.49781888708447e-21},
        {100, 1.08566257582787e-14}, {120, 2.48131050018331e-10}, {150, 6.09572451169956e-06},
        {180, 0.00539278431370982}, {200, 0.162604017609197},    {220, 2.65407238448116},
        {230, 8.94735274018915},    {240, 27.2668442748567},     {250, 76.0126695102467},
        {253.15, 103.23902900209},  {260, 195.801674007263},     {265, 305.913288043395},
        {270, 470.061877573792},    {273, 603.645739143372},     {273.16, 611.657},
    };
    for (const auto& state : table) {
        // the exponent is up to -103, its rounding as much relative to p
        EXPECT_NEAR(sublimation_pressure(state.T), state.p, 1e-13 * state.p) << state.T;
        EXPECT_NEAR(sublimation_temperature(state.p), state.T, 1e-12 * state.T);
    }
}

// Where a curve ends the next one begins: to the digits of the coefficients.
TEST(IapwsR14, CurvesJoinAtTheTriplePoints)
{
    const Ice ices[] = {Ice::Ih, Ice::III, Ice::V, Ice::VI, Ice::VII};
    for (std::size_t k = 0; k + 1 < std::size(ices); ++k) {
        const double T = iapws_r14::melting_range(ices[k]).upper;
        const double shared = k == 0 ? iapws_r14::melting_range(Ice::Ih).lower : T;
        EXPECT_EQ(iapws_r14::melting_range(ices[k + 1]).lower, shared);
        EXPECT_NEAR(melting_pressure(ices[k], shared) / melting_pressure(ices[k + 1], shared), 1.0, 3e-6) << shared;
    }
    EXPECT_DOUBLE_EQ(sublimation_pressure(273.16), melting_pressure(Ice::Ih, 273.16));
}

TEST(IapwsR14, TemperaturesInvertThePressures)
{
    for (int k = 0; k <= 2000; ++k) {
        const double melting = 251.165 + (273.16 - 251.165) * k / 2000.0;
        EXPECT_NEAR(melting_temperature(melting_pressure(Ice::Ih, melting)), melting, 1e-12 * melting);
        const double sublimation = 50.0 + (273.16 - 50.0) * k / 2000.0;
        EXPECT_NEAR(sublimation_temperature(sublimation_pressure(sublimation)), sublimation, 1e-12 * sublimation);
    }
}

TEST(IapwsR14, TemperaturesStayInTheRangeOfTheCurves)
{
    const double infinity = std::numeric_limits<double>::infinity();
    for (const double p : {-infinity, -1.0, 0.0, 5e-324, 600.0, std::nan("")})
        EXPECT_EQ(melting_temperature(p), 273.16) << p;
    for (const double p : {2.08567e8, 1e9, infinity})
        EXPECT_EQ(melting_temperature(p), 251.165) << p;
    for (const double p : {612.0, 1e5, infinity, std::nan("")})
        EXPECT_EQ(sublimation_temperature(p), 273.16) << p;
    for (const double p : {-infinity, -1.0, 0.0, 5e-324, 1e-41})
        EXPECT_EQ(sublimation_temperature(p), 50.0) << p;
}

// The numbers in registry/models/water_formulations.hpp.
TEST(OurPhases, IceAndLiquidMeetAtTheMeltingCurve)
{
    const auto difference = [](double p) {
        return value("TEMPERATURE.BALANCE", {"water", "cr", "l", p}) - melting_temperature(p);
    };
    for (const double p : {611.657, 1e3, 1e4, 1e5, 101325.0, 3e5})
        EXPECT_NEAR(difference(p), 0.0, 2e-5) << p;
    for (const double p : {0.9e6, 0.99e6, 1e6, 2e6, 5e6, 1e7, 2e7, 3e7, 4e7, 5e7, 6e7, 7e7})
        EXPECT_NEAR(difference(p), 0.0, 1.7e-4) << p;
    EXPECT_NEAR(difference(8e7), -0.10e-3, 0.01e-3); // region 1 below its end of 273.15 K: down to 264.2 K at 100 MPa
    EXPECT_NEAR(difference(9e7), -0.35e-3, 0.01e-3);
    EXPECT_NEAR(difference(1e8), -0.85e-3, 0.01e-3);
    // R10-06 Table 6 has the normal melting point at 273.152519 K
    EXPECT_NEAR(melting_temperature(101325.0), 273.152519, 1e-6);
}

TEST(OurPhases, IceAndSteamMeetNearTheSublimationCurve)
{
    double before = 0.0;
    for (const double T : {273.16, 273.0, 270.0, 265.0, 260.0, 256.0, 253.2}) {
        const double found = value("TEMPERATURE.BALANCE", {"water", "cr", "g", sublimation_pressure(T)});
        EXPECT_LT(found - T, before) << T; // it grows as region 2 goes further below its end
        EXPECT_NEAR(found, T, 1.4e-3) << T;
        before = found - T;
    }
}

// The three phases meet at one point.
TEST(OurPhases, TheTriplePoint)
{
    const double p = iapws_r14::triple_point_pressure;
    const double melting = value("TEMPERATURE.BALANCE", {"water", "cr", "l", p});
    const double sublimation = value("TEMPERATURE.BALANCE", {"water", "cr", "g", p});
    const double boiling = value("TEMPERATURE.BALANCE", {"water", "l", "g", p});
    EXPECT_NEAR(melting, 273.16, 0.1e-3);
    EXPECT_NEAR(sublimation, 273.16, 0.4e-3);
    EXPECT_NEAR(boiling, 273.16, 4e-3);
}

// The range of ice ends a fifth of a millikelvin above the melting curve and holds the equilibrium with the liquid.
TEST(OurPhases, IceIsFittedUpToItsMelting)
{
    const auto& phases = registry::find_substance("water").substance->phases;
    for (int k = 0; k <= 200; ++k) {
        const double p = std::min(611.657 * std::pow(210e6 / 611.657, k / 200.0), 210e6);
        const auto fit = registry::limits_of(phases[0], p).fit;
        EXPECT_NEAR(fit.upper, melting_temperature(p) + 2e-4, 1e-9) << p;
        if (p > 1e8)
            continue;
        const auto melting = registry::equilibrium_temperature(*registry::find_substance("water").substance, phases[0],
                                                               phases[1], p);
        ASSERT_TRUE(melting) << p;
        EXPECT_TRUE(fit.contains(*melting)) << p;
    }
}

// Over ice steam is trusted to 3 K below sublimation and not below 253.15 K.
TEST(OurPhases, SteamOverIceIsTrustedNearSublimation)
{
    const auto& steam = registry::find_substance("water").substance->phases[2];
    for (const double T : {250.0, 256.0, 257.0, 260.0, 270.0, 273.0, 273.16}) {
        const double p = sublimation_pressure(T);
        const auto trust = registry::limits_of(steam, p).trust;
        EXPECT_NEAR(trust.lower, std::max(253.15, T - 3.0), 1e-9) << T;
    }
    EXPECT_EQ(code_of(call("ENTROPY.SENSIBLE", {"water(g)", 252.9, 260.0, 1.0, 50.0})), 32767);
    EXPECT_EQ(code_of(call("ENTROPY.SENSIBLE", {"water(g)", 265.0, 272.0, 1.0, 600.0})), 32767);
}

} // namespace
} // namespace entropy_ledger::testing
