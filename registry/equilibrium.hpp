// Where two phases of a substance are in equilibrium.
#pragma once

#include "registry/substance.hpp"

#include <optional>

namespace entropy_ledger::registry {

// Specific Gibbs energy h - T s, J/kg, at T in K and p in Pa. The reference is that of the substance.
template <class Number>
Number gibbs_energy(const Phase& phase, const Number& T, const Number& p)
{
    return enthalpy(phase, T, p) - T * entropy(phase, T, p);
}

// The temperature in K at which the Gibbs energies of two phases of one substance are equal at pressure p in Pa:
// there their change generates no entropy. Found by bracketing and the method of Alefeld, Potra and Shi
// (Boost.Math toms748_solve) to the resolution of double. Where the two curves only touch (a transition without
// enthalpy), the nominal temperature of the source. Empty when there is none within both phases' trusted ranges.
std::optional<double> equilibrium_temperature(const Substance& substance, const Phase& first, const Phase& second,
                                              double p);

// Whether two phases have the same properties at (T, p): one fluid above the critical pressure, or a transition without
// enthalpy. Within 1e-4 of the entropy, which covers the steps between the regions of IAPWS R7-97 (at most 4e-5).
bool are_one(const Phase& first, const Phase& second, double T, double p);

// The pressure in Pa at which a liquid and a gas are in equilibrium at temperature T in K; otherwise as above. From 1 Pa to
// 100 MPa.
std::optional<double> equilibrium_pressure(const Phase& liquid, const Phase& gas, double T);

} // namespace entropy_ledger::registry
