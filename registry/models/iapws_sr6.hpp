// Liquid water at and near 0.1 MPa, 253.15 K <= T <= 383.15 K, by SR6-08.
//
// Source: IAPWS SR6-08(2011), the equations for g and v at 0.1 MPa with their table of coefficients; the same as
// J. Patek, J. Hruby, J. Klomfar, M. Souckova, A. H. Harvey, J. Phys. Chem. Ref. Data 38 (2009) 21:
//   g0/(R Tr) = c1 + c2 tau + c3 tau ln(tau) + sum a alpha^n + sum b beta^m
//   v0 p0/(R Tr) = a5 + sum a alpha^n + sum b beta^m
// with tau = T/Tr, alpha = Tr/(593 K - T), beta = Tr/(T - 232 K), Tr = 10 K, p0 = 0.1 MPa.
//
// Another pressure enters by the term of first order, g(p) = g0 + v0 (p - p0), which gives
//   s = s0 - dv0/dT (p - p0),  h = h0 + (v0 - T dv0/dT)(p - p0),  cp = cp0 - T d2v0/dT2 (p - p0),
// three functions that stay consistent with one another. Against IAPWS-95 from 253.15 K to 273.15 K the term costs,
// at 0.3 MPa, 0.08 J/kg in h and 0.0003 J/(kg K) in s beyond the difference at 0.1 MPa; at 1 MPa 1.5 J/kg and
// 0.005 J/(kg K); at 10 MPa 175 J/kg and 0.57 J/(kg K). The release names 0.3 MPa as the limit (from memory).
// T in K, p in Pa, results in J/kg, J/(kg K) and m3/kg. No check of range.
#pragma once

#include "registry/models/power_series.hpp"

#include <array>
#include <cmath>

namespace entropy_ledger::registry::iapws_sr6 {

inline constexpr double gas_constant = 461.51805;      // J/(kg K)
inline constexpr double reducing_temperature = 10.0;   // K
inline constexpr double reference_pressure = 1.0e5;    // Pa
inline constexpr double upper_pole = 593.0;            // K, of alpha
inline constexpr double lower_pole = 232.0;            // K, of beta

// Powers of alpha and of beta stand in one list: {n, 0, a} and {0, m, b}.
inline constexpr std::array<PowerTerm, 7> gibbs_terms{{
    {4, 0, -1.661470539e5}, {5, 0, 2.708781640e6}, {7, 0, -1.557191544e8},
    {0, 2, -8.237426256e-1}, {0, 3, 1.908956353}, {0, 4, -2.017597384}, {0, 5, 8.546361348e-1},
}};
inline constexpr std::array<double, 3> gibbs_constants{-2.452093414e2, 3.869269598e1, -8.983025854}; // c1 to c3

inline constexpr std::array<PowerTerm, 12> volume_terms{{
    {0, 0, 1.93763157e-2},
    {4, 0, 6.74458446e3}, {5, 0, -2.22521604e5}, {7, 0, 1.00231247e8}, {8, 0, -1.63552118e9}, {9, 0, 8.32299658e9},
    {0, 1, 5.78545292e-3}, {0, 2, -1.53195665e-2}, {0, 3, 3.11337859e-2}, {0, 4, -4.23546241e-2},
    {0, 5, 3.38713507e-2}, {0, 6, -1.19946761e-2},
}};

// With d(alpha)/dT = alpha^2/Tr and d(beta)/dT = -beta^2/Tr a derivative of a sum is again such a sum.
namespace weight {
constexpr double n(int i, int) { return i; }
constexpr double m(int, int j) { return j; }
constexpr double nn(int i, int) { return i * (i + 1); }
constexpr double mm(int, int j) { return j * (j + 1); }
} // namespace weight

template <const auto& Terms, class Number>
class Series {
public:
    explicit Series(const Number& T)
        : alpha_(reducing_temperature / (upper_pole - T)), beta_(reducing_temperature / (T - lower_pole)),
          series_(alpha_, beta_)
    {
    }

    Number value() const { return series_.template sum<term_weight::one>(); }

    Number first() const // Tr d/dT
    {
        return alpha_ * series_.template sum<weight::n>() - beta_ * series_.template sum<weight::m>();
    }

    Number second() const // Tr^2 d2/dT2
    {
        return alpha_ * alpha_ * series_.template sum<weight::nn>()
             + beta_ * beta_ * series_.template sum<weight::mm>();
    }

private:
    Number alpha_;
    Number beta_;
    PowerSeries<Terms, Number> series_;
};

inline constexpr double volume_unit = gas_constant * reducing_temperature / reference_pressure; // m3/kg

template <class Number>
Number entropy(const Number& T, const Number& p)
{
    using std::log;
    const Number at_reference =
        -gas_constant
        * (gibbs_constants[1] + gibbs_constants[2] * (1.0 + log(T * (1.0 / reducing_temperature)))
           + Series<gibbs_terms, Number>(T).first());
    return at_reference
         - volume_unit / reducing_temperature * Series<volume_terms, Number>(T).first() * (p - reference_pressure);
}

template <class Number>
Number enthalpy(const Number& T, const Number& p)
{
    // the logarithm of g cancels that of T s
    const Number tau = T * (1.0 / reducing_temperature);
    const Series<gibbs_terms, Number> g(T);
    const Series<volume_terms, Number> v(T);
    return gas_constant * reducing_temperature
             * (gibbs_constants[0] - gibbs_constants[2] * tau + g.value() - tau * g.first())
         + volume_unit * (v.value() - tau * v.first()) * (p - reference_pressure);
}

template <class Number>
Number heat_capacity(const Number& T, const Number& p)
{
    const Number tau = T * (1.0 / reducing_temperature);
    return -gas_constant * (gibbs_constants[2] + tau * Series<gibbs_terms, Number>(T).second())
         - volume_unit / reducing_temperature * tau * Series<volume_terms, Number>(T).second()
               * (p - reference_pressure);
}

template <class Number>
Number gibbs_energy(const Number& T, const Number& p)
{
    using std::log;
    const Number tau = T * (1.0 / reducing_temperature);
    return gas_constant * reducing_temperature
             * (gibbs_constants[0] + tau * (gibbs_constants[1] + gibbs_constants[2] * log(tau))
                + Series<gibbs_terms, Number>(T).value())
         + volume_unit * Series<volume_terms, Number>(T).value() * (p - reference_pressure);
}

// Specific volume at 0.1 MPa and its derivative with temperature, m3/(kg K).
template <class Number>
Number volume(const Number& T)
{
    return volume_unit * Series<volume_terms, Number>(T).value();
}

template <class Number>
Number volume_slope(const Number& T)
{
    return volume_unit / reducing_temperature * Series<volume_terms, Number>(T).first();
}

} // namespace entropy_ledger::registry::iapws_sr6
