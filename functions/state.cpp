#include "functions/state.hpp"

#include "functions/quantity.hpp"

#include <algorithm>
#include <array>
#include <utility>

namespace entropy_ledger::functions {

namespace {

using registry::Aggregation;
using registry::Phase;
using registry::Substance;

constexpr std::size_t longest_state_text = 120; // bytes; longer texts are refused unread

std::string_view trimmed(std::string_view text)
{
    const auto blank = [](char c) { return c == ' ' || c == '\t' || c == '\n' || c == '\r'; };
    while (!text.empty() && blank(text.front()))
        text.remove_prefix(1);
    while (!text.empty() && blank(text.back()))
        text.remove_suffix(1);
    return text;
}

char lower(char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; }

// Words for states of aggregation.
constexpr std::array<std::pair<std::string_view, std::string_view>, 14> symbol_words{{
    {"s", "cr"}, {"solid", "cr"}, {"crystal", "cr"}, {"ice", "cr"}, {"cr", "cr"},
    {"liquid", "l"}, {"l", "l"}, {"melt", "l"},
    {"gas", "g"}, {"vapour", "g"}, {"vapor", "g"}, {"steam", "g"}, {"g", "g"},
    {"l+g", "l+g"},
}};

// Words for whole states.
constexpr std::array<std::pair<std::string_view, std::string_view>, 4> state_names{{
    {"ice", "water(cr)"}, {"steam", "water(g)"}, {"water vapour", "water(g)"}, {"water vapor", "water(g)"},
}};

constexpr std::array<std::pair<std::string_view, std::string_view>, 5> greek{{
    {"α", "alpha"}, {"β", "beta"}, {"γ", "gamma"}, {"δ", "delta"}, {"ε", "epsilon"},
}};

// Whether a symbol of the registry ("cr,II") is `normal`, which has small letters only.
bool same_symbol(std::string_view symbol, std::string_view normal)
{
    return std::equal(symbol.begin(), symbol.end(), normal.begin(), normal.end(),
                      [](char a, char b) { return lower(a) == b; });
}

std::string excerpt(std::string_view text)
{
    if (text.size() <= 40)
        return std::string(text);
    std::size_t end = 40;
    while (end > 0 && (static_cast<unsigned char>(text[end]) & 0xc0u) == 0x80u)
        --end; // not inside a UTF-8 sequence
    return std::string(text.substr(0, end)) + "…";
}

template <class Words>
void report(StateProblem& problem, bool no_data, Words&& words)
{
    problem.no_data = no_data;
    if (problem.wants_reason)
        problem.reason = words();
}

} // namespace

std::string normal_symbol(std::string_view text)
{
    text = trimmed(text);
    if (text.starts_with('(') && text.ends_with(')') && text.size() >= 2)
        text = trimmed(text.substr(1, text.size() - 2));
    if (text.empty() || text.size() > 40)
        return {};
    std::string plain;
    for (std::size_t i = 0; i < text.size();) {
        const auto letter = std::find_if(greek.begin(), greek.end(),
                                         [&](const auto& g) { return text.substr(i).starts_with(g.first); });
        if (letter != greek.end()) {
            plain += letter->second;
            i += letter->first.size();
            continue;
        }
        if (text[i] != ' ')
            plain += lower(text[i]);
        ++i;
    }
    const std::size_t comma = plain.find(',');
    const std::string_view head = std::string_view(plain).substr(0, comma);
    for (const auto& [word, symbol] : symbol_words) {
        if (head == word)
            return std::string(symbol) + (comma == std::string::npos ? std::string() : plain.substr(comma));
    }
    return {};
}

Aggregation aggregation_of_symbol(std::string_view symbol)
{
    return symbol.starts_with("cr") ? Aggregation::crystal : symbol.starts_with("l") ? Aggregation::liquid
                                                                                     : Aggregation::gas;
}

SplitState split_state(std::string_view text)
{
    text = trimmed(text);
    if (text.size() > longest_state_text)
        return {text, {}};
    for (const auto& [name, state] : state_names) {
        if (name.size() == text.size()
            && std::equal(name.begin(), name.end(), text.begin(), [](char a, char b) { return a == lower(b); }))
            text = state;
    }
    if (!text.ends_with(')'))
        return {text, {}};
    int depth = 0;
    for (std::size_t i = text.size(); i-- > 0;) {
        depth += text[i] == ')' ? 1 : text[i] == '(' ? -1 : 0;
        if (depth == 0) {
            std::string symbol = normal_symbol(text.substr(i));
            if (symbol.empty())
                break; // the closing bracket belongs to the formula
            return {trimmed(text.substr(0, i)), std::move(symbol)};
        }
    }
    return {text, {}};
}

bool State::may_be(const Phase& candidate) const
{
    return phase ? phase == &candidate : any_aggregation || candidate.aggregation == aggregation;
}

const Phase& State::at(double T) const
{
    if (phase)
        return *phase;
    const auto& phases = substance->phases;
    std::size_t chosen = phases.size();
    for (std::size_t i = 0; i < phases.size(); ++i) {
        if (!may_be(phases[i]))
            continue;
        if (chosen == phases.size()) {
            chosen = i;
            continue;
        }
        for (const registry::Transition& t : substance->transitions) {
            if (t.from == chosen && t.to == i && T >= t.nominal_temperature)
                chosen = i;
        }
    }
    return phases[chosen];
}

std::string shown_state(const Substance& substance, const Phase& phase)
{
    return std::string(substance.name) + "(" + std::string(phase.symbol) + ")";
}

std::string shown_states(const Substance& substance)
{
    std::string list;
    for (const Phase& phase : substance.phases)
        list += (list.empty() ? "" : ", ") + shown_state(substance, phase);
    return list;
}

namespace {

const Substance* look_up(std::string_view name, StateProblem& problem)
{
    if (name.empty()) {
        report(problem, false, [] { return "is empty"; });
        return nullptr;
    }
    if (name.size() > longest_state_text) {
        report(problem, false, [] { return "is too long for a substance name"; });
        return nullptr;
    }
    const registry::Found found = registry::find_substance(name);
    if (found.substance)
        return found.substance;
    report(problem, false, [&] {
        std::string reason = found.ambiguous
            ? "\"" + excerpt(name)
                  + "\" fits more than one substance: write capitals and small letters as in the formula"
            : "no substance is called \"" + excerpt(name) + "\"";
        const registry::Suggestions similar = registry::similar_names(name);
        for (std::size_t i = 0; i < similar.count; ++i)
            reason += (i == 0 ? "; similar: " : ", ") + std::string(similar.names[i]);
        return reason;
    });
    return nullptr;
}

} // namespace

const Substance* read_substance(std::string_view text, StateProblem& problem)
{
    const SplitState split = split_state(text);
    if (!split.symbol.empty()) {
        report(problem, false, [&] {
               return "\"" + excerpt(text) + "\" has a state symbol; here the substance alone is wanted";
            });
        return nullptr;
    }
    return look_up(split.substance, problem);
}

namespace {

// Liquid and vapour together: "l+g,x=0.85".
std::optional<State> wet_state(const Substance& substance, std::string_view symbol, StateProblem& problem)
{
    constexpr std::string_view opening = "l+g,x=";
    const Reading quality = symbol.starts_with(opening) ? read_quantity(symbol.substr(opening.size())) : Reading(Unreadable{});
    const auto* x = std::get_if<Quantity>(&quality);
    if (!x || (x->has_unit && x->dimension != dimensions::dimensionless) || !(x->value >= 0.0 && x->value <= 1.0)) {
        report(problem, false, [] { return "liquid and vapour together need a quality from 0 to 1, as in \"water(l+g,x=0.85)\""; });
        return std::nullopt;
    }
    State state{&substance, nullptr, Aggregation::liquid};
    state.quality = x->value;
    for (const Phase& phase : substance.phases) {
        if (phase.symbol == "l")
            state.phase = &phase;
        else if (phase.symbol == "g")
            state.vapour = &phase;
    }
    if (!state.phase || !state.vapour) {
        report(problem, true, [&] {
            return "there are no data for liquid and vapour together; there is " + shown_states(substance);
        });
        return std::nullopt;
    }
    return state;
}

} // namespace

std::optional<State> state_of(const Substance& substance, std::string_view symbol, StateProblem& problem)
{
    const std::string normal = normal_symbol(symbol);
    if (normal.empty()) {
        report(problem, false, [&] {
               return "\"" + excerpt(symbol) + "\" is no state symbol; there is " + shown_states(substance);
            });
        return std::nullopt;
    }
    if (normal.starts_with("l+g"))
        return wet_state(substance, normal, problem);
    State state{&substance, nullptr, aggregation_of_symbol(normal)};
    std::size_t candidates = 0;
    for (const Phase& phase : substance.phases) {
        if (same_symbol(phase.symbol, normal)) {
            state.phase = &phase;
            return state;
        }
        if (normal.find(',') == std::string::npos && phase.aggregation == state.aggregation) {
            ++candidates;
            state.phase = &phase;
        }
    }
    if (candidates == 0) {
        report(problem, true, [&] {
               return "there are no data for " + std::string(substance.name) + "(" + normal + "); there is "
                   + shown_states(substance);
            });
        return std::nullopt;
    }
    if (candidates > 1)
        state.phase = nullptr;
    return state;
}

std::optional<State> read_state(std::string_view text, StateProblem& problem)
{
    const SplitState split = split_state(text);
    const Substance* substance = look_up(split.substance, problem);
    if (!substance)
        return std::nullopt;
    if (!split.symbol.empty())
        return state_of(*substance, split.symbol, problem);
    if (substance->phases.size() == 1)
        return State{substance, &substance->phases[0], substance->phases[0].aggregation};
    report(problem, false, [&] {
           return "\"" + excerpt(text) + "\" does not say in which state; there is " + shown_states(*substance);
        });
    return std::nullopt;
}

} // namespace entropy_ledger::functions
