// Numbers in messages, the same in every locale.
#pragma once

#include <string>

namespace entropy_ledger::functions {

// At most `digits` significant digits, decimal point, no trailing zeros.
std::string shown(double x, int digits = 6);

// "267.15 K (-6 °C)"
std::string shown_temperature(double kelvin);

// "100000 Pa" or "1.5 MPa"
std::string shown_pressure(double pascal);

} // namespace entropy_ledger::functions
