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
    return std::isfinite(work) ? work : error_number(ErrorCode::unusable_argument);
}

} // namespace entropy_ledger::functions::plain
