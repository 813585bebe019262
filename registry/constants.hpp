// Constants of nature.
#pragma once

namespace entropy_ledger::registry {

// Molar gas constant, J/(mol K): the product of the exact Avogadro and Boltzmann constants, to the digits shown.
// SI Brochure, 9th ed. (2019). The NASA Glenn set and the IAPWS formulations keep the values they were made with.
inline constexpr double molar_gas_constant = 8.314462618;

} // namespace entropy_ledger::registry
