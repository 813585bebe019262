// Worked examples of textbooks and papers. Each printed answer is checked three ways: by hand arithmetic on the book's
// own data within its rounding, by the cell functions on the same data within the same, and, where the substance is in
// the registry, by its property data within what the book's data differ from them.
//
// All data and answers are from memory. The hand arithmetic beside them tells that they belong together. The numbers of
// examples change from edition to edition; where they are not remembered for sure, the chapter is given alone.
#include "support/calling.hpp"

namespace entropy_ledger::testing {
namespace {

constexpr double R = 8.314462618; // J/(mol K), SI Brochure, 9th ed.

// Y. A. Çengel, M. A. Boles, Thermodynamics: An Engineering Approach, 7th ed., chapters 6 to 8. Its data are steam
// tables by a formulation of IAPWS, and constant heat capacities for air and iron. Zero degrees Celsius is 273 K there.

// Example 7-1: 750 kJ into a cylinder of boiling water at 300 K.
TEST(CengelBoles, IsothermalHeatToBoilingWater)
{
    const double printed = 2.5; // kJ/K
    EXPECT_NEAR(750.0 / 300.0, printed, 0.05);
    EXPECT_NEAR(value("ENTROPY.RESERVOIR", {"750 kJ", 300.0}), 1e3 * printed, 50.0);
    // the same as evaporation of as much water as takes up that heat
    const double p = 3536.6; // Pa, saturation at 300 K by R7-97 Table 35: 3536.58941
    const double heat = value("HEAT.PHASE", {"water", "l", "g", 300.0, 1.0, p});
    const double entropy = value("ENTROPY.PHASE", {"water", "l", "g", 300.0, 1.0, p});
    EXPECT_NEAR(750e3 / heat * entropy, 1e3 * printed, 0.1); // the phases meet within 4 mK: 4e-3/300 of 2500 J/K
}

// Example 7-2: 2000 kJ from a source at 800 K to a sink at 500 K or at 750 K.
TEST(CengelBoles, HeatTransferBetweenReservoirs)
{
    const double printed_500 = 1.5, printed_750 = 0.2; // kJ/K
    EXPECT_NEAR(2000.0 / 500.0 - 2000.0 / 800.0, printed_500, 0.05);
    EXPECT_NEAR(2000.0 / 750.0 - 2000.0 / 800.0, printed_750, 0.05);
    EXPECT_NEAR(value("ENTROPY.TRANSFER", {"2000 kJ", 800.0, 500.0}), 1e3 * printed_500, 1e-9);
    EXPECT_NEAR(value("ENTROPY.TRANSFER", {"2000 kJ", 800.0, 750.0}), 1e3 * (2000.0 / 750.0 - 2.5), 1e-9);
    EXPECT_EQ(words("ENTROPY.VERDICT", {value("ENTROPY.TRANSFER", {"2000 kJ", 800.0, 500.0})}), "can occur");
}

// Example 7-9: air from 100 kPa and 17 °C to 600 kPa and 57 °C. By the book's table of air -0.3844 kJ/(kg K), by
// cp = 1.006 kJ/(kg K) -0.3842.
TEST(CengelBoles, EntropyChangeOfAir)
{
    const double printed_table = -0.3844, printed_constant = -0.3842; // kJ/(kg K)
    EXPECT_NEAR(1.006 * std::log(330.0 / 290.0) - 0.287 * std::log(600.0 / 100.0), printed_constant, 0.0001);
    const double found = value("ENTROPY.CHANGE", {"air", 290.0, "air", 330.0, 1.0, "100 kPa", "600 kPa"});
    EXPECT_NEAR(1e-3 * found, printed_table, 0.0001); // the table of air has as many digits
    const double parts = value("ENTROPY.SENSIBLE", {"air", 290.0, 330.0, 1.0})
                       + value("ENTROPY.PRESSURE", {"air", 330.0, "100 kPa", "600 kPa", 1.0});
    EXPECT_NEAR(parts, found, 1e-9);
}

// Chapter 7, a wall: 1035 W; its faces at 20 °C and 5 °C, the room at 27 °C, the outside at 0 °C.
TEST(CengelBoles, HeatThroughAWall)
{
    const double printed_wall = 0.191, printed_total = 0.341; // W/K
    EXPECT_NEAR(1035.0 / 278.0 - 1035.0 / 293.0, printed_wall, 0.0005);
    EXPECT_NEAR(1035.0 / 273.0 - 1035.0 / 300.0, printed_total, 0.0005);
    EXPECT_NEAR(value("ENTROPY.TRANSFER", {"1035 W", 293.0, 278.0}), printed_wall, 0.0005);
    EXPECT_NEAR(value("ENTROPY.TRANSFER", {"1035 W", 300.0, 273.0}), printed_total, 0.0005);
    // the two films of air, left and right of the wall, make up the rest
    const double films = value("ENTROPY.TRANSFER", {"1035 W", 300.0, 293.0})
                       + value("ENTROPY.TRANSFER", {"1035 W", 278.0, 273.0});
    EXPECT_NEAR(films, printed_total - printed_wall, 0.001);
}

// Chapter 7: 50 kg of cast iron at 500 K into a lake at 285 K; c = 0.45 kJ/(kg K).
TEST(CengelBoles, HotBlockInALake)
{
    const double printed_iron = -12.65, printed_lake = 16.97, printed_total = 4.32; // kJ/K
    const double iron = 50.0 * 0.45 * std::log(285.0 / 500.0), heat = 50.0 * 0.45 * (500.0 - 285.0);
    EXPECT_NEAR(iron, printed_iron, 0.005);
    EXPECT_NEAR(heat / 285.0, printed_lake, 0.005);
    EXPECT_NEAR(iron + heat / 285.0, printed_total, 0.01); // the sum of two rounded figures
    EXPECT_NEAR(value("ENTROPY.BODY", {"22.5 kJ/K", 500.0, 285.0}), 1e3 * printed_iron, 5.0);
    EXPECT_NEAR(value("ENTROPY.RESERVOIR", {-value("HEAT.BODY", {"22.5 kJ/K", 500.0, 285.0}), 285.0}),
                1e3 * printed_lake, 5.0);
    EXPECT_NEAR(value("GENERATION.BODY", {"22.5 kJ/K", 500.0, 285.0, 285.0}), 1e3 * printed_total, 10.0);
    // Pure iron has 0.449 kJ/(kg K) at 298 K and 0.53 at 500 K: 7.5 % more in entropy, 11 % more in generation.
    const double entropy = value("ENTROPY.SENSIBLE", {"Fe(cr)", 500.0, 285.0, 50.0});
    const double generation = value("GENERATION.SENSIBLE", {"Fe(cr)", 500.0, 285.0, 50.0, 285.0});
    EXPECT_NEAR(entropy / (1e3 * printed_iron), 1.075, 0.005);
    EXPECT_NEAR(generation / (1e3 * printed_total), 1.11, 0.01);
}

// Chapter 7: condensing steam at 100 °C gives 600 kJ to surroundings at 25 °C.
TEST(CengelBoles, CondensingSteamToTheSurroundings)
{
    const double printed_system = -1.61, printed_generated = 0.40; // kJ/K
    EXPECT_NEAR(-600.0 / 373.0, printed_system, 0.005);
    EXPECT_NEAR(-600.0 / 373.0 + 600.0 / 298.0, printed_generated, 0.01);
    EXPECT_NEAR(value("ENTROPY.TRANSFER", {"600 kJ", 373.0, 298.0}), 1e3 * printed_generated, 10.0);
    const double p = 101.42e3; // Pa, saturation at 100 °C in the book's table
    const double condensed = -600e3 / value("HEAT.PHASE", {"water", "g", "l", "100 °C", 1.0, p});
    const std::string amount = std::to_string(condensed) + " kg";
    EXPECT_NEAR(value("ENTROPY.PHASE", {"water", "g", "l", "100 °C", amount, p}), 1e3 * printed_system, 5.0);
    EXPECT_NEAR(value("GENERATION.PHASE", {"water", "g", "l", "100 °C", amount, "25 °C", p}), 1e3 * printed_generated,
                10.0);
}

// Chapter 7, an air heater: steam, 10,000 kg/h, saturated at 35 °C, leaves as liquid at 32 °C; air from 20 °C to 30 °C
// at 1 atm, cp = 1.005 kJ/(kg K). Steam table of the book: h 2564.6 and 134.10 kJ/kg, s 8.3517 and 0.4641 kJ/(kg K).
TEST(CengelBoles, AirHeater)
{
    const double printed_air = 671.7, printed_generation = 0.745; // kg/s, kW/K
    const double steam = 10000.0 / 3600.0;
    const double heat_by_hand = steam * (2564.6 - 134.10), steam_by_hand = steam * (0.4641 - 8.3517);
    EXPECT_NEAR(std::round(heat_by_hand) / (1.005 * 10.0), printed_air, 0.05);
    EXPECT_NEAR(steam_by_hand + printed_air * 1.005 * std::log(303.0 / 293.0), printed_generation, 0.0005);

    const double p = 5629.1; // Pa, saturation at 35 °C in the book's table
    const std::vector<Input> condensing{"water(g)", 308.15, "water(l)", 305.15, "10000 kg/h", p};
    const double heat = value("HEAT.CHANGE", condensing), entropy = value("ENTROPY.CHANGE", condensing);
    EXPECT_NEAR(1e-3 * heat, -heat_by_hand, 0.3); // kW; half a digit in h at both ends: 0.15 kW
    EXPECT_NEAR(1e-3 * entropy, steam_by_hand, 0.0005);
    const double one = value("HEAT.SENSIBLE", {"air", "20 °C", "30 °C", "1 kg/s", "1 atm"});
    EXPECT_NEAR(-heat / one, printed_air, 0.6); // cp of air: 1.0042 against 1.005 kJ/(kg K), 0.08 %
    const double air = -heat / one * value("ENTROPY.SENSIBLE", {"air", "20 °C", "30 °C", "1 kg/s", "1 atm"});
    // 0 °C at 273.15 K in place of 273 K, and the air's flow not rounded: 0.736 kW/K, a small difference of two terms
    const double unrounded = steam_by_hand + heat_by_hand / 10.0 * std::log(303.15 / 293.15);
    EXPECT_NEAR(1e-3 * value("ENTROPY.TOTAL", {entropy, air}), unrounded, 0.0005);
    EXPECT_NEAR(unrounded - printed_generation, -0.0086, 0.00005);
}

// Chapter 6, a heat pump: a house at 21 °C loses 135,000 kJ/h, outside it has -5 °C. Least power 3.32 kW.
TEST(CengelBoles, LeastPowerOfAHeatPump)
{
    const double printed = 3.32; // kW
    EXPECT_NEAR(37.5 * (1.0 - 268.0 / 294.0), printed, 0.005);
    EXPECT_NEAR(value("WORK.LEAST", {"135000 kJ/h", 294.0, 268.0}), 1e3 * printed, 5.0);
    EXPECT_NEAR(value("WORK.LEAST", {"135000 kJ/h", "21 °C", "-5 °C"}), 1e3 * printed, 6.0); // with 273.15
}

// Example 8-4: 500 kg of iron cool from 200 °C to the surroundings' 27 °C, c = 0.45 kJ/(kg K). Work lost 8191 kJ.
TEST(CengelBoles, CoolingOfIronBlockDestroysWork)
{
    const double printed = 8191.0; // kJ
    const double C = 500.0 * 0.45;
    EXPECT_NEAR(C * (473.0 - 300.0) - 300.0 * C * std::log(473.0 / 300.0), printed, 0.5);
    const double generation = value("GENERATION.BODY", {"225 kJ/K", 473.0, 300.0, 300.0});
    EXPECT_NEAR(1e-3 * value("WORK.LOST", {generation, 300.0}), printed, 0.5);
    const double exergy = value("WORK.AVAILABLE", {value("HEAT.BODY", {"225 kJ/K", 473.0, 300.0}),
                                                   value("ENTROPY.BODY", {"225 kJ/K", 473.0, 300.0}), 300.0});
    EXPECT_NEAR(1e-3 * exergy, -printed, 0.5);
}

// M. J. Moran, H. N. Shapiro, Fundamentals of Engineering Thermodynamics, 6th ed.

// Example 6.1: water boils at 100 °C, 1.014 bar; heat 2257 kJ/kg, s 1.3069 and 7.3549 kJ/(kg K) by its steam table.
TEST(MoranShapiro, BoilingAtConstantTemperature)
{
    const double printed_heat = 2257.0; // kJ/kg
    EXPECT_NEAR(373.15 * (7.3549 - 1.3069), printed_heat, 0.5);
    // its steam tables are older than IAPWS-95: 0.5 kJ/kg and 0.001 kJ/(kg K) apart
    const std::vector<Input> boiling{"water", "l", "g", "100 °C", 1.0, "1.014 bar"};
    EXPECT_NEAR(1e-3 * value("HEAT.PHASE", boiling), printed_heat, 1.0);
    EXPECT_NEAR(1e-3 * value("ENTROPY.PHASE", boiling), 7.3549 - 1.3069, 0.0015);
}

// Chapter 6, quenching: a bar of 0.8 lb at 1900 °R, c = 0.1 Btu/(lb °R), in 20 lb of water at 530 °R. The end
// temperature is printed as 535 °R, the entropy produced as 0.0864 Btu/°R.
TEST(MoranShapiro, QuenchedBar)
{
    const double printed_T = 535.0, printed_production = 0.0864; // °R, Btu/°R
    const double water = 20.0, bar = 0.8 * 0.1, T = (water * 530.0 + bar * 1900.0) / (water + bar);
    EXPECT_NEAR(T, printed_T, 0.5);
    EXPECT_NEAR(water * std::log(535.0 / 530.0) + bar * std::log(535.0 / 1900.0), printed_production, 0.00005);

    const Range capacities = Range::column({text("20 Btu/°R"), text("0.08 Btu/°R")});
    const Range temperatures = Range::column({text("530 °R"), text("1900 °R")});
    const double T_common = value("TEMPERATURE.COMMON", {capacities, temperatures}); // K
    EXPECT_NEAR(1.8 * T_common, T, 1e-9);
    const double btu = 1055.05585262 * 1.8; // J/K in a Btu/°R, International Table
    const auto production = [&](const Input& end) {
        const double of_water = value("ENTROPY.BODY", {"20 Btu/°R", "530 °R", end});
        return (of_water + value("ENTROPY.BODY", {"0.08 Btu/°R", "1900 °R", end})) / btu;
    };
    EXPECT_NEAR(production("535 °R"), printed_production, 0.00005);
    // The book goes on with the rounded temperature. With 535.458 °R, where the energies balance, it is a fifth more.
    EXPECT_NEAR(production(T_common), water * std::log(T / 530.0) + bar * std::log(T / 1900.0), 1e-9);
    EXPECT_NEAR(production(T_common), 0.1036, 0.00005);
}

// J. M. Smith, H. C. Van Ness, M. M. Abbott, Introduction to Chemical Engineering Thermodynamics, 7th ed., chapter 5.

// Example 5.4: 40 kg of steel at 450 °C, 0.5 kJ/(kg K), quenched in 150 kg of oil at 25 °C, 2.5 kJ/(kg K).
TEST(SmithVanNessAbbott, SteelQuenchedInOil)
{
    const double printed_T = 46.52, printed_steel = -16.33, printed_oil = 26.13, printed_total = 9.80; // °C, kJ/K
    const double T = (20.0 * 450.0 + 375.0 * 25.0) / (20.0 + 375.0);
    EXPECT_NEAR(T, printed_T, 0.005);
    const double steel = 20.0 * std::log((T + 273.15) / 723.15), oil = 375.0 * std::log((T + 273.15) / 298.15);
    EXPECT_NEAR(steel, printed_steel, 0.005);
    EXPECT_NEAR(oil, printed_oil, 0.005);
    EXPECT_NEAR(steel + oil, printed_total, 0.01);

    const double common = value("TEMPERATURE.COMMON", {Range::column({text("20 kJ/K"), text("375 kJ/K")}),
                                                       Range::column({text("450 °C"), text("25 °C")})});
    EXPECT_NEAR(common - 273.15, printed_T, 0.005);
    const double of_steel = value("ENTROPY.BODY", {"20 kJ/K", "450 °C", common});
    const double of_oil = value("ENTROPY.BODY", {"375 kJ/K", "25 °C", common});
    EXPECT_NEAR(of_steel, 1e3 * printed_steel, 5.0);
    EXPECT_NEAR(of_oil, 1e3 * printed_oil, 5.0);
    EXPECT_NEAR(value("ENTROPY.TOTAL", {of_steel, of_oil}), 1e3 * printed_total, 10.0);
    EXPECT_NEAR(value("HEAT.BODY", {"20 kJ/K", "450 °C", common}),
                -value("HEAT.BODY", {"375 kJ/K", "25 °C", common}), 1e-6);
}

// Example 5.3: methane expands reversibly and adiabatically from 550 K and 5 bar to 1 bar and 411.34 K. The book's heat capacity:
// Cp/R = 1.702 + 9.081e-3 T - 2.164e-6 T^2.
TEST(SmithVanNessAbbott, ReversibleAdiabaticExpansionOfMethane)
{
    const double start = 550.0, printed = 411.34; // K
    const auto over_R = [&](double T) {
        return 1.702 * std::log(T / start) + 9.081e-3 * (T - start) - 0.5 * 2.164e-6 * (T * T - start * start);
    };
    EXPECT_NEAR(over_R(printed), std::log(1.0 / 5.0), 2e-4); // 0.005 K of the temperature: 8e-5
    const double found = value("ENTROPY.CHANGE", {"CH4(g)", start, "CH4(g)", printed, "1 mol", "5 bar", "1 bar"});
    const double pressure = value("ENTROPY.PRESSURE", {"CH4(g)", printed, "5 bar", "1 bar", "1 mol"});
    EXPECT_NEAR(pressure, R * std::log(5.0), 1e-4); // the set's own gas constant: 8.314510
    // Its heat capacity is 1.8 % below the polynomial between the two temperatures.
    EXPECT_NEAR((found - pressure) / (R * over_R(printed)), 0.982, 0.002);
}

// P. W. Atkins, J. de Paula, Atkins' Physical Chemistry, 9th ed.

// Example 3.2: argon at 25 °C and 1.00 bar in 0.500 dm3 expands to 1.000 dm3 and is heated to 100 °C.
TEST(Atkins, ArgonExpandsAndIsHeated)
{
    const double printed = 0.173; // J/K
    const double n = 1e5 * 0.5e-3 / (R * 298.15);
    const double ratio = 373.15 / 298.15;
    EXPECT_NEAR(n * R * std::log(2.0 * std::pow(ratio, 1.5)), printed, 0.0005);
    const std::string amount = std::to_string(1e3 * n) + " mmol";
    const double p_end = 1e5 * ratio / 2.0;
    EXPECT_NEAR(value("ENTROPY.CHANGE", {"Ar(g)", "25 °C", "Ar(g)", "100 °C", amount, "1.00 bar", p_end}), printed,
                0.0005);
}

// Chapter 5: 3.0 mol of hydrogen and 1.0 mol of nitrogen mix at 25 °C: Gibbs energy -5.6 kJ from equal pressures,
// -6.9 kJ from equal volumes.
TEST(Atkins, GibbsEnergyOfMixing)
{
    const double printed_pressures = -5.6, printed_volumes = -6.9; // kJ
    const double RT = R * 298.15e-3;
    EXPECT_NEAR(RT * (3.0 * std::log(0.75) + std::log(0.25)), printed_pressures, 0.05);
    EXPECT_NEAR(RT * 4.0 * std::log(0.5), printed_volumes, 0.05);

    const Range moles = Range::column({text("3.0 mol"), text("1.0 mol")});
    const Range gases = Range::column({text("H2"), text("N2")});
    const double mixing = value("ENTROPY.MIXING", {moles, gases});
    EXPECT_EQ(value("HEAT.MIXING", {moles, gases}), 0.0);
    EXPECT_NEAR(1e-3 * value("WORK.AVAILABLE", {0.0, mixing, 298.15}), printed_pressures, 0.05);
    // From 3 and 1 bar each gas comes to 2 bar before they mix there.
    const double levelled = value("ENTROPY.PRESSURE", {"H2(g)", 298.15, "3 bar", "2 bar", "3.0 mol"})
                          + value("ENTROPY.PRESSURE", {"N2(g)", 298.15, "1 bar", "2 bar", "1.0 mol"});
    EXPECT_NEAR(1e-3 * value("WORK.AVAILABLE", {0.0, mixing + levelled, 298.15}), printed_volumes, 0.05);
}

// Chapter 3, a problem and its answers: water freezes at -5 °C, and boils at 95 °C and 1.00 atm, each in surroundings
// of its own temperature. Data: 6.01 kJ/mol at 273 K with 37.3 J/(K mol) between the heat capacities of liquid and
// solid; 40.7 kJ/mol at 373 K with -41.9 J/(K mol) between those of vapour and liquid.
TEST(Atkins, FreezingBelowZeroAndBoilingBelowAHundred)
{
    const double printed_freezing = -21.3, printed_surroundings = 21.7, printed_total = 0.4; // J/(K mol)
    const double T = 268.0;
    const double entropy = -(6010.0 / 273.0 + 37.3 * std::log(T / 273.0));
    const double heat = -(6010.0 + 37.3 * (T - 273.0));
    EXPECT_NEAR(entropy, printed_freezing, 0.05);
    EXPECT_NEAR(-heat / T, printed_surroundings, 0.05);
    EXPECT_NEAR(entropy - heat / T, printed_total, 0.05);
    EXPECT_NEAR(value("ENTROPY.PHASE", {"water", "l", "cr", "-5 °C", "1 mol"}), printed_freezing, 0.05);
    EXPECT_NEAR(value("ENTROPY.RESERVOIR", {-value("HEAT.PHASE", {"water", "l", "cr", "-5 °C", "1 mol"}), "-5 °C"}),
                printed_surroundings, 0.05);
    EXPECT_NEAR(value("GENERATION.PHASE", {"water", "l", "cr", "-5 °C", "1 mol", "-5 °C"}), printed_total, 0.05);

    const double printed_boiling = 109.7, printed_around = -111.2, printed_sum = -1.5;
    const double steam = 40700.0 / 373.0 - 41.9 * std::log(368.0 / 373.0);
    const double steam_heat = 40700.0 - 41.9 * (368.0 - 373.0);
    EXPECT_NEAR(steam, printed_boiling, 0.05);
    EXPECT_NEAR(-steam_heat / 368.0, printed_around, 0.05);
    EXPECT_NEAR(steam - steam_heat / 368.0, printed_sum, 0.05);
    const std::vector<Input> boiling{"water", "l", "g", "95 °C", "1 mol", "1 atm"};
    const double own = value("ENTROPY.PHASE", boiling);
    EXPECT_NEAR(own, printed_boiling, 0.25); // 40.65 for 40.7 kJ/mol: 0.13 J/(K mol); 373.15 for 373 K: 0.04; and the
                                             // vapour is no ideal gas
    EXPECT_NEAR(value("GENERATION.PHASE", {"water", "l", "g", "95 °C", "1 mol", "95 °C", "1 atm"}), printed_sum, 0.05);
    EXPECT_EQ(words("ENTROPY.VERDICT", {printed_sum}), "cannot occur");
}

// W. F. Giauque, J. W. Stout, The Entropy of Water and the Third Law of Thermodynamics, J. Am. Chem. Soc. 58 (1936)
// 1144: the entropy of water vapour at 25 °C from ice near 0 K up, in cal/(K mol), by calorimetry. Steps and total.
// Their zero of the Celsius scale is 273.10 K; the functions are given °C.
TEST(GiauqueStout, EntropyOfWaterVapourFromIceUp)
{
    const double debye = 0.022, gas_imperfection = 0.002;
    const double ice = 9.081, melting = 5.257, liquid = 1.580, evaporation = 35.220, compression = -6.886;
    const double printed_total = 44.28, stated = 0.05;
    EXPECT_NEAR(debye + ice + melting + liquid + evaporation + gas_imperfection + compression, printed_total, 0.005);
    EXPECT_NEAR(1435.7 / 273.10, melting, 0.0005);
    EXPECT_NEAR(10499.0 / 298.10, evaporation, 0.0005);

    const double calorie = 4.184; // J
    const double p = 3169.9;      // Pa, saturation at 25 °C by R7-97
    const double steps[] = {
        value("ENTROPY.SENSIBLE", {"water(cr)", 10.0, "0 °C", "1 mol"}) / calorie,
        value("ENTROPY.PHASE", {"water", "cr", "l", "0 °C", "1 mol"}) / calorie,
        value("ENTROPY.SENSIBLE", {"water(l)", "0 °C", "25 °C", "1 mol"}) / calorie,
        value("ENTROPY.PHASE", {"water", "l", "g", "25 °C", "1 mol", p}) / calorie,
        value("ENTROPY.PRESSURE", {"H2O(g)", "25 °C", p, "1 atm", "1 mol"}) / calorie,
    };
    EXPECT_NEAR(steps[0], ice, stated);   // their greatest uncertainty
    EXPECT_NEAR(steps[1], melting, 0.005); // 1 cal/mol in the heat of melting: 0.004
    EXPECT_NEAR(steps[2], liquid, 0.002);
    EXPECT_NEAR(steps[3] - evaporation, 0.042, 0.002); // R7-97 has 10514 cal/mol, 0.14 % more than they
    EXPECT_NEAR(steps[4], compression, 0.002);
    double total = debye + gas_imperfection;
    for (const double step : steps)
        total += step;
    EXPECT_NEAR(total, printed_total, stated);

    // The entropy by spectra is greater by R ln(3/2), which ice keeps at 0 K (L. Pauling, 1935).
    const double M = 18.015268e-3; // kg/mol
    const double spectroscopic = M * value("DATA.ENTROPY", {"H2O(g)", "25 °C", "1 atm"});
    EXPECT_NEAR(spectroscopic - calorie * total, R * std::log(1.5), stated * calorie);
}

} // namespace
} // namespace entropy_ledger::testing
