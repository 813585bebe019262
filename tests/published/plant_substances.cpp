// The substances of plant practice against second figures, each from another source than the registry's own, within the
// stated uncertainty. "Seen": read in the work, or in a text that quotes it; "from memory": recalled.
#include "published/plant_phases.hpp"

#include <gtest/gtest.h>

#include <cmath>
#include <map>
#include <set>
#include <string>

namespace entropy_ledger::testing {
namespace {

struct Second {
    const char* name;
    const char* symbol;
    double T;            // K
    double cp;           // J/(kg K)
    const char* source;
};

constexpr double C(double t) { return t + zero_celsius; }

// C. J. Geankoplis, Transport Processes and Separation Process Principles, 4th ed., 2003, appendix A.4-1.
constexpr const char* geankoplis = "Geankoplis A.4-1, seen";
// The rule of R. L. Earle and M. D. Earle, Unit Operations in Food Processing, appendix 7: 4190 J/(kg K) for the water,
// 840 for the rest; they call it an over-simplification.
constexpr const char* earle_rule = "rule of Earle and Earle, seen";
constexpr double by_rule(double water) { return 4190.0 * water + 840.0 * (1.0 - water); }
constexpr const char* earle = "Earle and Earle, appendix 7, seen";
constexpr const char* ashrae = "ASHRAE Refrigeration, Thermal properties of foods, table 3, seen";
constexpr const char* va = "US Department of Veterans Affairs, HVAC Design Manual, table 2-3, seen";
// ASHRAE Fundamentals chapter 31, table 10, propylene glycol at 0 °C, 10 and 50 %, from memory; J/(kg K).
constexpr double table_10_at_10 = 4042.0, table_10_at_50 = 3455.0;
// K. E. Hurst and B. K. Harrison, Chem. Eng. Comm. 112 (1992) 21, modified Kopp rule: C 10.89, H 7.56, O 13.42 J/(mol K)
// at 298.15 K, from memory.
constexpr const char* hurst = "modified Kopp rule, from memory";
constexpr double by_atoms(double carbon, double hydrogen, double oxygen, double molar_mass)
{
    return (10.89 * carbon + 7.56 * hydrogen + 13.42 * oxygen) / molar_mass;
}

const Second seconds[] = {
    {"ethylene glycol 20 vol%", "l", C(1.6), 3894.0, va},   // 20 mass %: 18.5 vol%
    {"ethylene glycol 20 vol%", "l", C(85.0), 4061.0, va},
    {"ethylene glycol 30 vol%", "l", C(1.6), 3684.0, va},   // 30 mass %: 28 vol%
    {"ethylene glycol 30 vol%", "l", C(85.0), 3936.0, va},
    {"ethylene glycol 40 vol%", "l", C(1.6), 3391.0, va},   // 40 mass %: 38 vol%
    {"ethylene glycol 40 vol%", "l", C(85.0), 3768.0, va},
    {"ethylene glycol", "l", C(20.0), 2349.0, "Yuchai engine manual, table of glycol properties, seen"},
    {"glycerol", "l", C(15.0), (78468.0 + 480.71 * C(15.0)) / 92.094, "Perry 8th ed., table 2-153, from memory"},
    {"glycerol", "l", C(32.0), (78468.0 + 480.71 * C(32.0)) / 92.094, "Perry 8th ed., table 2-153, from memory"},
    {"glycerol", "l", C(32.5), 2410.0, "Doran C.5, mean over 15 to 50 °C, seen"},
    {"liquid acetone", "l", C(0.0), 2117.0, "Doran C.5, seen"},
    {"liquid acetone", "l", C(15.0), 2150.0, "table of liquids at 288 K, UPM, seen"},
    {"liquid acetone", "l", 298.15, 2161.0, "acetone data page, seen"},
    {"liquid acetone", "l", 298.15, 2174.7, "Perry 8th ed., table 2-153, from memory"},
    // TEOS-10 functions of the Python package gsw 3.6, salt content as absolute salinity; another program and another
    // formulation of the water part than the registry's fit rests on.
    {"sea water 35 g/kg", "l", C(0.0), 3987.4, "gsw"},
    {"sea water 35 g/kg", "l", C(20.0), 3997.0, "gsw"},
    {"sea water 35 g/kg", "l", C(40.0), 4006.8, "gsw"},
    {"sea water 70 g/kg", "l", C(0.0), 3800.9, "gsw"},
    {"sea water 70 g/kg", "l", C(20.0), 3833.4, "gsw"},
    {"sea water 70 g/kg", "l", C(40.0), 3851.2, "gsw"},
    {"sodium chloride brine 5 %", "l", C(0.0), 3902.2, "gsw, 50 g/kg of sea salt"},
    {"sodium chloride brine 5 %", "l", C(15.0), 3919.3, "gsw, 50 g/kg of sea salt"},
    {"sodium chloride brine 5 %", "l", C(40.0), 3938.6, "gsw, 50 g/kg of sea salt"},
    {"sodium chloride brine 10 %", "l", C(0.0), 3674.4, "gsw, 100 g/kg of sea salt"},
    {"sodium chloride brine 10 %", "l", C(15.0), 3701.5, "gsw, 100 g/kg of sea salt"},
    {"sodium chloride brine 10 %", "l", C(40.0), 3726.3, "gsw, 100 g/kg of sea salt"},
    {"mineral oil d 0.84", "l", C(15.0), 1900.0, "table of liquids at 288 K, UPM, diesel, seen"},
    {"mineral oil d 0.84", "l", C(15.0), 2000.0, "another edition of it, diesel, seen"},
    {"mineral oil d 0.90", "l", 300.0, 1909.0, "Incropera and DeWitt, table A.5, engine oil (d 0.89), from memory"},
    {"mineral oil d 0.90", "l", 350.0, 2118.0, "Incropera and DeWitt, table A.5, engine oil (d 0.89), from memory"},
    {"mineral oil d 0.87", "l", 300.0, 1909.0, "Incropera and DeWitt, table A.5, engine oil (d 0.89), from memory"},
    {"mineral oil d 0.87", "l", 400.0, 2337.0, "Incropera and DeWitt, table A.5, engine oil (d 0.89), from memory"},
    {"hexadecane", "l", 288.15, 2220.0, "table of liquids at 288 K, UPM, n-dodecane, seen"},
    {"hexadecane", "cr", 270.0, by_atoms(16, 34, 0, 0.226441), hurst},
    {"octadecane", "cr", 298.0, 1908.0, "NIST WebBook, octadecane, with premelting, from memory"},
    {"eicosane", "cr", 294.0, by_atoms(20, 42, 0, 0.282547), hurst},
    {"erythritol", "cr", 293.15, by_atoms(4, 10, 4, 0.122120), hurst},
    {"erythritol", "l", 413.15, 2322.0 + 5.18 * 125.0, "glycerol, Perry 7th ed., p. 2-184, continued to 140 °C"},
    {"palmitic acid", "cr", 298.15, by_atoms(16, 32, 2, 0.256424), hurst},
    {"stearic acid", "cr", 298.15, by_atoms(18, 36, 2, 0.284477), hurst},
    {"palmitic acid", "l", 343.15, 1984.2 + 1.4733 * 70.0 - 4.8008e-3 * 4900.0, "liquid fat by Choi and Okos"},
    {"stearic acid", "l", 347.0, 2215.0 + 3.5 * (347.0 - 298.15), "liquid hexadecane"},
    {"austenitic stainless steel", "cr", C(20.0), 460.0, "prEN 12524, seen"},
    {"austenitic stainless steel", "cr", C(20.0), 480.0, "CIBSE A, table 3.36, seen"},
    {"austenitic stainless steel", "cr", 400.0, 515.0, "Incropera and DeWitt, table A.1, AISI 304, from memory"},
    {"austenitic stainless steel", "cr", 600.0, 557.0, "Incropera and DeWitt, table A.1, AISI 304, from memory"},
    {"austenitic stainless steel", "cr", 800.0, 582.0, "Incropera and DeWitt, table A.1, AISI 304, from memory"},
    {"aluminium alloy", "cr", C(20.0), 880.0, "prEN 12524 and CIBSE A, seen"},
    {"brass", "cr", 300.0, 390.0, "CIBSE A, table 3.36, seen"},
    {"brass", "cr", 300.0, 380.0, "prEN 12524, seen"},
    {"cast iron", "cr", 293.15, 450.0, "EN ISO 10456, from memory"},
    {"concrete", "cr", 293.15, 840.0, "lower end for ordinary concrete, 0.20 Btu/(lb °F), seen"},
    {"concrete", "cr", 293.15, 1170.0, "upper end for ordinary concrete, 0.28 Btu/(lb °F), seen"},
    {"concrete", "cr", 293.15, 1116.0, "reinforced concrete, 0.31 Wh/(kg K), building physics data sheet 26, seen"},
    {"concrete", "cr", 293.15, 920.0, "Berge, table 14.15, seen"},
    {"brick", "cr", 293.15, 936.0, "solid brick, 0.26 Wh/(kg K), building physics data sheet 26, seen"},
    {"brick", "cr", 293.15, 900.0, "clinker brick, 0.25 Wh/(kg K), building physics data sheet 26, seen"},
    {"brick", "cr", 293.15, 840.0, "common brick, Incropera and DeWitt, table A.3, from memory"},
    {"soda-lime glass", "cr", 293.15, 750.0, "prEN 12524, seen"},
    {"soda-lime glass", "cr", 293.15, 840.0, "CIBSE A, table 3.36, seen"},
    {"granite", "cr", 293.15, 936.0, "0.26 Wh/(kg K), building physics data sheet 26, seen"},
    {"granite", "cr", 293.15, 800.0, "Berge, table 14.15, seen"},
    {"wood in use", "cr", 293.15, 1530.0, "EN 1995-1-2, table B.2, from memory"},
    {"food fat", "cr", C(20.0), 1984.2 + 1.4373 * 20.0 - 4.8008e-3 * 400.0, "another print of the same, seen"},
    {"whole milk", "l", C(4.0), 3850.0, geankoplis},
    {"whole milk", "l", C(4.0), 3900.0, earle},
    {"skim milk", "l", C(4.0), 3980.0, geankoplis},
    {"skim milk", "l", C(4.0), 4020.0, geankoplis},
    {"potato", "cr", C(10.0), 3520.0, geankoplis}, // 75 % water
    {"potato", "cr", C(10.0), by_rule(0.7896), earle_rule},
    {"green peas", "cr", C(10.0), 3768.0, ashrae},
    {"green peas", "cr", C(10.0), by_rule(0.7886), earle_rule},
    {"sweet corn", "cr", C(10.0), 3620.0, ashrae},
    {"sweet corn", "cr", C(10.0), by_rule(0.7596), earle_rule},
    {"carrot", "cr", C(10.0), 3920.0, ashrae},
    {"carrot", "cr", C(10.0), by_rule(0.8779), earle_rule},
    {"cabbage", "cr", C(10.0), 4020.0, ashrae},
    {"cabbage", "cr", C(10.0), by_rule(0.9215), earle_rule},
    {"broccoli", "cr", C(10.0), 4010.0, ashrae},
    {"broccoli", "cr", C(10.0), by_rule(0.9069), earle_rule},
    {"snap beans", "cr", C(10.0), 3990.0, ashrae},
    {"snap beans", "cr", C(10.0), by_rule(0.9027), earle_rule},
    {"mushroom", "cr", C(10.0), 3990.0, ashrae},
    {"mushroom", "cr", C(10.0), by_rule(0.9181), earle_rule},
    {"lean beef", "cr", C(10.0), 3430.0, geankoplis},
    {"lean beef", "cr", C(10.0), 3220.0, earle},
    {"cod", "cr", C(10.0), by_rule(0.812), earle_rule},
    {"apple", "cr", C(10.0), 3730.0, geankoplis},
    {"apple", "cr", C(10.0), 4020.0, geankoplis},
    {"apple", "cr", C(10.0), 3600.0, earle},
    {"strawberry", "cr", C(10.0), by_rule(0.916), earle_rule},
};

std::set<std::string> compared; // states with a second figure

void compare(const char* name, const char* symbol, double T, double cp, const std::string& source)
{
    const registry::Phase* phase = phase_of(name, symbol);
    ASSERT_NE(phase, nullptr) << name;
    const registry::Limits limits = registry::limits_of(*phase, bar);
    ASSERT_TRUE(limits.trust.contains(T)) << name << " " << T;
    const double beyond = std::max({0.0, limits.fit.lower - T, T - limits.fit.upper});
    const double allowed = phase->uncertainty.relative + beyond * phase->uncertainty.growth_above;
    const double ours = registry::heat_capacity(*phase, T, bar);
    EXPECT_LE(std::abs(cp / ours - 1.0), allowed)
        << name << " at " << T << " K: " << ours << ", " << cp << " by " << source;
    compared.insert(std::string(registry::find_substance(name).substance->name) + "(" + symbol + ")");
}

void compare_with_figures()
{
    for (const Second& second : seconds)
        compare(second.name, second.symbol, second.T, second.cp, second.source);
}

// Figures that other records of the registry give: the NASA Glenn set and the IAPWS formulations.
void compare_with_other_records()
{
    constexpr const char* nasa = "NASA Glenn";
    const auto salt = [&](double sodium, double potassium) {
        return sodium * cp_of("NaNO3", "l", C(300.0)) + potassium * cp_of("KNO3", "l", C(300.0));
    };
    for (const double t : {300.0, 565.0})
        compare("solar salt", "l", C(t), salt(0.6, 0.4), nasa);
    for (const double T : {310.0, 330.0, 350.0}) {
        const double octane = cp_of("C8H18,n-octane", "l", T);
        for (const char* alkane : {"hexadecane", "octadecane", "eicosane"})
            compare(alkane, "l", T, octane, "n-octane, NASA Glenn");
    }
    for (const double T : {298.15, 500.0, 700.0, 873.15})
        compare("carbon steel", "cr", T, cp_of("Fe", "cr,alpha", T), nasa);
    for (const double T : {298.15, 400.0, 500.0, 600.0, 700.0, 773.15})
        compare("aluminium alloy", "cr", T, cp_of("Al", "cr", T), nasa);
    for (const double T : {300.0, 400.0, 600.0})
        compare("brass", "cr", T, 0.7 * cp_of("Cu", "cr", T) + 0.3 * cp_of("Zn", "cr", T), nasa);
    compare("dry sand", "cr", 298.15, cp_of("SiO2", "cr,alpha-quartz", 298.15), nasa);

    // A hydrate as its salt and the ice or water in it, by Kopp's rule. kg/mol.
    constexpr double water = 0.018015268; // IAPWS R7-97
    const auto hydrate = [&](const char* name, const char* salt_of_it, const char* salt_symbol, double n, double T) {
        const double molar_mass = registry::find_substance(name).substance->molar_mass;
        const double anhydrous = registry::find_substance(salt_of_it).substance->molar_mass;
        EXPECT_NEAR(molar_mass, anhydrous + n * water, 2e-5 * molar_mass) << name;
        const double dry = anhydrous * cp_of(salt_of_it, salt_symbol, T);
        compare(name, "cr", T, (dry + n * water * cp_of("water", "cr", 270.0)) / molar_mass, "salt and ice");
        compare(name, "l", T, (dry + n * water * cp_of("water", "l", T)) / molar_mass, "salt and water");
    };
    hydrate("sodium sulfate decahydrate", "Na2SO4", "cr,V", 10, 300.0);
    hydrate("lithium nitrate trihydrate", "LiNO3", "cr", 3, 300.0);

    // Wood with 12 % of moisture on its dry mass against the design value for wood in use, prEN 12524, seen.
    const double moist = (cp_of("dry wood", "cr", 293.15) + 0.12 * cp_of("water", "l", 293.15)) / 1.12;
    EXPECT_NEAR(1600.0 / moist, 1.0, registry::find_substance("dry wood").substance->phases[0].uncertainty.relative);
    compared.insert("dry wood(cr)");
    compare("wood in use", "cr", 293.15, moist, "dry wood and water");
}

// The tables for propylene glycol at 0 °C: continued by their second differences they meet a second table at 10 and
// 50 %, and the parabola through that table and water passes near them.
void compare_glycol_series()
{
    const auto at_zero = [](int percent) {
        return cp_of("propylene glycol " + std::to_string(percent) + " %", "l", zero_celsius);
    };
    const double bend = at_zero(40) - 2.0 * at_zero(30) + at_zero(20);
    EXPECT_NEAR(table_10_at_10 / (2.0 * at_zero(20) - at_zero(30) + bend), 1.0, 0.007);
    EXPECT_NEAR(table_10_at_50 / (2.0 * at_zero(40) - at_zero(30) + bend), 1.0, 0.008);

    const double water = cp_of("water", "l", zero_celsius);
    const double first = (table_10_at_10 - water) / 10.0, next = (table_10_at_50 - table_10_at_10) / 40.0;
    for (const int percent : {20, 25, 30, 35, 40}) {
        const double parabola = water + percent * (first + (percent - 10) * (next - first) / 50.0);
        compare(("propylene glycol " + std::to_string(percent) + " %").c_str(), "l", zero_celsius, parabola,
                "ASHRAE Fundamentals, table 10, and water");
    }
}

// The tables are straight within their resolution of 10 J/(kg K): a slip of a digit would stand out.
TEST(PlantSubstances, GlycolTablesAreNearlyStraight)
{
    struct Line { const char* name; double c0, c1; }; // J/(kg K), t in °C; least squares through the table
    for (const Line& line : {Line{"propylene glycol 20 %", 3927, 2.26}, Line{"propylene glycol 25 %", 3861, 2.49},
                             Line{"propylene glycol 30 %", 3792, 2.80}, Line{"propylene glycol 35 %", 3718, 2.97},
                             Line{"propylene glycol 40 %", 3638, 3.24}}) {
        for (const double t : {0.0, 10.0, 20.0, 30.0, 40.0, 45.0})
            EXPECT_NEAR(cp_of(line.name, "l", C(t)), line.c0 + line.c1 * t, 6.0) << line.name << " " << t;
    }
}

struct Food {
    const char* name;
    double water, protein, fat, carbohydrate, fibre, ash; // mass %; fibre is part of the carbohydrate
};

// Compositions: milk by USDA Agriculture Handbook 8, vegetables by ASHRAE Refrigeration, seen; the last four by the
// latter from memory.
const Food foods[] = {
    {"whole milk", 88.0, 3.3, 3.3, 4.7, 0.0, 0.7},
    {"skim milk", 90.8, 3.4, 0.2, 4.9, 0.0, 0.8},
    {"potato", 78.96, 2.07, 0.10, 17.98, 1.6, 0.89},
    {"green peas", 78.86, 5.42, 0.40, 14.46, 5.1, 0.86},
    {"sweet corn", 75.96, 3.22, 1.18, 19.02, 2.7, 0.62},
    {"carrot", 87.79, 1.03, 0.19, 10.14, 3.0, 0.87},
    {"cabbage", 92.15, 1.44, 0.27, 5.43, 2.3, 0.71},
    {"broccoli", 90.69, 2.98, 0.35, 5.24, 3.0, 0.92},
    {"snap beans", 90.27, 1.82, 0.12, 7.14, 3.4, 0.66},
    {"mushroom", 91.81, 2.09, 0.42, 4.65, 1.2, 0.89},
    {"lean beef", 71.7, 21.2, 4.4, 0.0, 0.0, 1.1},
    {"cod", 81.2, 17.8, 0.7, 0.0, 0.0, 1.2},
    {"apple", 83.9, 0.2, 0.4, 15.3, 2.7, 0.3},
    {"strawberry", 91.6, 0.6, 0.4, 7.0, 2.3, 0.4},
};
constexpr std::size_t summed_foods = 10; // of which the registry has the sum itself

// The sum over the components; the three that are no substances by the lines of the data file.
double sum_over_components(const Food& food, double T)
{
    const double t = T - zero_celsius;
    return 0.01 * (food.water * (4176.2 - 0.0909 * t + 5.4731e-3 * t * t)
                   + food.protein * cp_of("food protein", "cr", T) + food.fat * cp_of("food fat", "cr", T)
                   + (food.carbohydrate - food.fibre) * cp_of("food carbohydrate", "cr", T)
                   + food.fibre * (1845.9 + 1.8306 * t - 4.6509e-3 * t * t)
                   + food.ash * (1092.6 + 1.8896 * t - 3.6817e-3 * t * t));
}

TEST(PlantSubstances, FoodsAreTheSumsOfTheirComponents)
{
    for (std::size_t i = 0; i < std::size(foods); ++i) {
        for (const double t : {0.0, 20.0, 40.0}) {
            const char* symbol = std::string(foods[i].name).ends_with("milk") ? "l" : "cr";
            const double ours = cp_of(foods[i].name, symbol, C(t)), sum = sum_over_components(foods[i], C(t));
            // The coefficients have six digits; the other foods are table values: 1.5 % is the most they differ by.
            EXPECT_NEAR(ours / sum, 1.0, i < summed_foods ? 3e-6 : 0.015) << foods[i].name << " " << t;
        }
    }
    // Butter, 81.1 % fat (USDA Agriculture Handbook 8): Geankoplis A.4-1 has 2300, ASHRAE (from memory) 2400 J/(kg K).
    const double butter = sum_over_components({"butter", 15.9, 0.9, 81.1, 0.1, 0.0, 2.1}, C(4.4));
    EXPECT_NEAR(2300.0 / butter, 1.0, 0.05);
    EXPECT_NEAR(2400.0 / butter, 1.0, 0.05);
}

TEST(PlantSubstances, SecondFiguresLieWithinTheUncertainty)
{
    compared.clear();
    compare_with_figures();
    compare_with_other_records();
    compare_glycol_series();
    for (const PlantPhase& phase : plant_phases()) {
        // Of these two components there is no second figure; the sums of foods stand for it.
        if (phase.substance->name != "food protein" && phase.substance->name != "food carbohydrate") {
            EXPECT_TRUE(compared.contains(phase.state())) << "no second figure for " << phase.state();
        }
    }
}

// The integrals of the formulas of EN 1993-1-2, 3.4.1.2, and of its annex C, worked out in closed form; J/kg.
TEST(PlantSubstances, EnthalpiesOfSteel)
{
    const auto between = [](const char* name, double t1, double t2) {
        return enthalpy_of(name, "cr", C(t2)) - enthalpy_of(name, "cr", C(t1));
    };
    EXPECT_NEAR(between("carbon steel", 20, 600), 335.7e3, 0.05e3);
    const double rise = 666.0 * 135.0 + 13002.0 * std::log(138.0 / 3.0);   // 139.7e3
    const double fall = 545.0 * 165.0 + 17820.0 * std::log(169.0 / 4.0);   // 156.6e3
    EXPECT_NEAR(between("carbon steel", 600, 735), rise, 0.0015 * rise); // the knots: see the data file
    EXPECT_NEAR(between("carbon steel", 735, 900), fall, 0.0015 * fall);
    EXPECT_NEAR(between("carbon steel", 20, 1200), 827.1e3, 0.5e3);
    EXPECT_NEAR(between("austenitic stainless steel", 20, 1200), 634.4e3, 0.05e3);
    // Iron of the NASA Glenn set, with its change from ferrite to austenite at 1184 K.
    const auto iron = [](const char* symbol, double t) {
        return enthalpy_of("Fe", symbol, C(t)) - enthalpy_of("Fe", "cr,alpha", C(20.0));
    };
    EXPECT_NEAR(between("carbon steel", 20, 600) / iron("cr,alpha", 600), 1.0, 0.01);
    EXPECT_NEAR(between("carbon steel", 20, 1200) / iron("cr,gamma", 1200), 1.0, 0.03);
    // The formulas between 600 and 900 °C, half way between knots at the worst.
    for (int t = 600; t <= 900; ++t) {
        const double formula = t <= 735 ? 666.0 + 13002.0 / (738.0 - t) : 545.0 + 17820.0 / (t - 731.0);
        EXPECT_NEAR(cp_of("carbon steel", "cr", C(t)) / formula, 1.0, 0.005) << t;
    }
}

// Enthalpies of fusion against what can be worked out from elsewhere.
TEST(PlantSubstances, EnthalpiesOfFusion)
{
    const auto fusion = [](const char* name) {
        const registry::Substance& substance = *registry::find_substance(name).substance;
        const double T = substance.transitions[0].nominal_temperature;
        return enthalpy_of(name, "l", T) - enthalpy_of(name, "cr", T);
    };
    // Even alkanes: the entropy of fusion grows evenly with the carbon number. C14: 45.07 kJ/mol at 279.0 K, Finke et
    // al. 1954, from memory; C20 is the figure of van Miltenburg et al. 1999, seen.
    const auto molar_entropy = [&](const char* name) {
        const registry::Substance& substance = *registry::find_substance(name).substance;
        return fusion(name) * substance.molar_mass / substance.transitions[0].nominal_temperature;
    };
    const double c14 = 45070.0 / 279.0, c16 = molar_entropy("hexadecane"), c18 = molar_entropy("octadecane"),
                 c20 = molar_entropy("eicosane");
    EXPECT_NEAR(c20, 69922.0 / 309.65, 0.01);
    EXPECT_NEAR(0.5 * (c16 + c20) / c18, 1.0, 0.005);
    EXPECT_NEAR((2.0 * c20 + c14) / 3.0 / c18, 1.0, 0.005);
    EXPECT_NEAR((2.0 * c14 + c20) / 3.0 / c16, 1.0, 0.005);

    // Hydrates: the step to the anhydrous salt and liquid water at 298.15 K, with the enthalpy of formation of the
    // hydrate by the NBS tables of chemical thermodynamic properties (1982), from memory, J/mol. What the salt gives off
    // or takes up in dissolving is not in it.
    const auto dehydration = [](const char* name, const char* salt, const char* symbol, double n, double formation) {
        const auto molar = [](const char* substance, const char* s) {
            return registry::find_substance(substance).substance->molar_mass * enthalpy_of(substance, s, 298.15);
        };
        return (molar(salt, symbol) + n * molar("H2O", "l") - formation)
             / registry::find_substance(name).substance->molar_mass;
    };
    EXPECT_NEAR(dehydration("sodium sulfate decahydrate", "Na2SO4", "cr,V", 10, -4327260.0),
                fusion("sodium sulfate decahydrate"), 0.10 * 252000.0);
    EXPECT_NEAR(dehydration("lithium nitrate trihydrate", "LiNO3", "cr", 3, -1374400.0),
                fusion("lithium nitrate trihydrate"), 0.05 * 287000.0);

    // Schaake et al. 1982, from memory; Adriaanse et al. 1965, in the NIST WebBook, seen.
    EXPECT_NEAR(fusion("palmitic acid"), 209400.0, 0.02 * 208200.0);
    EXPECT_NEAR(fusion("stearic acid"), 221500.0, 0.055 * 210800.0);
    // Kakiuchi et al. 1998, from memory.
    EXPECT_NEAR(fusion("erythritol"), 339800.0, 0.095 * 310500.0);
}

// A coolant has no values below its freezing point, a food none below the temperature from which ice forms.
TEST(PlantSubstances, NothingBelowFreezing)
{
    const std::map<std::string, double> freezing{ // °C
        {"propylene glycol 20 %", -7.1}, {"propylene glycol 40 %", -21.1}, {"ethylene glycol 30 vol%", -14.0},
        {"sodium chloride brine 5 %", -2.97}, {"sea water 35 g/kg", -1.9}, {"whole milk", -0.6}};
    for (const auto& [name, t] : freezing)
        EXPECT_NEAR(registry::limits_of(*phase_of(name, "l"), bar).trust.lower, C(t), 1e-9) << name;
    EXPECT_NEAR(registry::limits_of(*phase_of("carrot", "cr"), bar).trust.lower, C(-1.4), 1e-9);
}

TEST(PlantSubstances, AreToldApartAndExplained)
{
    EXPECT_GE(plant_phases().size(), 60u);
    for (const PlantPhase& phase : plant_phases()) {
        const std::string_view reason = phase.phase->uncertainty.reason;
        EXPECT_TRUE(reason.starts_with(
            phase.phase->uncertainty.origin == registry::Origin::derived ? "derived: " : "assigned here"))
            << phase.state();
        EXPECT_GE(phase.phase->uncertainty.relative, 0.002) << phase.state();
        EXPECT_FALSE(phase.model->gas) << phase.state();
    }
    EXPECT_NE(phase_of("carbon steel", "cr")->remark.find("design curve"), std::string_view::npos);
    EXPECT_EQ(registry::find_substance("PG 30%").substance,
              registry::find_substance("propylene glycol 30 %").substance);
    EXPECT_EQ(registry::find_substance("Diesel Fuel").substance->name, "mineral oil d 0.84");
}

} // namespace
} // namespace entropy_ledger::testing
