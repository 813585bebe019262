// One line of the catalogue at run time.
#pragma once

#include "functions/keys.hpp"
#include "functions/value.hpp"

#include <array>
#include <span>
#include <string_view>

namespace entropy_ledger::functions {

enum class Need : std::uint8_t { required, optional, repeated };
enum class ResultKind : std::uint8_t { number, text, table };

struct ArgumentEntry {
    Key key;
    std::string_view name; // as shown
    Need need;
};

struct Entry;
using CellHandler = Result (*)(const Entry&, std::span<const Cell>);
using GroupHandler = Result (*)(const Entry&, std::span<const Argument>);

struct Entry {
    std::string_view name;
    std::span<const ArgumentEntry> arguments;
    std::array<signed char, key_count> place; // of each key in the argument list; -1 where the function lacks it
    ResultKind result;
    CellHandler handler; // called with single cells; ranges are spread over it
    GroupHandler group;  // in its stead, for a function that takes its ranges as a whole
};

inline constexpr std::size_t most_arguments = 12;

template <std::size_t count>
constexpr std::array<signed char, key_count> places(const ArgumentEntry (&arguments)[count])
{
    static_assert(count <= most_arguments);
    std::array<signed char, key_count> place{};
    place.fill(-1);
    for (std::size_t i = 0; i < count; ++i)
        place[static_cast<std::size_t>(arguments[i].key)] = static_cast<signed char>(i);
    return place;
}

// The catalogue entry of a function.
const Entry& entry_of(std::size_t function);

} // namespace entropy_ledger::functions
