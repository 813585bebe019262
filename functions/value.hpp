// What goes into a cell function and what comes out, free of any office program's types.
#pragma once

#include <bit>
#include <cmath>
#include <cstddef>
#include <cstdint>
#include <string>
#include <string_view>
#include <variant>
#include <vector>

namespace entropy_ledger::functions {

// The error codes that a cell can show; the figures are those of Calc and of the ODF-based formats.
enum class ErrorCode : std::uint16_t {
    unusable_argument = 502, // Err:502
    no_convergence = 523,    // Err:523
    not_available = 32767    // #N/A
};

// A double that stands for an error: a quiet NaN whose low 32 bits hold the code. Calc reads such a number from a
// function's result, alone or inside a matrix, as that error, at the cost of a number.
inline double error_number(ErrorCode code)
{
    return std::bit_cast<double>(std::uint64_t{0x7ff8'0000'0000'0000} | static_cast<std::uint16_t>(code));
}

// A number for a cell: what is not finite, as after an overflow, becomes an error.
inline double finite_or_error(double x)
{
    return std::isfinite(x) ? x : error_number(ErrorCode::unusable_argument);
}

class UserTable;

// One cell as an argument.
struct Cell {
    enum class Kind : std::uint8_t {
        missing, // the argument was left out
        empty,   // an empty cell of a range, or an empty text
        number,
        text,    // UTF-8
        error,   // `number` carries the code as error_number() does
        table    // a whole range that is the user's own property table
    };
    Kind kind = Kind::missing;
    double number = 0.0;
    std::string_view text{}; // valid until the next access to the same block
    const UserTable* table = nullptr; // of kind `table`
};

// A rectangular range of cells.
class Block {
public:
    virtual ~Block() = default;
    virtual std::size_t rows() const = 0;
    virtual std::size_t columns() const = 0;
    virtual Cell at(std::size_t row, std::size_t column) const = 0; // row < rows(), column < columns()
};

// An argument: one cell, or a range when `block` is not null.
struct Argument {
    Cell cell{};
    const Block* block = nullptr;
};

// A rectangle of numbers, row by row; a number may stand for an error.
struct NumberTable {
    std::size_t rows = 0;
    std::size_t columns = 0;
    std::vector<double> numbers;
};

// A rectangle of numbers and texts, row by row; a number may stand for an error.
struct MixedTable {
    std::size_t rows = 0;
    std::size_t columns = 0;
    std::vector<std::variant<double, std::string>> cells;
};

// The result of a function. A number may stand for an error; it is never another NaN and never infinite.
using Result = std::variant<double, std::string, NumberTable, MixedTable>;

} // namespace entropy_ledger::functions
