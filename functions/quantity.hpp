// Reader of quantities as engineers write them in cells: "-6 °C", "2,5 bar", "1.2e3 kJ", "12 t/h".
#pragma once

#include "functions/units.hpp"

#include <string_view>
#include <variant>

namespace entropy_ledger::functions {

// A value in coherent SI units: K, Pa, kg, mol, J, W and their combinations. Always finite.
struct Quantity {
    double value;
    Dimension dimension;
    bool has_unit;  // false for a number alone: the dimension is then unknown, not "dimensionless"
};

struct Unreadable {
    Reason reason;
};

using Reading = std::variant<Quantity, Unreadable>;

// Reads a text of the form
//
//     quantity = numeral [ unit ]                  unit: see units.hpp; blanks around either do not matter
//     numeral  = [ sign ] mantissa [ exponent ]
//     sign     = "+" | "-" | U+2212 minus | U+2013 en dash, which text processors make of "-"
//     exponent = ( "e" | "E" ) [ sign ] digits | multiply "10" ( "^" [ sign ] digits | superscript digits )
//
// The decimal sign of the mantissa is a point or a comma, whatever the locale:
//   - a point alone is the decimal sign: "1.200" is 1.2;
//   - a comma alone is the decimal sign, but "1,200", one to three digits of which the first is not 0 and exactly three
//     digits after the comma, is refused: it could be 1.2 or 1200, a factor of a thousand;
//   - with both, the last one is the decimal sign and the other one groups: "1.234,5", "1,234.5";
//   - the same sign twice or more groups: "1,234,567".
// Digits may be grouped in threes by a space (plain, no-break, narrow no-break, thin, figure) or an apostrophe, and
// after the decimal sign by a space. Groups that are not of three are refused.
//
// The value is rounded once where the factor of the unit is a power of ten: "1.013 bar" is the double 101300.
// Refused with a reason: texts over 200 bytes, anything else than the above, values that a double cannot hold.
// An uncertainty, "298.15 ± 0.2 K", is recognised and refused.
// A temperature below absolute zero is a number like any other here: the caller knows whether it is a difference.
Reading read_quantity(std::string_view utf8) noexcept;

// What to answer where a number without a unit is not enough: "-6" has no unit.
Unreadable without_unit(std::string_view utf8) noexcept;

} // namespace entropy_ledger::functions
