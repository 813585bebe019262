#include "functions/user_table.hpp"

#include "functions/quantity.hpp"
#include "functions/state.hpp"
#include "functions/wording.hpp"

#include <algorithm>
#include <array>
#include <cmath>
#include <optional>

namespace entropy_ledger::functions {

namespace {

constexpr double usual_uncertainty = 0.05; // of a table that states none; assigned here

enum class Keyword { none, substance, molar_mass, source, uncertainty, interpolation, state, phase, heading, transition };

std::string small_letters(std::string_view text)
{
    std::string small;
    constexpr std::string_view no_break_space = "\u00a0";
    for (std::size_t i = 0; i < text.size(); ++i) {
        if (text.substr(i).starts_with(no_break_space)) {
            ++i;
            continue;
        }
        const char c = text[i];
        if (c != ' ' && c != '-' && c != '_' && c != ':')
            small += c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c;
    }
    return small;
}

Keyword keyword_of(const Cell& cell)
{
    if (cell.kind != Cell::Kind::text || cell.text.size() > longest_text)
        return Keyword::none;
    const std::string word = small_letters(cell.text);
    constexpr std::array<std::pair<std::string_view, Keyword>, 8> words{{
        {"substance", Keyword::substance}, {"molarmass", Keyword::molar_mass}, {"source", Keyword::source},
        {"uncertainty", Keyword::uncertainty}, {"interpolation", Keyword::interpolation}, {"state", Keyword::state},
        {"phase", Keyword::phase}, {"transition", Keyword::transition},
    }};
    for (const auto& [name, keyword] : words) {
        if (word == name)
            return keyword;
    }
    return word.starts_with("temperature") ? Keyword::heading : Keyword::none;
}

// The coherent SI unit.
Unit si(const Dimension& dimension)
{
    Unit unit{};
    unit.dimension = dimension;
    return unit;
}

bool blank(const Cell& cell) { return cell.kind == Cell::Kind::empty || cell.kind == Cell::Kind::missing; }

// Ends the reading.
struct BadRow {
    double error;
    std::string reason;
};

class TableReader {
public:
    explicit TableReader(const Block& block) : block_(block) {}

    registry::SubstanceTable read()
    {
        table_.name = "own substance";
        table_.citation = "own table in the sheet";
        table_.uncertainty = usual_uncertainty;
        if (block_.rows() > UserTable::most_rows)
            throw BadRow{error_number(ErrorCode::unusable_argument), "the table has more than 100000 rows"};
        for (row_ = 0; row_ < block_.rows(); ++row_)
            read_row();
        row_ = block_.rows() - 1;
        if (table_.phases.empty())
            fail("the table holds no phase");
        close_phase();
        if (transition_)
            fail("a transition is not followed by a phase");
        check_transitions();
        return std::move(table_);
    }

    std::string state; // the phase that is meant

private:
    struct Given {
        double T, enthalpy;
        std::size_t row;
    };

    Cell cell(std::size_t column) const { return column < block_.columns() ? block_.at(row_, column) : Cell{}; }

    [[noreturn]] void fail(const std::string& words) const { fail_at(row_, words); }

    [[noreturn]] void fail_at(std::size_t row, const std::string& words) const
    {
        throw BadRow{error_number(ErrorCode::unusable_argument),
                     "row " + std::to_string(row + 1) + " of the table: " + words};
    }

    void check_for_error(const Cell& c) const
    {
        if (c.kind == Cell::Kind::error)
            throw BadRow{c.number, "row " + std::to_string(row_ + 1) + " of the table: the cell holds an error"};
    }

    std::string word(std::size_t column, const char* what) const
    {
        const Cell c = cell(column);
        check_for_error(c);
        if (c.kind != Cell::Kind::text)
            fail(std::string("a text is wanted for the ") + what);
        return std::string(c.text);
    }

    // A number in `unit`, or a text with a unit of one of the dimensions.
    double quantity(std::size_t column, const char* what, const Unit& unit, const Dimension& dimension,
                    const Dimension& molar = {}) const
    {
        const Cell c = cell(column);
        check_for_error(c);
        if (c.kind == Cell::Kind::number && std::isfinite(c.number))
            return in_mass_units(what, unit.to_si(c.number), unit.dimension, molar);
        if (c.kind != Cell::Kind::text)
            fail(std::string(what) + " is missing");
        const Reading read = read_quantity(c.text);
        const auto* q = std::get_if<Quantity>(&read);
        if (!q)
            fail(std::string(what) + ": " + std::string(std::get<Unreadable>(read).reason.text()));
        if (!q->has_unit)
            fail(std::string(what) + ": " + std::string(without_unit(c.text).reason.text()));
        if (q->dimension != dimension && !(molar != Dimension{} && q->dimension == molar))
            fail(std::string(what) + " has a unit of another kind");
        return in_mass_units(what, q->value, q->dimension, molar);
    }

    double in_mass_units(const char* what, double value, const Dimension& dimension, const Dimension& molar) const
    {
        if (molar == Dimension{} || dimension != molar)
            return value;
        if (!(table_.molar_mass > 0.0))
            fail(std::string(what) + " is molar, and no molar mass stands above");
        return value / table_.molar_mass;
    }

    void read_row()
    {
        const Cell first = cell(0);
        check_for_error(first);
        if (blank(first)) {
            if (!blank(cell(1)))
                fail("the first column is empty");
            return;
        }
        switch (keyword_of(first)) {
        case Keyword::substance: table_.name = word(1, "name"); break;
        case Keyword::source: table_.citation = word(1, "source"); break;
        case Keyword::molar_mass:
            table_.molar_mass = quantity(1, "molar mass", si(dimensions::molar_mass), dimensions::molar_mass);
            if (!(table_.molar_mass > 0.0))
                fail("the molar mass is not above 0");
            if (table_.molar_mass > 10.0)
                fail("the molar mass is " + shown(table_.molar_mass) + " kg/mol; write g/mol as a text: \"254.5 g/mol\"");
            break;
        case Keyword::uncertainty:
            table_.uncertainty = quantity(1, "uncertainty", si(dimensions::dimensionless), dimensions::dimensionless);
            table_.uncertainty_given = true;
            if (!(table_.uncertainty >= 0.0 && table_.uncertainty < 1.0))
                fail("the uncertainty is relative: from 0 to below 1, such as 0.02 or \"2 %\"");
            break;
        case Keyword::interpolation: read_interpolation(); break;
        case Keyword::state: state = read_symbol(); break;
        case Keyword::phase: open_phase(); break;
        case Keyword::heading: read_heading(); break;
        case Keyword::transition: read_transition(); break;
        case Keyword::none: read_point(); break;
        }
    }

    void read_interpolation()
    {
        const std::string way = small_letters(word(1, "interpolation"));
        if (way != "linear" && way != "smooth")
            fail("the interpolation is linear or smooth");
        table_.smooth = way == "smooth";
    }

    std::string read_symbol() const
    {
        const std::string typed = word(1, "state symbol");
        std::string symbol = normal_symbol(typed);
        if (symbol.empty() || symbol.starts_with("l+g") || symbol.ends_with(','))
            fail("there is no such state symbol; write cr, l, g or, with a modification, cr,alpha");
        return symbol;
    }

    void open_phase()
    {
        close_phase();
        const std::string symbol = read_symbol();
        for (const registry::TabulatedPhase& phase : table_.phases) {
            if (phase.symbol == symbol)
                fail("the phase " + symbol + " stands there twice");
        }
        if (!table_.phases.empty() && aggregation_of_symbol(symbol) < table_.phases.back().aggregation)
            fail("the phases stand in their order on heating: cr, then l, then g");
        if (!table_.phases.empty() && !transition_)
            fail("a transition is wanted between two phases");
        if (table_.phases.empty() && transition_)
            fail_at(transition_->row, "a transition before the first phase");
        table_.phases.push_back({symbol, aggregation_of_symbol(symbol), {}, {}, transition_ ? transition_->T : 0.0,
                                 transition_ ? transition_->enthalpy : 0.0});
        transition_rows_.push_back(transition_ ? transition_->row : row_);
        transition_.reset();
    }

    void close_phase() const
    {
        if (!table_.phases.empty() && table_.phases.back().T.size() < 2)
            fail("the phase " + table_.phases.back().symbol + " has fewer than two temperatures");
    }

    void read_heading()
    {
        temperature_unit_ = unit_of_heading(0, si(dimensions::temperature), dimensions::temperature, {});
        heat_capacity_unit_ = unit_of_heading(1, si(dimensions::specific_heat_capacity), dimensions::specific_heat_capacity,
                                              dimensions::molar_heat_capacity);
        heat_capacity_in_si_ = heat_capacity_unit_ == si(dimensions::specific_heat_capacity);
    }

    // The unit of a heading: what follows the quantity's name, whether after a comma, in brackets or after "in" or "/".
    // A heading without one is in SI; one whose rest is no unit is refused, for a unit that is overlooked is a wrong figure.
    Unit unit_of_heading(std::size_t column, const Unit& usual, const Dimension& dimension, const Dimension& molar) const
    {
        const Cell c = cell(column);
        if (c.kind != Cell::Kind::text)
            fail("a heading is wanted in each column, with its unit: \"temperature, °C\" and \"heat capacity, kJ/(kg K)\"");
        const std::string_view text = unit_part(c.text);
        if (text.empty())
            return usual;
        Reason reason;
        const auto unit = read_unit(text, &reason);
        if (!unit)
            fail("the heading's unit: " + std::string(reason.text()) + "; write it as in \"temperature, °C\"");
        if (unit->dimension != dimension && (molar == Dimension{} || unit->dimension != molar))
            fail("the heading has a unit of another kind");
        return *unit;
    }

    // The text after the name of the quantity, without the marks around it.
    static std::string_view unit_part(std::string_view text)
    {
        const auto skip = [&](std::string_view word) {
            if (text.size() >= word.size() && small_letters(text.substr(0, word.size())) == small_letters(word)) {
                text.remove_prefix(word.size());
                return true;
            }
            return false;
        };
        const auto trim = [&] {
            while (!text.empty() && (text.front() == ' ' || text.front() == '\n'))
                text.remove_prefix(1);
            while (!text.empty() && (text.back() == ' ' || text.back() == '\n'))
                text.remove_suffix(1);
        };
        trim();
        for (const std::string_view name : {"temperature", "specific heat capacity", "heat capacity", "specific heat", "cp"}) {
            if (skip(name))
                break;
        }
        trim();
        for (const std::string_view mark : {",", ";", ":", "in ", "/ "}) {
            if (skip(mark))
                break;
        }
        trim();
        const bool brackets = text.size() >= 2
            && ((text.front() == '[' && text.back() == ']') || (text.front() == '(' && text.back() == ')'));
        if (brackets) {
            text.remove_prefix(1);
            text.remove_suffix(1);
        }
        trim();
        return text;
    }

    void read_transition()
    {
        if (transition_)
            fail("two transitions without a phase between them");
        close_phase();
        const double T = quantity(1, "temperature of transition", temperature_unit_, dimensions::temperature);
        if (cell(2).kind == Cell::Kind::number && !heat_capacity_in_si_)
            fail("the enthalpy of transition needs its unit, such as \"210 kJ/kg\": the heading above has others than SI");
        const double enthalpy = quantity(2, "enthalpy of transition", si(dimensions::specific_energy),
                                         dimensions::specific_energy, dimensions::molar_energy);
        if (!(T > 0.0))
            fail("the temperature of transition is not above 0 K");
        if (!(enthalpy >= 0.0))
            fail("the enthalpy of transition is negative; it is what is taken up on heating");
        transition_ = Given{T, enthalpy, row_};
    }

    void read_point()
    {
        if (cell(0).kind == Cell::Kind::text && read_quantity_fails(cell(0).text))
            fail("neither a keyword nor a temperature: " + std::string(Reason().quote(cell(0).text).text()));
        if (table_.phases.empty())
            fail("a temperature before the first phase");
        if (transition_)
            fail("a temperature after a transition and before the next phase");
        registry::TabulatedPhase& phase = table_.phases.back();
        const double T = quantity(0, "temperature", temperature_unit_, dimensions::temperature);
        const double cp = quantity(1, "heat capacity", heat_capacity_unit_, dimensions::specific_heat_capacity,
                                   dimensions::molar_heat_capacity);
        if (!(T > 0.0))
            fail("the temperature is not above 0 K");
        if (!(cp > 0.0))
            fail("the heat capacity is not above 0");
        if (!phase.T.empty() && !(T > phase.T.back()))
            fail(T == phase.T.back() ? "the temperature stands there twice" : "the temperatures do not ascend");
        if (!(T < 1e5) || !(cp < 1e9))
            fail("a value is out of all bounds");
        phase.T.push_back(T);
        phase.cp.push_back(cp);
    }

    static bool read_quantity_fails(std::string_view text)
    {
        return std::holds_alternative<Unreadable>(read_quantity(text));
    }

    // Each transition lies where both of its phases have values, and they follow one another.
    void check_transitions() const
    {
        double last = 0.0;
        for (std::size_t i = 1; i < table_.phases.size(); ++i) {
            const double T = table_.phases[i].transition_temperature;
            const std::size_t row = transition_rows_[i];
            if (!(T > last))
                fail_at(row, "the transitions do not ascend in temperature");
            last = T;
            for (const std::size_t k : {i - 1, i}) {
                if (!registry::trust_of_table(table_.phases[k]).contains(T))
                    fail_at(row, "a gap: the temperature of transition, " + shown_temperature(T)
                                     + ", is too far from the table of the phase " + table_.phases[k].symbol);
            }
        }
    }

    const Block& block_;
    std::size_t row_ = 0;
    registry::SubstanceTable table_;
    std::vector<std::size_t> transition_rows_;
    std::optional<Given> transition_;
    Unit temperature_unit_ = si(dimensions::temperature);
    Unit heat_capacity_unit_ = si(dimensions::specific_heat_capacity);
    bool heat_capacity_in_si_ = true;
};

} // namespace

bool UserTable::looks_like_one(const Block& block)
{
    if (block.columns() < 2 || block.rows() < 2)
        return false;
    for (std::size_t row = 0; row < block.rows() && row < most_rows; ++row) {
        const Keyword keyword = keyword_of(block.at(row, 0));
        if (keyword == Keyword::phase || keyword == Keyword::substance)
            return true;
    }
    return false;
}

UserTable::UserTable(const Block& block)
{
    TableReader reader(block);
    try {
        registry::SubstanceTable table = reader.read();
        const auto known = [&](const registry::TabulatedPhase& phase) {
            return phase.symbol == reader.state || phase.symbol.starts_with(reader.state + ",");
        };
        if (!reader.state.empty() && std::none_of(table.phases.begin(), table.phases.end(), known))
            throw BadRow{error_number(ErrorCode::not_available),
                         "the table has no phase " + reader.state + ", which its state names"};
        substance_ = std::make_unique<registry::TabulatedSubstance>(std::move(table));
        state_ = std::move(reader.state);
    } catch (const BadRow& bad) {
        refusal_ = {bad.error, bad.reason};
    }
}

} // namespace entropy_ledger::functions
