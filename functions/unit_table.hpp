// The units known by name, with their prefixes, and the names that are refused with advice.
#pragma once

#include "functions/units.hpp"

#include <span>
#include <string_view>

namespace entropy_ledger::functions {

// Which prefixes a name takes. UCUM allows all of them with a metric unit. With the tonne only the multiples are taken,
// as the SI Brochure has it for practice, so that "pt" or "ft" is not a fraction of a tonne.
enum class Prefixes { none, multiples, all };

struct NamedUnit {
    std::string_view name;  // UTF-8, case-sensitive
    Prefixes prefixes;
    Unit unit;
};

// All names.
std::span<const NamedUnit> named_units() noexcept;

// A unit by its name, with or without prefix; false when there is none. Cost does not depend on the number of units.
bool find_unit(std::string_view name, Unit& unit) noexcept;

// One of the dozen most usual unit texts in full, "kg/s" or "°C", found without reading it; null for all others.
const Unit* find_usual_unit(std::string_view text) noexcept;

// What a name that differs from a unit only in case must have meant; empty when nothing or several things can be meant.
struct Spelling {
    std::string_view prefix;
    std::string_view name;
};
Spelling right_spelling(std::string_view name) noexcept;

// Empty when there is no advice.
std::string_view advice_on(std::string_view name) noexcept;

} // namespace entropy_ledger::functions
