#include "functions/plain/items.hpp"

#include <cmath>

namespace entropy_ledger::functions::plain {

namespace {

// Neumaier's compensated summation (ZAMM 54 (1974) 39-51): the order of the items does not matter.
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

class Items {
public:
    // Adds one cell; false when it ends the sum with `error`.
    bool add(const Cell& cell, bool in_range)
    {
        seen = seen || cell.kind != Cell::Kind::missing;
        if (cell.kind == Cell::Kind::number && std::isfinite(cell.number)) {
            sum.add(cell.number);
            sizes.add(std::abs(cell.number));
            return true;
        }
        if (cell.kind == Cell::Kind::missing || (cell.kind == Cell::Kind::empty && in_range))
            return true;
        error = cell.kind == Cell::Kind::error ? cell.number : error_number(ErrorCode::unusable_argument);
        return false;
    }

    bool add(const Block& block)
    {
        seen = true;
        for (std::size_t row = 0; row < block.rows(); ++row) {
            for (std::size_t column = 0; column < block.columns(); ++column) {
                if (!add(block.at(row, column), true))
                    return false;
            }
        }
        return true;
    }

    Sum sum, sizes;
    double error = 0.0;
    bool seen = false;
};

} // namespace

ItemSums sum_of_items(std::span<const Argument> arguments)
{
    Items items;
    for (const Argument& argument : arguments) {
        if (!(argument.block ? items.add(*argument.block) : items.add(argument.cell, false)))
            return {items.error};
    }
    if (!items.seen || !std::isfinite(items.sum.value()) || !std::isfinite(items.sizes.value()))
        return {error_number(ErrorCode::unusable_argument)};
    return {0.0, items.sum.value(), items.sizes.value()};
}

} // namespace entropy_ledger::functions::plain
