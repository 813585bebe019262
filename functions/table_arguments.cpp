#include "functions/table_arguments.hpp"

#include <algorithm>
#include <string>

namespace entropy_ledger::functions {

namespace {

bool same(const Block& a, const Block& b)
{
    if (a.rows() != b.rows() || a.columns() != b.columns())
        return false;
    for (std::size_t row = 0; row < a.rows(); ++row) {
        for (std::size_t column = 0; column < a.columns(); ++column) {
            const Cell x = a.at(row, column);
            const std::string text{x.text}; // x.text need not outlive the next access
            const Cell y = b.at(row, column);
            if (x.kind != y.kind || text != y.text || (x.kind == Cell::Kind::number && x.number != y.number))
                return false;
        }
    }
    return true;
}

} // namespace

TableArguments::TableArguments(const Entry& entry, std::span<const Argument> arguments) : arguments_(arguments)
{
    for (std::size_t i = 0; i < arguments.size(); ++i) {
        const Block* block = arguments[i].block;
        if (!block || !takes_table(entry.arguments[i].key) || !UserTable::looks_like_one(*block))
            continue;
        if (arguments_.data() == arguments.data()) {
            std::copy(arguments.begin(), arguments.end(), replaced_.begin());
            arguments_ = {replaced_.data(), arguments.size()};
        }
        const UserTable* table = nullptr;
        for (std::size_t k = 0; k < i && !table; ++k) {
            if (arguments_[k].cell.table && same(*arguments[k].block, *block))
                table = arguments_[k].cell.table;
        }
        if (!table) {
            tables_[i] = std::make_unique<UserTable>(*block);
            table = tables_[i].get();
        }
        replaced_[i] = Argument{Cell{Cell::Kind::table, 0.0, {}, table}, nullptr};
    }
}

} // namespace entropy_ledger::functions
