// The tables that compile_data.py makes of the property data, for the look-up.
#pragma once

#include "registry/substance.hpp"

#include <cstddef>
#include <cstdint>
#include <span>
#include <string_view>

namespace entropy_ledger::registry::compiled {

// A slot of a hash table with linear probing; empty when the name is. Tables have a power of two of slots and are at
// most a third full.
struct NameEntry {
    std::string_view name;
    std::uint16_t substance;  // index into substances, or `ambiguous`
};

inline constexpr std::uint16_t ambiguous = 0xffff;
inline constexpr std::size_t longest_name = 64;  // bytes

extern const std::span<const Substance> substances;
extern const std::span<const NameEntry> names_as_written;
extern const std::span<const NameEntry> names_without_case;  // ASCII letters in lower case

// 64-bit FNV-1a, as in compile_data.py.
constexpr std::uint64_t hash_of(std::string_view name)
{
    std::uint64_t value = 0xcbf29ce484222325u;
    for (const char c : name)
        value = (value ^ static_cast<unsigned char>(c)) * 0x100000001b3u;
    return value;
}

} // namespace entropy_ledger::registry::compiled
