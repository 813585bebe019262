// Ice Ih, 0 < T <= 273.16 K, p <= 210 MPa, by R10-06.
//
// Source: IAPWS R10-06(2009), equations (1) to (4) with Table 2; the entropy constant s0 is the "IAPWS-95" one, for
// which the liquid at the triple point has s = u = 0:
//   g = g0(p) - s0 Tt tau + Tt Re{ r1 B1 + r2(p) B2 },  tau = T/Tt,  pi = p/pt,
//   Bk = (tk - tau) ln(tk - tau) + (tk + tau) ln(tk + tau) - 2 tk ln tk - tau^2/tk.
// With E = ln(1 - tau^2/tk^2) and D = ln((tk + tau)/(tk - tau)):
//   Bk = tk E + tau D - tau^2/tk,  dBk/dtau = D - 2 tau/tk,  Bk - tau dBk/dtau = tk E + tau^2/tk.
// A Number is real, so real and imaginary parts are written out. For tau > 0 the argument of E lies in the upper half
// plane and that of D in the lower one, so that each complex logarithm is one log and one atan without any branch.
// T in K, p in Pa, results in J/kg, J/(kg K) and m3/kg. No check of range; T > 0.
#pragma once

#include <array>
#include <cmath>

namespace entropy_ledger::registry::iapws_r10 {

inline constexpr double triple_point_temperature = 273.16; // K, R10-06 Table 1
inline constexpr double triple_point_pressure = 611.657;   // Pa
inline constexpr double normal_pressure = 101325.0;        // Pa
inline constexpr double pi0 = normal_pressure / triple_point_pressure;

namespace detail {

template <class Number>
struct Complex {
    Number re;
    Number im;
};

using Constant = Complex<double>;

// R10-06 Table 2.
inline constexpr std::array<double, 5> g0{-0.632020233335886e6, 0.655022213658955, -0.189369929326131e-7,
                                          0.339746123271053e-14, -0.556464869058991e-21}; // J/kg
inline constexpr double s0 = -0.332733756492168e4;                                        // J/(kg K)
inline constexpr Constant t1{0.368017112855051e-1, 0.510878114959572e-1};
inline constexpr Constant r1{0.447050716285388e2, 0.656876847463481e2}; // J/(kg K)
inline constexpr Constant t2{0.337315741065416, 0.335449415919309};
inline constexpr std::array<Constant, 3> r2{{{-0.725974574329220e2, -0.781008427112870e2},
                                             {-0.557107698030123e-4, 0.464578634580806e-4},
                                             {0.234801409215913e-10, -0.285651142904972e-10}}}; // J/(kg K)

constexpr Constant reciprocal(Constant z)
{
    const double square = z.re * z.re + z.im * z.im;
    return {z.re / square, -z.im / square};
}

constexpr Constant square(Constant z) { return {z.re * z.re - z.im * z.im, 2.0 * z.re * z.im}; }

inline constexpr double half_turn = 3.14159265358979323846;

// Natural logarithm of re + i im for im > 0.
template <class Number>
Complex<Number> log_upper(const Number& re, const Number& im)
{
    using std::atan;
    using std::log;
    return {0.5 * log(re * re + im * im), 0.5 * half_turn - atan(re / im)};
}

// E = ln(1 - tau^2/t^2)
template <class Number>
Complex<Number> log_product(Constant t, const Number& tau2)
{
    const Constant inverse = reciprocal(square(t));
    return log_upper<Number>(1.0 - tau2 * inverse.re, tau2 * -inverse.im);
}

// D = ln((t + tau)/(t - tau)) = ln((t + tau) conj(t - tau)) - 2 ln|t - tau|
template <class Number>
Complex<Number> log_quotient(Constant t, const Number& tau)
{
    using std::atan;
    using std::log;
    const double modulus2 = t.re * t.re + t.im * t.im;
    const Number even = modulus2 + tau * tau;
    const Number odd = 2.0 * t.re * tau;
    return {0.5 * log((even + odd) / (even - odd)),
            atan((modulus2 - tau * tau) / (2.0 * t.im * tau)) - 0.5 * half_turn};
}

template <class Number>
Complex<Number> r2_at(const Number& pi)
{
    return {r2[0].re + pi * (r2[1].re + pi * r2[2].re), r2[0].im + pi * (r2[1].im + pi * r2[2].im)};
}

template <class Number>
Complex<Number> r2_slope(const Number& pi) // d/dpi
{
    return {r2[1].re + pi * (2.0 * r2[2].re), r2[1].im + pi * (2.0 * r2[2].im)};
}

template <class Number>
Number g0_at(const Number& pi)
{
    return g0[0] + pi * (g0[1] + pi * (g0[2] + pi * (g0[3] + pi * g0[4])));
}

template <class Number>
Number g0_slope(const Number& pi) // d/dpi
{
    return g0[1] + pi * (2.0 * g0[2] + pi * (3.0 * g0[3] + pi * (4.0 * g0[4])));
}

template <class Left, class Number>
Number real_product(const Complex<Left>& a, const Complex<Number>& b)
{
    return a.re * b.re - a.im * b.im;
}

// dB/dtau
template <class Number>
Complex<Number> slope(Constant t, const Number& tau)
{
    const Constant inverse = reciprocal(t);
    const Complex<Number> d = log_quotient(t, tau);
    return {d.re - (2.0 * inverse.re) * tau, d.im - (2.0 * inverse.im) * tau};
}

// B - tau dB/dtau
template <class Number>
Complex<Number> intercept(Constant t, const Number& tau)
{
    const Number tau2 = tau * tau;
    const Constant inverse = reciprocal(t);
    const Complex<Number> e = log_product(t, tau2);
    return {t.re * e.re - t.im * e.im + inverse.re * tau2, t.re * e.im + t.im * e.re + inverse.im * tau2};
}

template <class Number>
Complex<Number> whole(Constant t, const Number& tau)
{
    const Complex<Number> i = intercept(t, tau);
    const Complex<Number> s = slope(t, tau);
    return {i.re + tau * s.re, i.im + tau * s.im};
}

// tau d2B/dtau2, with d2B/dtau2 = 2 tau^2/(t (t^2 - tau^2)); its factor tau is that of cp = -T d2g/dT2
template <class Number>
Complex<Number> curvature(Constant t, const Number& tau)
{
    const Number tau2 = tau * tau;
    const Constant t_square = square(t);
    // denominator t (t^2 - tau^2)
    const Number re = t.re * (t_square.re - tau2) - t.im * t_square.im;
    const Number im = t.re * t_square.im + t.im * (t_square.re - tau2);
    const Number factor = 2.0 * (tau * tau2) / (re * re + im * im);
    return {factor * re, -(factor * im)};
}

template <class Number>
Number reduced_pressure(const Number& p)
{
    return p * (1.0 / triple_point_pressure) - pi0;
}

} // namespace detail

template <class Number>
Number entropy(const Number& T, const Number& p)
{
    using namespace detail;
    const Number tau = T * (1.0 / triple_point_temperature);
    return s0 - real_product(r1, slope(t1, tau)) - real_product(r2_at(reduced_pressure(p)), slope(t2, tau));
}

template <class Number>
Number enthalpy(const Number& T, const Number& p)
{
    using namespace detail;
    const Number tau = T * (1.0 / triple_point_temperature);
    const Number pi = reduced_pressure(p);
    return g0_at(pi)
         + triple_point_temperature
               * (real_product(r1, intercept(t1, tau)) + real_product(r2_at(pi), intercept(t2, tau)));
}

template <class Number>
Number heat_capacity(const Number& T, const Number& p)
{
    using namespace detail;
    const Number tau = T * (1.0 / triple_point_temperature);
    return -(real_product(r1, curvature(t1, tau))
             + real_product(r2_at(reduced_pressure(p)), curvature(t2, tau)));
}

template <class Number>
Number gibbs_energy(const Number& T, const Number& p)
{
    using namespace detail;
    const Number tau = T * (1.0 / triple_point_temperature);
    const Number pi = reduced_pressure(p);
    return g0_at(pi) - s0 * T
         + triple_point_temperature
               * (real_product(r1, whole(t1, tau)) + real_product(r2_at(pi), whole(t2, tau)));
}

template <class Number>
Number volume(const Number& T, const Number& p)
{
    using namespace detail;
    const Number tau = T * (1.0 / triple_point_temperature);
    const Number pi = reduced_pressure(p);
    return (g0_slope(pi) + triple_point_temperature * real_product(r2_slope(pi), whole(t2, tau)))
         * (1.0 / triple_point_pressure);
}

} // namespace entropy_ledger::registry::iapws_r10
