#include "functions/whole_reader.hpp"

namespace entropy_ledger::functions {

const Argument* WholeReader::argument(Key key) const
{
    const int place = entry_.place[static_cast<std::size_t>(key)];
    return place >= 0 && static_cast<std::size_t>(place) < arguments_.size()
             ? &arguments_[static_cast<std::size_t>(place)]
             : nullptr;
}

bool WholeReader::given(Key key) const
{
    const Argument* a = argument(key);
    return a && (a->block || a->cell.kind != Cell::Kind::missing);
}

std::size_t WholeReader::count(Key key) const
{
    if (!given(key))
        return 0;
    const Argument* a = argument(key);
    return a->block ? a->block->rows() * a->block->columns() : 1;
}

bool WholeReader::take_row(std::size_t index, std::array<Cell, most_arguments>& cells,
                           std::array<std::string, most_arguments>& texts) const
{
    bool any = false;
    for (std::size_t i = 0; i < arguments_.size(); ++i) {
        const Argument& a = arguments_[i];
        cells[i] = a.cell;
        if (a.block)
            cells[i] = index < a.block->rows() * a.block->columns()
                         ? a.block->at(index / a.block->columns(), index % a.block->columns())
                         : Cell{};
        if (cells[i].kind == Cell::Kind::text) {
            texts[i] = cells[i].text;
            cells[i].text = texts[i];
        }
        any = any || (a.block && cells[i].kind != Cell::Kind::empty && cells[i].kind != Cell::Kind::missing);
    }
    bool ranges = false;
    for (const Argument& a : arguments_)
        ranges = ranges || a.block;
    return any || !ranges;
}

void WholeReader::require_equal(Key key, Key other)
{
    if (count(key) == 0)
        refuse(ErrorCode::unusable_argument, key, "is missing");
    else if (count(key) > most_items)
        refuse(ErrorCode::unusable_argument, key, "has too many cells");
    else if (given(other) && count(key) != count(other))
        refuse(ErrorCode::unusable_argument, other, "has not as many cells as the first range");
}

void WholeReader::refuse(ErrorCode code, Key key, std::string_view words)
{
    if (refused_)
        return;
    refused_ = true;
    refusal_.error = error_number(code);
    if (wants_words_) {
        const int place = entry_.place[static_cast<std::size_t>(key)];
        const std::string_view name = place >= 0 ? entry_.arguments[static_cast<std::size_t>(place)].name : "argument";
        refusal_.reason = std::string(name) + ": " + std::string(words);
    }
}

void WholeReader::keep(const Refusal& refusal, std::size_t index)
{
    if (refused_)
        return;
    refused_ = true;
    refusal_ = refusal;
    if (wants_words_)
        refusal_.reason += " (item " + std::to_string(index + 1) + " of the range)";
}

} // namespace entropy_ledger::functions
