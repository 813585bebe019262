#include "functions/units.hpp"

#include "functions/unit_table.hpp"

#include <array>
#include <cmath>
#include <cstdlib>

namespace entropy_ledger::functions {

namespace {

using detail::CodePoint;
using detail::decode;
using detail::is_blank;
using detail::is_digit;
using detail::superscript_digit;

constexpr char32_t superscript_plus = 0x207A;
constexpr char32_t superscript_minus = 0x207B;
constexpr int deepest_nesting = 16;
constexpr int largest_exponent = 9;
constexpr std::string_view gauge_refused = "gauge pressure: give absolute pressure";

bool is_letter(char c) { return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z'); }

bool is_multiplication(char32_t c)
{
    return c == U'.' || c == U'*' || c == U'\u00B7' || c == U'\u22C5' || c == U'\u00D7';
}

bool is_division(char32_t c) { return c == U'/' || c == U'\u2044' || c == U'\u2215'; }

bool is_degree_sign(char32_t c) { return c == U'\u00B0' || c == U'\u00BA' || c == U'\u02DA'; }

// A name in the spelling of the table: µ as "u", the look-alikes of ° as °. Too long a name is no unit: it is cut.
class Name {
public:
    void append(std::string_view text)
    {
        for (const char c : text)
            if (size_ < text_.size())
                text_[size_++] = c;
    }
    std::string_view text() const { return {text_.data(), size_}; }

private:
    std::array<char, 32> text_;
    std::size_t size_ = 0;
};

// A product of powers of units on its way. Exponents as int: they are checked at the end.
struct Product {
    std::array<int, 5> exponents{};
    int power_of_ten = 0;
    double numerator = 1.0;
    double denominator = 1.0;
    double start = 0.0;        // of the last temperature scale met; both count only while that is the only component
    double origin = 0.0;
    bool scale_above = false;  // a temperature scale stands above the fraction line
    bool scale_below = false;
    bool single = true;        // nothing has been multiplied yet

    Product() = default;
    explicit Product(const Unit& unit)
        : exponents{unit.dimension.length, unit.dimension.mass, unit.dimension.time, unit.dimension.temperature,
                    unit.dimension.amount},
          power_of_ten(unit.power_of_ten), numerator(unit.numerator), denominator(unit.denominator),
          start(unit.start), origin(unit.origin), scale_above(unit.is_scale())
    {
    }

    bool is_pressure() const
    {
        const auto& d = dimensions::pressure;
        return exponents == std::array<int, 5>{d.length, d.mass, d.time, d.temperature, d.amount};
    }

    // Multiplies by factor^exponent.
    void multiply(const Product& factor, int exponent)
    {
        for (int n = std::abs(exponent); n > 0; --n) {
            numerator *= exponent > 0 ? factor.numerator : factor.denominator;
            denominator *= exponent > 0 ? factor.denominator : factor.numerator;
        }
        for (std::size_t i = 0; i < exponents.size(); ++i)
            exponents[i] = saturated(exponents[i] + exponent * factor.exponents[i]);
        power_of_ten = saturated(power_of_ten + exponent * factor.power_of_ten);
        if (factor.scale_above || factor.scale_below)
            start = factor.start;
        scale_above = scale_above || (exponent > 0 ? factor.scale_above : factor.scale_below);
        scale_below = scale_below || (exponent > 0 ? factor.scale_below : factor.scale_above);
        // The square of a temperature scale has no meaning, above or below the line.
        if (std::abs(exponent) > 1 && (factor.scale_above || factor.scale_below))
            scale_above = true;
        single = false;
    }

private:
    // Far beyond what is let through in the end, far below what an int holds even after a ninth power.
    static int saturated(int x) { return x > 1000000 ? 1000000 : x < -1000000 ? -1000000 : x; }
};

class UnitReader {
public:
    UnitReader(std::string_view text, Reason& reason) : rest_(text), reason_(reason) {}

    std::optional<Unit> read()
    {
        Product product;
        if (!term(product, 0))
            return std::nullopt;
        if (!rest_.empty()) {  // term() stops early only at a closing parenthesis
            reason_.say("a closing parenthesis has no opening one");
            return std::nullopt;
        }
        return finish(product);
    }

private:
    std::string_view rest_;
    Reason& reason_;

    bool fail(std::string_view text)
    {
        reason_.say(text);
        return false;
    }

    bool fail_here()
    {
        const CodePoint next = decode(rest_);
        if (detail::begins_with_plus_minus(rest_))
            return fail("an uncertainty (±) is not read here: give the value alone");
        if (next.value == U'{')
            return fail("notes in braces are not read in a unit");
        if (rest_.starts_with("-mol"))
            return fail("write lbmol for the pound-mole");
        if (rest_.size() > 1 && rest_[0] == '-' && is_letter(rest_[1]))
            return fail("\"-\" does not join units: write \".\" between them");
        if (is_digit(static_cast<char>(next.value < 128 ? next.value : 0))) {
            std::size_t size = 1;
            while (size < rest_.size() && is_digit(rest_[size]))
                ++size;
            reason_.say("the number ").quote(rest_.substr(0, size)).say(" stands where a unit is expected");
            return false;
        }
        reason_.quote(rest_.substr(0, next.size)).say(" is not expected in a unit");
        return false;
    }

    void skip_blanks() { rest_ = detail::without_blanks_before(rest_); }

    bool take_per()
    {
        if (!rest_.starts_with("per") || (rest_.size() > 3 && (is_letter(rest_[3]) || rest_[3] == '_')))
            return false;
        rest_.remove_prefix(3);
        return true;
    }

    bool take_division()
    {
        const CodePoint next = decode(rest_);
        if (!is_division(next.value))
            return take_per();
        rest_.remove_prefix(next.size);
        return true;
    }

    // Reads up to the end or a closing parenthesis.
    bool term(Product& product, int depth)
    {
        skip_blanks();
        bool first = true;
        bool divided = false;
        if (take_division()) {
            first = false;
            divided = true;
        }
        bool divide = divided;
        for (;;) {
            skip_blanks();
            Product factor;
            int exponent = 1;
            if (!component(factor, exponent, depth))
                return false;
            if (first && exponent == 1)
                product = factor;
            else
                product.multiply(factor, divide ? -exponent : exponent);
            first = false;

            const std::size_t before = rest_.size();
            skip_blanks();
            const bool blank = rest_.size() != before;
            if (rest_.empty() || rest_.front() == ')')
                return true;
            divide = take_division();
            if (divide) {
                divided = true;
                continue;
            }
            const CodePoint next = decode(rest_);
            const bool sign = is_multiplication(next.value);
            if (!sign && !(blank && begins_component(next.value)))
                return fail_here();
            if (divided)
                return fail("a product after a division has two readings: put the divisor in parentheses");
            if (sign)
                rest_.remove_prefix(next.size);
        }
    }

    bool begins_component(char32_t c) const
    {
        return c == U'(' || c == U'[' || c == U'%' || (c < 128 && is_letter(static_cast<char>(c))) ||
               (c >= 128 && in_name(c));
    }

    static bool in_name(char32_t c)
    {
        return !is_multiplication(c) && !is_division(c) && !is_blank(c) && superscript_digit(c) < 0 &&
               c != superscript_plus && c != superscript_minus && c != U'\u00B1' && c != U'\u2212';
    }

    bool component(Product& factor, int& exponent, int depth)
    {
        if (rest_.empty())
            return fail("the unit is incomplete");
        if (rest_.front() == '(') {
            if (depth == deepest_nesting)
                return fail("too many parentheses");
            rest_.remove_prefix(1);
            if (!term(factor, depth + 1))
                return false;
            if (rest_.empty())
                return fail("a closing parenthesis is missing");
            rest_.remove_prefix(1);
            return read_exponent(exponent);
        }
        if (rest_.front() == '1' && !(rest_.size() > 1 && (is_digit(rest_[1]) || is_letter(rest_[1])))) {
            rest_.remove_prefix(1);
            return true;
        }
        if (!begins_component(decode(rest_).value))
            return fail_here();

        Name name;
        const std::string_view from = rest_;
        if (!read_name(name))
            return false;
        Unit unit;
        if (!look_up(name.text(), from.substr(0, from.size() - rest_.size()), unit))
            return false;
        factor = Product(unit);
        if (factor.is_pressure() && !read_pressure_mark())
            return false;
        return read_exponent(exponent);
    }

    // Letters, a part in brackets, degree signs; digits where a letter follows at once ("mmH2O").
    bool read_name(Name& name)
    {
        while (!rest_.empty()) {
            const CodePoint next = decode(rest_);
            if (next.value == U'[') {
                const std::size_t end = rest_.find(']');
                if (end == std::string_view::npos)
                    return fail("a closing bracket ] is missing");
                name.append(rest_.substr(0, end + 1));
                rest_.remove_prefix(end + 1);
                continue;
            }
            if (next.value < 128) {
                const char c = rest_.front();
                if (is_digit(c)) {
                    std::size_t end = 0;
                    while (end < rest_.size() && is_digit(rest_[end]))
                        ++end;
                    if (end == rest_.size() || !is_letter(rest_[end]))
                        return true;
                    name.append(rest_.substr(0, end));
                    rest_.remove_prefix(end);
                    continue;
                }
                if (!is_letter(c) && c != '_' && c != '%')
                    return true;
            } else if (!in_name(next.value)) {
                return true;
            }
            const std::string_view bytes = rest_.substr(0, next.size);
            rest_.remove_prefix(next.size);
            if (is_degree_sign(next.value)) {
                name.append("°");
                skip_blanks();
            } else if (next.value == U'\u2103') {
                name.append("°C");
            } else if (next.value == U'\u2109') {
                name.append("°F");
            } else if (next.value == U'\u212A') {
                name.append("K");
            } else if (next.value == U'\u00B5' || next.value == U'\u03BC') {
                name.append("u");
            } else {
                name.append(bytes);
            }
        }
        return true;
    }

    static bool is_pressure(std::string_view name)
    {
        Unit unit;
        return find_unit(name, unit) && unit.dimension == dimensions::pressure;
    }

    // `written` is the name as it stands in the text.
    bool look_up(std::string_view name, std::string_view written, Unit& unit)
    {
        if (find_unit(name, unit))
            return true;
        if (const std::string_view advice = advice_on(name); !advice.empty())
            return fail(advice);

        // Marks grown onto the unit of pressure: "barg", "bar_g", "barü"; "bara".
        constexpr std::array<std::string_view, 6> gauge_marks{"g", "_g", "G", "ga", "ü", "Ü"};
        for (const std::string_view mark : gauge_marks)
            if (name.ends_with(mark) && is_pressure(name.substr(0, name.size() - mark.size())))
                return fail(gauge_refused);
        constexpr std::array<std::string_view, 3> absolute_marks{"a", "_a", "A"};
        for (const std::string_view mark : absolute_marks)
            if (name.ends_with(mark) && is_pressure(name.substr(0, name.size() - mark.size())))
                return find_unit(name.substr(0, name.size() - mark.size()), unit);

        reason_.say("no unit is called ").quote(written);
        if (const Spelling spelling = right_spelling(name); !spelling.name.empty())
            reason_.say(": write ").say(spelling.prefix).say(spelling.name);
        return false;
    }

    // "bar(g)", "psi (a)", "bar abs". A mark must stand alone to count.
    bool read_pressure_mark()
    {
        std::string_view after = detail::without_blanks_before(rest_);
        const bool blank = after.size() != rest_.size();
        const bool parenthesis = after.starts_with('(');
        if (!blank && !parenthesis)
            return true;
        if (parenthesis)
            after = detail::without_blanks_before(after.substr(1));
        std::size_t size = 0;
        while (size < after.size() && is_letter(after[size]))
            ++size;
        const std::string_view word = after.substr(0, size);
        after.remove_prefix(size);
        if (parenthesis) {
            after = detail::without_blanks_before(after);
            if (!after.starts_with(')'))
                return true;
            after.remove_prefix(1);
        }
        const char32_t next = decode(after).value;
        if (!after.empty() && next != U')' && !is_division(next) && !is_blank(next))
            return true;
        if (word == "g" || word == "G" || word == "ga" || word == "gauge" || word == "gage")
            return fail(gauge_refused);
        if (word == "a" || word == "A" || word == "abs" || word == "absolute")
            rest_ = after;
        return true;
    }

    bool read_exponent(int& exponent)
    {
        const std::string_view from = rest_;
        const bool caret = rest_.starts_with('^');
        if (caret)
            rest_.remove_prefix(1);
        bool negative = false;
        bool sign = false;
        bool raised = false;
        CodePoint next = decode(rest_);
        if (next.value == U'+' || next.value == superscript_plus || next.value == U'-' ||
            next.value == U'\u2212' || next.value == superscript_minus) {
            negative = next.value != U'+' && next.value != superscript_plus;
            raised = next.value == superscript_plus || next.value == superscript_minus;
            sign = true;
            rest_.remove_prefix(next.size);
            next = decode(rest_);
        }
        if (superscript_digit(next.value) >= 0)
            raised = true;
        int value = 0;
        bool any = false;
        for (;; next = decode(rest_)) {
            const int digit = raised                                     ? superscript_digit(next.value)
                              : next.value >= U'0' && next.value <= U'9' ? static_cast<int>(next.value - U'0')
                                                                         : -1;
            if (digit < 0)
                break;
            any = true;
            value = value > largest_exponent ? value : value * 10 + digit;
            rest_.remove_prefix(next.size);
        }
        if (!any) {
            if (!caret && !sign)
                return true;
            rest_ = from;
            return caret ? fail("an exponent is missing after \"^\"") : fail_here();
        }
        if (value < 1 || value > largest_exponent)
            return fail("the exponent of a unit is a whole number from 1 to 9, with or without sign");
        exponent = negative ? -value : value;
        return true;
    }

    std::optional<Unit> finish(const Product& product)
    {
        if (product.scale_above && !product.single) {
            reason_.say("temperatures in ").say(product.start != 0.0 ? "°F" : "°C");
            reason_.say(" cannot be multiplied: write K");
            return std::nullopt;
        }
        Unit unit;
        const std::array<signed char*, 5> targets{&unit.dimension.length, &unit.dimension.mass, &unit.dimension.time,
                                                  &unit.dimension.temperature, &unit.dimension.amount};
        bool fits = std::isnormal(product.numerator) && std::isnormal(product.denominator) &&
                    std::abs(product.power_of_ten) <= 300;
        for (std::size_t i = 0; i < targets.size(); ++i) {
            fits = fits && std::abs(product.exponents[i]) <= 100;
            *targets[i] = static_cast<signed char>(fits ? product.exponents[i] : 0);
        }
        if (!fits) {
            reason_.say("the unit has too large an exponent");
            return std::nullopt;
        }
        unit.power_of_ten = product.power_of_ten;
        unit.numerator = product.numerator;
        unit.denominator = product.denominator;
        if (product.single) {
            unit.start = product.start;
            unit.origin = product.origin;
        }
        return unit;
    }
};

struct NamedDimension {
    Dimension dimension;
    std::string_view name;
};

constexpr std::array named_dimensions{
    NamedDimension{dimensions::dimensionless, "number"},
    NamedDimension{dimensions::length, "length"},
    NamedDimension{dimensions::volume, "volume"},
    NamedDimension{dimensions::duration, "time"},
    NamedDimension{dimensions::temperature, "temperature"},
    NamedDimension{dimensions::mass, "mass"},
    NamedDimension{dimensions::amount_of_substance, "amount of substance"},
    NamedDimension{dimensions::force, "force"},
    NamedDimension{dimensions::pressure, "pressure"},
    NamedDimension{dimensions::energy, "energy"},
    NamedDimension{dimensions::power, "power"},
    NamedDimension{dimensions::mass_rate, "mass rate"},
    NamedDimension{dimensions::molar_rate, "molar rate"},
    NamedDimension{dimensions::molar_mass, "molar mass"},
    NamedDimension{dimensions::heat_capacity, "heat capacity"},
    NamedDimension{dimensions::heat_capacity_rate, "heat capacity rate"},
    NamedDimension{dimensions::specific_energy, "specific energy"},
    NamedDimension{dimensions::specific_heat_capacity, "specific heat capacity"},
    NamedDimension{dimensions::molar_energy, "molar energy"},
    NamedDimension{dimensions::molar_heat_capacity, "molar heat capacity"},
};

} // namespace

std::string_view name_of(const Dimension& dimension) noexcept
{
    for (const NamedDimension& named : named_dimensions)
        if (named.dimension == dimension)
            return named.name;
    return {};
}

double Unit::factor() const noexcept { return Unit{dimension, power_of_ten, numerator, denominator}.to_si(1.0); }

double Unit::to_si(double x) const noexcept
{
    // Powers up to 10^22 are exact as double: one rounding. Larger ones come from rare prefixes and powers of them.
    constexpr std::array exact{1e0,  1e1,  1e2,  1e3,  1e4,  1e5,  1e6,  1e7,  1e8,  1e9,  1e10, 1e11,
                               1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22};
    const auto size = static_cast<std::size_t>(std::abs(power_of_ten));
    const double power = size < exact.size() ? exact[size] : std::pow(10.0, static_cast<double>(size));
    const double scaled = (x - start) * numerator;
    return (power_of_ten >= 0 ? scaled * power / denominator : scaled / denominator / power) + origin;
}

std::optional<Unit> read_unit(std::string_view utf8, Reason* reason) noexcept
{
    if (const Unit* usual = find_usual_unit(utf8))
        return *usual;
    Reason why;
    std::optional<Unit> unit;
    if (utf8.size() > longest_text)
        why.say("the text is too long");
    else if (detail::without_blanks_before(utf8).empty())
        why.say("there is no unit");
    else
        unit = UnitReader(utf8, why).read();
    if (!unit && reason)
        *reason = why;
    return unit;
}

} // namespace entropy_ledger::functions
