// A heat and an entropy change that belong together.
#pragma once

#include "functions/reader.hpp"

namespace entropy_ledger::functions::plain {

struct HeatAndEntropy {
    double heat;    // J or W
    double entropy; // J/K or W/K
};

// Reads both; refuses a heat in J beside an entropy in W/K, or the reverse, where both say their units.
inline HeatAndEntropy heat_and_entropy(Reader& reader)
{
    const Flow<double> heat = reader.heat(Key::heat_balance);
    const Flow<double> entropy = reader.entropy(Key::entropy_change);
    reader.require_same_rate(Key::heat_balance, heat.rate, Key::entropy_change, entropy.rate);
    return {heat.value, entropy.value};
}

} // namespace entropy_ledger::functions::plain
