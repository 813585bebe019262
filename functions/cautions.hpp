// Cautions for states in which work can hurt someone. They do not replace the local code, the plant's own rules or a
// licensed engineer; Remarks says so after them.
#pragma once

#include "registry/substance.hpp"

#include <vector>

namespace entropy_ledger::functions::cautions {

extern const char* const undercooled_liquid;
extern const char* const superheated_liquid;

// The cautions for a substance in a phase at T (K) and p (Pa).
std::vector<const char*> of_state(const registry::Substance& substance, const registry::Phase& phase, double T, double p);

} // namespace entropy_ledger::functions::cautions
