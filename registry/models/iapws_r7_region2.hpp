// Steam, R7-97 region 2, and the equation for its metastable vapour.
//
// Source: IAPWS R7-97(2012). Region 2, equations (15) to (17) with Tables 10 and 11:
//   273.15 K <= T <= 623.15 K up to the saturation pressure, to 863.15 K up to the pressure of equation (5),
//   to 1073.15 K up to 100 MPa.
// Metastable vapour, equations (18) and (19) with Table 16: from the saturated vapour to the line of 5 % equilibrium
//   moisture, 611.657 Pa <= p <= 10 MPa.
// Both: g/(R T) = ln(pi) + sum n0 tau^J0 + sum n pi^I (tau - 0.5)^J,  pi = p/1 MPa,  tau = 540 K/T.
// T in K, p in Pa, results in J/kg, J/(kg K) and m3/kg. No check of range.
#pragma once

#include "registry/models/iapws_r7_region1.hpp"
#include "registry/models/power_series.hpp"

#include <array>
#include <cmath>

namespace entropy_ledger::registry::iapws_r7 {

// An equation of the form above, of one ideal-gas part and one residual part.
template <const auto& Ideal, const auto& Residual>
struct VapourEquation {
    static constexpr double reducing_temperature = 540.0; // K
    static constexpr double reducing_pressure = 1.0e6;    // Pa
    static constexpr double shift_tau = 0.5;

    template <class Number>
    static PowerSeries<Ideal, Number> ideal(const Number& T)
    {
        return {Number(1.0), reducing_temperature / T};
    }

    template <class Number>
    static PowerSeries<Residual, Number> residual(const Number& T, const Number& p)
    {
        return {p * (1.0 / reducing_pressure), reducing_temperature / T - shift_tau};
    }

    template <class Number>
    static Number entropy(const Number& T, const Number& p)
    {
        using std::log;
        const auto o = ideal(T);
        const auto r = residual(T, p);
        const Number tau = reducing_temperature / T;
        return gas_constant
             * (o.template sum<one_less_j>() - log(p * (1.0 / reducing_pressure))
                + tau / (tau - shift_tau) * r.template sum<term_weight::j>() - r.template sum<term_weight::one>());
    }

    template <class Number>
    static Number enthalpy(const Number& T, const Number& p)
    {
        const auto o = ideal(T);
        const auto r = residual(T, p);
        return gas_constant
             * (T * o.template sum<term_weight::j>()
                + reducing_temperature / (reducing_temperature / T - shift_tau) * r.template sum<term_weight::j>());
    }

    template <class Number>
    static Number heat_capacity(const Number& T, const Number& p)
    {
        const auto o = ideal(T);
        const auto r = residual(T, p);
        const Number tau = reducing_temperature / T;
        const Number ratio = tau / (tau - shift_tau);
        return -gas_constant
             * (o.template sum<term_weight::jj>() + ratio * ratio * r.template sum<term_weight::jj>());
    }

    template <class Number>
    static Number gibbs_energy(const Number& T, const Number& p)
    {
        using std::log;
        return gas_constant * T
             * (log(p * (1.0 / reducing_pressure)) + ideal(T).template sum<term_weight::one>()
                + residual(T, p).template sum<term_weight::one>());
    }

    template <class Number>
    static Number volume(const Number& T, const Number& p)
    {
        return gas_constant * T / p * (1.0 + residual(T, p).template sum<term_weight::i>());
    }

private:
    static constexpr double one_less_j(int, int j) { return j - 1; } // tau gamma_tau - gamma
};

namespace region2 {

// J, n of R7-97 Table 10.
inline constexpr std::array<PowerTerm, 9> ideal_terms{{
    {0, 0, -0.96927686500217e1}, {0, 1, 0.10086655968018e2}, {0, -5, -0.56087911283020e-2},
    {0, -4, 0.71452738081455e-1}, {0, -3, -0.40710498223928}, {0, -2, 0.14240819171444e1},
    {0, -1, -0.43839511319450e1}, {0, 2, -0.28408632460772}, {0, 3, 0.21268463753307e-1},
}};

// I, J, n of R7-97 Table 11.
inline constexpr std::array<PowerTerm, 43> residual_terms{{
    {1, 0, -0.17731742473213e-2}, {1, 1, -0.17834862292358e-1}, {1, 2, -0.45996013696365e-1},
    {1, 3, -0.57581259083432e-1}, {1, 6, -0.50325278727930e-1}, {2, 1, -0.33032641670203e-4},
    {2, 2, -0.18948987516315e-3}, {2, 4, -0.39392777243355e-2}, {2, 7, -0.43797295650573e-1},
    {2, 36, -0.26674547914087e-4}, {3, 0, 0.20481737692309e-7}, {3, 1, 0.43870667284435e-6},
    {3, 3, -0.32277677238570e-4}, {3, 6, -0.15033924542148e-2}, {3, 35, -0.40668253562649e-1},
    {4, 1, -0.78847309559367e-9}, {4, 2, 0.12790717852285e-7}, {4, 3, 0.48225372718507e-6},
    {5, 7, 0.22922076337661e-5}, {6, 3, -0.16714766451061e-10}, {6, 16, -0.21171472321355e-2},
    {6, 35, -0.23895741934104e2}, {7, 0, -0.59059564324270e-17}, {7, 11, -0.12621808899101e-5},
    {7, 25, -0.38946842435739e-1}, {8, 8, 0.11256211360459e-10}, {8, 36, -0.82311340897998e1},
    {9, 13, 0.19809712802088e-7}, {10, 4, 0.10406965210174e-18}, {10, 10, -0.10234747095929e-12},
    {10, 14, -0.10018179379511e-8}, {16, 29, -0.80882908646985e-10}, {16, 50, 0.10693031879409},
    {18, 57, -0.33662250574171}, {20, 20, 0.89185845355421e-24}, {20, 35, 0.30629316876232e-12},
    {20, 48, -0.42002467698208e-5}, {21, 21, -0.59056029685639e-25}, {22, 53, 0.37826947613457e-5},
    {23, 39, -0.12768608934681e-14}, {24, 26, 0.73087610595061e-28}, {24, 40, 0.55414715350778e-16},
    {24, 58, -0.94369707241210e-6},
}};

using Equation = VapourEquation<ideal_terms, residual_terms>;

} // namespace region2

namespace metastable_vapour {

// Table 10 with the first two coefficients changed as R7-97 says beneath it. These two and Table 16 are written from
// memory; they reproduce all digits of the check values of Table 18.
inline constexpr std::array<PowerTerm, 9> ideal_terms{{
    {0, 0, -0.96937268393049e1}, {0, 1, 0.10087275970006e2}, {0, -5, -0.56087911283020e-2},
    {0, -4, 0.71452738081455e-1}, {0, -3, -0.40710498223928}, {0, -2, 0.14240819171444e1},
    {0, -1, -0.43839511319450e1}, {0, 2, -0.28408632460772}, {0, 3, 0.21268463753307e-1},
}};

// I, J, n of R7-97 Table 16.
inline constexpr std::array<PowerTerm, 13> residual_terms{{
    {1, 0, -0.73362260186506e-2}, {1, 2, -0.88223831943146e-1}, {1, 5, -0.72334555213245e-1},
    {1, 11, -0.40813178534455e-2}, {2, 1, 0.20097803380207e-2}, {2, 7, -0.53045921898642e-1},
    {2, 16, -0.76190409086970e-2}, {3, 4, -0.63498037657313e-2}, {3, 16, -0.86043093028588e-1},
    {4, 7, 0.75321581522770e-2}, {4, 10, -0.79238375446139e-2}, {5, 9, -0.22888160778447e-3},
    {5, 10, -0.26456501482810e-2},
}};

using Equation = VapourEquation<ideal_terms, residual_terms>;

} // namespace metastable_vapour
} // namespace entropy_ledger::registry::iapws_r7
