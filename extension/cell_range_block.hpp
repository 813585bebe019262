// The cells of a reference, read from the sheet itself: here an empty cell and a formula that returns "" differ, and
// a cell in error has its code. (A range that comes as an `any` tells neither, see cell_reading.hpp.)
#pragma once

#include "extension/cell_reading.hpp"
#include "functions/value.hpp"

#include <com/sun/star/table/XCellRange.hpp>
#include <com/sun/star/uno/Reference.hxx>

#include <cstddef>
#include <string>
#include <vector>

namespace entropy_ledger::extension {

// One column with the cells that have content, in the sheet's order of areas. Its size is that of the content, however
// large the reference: a whole column costs what its filled cells cost.
class CellRangeBlock final : public functions::Block {
public:
    // Throws what UNO throws when the range is none of a sheet.
    explicit CellRangeBlock(const com::sun::star::uno::Reference<com::sun::star::table::XCellRange>& range);
    std::size_t rows() const override { return cells_.size(); }
    std::size_t columns() const override { return cells_.empty() ? 0 : 1; }
    functions::Cell at(std::size_t row, std::size_t column) const override;

private:
    // A text is kept by its place in texts_, for a view would not outlive the growth of the list.
    struct Content {
        functions::Cell::Kind kind;
        double number;
        std::size_t text;
    };
    void read_area(const com::sun::star::uno::Reference<com::sun::star::table::XCellRange>& area);

    std::vector<Content> cells_;
    std::vector<std::string> texts_;
};

} // namespace entropy_ledger::extension
