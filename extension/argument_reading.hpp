// One UNO value as one argument.
#pragma once

#include "extension/blocks.hpp"
#include "extension/cell_range_block.hpp"
#include "extension/cell_reading.hpp"
#include "functions/value.hpp"

#include <com/sun/star/table/XCellRange.hpp>
#include <com/sun/star/uno/Any.hxx>
#include <com/sun/star/uno/Reference.hxx>

#include <variant>

namespace entropy_ledger::extension {

// Reads an argument and holds what it points to: it, and the value that was read, must outlive the argument's use.
class ArgumentReading {
public:
    ArgumentReading() = default;
    ArgumentReading(const ArgumentReading&) = delete;
    ArgumentReading& operator=(const ArgumentReading&) = delete;

    functions::Argument read(const com::sun::star::uno::Any& value, EmptyText empty_text);
    functions::Argument read(const com::sun::star::uno::Reference<com::sun::star::table::XCellRange>& range);

private:
    TextBuffer buffer_;
    AnyBlock::Rows rows_; // of a range that a macro passed
    std::variant<std::monostate, AnyBlock, NumberBlock, CellRangeBlock> block_;
};

} // namespace entropy_ledger::extension
