// Water near its critical point and above, R7-97 region 3: 623.15 K <= T <= the temperature of equation (6) at p,
// p <= 100 MPa. Liquid, vapour and supercritical fluid in one equation.
//
// Source: IAPWS R7-97(2012), equation (28) with Table 30, a Helmholtz energy:
//   f/(R T) = phi(delta, tau) = n1 ln(delta) + sum n delta^I tau^J,  delta = rho/322 kg/m3,  tau = 647.096 K/T.
// T in K, p in Pa, rho in kg/m3, results in J/kg, J/(kg K). No check of range.
//
// At given T and p the density is solved for. The iteration works on plain values and ends at rounding; one Newton
// step in Number arithmetic then carries the dependence on T and p, exact in value and in first derivatives. A Number
// that records an expression gets one that holds near this state only.
#pragma once

#include "registry/models/iapws_r7_region1.hpp"
#include "registry/models/iapws_r7_saturation.hpp"
#include "registry/models/power_series.hpp"
#include "registry/number.hpp"

#include <algorithm>
#include <array>
#include <cmath>

namespace entropy_ledger::registry::iapws_r7::region3 {

inline constexpr double critical_density = 322.0;          // kg/m3, R7-97 equation (4)
inline constexpr double logarithm_factor = 0.10658070028513e1; // n1 of Table 30

// I, J, n of R7-97 Table 30 from the second row on.
inline constexpr std::array<PowerTerm, 39> terms{{
    {0, 0, -0.15732845290239e2}, {0, 1, 0.20944396974307e2}, {0, 2, -0.76867707878716e1}, {0, 7, 0.26185947787954e1},
    {0, 10, -0.28080781148620e1}, {0, 12, 0.12053369696517e1}, {0, 23, -0.84566812812502e-2},
    {1, 2, -0.12654315477714e1}, {1, 6, -0.11524407806681e1}, {1, 15, 0.88521043984318}, {1, 17, -0.64207765181607},
    {2, 0, 0.38493460186671}, {2, 2, -0.85214708824206}, {2, 6, 0.48972281541877e1}, {2, 7, -0.30502617256965e1},
    {2, 22, 0.39420536879154e-1}, {2, 26, 0.12558408424308}, {3, 0, -0.27999329698710}, {3, 2, 0.13899799569460e1},
    {3, 4, -0.20189915023570e1}, {3, 16, -0.82147637173963e-2}, {3, 26, -0.47596035734923},
    {4, 0, 0.43984074473500e-1}, {4, 2, -0.44476435428739}, {4, 4, 0.90572070719733}, {4, 26, 0.70522450087967},
    {5, 1, 0.10770512626332}, {5, 3, -0.32913623258954}, {5, 26, -0.50871062041158}, {6, 0, -0.22175400873096e-1},
    {6, 2, 0.94260751665092e-1}, {6, 26, 0.16436278447961}, {7, 2, -0.13503372241348e-1},
    {8, 26, -0.14834345352472e-1}, {9, 2, 0.57922953628084e-3}, {9, 26, 0.32308904703711e-2},
    {10, 0, 0.80964802996215e-4}, {10, 1, -0.16557679795037e-3}, {11, 26, -0.44923899061815e-4},
}};

// Properties at given density and temperature.
template <class Number>
class State {
public:
    State(const Number& density, const Number& T)
        : T_(T), delta_(density * (1.0 / critical_density)), tau_(critical_temperature / T), phi_(delta_, tau_)
    {
    }

    Number pressure() const { return gas_constant * critical_density * T_ * (delta_ * delta_phi_delta()); }

    // dp/drho at constant T, J/kg
    Number pressure_slope() const { return gas_constant * T_ * stiffness(); }

    Number entropy() const
    {
        return gas_constant * (tau_phi_tau() - phi());
    }

    Number enthalpy() const { return gas_constant * T_ * (tau_phi_tau() + delta_phi_delta()); }

    Number heat_capacity() const
    {
        const Number mixed = delta_phi_delta() - phi_.template sum<term_weight::ij>();
        return gas_constant * (mixed * mixed / stiffness() - phi_.template sum<term_weight::jj>());
    }

    Number gibbs_energy() const { return gas_constant * T_ * (phi() + delta_phi_delta()); }

private:
    Number phi() const
    {
        using std::log;
        return logarithm_factor * log(delta_) + phi_.template sum<term_weight::one>();
    }
    Number delta_phi_delta() const { return logarithm_factor + phi_.template sum<term_weight::i>(); }
    Number tau_phi_tau() const { return phi_.template sum<term_weight::j>(); }
    Number stiffness() const // 2 delta phi_delta + delta^2 phi_delta_delta
    {
        return 2.0 * delta_phi_delta() - logarithm_factor + phi_.template sum<term_weight::ii>();
    }

    Number T_;
    Number delta_;
    Number tau_;
    PowerSeries<terms, Number> phi_;
};

// Which density is meant where the equation has two at one T and p.
enum class Side { liquid, vapour };

// Below the critical temperature the pressure is convex in the density on the liquid side and concave on the vapour
// side, so that Newton steps that start outside, at `densest` or at the ideal gas, come to the root from that side and
// never pass it. Above it the pressure rises throughout and the root is held between two bounds.
// Above the critical pressure there is one root, which below the critical temperature is liquid.
// 0 when the side asked for has no root.
inline double density_at(double T, double p, Side side)
{
    constexpr double densest = 800.0; // kg/m3; 762 kg/m3 at 623.15 K and 100 MPa is the greatest of the region
    constexpr int most_steps = 200;
    double lower = p / (gas_constant * T); // below any root: attraction makes the gas denser than the ideal one
    double upper = densest;
    const bool one_root = T >= critical_temperature;
    double density = side == Side::liquid || p >= critical_pressure ? upper : lower;
    for (int step = 0; step < most_steps; ++step) {
        const State<double> state(density, T);
        const double excess = state.pressure() - p;
        const double slope = state.pressure_slope();
        if (!one_root && !(slope > 0.0))
            return 0.0;
        if (excess > 0.0)
            upper = density;
        else
            lower = density;
        double next = density - excess / slope;
        if (one_root && !(next > lower && next < upper))
            next = 0.5 * (lower + upper);
        if (!(next > 0.0) || !(next <= densest))
            return 0.0;
        const double change = std::abs(next - density);
        density = next;
        if (change <= 1e-14 * density)
            break;
    }
    const State<double> state(density, T);
    return std::abs(state.pressure() - p) <= 1e-9 * p ? density : 0.0;
}

// How far beyond saturation at T both sides still have their root, K. The equation's own saturation curve and that of
// region 4 differ by 2.2 mK at most (at 20 MPa) and by less towards the critical point.
inline double metastable_margin(double saturation_temperature)
{
    return std::min(0.01, 0.01 * std::abs(critical_temperature - saturation_temperature));
}

// The state at T and p.
template <class Number>
State<Number> state_at(const Number& T, const Number& p, Side side)
{
    double start = density_at(value_of(T), value_of(p), side);
    if (start == 0.0)
        start = critical_density; // out of range; any positive density keeps the arithmetic defined
    const State<Number> nearby(Number(start), T);
    return State<Number>(start - (nearby.pressure() - p) / nearby.pressure_slope(), T);
}

} // namespace entropy_ledger::registry::iapws_r7::region3
