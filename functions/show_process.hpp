// A view of a process, from the cells of one call to its result.
#pragma once

#include "functions/whole_reader.hpp"

#include <optional>

namespace entropy_ledger::functions {

template <class View, template <class> class Process>
Result show_process(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, View::wants_words);
    const auto process = Process<Reader::Number>::read(reader);
    std::optional<double> T_reservoir;
    const bool required = [&] {
        const int place = entry.place[static_cast<std::size_t>(Key::T_reservoir)];
        return place >= 0 && entry.arguments[static_cast<std::size_t>(place)].need == Need::required;
    }();
    if (required || reader.given(Key::T_reservoir))
        T_reservoir = reader.reservoir_temperature(Key::T_reservoir);
    if (reader.refused())
        return View::refused(reader.refusal());
    return View::show(process, T_reservoir);
}

// The same for a process that takes ranges as a whole and has its reservoirs, if any, inside.
template <class View, template <class> class Process>
Result show_whole_process(const Entry& entry, std::span<const Argument> arguments)
{
    if (arguments.size() > entry.arguments.size())
        return error_number(ErrorCode::unusable_argument);
    WholeReader reader(entry, arguments, View::wants_words);
    const auto process = Process<WholeReader::Number>::read(reader);
    if (reader.refused())
        return View::refused(reader.refusal());
    return View::show(process, std::nullopt);
}

} // namespace entropy_ledger::functions
