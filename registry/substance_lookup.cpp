#include "registry/compiled_tables.hpp"
#include "registry/substance.hpp"

#include <algorithm>
#include <array>
#include <string_view>

namespace entropy_ledger::registry {

namespace {

using compiled::longest_name;
using compiled::NameEntry;

constexpr char lower(char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; }

std::string_view without_blanks(std::string_view text)
{
    constexpr std::string_view blanks = " \t\r\n";
    const std::size_t first = text.find_first_not_of(blanks);
    if (first == std::string_view::npos)
        return {};
    return text.substr(first, text.find_last_not_of(blanks) - first + 1);
}

const NameEntry* find_in(std::span<const NameEntry> table, std::string_view name)
{
    const std::size_t mask = table.size() - 1;
    for (std::size_t at = compiled::hash_of(name) & mask; !table[at].name.empty(); at = (at + 1) & mask) {
        if (table[at].name == name)
            return &table[at];
    }
    return nullptr;
}

Found found(const NameEntry& entry)
{
    if (entry.substance == compiled::ambiguous)
        return {nullptr, true};
    return {&compiled::substances[entry.substance], false};
}

// Number of insertions, deletions, substitutions and exchanges of neighbours between two texts, without regard to case;
// `limit` + 1 when there are more. Both at most longest_name bytes.
std::size_t difference(std::string_view a, std::string_view b, std::size_t limit)
{
    if (std::max(a.size(), b.size()) - std::min(a.size(), b.size()) > limit)
        return limit + 1;
    using Row = std::array<std::size_t, longest_name + 1>;
    Row before_last{}, last{}, row{};
    for (std::size_t j = 0; j <= b.size(); ++j)
        last[j] = j;
    for (std::size_t i = 1; i <= a.size(); ++i) {
        row[0] = i;
        std::size_t least = i;
        for (std::size_t j = 1; j <= b.size(); ++j) {
            const char x = lower(a[i - 1]);
            const char y = lower(b[j - 1]);
            row[j] = std::min({last[j] + 1, row[j - 1] + 1, last[j - 1] + (x == y ? 0u : 1u)});
            if (i > 1 && j > 1 && x == lower(b[j - 2]) && lower(a[i - 2]) == y)
                row[j] = std::min(row[j], before_last[j - 2] + 1);
            least = std::min(least, row[j]);
        }
        if (least > limit)
            return limit + 1;
        before_last = last;
        last = row;
    }
    return last[b.size()];
}

bool begins_with(std::string_view name, std::string_view beginning)
{
    return name.size() >= beginning.size()
        && std::equal(beginning.begin(), beginning.end(), name.begin(),
                      [](char a, char b) { return lower(a) == lower(b); });
}

} // namespace

// Symbols of the elements (IUPAC Periodic Table of the Elements, 2022) of two letters whose spelling in capitals is a
// formula or could become one.
bool is_element_symbol(std::string_view name)
{
    constexpr std::string_view symbols =
        "He Li Be Ne Na Mg Al Si Cl Ar Ca Sc Ti Cr Mn Fe Co Ni Cu Zn Ga Ge As Se Br Kr Rb Sr Zr Nb Mo Tc Ru Rh Pd Ag Cd In "
        "Sn Sb Te Xe Cs Ba La Ce Pr Nd Pm Sm Eu Gd Tb Dy Ho Er Tm Yb Lu Hf Ta Re Os Ir Pt Au Hg Tl Pb Bi Po At Rn Fr Ra "
        "Ac Th Pa Np Pu Am Cm Bk Cf Es Fm Md No Lr Rf Db Sg Bh Hs Mt Ds Rg Cn Nh Fl Mc Lv Ts Og ";
    if (name.size() != 2)
        return false;
    for (std::size_t i = 0; i < symbols.size(); i += 3) {
        if (symbols.substr(i, 2) == name)
            return true;
    }
    return false;
}

std::span<const Substance> substances() { return compiled::substances; }

Found find_substance(std::string_view name)
{
    name = without_blanks(name);
    if (name.empty() || name.size() > longest_name)
        return {nullptr, false};
    if (const NameEntry* entry = find_in(compiled::names_as_written, name))
        return found(*entry);
    if (is_element_symbol(name))
        return {nullptr, false}; // Hf is hafnium, not HF with small letters
    std::array<char, longest_name> folded;
    std::transform(name.begin(), name.end(), folded.begin(), lower);
    if (const NameEntry* entry = find_in(compiled::names_without_case, {folded.data(), name.size()}))
        return found(*entry);
    return {nullptr, false};
}

Suggestions similar_names(std::string_view name)
{
    Suggestions best{};
    name = without_blanks(name);
    if (name.empty() || name.size() > longest_name)
        return best;

    // A short name differs in one letter only, or everything would be similar to it.
    const std::size_t limit = name.size() <= 4 ? 1 : name.size() <= 8 ? 2 : 3;
    constexpr std::size_t shortest_beginning = 3;

    struct Candidate {
        std::string_view name;
        std::size_t difference;
        std::uint16_t substance;
        bool before(const Candidate& other) const
        {
            if (difference != other.difference)
                return difference < other.difference;
            if (name.size() != other.name.size())
                return name.size() < other.name.size();
            return name < other.name;
        }
    };
    constexpr std::size_t wanted = std::size(Suggestions{}.names);
    std::array<Candidate, wanted + 1> list{};
    std::size_t count = 0;

    for (const NameEntry& entry : compiled::names_as_written) {
        if (entry.name.empty() || entry.substance == compiled::ambiguous)
            continue;
        std::size_t apart = difference(name, entry.name, limit);
        if (begins_with(entry.name, name) && entry.name.size() > name.size() && entry.name[name.size()] == ',')
            apart = 0; // one of the isomers of a formula
        if (apart > limit) {
            if (name.size() < shortest_beginning || !begins_with(entry.name, name))
                continue;
            apart = limit + 1; // names that go on where the text ends come last
        }
        Candidate candidate{entry.name, apart, entry.substance};
        // A substance once, by its most similar name.
        const auto end = list.begin() + static_cast<std::ptrdiff_t>(count);
        const auto same = std::find_if(list.begin(), end,
                                       [&](const Candidate& c) { return c.substance == candidate.substance; });
        if (same != end) {
            if (!candidate.before(*same))
                continue;
            std::move(same + 1, end, same);
            --count;
        }
        std::size_t place = count;
        for (; place > 0 && candidate.before(list[place - 1]); --place)
            list[place] = list[place - 1];
        list[place] = candidate;
        count = std::min(count + 1, wanted);
    }
    for (; best.count < count; ++best.count)
        best.names[best.count] = list[best.count].name;
    return best;
}

} // namespace entropy_ledger::registry
