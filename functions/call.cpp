#include "functions/call.hpp"

#include "functions/entry.hpp"
#include "functions/function_id.hpp"
#include "functions/plain/plain.hpp"
#include "functions/processes/body.hpp"
#include "functions/processes/change.hpp"
#include "functions/processes/dissipation.hpp"
#include "functions/processes/mixing.hpp"
#include "functions/processes/phase.hpp"
#include "functions/processes/pressure.hpp"
#include "functions/processes/reservoir.hpp"
#include "functions/processes/sensible.hpp"
#include "functions/processes/transfer.hpp"
#include "functions/show_process.hpp"
#include "functions/spread.hpp"
#include "functions/table_arguments.hpp"
#include "functions/views/views.hpp"

#include <algorithm>

namespace entropy_ledger::functions {

namespace {

#include "functions/entries.inc"

static_assert(std::size(entries) == function_count);

bool is_single(const Argument& argument)
{
    return !argument.block || (argument.block->rows() == 1 && argument.block->columns() == 1);
}

Result call_with_cells(const Entry& entry, std::span<const Argument> arguments)
{
    if (!std::all_of(arguments.begin(), arguments.end(), is_single))
        return spread(entry, arguments);
    std::array<Cell, most_arguments> cells;
    for (std::size_t i = 0; i < arguments.size(); ++i)
        cells[i] = arguments[i].block ? arguments[i].block->at(0, 0) : arguments[i].cell;
    return entry.handler(entry, std::span<const Cell>(cells.data(), arguments.size()));
}

// Missing arguments at the end, and in the middle, of what may not be missing are left to the reader, which names them.
Result call_entry(const Entry& entry, std::span<const Argument> arguments)
{
    if (entry.group)
        return entry.group(entry, arguments);
    if (arguments.size() > entry.arguments.size())
        return error_number(ErrorCode::unusable_argument);
    if (std::any_of(arguments.begin(), arguments.end(), [](const Argument& a) { return a.block; })) {
        const TableArguments read(entry, arguments);
        return call_with_cells(entry, read.arguments());
    }
    return call_with_cells(entry, arguments);
}

} // namespace

const Entry& entry_of(std::size_t function) { return entries[function]; }

Result call(FunctionId function, std::span<const Argument> arguments) noexcept
{
    try {
        const auto index = static_cast<std::size_t>(function);
        if (index < function_count)
            return call_entry(entries[index], arguments);
    } catch (...) {
        // Out of memory for a table or a text: the caller's document must not pay for it.
    }
    return error_number(ErrorCode::unusable_argument);
}

} // namespace entropy_ledger::functions
