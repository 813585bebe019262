// Liquid water, stable, supercooled and superheated: SR6-08 below 273.15 K, R7-97 from there on.
//
// Why this seam. Steps in h (J/kg), s (J/(kg K)), cp (J/(kg K)) and g (J/kg) from SR6-08 with its pressure term to
// R7-97, region 1, measured at the candidate seams:
//   at 273.15 K, from the triple-point pressure to 0.3 MPa:  -0.17   -0.0007   +0.12  +0.03
//   at 273.15 K and 1 MPa:                                   -0.79   -0.0022   +0.12  -0.18
//   at 298.15 K and 0.1 MPa:                                 +8.7    +0.030    +0.45  -0.21
//   at 373.12 K and 0.1 MPa:                                 -67     -0.197    +1.1   +6.4
//   at 383.15 K and 0.1 MPa:                                 -52     -0.156    +1.8   +8.2
//   in pressure, at 0.3 MPa, 353.15 K:                       -64     -0.187    -1.3   +2.4
// Both formulations keep to the tolerances they state, but a seam at 383.15 K or in pressure would show in a difference
// of a few kelvin across it; one at 273.15 K, the lower end of R7-97, is 40 microkelvin in temperature. It also leaves
// R7-97 on both sides of the saturation curve, where g of its liquid and its steam meet within 11 J/kg or 4 mK, and
// puts the melting temperature at 0.101325 MPa at 273.15253 K (R10-06: 273.152519 K).
//
// Supercooled. SR6-08 gives 253.15 K at 0.1 MPa; its term in pressure is used below 1 MPa and counted as the source's
// own to 0.3 MPa. From 253.15 K down to 250.15 K its heat capacity is held: at 250.15 K 4401 J/(kg K) against 4484 by
// IAPWS G12-15 (-1.9 %), 0.66 J/(kg K) in entropy; the equation itself turns over soon below (pole at 232 K). From 1
// MPa on region 1 is used below its end of 273.15 K, where the melting curve runs, down to 263.15 K. Against IAPWS-95
// it differs there by 18 J/kg, 0.068 J/(kg K) and 5.4 J/(kg K) in cp at 1 MPa, by 11 J/kg at 10 MPa and by 21 J/kg at
// 100 MPa, of which 19 stand at 273.15 K already; against G12-15 cp differs by 4.5, 4.2 and -31 J/(kg K) at 1, 10 and
// 100 MPa. Where SR6-08 and region 1 meet at 1 MPa, h steps by 3.8 J/kg at 268.15 K and by 19 J/kg at 263.15 K.
//
// Superheated. R7-97 says that region 1 gives reasonable values close to saturation (from memory). Compared with
// IAPWS-95 on its metastable branch from 373.15 K to 573.15 K, 1 Pa to 8.6 MPa: cp within 0.11 %, h within 290 J/kg,
// s within 0.52 J/(kg K), little more than on the saturation curve itself (240 J/kg, 0.43 J/(kg K)). At 578 K cp
// begins to part (0.13 %), at 583 K by 1.1 % at 1 bar: the range ends at 573.15 K. Where saturation lies above, 3 K
// of superheat are kept: cp within 0.8 %.
//
// Above 623.15 K: region 3, on the liquid side up to saturation; the step from region 1 is -7 to +28 J/kg in h, -0.018
// to +0.038 J/(kg K) in s. Above the critical pressure there is one fluid; liquid and steam then both have the values
// of region 3.
#pragma once

#include "registry/limits.hpp"
#include "registry/models/iapws_r7_region1.hpp"
#include "registry/models/iapws_r7_region3.hpp"
#include "registry/models/iapws_r7_saturation.hpp"
#include "registry/models/iapws_sr6.hpp"
#include "registry/number.hpp"
#include "registry/source.hpp"

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <span>
#include <string_view>

namespace entropy_ledger::registry {

struct LiquidWater {
    static constexpr bool holds_heat_capacity = false; // the model itself does so where that is right

    enum class Formulation { sr6_held, sr6, region1, region3 };

    static constexpr double sr6_lower = 253.15;           // K, SR6-08
    static constexpr double sr6_held_to = 250.15;         // K, see above
    static constexpr double seam = 273.15;                // K, R7-97's lower end
    static constexpr double region1_trusted_to = 263.15;  // K, see above
    static constexpr double region1_upper = 623.15;       // K, R7-97
    static constexpr double superheat_trusted_to = 573.15; // K, see above
    static constexpr double superheat_margin = 3.0;       // K, see above
    static constexpr double sr6_stated_pressure = 0.3e6;  // Pa, SR6-08
    static constexpr double sr6_pressure = 1.0e6;         // Pa, used below this
    static constexpr double greatest_pressure = 100.0e6;  // Pa, R7-97

    // The formulation that answers at (T, p).
    static Formulation formulation_at(double T, double p)
    {
        return formulation_in(interval_of(T, temperature_bounds), interval_of(p, pressure_bounds));
    }

    static constexpr std::string_view name(Formulation f)
    {
        switch (f) {
        case Formulation::sr6_held: return "IAPWS SR6-08, heat capacity held below 253.15 K";
        case Formulation::sr6: return "IAPWS SR6-08";
        case Formulation::region1: return "IAPWS R7-97 region 1";
        case Formulation::region3: return "IAPWS R7-97 region 3";
        }
        return {};
    }

    std::string_view formulation(double T, double p) const { return name(formulation_at(T, p)); }

    template <class Number>
    Number entropy(const Number& T, const Number& p) const
    {
        return select(T, p, [&](Formulation f) -> Number {
            using std::log;
            switch (f) {
            case Formulation::sr6_held: {
                const Number edge(sr6_lower);
                return iapws_sr6::entropy(edge, p) + iapws_sr6::heat_capacity(edge, p) * log(T / sr6_lower);
            }
            case Formulation::sr6: return iapws_sr6::entropy(T, p);
            case Formulation::region3: return region3(T, p).entropy();
            case Formulation::region1: break;
            }
            return iapws_r7::region1::entropy(T, p);
        });
    }

    template <class Number>
    Number enthalpy(const Number& T, const Number& p) const
    {
        return select(T, p, [&](Formulation f) -> Number {
            switch (f) {
            case Formulation::sr6_held: {
                const Number edge(sr6_lower);
                return iapws_sr6::enthalpy(edge, p) + iapws_sr6::heat_capacity(edge, p) * (T - sr6_lower);
            }
            case Formulation::sr6: return iapws_sr6::enthalpy(T, p);
            case Formulation::region3: return region3(T, p).enthalpy();
            case Formulation::region1: break;
            }
            return iapws_r7::region1::enthalpy(T, p);
        });
    }

    template <class Number>
    Number heat_capacity(const Number& T, const Number& p) const
    {
        return select(T, p, [&](Formulation f) -> Number {
            switch (f) {
            case Formulation::sr6_held: return iapws_sr6::heat_capacity(Number(sr6_lower), p);
            case Formulation::sr6: return iapws_sr6::heat_capacity(T, p);
            case Formulation::region3: return region3(T, p).heat_capacity();
            case Formulation::region1: break;
            }
            return iapws_r7::region1::heat_capacity(T, p);
        });
    }

    Limits limits(double p) const
    {
        if (!(p > 0.0 && p <= greatest_pressure))
            return {empty_range, empty_range};
        const double saturation = stable_to(p);
        const double lowest = p < sr6_pressure ? sr6_held_to : region1_trusted_to;
        const double given = p <= sr6_stated_pressure ? sr6_lower : seam;
        const double superheated =
            std::min(region1_upper, std::max(superheat_trusted_to, saturation + superheat_margin));
        const double two_phases = p < iapws_r7::critical_pressure
                                    ? saturation + iapws_r7::region3::metastable_margin(saturation)
                                    : saturation;
        return {{given, saturation}, {lowest, std::max(superheated, two_phases)}};
    }

    const Source& source(double T, double p) const
    {
        const Formulation f = formulation_at(T, p);
        return f == Formulation::sr6 || f == Formulation::sr6_held ? sources::iapws_sr6 : sources::iapws_r7;
    }

    std::span<const Source* const> sources() const { return answering; }

private:
    static constexpr const Source* answering[] = {&sources::iapws_r7, &sources::iapws_sr6};

    // Upper end of the stable liquid, K. Below the triple point's pressure no liquid is stable; its end there is put
    // at the triple point. Above the critical pressure it is the end of region 3.
    static double stable_to(double p)
    {
        if (p <= iapws_r7::triple_point_pressure)
            return iapws_r7::triple_point_temperature;
        if (p < iapws_r7::critical_pressure)
            return iapws_r7::saturation_temperature(p);
        return iapws_r7::boundary_23_temperature(p);
    }

    template <class Number>
    static iapws_r7::region3::State<Number> region3(const Number& T, const Number& p)
    {
        return iapws_r7::region3::state_at(T, p, iapws_r7::region3::Side::liquid);
    }

    // A bound belongs to the interval above it, but region 1 keeps its own upper end.
    static constexpr double temperature_bounds[] = {sr6_lower, seam, region1_upper + 1e-9};
    static constexpr double pressure_bounds[] = {sr6_pressure};

    static constexpr Formulation formulation_in(std::size_t temperature, std::size_t pressure)
    {
        if (temperature == 3)
            return Formulation::region3;
        if (temperature == 2 || pressure == 1)
            return Formulation::region1;
        return temperature == 1 ? Formulation::sr6 : Formulation::sr6_held;
    }

    template <class Number, class Branch>
    static Number select(const Number& T, const Number& p, Branch&& branch)
    {
        return choose(T, temperature_bounds, [&](std::size_t temperature) -> Number {
            if (temperature >= 2)
                return branch(formulation_in(temperature, 0));
            return choose(p, pressure_bounds, [&](std::size_t pressure) -> Number {
                return branch(formulation_in(temperature, pressure));
            });
        });
    }
};

} // namespace entropy_ledger::registry
