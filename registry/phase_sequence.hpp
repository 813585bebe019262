// The phases that a substance passes when it is heated or cooled at constant pressure.
#pragma once

#include "registry/substance.hpp"

#include <optional>
#include <vector>

namespace entropy_ledger::registry {

struct PhaseSequence {
    std::vector<const Phase*> phases;  // in the order in which they are passed
    std::vector<double> temperatures;  // K; where each gives way to the next: one fewer than phases
};

// From `first` to `last` at pressure p (Pa), through the phases between them in the order of stability, each change at
// its equilibrium temperature. A phase that is nowhere stable between its neighbours is left out. With `directly`, only
// the two themselves. Empty when some neighbours have no equilibrium within their ranges.
std::optional<PhaseSequence> phase_sequence(const Substance& substance, const Phase& first, const Phase& last, double p,
                                            bool directly = false);

} // namespace entropy_ledger::registry
