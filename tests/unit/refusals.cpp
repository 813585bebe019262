// Bad input: the error code that the cell shows, and the words of CHECK.
#include "support/calling.hpp"

namespace entropy_ledger::testing {
namespace {

constexpr int unusable = 502;
constexpr int no_data = 32767;

struct BadInput {
    const char* what;
    std::vector<Input> arguments; // of ENTROPY.SENSIBLE
    int code;
    std::vector<const char*> words; // that CHECK must hold
};

class Sensible : public ::testing::TestWithParam<BadInput> {};

TEST_P(Sensible, GivesTheErrorAndCheckSaysWhy)
{
    const BadInput& bad = GetParam();
    for (const char* view : {"ENTROPY.SENSIBLE", "HEAT.SENSIBLE"})
        EXPECT_EQ(code_of(call(view, bad.arguments)), bad.code) << view;

    std::vector<Input> with_reservoir = bad.arguments;
    if (with_reservoir.size() >= 4)
        with_reservoir.insert(with_reservoir.begin() + 4, Input(290.0));
    for (const char* view : {"GENERATION.SENSIBLE", "STEPS.SENSIBLE", "SOURCE.SENSIBLE"})
        EXPECT_EQ(code_of(call(view, with_reservoir)), bad.code) << view;

    const std::string reason = words("CHECK.SENSIBLE", with_reservoir);
    EXPECT_EQ(reason.rfind("refused: ", 0), 0u) << reason;
    for (const char* part : bad.words)
        EXPECT_NE(reason.find(part), std::string::npos) << "wanted: " << part << "\nsays: " << reason;
}

INSTANTIATE_TEST_SUITE_P(BadInput, Sensible, ::testing::Values(
    BadInput{"unknown substance", {"watr(l)", 280, 290, 1}, unusable, {"substance", "watr", "water"}},
    BadInput{"empty substance", {empty(), 280, 290, 1}, unusable, {"substance", "missing"}},
    BadInput{"number as substance", {1.0, 280, 290, 1}, unusable, {"substance", "text is wanted"}},
    BadInput{"no state symbol", {"water", 280, 290, 1}, unusable, {"substance", "water(l)", "water(g)"}},
    BadInput{"phase without data", {"N2(l)", 280, 290, 1}, no_data, {"substance", "N2(g)"}},
    BadInput{"zero kelvin", {"water(l)", 0, 290, 1}, unusable, {"T_start", "0 K"}},
    BadInput{"below zero kelvin", {"water(l)", 280, -5, 1}, unusable, {"T_end", "-5", "°C"}},
    BadInput{"below absolute zero in °C", {"water(l)", "-300 °C", 290, 1}, unusable, {"T_start"}},
    BadInput{"negative amount", {"water(l)", 280, 290, -1}, unusable, {"amount", "-1"}},
    BadInput{"amount of an empty cell", {"water(l)", 280, 290, 0}, unusable, {"amount", "empty"}},
    BadInput{"amount left out", {"water(l)", 280, 290}, unusable, {}},
    BadInput{"text without unit", {"water(l)", "280", 290, 1}, unusable, {"T_start", "no unit"}},
    BadInput{"unreadable text", {"water(l)", "warm", 290, 1}, unusable, {"T_start"}},
    BadInput{"unknown unit", {"water(l)", "280 Q", 290, 1}, unusable, {"T_start", "Q"}},
    BadInput{"wrong dimension", {"water(l)", "2 bar", 290, 1}, unusable, {"T_start", "another kind"}},
    BadInput{"amount as power", {"water(l)", 280, 290, "3 kW"}, unusable, {"amount", "another kind"}},
    BadInput{"pressure of nothing", {"water(l)", 280, 290, 1, 0}, unusable, {"p:", "0 Pa"}},
    BadInput{"negative pressure", {"water(l)", 280, 290, 1, -1e5}, unusable, {"p:", "absolute"}},
    BadInput{"out of range", {"water(l)", 280, 800, 1}, no_data, {"T_end", "800", "outside"}},
    BadInput{"pressure out of range", {"water(l)", 280, 290, 1, 1e10}, no_data, {"T_start", "pressure"}},
    BadInput{"infinite", {"water(l)", INFINITY, 290, 1}, unusable, {"T_start", "finite"}},
    BadInput{"overflow", {"water(l)", 280, 290, 1e308}, unusable, {"amount", "too large"}}),
    [](const auto& test) {
        std::string name = test.param.what;
        for (char& c : name) {
            if (!std::isalnum(static_cast<unsigned char>(c)))
                c = '_';
        }
        return name;
    });

TEST(Refusals, AnErrorInAnArgumentPassesThrough)
{
    EXPECT_EQ(code_of(call("ENTROPY.SENSIBLE", {"water(l)", error(ErrorCode::no_convergence), 290, 1})), 523);
    EXPECT_EQ(code_of(call("ENTROPY.TOTAL", {1.0, error(ErrorCode::not_available)})), no_data);
}

TEST(Refusals, HotReservoirHintsAtPressure)
{
    const std::vector<Input> arguments{"water(l)", 280, 290, 1, 101325};
    EXPECT_EQ(code_of(call("GENERATION.SENSIBLE", arguments)), unusable);
    const std::string reason = words("CHECK.SENSIBLE", arguments);
    EXPECT_NE(reason.find("T_reservoir"), std::string::npos) << reason;
    EXPECT_NE(reason.find("pressure"), std::string::npos) << reason;
    EXPECT_NE(reason.find("5000"), std::string::npos) << reason;
}

TEST(Refusals, GenerationNeedsItsReservoir)
{
    EXPECT_EQ(code_of(call("GENERATION.SENSIBLE", {"water(l)", 280, 290, 1})), unusable);
    EXPECT_EQ(code_of(call("GENERATION.BODY", {4186.0, 280, 290})), unusable);
}

TEST(Refusals, SensibleAcrossATransitionSendsToChange)
{
    const std::string reason = words("CHECK.SENSIBLE", {"Fe(cr)", 300, 1300, 1});
    EXPECT_NE(reason.find("CHANGE"), std::string::npos) << reason;
    EXPECT_GT(value("HEAT.CHANGE", {"Fe(cr)", 300, "Fe(cr)", 1300, 1}), 0.0);
}

TEST(Refusals, PhaseToItselfAndOtherSubstance)
{
    EXPECT_EQ(code_of(call("ENTROPY.PHASE", {"water", "l", "l", 273.15, 1})), unusable);
    EXPECT_EQ(code_of(call("ENTROPY.PHASE", {"water(l)", "l", "cr", 273.15, 1})), unusable);
    EXPECT_EQ(code_of(call("ENTROPY.PHASE", {"water", "l", "nonsense", 273.15, 1})), unusable);
    EXPECT_EQ(code_of(call("ENTROPY.CHANGE", {"water(l)", 280, "Al(cr)", 290, 1})), unusable);
    const std::string reason = words("CHECK.CHANGE", {"water(l)", 280, "Al(cr)", 290, 1});
    EXPECT_NE(reason.find("end:"), std::string::npos) << reason;
}

TEST(Refusals, WorkTurnedToHeatIsNotNegative)
{
    EXPECT_EQ(code_of(call("ENTROPY.DISSIPATION", {-5.0, 300})), unusable);
    EXPECT_NE(words("CHECK.DISSIPATION", {-5.0, 300}).find("work"), std::string::npos);
}

TEST(Refusals, OverflowIsNeverAZeroOrInfinity)
{
    EXPECT_NEAR(value("GENERATION.BODY", {1e306, 300, 301, 290}) / 1e304, value("GENERATION.BODY", {100.0, 300, 301, 290}), 1e-9);
    EXPECT_EQ(code_of(call("GENERATION.SENSIBLE", {"water(l)", 280, 290, 1, 1e-305})), unusable);
    EXPECT_EQ(words("CHECK.SENSIBLE", {"water(l)", 280, 290, 1, 1e-305}).rfind("refused", 0), 0u);
    EXPECT_EQ(code_of(call("STEPS.SENSIBLE", {"water(l)", 280, 290, 1, 1e-305})), unusable);
    EXPECT_EQ(code_of(call("STEPS.TRANSFER", {1e300, 1e-20, 1e-20})), unusable);
}

TEST(Refusals, AnElementIsNotACompoundInSmallLetters)
{
    for (const char* state : {"Hf(g)", "Bi(g)", "Po(g)"})
        EXPECT_EQ(code_of(call("DATA.ENTROPY", {state, 300})), unusable) << state;
    EXPECT_GT(value("DATA.ENTROPY", {"hf(g)", 300}), 0.0) << "HF in small letters";
}

TEST(Refusals, NoPhaseChangeAboveTheCriticalPressure)
{
    EXPECT_NEAR(value("TEMPERATURE.BALANCE", {"water", "l", "g", "220 bar"}), 646.9, 0.1);
    for (const char* p : {"220.64 bar", "250 bar", "300 bar", "900 bar"})
        EXPECT_EQ(code_of(call("TEMPERATURE.BALANCE", {"water", "l", "g", p})), no_data) << p;
}

TEST(Refusals, ASingleCellOfARangeIsACell)
{
    const Range one = Range::column({text("water(l)")});
    EXPECT_TRUE(std::holds_alternative<functions::MixedTable>(call("STEPS.SENSIBLE", {one, 280, 290, 1})));
}

TEST(Check, NotesCrossingTemperatures)
{
    for (const auto& arguments : {std::vector<Input>{"water(l)", "15 °C", "80 °C", 1000, "70 °C"},
                                  std::vector<Input>{"water(l)", "80 °C", "15 °C", 1000, "20 °C"}})
        EXPECT_NE(words("CHECK.SENSIBLE", arguments).find("temperatures cross"), std::string::npos);
    EXPECT_NE(words("CHECK.BODY", {"3.9 kJ/K", "20 °C", "60 °C", "50 °C"}).find("temperatures cross"), std::string::npos);
    EXPECT_EQ(words("CHECK.SENSIBLE", {"water(l)", "15 °C", "80 °C", 1000, "90 °C"}).rfind("ok", 0), 0u);
    EXPECT_EQ(words("CHECK.SENSIBLE", {"water(l)", "80 °C", "20 °C", 1000, "20 °C"}).rfind("ok", 0), 0u);
}

TEST(Check, NotesChangesThatDoNotOccurByThemselves)
{
    EXPECT_NE(words("CHECK.PHASE", {"water", "cr", "l", "-6 °C", 1, "20 °C"}).find("does not occur there by itself"),
              std::string::npos);
    EXPECT_EQ(words("CHECK.PHASE", {"water", "l", "cr", "-6 °C", 1, "-6 °C"}).find("does not occur"), std::string::npos);
}

TEST(Check, AsksWhereAUnitMayBeMistaken)
{
    EXPECT_NE(words("CHECK.PHASE", {"water", "l", "cr", "-6 °C", 1, 10}).find("perhaps meant in °C"), std::string::npos);
    EXPECT_NE(words("CHECK.SENSIBLE", {"N2(g)", 290, 300, 1, 280, 3}).find("another unit"), std::string::npos);
    EXPECT_NE(words("CHECK.SENSIBLE", {"N2(g)", 290, 300, 1, 310, "100 bar"}).find("ideal gas"), std::string::npos);
    EXPECT_NE(words("CHECK.BODY", {1000, 20, 80}).find("perhaps meant in °C"), std::string::npos);
    EXPECT_NE(words("CHECK.TRANSFER", {1000, 80, 20}).find("T_to"), std::string::npos);
    EXPECT_NE(words("CHECK.RESERVOIR", {0, 300}).find("its cell is empty"), std::string::npos);
}

TEST(Check, CautionsComeFirst)
{
    const std::string check = words("CHECK.PHASE", {"water", "l", "cr", "-6 °C", 1, "-10 °C"});
    EXPECT_EQ(check.rfind("CAUTION: ", 0), 0u) << check;
    EXPECT_EQ(check.find("local code"), check.rfind("local code")) << "said once";
}

TEST(Refusals, TooManyArguments)
{
    EXPECT_EQ(code_of(call("ENTROPY.RESERVOIR", {1.0, 300, 4.0})), unusable);
}

TEST(Total, NeverSkipsATextOrAnError)
{
    const Range clean = Range::column({number(1.0), empty(), number(2.5)});
    EXPECT_DOUBLE_EQ(value("ENTROPY.TOTAL", {clean, 4.0}), 7.5);
    const Range with_text = Range::column({number(1.0), text("2"), number(2.5)});
    EXPECT_EQ(code_of(call("ENTROPY.TOTAL", {with_text})), unusable);
    const Range with_error = Range::column({number(1.0), error(ErrorCode::not_available)});
    EXPECT_EQ(code_of(call("ENTROPY.TOTAL", {with_error})), no_data);
    EXPECT_EQ(code_of(call("ENTROPY.TOTAL", {"3"})), unusable);
    EXPECT_EQ(code_of(call("ENTROPY.TOTAL", {})), unusable);
}

TEST(Total, DoesNotDependOnTheOrder)
{
    EXPECT_EQ(value("ENTROPY.TOTAL", {1e16, 1.0, -1e16}), 1.0);
    EXPECT_EQ(value("ENTROPY.TOTAL", {1.0, 1e16, -1e16}), 1.0);
}

TEST(Verdict, SaysWhatTheSignMeans)
{
    EXPECT_EQ(words("ENTROPY.VERDICT", {2.0}), "can occur");
    EXPECT_EQ(words("ENTROPY.VERDICT", {-2.0}), "cannot occur");
    EXPECT_EQ(words("ENTROPY.VERDICT", {0.0}), "reversible");
    EXPECT_EQ(words("ENTROPY.VERDICT", {2.0, 1.0}), "undecided");
    EXPECT_EQ(words("ENTROPY.VERDICT", {2.0, 1.0, 1.9}), "can occur");
    EXPECT_EQ(words("ENTROPY.VERDICT", {"2 kJ/K", "0.9 kJ/K"}), "can occur");
    EXPECT_EQ(code_of(call("ENTROPY.VERDICT", {2.0, -1.0})), unusable);
    EXPECT_EQ(code_of(call("ENTROPY.VERDICT", {2.0, 1.0, 0.0})), unusable);
}

TEST(Spread, RepeatsRowsAndColumnsAndEndsWithNotAvailable)
{
    const Range column = Range::column({number(280), number(290), number(-1)});
    const auto result = call("ENTROPY.SENSIBLE", {"water(l)", column, 300, 1});
    const auto& table = std::get<functions::NumberTable>(result);
    ASSERT_EQ(table.rows, 3u);
    ASSERT_EQ(table.columns, 1u);
    EXPECT_EQ(table.numbers[0], value("ENTROPY.SENSIBLE", {"water(l)", 280, 300, 1}));
    EXPECT_EQ(table.numbers[1], value("ENTROPY.SENSIBLE", {"water(l)", 290, 300, 1}));
    EXPECT_EQ(code_of(table.numbers[2]), unusable) << "only the row with the bad cell";

    const Range row = Range::row({number(1), number(2)});
    const auto grid = std::get<functions::NumberTable>(call("HEAT.SENSIBLE", {"water(l)", column, 300, row}));
    EXPECT_EQ(grid.rows, 3u);
    EXPECT_EQ(grid.columns, 2u);
    EXPECT_DOUBLE_EQ(grid.numbers[1], 2.0 * grid.numbers[0]);

    const Range shorter = Range::column({number(1), number(2)});
    const auto uneven = std::get<functions::NumberTable>(call("HEAT.SENSIBLE", {"water(l)", column, 300, shorter}));
    ASSERT_EQ(uneven.rows, 3u);
    EXPECT_EQ(code_of(uneven.numbers[2]), no_data);

    const auto checks = std::get<functions::MixedTable>(call("CHECK.SENSIBLE", {"water(l)", column, 300, 1}));
    EXPECT_EQ(std::get<std::string>(checks.cells[0]).rfind("ok", 0), 0u);
    EXPECT_NE(std::get<std::string>(checks.cells[2]).find("T_start"), std::string::npos);
}

TEST(Spread, ATableIsNotSpread)
{
    const Range column = Range::column({number(280), number(290)});
    EXPECT_EQ(code_of(call("STEPS.SENSIBLE", {"water(l)", column, 300, 1})), unusable);
}

TEST(Spread, AMillionRows)
{
    class Ramp : public functions::Block {
    public:
        std::size_t rows() const override { return 1u << 20; }
        std::size_t columns() const override { return 1; }
        Cell at(std::size_t row, std::size_t) const override { return number(280.0 + 1e-5 * static_cast<double>(row)); }
    } ramp;
    const std::vector<Argument> arguments{Input("N2(g)"), Argument{{}, &ramp}, Input(300.0), Input(1.0)};
    const auto result = functions::call(functions::FunctionId::entropy_sensible, arguments);
    const auto& table = std::get<functions::NumberTable>(result);
    ASSERT_EQ(table.numbers.size(), std::size_t{1} << 20);
    EXPECT_GT(table.numbers.front(), 0.0);
    EXPECT_EQ(table.numbers.back(), value("ENTROPY.SENSIBLE", {"N2(g)", 280.0 + 1e-5 * 1048575.0, 300.0, 1.0}));
}

TEST(Spread, MoreThanAnySheetHoldsIsRefused)
{
    class Huge : public functions::Block {
    public:
        Huge(std::size_t rows, std::size_t columns) : rows_(rows), columns_(columns) {}
        std::size_t rows() const override { return rows_; }
        std::size_t columns() const override { return columns_; }
        Cell at(std::size_t, std::size_t) const override { return number(290.0); }
    private:
        std::size_t rows_, columns_;
    } column(1u << 20, 1), row(1, 1u << 14);
    const std::vector<Argument> arguments{Input("N2(g)"), Argument{{}, &column}, Argument{{}, &row}, Input(1.0)};
    EXPECT_EQ(code_of(functions::call(functions::FunctionId::entropy_sensible, arguments)), unusable);
}

} // namespace
} // namespace entropy_ledger::testing
