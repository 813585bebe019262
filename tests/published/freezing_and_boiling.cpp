// The direction in which water changes its phase: common practice, no source.
#include "support/calling.hpp"

namespace entropy_ledger::testing {
namespace {

double generated(const char* from, const char* to, double T, double T_reservoir)
{
    return value("GENERATION.PHASE", {"water", from, to, T, 1.0, T_reservoir});
}

TEST(CommonPractice, WaterFreezesByItselfBelowZeroAndNotAbove)
{
    for (const double T : {258.15, 263.15, 268.15, 272.15, 273.05}) {
        EXPECT_GT(generated("l", "cr", T, T), 0.0) << T;
        EXPECT_LT(generated("cr", "l", T, T), 0.0) << T;
    }
    for (const double T : {273.25, 274.15, 276.15}) {
        EXPECT_LT(generated("l", "cr", T, T), 0.0) << T;
        EXPECT_GT(generated("cr", "l", T, T), 0.0) << T;
    }
}

TEST(CommonPractice, HotWaterAtOneBarBoilsByItself)
{
    EXPECT_GT(generated("l", "g", 500.0, 500.0), 0.0);
    EXPECT_LT(generated("g", "l", 500.0, 500.0), 0.0);
    EXPECT_GT(generated("l", "g", 380.0, 380.0), 0.0);
    EXPECT_GT(generated("g", "l", 370.0, 370.0), 0.0);
}

TEST(CommonPractice, TheBalanceIsWhereNothingIsGenerated)
{
    const double T_melting = value("TEMPERATURE.BALANCE", {"water", "cr", "l"});
    EXPECT_NEAR(T_melting, 273.1525, 0.001); // IAPWS R14-08: 273.1525 K at 0.101325 MPa, -7.4 nK/Pa towards 1 bar
    EXPECT_NEAR(generated("l", "cr", T_melting, T_melting), 0.0, 1e-9);
    const double T_boiling = value("TEMPERATURE.BALANCE", {"water", "l", "g"});
    // IAPWS R7-97 table 36: T_s(0.1 MPa) = 372.755919 K; the Gibbs energies of its regions 1 and 2 meet within 4 mK of that.
    EXPECT_NEAR(T_boiling, 372.755919, 4e-3);
    EXPECT_NEAR(generated("l", "g", T_boiling, T_boiling), 0.0, 1e-9);
}

TEST(CommonPractice, ColderSurroundingsGenerateMore)
{
    double before = -1e9;
    for (const double T_reservoir : {267.15, 265.15, 260.15, 250.15, 230.15}) {
        const double now = generated("l", "cr", 267.15, T_reservoir);
        EXPECT_GT(now, before);
        before = now;
    }
}

TEST(CommonPractice, FreezingByTheWayOfZeroAgreesWithTheDirectDifference)
{
    const double T_melting = value("TEMPERATURE.BALANCE", {"water", "cr", "l"});
    for (const double T : {255.0, 260.0, 267.15, 272.0}) {
        for (const std::string view : {"ENTROPY", "HEAT"}) {
            const double direct = value(view + ".PHASE", {"water", "l", "cr", T, 1.0});
            const double path = value(view + ".SENSIBLE", {"water(l)", T, T_melting, 1.0})
                              + value(view + ".PHASE", {"water", "l", "cr", T_melting, 1.0})
                              + value(view + ".SENSIBLE", {"water(cr)", T_melting, T, 1.0});
            EXPECT_NEAR(path, direct, 1e-12 * std::abs(direct)) << view << " at " << T;
        }
    }
}

TEST(CommonPractice, CheckSpeaksOfUndercoolingAndFlashing)
{
    const std::string freezing = words("CHECK.PHASE", {"water", "l", "cr", "-6 °C", 1.0});
    EXPECT_NE(freezing.find("undercooled"), std::string::npos) << freezing;
    EXPECT_NE(freezing.find("CAUTION"), std::string::npos) << freezing;
    const std::string flashing = words("CHECK.PHASE", {"water", "l", "g", 500.0, 1.0});
    EXPECT_NE(flashing.find("superheated"), std::string::npos) << flashing;
    EXPECT_NE(flashing.find("licensed engineer"), std::string::npos) << flashing;
    const std::string impossible = words("CHECK.PHASE", {"water", "l", "cr", 273.15, 1.0, 276.15});
    EXPECT_NE(impossible.find("cannot occur"), std::string::npos) << impossible;
    EXPECT_EQ(words("CHECK.SENSIBLE", {"water(l)", 290.0, 300.0, 1.0}).rfind("ok", 0), 0u);
}

TEST(CommonPractice, WarmAndColdStreamsAtOneReservoirAlwaysGenerate)
{
    for (const char* state : {"water(l)", "air", "Al(cr)", "N2(g)"}) {
        for (const double T_reservoir : {275.0, 300.0, 350.0}) {
            EXPECT_GT(value("GENERATION.SENSIBLE", {state, 280.0, T_reservoir, 1.0, T_reservoir}), 0.0);
            EXPECT_GT(value("GENERATION.SENSIBLE", {state, 360.0, T_reservoir, 1.0, T_reservoir}), 0.0);
        }
    }
}

} // namespace
} // namespace entropy_ledger::testing
