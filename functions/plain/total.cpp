#include "functions/plain/plain.hpp"

#include <cmath>

namespace entropy_ledger::functions::plain {

namespace {

// Neumaier's compensated summation (ZAMM 54 (1974) 39-51).
class Sum {
public:
    void add(double x)
    {
        const double next = sum_ + x;
        correction_ += std::abs(sum_) >= std::abs(x) ? (sum_ - next) + x : (x - next) + sum_;
        sum_ = next;
    }
    double value() const { return sum_ + correction_; }

private:
    double sum_ = 0.0;
    double correction_ = 0.0;
};

// Adds one cell; returns the error that ends the sum, or 0.
double add(Sum& sum, const Cell& cell, bool in_range)
{
    switch (cell.kind) {
    case Cell::Kind::number:
        if (!std::isfinite(cell.number))
            return error_number(ErrorCode::unusable_argument);
        sum.add(cell.number);
        return 0.0;
    case Cell::Kind::error:
        return cell.number;
    case Cell::Kind::empty:
        return in_range ? 0.0 : error_number(ErrorCode::unusable_argument);
    case Cell::Kind::missing:
        return 0.0;
    case Cell::Kind::text:
        break;
    }
    return error_number(ErrorCode::unusable_argument);
}

} // namespace

Result entropy_total(const Entry&, std::span<const Argument> arguments)
{
    Sum sum;
    bool any = false;
    for (const Argument& argument : arguments) {
        if (!argument.block) {
            any = any || argument.cell.kind != Cell::Kind::missing;
            if (const double error = add(sum, argument.cell, false); error != 0.0) // NaN differs from 0
                return error;
            continue;
        }
        any = true;
        for (std::size_t row = 0; row < argument.block->rows(); ++row) {
            for (std::size_t column = 0; column < argument.block->columns(); ++column) {
                if (const double error = add(sum, argument.block->at(row, column), true); error != 0.0)
                    return error;
            }
        }
    }
    return any && std::isfinite(sum.value()) ? sum.value() : error_number(ErrorCode::unusable_argument);
}

} // namespace entropy_ledger::functions::plain
