#include "functions/plain/plain.hpp"
#include "functions/reader.hpp"
#include "registry/equilibrium.hpp"

#include <optional>

namespace entropy_ledger::functions::plain {

namespace {

// The modification of `state` that takes part in an equilibrium with `other`: the named one, or the first whose
// equilibrium temperature lies where it is the stable modification.
std::optional<double> balance(const registry::Substance& substance, const State& first, const State& second, double p)
{
    for (const registry::Phase& a : substance.phases) {
        if (!first.may_be(a))
            continue;
        for (const registry::Phase& b : substance.phases) {
            if (!second.may_be(b))
                continue;
            const auto T = registry::equilibrium_temperature(substance, a, b, p);
            // A hair to both sides: at the temperature itself either neighbour may be the stable one.
            if (T && (&first.at(*T * (1.0 - 1e-6)) == &a || &first.at(*T * (1.0 + 1e-6)) == &a)
                && (&second.at(*T * (1.0 - 1e-6)) == &b || &second.at(*T * (1.0 + 1e-6)) == &b))
                return T;
        }
    }
    return std::nullopt;
}

} // namespace

Result temperature_balance(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const registry::Substance* substance = reader.substance(Key::material);
    const State first = reader.state(substance, Key::from);
    const State second = reader.state(substance, Key::to);
    const double p = reader.pressure(Key::p, standard_pressure);
    if (reader.refused())
        return reader.refusal().error;
    const auto T = balance(*substance, first, second, p);
    return T ? *T : error_number(ErrorCode::not_available);
}

} // namespace entropy_ledger::functions::plain
