// UTF-16 to UTF-8 without an allocation for the short texts that cells hold.
#pragma once

#include <sal/types.h>

#include <array>
#include <string>
#include <string_view>

namespace entropy_ledger::extension {

class TextBuffer {
public:
    TextBuffer() {} // leaves the array as it is: it is written before it is read
    TextBuffer(const TextBuffer&) = delete;
    TextBuffer& operator=(const TextBuffer&) = delete;

    // Valid until the next call. A surrogate without its partner becomes U+FFFD.
    std::string_view utf8(const sal_Unicode* units, sal_Int32 length);

private:
    std::array<char, 96> small_;
    std::string large_;
};

} // namespace entropy_ledger::extension
