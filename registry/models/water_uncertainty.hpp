// Uncertainty of the heat capacities of water, ice and steam.
//
// What the releases state is written from memory. Where they state an expanded uncertainty (coverage factor 2), half
// of it is taken. The growth is derived from the comparisons with IAPWS-95 described in water_formulations.hpp.
#pragma once

#include "registry/phase.hpp"

namespace entropy_ledger::registry::water_uncertainty {

// Below 253.15 K the heat capacity of the supercooled liquid is held: there it falls short of IAPWS G12-15 by 1.9 % at
// 250.15 K. Above saturation region 1 stays within 0.11 % of IAPWS-95 over 200 K; the growth is twice that.
inline constexpr Uncertainty liquid{0.001, 0.0063, 1.1e-5, Origin::stated,
    "IAPWS R7-97 states 0.2 % for the heat capacity of the liquid, IAPWS SR6-08 0.1 % at 0.1 MPa; the larger is taken, "
    "at coverage factor 2"};

// Over ice, 20 K below the range, 0.4 % from IAPWS-95. Above 10 MPa, 1 K supersaturated, it is up to 1.6 %.
inline constexpr Uncertainty steam{0.0015, 2.0e-4, 2.0e-4, Origin::stated,
    "IAPWS R7-97 states 0.2 % to 0.3 % for the heat capacity of steam, more near the critical point; 0.3 % is taken, "
    "at coverage factor 2"};

// Superheated ice is the same equation; nothing measured stands against it, hence an assigned 0.1 % a kelvin.
inline constexpr Uncertainty ice{0.02, 0.001, 0.001, Origin::stated,
    "IAPWS R10-06 states a standard uncertainty of 2 % for the heat capacity"};

} // namespace entropy_ledger::registry::water_uncertainty
