// Temperature of liquid water from pressure and enthalpy or entropy: the backward equations of R7-97 region 1.
//
// Source: IAPWS R7-97(2012), equations (11) and (13) with the coefficients of Tables 6 and 8:
//   T/(1 K) = sum n pi^I (eta + 1)^J,    pi = p/1 MPa,  eta = h/(2500 kJ/kg)
//   T/(1 K) = sum n pi^I (sigma + 2)^J,  pi = p/1 MPa,  sigma = s/(1 kJ/(kg K))
// They are fits to the inverse of region 1, not the inverse itself: T within 25 mK of it throughout the region, which
// the release states. p in Pa, h in J/kg, s in J/(kg K), results in K. No check of range.
//
// The coefficients are those of the transcription in python3-iapws 1.5.2. They reproduce the release's verification
// values and keep its tolerance against the equation for g(T, p): tests/published/water_backward.cpp.
#pragma once

#include "registry/models/power_series.hpp"

#include <array>

namespace entropy_ledger::registry::iapws_r7::region1 {

// I, J, n of R7-97 Table 6.
inline constexpr std::array<PowerTerm, 20> backward_enthalpy_terms{{
    {0, 0, -0.23872489924521e3}, {0, 1, 0.40421188637945e3}, {0, 2, 0.11349746881718e3}, {0, 6, -0.58457616048039e1},
    {0, 22, -0.15285482413140e-3}, {0, 32, -0.10866707695377e-5}, {1, 0, -0.13391744872602e2},
    {1, 1, 0.43211039183559e2}, {1, 2, -0.54010067170506e2}, {1, 3, 0.30535892203916e2}, {1, 4, -0.65964749423638e1},
    {1, 10, 0.93965400878363e-2}, {1, 32, 0.11573647505340e-6}, {2, 10, -0.25858641282073e-4},
    {2, 32, -0.40644363084799e-8}, {3, 10, 0.66456186191635e-7}, {3, 32, 0.80670734103027e-10},
    {4, 32, -0.93477771213947e-12}, {5, 32, 0.58265442020601e-14}, {6, 32, -0.15020185953503e-16},
}};

// I, J, n of R7-97 Table 8.
inline constexpr std::array<PowerTerm, 20> backward_entropy_terms{{
    {0, 0, 0.17478268058307e3}, {0, 1, 0.34806930892873e2}, {0, 2, 0.65292584978455e1}, {0, 3, 0.33039981775489},
    {0, 11, -0.19281382923196e-6}, {0, 31, -0.24909197244573e-22}, {1, 0, -0.26107636489332}, {1, 1, 0.22592965981586},
    {1, 2, -0.64256463395226e-1}, {1, 3, 0.78876289270526e-2}, {1, 12, 0.35672110607366e-9},
    {1, 31, 0.17332496994895e-23}, {2, 0, 0.56608900654837e-3}, {2, 1, -0.32635483139717e-3},
    {2, 2, 0.44778286690632e-4}, {2, 9, -0.51322156908507e-9}, {2, 31, -0.42522657042207e-25},
    {3, 10, 0.26400441360689e-12}, {3, 32, 0.78124600459723e-28}, {4, 32, -0.30732199903668e-30},
}};

inline constexpr double backward_tolerance = 0.025; // K, R7-97 for both equations

inline double temperature_at_enthalpy(double p, double h)
{
    return PowerSeries<backward_enthalpy_terms, double>(p * 1e-6, h / 2.5e6 + 1.0).sum<term_weight::one>();
}

inline double temperature_at_entropy(double p, double s)
{
    return PowerSeries<backward_entropy_terms, double>(p * 1e-6, s * 1e-3 + 2.0).sum<term_weight::one>();
}

} // namespace entropy_ledger::registry::iapws_r7::region1
