#include "functions/quantity.hpp"

#include <array>
#include <charconv>
#include <cmath>
#include <optional>
#include <system_error>

namespace entropy_ledger::functions {

namespace {

using detail::CodePoint;
using detail::decode;
using detail::is_digit;

constexpr int largest_exponent = 100000;  // far beyond a double; keeps the exponent an int

// A numeral in the form that std::from_chars reads, without its exponent.
struct Numeral {
    std::array<char, longest_text + 16> text;  // room for the exponent, appended in the end
    std::size_t size = 0;
    int exponent = 0;

    void append(std::string_view part)
    {
        for (const char c : part)
            text[size++] = c;
    }
};

// Marks between the digits of a mantissa.
enum class Mark : char { none, point, comma, space, apostrophe };

// A run of digits and the mark before it.
struct Run {
    std::string_view digits;
    Mark mark;
};

std::size_t count_digits(std::string_view text)
{
    std::size_t size = 0;
    while (size < text.size() && is_digit(text[size]))
        ++size;
    return size;
}

bool is_minus(char32_t c) { return c == U'-' || c == U'\u2212' || c == U'\u2013'; }

// Spaces that ISO 80000-1, 7.3.1 has in mind for grouping, and the plain one that a keyboard gives.
bool is_grouping_space(char32_t c)
{
    return c == U' ' || c == U'\u00A0' || c == U'\u2007' || c == U'\u2009' || c == U'\u202F';
}

class NumeralReader {
public:
    NumeralReader(std::string_view text, Numeral& numeral, Reason& reason)
        : whole_(text), rest_(text), numeral_(numeral), reason_(reason)
    {
    }

    bool read()
    {
        rest_ = detail::without_blanks_before(rest_);
        if (rest_.empty()) {
            reason_.say("the text is empty");
            return false;
        }
        const CodePoint sign = decode(rest_);
        if (is_minus(sign.value) || sign.value == U'+') {
            if (sign.value != U'+')
                numeral_.append("-");
            rest_ = detail::without_blanks_before(rest_.substr(sign.size));
        }
        mantissa_ = rest_;
        if (!split() || !join())
            return false;
        if (!read_letter_exponent())
            read_power_of_ten();
        return true;
    }

    std::string_view rest() const { return rest_; }

private:
    std::string_view whole_;
    std::string_view rest_;
    std::string_view mantissa_;
    Numeral& numeral_;
    Reason& reason_;
    std::array<Run, 40> runs_;
    std::size_t size_ = 0;

    bool fail_grouping()
    {
        reason_.say("the digits of ").quote(mantissa_).say(" are not grouped in threes with one decimal sign");
        return false;
    }

    std::string_view take_digits()
    {
        const std::size_t size = count_digits(rest_);
        const std::string_view digits = rest_.substr(0, size);
        rest_.remove_prefix(size);
        return digits;
    }

    // The mark that stands next and belongs to the mantissa.
    static Mark mark_at(std::string_view text, std::size_t& bytes)
    {
        const CodePoint next = decode(text);
        const std::string_view after = text.substr(next.size);
        bytes = next.size;
        if (next.value == U'.')
            return Mark::point;
        const std::size_t digits = count_digits(after);
        if (next.value == U',')
            return digits != 0 ? Mark::comma : Mark::none;
        if (next.value == U'\'' || next.value == U'\u2019')
            return digits != 0 ? Mark::apostrophe : Mark::none;
        // "1 200 kg", but not "0.5 1/K": no unit begins with three digits.
        return is_grouping_space(next.value) && digits == 3 ? Mark::space : Mark::none;
    }

    // Cuts the mantissa into runs of digits.
    bool split()
    {
        runs_[size_++] = {take_digits(), Mark::none};
        bool any = !runs_[0].digits.empty();
        for (;;) {
            std::size_t bytes = 0;
            const Mark mark = mark_at(rest_, bytes);
            if (mark == Mark::none)
                break;
            if (size_ == runs_.size())
                return fail_grouping();
            rest_.remove_prefix(bytes);
            runs_[size_++] = {take_digits(), mark};
            any = any || !runs_[size_ - 1].digits.empty();
            if (runs_[size_ - 1].digits.empty())
                break;
        }
        if (!any)
            reason_.quote(whole_).say(" does not begin with a number");
        mantissa_ = mantissa_.substr(0, mantissa_.size() - rest_.size());
        return any;
    }

    std::size_t count(Mark mark) const
    {
        std::size_t n = 0;
        for (std::size_t i = 1; i < size_; ++i)
            n += runs_[i].mark == mark ? 1u : 0u;
        return n;
    }

    // Finds the decimal sign, checks the grouping, writes the digits.
    bool join()
    {
        std::size_t decimal = size_;  // index of the run after the decimal sign
        if (size_ == 2 && runs_[1].mark == Mark::point) {
            decimal = 1;
        } else if (size_ > 1) {
            const std::size_t points = count(Mark::point);
            const std::size_t commas = count(Mark::comma);
            std::size_t last = size_;
            for (std::size_t i = 1; i < size_; ++i)
                if (runs_[i].mark == Mark::point || runs_[i].mark == Mark::comma)
                    last = i;
            const bool both = points != 0 && commas != 0;
            if (points + commas == 1 || (both && (runs_[last].mark == Mark::point ? points : commas) == 1))
                decimal = last;
            if (decimal == 1 && runs_[1].mark == Mark::comma && runs_[1].digits.size() == 3 && is_ambiguous())
                return false;
            if (!grouped_before(decimal) || !grouped_after(decimal))
                return fail_grouping();
        }
        for (std::size_t i = 0; i < size_; ++i) {
            if (i == decimal)
                numeral_.append(".");
            else if (i == 0 && runs_[0].digits.empty())
                numeral_.append("0");
            numeral_.append(runs_[i].digits);
        }
        return true;
    }

    bool is_ambiguous()
    {
        const std::string_view whole = runs_[0].digits;
        if (whole.empty() || whole.size() > 3 || whole.front() == '0')
            return false;
        std::string_view fraction = runs_[1].digits;
        const std::string_view sign = numeral_.size != 0 ? "-" : "";
        reason_.quote(mantissa_).say(" could be ").say(sign);
        const auto say_decimal = [&] {
            std::string_view digits = fraction;
            while (!digits.empty() && digits.back() == '0')
                digits.remove_suffix(1);
            reason_.say(whole).say(digits.empty() ? "" : ".").say(digits);
        };
        say_decimal();
        reason_.say(" or ").say(sign).say(whole).say(fraction).say(": write ").say(sign);
        say_decimal();
        reason_.say(" or ").say(sign).say(whole).say(fraction);
        return true;
    }

    bool grouped_before(std::size_t decimal) const
    {
        if (decimal <= 1)
            return true;
        const std::string_view first = runs_[0].digits;
        if (first.empty() || first.size() > 3 || first.front() == '0')
            return false;
        for (std::size_t i = 1; i < decimal; ++i)
            if (runs_[i].digits.size() != 3 || runs_[i].mark != runs_[1].mark)
                return false;
        return true;
    }

    bool grouped_after(std::size_t decimal) const
    {
        for (std::size_t i = decimal + 1; i < size_; ++i)
            if (runs_[i].digits.size() != 3 || runs_[i].mark != Mark::space || runs_[decimal].digits.size() != 3)
                return false;
        return true;
    }

    // Sign and digits of an exponent at the start of `text`; leaves everything as it is when there are none.
    bool take_exponent(std::string_view text, bool superscript)
    {
        const auto digit_of = [superscript](char32_t c) {
            if (superscript)
                return detail::superscript_digit(c);
            return c >= U'0' && c <= U'9' ? static_cast<int>(c - U'0') : -1;
        };
        const CodePoint sign = decode(text);
        const bool minus = superscript ? sign.value == U'\u207B' : is_minus(sign.value);
        if (minus || sign.value == (superscript ? U'\u207A' : U'+'))
            text.remove_prefix(sign.size);
        if (digit_of(decode(text).value) < 0)
            return false;
        int value = 0;
        for (CodePoint next = decode(text); digit_of(next.value) >= 0; next = decode(text)) {
            value = value > largest_exponent ? value : value * 10 + digit_of(next.value);
            text.remove_prefix(next.size);
        }
        numeral_.exponent = minus ? -value : value;
        rest_ = text;
        return true;
    }

    // "e3" directly after the digits; "e" without digits begins a unit, as in "1 eV".
    bool read_letter_exponent()
    {
        const bool letter = rest_.starts_with('e') || rest_.starts_with('E');
        return letter && take_exponent(rest_.substr(1), false);
    }

    // "×10^3", "x 10^3", "·10³"
    void read_power_of_ten()
    {
        std::string_view text = detail::without_blanks_before(rest_);
        const CodePoint times = decode(text);
        if (times.value != U'\u00D7' && times.value != U'x' && times.value != U'*' && times.value != U'\u00B7' &&
            times.value != U'\u22C5')
            return;
        text = detail::without_blanks_before(text.substr(times.size));
        if (!text.starts_with("10"))
            return;
        text.remove_prefix(2);
        if (text.starts_with('^'))
            take_exponent(text.substr(1), false);
        else
            take_exponent(text, true);
    }
};

// Moves the power of ten into the numeral, so that decimal numbers are rounded once.
std::optional<double> convert(Numeral& numeral, const Unit& unit)
{
    char* end = numeral.text.data() + numeral.size;
    const int exponent = numeral.exponent + unit.power_of_ten;
    if (exponent != 0) {
        *end++ = 'e';
        end = std::to_chars(end, numeral.text.data() + numeral.text.size(), exponent).ptr;
    }
    double x = 0.0;
    const auto [stop, error] = std::from_chars(numeral.text.data(), end, x, std::chars_format::general);
    if (error != std::errc{} || stop != end)
        return std::nullopt;
    const double scaled = (x - unit.start) * unit.numerator / unit.denominator;
    if (!std::isfinite(scaled) || (scaled == 0.0 && x != unit.start))
        return std::nullopt;
    return scaled + unit.origin + 0.0;  // no negative zero
}

Unreadable refuse(const Reason& reason) { return Unreadable{reason}; }

} // namespace

Reading read_quantity(std::string_view utf8) noexcept
{
    Reason reason;
    if (utf8.size() > longest_text)
        return refuse(reason.say("the text is too long for a quantity"));

    Numeral numeral;
    NumeralReader reader(utf8, numeral, reason);
    if (!reader.read())
        return refuse(reason);

    std::string_view rest = detail::without_blanks_before(reader.rest());
    while (rest.ends_with(' '))
        rest.remove_suffix(1);
    const bool has_unit = !rest.empty();
    Unit unit;
    if (has_unit) {
        const std::optional<Unit> read = read_unit(rest, &reason);
        if (!read)
            return refuse(reason);
        unit = *read;
    }
    const std::optional<double> value = convert(numeral, unit);
    if (!value)
        return refuse(reason.quote(utf8).say(" is too large or too small a number"));
    return Quantity{*value, unit.dimension, has_unit};
}

Unreadable without_unit(std::string_view utf8) noexcept
{
    Reason reason;
    return refuse(reason.quote(utf8).say(" has no unit"));
}

} // namespace entropy_ledger::functions
