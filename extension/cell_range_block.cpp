#include "extension/cell_range_block.hpp"

#include <com/sun/star/beans/XPropertySet.hpp>
#include <com/sun/star/container/XIndexAccess.hpp>
#include <com/sun/star/sheet/CellFlags.hpp>
#include <com/sun/star/sheet/XCellRangeAddressable.hpp>
#include <com/sun/star/sheet/XCellRangeData.hpp>
#include <com/sun/star/sheet/XCellRangesQuery.hpp>
#include <com/sun/star/sheet/XSheetCellRanges.hpp>
#include <com/sun/star/table/CellRangeAddress.hpp>
#include <com/sun/star/table/XCell.hpp>

#include <algorithm>
#include <cstdint>

namespace entropy_ledger::extension {

using com::sun::star::sheet::XCellRangeData;
using com::sun::star::sheet::XCellRangesQuery;
using com::sun::star::table::CellRangeAddress;
using com::sun::star::table::XCellRange;
using com::sun::star::uno::Any;
using com::sun::star::uno::Reference;
using com::sun::star::uno::Sequence;
using com::sun::star::uno::UNO_QUERY_THROW;
using functions::Cell;

namespace {

// Whether a range goes over several sheets: $Sheet1.$A$1:$Sheet3.$B$2. Of such a range UNO hands out the first sheet
// only, so its absolute name is asked.
bool spans_sheets(const Reference<XCellRange>& range)
{
    const Reference<com::sun::star::beans::XPropertySet> properties(range, UNO_QUERY_THROW);
    rtl::OUString name;
    properties->getPropertyValue("AbsoluteName") >>= name;
    const sal_Int32 colon = name.lastIndexOf(':');
    return colon >= 0 && name.indexOf('.', colon) >= 0; // no sheet name holds a colon
}

CellRangeAddress address_of(const Any& range)
{
    return Reference<com::sun::star::sheet::XCellRangeAddressable>(range, UNO_QUERY_THROW)->getRangeAddress();
}

CellRangeAddress address_of(const Reference<XCellRange>& range) { return address_of(Any(range)); }

} // namespace

CellRangeBlock::CellRangeBlock(const Reference<XCellRange>& range)
{
    namespace flags = com::sun::star::sheet::CellFlags;
    if (spans_sheets(range)) {
        cells_.push_back({Cell::Kind::error, functions::error_number(functions::ErrorCode::unusable_argument), 0});
        return;
    }
    const Reference<XCellRangesQuery> query(range, UNO_QUERY_THROW);
    const Reference<com::sun::star::container::XIndexAccess> areas(
        query->queryContentCells(static_cast<sal_Int16>(flags::VALUE | flags::DATETIME | flags::STRING
                                                        | flags::FORMULA)),
        UNO_QUERY_THROW);
    // Where the asked columns hold nothing, LibreOffice 7.4 answers with cells beside them: only what lies inside counts.
    const CellRangeAddress asked = address_of(range);
    const sal_Int32 count = areas->getCount();
    for (sal_Int32 i = 0; i < count; ++i) {
        const CellRangeAddress area = address_of(areas->getByIndex(i));
        const sal_Int32 left = std::max(asked.StartColumn, area.StartColumn);
        const sal_Int32 right = std::min(asked.EndColumn, area.EndColumn);
        const sal_Int32 top = std::max(asked.StartRow, area.StartRow);
        const sal_Int32 bottom = std::min(asked.EndRow, area.EndRow);
        if (left <= right && top <= bottom)
            read_area(range->getCellRangeByPosition(left - asked.StartColumn, top - asked.StartRow,
                                                    right - asked.StartColumn, bottom - asked.StartRow));
    }
}

void CellRangeBlock::read_area(const Reference<XCellRange>& area)
{
    const Sequence<Sequence<Any>> rows = Reference<XCellRangeData>(area, UNO_QUERY_THROW)->getDataArray();
    TextBuffer buffer;
    for (sal_Int32 row = 0; row < rows.getLength(); ++row) {
        const Sequence<Any>& values = rows.getConstArray()[row];
        for (sal_Int32 column = 0; column < values.getLength(); ++column) {
            Cell cell = read_cell(values.getConstArray()[column], buffer, EmptyText::is_text);
            std::size_t text = 0;
            if (cell.kind == Cell::Kind::missing) { // so the data array shows a cell in error
                const auto code = static_cast<std::uint16_t>(area->getCellByPosition(column, row)->getError());
                cell = number_cell(functions::error_number(
                    code == 0 ? functions::ErrorCode::unusable_argument : functions::ErrorCode{code}));
            } else if (cell.kind == Cell::Kind::text) {
                text = texts_.size();
                texts_.emplace_back(cell.text);
            }
            cells_.push_back({cell.kind, cell.number, text});
        }
    }
}

Cell CellRangeBlock::at(std::size_t row, std::size_t) const
{
    const Content& content = cells_[row];
    Cell cell{content.kind, content.number, {}};
    if (content.kind == Cell::Kind::text)
        cell.text = texts_[content.text];
    return cell;
}

} // namespace entropy_ledger::extension
