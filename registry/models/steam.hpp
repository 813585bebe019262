// Steam, stable, supersaturated and supercritical, by R7-97: regions 2, 3 and 5 and the metastable-vapour equation;
// over ice down to the sublimation curve of R14-08 and a little beyond. Ranges and seams: water_formulations.hpp.
#pragma once

#include "registry/limits.hpp"
#include "registry/models/iapws_r14.hpp"
#include "registry/models/iapws_r7_region2.hpp"
#include "registry/models/iapws_r7_region3.hpp"
#include "registry/models/iapws_r7_region5.hpp"
#include "registry/models/iapws_r7_saturation.hpp"
#include "registry/models/water_formulations.hpp"
#include "registry/number.hpp"
#include "registry/source.hpp"

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <span>
#include <string_view>

namespace entropy_ledger::registry {

struct Steam {
    using Bounds = SteamBounds;

    static constexpr bool holds_heat_capacity = false;

    enum class Formulation { region2, metastable, region3, region5 };

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
        if (!(p > 0.0 && p <= Bounds::greatest_pressure))
            return {empty_range, empty_range};
        const double upper = p <= Bounds::region5_pressure ? Bounds::region5_upper : Bounds::region2_upper;
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
            const double over_ice = iapws_r14::sublimation_temperature(p) - Bounds::sublimation_margin;
            return {std::max(Bounds::over_ice_trusted_to, over_ice), Bounds::lowest_temperature};
        }
        if (p >= iapws_r7::critical_pressure)
            return {Bounds::region3_lower, Bounds::region3_lower};
        const double saturation = iapws_r7::saturation_temperature(p);
        if (p <= Bounds::metastable_pressure) {
            const double end = std::max(Bounds::lowest_temperature, saturation - 0.178 * (627.0 - saturation));
            return {end, end};
        }
        if (saturation <= Bounds::region3_lower)
            return {saturation - Bounds::supersaturation_margin, saturation};
        return {saturation - iapws_r7::region3::metastable_margin(saturation), saturation};
    }

    template <class Number>
    static iapws_r7::region3::State<Number> region3(const Number& T, const Number& p)
    {
        return iapws_r7::region3::state_at(T, p, iapws_r7::region3::Side::vapour);
    }

    // A bound belongs to the interval above it; region 2 keeps its own upper end.
    static constexpr double temperature_bounds[] = {Bounds::metastable_upper, Bounds::region3_lower,
                                                    Bounds::region3_upper, Bounds::region2_upper + 1e-9};

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
        static constexpr double pressures[] = {iapws_r7::triple_point_pressure,
                                               Bounds::metastable_pressure * (1.0 + 1e-12)};
        return choose(p, pressures, [&](std::size_t pressure) -> Number {
            if (pressure != 1)
                return branch(Formulation::region2);
            static constexpr double seam[] = {Bounds::seam_supersaturation};
            return choose(Number(p / iapws_r7::saturation_pressure(T)), seam, [&](std::size_t above) -> Number {
                return branch(above ? Formulation::metastable : Formulation::region2);
            });
        });
    }
};

} // namespace entropy_ledger::registry
