// Liquid water, stable, supercooled and superheated: SR6-08 below 273.15 K, R7-97 from there on. Ranges, seams and why:
// water_formulations.hpp.
#pragma once

#include "registry/limits.hpp"
#include "registry/models/iapws_r7_region1.hpp"
#include "registry/models/iapws_r7_region3.hpp"
#include "registry/models/iapws_r7_saturation.hpp"
#include "registry/models/iapws_sr6.hpp"
#include "registry/models/water_formulations.hpp"
#include "registry/number.hpp"
#include "registry/source.hpp"

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <span>
#include <string_view>

namespace entropy_ledger::registry {

struct LiquidWater {
    using Bounds = LiquidWaterBounds;

    static constexpr bool holds_heat_capacity = false; // the model itself does so where that is right

    enum class Formulation { sr6_held, sr6, region1, region3 };

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
                const Number edge(Bounds::sr6_lower);
                return iapws_sr6::entropy(edge, p) + iapws_sr6::heat_capacity(edge, p) * log(T / Bounds::sr6_lower);
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
                const Number edge(Bounds::sr6_lower);
                return iapws_sr6::enthalpy(edge, p) + iapws_sr6::heat_capacity(edge, p) * (T - Bounds::sr6_lower);
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
            case Formulation::sr6_held: return iapws_sr6::heat_capacity(Number(Bounds::sr6_lower), p);
            case Formulation::sr6: return iapws_sr6::heat_capacity(T, p);
            case Formulation::region3: return region3(T, p).heat_capacity();
            case Formulation::region1: break;
            }
            return iapws_r7::region1::heat_capacity(T, p);
        });
    }

    Limits limits(double p) const
    {
        if (!(p > 0.0 && p <= Bounds::greatest_pressure))
            return {empty_range, empty_range};
        const double saturation = stable_to(p);
        const double lowest = p < Bounds::sr6_pressure ? Bounds::sr6_held_to : Bounds::region1_trusted_to;
        const double given = p <= Bounds::sr6_stated_pressure ? Bounds::sr6_lower : Bounds::seam;
        const double superheated =
            std::min(Bounds::region1_upper,
                     std::max(Bounds::superheat_trusted_to, saturation + Bounds::superheat_margin));
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
    static constexpr double temperature_bounds[] = {Bounds::sr6_lower, Bounds::seam, Bounds::region1_upper + 1e-9};
    static constexpr double pressure_bounds[] = {Bounds::sr6_pressure};

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
