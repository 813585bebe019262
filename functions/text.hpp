// Texts of cells and of messages: UTF-8 without allocation.
#pragma once

#include <cstddef>
#include <string_view>

namespace entropy_ledger::functions {

// A sentence in plain English, in a fixed buffer: writing it neither allocates nor throws. Always valid UTF-8.
class Reason {
public:
    Reason() noexcept = default;
    explicit Reason(std::string_view text) noexcept { say(text); }

    std::string_view text() const noexcept { return {buffer_, size_}; }
    bool empty() const noexcept { return size_ == 0; }

    Reason& say(std::string_view text) noexcept;   // appends; text is UTF-8 of our own
    Reason& quote(std::string_view text) noexcept; // appends an input in quotation marks, cleaned and shortened

private:
    static constexpr std::size_t capacity = 184;
    char buffer_[capacity]{};
    std::size_t size_ = 0;
};

namespace detail {

struct CodePoint {
    char32_t value;    // U+FFFD for an invalid byte
    std::size_t size;  // bytes taken; 1 for an invalid byte, 0 at the end
};

// The code point at the start of `text`.
CodePoint decode(std::string_view text) noexcept;

bool is_digit(char c) noexcept;
bool is_blank(char32_t c) noexcept;             // space, tab, line break, no-break and typographic spaces
int superscript_digit(char32_t c) noexcept;     // 0 to 9; -1 for others
std::string_view without_blanks_before(std::string_view text) noexcept;

// True when the text begins with "±", "+/-" or "+-".
bool begins_with_plus_minus(std::string_view text) noexcept;

} // namespace detail

} // namespace entropy_ledger::functions
