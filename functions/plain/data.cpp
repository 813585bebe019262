#include "functions/plain/plain.hpp"
#include "functions/reader.hpp"

#include <algorithm>
#include <string>
#include <utility>

namespace entropy_ledger::functions::plain {

namespace {

// With `wet`, liquid and vapour together may stand for the state; the property is then the mean by quality.
template <class Property>
Result property_of_state(const Entry& entry, std::span<const Cell> cells, bool wet, Property&& property)
{
    Reader reader(entry, cells, false);
    const State state = wet ? reader.state_or_wet(Key::state) : reader.state(Key::state);
    const double T = reader.temperature(Key::T);
    const double p = reader.pressure_of(state, T, Key::p, standard_pressure);
    if (reader.refused())
        return reader.refusal().error;
    const registry::Phase& phase = state.at(T);
    reader.admit(state.substance, phase, T, p, Key::T);
    if (reader.refused())
        return reader.refusal().error;
    double value = property(phase, T, p);
    if (state.vapour)
        value += state.quality * (property(*state.vapour, T, p) - value);
    return finite_or_error(value);
}

// A state's range at 1 bar; for a state of several modifications from the first to the last.
registry::Limits range_of(const State& state)
{
    if (state.phase)
        return registry::limits_of(*state.phase, standard_pressure);
    registry::Limits all{registry::empty_range, registry::empty_range};
    for (const registry::Phase& phase : state.substance->phases) {
        if (!state.may_be(phase))
            continue;
        const registry::Limits own = registry::limits_of(phase, standard_pressure);
        const auto join = [](registry::Range& range, const registry::Range& more) {
            range = range.empty() ? more : registry::Range{std::min(range.lower, more.lower), std::max(range.upper, more.upper)};
        };
        join(all.fit, own.fit);
        join(all.trust, own.trust);
    }
    return all;
}

} // namespace

Result data_heatcapacity(const Entry& entry, std::span<const Cell> cells)
{
    return property_of_state(entry, cells, false, [](const registry::Phase& phase, double T, double p) {
        return registry::heat_capacity(phase, T, p);
    });
}

Result data_enthalpy(const Entry& entry, std::span<const Cell> cells)
{
    return property_of_state(entry, cells, true, [](const registry::Phase& phase, double T, double p) {
        return registry::enthalpy(phase, T, p);
    });
}

Result data_entropy(const Entry& entry, std::span<const Cell> cells)
{
    return property_of_state(entry, cells, true, [](const registry::Phase& phase, double T, double p) {
        return registry::entropy(phase, T, p);
    });
}

Result data_range(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const State state = reader.state(Key::state);
    const std::string_view which = reader.given(Key::which) ? reader.text(Key::which) : std::string_view();
    if (reader.refused())
        return reader.refusal().error;
    const registry::Limits limits = range_of(state);
    if (limits.fit.empty())
        return error_number(ErrorCode::not_available);
    if (which.empty())
        return NumberTable{1, 2, {limits.fit.lower, limits.fit.upper}};
    const std::pair<std::string_view, double> ends[] = {{"lower", limits.fit.lower}, {"upper", limits.fit.upper},
        {"trusted lower", limits.trust.lower}, {"trusted upper", limits.trust.upper}};
    for (const auto& [name, value] : ends) {
        if (which == name)
            return value;
    }
    return error_number(ErrorCode::unusable_argument);
}

Result data_source(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const State state = reader.state(Key::state);
    if (reader.refused())
        return reader.refusal().error;
    std::string text;
    for (const registry::Phase& phase : state.substance->phases) {
        if (!state.may_be(phase))
            continue;
        for (const registry::Source* source : registry::sources_of(phase)) {
            if (text.find(source->citation) == std::string::npos)
                text += (text.empty() ? "" : "; ") + std::string(source->citation);
        }
        if (!phase.remark.empty())
            text += " [" + shown_state(*state.substance, phase) + ": " + std::string(phase.remark) + "]";
    }
    return text;
}

} // namespace entropy_ledger::functions::plain
