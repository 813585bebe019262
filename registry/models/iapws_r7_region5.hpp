// Steam of high temperature, R7-97 region 5: 1073.15 K <= T <= 2273.15 K, p <= 50 MPa.
//
// Source: IAPWS R7-97(2012), equations (32) to (34) with Tables 37 and 38:
//   g/(R T) = ln(pi) + sum n0 tau^J0 + sum n pi^I tau^J,  pi = p/1 MPa,  tau = 1000 K/T.
// T in K, p in Pa, results in J/kg, J/(kg K) and m3/kg. No check of range.
#pragma once

#include "registry/models/iapws_r7_region1.hpp"
#include "registry/models/power_series.hpp"

#include <array>
#include <cmath>

namespace entropy_ledger::registry::iapws_r7::region5 {

// Table 37 (I = 0, ideal gas) and Table 38 in one list: both are series in tau alone beside pi^I.
inline constexpr std::array<PowerTerm, 12> terms{{
    {0, 0, -0.13179983674201e2}, {0, 1, 0.68540841634434e1}, {0, -3, -0.24805148933466e-1},
    {0, -2, 0.36901534980333}, {0, -1, -0.31161318213925e1}, {0, 2, -0.32961626538917},
    {1, 1, 0.15736404855259e-2}, {1, 2, 0.90153761673944e-3}, {1, 3, -0.50270077677648e-2},
    {2, 3, 0.22440037409485e-5}, {2, 9, -0.41163275453471e-5}, {3, 7, 0.37919454822955e-7},
}};

inline constexpr double reducing_temperature = 1000.0; // K
inline constexpr double reducing_pressure = 1.0e6;     // Pa

template <class Number>
PowerSeries<terms, Number> series(const Number& T, const Number& p)
{
    return {p * (1.0 / reducing_pressure), reducing_temperature / T};
}

constexpr double one_less_j(int, int j) { return j - 1; } // tau gamma_tau - gamma

template <class Number>
Number entropy(const Number& T, const Number& p)
{
    using std::log;
    return gas_constant * (series(T, p).template sum<one_less_j>() - log(p * (1.0 / reducing_pressure)));
}

template <class Number>
Number enthalpy(const Number& T, const Number& p)
{
    return gas_constant * T * series(T, p).template sum<term_weight::j>();
}

template <class Number>
Number heat_capacity(const Number& T, const Number& p)
{
    return -gas_constant * series(T, p).template sum<term_weight::jj>();
}

template <class Number>
Number gibbs_energy(const Number& T, const Number& p)
{
    using std::log;
    return gas_constant * T * (log(p * (1.0 / reducing_pressure)) + series(T, p).template sum<term_weight::one>());
}

template <class Number>
Number volume(const Number& T, const Number& p)
{
    return gas_constant * T / p * (1.0 + series(T, p).template sum<term_weight::i>());
}

} // namespace entropy_ledger::registry::iapws_r7::region5
