#include "functions/text.hpp"

#include <array>

namespace entropy_ledger::functions {

using detail::CodePoint;
using detail::decode;

Reason& Reason::say(std::string_view text) noexcept
{
    while (!text.empty()) {
        const CodePoint next = decode(text);
        if (size_ + next.size > capacity)
            break;
        for (std::size_t i = 0; i < next.size; ++i)
            buffer_[size_++] = text[i];
        text.remove_prefix(next.size);
    }
    return *this;
}

Reason& Reason::quote(std::string_view text) noexcept
{
    constexpr std::size_t longest_quotation = 40;
    say("\"");
    std::size_t used = 0;
    while (!text.empty()) {
        const CodePoint next = decode(text);
        if (used + next.size > longest_quotation) {
            say("…");
            break;
        }
        const bool control = next.value < 0x20 || (next.value >= 0x7F && next.value < 0xA0);
        say(control || next.value == 0xFFFD ? std::string_view("\uFFFD") : text.substr(0, next.size));
        used += next.size;
        text.remove_prefix(next.size);
    }
    return say("\"");
}

namespace detail {

CodePoint decode(std::string_view text) noexcept
{
    constexpr CodePoint invalid{0xFFFD, 1};
    if (text.empty())
        return {0, 0};
    const auto byte = [&](std::size_t i) { return static_cast<char32_t>(static_cast<unsigned char>(text[i])); };
    const char32_t lead = byte(0);
    if (lead < 0x80)
        return {lead, 1};
    const std::size_t size = lead >= 0xF0 ? 4 : lead >= 0xE0 ? 3 : 2;
    if (lead < 0xC2 || lead > 0xF4 || text.size() < size)
        return invalid;
    char32_t value = lead & (0x7Fu >> size);
    for (std::size_t i = 1; i < size; ++i) {
        if ((byte(i) & 0xC0u) != 0x80u)
            return invalid;
        value = (value << 6) | (byte(i) & 0x3Fu);
    }
    constexpr std::array<char32_t, 5> smallest{0, 0, 0x80, 0x800, 0x10000};
    if (value < smallest[size] || value > 0x10FFFF || (value >= 0xD800 && value <= 0xDFFF))
        return invalid;
    return {value, size};
}

bool is_digit(char c) noexcept { return c >= '0' && c <= '9'; }

bool is_blank(char32_t c) noexcept
{
    return c == U' ' || (c >= 0x09 && c <= 0x0D) || c == 0x00A0 || (c >= 0x2000 && c <= 0x200A) || c == 0x202F ||
           c == 0x205F || c == 0x3000;
}

int superscript_digit(char32_t c) noexcept
{
    if (c == 0x00B9)
        return 1;
    if (c == 0x00B2 || c == 0x00B3)
        return static_cast<int>(c - 0x00B0);
    if (c == 0x2070 || (c >= 0x2074 && c <= 0x2079))
        return static_cast<int>(c - 0x2070);
    return -1;
}

std::string_view without_blanks_before(std::string_view text) noexcept
{
    for (CodePoint next = decode(text); is_blank(next.value); next = decode(text))
        text.remove_prefix(next.size);
    return text;
}

bool begins_with_plus_minus(std::string_view text) noexcept
{
    return text.starts_with("\u00B1") || text.starts_with("+/-") || text.starts_with("+-");
}

} // namespace detail

} // namespace entropy_ledger::functions
