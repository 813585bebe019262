// The limits below are common practice, no source; they only decide whether a caution is shown.
#include "functions/cautions.hpp"

namespace entropy_ledger::functions::cautions {

const char* const undercooled_liquid
    = "an undercooled liquid can freeze all at once and release its heat";
const char* const superheated_liquid
    = "a superheated liquid can flash to vapour violently";

namespace {

const char* const steam = "hot water and steam under pressure scald and burst vessels (pressure-equipment code)";
const char* const melt = "a hot melt or oil burns, and meeting water or damp material it can spatter or explode";
const char* const ammonia = "ammonia is toxic and burns eyes and lungs (refrigeration code)";

constexpr double scalding = 333.15;      // K, 60 °C
constexpr double raised_pressure = 1.5e5; // Pa
constexpr double hot_melt = 373.15;      // K

} // namespace

std::vector<const char*> of_state(const registry::Substance& substance, const registry::Phase& phase, double T, double p)
{
    std::vector<const char*> list;
    const bool fluid = phase.aggregation != registry::Aggregation::crystal;
    const bool is_water = substance.formula == "H2O";
    if (is_water && fluid && (T > 373.15 || (p > raised_pressure && T > scalding)))
        list.push_back(steam);
    // Nothing but water is liquid above 100 °C and harmless beside it: metals and salts alike.
    if (!is_water && phase.aggregation == registry::Aggregation::liquid && T > hot_melt)
        list.push_back(melt);
    if (substance.formula == "NH3")
        list.push_back(ammonia);
    return list;
}

} // namespace entropy_ledger::functions::cautions
