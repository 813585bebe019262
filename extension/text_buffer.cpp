#include "extension/text_buffer.hpp"

#include <cstddef>
#include <cstdint>

namespace entropy_ledger::extension {

std::string_view TextBuffer::utf8(const sal_Unicode* units, sal_Int32 length)
{
    if (length <= 0)
        return {};
    const auto count = static_cast<std::size_t>(length);
    char* begin = small_.data();
    if (count * 3 > small_.size()) { // one unit gives at most three bytes, a pair four
        large_.resize(count * 3);
        begin = large_.data();
    }
    char* out = begin;
    const auto put = [&out](std::uint32_t byte) { *out++ = static_cast<char>(byte); };
    for (std::size_t i = 0; i < count; ++i) {
        std::uint32_t code = units[i];
        if (code >= 0xD800 && code < 0xE000) {
            const bool pair = code < 0xDC00 && i + 1 < count && units[i + 1] >= 0xDC00 && units[i + 1] < 0xE000;
            if (pair)
                code = 0x10000 + ((code - 0xD800) << 10) + (static_cast<std::uint32_t>(units[++i]) - 0xDC00);
            else
                code = 0xFFFD;
        }
        if (code < 0x80) {
            put(code);
        } else if (code < 0x800) {
            put(0xC0 | code >> 6);
            put(0x80 | (code & 0x3F));
        } else if (code < 0x10000) {
            put(0xE0 | code >> 12);
            put(0x80 | (code >> 6 & 0x3F));
            put(0x80 | (code & 0x3F));
        } else {
            put(0xF0 | code >> 18);
            put(0x80 | (code >> 12 & 0x3F));
            put(0x80 | (code >> 6 & 0x3F));
            put(0x80 | (code & 0x3F));
        }
    }
    return {begin, static_cast<std::size_t>(out - begin)};
}

} // namespace entropy_ledger::extension
