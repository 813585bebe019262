// Liquid water, R7-97 region 1: 273.15 K <= T <= 623.15 K, saturation pressure <= p <= 100 MPa.
//
// Source: IAPWS R7-97(2012), equation (7) with the coefficients of Table 2:
//   g/(R T) = gamma(pi, tau) = sum n (7.1 - pi)^I (tau - 1.222)^J,  pi = p/16.53 MPa,  tau = 1386 K/T.
// T in K, p in Pa, results in J/kg, J/(kg K) and m3/kg. No check of range.
//
// The release sets u = s = 0 for the saturated liquid at the triple point. The equation gives there
// (273.16 K, 611.657 Pa) u = -1.3e-7 J/kg and s = -6.16e-5 J/(kg K), which is 0.017 J/kg in g or 14 microkelvin in the
// melting temperature.
#pragma once

#include "registry/models/power_series.hpp"

#include <array>

namespace entropy_ledger::registry::iapws_r7 {

inline constexpr double gas_constant = 461.526; // J/(kg K), R7-97 equation (1)

namespace region1 {

// I, J, n of R7-97 Table 2.
inline constexpr std::array<PowerTerm, 34> terms{{
    {0, -2, 0.14632971213167}, {0, -1, -0.84548187169114}, {0, 0, -0.37563603672040e1}, {0, 1, 0.33855169168385e1},
    {0, 2, -0.95791963387872}, {0, 3, 0.15772038513228}, {0, 4, -0.16616417199501e-1}, {0, 5, 0.81214629983568e-3},
    {1, -9, 0.28319080123804e-3}, {1, -7, -0.60706301565874e-3}, {1, -1, -0.18990068218419e-1},
    {1, 0, -0.32529748770505e-1}, {1, 1, -0.21841717175414e-1}, {1, 3, -0.52838357969930e-4},
    {2, -3, -0.47184321073267e-3}, {2, 0, -0.30001780793026e-3}, {2, 1, 0.47661393906987e-4},
    {2, 3, -0.44141845330846e-5}, {2, 17, -0.72694996297594e-15}, {3, -4, -0.31679644845054e-4},
    {3, 0, -0.28270797985312e-5}, {3, 6, -0.85205128120103e-9}, {4, -5, -0.22425281908000e-5},
    {4, -2, -0.65171222895601e-6}, {4, 10, -0.14341729937924e-12}, {5, -8, -0.40516996860117e-6},
    {8, -11, -0.12734301741641e-8}, {8, -6, -0.17424871230634e-9}, {21, -29, -0.68762131295531e-18},
    {23, -31, 0.14478307828521e-19}, {29, -38, 0.26335781662795e-22}, {30, -39, -0.11947622640071e-22},
    {31, -40, 0.18228094581404e-23}, {32, -41, -0.93537087292458e-25},
}};

inline constexpr double reducing_temperature = 1386.0; // K
inline constexpr double reducing_pressure = 16.53e6;   // Pa
inline constexpr double shift_tau = 1.222;

template <class Number>
PowerSeries<terms, Number> series(const Number& T, const Number& p)
{
    return {7.1 - p * (1.0 / reducing_pressure), reducing_temperature / T - shift_tau};
}

template <class Number>
Number entropy(const Number& T, const Number& p)
{
    const auto gamma = series(T, p);
    const Number tau = reducing_temperature / T;
    return gas_constant
         * (tau / (tau - shift_tau) * gamma.template sum<term_weight::j>() - gamma.template sum<term_weight::one>());
}

template <class Number>
Number enthalpy(const Number& T, const Number& p)
{
    const auto gamma = series(T, p);
    return gas_constant * reducing_temperature / (reducing_temperature / T - shift_tau)
         * gamma.template sum<term_weight::j>();
}

template <class Number>
Number heat_capacity(const Number& T, const Number& p)
{
    const auto gamma = series(T, p);
    const Number tau = reducing_temperature / T;
    const Number ratio = tau / (tau - shift_tau);
    return -gas_constant * (ratio * ratio * gamma.template sum<term_weight::jj>());
}

template <class Number>
Number gibbs_energy(const Number& T, const Number& p)
{
    return gas_constant * T * series(T, p).template sum<term_weight::one>();
}

template <class Number>
Number volume(const Number& T, const Number& p)
{
    const Number x = 7.1 - p * (1.0 / reducing_pressure);
    return -gas_constant / reducing_pressure * T / x * series(T, p).template sum<term_weight::i>();
}

} // namespace region1
} // namespace entropy_ledger::registry::iapws_r7
