#include "functions/plain/plain.hpp"
#include "functions/reader.hpp"

#include <algorithm>
#include <optional>
#include <string>

namespace entropy_ledger::functions::plain {

namespace {

constexpr const char* headings[] = {"state", "name", "formula", "from, K", "to, K", "trusted from, K", "trusted to, K",
    "uncertainty of cp, %", "uncertainty is", "molar mass, g/mol", "source"};
constexpr std::size_t columns = std::size(headings);

bool holds(std::string_view text, std::string_view part)
{
    const auto same = [](char a, char b) {
        const auto lower = [](char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; };
        return lower(a) == lower(b);
    };
    return std::search(text.begin(), text.end(), part.begin(), part.end(), same) != text.end();
}

// Whether a phase is in the state of a symbol in normal form; "cr" fits every modification.
bool is_of_state(const registry::Phase& phase, const std::string& symbol)
{
    if (symbol.find(',') == std::string::npos)
        return phase.aggregation == aggregation_of_symbol(symbol);
    return phase.symbol.size() == symbol.size() && holds(phase.symbol, symbol);
}

const char* shown_origin(registry::Origin origin)
{
    switch (origin) {
    case registry::Origin::stated: return "stated by the source";
    case registry::Origin::derived: return "derived";
    case registry::Origin::assigned: return "assigned here";
    }
    return "";
}

} // namespace

Result data_list(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const std::string_view filter = reader.given(Key::filter) ? reader.text(Key::filter) : std::string_view();
    const std::string_view symbol_text = reader.given(Key::symbol) ? reader.text(Key::symbol) : std::string_view();
    const std::string symbol = normal_symbol(symbol_text);
    if (!symbol_text.empty() && (symbol.empty() || symbol.starts_with("l+g")))
        reader.refuse(ErrorCode::unusable_argument, Key::symbol, [] { return "is no state symbol"; });
    std::optional<double> T_within;
    if (reader.given(Key::T_within))
        T_within = reader.temperature(Key::T_within);
    if (reader.refused())
        return reader.refusal().error;

    MixedTable table;
    table.columns = columns;
    table.rows = 1;
    for (const char* heading : headings)
        table.cells.emplace_back(std::string(heading));
    const registry::Substance* const named = filter.empty() ? nullptr : registry::find_substance(filter).substance;
    for (const registry::Substance& substance : registry::substances()) {
        for (const registry::Phase& phase : substance.phases) {
            const std::string state = shown_state(substance, phase);
            if (&substance != named && !holds(state, filter) && !holds(substance.title, filter) && !holds(substance.formula, filter))
                continue;
            if (!symbol.empty() && !is_of_state(phase, symbol))
                continue;
            const registry::Limits limits = registry::limits_of(phase, standard_pressure);
            if (T_within && !limits.trust.contains(*T_within))
                continue;
            table.cells.emplace_back(state);
            table.cells.emplace_back(std::string(substance.title));
            table.cells.emplace_back(std::string(substance.formula));
            for (const double end : {limits.fit.lower, limits.fit.upper, limits.trust.lower, limits.trust.upper})
                table.cells.emplace_back(end);
            table.cells.emplace_back(100.0 * phase.uncertainty.relative);
            table.cells.emplace_back(std::string(shown_origin(phase.uncertainty.origin)));
            if (substance.molar_mass > 0.0)
                table.cells.emplace_back(1000.0 * substance.molar_mass);
            else
                table.cells.emplace_back(std::string());
            std::string keys;
            for (const registry::Source* source : registry::sources_of(phase))
                keys += (keys.empty() ? "" : "; ") + std::string(source->key);
            table.cells.emplace_back(std::move(keys));
            ++table.rows;
        }
    }
    if (table.rows == 1)
        return error_number(ErrorCode::not_available);
    return table;
}

} // namespace entropy_ledger::functions::plain
