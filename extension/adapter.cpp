#include "extension/adapter.hpp"

#include "extension/argument_reading.hpp"
#include "extension/result_writing.hpp"

#include <array>
#include <cstddef>
#include <memory>
#include <vector>

namespace entropy_ledger::extension {

using com::sun::star::table::XCellRange;
using com::sun::star::uno::Any;
using com::sun::star::uno::Reference;
using com::sun::star::uno::Sequence;
using functions::Argument;
using functions::FunctionId;

namespace {

constexpr std::size_t most_values = 12; // parameters of a method, without repeated ones; checked at each call

Any failure()
{
    return Any(functions::error_number(functions::ErrorCode::unusable_argument));
}

} // namespace

Any answer(FunctionId function, std::initializer_list<const Any*> values) noexcept
{
    try {
        std::array<ArgumentReading, most_values> readings;
        std::array<Argument, most_values> arguments;
        if (values.size() > most_values)
            return failure();
        std::size_t count = 0;
        for (const Any* value : values) {
            arguments[count] = readings[count].read(*value, EmptyText::is_empty);
            ++count;
        }
        return write_result(functions::call(function, {arguments.data(), count}));
    } catch (...) {
        return failure();
    }
}

Any answer(FunctionId function, std::initializer_list<const Any*> values, const Reference<XCellRange>& first_item,
           const Sequence<Any>& more_items) noexcept
{
    try {
        const std::size_t count = values.size() + 1 + static_cast<std::size_t>(more_items.getLength());
        const auto readings = std::make_unique<ArgumentReading[]>(count);
        std::vector<Argument> arguments;
        arguments.reserve(count);
        for (const Any* value : values)
            arguments.push_back(readings[arguments.size()].read(*value, EmptyText::is_empty));
        arguments.push_back(readings[arguments.size()].read(first_item));
        for (sal_Int32 i = 0; i < more_items.getLength(); ++i)
            arguments.push_back(
                readings[arguments.size()].read(more_items.getConstArray()[i], EmptyText::is_text));
        return write_result(functions::call(function, arguments));
    } catch (...) {
        return failure();
    }
}

} // namespace entropy_ledger::extension
