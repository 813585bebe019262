// Temperature of water or steam from pressure and enthalpy by the backward equations of R7-97, with the check of range
// that the equations leave out.
//
// p in Pa, h in J/kg, results in K. Regions 1 and 2 of IAPWS R7-97(2012) only: no answer in the two-phase region, in
// regions 3 and 5, nor beyond the release.
#pragma once

#include "registry/models/iapws_r7_backward_region1.hpp"
#include "registry/models/iapws_r7_backward_region2.hpp"
#include "registry/models/iapws_r7_region1.hpp"
#include "registry/models/iapws_r7_region2.hpp"
#include "registry/models/iapws_r7_saturation.hpp"

#include <algorithm>
#include <optional>

namespace entropy_ledger::registry::iapws_r7 {

enum class BackwardRegion { none, liquid, steam }; // liquid: region 1, steam: region 2

namespace detail {

inline constexpr double lowest_temperature = 273.15;           // K
inline constexpr double highest_liquid_temperature = 623.15;   // K, also the start of boundary 2-3
inline constexpr double highest_steam_temperature = 1073.15;   // K
inline constexpr double highest_pressure = 100e6;              // Pa

struct TemperatureRange {
    double lowest;
    double highest;
};

// The temperatures of region 1 at p; none below the saturation pressure at 273.15 K (611.21 Pa).
inline std::optional<TemperatureRange> liquid_range(double p)
{
    if (!(p >= saturation_pressure(lowest_temperature) && p <= highest_pressure))
        return std::nullopt;
    const bool saturates = p < saturation_pressure(highest_liquid_temperature);
    return TemperatureRange{lowest_temperature, saturates ? saturation_temperature(p) : highest_liquid_temperature};
}

// The temperatures of region 2 at p.
inline std::optional<TemperatureRange> steam_range(double p)
{
    if (!(p > 0.0 && p <= highest_pressure))
        return std::nullopt;
    double lowest = lowest_temperature;
    if (p >= saturation_pressure(highest_liquid_temperature))
        lowest = boundary_23_temperature(p);
    else if (p > saturation_pressure(lowest_temperature))
        lowest = saturation_temperature(p);
    return TemperatureRange{lowest, highest_steam_temperature};
}

} // namespace detail

// Which region's backward equation answers; the ends of both regions are theirs. The bounds in h are those of the
// equations for T and p, so that a state at the very end of a region is not lost to the tolerance of the backward one.
inline BackwardRegion backward_region(double p, double h)
{
    if (const auto range = detail::liquid_range(p))
        if (h >= region1::enthalpy(range->lowest, p) && h <= region1::enthalpy(range->highest, p))
            return BackwardRegion::liquid;
    if (const auto range = detail::steam_range(p))
        if (h >= region2::Equation::enthalpy(range->lowest, p) && h <= region2::Equation::enthalpy(range->highest, p))
            return BackwardRegion::steam;
    return BackwardRegion::none;
}

// Within the tolerance of the backward equations (17.4 mK for steam below 611 Pa), and never outside the region: of the
// saturated liquid at most the saturation temperature, of the saturated steam at least that.
inline std::optional<double> temperature_from_enthalpy(double p, double h)
{
    switch (backward_region(p, h)) {
    case BackwardRegion::liquid: {
        const auto range = *detail::liquid_range(p);
        return std::clamp(region1::temperature_at_enthalpy(p, h), range.lowest, range.highest);
    }
    case BackwardRegion::steam: {
        const auto range = *detail::steam_range(p);
        return std::clamp(region2::temperature_at_enthalpy(p, h), range.lowest, range.highest);
    }
    case BackwardRegion::none:
        break;
    }
    return std::nullopt;
}

} // namespace entropy_ledger::registry::iapws_r7
