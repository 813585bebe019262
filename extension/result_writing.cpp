#include "extension/result_writing.hpp"

#include <com/sun/star/uno/Sequence.hxx>
#include <rtl/ustring.hxx>

#include <algorithm>
#include <cstddef>
#include <limits>
#include <string>
#include <variant>

namespace entropy_ledger::extension {

using com::sun::star::uno::Any;
using com::sun::star::uno::Sequence;

namespace {

constexpr auto longest = static_cast<std::size_t>(std::numeric_limits<sal_Int32>::max());

rtl::OUString utf16(const std::string& text)
{
    const auto length = static_cast<sal_Int32>(std::min(text.size(), longest));
    return rtl::OUString(text.data(), length, RTL_TEXTENCODING_UTF8);
}

bool has_cells(std::size_t rows, std::size_t columns, std::size_t cells)
{
    return rows != 0 && columns != 0 && rows <= longest && columns <= longest && cells / columns == rows
        && cells % columns == 0;
}

Any failure()
{
    return Any(functions::error_number(functions::ErrorCode::unusable_argument));
}

struct Writer {
    Any operator()(double number) const { return Any(number); }

    Any operator()(const std::string& text) const { return Any(utf16(text)); }

    Any operator()(const functions::NumberTable& table) const
    {
        if (!has_cells(table.rows, table.columns, table.numbers.size()))
            return failure();
        const auto columns = static_cast<sal_Int32>(table.columns);
        Sequence<Sequence<double>> rows(static_cast<sal_Int32>(table.rows));
        Sequence<double>* row = rows.getArray();
        for (std::size_t i = 0; i < table.rows; ++i)
            row[i] = Sequence<double>(table.numbers.data() + i * table.columns, columns);
        return Any(rows);
    }

    Any operator()(const functions::MixedTable& table) const
    {
        if (!has_cells(table.rows, table.columns, table.cells.size()))
            return failure();
        Sequence<Sequence<Any>> rows(static_cast<sal_Int32>(table.rows));
        Sequence<Any>* row = rows.getArray();
        for (std::size_t i = 0; i < table.rows; ++i) {
            row[i].realloc(static_cast<sal_Int32>(table.columns));
            Any* cell = row[i].getArray();
            for (std::size_t j = 0; j < table.columns; ++j)
                cell[j] = std::visit(*this, table.cells[i * table.columns + j]);
        }
        return Any(rows);
    }
};

} // namespace

Any write_result(const functions::Result& result)
{
    return std::visit(Writer{}, result);
}

} // namespace entropy_ledger::extension
