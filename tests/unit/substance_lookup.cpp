// Looking substances up by name, formula and alias, and the suggestions for a name that is not there.
#include "registry/compiled_tables.hpp"
#include "registry/substance.hpp"

#include <gtest/gtest.h>

#include <algorithm>
#include <cstdlib>
#include <new>
#include <set>
#include <string>
#include <vector>

namespace {
std::size_t allocations = 0;
}

// Not inlined: the compiler would take new and free for a mismatched pair.
[[gnu::noinline]] void* operator new(std::size_t size)
{
    ++allocations;
    if (void* memory = std::malloc(size == 0 ? 1 : size))
        return memory;
    throw std::bad_alloc();
}

[[gnu::noinline]] void operator delete(void* memory) noexcept { std::free(memory); }
[[gnu::noinline]] void operator delete(void* memory, std::size_t) noexcept { std::free(memory); }

namespace entropy_ledger::registry {
namespace {

std::string found(std::string_view name)
{
    const Found result = find_substance(name);
    EXPECT_FALSE(result.substance && result.ambiguous) << name;
    return result.ambiguous ? "ambiguous" : result.substance ? std::string(result.substance->name) : "none";
}

std::vector<std::string> similar(std::string_view name)
{
    const Suggestions suggestions = similar_names(name);
    EXPECT_LE(suggestions.count, std::size(suggestions.names));
    return {suggestions.names, suggestions.names + suggestions.count};
}

TEST(SubstanceLookup, ByNameFormulaAndAlias)
{
    EXPECT_EQ(found("Al"), "Al");
    EXPECT_EQ(found("aluminium"), "Al");
    EXPECT_EQ(found("aluminum"), "Al");
    EXPECT_EQ(found("sulphur dioxide"), "SO2");
    EXPECT_EQ(found("sulfur dioxide"), "SO2");
    EXPECT_EQ(found("Ca(OH)2"), "Ca(OH)2");
    EXPECT_EQ(found("methane"), "CH4");
    EXPECT_EQ(found("C10H8"), "C10H8,naphthalene");
    EXPECT_EQ(found("CH2ClCOOH"), "CH2Cl-COOH");
    EXPECT_EQ(found("R-22"), "CHF2Cl");
    EXPECT_EQ(found("air"), "air");
}

TEST(SubstanceLookup, CaseIsIgnoredWhereUnambiguous)
{
    EXPECT_EQ(found("nacl"), "NaCl");
    EXPECT_EQ(found("NACL"), "NaCl");
    EXPECT_EQ(found("AIR"), "air");
    EXPECT_EQ(found("Water"), "water");
    EXPECT_EQ(found("AlUmInIuM"), "Al");
}

TEST(SubstanceLookup, CaseDecidesWhereItMust)
{
    EXPECT_EQ(found("CO"), "CO");
    EXPECT_EQ(found("Co"), "Co");
    EXPECT_EQ(found("co"), "ambiguous");
    EXPECT_EQ(found("CS"), "CS");
    EXPECT_EQ(found("Cs"), "Cs");
    EXPECT_EQ(found("cs"), "ambiguous");
    EXPECT_EQ(found("SN"), "SN");
    EXPECT_EQ(found("Sn"), "Sn");
    EXPECT_EQ(found("sn"), "ambiguous");
    // The metal and titanium nitride; a word may begin with a capital.
    EXPECT_EQ(found("tin"), "Sn");
    EXPECT_EQ(found("Tin"), "Sn");
    EXPECT_EQ(found("TiN"), "TiN");
    EXPECT_EQ(found("TIN"), "ambiguous");
}

TEST(SubstanceLookup, WaterAndTheRecordOfTheSetAreTwo)
{
    EXPECT_EQ(found("water"), "water");
    EXPECT_EQ(found("H2O"), "H2O");
    EXPECT_EQ(found("h2o"), "H2O");
    const Substance& water = *find_substance("water").substance;
    ASSERT_EQ(water.phases.size(), 3u);
    EXPECT_EQ(water.formula, "H2O");
    EXPECT_DOUBLE_EQ(water.molar_mass, 0.018015268); // IAPWS R7-97
    EXPECT_TRUE(std::holds_alternative<IceIh>(water.phases[0].model));
    EXPECT_TRUE(std::holds_alternative<LiquidWater>(water.phases[1].model));
    EXPECT_TRUE(std::holds_alternative<Steam>(water.phases[2].model));
}

TEST(SubstanceLookup, AFormulaOfSeveralIsomersIsAmbiguous)
{
    EXPECT_EQ(found("C8H18"), "ambiguous");
    EXPECT_EQ(found("c8h18"), "ambiguous");
    const auto names = similar("C8H18");
    EXPECT_NE(std::find(names.begin(), names.end(), "C8H18,n-octane"), names.end());
    EXPECT_NE(std::find(names.begin(), names.end(), "C8H18,isooctane"), names.end());
    EXPECT_EQ(found("C8H18,n-octane"), "C8H18,n-octane");
    EXPECT_EQ(found("isooctane"), "C8H18,isooctane");
}

TEST(SubstanceLookup, BlanksAroundAreIgnoredAndNothingElse)
{
    EXPECT_EQ(found("  iron\t"), "Fe");
    EXPECT_EQ(found("i ron"), "none");
    EXPECT_EQ(found(""), "none");
    EXPECT_EQ(found("   "), "none");
    EXPECT_EQ(found("Fe(cr)"), "none");
    EXPECT_EQ(found(std::string("Fe\0", 3)), "none");
    EXPECT_EQ(found(std::string_view()), "none");
}

TEST(SubstanceLookup, BytesBeyondAsciiAreComparedExactly)
{
    EXPECT_EQ(found("w\u00fcstite"), "Fe0.947O");
    EXPECT_EQ(found("W\u00fcSTITE"), "Fe0.947O");
    EXPECT_EQ(found("w\u00dcstite"), "none");
    EXPECT_EQ(found("\xff\xfe"), "none");
}

TEST(SubstanceLookup, EverySubstanceIsFoundByItsNameAndListedInOrder)
{
    const auto all = substances();
    ASSERT_GT(all.size(), 1000u);
    const auto lower = [](std::string_view text) {
        std::string result{text};
        std::transform(result.begin(), result.end(), result.begin(),
                       [](char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; });
        return result;
    };
    for (std::size_t i = 0; i < all.size(); ++i) {
        EXPECT_EQ(find_substance(all[i].name).substance, &all[i]) << all[i].name;
        if (!all[i].title.empty()) {
            EXPECT_EQ(find_substance(all[i].title).substance, &all[i]) << all[i].title;
        }
        if (i > 0) {
            EXPECT_LE(lower(all[i - 1].name), lower(all[i].name));
        }
    }
}

TEST(SubstanceLookup, EveryFormulaLeadsToItsSubstanceOrIsAmbiguous)
{
    for (const Substance& substance : substances()) {
        if (substance.formula.empty())
            continue;
        const Found result = find_substance(substance.formula);
        ASSERT_TRUE(result.substance || result.ambiguous) << substance.formula;
        if (result.substance) {
            EXPECT_EQ(result.substance->formula, substance.formula);
        }
    }
}

TEST(SubstanceLookup, PhasesAndTransitionsAreInOrder)
{
    for (const Substance& substance : substances()) {
        ASSERT_FALSE(substance.phases.empty()) << substance.name;
        std::set<std::string_view> symbols;
        for (std::size_t i = 0; i < substance.phases.size(); ++i) {
            const Phase& phase = substance.phases[i];
            EXPECT_TRUE(symbols.insert(phase.symbol).second) << substance.name << " " << phase.symbol;
            EXPECT_EQ(phase.aggregation == Aggregation::gas, phase.symbol == "g") << substance.name;
            if (phase.aggregation == Aggregation::gas) {
                EXPECT_EQ(i + 1, substance.phases.size()) << substance.name;
            }
            EXPECT_GT(phase.uncertainty.relative, 0.0);
            EXPECT_GE(phase.uncertainty.growth_below, 0.0);
            EXPECT_GE(phase.uncertainty.growth_above, 0.0);
            EXPECT_FALSE(phase.uncertainty.reason.empty());
            EXPECT_FALSE(sources_of(phase).empty());
            const Limits limits = limits_of(phase, 1e5);
            EXPECT_LE(limits.trust.lower, limits.fit.lower) << substance.name << " " << phase.symbol;
            EXPECT_GE(limits.trust.upper, limits.fit.upper) << substance.name << " " << phase.symbol;
        }
        double last = 0.0;
        for (const Transition& transition : substance.transitions) {
            ASSERT_LT(transition.to, substance.phases.size());
            EXPECT_EQ(transition.to, transition.from + 1);
            EXPECT_GT(transition.nominal_temperature, last);
            last = transition.nominal_temperature;
            for (const std::size_t side : {transition.from, transition.to})
                EXPECT_TRUE(limits_of(substance.phases[side], 1e5).trust.contains(last))
                    << substance.name << " " << last;
        }
    }
}

TEST(SubstanceLookup, AllocatesNothing)
{
    const std::string_view names[] = {"Al", "aluminium", "NACL", "no such substance", "co", "water"};
    const std::size_t before = allocations;
    std::size_t known = 0;
    for (const std::string_view name : names)
        known += find_substance(name).substance != nullptr;
    const Suggestions suggestions = similar_names("aluminim");
    const std::size_t after = allocations;
    EXPECT_EQ(after, before);
    EXPECT_EQ(known, 4u);
    EXPECT_GT(suggestions.count, 0u);
}

// The cost of a look-up is the length of the probe; it stays short however many names there are.
TEST(SubstanceLookup, ProbesAreShort)
{
    for (const auto table : {compiled::names_as_written, compiled::names_without_case}) {
        const std::size_t mask = table.size() - 1;
        ASSERT_EQ(table.size() & mask, 0u);
        std::size_t longest = 0, total = 0, names = 0;
        for (std::size_t at = 0; at < table.size(); ++at) {
            if (table[at].name.empty())
                continue;
            const std::size_t probe = ((at - compiled::hash_of(table[at].name)) & mask) + 1;
            longest = std::max(longest, probe);
            total += probe;
            ++names;
        }
        EXPECT_LE(3 * names, table.size());
        EXPECT_LE(longest, 12u);
        EXPECT_LT(static_cast<double>(total), 1.3 * static_cast<double>(names));
    }
}

TEST(SimilarNames, FindsSlips)
{
    const auto first = [](std::string_view name) {
        const auto names = similar(name);
        return names.empty() ? std::string() : names.front();
    };
    EXPECT_EQ(first("watr"), "water");
    EXPECT_EQ(first("aluminuim"), "aluminum");
    EXPECT_EQ(first("sodium chlorid"), "sodium chloride");
    EXPECT_EQ(first("sulphr"), "sulphur");
    EXPECT_EQ(first("Na2Cl"), "NaCl");
    const auto either = similar("co");
    EXPECT_NE(std::find(either.begin(), either.end(), "CO"), either.end());
    EXPECT_NE(std::find(either.begin(), either.end(), "Co"), either.end());
    EXPECT_EQ(first("naphth"), "naphthalene");
}

TEST(SimilarNames, NamesASubstanceOnceAndOnlyKnownOnes)
{
    for (const char* text : {"alumin", "iron", "sodium", "C2H4", "x", "Cl", "methan"}) {
        std::set<const Substance*> seen;
        for (const std::string& name : similar(text)) {
            const Substance* substance = find_substance(name).substance;
            ASSERT_TRUE(substance) << name;
            EXPECT_TRUE(seen.insert(substance).second) << text << ": " << name;
        }
    }
}

TEST(SimilarNames, LongEmptyAndBinaryTextsGiveNothing)
{
    EXPECT_TRUE(similar("").empty());
    EXPECT_TRUE(similar(std::string(1'000'000, 'a')).empty());
    EXPECT_TRUE(similar(std::string(65, 'a')).empty());
    EXPECT_TRUE(similar("qqqqqqqqqqqqqqqqqqqqqqqqqqqqqq").empty());
    EXPECT_TRUE(similar(std::string(64, '\xff')).empty());
}

} // namespace
} // namespace entropy_ledger::registry
