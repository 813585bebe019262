// Which formulation answers where for water(l), water(cr) and water(g), why, and what the seams cost: all of it here,
// for liquid_water.hpp, ice.hpp and steam.hpp, which select by the bounds below.
//
// Ts saturation temperature (R7-97), Tm melting temperature and Tsub sublimation temperature of ice Ih (R14-08), all at
// the pressure p; pt = 611.657 Pa, pc = 22.064 MPa. `fit` is what the source gives, `trust` what this project uses.
//
// | phase | formulation                  | T / K                        | p                            |
// |-------|------------------------------|------------------------------|------------------------------|
// | l     | SR6-08, cp held              | 250.15 to 253.15             | below 1 MPa                  |
// | l     | SR6-08                       | 253.15 to 273.15             | below 1 MPa                  |
// | l     | R7-97 region 1               | 263.15 to 273.15             | 1 MPa to 100 MPa             |
// | l     | R7-97 region 1               | 273.15 to 623.15             | to 100 MPa                   |
// | l     | R7-97 region 3, liquid side  | 623.15 to Ts or boundary 2-3 | 16.5 MPa to 100 MPa          |
// | cr    | R10-06                       | 1 to Tm (or 273.16) + 5      | to 210 MPa                   |
// | g     | R7-97 region 2, over ice     | Tsub - 3, or 253.15, up      | to pt                        |
// | g     | R7-97 metastable vapour      | Ts - 0.178 (627 - Ts) to Ts  | pt to 10 MPa                 |
// | g     | R7-97 region 2               | Ts to 1073.15                | to 100 MPa, below region 3   |
// | g     | R7-97 region 3, vapour side  | 623.15 to 863.15             | 16.5 MPa to 100 MPa          |
// | g     | R7-97 region 5               | 1073.15 to 2273.15           | to 50 MPa                    |
//
// Lower and upper end of `fit`, and of `trust` where it goes further:
//   l   fit    253.15 K (273.15 K above 0.3 MPa) to Ts, above pc to boundary 2-3
//       trust  250.15 K (263.15 K from 1 MPa on) to 573.15 K or, where that is more, Ts + 3 K, at most 623.15 K;
//              beyond, to the end of region 3's liquid branch
//   cr  fit    1 K to Tm + 0.0002 K
//       trust  5 K more
//   g   fit    from 273.15 K to pt, then from the end of the metastable equation, above 10 MPa from Ts (623.15 K from
//              pc on); to 2273.15 K, above 50 MPa to 1073.15 K
//       trust  from Tsub - 3 K, but not below 253.15 K, to pt; above 10 MPa from Ts - 1 K, and where Ts is above
//              623.15 K from the end of region 3's vapour branch
//
// Where phases meet. g of liquid and steam, R7-97 on both sides, within 11 J/kg or 4 mK of Ts. g of ice and liquid
// within 0.02 mK of Tm to 0.3 MPa, 0.16 mK to 70 MPa, then 0.10 mK below it at 80 MPa, 0.85 mK at 100 MPa; at
// 0.101325 MPa at 273.15253 K (R10-06: 273.152519 K). g of ice and steam 0.35 mK below Tsub at the triple point, 1.4 mK
// at 253.2 K. Held by tests/published/water_melting.cpp.
//
// Steps in h (J/kg), s (J/(kg K)), cp (J/(kg K)) and g (J/kg) at the seams, on the way up in T or p:
//   l, SR6-08 to region 1 at 273.15 K, pt to 0.3 MPa   -0.17        -0.0007            +0.12        +0.03
//      the same at 1 MPa                               -0.79        -0.0022            +0.12        -0.18
//      SR6-08 to region 1 at 1 MPa, 268.15 K           3.8
//      the same at 263.15 K                            19
//      region 1 to region 3 at 623.15 K                -7 to +28    -0.018 to +0.038
//   g, metastable vapour to region 2, at Ts            -37 to +43   -0.08 to +0.08     -17 to +16   -23 to +16
//      region 2 to region 3 along their boundary       -125 to +72  -0.18 to +0.10
//      region 2 to region 5 at 1073.15 K               -94 to +90   -0.13 to +0.015    -2.2 to +2.2
// cp of the steam steps by +55 of 7147 at 10 MPa. Above pc there is one fluid: liquid and steam both are region 3.
//
// Liquid, the seam. From SR6-08 with its term in pressure to region 1 at other places it would be, in the same units:
//   at 298.15 K and 0.1 MPa          +8.7    +0.030    +0.45  -0.21
//   at 373.12 K and 0.1 MPa          -67     -0.197    +1.1   +6.4
//   at 383.15 K and 0.1 MPa          -52     -0.156    +1.8   +8.2
//   in pressure, at 0.3 MPa, 353.15 K  -64   -0.187    -1.3   +2.4
// Both formulations keep to the tolerances they state, but such a seam would show in a difference of a few kelvin
// across it; the one at 273.15 K, the lower end of R7-97, is 40 microkelvin in temperature. It also leaves R7-97 on
// both sides of the saturation curve.
//
// Liquid, supercooled. SR6-08 gives 253.15 K at 0.1 MPa; its term in pressure is used below 1 MPa and counted as the
// source's own to 0.3 MPa. Below 253.15 K its heat capacity is held: at 250.15 K 4401 J/(kg K) against 4484 by IAPWS
// G12-15 (-1.9 %), 0.66 J/(kg K) in entropy; the equation itself turns over soon below (pole at 232 K). From 1 MPa on
// region 1 goes on below its end, since the melting curve runs there. Against IAPWS-95 it differs at 263.15 K by 18
// J/kg, 0.068 J/(kg K) and 5.4 J/(kg K) in cp at 1 MPa, by 11 J/kg at 10 MPa and by 21 J/kg at 100 MPa, of which 19
// stand at 273.15 K already; against G12-15 cp differs by 4.5, 4.2 and -31 J/(kg K) at 1, 10 and 100 MPa.
//
// Liquid, superheated. R7-97 says that region 1 gives reasonable values close to saturation (from memory). Against
// IAPWS-95 on its metastable branch from 373.15 K to 573.15 K, 1 Pa to 8.6 MPa: cp within 0.11 %, h within 290 J/kg,
// s within 0.52 J/(kg K), little more than on the saturation curve itself (240 J/kg, 0.43 J/(kg K)). At 578 K cp
// begins to part (0.13 %), at 583 K by 1.1 % at 1 bar. In the 3 K of superheat beyond: cp within 0.8 %.
//
// Ice, superheated. The same equation, whose properties stay smooth there (cp rises by 7.5 J/(kg K) a kelvin
// throughout). Above the triple point of ice Ih, ice III and liquid, 208.57 MPa, its Tm stays at 251.165 K.
//
// Steam, supersaturated, up to 10 MPa. The metastable-vapour equation goes from saturation to the line of 5 %
// equilibrium moisture, which lies 56 K below saturation at 0.01 MPa, 48 K at 0.1 MPa, 32 K at 1 MPa and 8.2 K at 10
// MPa; the end in the table is up to 3 K inside that line, and not below 273.15 K. Region 2 itself does not serve: 48 K
// below saturation at 0.1 MPa its h is off by 90 kJ/kg. To keep the equilibrium of liquid and steam clear of the step
// between the two it is put at a pressure 0.5 % above saturation, 0.1 K below Ts at 0.1 MPa. Above 10 MPa the release
// names region 2 (from memory); in the 1 K for which it is trusted cp is within 0.4 % of IAPWS-95 up to 15 MPa and
// 1.6 % below it at 16.5 MPa (at 3 K 12 %).
//
// Steam over ice. Region 2 below its end of 273.15 K, against IAPWS-95 at 100 Pa and 253.15 K: h -35 J/kg,
// s -0.094 J/(kg K), cp +0.4 %.
#pragma once

namespace entropy_ledger::registry {

struct LiquidWaterBounds {
    static constexpr double sr6_held_to = 250.15;          // K
    static constexpr double sr6_lower = 253.15;            // K, SR6-08
    static constexpr double seam = 273.15;                 // K, R7-97's lower end
    static constexpr double region1_trusted_to = 263.15;   // K
    static constexpr double region1_upper = 623.15;        // K, R7-97
    static constexpr double superheat_trusted_to = 573.15; // K
    static constexpr double superheat_margin = 3.0;        // K
    static constexpr double sr6_stated_pressure = 0.3e6;   // Pa, SR6-08
    static constexpr double sr6_pressure = 1.0e6;          // Pa, used below this
    static constexpr double greatest_pressure = 100.0e6;   // Pa, R7-97
};

struct IceBounds {
    static constexpr double lowest_temperature = 1.0;      // K; R10-06 begins at 0 K, where T = 0 has no logarithm
    static constexpr double greatest_pressure = 210.0e6;   // Pa, R10-06
    static constexpr double melting_allowance = 2.0e-4;    // K; the equilibrium with the liquid lies inside `fit`
    static constexpr double superheat_margin = 5.0;        // K
};

struct SteamBounds {
    static constexpr double lowest_temperature = 273.15;    // K, R7-97
    static constexpr double over_ice_trusted_to = 253.15;   // K
    static constexpr double sublimation_margin = 3.0;       // K
    static constexpr double metastable_pressure = 10.0e6;   // Pa, R7-97
    static constexpr double metastable_upper = 584.15;      // K, just above saturation at that pressure
    static constexpr double seam_supersaturation = 1.005;   // p over saturation pressure
    static constexpr double supersaturation_margin = 1.0;   // K, above 10 MPa
    static constexpr double region3_lower = 623.15;         // K, R7-97
    static constexpr double region3_upper = 863.15;         // K, R7-97
    static constexpr double region2_upper = 1073.15;        // K, R7-97
    static constexpr double region5_upper = 2273.15;        // K, R7-97
    static constexpr double region5_pressure = 50.0e6;      // Pa, R7-97
    static constexpr double greatest_pressure = 100.0e6;    // Pa, R7-97
};

} // namespace entropy_ledger::registry
