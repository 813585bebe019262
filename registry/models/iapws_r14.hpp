// Melting and sublimation curves of water, by R14-08.
//
// Source: IAPWS R14-08(2011), Revised Release on the Pressure along the Melting and Sublimation Curves of Ordinary
// Water Substance: melting of ice Ih, III, V, VI and VII, equations (1) to (5); sublimation of ice Ih, equation (6)
// (numbers from memory). Coefficients from memory, equal to those of python3-iapws: tests/published/water_melting.cpp.
// From memory too: the release states 2 % for the melting pressure of ice Ih, 3 % for III, V and VI, 7 % for VII, and
// for the sublimation pressure 0.1 % down to 250 K. T in K, p in Pa. The pressures have no check of range.
#pragma once

#include "registry/limits.hpp"
#include "registry/number.hpp"

#include <cmath>

namespace entropy_ledger::registry::iapws_r14 {

inline constexpr double triple_point_temperature = 273.16; // K, of ice Ih, liquid and vapour
inline constexpr double triple_point_pressure = 611.657;   // Pa

// Ice III exists with the liquid between its triple points only, and so on: each curve ends where the next begins.
enum class Ice { Ih, III, V, VI, VII };

// Temperatures of the melting curve, K.
constexpr Range melting_range(Ice ice)
{
    switch (ice) {
    case Ice::Ih: return {251.165, triple_point_temperature};
    case Ice::III: return {251.165, 256.164};
    case Ice::V: return {256.164, 273.31};
    case Ice::VI: return {273.31, 355.0};
    case Ice::VII: return {355.0, 715.0};
    }
    return empty_range;
}

inline constexpr Range sublimation_range{50.0, triple_point_temperature};

// Pa, by the equations at the lower ends of the curves of ice Ih.
inline constexpr double greatest_melting_pressure = 208566566.0;
inline constexpr double least_sublimation_pressure = 1.935e-40;

namespace detail {

struct Power {
    double factor;
    double exponent;
};

inline constexpr Power melting_Ih[] = {{0.119539337e7, 3.0}, {0.808183159e5, 25.75}, {0.33382686e4, 103.75}};
inline constexpr Power sublimation[] = {
    {-0.212144006e2, 0.333333333e-2}, {0.273203819e2, 0.120666667e1}, {-0.61059813e1, 0.170333333e1}};

template <class Number>
Number power(const Number& x, double exponent)
{
    using std::exp;
    using std::log;
    return exp(exponent * log(x));
}

// p/p* = 1 + factor (theta^exponent - 1), theta = T/T*, from the triple point T*, p* up
template <class Number>
Number melting_from(double T_start, double p_start, Power term, const Number& T)
{
    return p_start * (1.0 + term.factor * (power(T * (1.0 / T_start), term.exponent) - 1.0));
}

} // namespace detail

// Pressure in Pa at which the ice melts at T.
template <class Number>
Number melting_pressure(Ice ice, const Number& T)
{
    using std::exp;
    using detail::power;
    switch (ice) {
    case Ice::Ih: {
        const Number theta = T * (1.0 / triple_point_temperature);
        Number sum = 1.0;
        for (const detail::Power& term : detail::melting_Ih)
            sum = sum + term.factor * (1.0 - power(theta, term.exponent));
        return triple_point_pressure * sum;
    }
    case Ice::III: return detail::melting_from(251.165, 208.566e6, {0.299948, 60.0}, T);
    case Ice::V: return detail::melting_from(256.164, 350.1e6, {1.18721, 8.0}, T);
    case Ice::VI: return detail::melting_from(273.31, 632.4e6, {1.07476, 4.6}, T);
    case Ice::VII: break;
    }
    const Number theta = T * (1.0 / 355.0);
    return 2216.0e6
         * exp(0.173683e1 * (1.0 - 1.0 / theta) - 0.544606e-1 * (1.0 - power(theta, 5.0))
               + 0.806106e-7 * (1.0 - power(theta, 22.0)));
}

// Pressure in Pa of the vapour over ice Ih at T.
template <class Number>
Number sublimation_pressure(const Number& T)
{
    using std::exp;
    const Number theta = T * (1.0 / triple_point_temperature);
    Number sum = 0.0;
    for (const detail::Power& term : detail::sublimation)
        sum = sum + term.factor * detail::power(theta, term.exponent);
    return triple_point_pressure * exp(sum / theta);
}

// Temperature in K at which ice Ih melts at p: the inverse of melting_pressure within 1e-12 relative. 273.16 K from the
// triple point down, 251.165 K from the triple point with ice III (208.57 MPa) up.
//
// Newton's method from a parabola that follows the curve within 0.0102 K. Each step leaves at most 0.02/K times the
// square of the error before: 2 microkelvin after the first, 1e-13 K after the second.
inline double melting_temperature(double p)
{
    constexpr Range range = melting_range(Ice::Ih);
    if (!(p > triple_point_pressure))
        return range.upper;
    if (p >= greatest_melting_pressure)
        return range.lower;
    const double megapascal = p * 1e-6;
    double T = triple_point_temperature - megapascal * (0.07476951 + 0.00014737 * megapascal);
    for (int step = 0; step < 2; ++step) {
        const double logarithm = std::log(T / triple_point_temperature);
        double missing = p / triple_point_pressure - 1.0;
        double slope = 0.0;
        for (const detail::Power& term : detail::melting_Ih) {
            const double power = std::exp(term.exponent * logarithm);
            missing -= term.factor * (1.0 - power);
            slope -= term.factor * term.exponent * power;
        }
        T += T * missing / slope;
    }
    return clamp_to(T, range.lower, range.upper);
}

// Temperature in K at which ice Ih and its vapour are in equilibrium at p: the inverse of sublimation_pressure within
// 1e-12 relative. 273.16 K from the triple point up, 50 K from 1.935e-40 Pa down.
//
// Newton's method in 1/T, in which the logarithm of the pressure is almost a straight line.
inline double sublimation_temperature(double p)
{
    constexpr Range range = sublimation_range;
    if (!(p < triple_point_pressure))
        return range.upper;
    if (p <= least_sublimation_pressure)
        return range.lower;
    const double logarithm = std::log(p / triple_point_pressure);
    double u = 1.0 - logarithm / 22.48; // u = Tt/T; the slope of the curve at the triple point
    for (int step = 0; step < 5; ++step) {
        double value = 0.0;
        double slope = 0.0;
        for (const detail::Power& term : detail::sublimation) {
            const double part = term.factor * std::pow(u, 1.0 - term.exponent);
            value += part;
            slope += (1.0 - term.exponent) * part / u;
        }
        const double change = (logarithm - value) / slope;
        u += change;
        if (std::abs(change) < 1e-13 * u)
            break;
    }
    return clamp_to(triple_point_temperature / u, range.lower, range.upper);
}

} // namespace entropy_ledger::registry::iapws_r14
