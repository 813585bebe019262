// Temperature of steam from pressure and enthalpy or entropy: the backward equations of R7-97 region 2.
//
// Source: IAPWS R7-97(2012), equations (20) to (27) with Tables 19 to 22 and 25 to 27. Three subregions:
//   2a  p <= 4 MPa
//   2b  p > 4 MPa and s >= 5.85 kJ/(kg K); from enthalpy that isentrope is replaced by the boundary B2bc
//   2c  the rest
// pi = p/1 MPa, eta = h/(2000 kJ/kg), T in K:
//   2a  T = sum n pi^I (eta - 2.1)^J               T = sum n pi^I (s/(2 kJ/(kg K)) - 2)^J, I in quarters
//   2b  T = sum n (pi - 2)^I (eta - 2.6)^J         T = sum n pi^I (10 - s/(0.7853 kJ/(kg K)))^J
//   2c  T = sum n (pi + 25)^I (eta - 1.8)^J        T = sum n pi^I (2 - s/(2.9251 kJ/(kg K)))^J
// They are fits to the inverse of region 2, not the inverse itself: T within 10 mK of it in 2a and 2b, 25 mK in 2c,
// which the release states. Below 611 Pa they are no longer fitted (found by comparison): from enthalpy they are off by
// up to 17.4 mK, from entropy by 1.1 K at 100 Pa and without bound below.
// p in Pa, h in J/kg, s in J/(kg K), results in K. No check of range.
//
// The coefficients are those of the transcription in python3-iapws 1.5.2. They reproduce the release's verification
// values and keep its tolerance against the equation for g(T, p): tests/published/water_backward.cpp.
#pragma once

#include "registry/models/power_series.hpp"

#include <array>
#include <cmath>

namespace entropy_ledger::registry::iapws_r7::region2 {

// n1 to n5 of R7-97 Table 19.
inline constexpr double boundary_2bc_coefficients[5] = {
    0.90584278514723e3, -0.67955786399241, 0.12809002730136e-3, 0.26526571908428e4, 0.45257578905948e1,
};

// I, J, n of R7-97 Table 20.
inline constexpr std::array<PowerTerm, 34> backward_enthalpy_terms_2a{{
    {0, 0, 0.10898952318288e4}, {0, 1, 0.84951654495535e3}, {0, 2, -0.10781748091826e3}, {0, 3, 0.33153654801263e2},
    {0, 7, -0.74232016790248e1}, {0, 20, 0.11765048724356e2}, {1, 0, 0.18445749355790e1}, {1, 1, -0.41792700549624e1},
    {1, 2, 0.62478196935812e1}, {1, 3, -0.17344563108114e2}, {1, 7, -0.20058176862096e3}, {1, 9, 0.27196065473796e3},
    {1, 11, -0.45511318285818e3}, {1, 18, 0.30919688604755e4}, {1, 44, 0.25226640357872e6},
    {2, 0, -0.61707422868339e-2}, {2, 2, -0.31078046629583}, {2, 7, 0.11670873077107e2}, {2, 36, 0.12812798404046e9},
    {2, 38, -0.98554909623276e9}, {2, 40, 0.28224546973002e10}, {2, 42, -0.35948971410703e10},
    {2, 44, 0.17227349913197e10}, {3, 24, -0.13551334240775e5}, {3, 44, 0.12848734664650e8},
    {4, 12, 0.13865724283226e1}, {4, 32, 0.23598832556514e6}, {4, 44, -0.13105236545054e8}, {5, 32, 0.73999835474766e4},
    {5, 36, -0.55196697030060e6}, {5, 42, 0.37154085996233e7}, {6, 34, 0.19127729239660e5},
    {6, 44, -0.41535164835634e6}, {7, 28, -0.62459855192507e2},
}};

// I, J, n of R7-97 Table 21.
inline constexpr std::array<PowerTerm, 38> backward_enthalpy_terms_2b{{
    {0, 0, 0.14895041079516e4}, {0, 1, 0.74307798314034e3}, {0, 2, -0.97708318797837e2}, {0, 12, 0.24742464705674e1},
    {0, 18, -0.63281320016026}, {0, 24, 0.11385952129658e1}, {0, 28, -0.47811863648625}, {0, 40, 0.85208123431544e-2},
    {1, 0, 0.93747147377932}, {1, 2, 0.33593118604916e1}, {1, 6, 0.33809355601454e1}, {1, 12, 0.16844539671904},
    {1, 18, 0.73875745236695}, {1, 24, -0.47128737436186}, {1, 28, 0.15020273139707}, {1, 40, -0.21764114219750e-2},
    {2, 2, -0.21810755324761e-1}, {2, 8, -0.10829784403677}, {2, 18, -0.46333324635812e-1},
    {2, 40, 0.71280351959551e-4}, {3, 1, 0.11032831789999e-3}, {3, 2, 0.18955248387902e-3},
    {3, 12, 0.30891541160537e-2}, {3, 24, 0.13555504554949e-2}, {4, 2, 0.28640237477456e-6},
    {4, 12, -0.10779857357512e-4}, {4, 18, -0.76462712454814e-4}, {4, 24, 0.14052392818316e-4},
    {4, 28, -0.31083814331434e-4}, {4, 40, -0.10302738212103e-5}, {5, 18, 0.28217281635040e-6},
    {5, 24, 0.12704902271945e-5}, {5, 40, 0.73803353468292e-7}, {6, 28, -0.11030139238909e-7},
    {7, 2, -0.81456365207833e-13}, {7, 28, -0.25180545682962e-10}, {9, 1, -0.17565233969407e-17},
    {9, 40, 0.86934156344163e-14},
}};

// I, J, n of R7-97 Table 22.
inline constexpr std::array<PowerTerm, 23> backward_enthalpy_terms_2c{{
    {-7, 0, -0.32368398555242e13}, {-7, 4, 0.73263350902181e13}, {-6, 0, 0.35825089945447e12},
    {-6, 2, -0.58340131851590e12}, {-5, 0, -0.10783068217470e11}, {-5, 2, 0.20825544563171e11},
    {-2, 0, 0.61074783564516e6}, {-2, 1, 0.85977722535580e6}, {-1, 0, -0.25745723604170e5}, {-1, 2, 0.31081088422714e5},
    {0, 0, 0.12082315865936e4}, {0, 1, 0.48219755109255e3}, {1, 4, 0.37966001272486e1}, {1, 8, -0.10842984880077e2},
    {2, 4, -0.45364172676660e-1}, {6, 0, 0.14559115658698e-12}, {6, 1, 0.11261597407230e-11},
    {6, 4, -0.17804982240686e-10}, {6, 10, 0.12324579690832e-6}, {6, 12, -0.11606921130984e-5},
    {6, 16, 0.27846367088554e-4}, {6, 20, -0.59270038474176e-3}, {6, 22, 0.12918582991878e-2},
}};

// 4 I, J, n of R7-97 Table 25: whole exponents of the fourth root of pi.
inline constexpr std::array<PowerTerm, 46> backward_entropy_terms_2a{{
    {-6, -24, -0.39235983861984e6}, {-6, -23, 0.51526573827270e6}, {-6, -19, 0.40482443161048e5},
    {-6, -13, -0.32193790923902e3}, {-6, -11, 0.96961424218694e2}, {-6, -10, -0.22867846371773e2},
    {-5, -19, -0.44942914124357e6}, {-5, -15, -0.50118336020166e4}, {-5, -6, 0.35684463560015},
    {-4, -26, 0.44235335848190e5}, {-4, -21, -0.13673388811708e5}, {-4, -17, 0.42163260207864e6},
    {-4, -16, 0.22516925837475e5}, {-4, -9, 0.47442144865646e3}, {-4, -8, -0.14931130797647e3},
    {-3, -15, -0.19781126320452e6}, {-3, -14, -0.23554399470760e5}, {-2, -26, -0.19070616302076e5},
    {-2, -13, 0.55375669883164e5}, {-2, -9, 0.38293691437363e4}, {-2, -7, -0.60391860580567e3},
    {-1, -27, 0.19363102620331e4}, {-1, -25, 0.42660643698610e4}, {-1, -11, -0.59780638872718e4},
    {-1, -6, -0.70401463926862e3}, {1, 1, 0.33836784107553e3}, {1, 4, 0.20862786635187e2}, {1, 8, 0.33834172656196e-1},
    {1, 11, -0.43124428414893e-4}, {2, 0, 0.16653791356412e3}, {2, 1, -0.13986292055898e3}, {2, 5, -0.78849547999872},
    {2, 6, 0.72132411753872e-1}, {2, 10, -0.59754839398283e-2}, {2, 14, -0.12141358953904e-4},
    {2, 16, 0.23227096733871e-6}, {3, 0, -0.10538463566194e2}, {3, 4, 0.20718925496502e1}, {3, 9, -0.72193155260427e-1},
    {3, 17, 0.20749887081120e-6}, {4, 7, -0.18340657911379e-1}, {4, 18, 0.29036272348696e-6}, {5, 3, 0.21037527893619},
    {5, 15, 0.25681239729999e-3}, {6, 5, -0.12799002933781e-1}, {6, 18, -0.82198102652018e-5},
}};

// I, J, n of R7-97 Table 26.
inline constexpr std::array<PowerTerm, 44> backward_entropy_terms_2b{{
    {-6, 0, 0.31687665083497e6}, {-6, 11, 0.20864175881858e2}, {-5, 0, -0.39859399803599e6},
    {-5, 11, -0.21816058518877e2}, {-4, 0, 0.22369785194242e6}, {-4, 1, -0.27841703445817e4},
    {-4, 11, 0.99207436071480e1}, {-3, 0, -0.75197512299157e5}, {-3, 1, 0.29708605951158e4},
    {-3, 11, -0.34406878548526e1}, {-3, 12, 0.38815564249115}, {-2, 0, 0.17511295085750e5},
    {-2, 1, -0.14237112854449e4}, {-2, 6, 0.10943803364167e1}, {-2, 10, 0.89971619308495}, {-1, 0, -0.33759740098958e4},
    {-1, 1, 0.47162885818355e3}, {-1, 5, -0.19188241993679e1}, {-1, 8, 0.41078580492196}, {-1, 9, -0.33465378172097},
    {0, 0, 0.13870034777505e4}, {0, 1, -0.40663326195838e3}, {0, 2, 0.41727347159610e2}, {0, 4, 0.21932549434532e1},
    {0, 5, -0.10320050009077e1}, {0, 6, 0.35882943516703}, {0, 9, 0.52511453726066e-2}, {1, 0, 0.12838916450705e2},
    {1, 1, -0.28642437219381e1}, {1, 2, 0.56912683664855}, {1, 3, -0.99962954584931e-1}, {1, 7, -0.32632037778459e-2},
    {1, 8, 0.23320922576723e-3}, {2, 0, -0.15334809857450}, {2, 1, 0.29072288239902e-1}, {2, 5, 0.37534702741167e-3},
    {3, 0, 0.17296691702411e-2}, {3, 1, -0.38556050844504e-3}, {3, 3, -0.35017712292608e-4},
    {4, 0, -0.14566393631492e-4}, {4, 1, 0.56420857267269e-5}, {5, 0, 0.41286150074605e-7},
    {5, 1, -0.20684671118824e-7}, {5, 2, 0.16409393674725e-8},
}};

// I, J, n of R7-97 Table 27.
inline constexpr std::array<PowerTerm, 30> backward_entropy_terms_2c{{
    {-2, 0, 0.90968501005365e3}, {-2, 1, 0.24045667088420e4}, {-1, 0, -0.59162326387130e3}, {0, 0, 0.54145404128074e3},
    {0, 1, -0.27098308411192e3}, {0, 2, 0.97976525097926e3}, {0, 3, -0.46966772959435e3}, {1, 0, 0.14399274604723e2},
    {1, 1, -0.19104204230429e2}, {1, 3, 0.53299167111971e1}, {1, 4, -0.21252975375934e2}, {2, 0, -0.31147334413760},
    {2, 1, 0.60334840894623}, {2, 2, -0.42764839702509e-1}, {3, 0, 0.58185597255259e-2}, {3, 1, -0.14597008284753e-1},
    {3, 5, 0.56631175631027e-2}, {4, 0, -0.76155864584577e-4}, {4, 1, 0.22440342919332e-3},
    {4, 4, -0.12561095013413e-4}, {5, 0, 0.63323132660934e-6}, {5, 1, -0.20541989675375e-5},
    {5, 2, 0.36405370390082e-7}, {6, 0, -0.29759897789215e-8}, {6, 1, 0.10136618529763e-7},
    {7, 0, 0.59925719692351e-11}, {7, 1, -0.20677870105164e-10}, {7, 3, -0.20874278181886e-10},
    {7, 4, 0.10162166825089e-9}, {7, 5, -0.16429828281347e-9},
}};

enum class Subregion { a, b, c };

// K, R7-97 for both equations of a subregion
constexpr double backward_tolerance(Subregion subregion) { return subregion == Subregion::c ? 0.025 : 0.010; }

inline constexpr double boundary_2ab_pressure = 4.0e6;  // Pa
inline constexpr double boundary_2bc_entropy = 5850.0;  // J/(kg K)
inline constexpr double boundary_2bc_end = 6.5467e6;    // Pa, where B2bc meets the saturation curve

// B2bc, equation (20): h in J/kg, result in Pa.
inline double boundary_2bc_pressure(double h)
{
    const auto& n = boundary_2bc_coefficients;
    const double eta = h * 1e-3;
    return 1e6 * (n[0] + eta * (n[1] + eta * n[2]));
}

// B2bc, equation (21): p in Pa, at least 4.53 MPa; result in J/kg.
inline double boundary_2bc_enthalpy(double p)
{
    const auto& n = boundary_2bc_coefficients;
    return 1e3 * (n[3] + std::sqrt((p * 1e-6 - n[4]) / n[2]));
}

inline Subregion subregion_at_enthalpy(double p, double h)
{
    if (p <= boundary_2ab_pressure)
        return Subregion::a;
    return p < boundary_2bc_end || h >= boundary_2bc_enthalpy(p) ? Subregion::b : Subregion::c;
}

inline Subregion subregion_at_entropy(double p, double s)
{
    if (p <= boundary_2ab_pressure)
        return Subregion::a;
    return s >= boundary_2bc_entropy ? Subregion::b : Subregion::c;
}

inline double temperature_at_enthalpy(Subregion subregion, double p, double h)
{
    const double pi = p * 1e-6;
    const double eta = h * 0.5e-6;
    switch (subregion) {
    case Subregion::a:
        return PowerSeries<backward_enthalpy_terms_2a, double>(pi, eta - 2.1).sum<term_weight::one>();
    case Subregion::b:
        return PowerSeries<backward_enthalpy_terms_2b, double>(pi - 2.0, eta - 2.6).sum<term_weight::one>();
    case Subregion::c:
        break;
    }
    return PowerSeries<backward_enthalpy_terms_2c, double>(pi + 25.0, eta - 1.8).sum<term_weight::one>();
}

inline double temperature_at_enthalpy(double p, double h)
{
    return temperature_at_enthalpy(subregion_at_enthalpy(p, h), p, h);
}

inline double temperature_at_entropy(Subregion subregion, double p, double s)
{
    const double pi = p * 1e-6;
    const double sigma = s * 1e-3;
    switch (subregion) {
    case Subregion::a:
        return PowerSeries<backward_entropy_terms_2a, double>(std::sqrt(std::sqrt(pi)), sigma / 2.0 - 2.0)
            .sum<term_weight::one>();
    case Subregion::b:
        return PowerSeries<backward_entropy_terms_2b, double>(pi, 10.0 - sigma / 0.7853).sum<term_weight::one>();
    case Subregion::c:
        break;
    }
    return PowerSeries<backward_entropy_terms_2c, double>(pi, 2.0 - sigma / 2.9251).sum<term_weight::one>();
}

inline double temperature_at_entropy(double p, double s)
{
    return temperature_at_entropy(subregion_at_entropy(p, s), p, s);
}

} // namespace entropy_ledger::registry::iapws_r7::region2
