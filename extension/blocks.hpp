// UNO's forms of a range as blocks of cells.
#pragma once

#include "extension/cell_reading.hpp"
#include "functions/value.hpp"

#include <com/sun/star/uno/Any.hxx>
#include <com/sun/star/uno/Sequence.hxx>

#include <cstddef>

namespace entropy_ledger::extension {

// Rows of values of any kind, as Calc passes a range or an inline array. Refers to the rows and the buffer.
class AnyBlock final : public functions::Block {
public:
    using Rows = com::sun::star::uno::Sequence<com::sun::star::uno::Sequence<com::sun::star::uno::Any>>;

    AnyBlock(const Rows& rows, TextBuffer& buffer, EmptyText empty_text);
    std::size_t rows() const override { return rows_; }
    std::size_t columns() const override { return columns_; }
    functions::Cell at(std::size_t row, std::size_t column) const override;

private:
    const com::sun::star::uno::Sequence<com::sun::star::uno::Any>* data_;
    TextBuffer& buffer_;
    std::size_t rows_;
    std::size_t columns_;
    EmptyText empty_text_;
};

// Rows of numbers, as a macro may pass them. Refers to the rows.
class NumberBlock final : public functions::Block {
public:
    using Rows = com::sun::star::uno::Sequence<com::sun::star::uno::Sequence<double>>;

    explicit NumberBlock(const Rows& rows);
    std::size_t rows() const override { return rows_; }
    std::size_t columns() const override { return columns_; }
    functions::Cell at(std::size_t row, std::size_t column) const override;

private:
    const com::sun::star::uno::Sequence<double>* data_;
    std::size_t rows_;
    std::size_t columns_;
};

} // namespace entropy_ledger::extension
