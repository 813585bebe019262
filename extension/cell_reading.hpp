// One UNO value as one cell.
#pragma once

#include "extension/text_buffer.hpp"
#include "functions/value.hpp"

#include <com/sun/star/uno/Any.hxx>

namespace entropy_ledger::extension {

// How a text without characters is taken. Calc hands over an empty cell of a range and a formula that returns ""
// alike; where the difference matters (a total must not skip a missing item) the text stays a text.
enum class EmptyText : bool { is_empty, is_text };

// A number; an error when it is a NaN that carries a code of Calc's.
functions::Cell number_cell(double number);

// A void value is a missing cell. The text lies in the buffer.
functions::Cell read_cell(const com::sun::star::uno::Any& value, TextBuffer& buffer, EmptyText empty_text);

} // namespace entropy_ledger::extension
