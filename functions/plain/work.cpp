#include "functions/plain/heat_and_entropy.hpp"
#include "functions/plain/plain.hpp"
#include "functions/reader.hpp"

#include <cmath>

namespace entropy_ledger::functions::plain {

Result work_lost(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const double generation = reader.entropy(Key::generation).value;
    const double T = reader.reservoir_temperature(Key::T_ambient);
    const double work = T * generation;
    if (reader.refused())
        return reader.refusal().error;
    return finite_or_error(work);
}

Result work_available(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const auto [heat, entropy] = heat_and_entropy(reader);
    const double T = reader.reservoir_temperature(Key::T_ambient);
    if (reader.refused())
        return reader.refusal().error;
    return finite_or_error(heat - T * entropy);
}

Result work_least(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const double heat = reader.heat(Key::heat).value;
    const double T = reader.reservoir_temperature(Key::T);
    const double T_ambient = reader.reservoir_temperature(Key::T_ambient);
    if (reader.refused())
        return reader.refusal().error;
    return finite_or_error(std::abs(heat) * std::abs(T - T_ambient) / T);
}

} // namespace entropy_ledger::functions::plain
