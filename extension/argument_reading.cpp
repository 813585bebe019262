#include "extension/argument_reading.hpp"

#include <com/sun/star/sheet/XCellRangeData.hpp>

#include <cppu/unotype.hxx>

namespace entropy_ledger::extension {

using com::sun::star::table::XCellRange;
using com::sun::star::uno::Any;
using com::sun::star::uno::Reference;
using functions::Argument;

Argument ArgumentReading::read(const Any& value, EmptyText empty_text)
{
    if (value.getValueTypeClass() == com::sun::star::uno::TypeClass_SEQUENCE) {
        if (value.getValueType() == cppu::UnoType<AnyBlock::Rows>::get())
            return {{}, &block_.emplace<AnyBlock>(*static_cast<const AnyBlock::Rows*>(value.getValue()), buffer_,
                                                  empty_text)};
        if (value.getValueType() == cppu::UnoType<NumberBlock::Rows>::get())
            return {{}, &block_.emplace<NumberBlock>(*static_cast<const NumberBlock::Rows*>(value.getValue()))};
    }
    if (value.getValueTypeClass() == com::sun::star::uno::TypeClass_INTERFACE) {
        // A macro may pass the cell range itself; it keeps its shape.
        const Reference<com::sun::star::sheet::XCellRangeData> range(value, com::sun::star::uno::UNO_QUERY);
        if (range.is()) {
            rows_ = range->getDataArray();
            return {{}, &block_.emplace<AnyBlock>(rows_, buffer_, empty_text)};
        }
    }
    return {read_cell(value, buffer_, empty_text), nullptr};
}

Argument ArgumentReading::read(const Reference<XCellRange>& range)
{
    return {{}, &block_.emplace<CellRangeBlock>(range)};
}

} // namespace entropy_ledger::extension
