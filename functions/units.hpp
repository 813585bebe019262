// Units of measurement: their dimensions, and the reader of unit texts such as "kg/s", "[degF]" or "kJ/(kg·K)".
#pragma once

#include "functions/text.hpp"

#include <cstddef>
#include <optional>
#include <string_view>

namespace entropy_ledger::functions {

// Exponents of the SI base quantities that this project meets. Electric current and luminous intensity are left out.
struct Dimension {
    signed char length = 0;
    signed char mass = 0;
    signed char time = 0;
    signed char temperature = 0;
    signed char amount = 0;

    friend bool operator==(const Dimension&, const Dimension&) = default;
};

namespace dimensions {
inline constexpr Dimension dimensionless{};
inline constexpr Dimension length{1, 0, 0, 0, 0};
inline constexpr Dimension volume{3, 0, 0, 0, 0};
inline constexpr Dimension duration{0, 0, 1, 0, 0};
inline constexpr Dimension temperature{0, 0, 0, 1, 0};
inline constexpr Dimension mass{0, 1, 0, 0, 0};
inline constexpr Dimension amount_of_substance{0, 0, 0, 0, 1};
inline constexpr Dimension force{1, 1, -2, 0, 0};
inline constexpr Dimension pressure{-1, 1, -2, 0, 0};
inline constexpr Dimension energy{2, 1, -2, 0, 0};
inline constexpr Dimension power{2, 1, -3, 0, 0};
inline constexpr Dimension mass_rate{0, 1, -1, 0, 0};
inline constexpr Dimension molar_rate{0, 0, -1, 0, 1};
inline constexpr Dimension molar_mass{0, 1, 0, 0, -1};
inline constexpr Dimension heat_capacity{2, 1, -2, -1, 0};       // J/K
inline constexpr Dimension heat_capacity_rate{2, 1, -3, -1, 0};  // W/K
inline constexpr Dimension entropy = heat_capacity;
inline constexpr Dimension entropy_rate = heat_capacity_rate;
inline constexpr Dimension specific_energy{2, 0, -2, 0, 0};           // J/kg
inline constexpr Dimension specific_heat_capacity{2, 0, -2, -1, 0};   // J/(kg K)
inline constexpr Dimension molar_energy{2, 1, -2, 0, -1};             // J/mol
inline constexpr Dimension molar_heat_capacity{2, 1, -2, -1, -1};     // J/(mol K)
} // namespace dimensions

// "temperature", "mass rate", ... for messages; empty for a dimension without a name above.
std::string_view name_of(const Dimension& dimension) noexcept;

// A unit u of the quantity Q. The coherent SI value of the number x is
//     (x - start) * 10^power_of_ten * numerator / denominator + origin.
// The factor stays split so that a power of ten can be taken into the decimal numeral before it is rounded and so that
// 36 t/h is 10 kg/s to the last bit. Only the Celsius and Fahrenheit scales have an origin, the ice point 273.15 K, and
// the reading `start` there; their power_of_ten is 0.
struct Unit {
    Dimension dimension;
    int power_of_ten = 0;
    double numerator = 1.0;
    double denominator = 1.0;
    double start = 0.0;
    double origin = 0.0;

    bool is_scale() const noexcept { return origin != 0.0; }

    double factor() const noexcept;         // 10^power_of_ten * numerator / denominator
    double to_si(double x) const noexcept;  // may overflow to infinity when x is huge: the caller checks

    friend bool operator==(const Unit&, const Unit&) = default;
};

// The longest text that is read, in bytes. Longer ones are refused unseen.
inline constexpr std::size_t longest_text = 200;

// Reads a unit. The UCUM case-sensitive codes (The Unified Code for Units of Measure, https://ucum.org) of the units in
// unit_table.cpp are read, and besides them the usual symbols and spellings:
//
//     unit       = [divide] component { operator component }
//     component  = ( name | "1" | "(" unit ")" ) [ exponent ]
//     operator   = multiply | divide
//     multiply   = "." | "·" | "⋅" | "×" | "*" | blank
//     divide     = "/" | "⁄" | "∕" | "per"
//     exponent   = [ "^" ] [ "+" | "-" ] digit | superscript digit with or without ⁻
//
// Decisions where usage is divided:
//   - A product after a division, "J/kg.K", is refused. UCUM reads it as (J/kg).K, engineers mean J/(kg.K), and the SI
//     Brochure (9th ed., 5.2) forbids it. "J/kg/K" and "J/(kg K)" are read.
//   - °C and °F alone are temperatures, with their origin. As a divisor, "Btu/(lb.°F)", they are temperature
//     differences: usual in the trade though not in UCUM. In every other combination they are refused.
//   - Gauge pressures ("barg", "bar(g)", "psig") are refused, absolute ones ("bara", "psi(a)") are read as plain.
//   - Notes in braces, which UCUM ignores, are refused: "bar{gauge}" must not pass as bar.
// No allocation, no exception; nesting is limited to 16.
std::optional<Unit> read_unit(std::string_view utf8, Reason* reason = nullptr) noexcept;

} // namespace entropy_ledger::functions
