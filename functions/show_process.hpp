// A view of a process, from the cells of one call to its result.
#pragma once

#include "functions/reader.hpp"

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

} // namespace entropy_ledger::functions
