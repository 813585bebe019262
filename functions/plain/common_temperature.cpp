// Mean and common temperatures.
#include "functions/plain/heat_and_entropy.hpp"
#include "functions/plain/plain.hpp"
#include "functions/whole_reader.hpp"

#include <cmath>

namespace entropy_ledger::functions::plain {

Result temperature_mean(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const auto [heat, entropy] = heat_and_entropy(reader);
    if (reader.refused())
        return reader.refusal().error;
    const double T = heat / entropy;
    return T > 0.0 && std::isfinite(T) ? T : error_number(ErrorCode::unusable_argument);
}

Result temperature_common(const Entry& entry, std::span<const Argument> arguments)
{
    if (arguments.size() > entry.arguments.size())
        return error_number(ErrorCode::unusable_argument);
    WholeReader reader(entry, arguments, false);
    reader.require_equal(Key::capacities, Key::temperatures);
    if (!reader.given(Key::temperatures))
        reader.refuse(ErrorCode::unusable_argument, Key::temperatures, "is missing");
    bool reversible = false;
    double capacities = 0.0;
    double weighted = 0.0; // sum of C T, or of C ln T
    bool mixed_rates = false;
    bool first = true;
    bool first_rate = false;
    const std::size_t count = reader.refused() ? 0 : reader.count(Key::capacities);
    for (std::size_t i = 0; i < count; ++i) {
        reader.row(i, [&](Reader& row) {
            const Flow<double> C = row.heat_capacity(Key::capacities);
            const double T = row.temperature(Key::temperatures);
            const std::string_view way = row.given(Key::way) ? row.text(Key::way) : std::string_view("mixed");
            if (!row.refused() && way != "mixed" && way != "reversible")
                row.refuse(ErrorCode::unusable_argument, Key::way, [] { return "is neither \"mixed\" nor \"reversible\""; });
            reversible = way == "reversible";
            mixed_rates = mixed_rates || (!first && C.rate != first_rate);
            first_rate = C.rate;
            first = false;
            capacities += C.value;
            weighted += C.value * (reversible ? std::log(T) : T);
        });
    }
    if (reader.refused())
        return reader.refusal().error;
    const double mean = weighted / capacities;
    const double T = reversible ? std::exp(mean) : mean;
    return !mixed_rates && capacities > 0.0 && std::isfinite(T) ? T : error_number(ErrorCode::unusable_argument);
}

} // namespace entropy_ledger::functions::plain
