// Liquid and vapour together, by quality, against the saturated states of IAPWS R7-97.
#include "support/calling.hpp"

namespace entropy_ledger::testing {
namespace {

constexpr int unusable = 502;
constexpr int no_data = 32767;

TEST(WetSteam, IsTheMeanByQuality)
{
    // Saturated water and steam at 1 MPa by IAPWS R7-97, from memory of its steam tables: T_s = 453.036 K, h' = 762.68,
    // h'' = 2777.12 kJ/kg, s' = 2.1384, s'' = 6.5850 kJ/(kg K).
    const double T = value("TEMPERATURE.BALANCE", {"water", "l", "g", "10 bar"});
    for (const double x : {0.0, 0.25, 0.9, 1.0}) {
        const std::string state = "water(l+g,x=" + std::to_string(x) + ")";
        EXPECT_NEAR(value("DATA.ENTHALPY", {state, T}), (762.68 + x * (2777.12 - 762.68)) * 1e3, 60.0);
        EXPECT_NEAR(value("DATA.ENTROPY", {state, T}), (2.1384 + x * (6.5850 - 2.1384)) * 1e3, 0.15);
        EXPECT_NEAR(value("DATA.ENTHALPY", {state, T, "10 bar"}), value("DATA.ENTHALPY", {state, T}), 1e-3);
    }
}

TEST(WetSteam, TheEquilibriumPressureIsTheSaturationPressure)
{
    // R7-97 table 35: 300 K 3536.58941 Pa, 500 K 2.63889776 MPa, 600 K 12.3443146 MPa; the regions meet within 4 mK.
    const std::pair<double, double> table[] = {{300.0, 3536.58941}, {500.0, 2.63889776e6}, {600.0, 12.3443146e6}};
    for (const auto& [T, p] : table) {
        const Result steps = call("STEPS.CHANGE", {"water(l+g,x=0)", T, "water(l+g,x=1)", T, 1});
        const auto& rows = std::get<functions::MixedTable>(steps);
        ASSERT_GE(rows.rows, 2u);
        EXPECT_NEAR(std::get<double>(rows.cells[rows.columns + 4]), p, 2e-4 * p);
    }
}

TEST(WetSteam, ReachesNearToTheCriticalPoint)
{
    for (double T = 275.0; T < 646.0; T += 1.7) {
        const Result h = call("DATA.ENTHALPY", {"water(l+g,x=0.5)", T});
        EXPECT_EQ(code_of(h), 0) << T;
    }
    // 640 K: IAPWS R7-97 by python3-iapws 1.5.2.
    EXPECT_NEAR(value("DATA.ENTHALPY", {"water(l+g,x=0.5)", 640.0}), 2118.20e3, 100.0);
}

TEST(WetSteam, ThrottlingExchangesNoHeat)
{
    const double T = value("TEMPERATURE.BALANCE", {"water", "l", "g", "10 bar"});
    const double T_end = value("TEMPERATURE.BALANCE", {"water", "l", "g", "2 bar"});
    const std::string check = words("CHECK.CHANGE", {"water(l)", T, "water(l+g,x=0.1172)", T_end, 1, "20 °C", "10 bar"});
    EXPECT_EQ(check.find("temperatures cross"), std::string::npos) << check;
}

TEST(WetSteam, ChangesAddUp)
{
    for (const std::string view : {"ENTROPY", "HEAT"}) {
        const double wet = value(view + ".CHANGE", {"water(l)", 300, "water(l+g,x=0.4)", 400, 1, "5 bar"});
        const double rest = value(view + ".CHANGE", {"water(l+g,x=40 %)", 400, "water(g)", 450, 1, missing(), "2 bar"});
        const double whole = value(view + ".CHANGE", {"water(l)", 300, "water(g)", 450, 1, "5 bar", "2 bar"});
        EXPECT_NEAR(wet + rest, whole, 1e-9 * std::abs(whole)) << view;
    }
    for (const char* other : {"water(l)", "water(g)"}) {
        const double T = other == std::string("water(l)") ? 300.0 : 450.0;
        const std::vector<Input> arguments{other, T, "water(l+g,x=0.4)", 400, 1, 350.0};
        const Result steps = call("STEPS.CHANGE", arguments);
        const auto& rows = std::get<functions::MixedTable>(steps);
        double entropy = 0.0;
        for (std::size_t row = 1; row < rows.rows; ++row)
            entropy += std::get<double>(rows.cells[row * rows.columns + 6]);
        EXPECT_NEAR(entropy, value("GENERATION.CHANGE", arguments), 1e-7) << other;
    }
}

TEST(WetSteam, RefusesWhatIsNoSaturation)
{
    EXPECT_EQ(code_of(call("DATA.ENTHALPY", {"water(l+g,x=0.5)", 400, "1 bar"})), unusable);
    EXPECT_EQ(code_of(call("DATA.ENTHALPY", {"water(l+g,x=1.5)", 400})), unusable);
    EXPECT_EQ(code_of(call("DATA.ENTHALPY", {"water(l+g)", 400})), unusable);
    EXPECT_EQ(code_of(call("DATA.ENTHALPY", {"water(l+g,x=0.5)", 700})), no_data);
    EXPECT_EQ(code_of(call("DATA.ENTHALPY", {"CaCO3(l+g,x=0.5)", 700})), no_data);
    EXPECT_EQ(code_of(call("DATA.HEATCAPACITY", {"water(l+g,x=0.5)", 400})), unusable);
    EXPECT_EQ(code_of(call("HEAT.SENSIBLE", {"water(l+g,x=0.5)", 400, 410, 1})), unusable);
    EXPECT_EQ(code_of(call("HEAT.PHASE", {"water", "l", "l+g,x=0.5", 400, 1})), unusable);
    EXPECT_NE(words("CHECK.CHANGE", {"water(l+g,x=0.5)", 400, "water(l)", 350, 1, missing(), "1 bar"}).find("p_start"),
              std::string::npos);
    EXPECT_EQ(words("CHECK.CHANGE", {"water(l+g,x=0.5)", "120 °C", "water(l)", "60 °C", 1, "20 °C"}).find("metastable"),
              std::string::npos);
}

} // namespace
} // namespace entropy_ledger::testing
