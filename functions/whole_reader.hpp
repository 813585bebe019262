// Reads ranges that a function takes as a whole, row by row, with the usual reader for each row.
#pragma once

#include "functions/reader.hpp"

#include <optional>
#include <string>

namespace entropy_ledger::functions {

class WholeReader {
public:
    using Number = double;

    // More items than this in one range are refused.
    static constexpr std::size_t most_items = std::size_t{1} << 20;

    WholeReader(const Entry& entry, std::span<const Argument> arguments, bool wants_words)
        : entry_(entry), arguments_(arguments), wants_words_(wants_words) {}

    bool refused() const { return refused_; }
    const Refusal& refusal() const { return refusal_; }

    bool given(Key key) const;
    std::size_t count(Key key) const; // cells of the range; 1 for a single cell, 0 when left out

    // Calls read(row_reader) for item `index`: the same place in every range. Rows whose cells are all empty are left
    // out. A refusal names the row.
    template <class Read>
    void row(std::size_t index, Read&& read)
    {
        if (refused_)
            return;
        std::array<Cell, most_arguments> cells;
        std::array<std::string, most_arguments> texts; // a cell's text holds only until the next access to its range
        if (!take_row(index, cells, texts))
            return;
        Reader reader(entry_, std::span<const Cell>(cells.data(), arguments_.size()), wants_words_);
        read(reader);
        if (reader.refused())
            keep(reader.refusal(), index);
    }

    // Refuses unless the ranges hold equally many cells, at least one.
    void require_equal(Key key, Key other);

    void refuse(ErrorCode code, Key key, std::string_view words);

private:
    const Argument* argument(Key key) const;
    bool take_row(std::size_t index, std::array<Cell, most_arguments>& cells,
                  std::array<std::string, most_arguments>& texts) const;
    void keep(const Refusal& refusal, std::size_t index);

    const Entry& entry_;
    std::span<const Argument> arguments_;
    Refusal refusal_;
    bool wants_words_;
    bool refused_ = false;
};

} // namespace entropy_ledger::functions
