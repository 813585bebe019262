#include "extension/cell_reading.hpp"

#include <rtl/ustring.hxx>

#include <bit>
#include <cmath>
#include <cstdint>

namespace entropy_ledger::extension {

using com::sun::star::uno::Any;
using functions::Cell;

Cell number_cell(double number)
{
    if (!std::isnan(number))
        return {Cell::Kind::number, number, {}};
    // Calc keeps an error's code in the low half of a NaN; any other NaN is no usable number.
    const auto code = static_cast<std::uint32_t>(std::bit_cast<std::uint64_t>(number));
    if (code == 0 || code > 0xFFFF)
        number = functions::error_number(functions::ErrorCode::unusable_argument);
    return {Cell::Kind::error, number, {}};
}

Cell read_cell(const Any& value, TextBuffer& buffer, EmptyText empty_text)
{
    using com::sun::star::uno::TypeClass_DOUBLE;
    using com::sun::star::uno::TypeClass_STRING;
    switch (value.getValueTypeClass()) {
    case TypeClass_DOUBLE:
        return number_cell(*static_cast<const double*>(value.getValue()));
    case TypeClass_STRING: {
        const auto& text = *static_cast<const rtl::OUString*>(value.getValue());
        if (text.isEmpty() && empty_text == EmptyText::is_empty)
            return {Cell::Kind::empty, 0.0, {}};
        return {Cell::Kind::text, 0.0, buffer.utf8(text.getStr(), text.getLength())};
    }
    case com::sun::star::uno::TypeClass_VOID:
        return {};
    default:
        break;
    }
    // Calc passes doubles only; a macro may pass other kinds of numbers.
    double number = 0.0;
    sal_Int64 whole = 0;
    bool truth = false;
    if (value >>= number)
        return number_cell(number);
    if (value >>= whole)
        return {Cell::Kind::number, static_cast<double>(whole), {}};
    if (value >>= truth)
        return {Cell::Kind::number, truth ? 1.0 : 0.0, {}};
    return number_cell(functions::error_number(functions::ErrorCode::unusable_argument));
}

} // namespace entropy_ledger::extension
