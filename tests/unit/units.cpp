// Every unit against its published factor, and the grammar of units.
#include "functions/unit_table.hpp"
#include "functions/units.hpp"

#include <boost/units/base_units/imperial/foot.hpp>
#include <boost/units/base_units/imperial/ounce.hpp>
#include <boost/units/base_units/imperial/pound.hpp>
#include <boost/units/base_units/imperial/ton.hpp>
#include <boost/units/base_units/imperial/yard.hpp>
#include <boost/units/base_units/metric/atmosphere.hpp>
#include <boost/units/base_units/metric/bar.hpp>
#include <boost/units/base_units/metric/day.hpp>
#include <boost/units/base_units/metric/hour.hpp>
#include <boost/units/base_units/metric/liter.hpp>
#include <boost/units/base_units/metric/minute.hpp>
#include <boost/units/base_units/metric/mmHg.hpp>
#include <boost/units/base_units/metric/ton.hpp>
#include <boost/units/base_units/metric/torr.hpp>
#include <boost/units/base_units/us/pound_force.hpp>
#include <boost/units/base_units/us/ton.hpp>
#include <boost/units/quantity.hpp>
#include <boost/units/systems/si.hpp>
#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <set>
#include <string>
#include <string_view>
#include <vector>

namespace {

using namespace entropy_ledger::functions;
using namespace entropy_ledger::functions::dimensions;

std::string reason_for(std::string_view text)
{
    Reason reason;
    const auto unit = read_unit(text, &reason);
    if (unit)
        return "read as a unit";
    return std::string(reason.text());
}

Unit unit_of(std::string_view text)
{
    Reason reason;
    const auto unit = read_unit(text, &reason);
    EXPECT_TRUE(unit) << text << ": " << reason.text();
    return unit.value_or(Unit{{}, 0, std::numeric_limits<double>::quiet_NaN()});
}

// A unit with its published factor. `tolerance` is half a unit of the last published digit, relative; 0 where the
// published figure is the exact definition (then one rounding is allowed).
struct Published {
    std::string_view name;
    Dimension dimension;
    double factor;
    double tolerance;
};

constexpr Dimension frequency{0, 0, -1, 0, 0};
constexpr double seven_digits = 5e-7;  // NIST SP 811 (2008), B.8 gives seven digits where a factor is not exact

// "SI": SI Brochure, 9th ed. "SP811": NIST SP 811 (2008), B.8. "UCUM": https://ucum.org. All from memory; they were
// typed apart from the definitions in unit_table.cpp, mostly as decimals of another form.
const std::vector<Published> published{
    {"m", length, 1, 0},                                   // SI
    {"s", duration, 1, 0},                                     // SI
    {"g", mass, 1e-3, 0},                                  // SI
    {"K", temperature, 1, 0},                              // SI
    {"mol", amount_of_substance, 1, 0},                    // SI
    {"°K", temperature, 1, 0},                             // SI, former name
    {"sec", duration, 1, 0},                                   // usual
    {"Hz", frequency, 1, 0},                               // SI
    {"N", force, 1, 0},                                    // SI
    {"Pa", pressure, 1, 0},                                // SI
    {"J", energy, 1, 0},                                   // SI
    {"W", power, 1, 0},                                    // SI
    {"Cel", temperature, 1, 0},                            // SI
    {"°C", temperature, 1, 0},                             // SI
    {"degC", temperature, 1, 0},                           // SI
    {"[degF]", temperature, 5.555556e-1, seven_digits},    // SP811
    {"°F", temperature, 5.555556e-1, seven_digits},        // SP811
    {"degF", temperature, 5.555556e-1, seven_digits},      // SP811
    {"[degR]", temperature, 5.555556e-1, seven_digits},    // SP811
    {"°R", temperature, 5.555556e-1, seven_digits},        // SP811
    {"degR", temperature, 5.555556e-1, seven_digits},      // SP811
    {"min", duration, 60, 0},                                  // SI
    {"h", duration, 3600, 0},                                  // SI
    {"hr", duration, 3600, 0},                                 // SI
    {"d", duration, 8.64e4, 0},                                // SI
    {"day", duration, 8.64e4, 0},                              // SI
    {"wk", duration, 7 * 8.64e4, 0},                           // UCUM
    {"a", duration, 365.25 * 8.64e4, 0},                       // UCUM
    {"a_j", duration, 365.25 * 8.64e4, 0},                     // UCUM
    {"[in_i]", length, 2.54e-2, 0},                        // SP811
    {"in", length, 2.54e-2, 0},                            // SP811
    {"[ft_i]", length, 3.048e-1, 0},                       // SP811
    {"ft", length, 3.048e-1, 0},                           // SP811
    {"[yd_i]", length, 9.144e-1, 0},                       // SP811
    {"L", volume, 1e-3, 0},                                // SI
    {"l", volume, 1e-3, 0},                                // SI
    {"[cin_i]", volume, 1.638706e-5, seven_digits},        // SP811
    {"[cft_i]", volume, 2.831685e-2, seven_digits},        // SP811
    {"[gal_us]", volume, 3.785412e-3, seven_digits},       // SP811
    {"[gal_br]", volume, 4.54609e-3, 0},                   // SP811
    {"t", mass, 1e3, 0},                                   // SI
    {"tonne", mass, 1e3, 0},                               // SI
    {"tonnes", mass, 1e3, 0},                              // SI
    {"[lb_av]", mass, 0.45359237, 0},                      // SP811, exact
    {"lb", mass, 0.45359237, 0},                           // SP811, exact
    {"lbs", mass, 0.45359237, 0},                          // SP811, exact
    {"lbm", mass, 0.45359237, 0},                          // SP811, exact
    {"[oz_av]", mass, 2.834952e-2, seven_digits},          // SP811
    {"[gr]", mass, 6.479891e-5, 0},                        // SP811, exact
    {"[ston_av]", mass, 9.071847e2, seven_digits},         // SP811
    {"[lton_av]", mass, 1.016047e3, seven_digits},         // SP811
    {"lbmol", amount_of_substance, 453.59237, 0},          // pound in grams, exact
    {"dyn", force, 1e-5, 0},                               // SP811
    {"gf", force, 9.80665e-3, 0},                          // SP811: kgf 9.80665 N
    {"[lbf_av]", force, 4.448222, seven_digits},           // SP811
    {"lbf", force, 4.448222, seven_digits},                // SP811
    {"bar", pressure, 1e5, 0},                             // SI
    {"atm", pressure, 1.01325e5, 0},                       // SP811, exact
    {"att", pressure, 9.80665e4, 0},                       // SP811, exact
    {"[psi]", pressure, 6.894757e3, seven_digits},         // SP811
    {"psi", pressure, 6.894757e3, seven_digits},           // SP811
    {"Torr", pressure, 1.333224e2, seven_digits},          // SP811
    {"torr", pressure, 1.333224e2, seven_digits},          // SP811
    {"m[Hg]", pressure, 133322.387415, 0},                 // 13 595.1 * 9.80665
    {"mHg", pressure, 133322.387415, 0},                   // 13 595.1 * 9.80665
    {"m[H2O]", pressure, 9.80665e3, 0},                    // SP811: mmH2O conventional 9.80665 Pa
    {"mH2O", pressure, 9.80665e3, 0},                      // SP811
    {"[in_i'Hg]", pressure, 3.386389e3, seven_digits},     // SP811, conventional
    {"inHg", pressure, 3.386389e3, seven_digits},          // SP811, conventional
    {"[in_i'H2O]", pressure, 2.490889e2, seven_digits},    // SP811, conventional
    {"inH2O", pressure, 2.490889e2, seven_digits},         // SP811, conventional
    {"Wh", energy, 3.6e3, 0},                              // SI
    {"erg", energy, 1e-7, 0},                              // SP811
    {"eV", energy, 1.602176634e-19, 0},                    // SI, exact
    {"cal", energy, 4.184, 0},                             // SP811, exact
    {"cal_th", energy, 4.184, 0},                          // SP811, exact
    {"cal_IT", energy, 4.1868, 0},                         // SP811, exact
    {"[Btu]", energy, 1.054350e3, 0},                      // UCUM
    {"[Btu_th]", energy, 1.054350e3, 0},                   // UCUM, SP811
    {"[Btu_IT]", energy, 1.05505585262e3, 0},              // SP811, footnote 9, exact
    {"Btu", energy, 1.05505585262e3, 0},                   // SP811
    {"BTU", energy, 1.05505585262e3, 0},                   // SP811
    {"kBtu", energy, 1.05505585262e6, 0},                  // SP811
    {"MMBtu", energy, 1.05505585262e9, 0},                 // SP811
    {"MMBTU", energy, 1.05505585262e9, 0},                 // SP811
    {"[HP]", power, 7.456999e2, seven_digits},             // SP811, 550 ft.lbf/s
    {"%", dimensionless, 1e-2, 0},                         // SI 5.4.7
    {"[ppm]", dimensionless, 1e-6, 0},                     // UCUM
    {"ppm", dimensionless, 1e-6, 0},                       // UCUM
};

TEST(Units, EveryUnitHasItsPublishedFactor)
{
    for (const Published& expected : published) {
        const Unit unit = unit_of(expected.name);
        EXPECT_EQ(unit.dimension, expected.dimension) << expected.name;
        const double tolerance = expected.tolerance + 2.3e-16;
        EXPECT_NEAR(unit.factor() / expected.factor, 1.0, tolerance) << expected.name;
    }
}

TEST(Units, NoUnitIsLeftUnchecked)
{
    std::set<std::string_view> checked;
    for (const Published& expected : published)
        checked.insert(expected.name);
    for (const NamedUnit& named : named_units())
        EXPECT_TRUE(checked.contains(named.name)) << named.name;
    EXPECT_EQ(checked.size(), named_units().size());
}

// The psi from its definition with other arithmetic: lb * g_n / in2 (NIST SP 811: 6.894757 E+03).
TEST(Units, PoundPerSquareInchToAllDigits)
{
    const long double exact = 0.45359237L * 9.80665L / (0.0254L * 0.0254L);
    EXPECT_DOUBLE_EQ(unit_of("[psi]").factor(), static_cast<double>(exact));
    const long double horsepower = 550.0L * 0.3048L * 0.45359237L * 9.80665L;
    EXPECT_DOUBLE_EQ(unit_of("[HP]").factor(), static_cast<double>(horsepower));
}

template <class BoostUnit, class SiUnit>
double boost_factor(const BoostUnit& unit, const SiUnit&)
{
    namespace bu = boost::units;
    return bu::quantity<SiUnit>(bu::quantity<BoostUnit>(1.0 * unit)).value();
}

// Boost.Units as an independent table.
TEST(Units, AgreeWithBoostUnits)
{
    namespace bu = boost::units;
    const auto check = [](std::string_view name, double expected, double tolerance) {
        EXPECT_NEAR(unit_of(name).factor() / expected, 1.0, tolerance) << name;
    };
    check("lb", boost_factor(bu::imperial::pound_base_unit::unit_type(), bu::si::mass()), 1e-15);
    check("[oz_av]", boost_factor(bu::imperial::ounce_base_unit::unit_type(), bu::si::mass()), 1e-15);
    check("[ston_av]", boost_factor(bu::us::ton_base_unit::unit_type(), bu::si::mass()), 1e-15);
    check("[lton_av]", boost_factor(bu::imperial::ton_base_unit::unit_type(), bu::si::mass()), 1e-15);
    check("t", boost_factor(bu::metric::ton_base_unit::unit_type(), bu::si::mass()), 1e-15);
    check("ft", boost_factor(bu::imperial::foot_base_unit::unit_type(), bu::si::length()), 1e-15);
    check("[yd_i]", boost_factor(bu::imperial::yard_base_unit::unit_type(), bu::si::length()), 1e-15);
    check("L", boost_factor(bu::metric::liter_base_unit::unit_type(), bu::si::volume()), 1e-15);
    check("min", boost_factor(bu::metric::minute_base_unit::unit_type(), bu::si::time()), 1e-15);
    check("h", boost_factor(bu::metric::hour_base_unit::unit_type(), bu::si::time()), 1e-15);
    check("d", boost_factor(bu::metric::day_base_unit::unit_type(), bu::si::time()), 1e-15);
    check("bar", boost_factor(bu::metric::bar_base_unit::unit_type(), bu::si::pressure()), 1e-15);
    check("atm", boost_factor(bu::metric::atmosphere_base_unit::unit_type(), bu::si::pressure()), 1e-15);
    check("Torr", boost_factor(bu::metric::torr_base_unit::unit_type(), bu::si::pressure()), 1e-6);
    // Boost.Units gives mmHg with six digits, 133.322 Pa.
    check("mmHg", boost_factor(bu::metric::mmHg_base_unit::unit_type(), bu::si::pressure()), 4e-6);
    check("lbf", boost_factor(bu::us::pound_force_base_unit::unit_type(), bu::si::force()), 1e-6);
}

TEST(Units, OnlyTemperatureScalesHaveAnOrigin)
{
    for (const NamedUnit& named : named_units()) {
        const bool celsius = named.name == "Cel" || named.name == "°C" || named.name == "degC";
        const bool fahrenheit = named.name == "[degF]" || named.name == "°F" || named.name == "degF";
        EXPECT_EQ(unit_of(named.name).origin, celsius || fahrenheit ? 273.15 : 0.0) << named.name;
        EXPECT_EQ(unit_of(named.name).start, fahrenheit ? 32.0 : 0.0) << named.name;
    }
    EXPECT_EQ(unit_of("Cel").to_si(25.0), 298.15);
    EXPECT_EQ(unit_of("[degF]").to_si(32.0), 273.15);
    EXPECT_EQ(unit_of("[degF]").to_si(212.0), 373.15);
    EXPECT_EQ(unit_of("[degF]").to_si(-459.67), 0.0);
}

TEST(Units, PrefixesMultiply)
{
    const std::vector<std::pair<std::string_view, double>> factors{
        {"YJ", 1e24}, {"ZJ", 1e21}, {"EJ", 1e18}, {"PJ", 1e15}, {"TJ", 1e12}, {"GJ", 1e9},    {"MJ", 1e6},
        {"kJ", 1e3},  {"hJ", 1e2},  {"daJ", 1e1}, {"dJ", 1e-1}, {"cJ", 1e-2}, {"mJ", 1e-3},   {"uJ", 1e-6},
        {"µJ", 1e-6}, {"μJ", 1e-6}, {"nJ", 1e-9}, {"pJ", 1e-12}, {"fJ", 1e-15}, {"aJ", 1e-18}, {"zJ", 1e-21},
        {"yJ", 1e-24}};
    for (const auto& [text, factor] : factors) {
        EXPECT_DOUBLE_EQ(unit_of(text).factor(), factor) << text;
        EXPECT_EQ(unit_of(text).dimension, energy) << text;
    }
    EXPECT_EQ(unit_of("kg"), (Unit{mass}));
    EXPECT_EQ(unit_of("Mg").factor(), 1e3);
    EXPECT_EQ(unit_of("kt").factor(), 1e6);
    EXPECT_EQ(unit_of("mbar").factor(), 100.0);
    EXPECT_EQ(unit_of("kWh").factor(), 3.6e6);
    EXPECT_NEAR(unit_of("mm[Hg]").factor(), 133.322387415, 1e-12);
    EXPECT_NEAR(unit_of("mmHg").factor(), 133.322387415, 1e-12);
    EXPECT_NEAR(unit_of("cmH2O").factor(), 98.0665, 1e-12);
    EXPECT_EQ(unit_of("kgf").factor(), 9.80665);
    EXPECT_EQ(unit_of("kgf/cm2").dimension, pressure);
    EXPECT_NEAR(unit_of("kgf/cm2").factor(), 98066.5, 1e-10);
}

TEST(Units, UnitsWithoutPrefixesTakeNone)
{
    for (const std::string_view text : {"kh", "mmin", "k[psi]", "kpsi", "matm", "mCel", "m°C", "k[lb_av]", "klb", "k%",
                                        "mt", "pt", "kkg", "mkg", "k", "da", "kd"})
        EXPECT_NE(reason_for(text).find("no unit is called"), std::string::npos) << text << ": " << reason_for(text);
    EXPECT_EQ(unit_of("ft").dimension, length);  // not the femtotonne
    EXPECT_EQ(unit_of("min").dimension, duration);   // not a milli-inch
}

TEST(Units, UsualTextsAgreeWithTheGrammar)
{
    // Parentheses take the long way.
    for (const std::string_view text :
         {"°C", "K", "bar", "kg", "kg/s", "kW", "kJ", "mol", "kPa", "kJ/K", "W", "J"}) {
        const std::string enclosed = "(" + std::string(text) + ")";
        EXPECT_EQ(unit_of(text), unit_of(enclosed)) << text;
        EXPECT_EQ(unit_of(text), unit_of(std::string(text) + " ")) << text;
    }
}

TEST(Units, ProductsAndQuotients)
{
    struct Case {
        std::string_view text;
        Dimension dimension;
        double factor;
    };
    const std::vector<Case> cases{
        {"kg/s", mass_rate, 1.0},
        {"t/h", mass_rate, 1000.0 / 3600.0},
        {"kmol/h", molar_rate, 1000.0 / 3600.0},
        {"kJ/K", heat_capacity, 1000.0},
        {"W/K", heat_capacity_rate, 1.0},
        {"kW.h", energy, 3.6e6},
        {"kW·h", energy, 3.6e6},
        {"kW⋅h", energy, 3.6e6},
        {"kW*h", energy, 3.6e6},
        {"kW×h", energy, 3.6e6},
        {"kW h", energy, 3.6e6},
        {"kW\u00A0h", energy, 3.6e6},
        {" kW  h ", energy, 3.6e6},
        {"J/(kg.K)", specific_heat_capacity, 1.0},
        {"J/(kg K)", specific_heat_capacity, 1.0},
        {"kJ/(kg·K)", specific_heat_capacity, 1000.0},
        {"J/kg/K", specific_heat_capacity, 1.0},
        {"J kg-1 K-1", specific_heat_capacity, 1.0},
        {"J kg⁻¹ K⁻¹", specific_heat_capacity, 1.0},
        {"J.kg-1.K-1", specific_heat_capacity, 1.0},
        {"J per kg per K", specific_heat_capacity, 1.0},
        {"kJ per (kg K)", specific_heat_capacity, 1000.0},
        {"kJ/(mol K)", molar_heat_capacity, 1000.0},
        {"kg per s", mass_rate, 1.0},
        {"kg⁄s", mass_rate, 1.0},
        {"kg∕s", mass_rate, 1.0},
        {"N/m2", pressure, 1.0},
        {"N/m^2", pressure, 1.0},
        {"N/m²", pressure, 1.0},
        {"N.m-2", pressure, 1.0},
        {"N m⁻²", pressure, 1.0},
        {"N m^-2", pressure, 1.0},
        {"kg.m+2/s2", energy, 1.0},
        {"kg.m2/s2", energy, 1.0},
        {"kg m²/s³", power, 1.0},
        {"(kg.m2)/(s2.K)", heat_capacity, 1.0},
        {"(m/s)2", specific_energy, 1.0},
        {"(m/s)²", specific_energy, 1.0},
        {"(s/m)-2", specific_energy, 1.0},
        {"m3", volume, 1.0},
        {"dm3", volume, 1e-3},
        {"cm³", volume, 1e-6},
        {"/s", frequency, 1.0},
        {"1/s", frequency, 1.0},
        {"per s", frequency, 1.0},
        {"s-1", frequency, 1.0},
        {"1", dimensionless, 1.0},
        {"g/g", dimensionless, 1.0},
        {"g/mol", molar_mass, 1e-3},
        {"lb/h", mass_rate, 0.45359237 / 3600.0},
        {"Btu/h", power, 1055.05585262 / 3600.0},
        {"Btu/lb", specific_energy, 2326.0},                 // exact: the definition of Btu_IT (SP811, footnote 9)
        {"Btu/(lb·°F)", specific_heat_capacity, 4186.8},     // exact by the same definition
        {"Btu/(lb.[degR])", specific_heat_capacity, 4186.8},
        {"kcal_IT/(kg K)", specific_heat_capacity, 4186.8},
        {"kJ/°C", heat_capacity, 1000.0},
        {"kJ/(kg °C)", specific_heat_capacity, 1000.0},
        {"J kg⁻¹ °C⁻¹", specific_heat_capacity, 1.0},
        {"((((kg))))", mass, 1.0},
    };
    for (const Case& expected : cases) {
        const Unit unit = unit_of(expected.text);
        EXPECT_EQ(unit.dimension, expected.dimension) << expected.text;
        EXPECT_NEAR(unit.factor() / expected.factor, 1.0, 1e-15) << expected.text;
        EXPECT_FALSE(unit.is_scale()) << expected.text;
    }
}

TEST(Units, SpellingsOfTheDegree)
{
    for (const std::string_view text : {"°C", "ºC", "˚C", "℃", "° C", "Cel", "degC", "(°C)"})
        EXPECT_EQ(unit_of(text), (Unit{temperature, 0, 1.0, 1.0, 0.0, 273.15})) << text;
    for (const std::string_view text : {"°F", "ºF", "℉", "° F", "[degF]", "degF"})
        EXPECT_EQ(unit_of(text), (Unit{temperature, 0, 5.0, 9.0, 32.0, 273.15})) << text;
    EXPECT_EQ(unit_of("\u212A"), (Unit{temperature}));  // KELVIN SIGN
}

TEST(Units, TemperatureScalesStandAlone)
{
    for (const std::string_view text : {"°C.m", "m.°C", "°C2", "°C²", "°C-2", "°C/h", "W.Cel", "J/(kg/°C)", "J/°C2",
                                        "°C/°C", "(°C)2", "(°C.m)-1.°C"})
        EXPECT_EQ(reason_for(text), "temperatures in °C cannot be multiplied: write K") << text;
    EXPECT_EQ(reason_for("[degF].m"), "temperatures in °F cannot be multiplied: write K");
}

TEST(Units, ProductAfterADivisionIsRefused)
{
    for (const std::string_view text : {"J/kg.K", "J/kg K", "J/kg·K", "kJ per kg K", "/K.m", "J/(kg).K"})
        EXPECT_EQ(reason_for(text), "a product after a division has two readings: put the divisor in parentheses")
            << text;
}

TEST(Units, GaugePressureIsRefused)
{
    for (const std::string_view text :
         {"barg", "bar(g)", "bar (g)", "bar g", "bar gauge", "bar(gauge)", "bar_g", "barü", "barÜ", "psig", "psi(g)",
          "psi g", "psi gage", "[psig]", "kPag", "kPa(g)", "kPa g", "MPag", "MPa (g)", "mmHg(g)", "mbarg", "barG"})
        EXPECT_EQ(reason_for(text), "gauge pressure: give absolute pressure") << text;
    EXPECT_EQ(reason_for("bar{gauge}"), "notes in braces are not read in a unit");
}

TEST(Units, AbsolutePressureIsMarkedOrNot)
{
    for (const std::string_view text : {"bar", "bara", "bar(a)", "bar (a)", "bar a", "bar abs", "bar(abs)", "bar_a",
                                        "bar absolute", "bar ( a )"})
        EXPECT_EQ(unit_of(text), (Unit{pressure, 5})) << text;
    EXPECT_EQ(unit_of("psia"), unit_of("psi"));
    EXPECT_EQ(unit_of("psi(a)"), unit_of("[psi]"));
    EXPECT_EQ(unit_of("kPa(a)"), unit_of("kPa"));
    EXPECT_EQ(unit_of("m3.Pa"), unit_of("J"));
    EXPECT_EQ(unit_of("Pa m3"), unit_of("J"));
    EXPECT_EQ(unit_of("Pa (m3)"), unit_of("J"));
}

TEST(Units, UnknownNamesAreQuoted)
{
    EXPECT_EQ(reason_for("kgg"), "no unit is called \"kgg\"");
    EXPECT_EQ(reason_for("m2K"), "no unit is called \"m2K\"");
    EXPECT_EQ(reason_for("kg/furlong"), "no unit is called \"furlong\"");
    EXPECT_EQ(reason_for("😀"), "no unit is called \"😀\"");
    EXPECT_EQ(reason_for("Ω"), "no unit is called \"Ω\"");
    EXPECT_EQ(reason_for("[degX]"), "no unit is called \"[degX]\"");
}

TEST(Units, WrongCaseIsPutRight)
{
    EXPECT_EQ(reason_for("Kg"), "no unit is called \"Kg\": write kg");
    EXPECT_EQ(reason_for("KW"), "no unit is called \"KW\": write kW");
    EXPECT_EQ(reason_for("PSI"), "no unit is called \"PSI\": write psi");
    EXPECT_EQ(reason_for("k"), "no unit is called \"k\": write K");
    EXPECT_EQ(reason_for("pa"), "no unit is called \"pa\": write Pa");
    EXPECT_EQ(reason_for("cel"), "no unit is called \"cel\": write Cel");
    EXPECT_EQ(reason_for("btu"), "no unit is called \"btu\": write Btu");
    EXPECT_EQ(reason_for("Mpa"), "no unit is called \"Mpa\"");  // MPa or mPa
}

TEST(Units, AdviceWhereANameHasSeveralMeanings)
{
    EXPECT_EQ(reason_for("C"), "\"C\" is the coulomb: write °C");
    EXPECT_EQ(reason_for("F"), "\"F\" is the farad: write °F");
    for (const std::string_view text : {"ton", "hp", "gal", "Cal", "MBtu", "yr", "Nm", "Nm3/h", "at", "deg C", "°"})
        EXPECT_NE(reason_for(text).find("write"), std::string::npos) << text;
}

TEST(Units, MalformedTextsAreRefused)
{
    struct Case {
        std::string_view text;
        std::string_view reason;
    };
    using namespace std::string_view_literals;
    const std::vector<Case> cases{
        {"", "there is no unit"},
        {"   ", "there is no unit"},
        {"kg//s", "\"/\" is not expected in a unit"},
        {"kg/", "the unit is incomplete"},
        {"kg.", "the unit is incomplete"},
        {"/", "the unit is incomplete"},
        {"kg per", "the unit is incomplete"},
        {".kg", "\".\" is not expected in a unit"},
        {"(kg", "a closing parenthesis is missing"},
        {"kg)", "a closing parenthesis has no opening one"},
        {"()", "\")\" is not expected in a unit"},
        {"[degF", "a closing bracket ] is missing"},
        {"m^", "an exponent is missing after \"^\""},
        {"m^-", "an exponent is missing after \"^\""},
        {"m-", "\"-\" is not expected in a unit"},
        {"lb-mol", "write lbmol for the pound-mole"},
        {"kW-h", "\"-\" does not join units: write \".\" between them"},
        {"m0", "the exponent of a unit is a whole number from 1 to 9, with or without sign"},
        {"m10", "the exponent of a unit is a whole number from 1 to 9, with or without sign"},
        {"m99999999999999999999", "the exponent of a unit is a whole number from 1 to 9, with or without sign"},
        {"12", "the number \"12\" stands where a unit is expected"},
        {"kg.7", "the number \"7\" stands where a unit is expected"},
        {"kg{dry}", "notes in braces are not read in a unit"},
        {"K ± 0.2 K", "an uncertainty (±) is not read here: give the value alone"},
        {"K +/- 0.2 K", "an uncertainty (±) is not read here: give the value alone"},
        {"kg\0"sv, "\"\uFFFD\" is not expected in a unit"},
        {"\0K"sv, "\"\uFFFD\" is not expected in a unit"},
        {"\xFF", "no unit is called \"\uFFFD\""},
        {"\xC2", "no unit is called \"\uFFFD\""},
        {"\xE2\x82", "no unit is called \"\uFFFD\uFFFD\""},
        {"\xED\xA0\x80", "no unit is called \"\uFFFD\uFFFD\uFFFD\""},  // a surrogate
        {"\xC0\xAF", "no unit is called \"\uFFFD\uFFFD\""},            // overlong "/"
    };
    for (const Case& expected : cases)
        EXPECT_EQ(reason_for(expected.text), expected.reason) << expected.text;
    EXPECT_FALSE(read_unit("kgg"));  // without asking for the reason
}

TEST(Units, NestingAndLengthAreBounded)
{
    const auto nested = [](std::size_t depth) {
        return std::string(depth, '(') + "kg" + std::string(depth, ')');
    };
    EXPECT_EQ(unit_of(nested(16)), (Unit{mass}));
    EXPECT_EQ(reason_for(nested(17)), "too many parentheses");
    EXPECT_EQ(reason_for(std::string(199, '(')), "too many parentheses");
    EXPECT_EQ(reason_for(std::string(201, 'm')), "the text is too long");
    EXPECT_EQ(reason_for(std::string(1000000, '(')), "the text is too long");
    EXPECT_EQ(reason_for(std::string(200, 'm')), "no unit is called \"" + std::string(40, 'm') + "…\"");
}

TEST(Units, LargeExponentsAreRefused)
{
    std::string tower = "Ym";
    for (int i = 0; i < 16; ++i)
        tower = "(" + tower + ")9";
    EXPECT_EQ(reason_for(tower), "the unit has too large an exponent");
    tower = "[psi]";
    for (int i = 0; i < 16; ++i)
        tower = "(" + tower + ")-9";
    EXPECT_EQ(reason_for(tower), "the unit has too large an exponent");
    EXPECT_EQ(reason_for("(Ym9)9"), "the unit has too large an exponent");
    EXPECT_EQ(unit_of("(m9)9").dimension.length, 81);
    EXPECT_EQ(reason_for("(m9)9.(m9)9"), "the unit has too large an exponent");
}

TEST(Units, DimensionsHaveNames)
{
    EXPECT_EQ(name_of(unit_of("W/K").dimension), "heat capacity rate");
    EXPECT_EQ(name_of(unit_of("psi").dimension), "pressure");
    EXPECT_EQ(name_of(unit_of("lb/h").dimension), "mass rate");
    EXPECT_EQ(name_of(entropy), name_of(heat_capacity));
    EXPECT_EQ(name_of(Dimension{7, 0, 0, 0, 0}), "");
}

} // namespace
