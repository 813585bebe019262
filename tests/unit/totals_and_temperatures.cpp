// The plain functions on heats, works and temperatures, and the processes PRESSURE and MIXING, by closed forms.
#include "support/calling.hpp"

namespace entropy_ledger::testing {
namespace {

constexpr int unusable = 502;
constexpr int no_data = 32767;
constexpr double R = 8.314462618; // J/(mol K), SI Brochure, 9th ed.

TEST(Closure, SumAndRelativeImbalance)
{
    const Range heats = Range::column({number(-1000.0), empty(), number(990.0)});
    const auto result = call("HEAT.CLOSURE", {heats});
    const auto& pair = std::get<functions::NumberTable>(result);
    ASSERT_EQ(pair.numbers.size(), 2u);
    EXPECT_EQ(pair.numbers[0], -10.0);
    EXPECT_DOUBLE_EQ(pair.numbers[1], 10.0 / 995.0);
    EXPECT_EQ(code_of(call("HEAT.CLOSURE", {text("1 kJ")})), unusable);
}

TEST(Work, AvailableAndLeast)
{
    EXPECT_DOUBLE_EQ(value("WORK.AVAILABLE", {"100 kJ", "200 J/K", "27 °C"}), 1e5 - 300.15 * 200.0);
    EXPECT_DOUBLE_EQ(value("WORK.LEAST", {"100 kJ", 250.0, 300.0}), 1e5 * 50.0 / 250.0);
    EXPECT_DOUBLE_EQ(value("WORK.LEAST", {"100 kJ", 400.0, 300.0}), 1e5 * 100.0 / 400.0);
    EXPECT_EQ(value("WORK.LEAST", {"100 kJ", 300.0, 300.0}), 0.0);
    EXPECT_EQ(code_of(call("WORK.AVAILABLE", {"100 kJ", 200.0, 101325.0})), unusable);
    EXPECT_EQ(code_of(call("WORK.AVAILABLE", {"1 kW", "2 J/K", 300.0})), unusable) << "a rate and no rate";
    EXPECT_EQ(code_of(call("TEMPERATURE.MEAN", {"1 kJ", "2 W/K"})), unusable);
    EXPECT_EQ(code_of(call("TEMPERATURE.FINAL", {"water(l)", 300.0, "1 kW", "1 kg"})), unusable);
}

TEST(Temperature, Mean)
{
    EXPECT_DOUBLE_EQ(value("TEMPERATURE.MEAN", {"300 kJ", "1 kJ/K"}), 300.0);
    EXPECT_DOUBLE_EQ(value("TEMPERATURE.MEAN", {-300.0, -1.0}), 300.0);
    EXPECT_EQ(code_of(call("TEMPERATURE.MEAN", {300.0, 0.0})), unusable);
    EXPECT_EQ(code_of(call("TEMPERATURE.MEAN", {300.0, -1.0})), unusable);
}

TEST(Temperature, Common)
{
    const Range C = Range::column({number(1000.0), text("3 kJ/K"), empty()});
    const Range T = Range::column({number(400.0), text("26.85 °C"), empty()});
    EXPECT_DOUBLE_EQ(value("TEMPERATURE.COMMON", {C, T}), (1000.0 * 400.0 + 3000.0 * 300.0) / 4000.0);
    EXPECT_DOUBLE_EQ(value("TEMPERATURE.COMMON", {C, T, "reversible"}),
                     std::exp((1000.0 * std::log(400.0) + 3000.0 * std::log(300.0)) / 4000.0));
    EXPECT_EQ(code_of(call("TEMPERATURE.COMMON", {C, T, "somehow"})), unusable);
    EXPECT_EQ(code_of(call("TEMPERATURE.COMMON", {C, Range::column({number(1)})})), unusable);
    EXPECT_EQ(code_of(call("TEMPERATURE.COMMON", {C})), unusable);
    const Range mixed = Range::column({number(1000.0), text("3 kW/K"), empty()});
    EXPECT_EQ(code_of(call("TEMPERATURE.COMMON", {mixed, T})), unusable) << "J/K and W/K together";
}

TEST(Temperature, FinalInvertsTheHeat)
{
    for (const double T_end : {255.0, 268.0, 280.0, 350.0, 372.0, 380.0, 500.0, 900.0}) {
        const bool ice = T_end < 273.0, steam = T_end > 373.0;
        const char* end = ice ? "water(cr)" : steam ? "water(g)" : "water(l)";
        const double heat = value("HEAT.CHANGE", {"water(l)", 300.0, end, T_end, 2.0});
        EXPECT_NEAR(value("TEMPERATURE.FINAL", {"water(l)", 300.0, heat, 2.0}), T_end, 1e-6) << T_end;
    }
}

TEST(Temperature, FinalPassesAboveTheCriticalPressure)
{
    for (const char* p : {"230 bar", "300 bar", "800 bar"}) {
        for (const double T_end : {500.0, 700.0, 750.0, 900.0}) {
            const double heat = value("HEAT.CHANGE", {"water(l)", 300.0, T_end > 623.15 ? "water(g)" : "water(l)", T_end, 1.0, p});
            // At the boundary of regions 2 and 3 the enthalpy steps by up to 125 J/kg.
            EXPECT_NEAR(value("TEMPERATURE.FINAL", {"water(l)", 300.0, heat, 1.0, p}), T_end, 0.05) << p << ' ' << T_end;
        }
    }
    const auto steps = call("STEPS.CHANGE", {"water(l)", 600, "water(g)", 800, 1, 850.0, "300 bar"});
    const auto& table = std::get<functions::MixedTable>(steps);
    for (std::size_t row = 1; row < table.rows; ++row)
        EXPECT_NE(std::get<std::string>(table.cells[row * table.columns]), "boiling");
}

TEST(Temperature, FinalRestsAtThePhaseChange)
{
    const double T_melting = value("TEMPERATURE.BALANCE", {"water", "cr", "l"});
    EXPECT_DOUBLE_EQ(value("TEMPERATURE.FINAL", {"water(l)", "5 °C", "-200 kJ", 1.0}), T_melting);
    EXPECT_DOUBLE_EQ(value("TEMPERATURE.FINAL", {"water(cr)", "-5 °C", "200 kJ", 1.0}), T_melting);
    // Undercooled water that is left to itself freezes in part and comes to the melting temperature.
    EXPECT_DOUBLE_EQ(value("TEMPERATURE.FINAL", {"water(l)", "-6 °C", 0.0, 1.0}), T_melting);
    EXPECT_EQ(code_of(call("TEMPERATURE.FINAL", {"water(l)", 300.0, 1e9, 1.0})), no_data);
    EXPECT_EQ(code_of(call("TEMPERATURE.FINAL", {"water(l)", 300.0, 1e5, "0 kg"})), unusable);
    const double heat = value("HEAT.CHANGE", {"Fe(cr)", 300.0, "Fe(l)", 1900.0, 1.0});
    EXPECT_NEAR(value("TEMPERATURE.FINAL", {"Fe(cr)", 300.0, heat, 1.0}), 1900.0, 1e-6);
}

TEST(Pressure, OfAnIdealGas)
{
    const double expected = -R * std::log(4.0); // J/(mol K)
    EXPECT_NEAR(value("ENTROPY.PRESSURE", {"N2(g)", 300.0, "1 bar", "4 bar", "1 mol"}), expected, 1e-5 * std::abs(expected));
    EXPECT_EQ(value("HEAT.PRESSURE", {"N2(g)", 300.0, 1e5, 4e5, 1.0}), 0.0);
    EXPECT_GT(value("GENERATION.PRESSURE", {"N2(g)", 300.0, 4e5, 1e5, 1.0, 300.0}), 0.0) << "throttling";
    EXPECT_EQ(value("ENTROPY.PRESSURE", {"Al(cr)", 300.0, 1e5, 4e5, 1.0}), 0.0);
    EXPECT_NE(words("CHECK.PRESSURE", {"Al(cr)", 300.0, 1e5, 4e5, 1.0}).find("no dependence on pressure"), std::string::npos);
    EXPECT_EQ(code_of(call("ENTROPY.PRESSURE", {"N2(g)", 300.0, 1e5, missing(), 1.0})), unusable);
}

TEST(Mixing, IdealComponents)
{
    const Range moles = Range::column({text("1 mol"), text("3 mol"), empty()});
    const double expected = -R * (std::log(0.25) + 3.0 * std::log(0.75));
    EXPECT_NEAR(value("ENTROPY.MIXING", {moles}), expected, 1e-14 * expected);
    EXPECT_EQ(value("HEAT.MIXING", {moles}), 0.0);
    const Range names = Range::column({text("N2"), text("O2"), empty()});
    EXPECT_NEAR(value("ENTROPY.MIXING", {moles, names}), expected, 1e-14 * expected);
    const Range same = Range::column({text("N2"), text("nitrogen"), empty()});
    EXPECT_EQ(value("ENTROPY.MIXING", {moles, same}), 0.0) << "equal substances do not mix";
    const Range masses = Range::column({number(0.0280134), number(3 * 0.0319988), empty()});
    EXPECT_NEAR(value("ENTROPY.MIXING", {masses, names}), expected, 1e-6 * expected);
    EXPECT_EQ(code_of(call("ENTROPY.MIXING", {Range::column({text("1 kg"), text("2 kg")})})), unusable);
    EXPECT_EQ(code_of(call("ENTROPY.MIXING", {moles, Range::column({text("N2")})})), unusable);
    const std::string reason = words("CHECK.MIXING", {Range::column({number(1.0), text("-2 mol")})});
    EXPECT_NE(reason.find("item 2"), std::string::npos) << reason;
    const auto steps = call("STEPS.MIXING", {moles, names});
    EXPECT_EQ(std::get<functions::MixedTable>(steps).rows, 3u);
}

} // namespace
} // namespace entropy_ledger::testing
