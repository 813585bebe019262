// From a method's UNO values to functions::call() and back.
#pragma once

#include "functions/call.hpp"

#include <com/sun/star/table/XCellRange.hpp>
#include <com/sun/star/uno/Any.hxx>
#include <com/sun/star/uno/Reference.hxx>
#include <com/sun/star/uno/Sequence.hxx>

#include <initializer_list>

namespace entropy_ledger::extension {

// Calls the function with the values in the catalogue's order; a void value is an argument left out.
// Whatever fails inside comes back as Err:502, for an exception out of an add-in would reach the office program.
com::sun::star::uno::Any answer(functions::FunctionId function,
                                std::initializer_list<const com::sun::star::uno::Any*> values) noexcept;

// The same for a function whose last argument repeats: its first item is a reference, the others are any values.
com::sun::star::uno::Any answer(functions::FunctionId function,
                                std::initializer_list<const com::sun::star::uno::Any*> values,
                                const com::sun::star::uno::Reference<com::sun::star::table::XCellRange>& first_item,
                                const com::sun::star::uno::Sequence<com::sun::star::uno::Any>& more_items) noexcept;

} // namespace entropy_ledger::extension
