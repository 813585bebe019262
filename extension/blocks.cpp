#include "extension/blocks.hpp"

namespace entropy_ledger::extension {

using functions::Cell;

namespace {

template <class Rows>
std::size_t row_count(const Rows& rows)
{
    return static_cast<std::size_t>(rows.getLength());
}

// Calc's ranges are rectangles; where a macro's rows differ in length, the first one counts.
template <class Rows>
std::size_t column_count(const Rows& rows)
{
    return rows.hasElements() ? static_cast<std::size_t>(rows.getConstArray()[0].getLength()) : 0;
}

} // namespace

AnyBlock::AnyBlock(const Rows& rows, TextBuffer& buffer, EmptyText empty_text)
    : data_(rows.getConstArray()), buffer_(buffer), rows_(row_count(rows)), columns_(column_count(rows)),
      empty_text_(empty_text)
{
}

Cell AnyBlock::at(std::size_t row, std::size_t column) const
{
    const auto& cells = data_[row];
    if (column >= static_cast<std::size_t>(cells.getLength()))
        return {Cell::Kind::empty, 0.0, {}};
    Cell cell = read_cell(cells.getConstArray()[column], buffer_, empty_text_);
    if (cell.kind == Cell::Kind::missing)
        cell.kind = Cell::Kind::empty;
    return cell;
}

NumberBlock::NumberBlock(const Rows& rows)
    : data_(rows.getConstArray()), rows_(row_count(rows)), columns_(column_count(rows))
{
}

Cell NumberBlock::at(std::size_t row, std::size_t column) const
{
    const auto& numbers = data_[row];
    if (column >= static_cast<std::size_t>(numbers.getLength()))
        return {Cell::Kind::empty, 0.0, {}};
    return number_cell(numbers.getConstArray()[column]);
}

} // namespace entropy_ledger::extension
