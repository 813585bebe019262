// Saturation curve of water and the boundary between regions 2 and 3, by R7-97.
//
// Source: IAPWS R7-97(2012). Region 4, equations (29) to (31) with Table 34, 273.15 K <= T <= 647.096 K; both
// directions solve the same quadratic and so agree to rounding. Boundary 2-3, equations (5) and (6) with Table 1,
// 623.15 K <= T <= 863.15 K. T in K, p in Pa. No check of range.
#pragma once

#include <cmath>

namespace entropy_ledger::registry::iapws_r7 {

inline constexpr double critical_temperature = 647.096;   // K, R7-97 equation (2)
inline constexpr double critical_pressure = 22.064e6;     // Pa, R7-97 equation (3)
inline constexpr double triple_point_temperature = 273.16; // K
inline constexpr double triple_point_pressure = 611.657;   // Pa, R7-97 section 1

// n1 to n10 of R7-97 Table 34.
inline constexpr double saturation_coefficients[10] = {
    0.11670521452767e4, -0.72421316703206e6, -0.17073846940092e2, 0.12020824702470e5, -0.32325550322333e7,
    0.14915108613530e2, -0.48232657361591e4, 0.40511340542057e6, -0.23855557567849, 0.65017534844798e3,
};

template <class Number>
Number saturation_pressure(const Number& T)
{
    using std::sqrt;
    const auto& n = saturation_coefficients;
    const Number theta = T + n[8] / (T - n[9]);
    const Number a = (theta + n[0]) * theta + n[1];
    const Number b = (n[2] * theta + n[3]) * theta + n[4];
    const Number c = (n[5] * theta + n[6]) * theta + n[7];
    const Number root = 2.0 * c / (sqrt(b * b - 4.0 * a * c) - b);
    const Number square = root * root;
    return 1.0e6 * (square * square);
}

template <class Number>
Number saturation_temperature(const Number& p)
{
    using std::sqrt;
    const auto& n = saturation_coefficients;
    const Number beta = sqrt(sqrt(p * 1.0e-6));
    const Number e = (beta + n[2]) * beta + n[5];
    const Number f = (n[0] * beta + n[3]) * beta + n[6];
    const Number g = (n[1] * beta + n[4]) * beta + n[7];
    const Number d = -2.0 * g / (f + sqrt(f * f - 4.0 * e * g));
    const Number sum = n[9] + d;
    return 0.5 * (sum - sqrt(sum * sum - 4.0 * (n[8] + n[9] * d)));
}

// n1 to n5 of R7-97 Table 1.
inline constexpr double boundary_23_coefficients[5] = {
    0.34805185628969e3, -0.11671859879975e1, 0.10192970039326e-2, 0.57254459862746e3, 0.13918839778870e2,
};

template <class Number>
Number boundary_23_pressure(const Number& T)
{
    const auto& n = boundary_23_coefficients;
    return 1.0e6 * (n[0] + T * (n[1] + T * n[2]));
}

template <class Number>
Number boundary_23_temperature(const Number& p)
{
    using std::sqrt;
    const auto& n = boundary_23_coefficients;
    return n[3] + sqrt((p * 1.0e-6 - n[4]) / n[2]);
}

} // namespace entropy_ledger::registry::iapws_r7
