// A function's result as a UNO value.
#pragma once

#include "functions/value.hpp"

#include <com/sun/star/uno/Any.hxx>

namespace entropy_ledger::extension {

// Numbers, also those that stand for an error, become doubles; a table of numbers becomes rows of doubles, for Calc
// takes these in half the time of rows of mixed values. A table without cells becomes Err:502.
com::sun::star::uno::Any write_result(const functions::Result& result);

} // namespace entropy_ledger::extension
