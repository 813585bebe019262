#include "functions/wording.hpp"

#include <charconv>
#include <cmath>

namespace entropy_ledger::functions {

std::string shown(double x, int digits)
{
    char buffer[40];
    const double nonnegative_zero = x == 0.0 ? 0.0 : x;
    const auto end = std::to_chars(buffer, buffer + sizeof buffer, nonnegative_zero, std::chars_format::general, digits);
    return std::string(buffer, end.ptr);
}

std::string shown_temperature(double kelvin)
{
    // Hundredths of a kelvin, so that 0.1 + 273.15 reads as an engineer wrote it.
    const double celsius = std::round((kelvin - 273.15) * 1000.0) / 1000.0;
    return shown(kelvin, 8) + " K (" + shown(celsius, 8) + " °C)";
}

std::string shown_pressure(double pascal)
{
    if (pascal >= 1e6)
        return shown(pascal / 1e6) + " MPa";
    if (pascal >= 1e3)
        return shown(pascal / 1e5) + " bar";
    return shown(pascal) + " Pa";
}

} // namespace entropy_ledger::functions
