#include "functions/plain/items.hpp"
#include "functions/plain/plain.hpp"

#include <cmath>

namespace entropy_ledger::functions::plain {

Result entropy_total(const Entry&, std::span<const Argument> arguments)
{
    const ItemSums items = sum_of_items(arguments);
    return std::isnan(items.error) ? items.error : items.sum;
}

Result heat_closure(const Entry&, std::span<const Argument> arguments)
{
    const ItemSums items = sum_of_items(arguments);
    if (std::isnan(items.error))
        return items.error;
    const double moved = 0.5 * items.sizes; // each heat that passes is counted where it leaves and where it enters
    return NumberTable{1, 2, {items.sum, moved > 0.0 ? std::abs(items.sum) / moved : 0.0}};
}

} // namespace entropy_ledger::functions::plain
