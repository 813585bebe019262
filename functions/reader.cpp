#include "functions/reader.hpp"

#include "functions/user_table.hpp"
#include "functions/wording.hpp"
#include "registry/equilibrium.hpp"

#include <cmath>
#include <optional>

namespace entropy_ledger::functions {

namespace {

constexpr Cell left_out{};

} // namespace

const Cell& Reader::cell(Key key) const
{
    const int place = entry_.place[static_cast<std::size_t>(key)];
    return place >= 0 && static_cast<std::size_t>(place) < cells_.size() ? cells_[static_cast<std::size_t>(place)]
                                                                         : left_out;
}

std::string_view Reader::name(Key key) const
{
    const int place = entry_.place[static_cast<std::size_t>(key)];
    return place >= 0 ? entry_.arguments[static_cast<std::size_t>(place)].name : "argument";
}

void Reader::keep(double error, std::string reason)
{
    if (refused_)
        return;
    refused_ = true;
    refusal_ = {error, std::move(reason)};
}

void Reader::pass_error_on(Key key)
{
    keep(cell(key).number, wants_words_ ? std::string(name(key)) + ": the cell holds an error" : std::string());
}

void Reader::require_same_rate(Key first, bool first_is_rate, Key second, bool second_is_rate)
{
    const auto has_unit = [&](Key key) { return cell(key).kind == Cell::Kind::text; };
    if (!refused_ && has_unit(first) && has_unit(second) && first_is_rate != second_is_rate)
        refuse(ErrorCode::unusable_argument, second, [] { return "is no rate beside a rate, or the reverse"; });
}

bool Reader::given(Key key) const { return cell(key).kind != Cell::Kind::missing; }

// The plain number or the text with its unit; checks that it is there and readable.
Quantity Reader::quantity(Key key, std::string_view wanted)
{
    if (refused_)
        return {};
    const Cell& c = cell(key);
    switch (c.kind) {
    case Cell::Kind::number:
        if (std::isfinite(c.number))
            return {c.number, {}, false};
        refuse(ErrorCode::unusable_argument, key, [] { return "is not a finite number"; });
        return {};
    case Cell::Kind::error:
        pass_error_on(key);
        return {};
    case Cell::Kind::text: {
        const auto read = read_quantity(c.text);
        if (const auto* q = std::get_if<Quantity>(&read)) {
            if (q->has_unit)
                return *q;
            refuse(ErrorCode::unusable_argument, key, [&] {
                return std::string(without_unit(c.text).reason.text()) + "; write a number for " + std::string(wanted)
                     + ", or a text with its unit";
            });
            return {};
        }
        refuse(ErrorCode::unusable_argument, key, [&] { return std::string(std::get<Unreadable>(read).reason.text()); });
        return {};
    }
    case Cell::Kind::table:
        refuse(ErrorCode::unusable_argument, key, [] { return "is a range; a single cell is wanted"; });
        return {};
    case Cell::Kind::missing:
    case Cell::Kind::empty:
        refuse(ErrorCode::unusable_argument, key,
               [&] { return "is missing; wanted: " + std::string(wanted) + ", or a text with its unit"; });
        return {};
    }
    return {};
}

template <class Fits>
Flow<double> Reader::flow(Key key, std::string_view wanted, Fits&& fits)
{
    const Quantity q = quantity(key, wanted);
    if (refused_ || !q.has_unit)
        return {q.value, false};
    const std::optional<bool> rate = fits(q.dimension);
    if (!rate) {
        refuse(ErrorCode::unusable_argument, key,
               [&] { return "has a unit of another kind; wanted: " + std::string(wanted); });
        return {};
    }
    return {q.value, *rate};
}

double Reader::temperature(Key key)
{
    const auto kelvin = flow(key, "a temperature in K", [](const Dimension& d) -> std::optional<bool> {
        return d == dimensions::temperature ? std::optional(false) : std::nullopt;
    });
    if (!refused_ && !(kelvin.value > 0.0))
        refuse(ErrorCode::unusable_argument, key, [&] {
            return kelvin.value == 0.0 ? std::string("is 0 K, or its cell is empty; a temperature is above 0 K")
                                       : "is " + shown(kelvin.value) + " K; a temperature is above 0 K "
                                             + "(write °C as a text with its unit, such as \"-6 °C\")";
        });
    return refused_ ? 300.0 : kelvin.value;
}

double Reader::reservoir_temperature(Key key)
{
    const double T = temperature(key);
    if (!refused_ && T > hottest_reservoir)
        refuse(ErrorCode::unusable_argument, key, [&] {
            return "is " + shown(T) + " K, above the limit of " + shown(hottest_reservoir)
                 + " K; was a pressure meant? The pressure is the argument after it";
        });
    return T;
}

double Reader::pressure(Key key, double when_left_out)
{
    return given(key) ? required_pressure(key) : when_left_out;
}

double Reader::required_pressure(Key key)
{
    const auto pascal = flow(key, "a pressure in Pa", [](const Dimension& d) -> std::optional<bool> {
        return d == dimensions::pressure ? std::optional(false) : std::nullopt;
    });
    if (!refused_ && !(pascal.value > 0.0))
        refuse(ErrorCode::unusable_argument, key, [&] {
            return pascal.value == 0.0
                ? std::string("is 0 Pa, or its cell is empty; leave the argument out for the usual pressure")
                : "is " + shown(pascal.value) + " Pa; an absolute pressure is above 0 Pa";
        });
    return refused_ ? standard_pressure : pascal.value;
}

Flow<double> Reader::heat(Key key)
{
    return flow(key, "a heat in J or W", [](const Dimension& d) -> std::optional<bool> {
        return d == dimensions::energy ? std::optional(false) : d == dimensions::power ? std::optional(true) : std::nullopt;
    });
}

Flow<double> Reader::entropy(Key key)
{
    return flow(key, "an entropy in J/K or W/K", [](const Dimension& d) -> std::optional<bool> {
        return d == dimensions::heat_capacity        ? std::optional(false)
             : d == dimensions::heat_capacity_rate ? std::optional(true)
                                                   : std::nullopt;
    });
}

Flow<double> Reader::heat_capacity(Key key)
{
    const auto capacity = entropy(key);
    if (!refused_ && !(capacity.value > 0.0))
        refuse(ErrorCode::unusable_argument, key, [&] {
            return "is " + shown(capacity.value) + " J/K, or its cell is empty; a heat capacity is above 0 J/K";
        });
    return capacity;
}

double Reader::number(Key key)
{
    if (refused_)
        return 0.0;
    const Cell& c = cell(key);
    if (c.kind == Cell::Kind::number && std::isfinite(c.number))
        return c.number;
    if (c.kind == Cell::Kind::error)
        pass_error_on(key);
    else if (c.kind == Cell::Kind::text) {
        const auto read = read_quantity(c.text);
        const auto* q = std::get_if<Quantity>(&read);
        if (q && (!q->has_unit || q->dimension == dimensions::dimensionless))
            return q->value;
    }
    refuse(ErrorCode::unusable_argument, key, [] { return "is not a number without a unit"; });
    return 0.0;
}

std::string_view Reader::text(Key key)
{
    const Cell& c = cell(key);
    if (c.kind == Cell::Kind::text)
        return c.text;
    if (c.kind == Cell::Kind::error)
        pass_error_on(key);
    else if (c.kind == Cell::Kind::number)
        refuse(ErrorCode::unusable_argument, key, [] { return "is a number, or its cell is empty; a text is wanted"; });
    else
        refuse(ErrorCode::unusable_argument, key, [] { return "is missing; a text is wanted"; });
    return {};
}

// The table in an argument; null when there is none or it is refused.
const UserTable* Reader::table(Key key)
{
    const UserTable* found = cell(key).table;
    if (!found || !found->refused())
        return found;
    keep(found->refusal().error, wants_words_ ? std::string(name(key)) + ": " + found->refusal().reason : std::string());
    return nullptr;
}

const registry::Substance* Reader::substance(Key key)
{
    if (const UserTable* own = table(key))
        return &own->substance();
    const std::string_view name = text(key);
    if (refused_)
        return nullptr;
    StateProblem problem{wants_words_, false, {}};
    const registry::Substance* found = read_substance(name, problem);
    if (!found)
        refuse(ErrorCode::unusable_argument, key, [&] { return problem.reason; });
    return found;
}

State Reader::state(Key key)
{
    const State found = state_or_wet(key);
    if (found.vapour)
        refuse(ErrorCode::unusable_argument, key,
               [] { return "liquid and vapour together can stand in CHANGE, DATA.ENTHALPY and DATA.ENTROPY only"; });
    return found;
}

State Reader::state_or_wet(Key key)
{
    if (const UserTable* own = table(key)) {
        StateProblem none{false, false, {}};
        const auto named = own->state().empty() ? std::nullopt : state_of(own->substance(), own->state(), none);
        return named ? *named : State{&own->substance(), nullptr, registry::Aggregation::crystal, true};
    }
    const std::string_view name = text(key);
    if (refused_)
        return {};
    StateProblem problem{wants_words_, false, {}};
    const std::optional<State> found = read_state(name, problem);
    if (found)
        return *found;
    refuse(problem.no_data ? ErrorCode::not_available : ErrorCode::unusable_argument, key,
           [&] { return problem.reason; });
    return {};
}

State Reader::state_beside_table(Key key, Key other)
{
    const Cell& c = cell(key);
    if (c.kind == Cell::Kind::text && !normal_symbol(c.text).empty()) {
        if (const UserTable* own = table(other))
            return state(&own->substance(), key);
    }
    return state_or_wet(key);
}

double Reader::pressure_of(const State& state, double T, Key key, double when_left_out)
{
    // So far, in K, a temperature may lie from equilibrium at the pressure given beside it.
    constexpr double agreement = 0.02;
    if (!state.vapour || refused_)
        return pressure(key, when_left_out);
    if (!given(key)) {
        const auto p = registry::equilibrium_pressure(*state.phase, *state.vapour, T);
        if (!p)
            refuse(ErrorCode::not_available, key, [&] {
                return "liquid and vapour are not together at " + shown_temperature(T);
            });
        return p.value_or(when_left_out);
    }
    const double p = pressure(key, when_left_out);
    const auto equilibrium = registry::equilibrium_temperature(*state.substance, *state.phase, *state.vapour, p);
    if (!refused_ && !(equilibrium && std::abs(*equilibrium - T) <= agreement))
        refuse(ErrorCode::unusable_argument, key, [&] {
            return "at " + shown_pressure(p) + " liquid and vapour are together "
                 + (equilibrium ? "at " + shown_temperature(*equilibrium) : std::string("nowhere")) + ", not at "
                 + shown_temperature(T) + "; leave the pressure out for the one that fits";
        });
    return p;
}

State Reader::state(const registry::Substance* substance, Key symbol)
{
    const std::string_view typed = text(symbol);
    if (refused_ || !substance)
        return {};
    StateProblem problem{wants_words_, false, {}};
    const std::optional<State> found = state_of(*substance, typed, problem);
    if (found && found->vapour)
        refuse(ErrorCode::unusable_argument, symbol, [] { return "one phase is wanted, not liquid and vapour together"; });
    if (found)
        return *found;
    refuse(problem.no_data ? ErrorCode::not_available : ErrorCode::unusable_argument, symbol,
           [&] { return problem.reason; });
    return {};
}

Amount<double> Reader::amount(Key key, const registry::Substance* substance)
{
    const Quantity q = quantity(key, "an amount in kg");
    if (refused_ || !substance)
        return {1.0, false};
    const Dimension& d = q.dimension;
    const bool molar = q.has_unit && (d == dimensions::amount_of_substance || d == dimensions::molar_rate);
    const bool rate = q.has_unit && (d == dimensions::mass_rate || d == dimensions::molar_rate);
    if (q.has_unit && !molar && !rate && d != dimensions::mass)
        refuse(ErrorCode::unusable_argument, key,
               [] { return "has a unit of another kind; wanted: kg, mol, kg/s or mol/s"; });
    else if (molar && !(substance->molar_mass > 0.0))
        refuse(ErrorCode::unusable_argument, key,
               [&] { return "the molar mass of " + std::string(substance->name) + " is not known; give kg"; });
    else if (q.value < 0.0)
        refuse(ErrorCode::unusable_argument, key, [&] { return "is " + shown(q.value) + "; an amount is not negative"; });
    else if (q.value == 0.0 && !q.has_unit) // an empty cell arrives as 0
        refuse(ErrorCode::unusable_argument, key,
               [] { return "is 0, or its cell is empty; write \"0 kg\" for an amount of nothing"; });
    return {molar ? q.value * substance->molar_mass : q.value, rate};
}

Flow<double> Reader::moles(Key key, const registry::Substance* substance, bool converts)
{
    const Quantity q = quantity(key, converts ? "an amount in kg" : "an amount in mol");
    if (refused_)
        return {0.0, false};
    const Dimension& d = q.dimension;
    const bool rate = q.has_unit && (d == dimensions::mass_rate || d == dimensions::molar_rate);
    const bool molar = q.has_unit ? d == dimensions::amount_of_substance || d == dimensions::molar_rate : !converts;
    if (!molar && q.has_unit && d != dimensions::mass && d != dimensions::mass_rate)
        refuse(ErrorCode::unusable_argument, key,
               [] { return "has a unit of another kind; wanted: mol, kg, mol/s or kg/s"; });
    else if (!molar && !converts)
        refuse(ErrorCode::unusable_argument, key,
               [] { return "is a mass, and without substances there is no molar mass to convert it; give mol"; });
    else if (!molar && !(substance && substance->molar_mass > 0.0))
        refuse(ErrorCode::unusable_argument, key, [] { return "the molar mass of the substance is not known; give mol"; });
    else if (q.value < 0.0)
        refuse(ErrorCode::unusable_argument, key, [&] { return "is " + shown(q.value) + "; an amount is not negative"; });
    return {molar || refused_ ? q.value : q.value / substance->molar_mass, rate};
}

void Reader::admit(const registry::Substance* substance, const registry::Phase& phase, double T, double p, Key key)
{
    if (refused_)
        return;
    const registry::Limits limits = registry::limits_of(phase, p);
    if (limits.trust.contains(T))
        return;
    refuse(ErrorCode::not_available, key, [&] {
        const std::string state = shown_state(*substance, phase);
        if (limits.trust.empty())
            return "there are no data for " + state + " at a pressure of " + shown_pressure(p);
        return shown_temperature(T) + " is outside the range of " + state + " at " + shown_pressure(p) + ": "
             + shown_temperature(limits.trust.lower) + " to " + shown_temperature(limits.trust.upper);
    });
}

} // namespace entropy_ledger::functions
