// Steam, stable, supersaturated and supercritical, by R7-97: regions 2, 3 and 5 and the metastable-vapour equation.
//
// Supersaturated steam, up to 10 MPa: the metastable-vapour equation, from saturation to the line of 5 % equilibrium
// moisture, which lies 56 K below saturation at 0.01 MPa, 48 K at 0.1 MPa, 32 K at 1 MPa and 8.2 K at 10 MPa. `fit`
// ends 0.178 (627 K - T_saturation) below saturation, up to 3 K inside that line, and not below 273.15 K. Region 2
// itself does not serve: 48 K below saturation at 0.1 MPa its h is off by 90 kJ/kg. The two equations do not meet to
// the last digit. Steps at saturation from region 2 to the other, 611 Pa to 10 MPa: h -43 to +37 J/kg, s -0.08 to
// +0.08 J/(kg K), g -16 to +23 J/kg, cp -16 to +17 J/(kg K) (-55 of 7147 at 10 MPa). To keep the equilibrium of
// liquid and steam, which is met within 4 mK, clear of that step it is put at a pressure 0.5 % above saturation, 0.1
// K below saturation at 0.1 MPa. Above 10 MPa the release names region 2 (from memory); it is trusted for 1 K, within
// which cp is within 0.4 % of IAPWS-95 up to 15 MPa and 1.6 % below it at 16.5 MPa (at 3 K 12 %).
//
// Below the triple point's pressure, over ice: region 2 is trusted below its end of 273.15 K down to 253.15 K, but
// not more than 3 K below the sublimation temperature. Against IAPWS-95 at 100 Pa and 253.15 K: h -35 J/kg,
// s -0.094 J/(kg K), cp +0.4 %.
//
// Steps from region 2 to region 3 along their boundary: h -125 to +72 J/kg, s -0.18 to +0.10 J/(kg K).
// Step from region 2 to region 5 at 1073.15 K: h -94 to +90 J/kg, s -0.13 to +0.015 J/(kg K), cp within 2.2 J/(kg K).
// Above the critical pressure there is one fluid; steam and liquid then both have the values of region 3.
#pragma once

#include "registry/limits.hpp"
#include "registry/models/iapws_r7_region2.hpp"
#include "registry/models/iapws_r7_region3.hpp"
#include "registry/models/iapws_r7_region5.hpp"
#include "registry/models/iapws_r7_saturation.hpp"
#include "registry/number.hpp"
#include "registry/source.hpp"

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <span>
#include <string_view>

namespace entropy_ledger::registry {

struct Steam {
    static constexpr bool holds_heat_capacity = false;

    enum class Formulation { region2, metastable, region3, region5 };

    static constexpr double lowest_temperature = 273.15;      // K, R7-97
    static constexpr double over_ice_trusted_to = 253.15;     // K, see above
    static constexpr double metastable_pressure = 10.0e6;     // Pa, R7-97
    static constexpr double metastable_upper = 584.15;        // K, just above saturation at that pressure
    static constexpr double seam_supersaturation = 1.005;     // p over saturation pressure, see above
    static constexpr double region3_lower = 623.15;           // K, R7-97
    static constexpr double region3_upper = 863.15;           // K, R7-97
    static constexpr double region2_upper = 1073.15;          // K, R7-97
    static constexpr double region5_upper = 2273.15;          // K, R7-97
    static constexpr double region5_pressure = 50.0e6;        // Pa, R7-97
    static constexpr double greatest_pressure = 100.0e6;      // Pa, R7-97
    static constexpr double supersaturation_margin = 1.0;     // K, above 10 MPa, see above
    static constexpr double sublimation_margin = 3.0;         // K, over ice, see above

    static constexpr std::string_view name(Formulation f)
    {
        switch (f) {
        case Formulation::region2: return "IAPWS R7-97 region 2";
        case Formulation::metastable: return "IAPWS R7-97 metastable vapour";
        case Formulation::region3: return "IAPWS R7-97 region 3";
        case Formulation::region5: return "IAPWS R7-97 region 5";
        }
        return {};
    }

    // The formulation that answers at (T, p).
    static Formulation formulation_at(double T, double p)
    {
        Formulation result = Formulation::region2;
        select(T, p, [&](Formulation f) {
            result = f;
            return 0.0;
        });
        return result;
    }

    std::string_view formulation(double T, double p) const { return name(formulation_at(T, p)); }

    template <class Number>
    Number entropy(const Number& T, const Number& p) const
    {
        return select(T, p, [&](Formulation f) -> Number {
            switch (f) {
            case Formulation::metastable: return iapws_r7::metastable_vapour::Equation::entropy(T, p);
            case Formulation::region3: return region3(T, p).entropy();
            case Formulation::region5: return iapws_r7::region5::entropy(T, p);
            case Formulation::region2: break;
            }
            return iapws_r7::region2::Equation::entropy(T, p);
        });
    }

    template <class Number>
    Number enthalpy(const Number& T, const Number& p) const
    {
        return select(T, p, [&](Formulation f) -> Number {
            switch (f) {
            case Formulation::metastable: return iapws_r7::metastable_vapour::Equation::enthalpy(T, p);
            case Formulation::region3: return region3(T, p).enthalpy();
            case Formulation::region5: return iapws_r7::region5::enthalpy(T, p);
            case Formulation::region2: break;
            }
            return iapws_r7::region2::Equation::enthalpy(T, p);
        });
    }

    template <class Number>
    Number heat_capacity(const Number& T, const Number& p) const
    {
        return select(T, p, [&](Formulation f) -> Number {
            switch (f) {
            case Formulation::metastable: return iapws_r7::metastable_vapour::Equation::heat_capacity(T, p);
            case Formulation::region3: return region3(T, p).heat_capacity();
            case Formulation::region5: return iapws_r7::region5::heat_capacity(T, p);
            case Formulation::region2: break;
            }
            return iapws_r7::region2::Equation::heat_capacity(T, p);
        });
    }

    Limits limits(double p) const
    {
        if (!(p > 0.0 && p <= greatest_pressure))
            return {empty_range, empty_range};
        const double upper = p <= region5_pressure ? region5_upper : region2_upper;
        const Range lower = lower_ends(p);
        return {{lower.upper, upper}, {lower.lower, upper}};
    }

    const Source& source(double, double) const { return sources::iapws_r7; }
    std::span<const Source* const> sources() const { return answering; }

private:
    static constexpr const Source* answering[] = {&sources::iapws_r7};

    // Lower ends at pressure p: of the fit as `upper`, of the trust as `lower`.
    static Range lower_ends(double p)
    {
        if (p <= iapws_r7::triple_point_pressure) {
            const double over_ice = std::max(over_ice_trusted_to, sublimation_temperature(p) - sublimation_margin);
            return {std::min(over_ice, lowest_temperature), lowest_temperature};
        }
        if (p >= iapws_r7::critical_pressure)
            return {region3_lower, region3_lower};
        const double saturation = iapws_r7::saturation_temperature(p);
        if (p <= metastable_pressure) {
            const double end = std::max(lowest_temperature, saturation - 0.178 * (627.0 - saturation));
            return {end, end};
        }
        if (saturation <= region3_lower)
            return {saturation - supersaturation_margin, saturation};
        return {saturation - iapws_r7::region3::metastable_margin(saturation), saturation};
    }

    // Clausius-Clapeyron from the triple point with 2834 kJ/kg; within 0.1 K of the sublimation curve of IAPWS R14-08
    // down to 250 K.
    static double sublimation_temperature(double p)
    {
        constexpr double slope = 2.834e6 / (iapws_r7::gas_constant * iapws_r7::triple_point_temperature);
        return iapws_r7::triple_point_temperature
             / (1.0 - std::log(p / iapws_r7::triple_point_pressure) / slope);
    }

    template <class Number>
    static iapws_r7::region3::State<Number> region3(const Number& T, const Number& p)
    {
        return iapws_r7::region3::state_at(T, p, iapws_r7::region3::Side::vapour);
    }

    // A bound belongs to the interval above it; region 2 keeps its own upper end.
    static constexpr double temperature_bounds[] = {metastable_upper, region3_lower, region3_upper,
                                                    region2_upper + 1e-9};

    template <class Number, class Branch>
    static Number select(const Number& T, const Number& p, Branch&& branch)
    {
        return choose(T, temperature_bounds, [&](std::size_t temperature) -> Number {
            switch (temperature) {
            case 0: return below_metastable_upper(T, p, branch);
            case 2: {
                static constexpr double zero[] = {0.0};
                return choose(Number(p - iapws_r7::boundary_23_pressure(T)), zero, [&](std::size_t above) -> Number {
                    return branch(above ? Formulation::region3 : Formulation::region2);
                });
            }
            case 4: return branch(Formulation::region5);
            default: return branch(Formulation::region2);
            }
        });
    }

    template <class Number, class Branch>
    static Number below_metastable_upper(const Number& T, const Number& p, Branch&& branch)
    {
        static constexpr double pressures[] = {iapws_r7::triple_point_pressure, metastable_pressure * (1.0 + 1e-12)};
        return choose(p, pressures, [&](std::size_t pressure) -> Number {
            if (pressure != 1)
                return branch(Formulation::region2);
            static constexpr double seam[] = {seam_supersaturation};
            return choose(Number(p / iapws_r7::saturation_pressure(T)), seam, [&](std::size_t above) -> Number {
                return branch(above ? Formulation::metastable : Formulation::region2);
            });
        });
    }
};

} // namespace entropy_ledger::registry
