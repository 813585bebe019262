// Quantities as written in cells: every accepted form, every refusal, hostile texts.
#include "functions/quantity.hpp"

#include <gtest/gtest.h>

#include <clocale>
#include <cmath>
#include <cstdlib>
#include <limits>
#include <random>
#include <string>
#include <string_view>
#include <vector>

namespace {

using namespace entropy_ledger::functions;
using namespace std::string_view_literals;

Quantity quantity_of(std::string_view text)
{
    const Reading reading = read_quantity(text);
    if (const auto* refused = std::get_if<Unreadable>(&reading)) {
        ADD_FAILURE() << text << ": " << refused->reason.text();
        return {std::numeric_limits<double>::quiet_NaN(), {}, false};
    }
    return std::get<Quantity>(reading);
}

double value_of(std::string_view text) { return quantity_of(text).value; }

std::string refusal(std::string_view text)
{
    const Reading reading = read_quantity(text);
    if (const auto* refused = std::get_if<Unreadable>(&reading))
        return std::string(refused->reason.text());
    return "read as " + std::to_string(std::get<Quantity>(reading).value);
}

struct Expected {
    std::string_view text;
    double value;
    Dimension dimension;
};

TEST(Quantity, UsualCells)
{
    const std::vector<Expected> cases{
        {"-6 °C", 267.15, dimensions::temperature},
        {"2.5 bar", 250000.0, dimensions::pressure},
        {"2,5 bar", 250000.0, dimensions::pressure},
        {"18 mol", 18.0, dimensions::amount_of_substance},
        {"1.2 kg/s", 1.2, dimensions::mass_rate},
        {"30 Cel", 303.15, dimensions::temperature},
        {"1.2e3 kJ", 1.2e6, dimensions::energy},
        {"350 kW", 350000.0, dimensions::power},
        {"4.2 kJ/K", 4200.0, dimensions::heat_capacity},
        {"12 t/h", 12000.0 / 3600.0, dimensions::mass_rate},
        {"36 t/h", 10.0, dimensions::mass_rate},
        {"0.9 atm", 91192.5, dimensions::pressure},
        {"3 kmol/h", 3000.0 / 3600.0, dimensions::molar_rate},
        {"250 kWh", 9e8, dimensions::energy},
        {"250 kW.h", 9e8, dimensions::energy},
        {"50 %", 0.5, dimensions::dimensionless},
        {"0.5 1/K", 0.5, Dimension{0, 0, 0, -1, 0}},
        {"25psi", 172368.93232920902, dimensions::pressure},  // NIST SP 811: 25 * 6 894.757 293 168 361
        {"25 [psi]", 172368.93232920902, dimensions::pressure},
    };
    for (const Expected& expected : cases) {
        const Quantity quantity = quantity_of(expected.text);
        EXPECT_DOUBLE_EQ(quantity.value, expected.value) << expected.text;
        EXPECT_EQ(quantity.dimension, expected.dimension) << expected.text;
        EXPECT_TRUE(quantity.has_unit) << expected.text;
    }
    EXPECT_NEAR(value_of("85 [degF]"), 302.594444444444, 1e-12);  // (85 + 459.67)/1.8
}

TEST(Quantity, RoundNumbersAreExact)
{
    EXPECT_EQ(value_of("-6 °C"), 267.15);
    EXPECT_EQ(value_of("-6 °C"), -6 + 273.15);
    EXPECT_EQ(value_of("25 °C"), 298.15);
    EXPECT_EQ(value_of("0 °C"), 273.15);
    EXPECT_EQ(value_of("-273.15 °C"), 0.0);
    EXPECT_EQ(value_of("32 °F"), 273.15);
    EXPECT_EQ(value_of("212 °F"), 373.15);
    EXPECT_EQ(value_of("1.013 bar"), 101300.0);
    EXPECT_EQ(value_of("1.01325 bar"), 101325.0);
    EXPECT_EQ(value_of("0.101325 MPa"), 101325.0);
    EXPECT_EQ(value_of("1 atm"), 101325.0);
    EXPECT_EQ(value_of("760 Torr"), 101325.0);
    EXPECT_EQ(value_of("36 t/h"), 10.0);
    EXPECT_EQ(value_of("1000 cal"), 4184.0);
    EXPECT_EQ(value_of("1 lb"), 0.45359237);
    EXPECT_EQ(value_of("1 Btu"), 1055.05585262);
    EXPECT_EQ(value_of("1 [Btu]"), 1054.35);
    EXPECT_EQ(value_of("1 kgf/cm2"), 98066.5);
    // A prefix costs no accuracy: every decimal is the double of the shifted decimal.
    for (int i = 1; i < 2000; ++i) {
        const std::string milli = std::to_string(i) + " g";
        const std::string expected = std::to_string(i) + "e-3";
        EXPECT_EQ(value_of(milli), std::strtod(expected.c_str(), nullptr)) << milli;
        const std::string bar = std::to_string(i / 1000) + "." + std::to_string(1000 + i % 1000).substr(1) + " bar";
        EXPECT_EQ(value_of(bar), i * 100.0) << bar;
    }
}

TEST(Quantity, NumberAlone)
{
    const Quantity quantity = quantity_of("12");
    EXPECT_EQ(quantity.value, 12.0);
    EXPECT_FALSE(quantity.has_unit);
    EXPECT_FALSE(quantity_of("  -1.5e3  ").has_unit);
    EXPECT_EQ(value_of("  -1.5e3  "), -1500.0);
    EXPECT_EQ(without_unit("-6").reason.text(), "\"-6\" has no unit");
}

TEST(Quantity, DecimalSignsAndGroups)
{
    const std::vector<std::pair<std::string_view, double>> cases{
        {"1.2", 1.2},
        {"1,2", 1.2},
        {"1.200", 1.2},
        {"1.234.567", 1234567.0},
        {"1,234,567", 1234567.0},
        {"1.234,5", 1234.5},
        {"1,234.5", 1234.5},
        {"1.234.567,8", 1234567.8},
        {"1,234,567.8", 1234567.8},
        {"1.234,567", 1234.567},
        {"1,234.567", 1234.567},
        {"1,200.", 1200.0},
        {"0,125", 0.125},
        {"0,200", 0.2},
        {"-0,200", -0.2},
        {"1234,567", 1234.567},
        {"1,2345", 1.2345},
        {"1,20", 1.2},
        {",5", 0.5},
        {",500", 0.5},
        {".5", 0.5},
        {"5.", 5.0},
        {"1 200", 1200.0},
        {"12 345 678", 12345678.0},
        {"1\u00A0200", 1200.0},
        {"1\u2009200", 1200.0},
        {"1\u202F200", 1200.0},
        {"1\u2007200", 1200.0},
        {"1 200,5", 1200.5},
        {"1 200.5", 1200.5},
        {"1 234,567", 1234.567},
        {"1'200", 1200.0},
        {"1'234'567.25", 1234567.25},
        {"1’200,5", 1200.5},
        {"3.141 592 654", 3.141592654},
        {"3,1415 ", 3.1415},
        {"007", 7.0},
        {"1e3", 1000.0},
        {"1E+3", 1000.0},
        {"1e-3", 0.001},
        {"1e\u22123", 0.001},
        {"1,5e3", 1500.0},
        {"1.2×10^3", 1200.0},
        {"1.2 × 10^3", 1200.0},
        {"1.2 x 10^-3", 0.0012},
        {"1.2*10^3", 1200.0},
        {"1.2·10³", 1200.0},
        {"1.2×10⁻³", 0.0012},
        {"0e999999999999", 0.0},
    };
    for (const auto& [text, value] : cases) {
        EXPECT_EQ(value_of(text), value) << text;
        const std::string with_unit = std::string(text) + " K";
        const Quantity quantity = quantity_of(with_unit);
        EXPECT_EQ(quantity.value, value) << with_unit;
        EXPECT_TRUE(quantity.has_unit) << with_unit;
    }
    EXPECT_EQ(value_of("1.2×10³ kJ"), 1.2e6);
    EXPECT_EQ(value_of("1eV"), 1.602176634e-19);
}

TEST(Quantity, AmbiguousCommaIsRefused)
{
    EXPECT_EQ(refusal("1,200 kg"), "\"1,200\" could be 1.2 or 1200: write 1.2 or 1200");
    EXPECT_EQ(refusal("-1,250 kg"), "\"1,250\" could be -1.25 or -1250: write -1.25 or -1250");
    EXPECT_EQ(refusal("12,000 K"), "\"12,000\" could be 12 or 12000: write 12 or 12000");
    EXPECT_EQ(refusal("123,456"), "\"123,456\" could be 123.456 or 123456: write 123.456 or 123456");
    EXPECT_EQ(refusal("1,200e3 J"), "\"1,200\" could be 1.2 or 1200: write 1.2 or 1200");
    EXPECT_NE(refusal("1,200 300 kg").find("could be"), std::string::npos);
}

TEST(Quantity, BadGroupsAreRefused)
{
    for (const std::string_view text :
         {"1.2.3 kg", "1,2,3 kg", "12,34,567 kg", "1,234.567,8 kg", "1.234,567.8 kg", "1234 567 kg", "0 200 kg",
          "1 234,567.8 kg", "1'20 kg", "1'2000 kg", "1234'567 kg", "1'234 567 kg", "1.234. kg", "1.23 456 kg",
          "1.234'567 kg", "0,123,456 kg", ".123.456 kg"})
        EXPECT_NE(refusal(text).find("are not grouped in threes"), std::string::npos) << text << ": " << refusal(text);
    EXPECT_EQ(refusal("1 20 kg"), "the number \"20\" stands where a unit is expected");
    EXPECT_EQ(refusal("1 2000 kg"), "the number \"2000\" stands where a unit is expected");
    EXPECT_EQ(refusal("5, kg"), "\",\" is not expected in a unit");
}

TEST(Quantity, Signs)
{
    for (const std::string_view text : {"-6 °C", "\u22126 °C", "\u20136 °C", "- 6 °C", "-6°C", " -6  °C ", "-6\u00A0°C",
                                        "-6.0 °C", "-6,0 °C", "\t-6 °C\n"})
        EXPECT_EQ(value_of(text), 267.15) << text;
    EXPECT_EQ(value_of("+6 °C"), 279.15);
    EXPECT_FALSE(std::signbit(value_of("-0 K")));
    for (const std::string_view text : {"--6 °C", "+-6 °C", "-+6 °C", "\u2014 6 °C"})
        EXPECT_NE(refusal(text).find("does not begin with a number"), std::string::npos) << text;
}

TEST(Quantity, DoesNotDependOnTheLocale)
{
    const std::string before = std::setlocale(LC_ALL, nullptr);
    for (const char* locale : {"de_DE.UTF-8", "fr_FR.UTF-8", "C.UTF-8", "C"}) {
        if (!std::setlocale(LC_ALL, locale))
            continue;
        EXPECT_EQ(value_of("2.5 bar"), 250000.0) << locale;
        EXPECT_EQ(value_of("2,5 bar"), 250000.0) << locale;
    }
    std::setlocale(LC_ALL, before.c_str());
}

TEST(Quantity, RefusalsSayWhy)
{
    const std::vector<std::pair<std::string_view, std::string_view>> cases{
        {"", "the text is empty"},
        {"   ", "the text is empty"},
        {"\u00A0", "the text is empty"},
        {"K", "\"K\" does not begin with a number"},
        {"°", "\"°\" does not begin with a number"},
        {"-", "\"-\" does not begin with a number"},
        {".", "\".\" does not begin with a number"},
        {", kg", "\", kg\" does not begin with a number"},
        {"e5 K", "\"e5 K\" does not begin with a number"},
        {"nan", "\"nan\" does not begin with a number"},
        {"-inf K", "\"-inf K\" does not begin with a number"},
        {"infinity", "\"infinity\" does not begin with a number"},
        {"١٢ K", "\"١٢ K\" does not begin with a number"},  // Arabic-Indic digits
        {"０ K", "\"０ K\" does not begin with a number"},  // fullwidth digit
        {"😀 K", "\"😀 K\" does not begin with a number"},
        {"0x10", "no unit is called \"x\""},
        {"0x1p3 K", "no unit is called \"x1p\""},
        {"5 kgg", "no unit is called \"kgg\""},
        {"5 kg//s", "\"/\" is not expected in a unit"},
        {"5 °", "\"°\" is a plane angle: write °C or °F"},
        {"5 barg", "gauge pressure: give absolute pressure"},
        {"3 psi g", "gauge pressure: give absolute pressure"},
        {"5 °C.m", "temperatures in °C cannot be multiplied: write K"},
        {"298.15 ± 0.2 K", "an uncertainty (±) is not read here: give the value alone"},
        {"298.15 +/- 0.2 K", "an uncertainty (±) is not read here: give the value alone"},
        {"298.15 K ± 0.2 K", "an uncertainty (±) is not read here: give the value alone"},
        {"1e400 K", "\"1e400 K\" is too large or too small a number"},
        {"1e-400 K", "\"1e-400 K\" is too large or too small a number"},
        {"1e99999999999999999999 K", "\"1e99999999999999999999 K\" is too large or too small a number"},
        {"1e308 kJ", "\"1e308 kJ\" is too large or too small a number"},
        {"1.7e308 h", "\"1.7e308 h\" is too large or too small a number"},
        {"1e-323 ug", "\"1e-323 ug\" is too large or too small a number"},
        {"5e-324 /h", "\"5e-324 /h\" is too large or too small a number"},
        {"5\0 K"sv, "\"\uFFFD\" is not expected in a unit"},
        {"5 K\0"sv, "\"\uFFFD\" is not expected in a unit"},
        {"5 \0K"sv, "\"\uFFFD\" is not expected in a unit"},
        {"\0"sv, "\"\uFFFD\" does not begin with a number"},
        {"\xFF\xFE", "\"\uFFFD\uFFFD\" does not begin with a number"},
        {"5 \xC2", "no unit is called \"\uFFFD\""},
        {"5\xE2\x88", "no unit is called \"\uFFFD\uFFFD\""},
    };
    for (const auto& [text, reason] : cases)
        EXPECT_EQ(refusal(text), reason) << text;
}

TEST(Quantity, LongTexts)
{
    EXPECT_EQ(refusal(std::string(1 << 20, '9')), "the text is too long for a quantity");
    EXPECT_EQ(refusal(std::string(201, ' ')), "the text is too long for a quantity");
    EXPECT_EQ(refusal(std::string(200, '9') + "K"), "the text is too long for a quantity");
    EXPECT_EQ(value_of(std::string(200, '9')), 1e200);
    EXPECT_EQ(value_of("0." + std::string(196, '0') + "1K"), 1e-197);
    EXPECT_EQ(value_of("-" + std::string(190, '0') + "5 kJ"), -5000.0);
    std::string groups = "1";
    while (groups.size() + 4 <= 150)
        groups += " 000";
    EXPECT_EQ(value_of(groups), 1e111);
    EXPECT_NE(refusal(groups + std::string(" 000 000 000 000 000")).find("grouped"), std::string::npos);
    EXPECT_EQ(refusal("5 " + std::string(198, '(')), "too many parentheses");
}

// Well-formed in the sense of Unicode 15, table 3-7.
bool is_utf8(std::string_view text)
{
    while (!text.empty()) {
        const auto point = detail::decode(text);
        if (point.value == 0xFFFD && point.size == 1)
            return false;
        text.remove_prefix(point.size);
    }
    return true;
}

// Random splices of what the reader looks for. Whatever comes back is finite or has a reason in valid UTF-8.
TEST(Quantity, RandomTextsAreReadOrRefusedInOrder)
{
    const std::vector<std::string_view> parts{
        "1", "2", "200", "0", "9999", ".", ",", " ", "\u00A0", "\u202F", "'", "-", "+", "\u2212", "e", "E", "×10^",
        "10", "^", "²", "⁻", "¹", "(", ")", "[", "]", "{", "}", "/", "·", "per ", "kg", "J", "K", "°", "C", "°C",
        "[degF]", "bar", "g", "a", "psi", "m", "k", "da", "Y", "mol", "µ", "%", "±", "\xFF", "\xC2", "\xE2\x88", "\0"sv,
        "😀", "ü", "H2O", "nan", "inf", "0x", "\n"};
    std::mt19937 random(20240607);
    std::uniform_int_distribution<std::size_t> pick(0, parts.size() - 1);
    std::uniform_int_distribution<int> length(0, 24);
    int read = 0;
    for (int i = 0; i < 200000; ++i) {
        std::string text;
        if (i % 2 == 0)
            text = std::to_string(i % 1000) + " ";
        for (int n = length(random); n > 0; --n)
            text += parts[pick(random)];
        const Reading reading = read_quantity(text);
        if (const auto* quantity = std::get_if<Quantity>(&reading)) {
            ++read;
            ASSERT_TRUE(std::isfinite(quantity->value)) << text;
        } else {
            const std::string_view reason = std::get<Unreadable>(reading).reason.text();
            ASSERT_FALSE(reason.empty()) << text;
            ASSERT_TRUE(is_utf8(reason)) << text << ": " << reason;
        }
    }
    EXPECT_GT(read, 2000);  // the splices do reach the inside of the grammar
}

} // namespace
