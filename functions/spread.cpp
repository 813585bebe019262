#include "functions/spread.hpp"

#include <algorithm>

namespace entropy_ledger::functions {

namespace {

struct Shape {
    std::size_t rows = 1;
    std::size_t columns = 1;
};

// The cell of an argument that goes with (row, column) of the result; false where the range has ended.
bool pick(const Argument& argument, std::size_t row, std::size_t column, Cell& cell)
{
    if (!argument.block) {
        cell = argument.cell;
        return true;
    }
    const std::size_t rows = argument.block->rows();
    const std::size_t columns = argument.block->columns();
    const std::size_t r = rows == 1 ? 0 : row;
    const std::size_t c = columns == 1 ? 0 : column;
    if (r >= rows || c >= columns)
        return false;
    cell = argument.block->at(r, c);
    return true;
}

// Result of one cell of a spread; a function that gives a row of its own shows the first of it, as a cell does.
std::variant<double, std::string> single(Result&& result)
{
    if (auto* text = std::get_if<std::string>(&result))
        return std::move(*text);
    if (const auto* number = std::get_if<double>(&result))
        return *number;
    if (const auto* table = std::get_if<NumberTable>(&result); table && !table->numbers.empty())
        return table->numbers.front();
    return error_number(ErrorCode::unusable_argument);
}

} // namespace

Result spread(const Entry& entry, std::span<const Argument> arguments)
{
    if (arguments.size() > most_arguments || entry.result == ResultKind::table)
        return error_number(ErrorCode::unusable_argument);
    Shape shape;
    for (const Argument& argument : arguments) {
        if (!argument.block)
            continue;
        if (argument.block->rows() == 0 || argument.block->columns() == 0)
            return error_number(ErrorCode::unusable_argument);
        shape.rows = std::max(shape.rows, argument.block->rows());
        shape.columns = std::max(shape.columns, argument.block->columns());
    }
    if (shape.rows > most_results / shape.columns)
        return error_number(ErrorCode::unusable_argument);

    std::array<Cell, most_arguments> cells;
    const auto call_at = [&](std::size_t row, std::size_t column) -> Result {
        for (std::size_t i = 0; i < arguments.size(); ++i) {
            if (!pick(arguments[i], row, column, cells[i]))
                return error_number(ErrorCode::not_available);
        }
        return entry.handler(entry, std::span<const Cell>(cells.data(), arguments.size()));
    };

    if (entry.result == ResultKind::number) {
        NumberTable table{shape.rows, shape.columns, {}};
        table.numbers.reserve(shape.rows * shape.columns);
        for (std::size_t row = 0; row < shape.rows; ++row) {
            for (std::size_t column = 0; column < shape.columns; ++column) {
                const auto value = single(call_at(row, column));
                const double* number = std::get_if<double>(&value);
                table.numbers.push_back(number ? *number : error_number(ErrorCode::unusable_argument));
            }
        }
        return table;
    }
    MixedTable table{shape.rows, shape.columns, {}};
    table.cells.reserve(shape.rows * shape.columns);
    for (std::size_t row = 0; row < shape.rows; ++row) {
        for (std::size_t column = 0; column < shape.columns; ++column)
            table.cells.push_back(single(call_at(row, column)));
    }
    return table;
}

} // namespace entropy_ledger::functions
