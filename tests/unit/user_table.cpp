// The user's own table in a range of cells: right answers, and refusals that name the row.
#include "support/calling.hpp"

namespace entropy_ledger::testing {
namespace {

constexpr int unusable = 502;
constexpr int no_data = 32767;

using Rows = std::vector<std::vector<Cell>>;

Range table(const Rows& rows, std::size_t columns = 3)
{
    std::vector<Cell> cells;
    for (const auto& row : rows) {
        for (std::size_t c = 0; c < columns; ++c)
            cells.push_back(c < row.size() ? row[c] : empty());
    }
    return Range(rows.size(), columns, cells);
}

// A wax, invented: crystal to 300.5 K, liquid above, 210 kJ/kg.
Rows wax()
{
    return {{text("substance"), text("wax")},
            {text("Molar mass"), text("254.5 g/mol")},
            {text("source"), text("supplier's data sheet, invented")},
            {text("uncertainty"), text("3 %")},
            {empty()},
            {text("phase"), text("cr")},
            {text("temperature, K"), text("heat capacity, J/(kg K)")},
            {number(260), number(1800)},
            {number(300), number(2000)},
            {text("transition"), number(300.5), number(210e3)},
            {text("phase"), text("l")},
            {text("temperature, °C"), text("heat capacity [kJ/(kg K)]")},
            {number(25), number(2.2)},
            {number(75), number(2.4)}};
}

TEST(OwnTable, HeatsChangesAndSteps)
{
    const Range own = table(wax());
    // By hand: cp of the crystal is 1800 + 5 (T - 260).
    EXPECT_NEAR(value("HEAT.SENSIBLE", {own, 270, 290, 1}), 20.0 * 1900.0, 1e-7);
    EXPECT_NEAR(value("ENTROPY.SENSIBLE", {own, 270, 290, 1}), 500.0 * std::log(290.0 / 270.0) + 5.0 * 20.0, 1e-9);
    EXPECT_NEAR(value("HEAT.PHASE", {own, "cr", "l", 300.5, 2}), 420e3, 1e-6);
    EXPECT_NEAR(value("ENTROPY.PHASE", {own, "cr", "l", 300.5, 2}), 420e3 / 300.5, 1e-9);
    EXPECT_NEAR(value("TEMPERATURE.BALANCE", {own, "cr", "l"}), 300.5, 1e-9);
    // 300 K to 300.5 K at the held 2000, melting, and 25 °C + ... of the liquid: cp = 2200 + 4 (T - 298.15).
    const double liquid = 2200.0 * (320.0 - 300.5) + 2.0 * (21.85 * 21.85 - 2.35 * 2.35);
    EXPECT_NEAR(value("HEAT.CHANGE", {own, 290, own, 320, 1}), 10.0 * 1975.0 + 0.5 * 2000.0 + 210e3 + liquid, 1e-6);
    EXPECT_EQ(value("HEAT.CHANGE", {own, 290, own, 320, 1}), value("HEAT.CHANGE", {own, 290, "l", 320, 1}));
    EXPECT_NEAR(value("HEAT.CHANGE", {own, 290, own, 320, "2 mol"}), 0.509 * value("HEAT.CHANGE", {own, 290, own, 320, 1}), 1e-6);
    EXPECT_GT(value("GENERATION.PHASE", {own, "l", "cr", "22 °C", 1, "22 °C"}), 0.0) << "undercooled by 5 K";
    EXPECT_EQ(std::get<functions::MixedTable>(call("STEPS.CHANGE", {own, 290, own, 320, 1})).rows, 4u);
    EXPECT_NE(words("SOURCE.SENSIBLE", {own, 270, 290, 1}).find("supplier's data sheet"), std::string::npos);
    EXPECT_EQ(words("CHECK.SENSIBLE", {own, 270, 290, 1}).rfind("ok", 0), 0u);
    EXPECT_NEAR(value("TEMPERATURE.FINAL", {own, 290, "100 kJ", 1}), 300.5, 1e-9);
    EXPECT_NEAR(value("DATA.HEATCAPACITY", {own, 280}), 1900.0, 1e-9);
}

TEST(OwnTable, IsReadOnceForAWholeColumn)
{
    const Range own = table(wax());
    const Range T = Range::column({number(265), number(275), number(-1)});
    const auto result = std::get<functions::NumberTable>(call("HEAT.SENSIBLE", {own, T, 290, 1}));
    ASSERT_EQ(result.rows, 3u);
    EXPECT_EQ(result.numbers[1], value("HEAT.SENSIBLE", {own, 275, 290, 1}));
    EXPECT_EQ(code_of(result.numbers[2]), unusable);
}

TEST(OwnTable, NamesOfSubstancesStillSpread)
{
    const Range names(2, 2, {text("water(l)"), text("Al(cr)"), text("N2(g)"), text("O2(g)")});
    const auto result = std::get<functions::NumberTable>(call("HEAT.SENSIBLE", {names, 290, 300, 1}));
    EXPECT_EQ(result.numbers.size(), 4u);
    EXPECT_EQ(result.numbers[3], value("HEAT.SENSIBLE", {"O2(g)", 290, 300, 1}));
}

TEST(OwnTable, AStateRowChoosesThePhase)
{
    Rows rows = wax();
    rows.push_back({text("state"), text("l")});
    const Range own = table(rows);
    EXPECT_NEAR(value("DATA.HEATCAPACITY", {own, 290}), 2200.0, 1e-9) << "undercooled, held";
    rows.back()[1] = text("g");
    EXPECT_EQ(code_of(call("DATA.HEATCAPACITY", {table(rows), 290})), no_data);
}

TEST(OwnTable, RangeAndDirections)
{
    const Range own = table(wax());
    EXPECT_EQ(code_of(call("HEAT.SENSIBLE", {own, 200, 290, 1})), no_data);
    EXPECT_NE(words("CHECK.SENSIBLE", {own, 255, 290, 1}).find("uncertainty"), std::string::npos);
    EXPECT_NE(words("CHECK.SENSIBLE", {own, 290, 320, 1}).find("CHANGE"), std::string::npos);
}

struct BadTable {
    const char* what;
    Rows rows;
    const char* words; // of CHECK
};

class OwnTableRefusal : public ::testing::TestWithParam<BadTable> {};

TEST_P(OwnTableRefusal, NamesTheRow)
{
    const Range own = table(GetParam().rows);
    EXPECT_EQ(code_of(call("HEAT.SENSIBLE", {own, 270, 290, 1})), unusable);
    const std::string reason = words("CHECK.SENSIBLE", {own, 270, 290, 1});
    EXPECT_NE(reason.find(GetParam().words), std::string::npos) << reason;
    EXPECT_EQ(reason.rfind("refused: substance: ", 0), 0u) << reason;
}

Rows changed(std::size_t row, std::vector<Cell> cells)
{
    Rows rows = wax();
    rows[row] = std::move(cells);
    return rows;
}

INSTANTIATE_TEST_SUITE_P(Bad, OwnTableRefusal, ::testing::Values(
    BadTable{"unsorted", changed(8, {number(250), number(2000)}), "row 9 of the table: the temperatures do not ascend"},
    BadTable{"duplicate", changed(8, {number(260), number(2000)}), "row 9 of the table: the temperature stands there twice"},
    BadTable{"negative_cp", changed(8, {number(300), number(-5)}), "row 9 of the table: the heat capacity is not above 0"},
    BadTable{"below_absolute_zero", changed(7, {text("-300 °C"), number(1800)}), "row 8 of the table: the temperature"},
    BadTable{"text_in_numbers", changed(8, {number(300), text("about 2000")}), "row 9 of the table: heat capacity"},
    BadTable{"no_cp", changed(8, {number(300)}), "row 9 of the table: heat capacity is missing"},
    BadTable{"stray_word", changed(8, {text("warm"), number(2000)}), "row 9 of the table: neither a keyword"},
    BadTable{"one_row", changed(8, {empty()}), "row 10 of the table: the phase cr has fewer than two temperatures"},
    BadTable{"gap", changed(9, {text("transition"), number(340), number(210e3)}), "row 10 of the table: a gap"},
    BadTable{"negative_enthalpy", changed(9, {text("transition"), number(300.5), number(-1)}), "row 10 of the table: the enthalpy"},
    BadTable{"no_transition", changed(9, {empty()}), "row 11 of the table: a transition is wanted"},
    BadTable{"two_transitions", changed(10, {text("transition"), number(301), number(1)}), "row 11 of the table: two transitions"},
    BadTable{"same_phase_twice", changed(10, {text("phase"), text("cr")}), "row 11 of the table: the phase cr stands there twice"},
    BadTable{"bad_symbol", changed(5, {text("phase"), text("plasma")}), "row 6 of the table"},
    BadTable{"heading_without_reading", changed(11, {text("temperature, °C"), text("heat capacity, kilo-something")}), "row 12 of the table: the heading's unit"},
    BadTable{"heading_in_one_column", changed(11, {text("temperature, °C"), empty()}), "row 12 of the table: a heading is wanted in each column"},
    BadTable{"wrong_order", {{text("phase"), text("l")}, {number(280), number(2000)}, {number(300), number(2000)},
                             {text("transition"), number(300), number(1)}, {text("phase"), text("cr")}, {number(300), number(1000)},
                             {number(320), number(1000)}}, "row 5 of the table: the phases stand in their order"},
    BadTable{"molar_mass_in_grams", changed(1, {text("molar mass"), number(254.5)}), "row 2 of the table: the molar mass is 254.5 kg/mol"},
    BadTable{"title_above", {{text("My wax")}, {text("phase"), text("l")}, {number(280), number(2000)}, {number(300), number(2000)}},
             "row 1 of the table: neither a keyword"},
    BadTable{"bad_heading", changed(6, {text("temperature, bar"), text("heat capacity")}), "row 7 of the table: the heading"},
    BadTable{"bad_uncertainty", changed(3, {text("uncertainty"), number(3)}), "row 4 of the table: the uncertainty is relative"},
    BadTable{"bad_interpolation", changed(4, {text("interpolation"), text("wild")}), "row 5 of the table: the interpolation"},
    BadTable{"wrong_unit", changed(8, {text("3 bar"), number(2000)}), "row 9 of the table: temperature has a unit of another kind"},
    BadTable{"first_column_empty", changed(8, {empty(), number(2000)}), "row 9 of the table: the first column is empty"},
    BadTable{"transition_at_the_end", {{text("phase"), text("cr")}, {number(250), number(1000)}, {number(300), number(1000)},
                                       {text("transition"), number(300), number(1)}}, "a transition is not followed"},
    BadTable{"no_phase", {{text("substance"), text("x")}, {text("source"), text("y")}}, "the table holds no phase"}),
    [](const auto& test) { return std::string(test.param.what); });

TEST(OwnTable, UnitsOfHeadingsAsDataSheetsWriteThem)
{
    for (const char* heading : {"heat capacity, kJ/(kg K)", "heat capacity [kJ/(kg K)]", "heat capacity (kJ/(kg K))",
                                "Heat capacity in kJ/(kg K)", "cp kJ/(kg K)", "cp / kJ/(kg K)", "specific heat; kJ/kg/K",
                                "heat capacity [kJ/(kg K)] "}) {
        for (const char* temperature : {"temperature, °C", "temperature (°C)", "Temperature in °C", "temperature / °C"}) {
            const Range own = table({{text("phase"), text("l")}, {text(temperature), text(heading)}, {number(20), number(2)},
                                     {number(80), number(2)}});
            EXPECT_NEAR(value("HEAT.SENSIBLE", {own, "30 °C", "40 °C", 1}), 20000.0, 1e-8) << temperature << heading;
        }
    }
}

TEST(OwnTable, AGasIsIdealWhenItsMolarMassIsGiven)
{
    const Rows gas{{text("molar mass"), text("28 g/mol")}, {text("phase"), text("g")}, {number(250), number(1040)},
                   {number(500), number(1060)}};
    const Range own = table(gas);
    EXPECT_NEAR(value("ENTROPY.CHANGE", {own, 300, own, 300, 1, "1 bar", "10 bar"}), -8.314462618 / 0.028 * std::log(10.0), 1e-9);
    const Range nameless = table({gas.begin() + 1, gas.end()});
    EXPECT_EQ(value("ENTROPY.CHANGE", {nameless, 300, nameless, 300, 1, "1 bar", "10 bar"}), 0.0);
    EXPECT_NE(words("CHECK.CHANGE", {nameless, 300, nameless, 300, 1, missing(), "1 bar", "10 bar"}).find("molar mass"),
              std::string::npos);
}

TEST(OwnTable, BoilingAtTheFirstRowOfTheGas)
{
    for (int t = 5; t < 400; ++t) {
        const double T = t + 273.15;
        const Range own = table({{text("phase"), text("l")}, {number(T - 60), number(4000)}, {number(T), number(4000)},
                                 {text("transition"), number(T), number(2257e3)}, {text("phase"), text("g")},
                                 {number(T), number(2000)}, {number(T + 200), number(2000)}});
        EXPECT_NEAR(value("TEMPERATURE.BALANCE", {own, "l", "g"}), T, 1e-9) << t;
    }
}

TEST(OwnTable, AnErrorCellPassesThrough)
{
    EXPECT_EQ(code_of(call("HEAT.SENSIBLE", {table(changed(8, {error(ErrorCode::not_available), number(2)})), 270, 290, 1})),
              no_data);
}

TEST(OwnTable, TenThousandRows)
{
    Rows rows{{text("phase"), text("cr")}};
    for (int i = 0; i < 10000; ++i)
        rows.push_back({number(200.0 + 0.01 * i), number(1000.0 + 0.1 * i)});
    const Range own = table(rows, 2);
    // cp = 1000 + 10 (T - 200): from 210 to 290 its mean is 1500.
    EXPECT_NEAR(value("HEAT.SENSIBLE", {own, 210, 290, 1}), 80.0 * 1500.0, 1e-5);
    EXPECT_NEAR(value("ENTROPY.SENSIBLE", {own, 210, 290, 1}), -1000.0 * std::log(290.0 / 210.0) + 800.0, 1e-6);
    rows[5000] = {number(100), number(1000)};
    EXPECT_NE(words("CHECK.SENSIBLE", {table(rows, 2), 210, 290, 1}).find("row 5001"), std::string::npos);
}

} // namespace
} // namespace entropy_ledger::testing
