// Ranges of temperature and pressure.
#pragma once

namespace entropy_ledger::registry {

// A closed range; empty when lower > upper.
struct Range {
    double lower;
    double upper;

    constexpr bool contains(double x) const { return lower <= x && x <= upper; } // false for NaN
    constexpr bool empty() const { return !(lower <= upper); }
};

inline constexpr Range empty_range{1.0, 0.0};

// Temperatures in K for which a model holds at one pressure.
struct Limits {
    Range fit;    // where the source gives the model
    Range trust;  // how far it may be used; holds `fit`; beyond it there is no value
};

} // namespace entropy_ledger::registry
