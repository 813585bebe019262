// Whether the NASA Glenn set came over whole, and whether it is evaluated right.
// nasa_fingerprint.txt is made from the published file by registry/carry_over_nasa.py; the independent values are made
// by nasa_independent.py, see nasa.cmake.
#include "published/nasa_phases.hpp"

#include <gtest/gtest.h>

#include <cstdint>
#include <cstdio>
#include <fstream>
#include <map>
#include <set>
#include <string>

namespace entropy_ledger::testing {
namespace {

using registry::NasaInterval;

std::string printed(const char* format, double x)
{
    char text[64];
    std::snprintf(text, sizeof text, format, x);
    return text;
}

// The digits of an interval as published.
std::string digits(const NasaPhase& phase, const NasaInterval& interval)
{
    std::string text = printed("%.7f", 1000.0 * phase.substance->molar_mass);
    for (const double bound : {interval.lower, interval.upper})
        text += printed(" %.3f", bound);
    for (const double a : interval.a)
        text += printed(" %.9e", a);
    return text + printed(" %.9e", interval.b1) + printed(" %.9e", interval.b2);
}

std::string fingerprint(const std::string& text)
{
    std::uint32_t value = 0x811c9dc5u; // 32-bit FNV-1a
    for (const char c : text)
        value = (value ^ static_cast<unsigned char>(c)) * 0x01000193u;
    char hex[9];
    std::snprintf(hex, sizeof hex, "%08x", static_cast<unsigned>(value));
    return hex;
}

TEST(NasaSet, EveryPublishedIntervalIsThereToTheLastDigit)
{
    std::map<std::string, NasaPhase> by_state;
    std::size_t ours = 0;
    for (const NasaPhase& phase : nasa_phases()) {
        by_state.emplace(phase.state(), phase);
        ours += phase.model->count;
    }

    std::ifstream file(std::string(TEST_DATA_DIRECTORY) + "/nasa_fingerprint.txt");
    ASSERT_TRUE(file);
    std::size_t records = 0, intervals = 0, stated_records = 0, stated_intervals = 0;
    std::map<std::string, std::size_t> taken; // intervals of a state that were seen
    for (std::string line; std::getline(file, line);) {
        if (line.empty() || line[0] == '#')
            continue;
        if (line.rfind("records ", 0) == 0) {
            ASSERT_EQ(std::sscanf(line.c_str(), "records %zu intervals %zu", &stated_records, &stated_intervals), 2);
            continue;
        }
        const auto fields = fields_of(line);
        ASSERT_EQ(fields.size() % 2, 1u) << line;
        ++records;
        for (std::size_t i = 1; i < fields.size(); i += 2) {
            SCOPED_TRACE(fields[0] + " as " + fields[i]);
            ++intervals;
            const auto found = by_state.find(fields[i]);
            ASSERT_NE(found, by_state.end());
            const std::size_t index = taken[fields[i]]++;
            ASSERT_LT(index, found->second.model->count);
            EXPECT_EQ(fingerprint(digits(found->second, found->second.model->intervals[index])), fields[i + 1]);
        }
    }
    EXPECT_EQ(records, stated_records);
    EXPECT_EQ(intervals, stated_intervals);
    EXPECT_EQ(intervals, ours) << "intervals of ours that are not in the published set";
    EXPECT_EQ(taken.size(), by_state.size());
    // Counted in the published file by other means: 2085 records, of them 1830 neutral with a heat capacity.
    EXPECT_EQ(records, 1830u);
}

TEST(NasaSet, AgreesWithIndependentQuadrature)
{
    std::ifstream file(NASA_INDEPENDENT_FILE);
    ASSERT_TRUE(file) << NASA_INDEPENDENT_FILE << " is written by nasa_independent.py when the tests are built";
    std::map<std::string, NasaPhase> by_state;
    for (const NasaPhase& phase : nasa_phases())
        by_state.emplace(phase.state(), phase);

    std::map<std::string, std::size_t> seen;
    double worst = 0.0;
    for (std::string line; std::getline(file, line);) {
        const auto fields = fields_of(line);
        ASSERT_EQ(fields.size(), 6u) << line;
        const auto found = by_state.find(fields[0]);
        ASSERT_NE(found, by_state.end()) << fields[0];
        const registry::Phase& phase = *found->second.phase;
        const double T = std::stod(fields[1]), p = std::stod(fields[2]);
        const double cp = std::stod(fields[3]), h = std::stod(fields[4]), s = std::stod(fields[5]);
        SCOPED_TRACE(fields[0] + " at " + fields[1] + " K");
        EXPECT_TRUE(registry::limits_of(phase, p).trust.contains(T));
        const auto compare = [&](double ours, double theirs, double scale) {
            const double apart = std::abs(ours - theirs) / scale;
            worst = std::max(worst, apart);
            EXPECT_LT(apart, 1e-9) << ours << " " << theirs;
        };
        // The terms of the polynomials cancel; the worst case of the set loses six digits, at 20 000 K.
        const double R = found->second.model->specific_gas_constant;
        compare(registry::heat_capacity(phase, T, p), cp, std::max(cp, R));
        compare(registry::enthalpy(phase, T, p), h, std::max(std::abs(h), R * T));
        compare(registry::entropy(phase, T, p), s, std::max(std::abs(s), R));
        ++seen[fields[0]];
    }
    EXPECT_EQ(seen.size(), by_state.size());
    for (const auto& [state, count] : seen)
        EXPECT_GE(count, 3u) << state;
    char text[32];
    std::snprintf(text, sizeof text, "%.2g", worst);
    RecordProperty("worst_relative_difference", text);
}

TEST(NasaSet, UncertaintyIsMarkedAsAssignedHere)
{
    for (const NasaPhase& phase : nasa_phases()) {
        EXPECT_EQ(phase.phase->uncertainty.origin, registry::Origin::assigned) << phase.state();
        EXPECT_NE(phase.phase->uncertainty.reason.find("assigned here"), std::string_view::npos) << phase.state();
    }
}

// The rules of trust, on examples worked by hand.
TEST(NasaSet, Trust)
{
    const auto trust = [](const char* name, std::string_view symbol) {
        const registry::Substance* substance = registry::find_substance(name).substance;
        for (const registry::Phase& phase : substance->phases) {
            if (phase.symbol == symbol)
                return registry::limits_of(phase, bar).trust;
        }
        return registry::empty_range;
    };
    EXPECT_NEAR(trust("Al", "cr").lower, 190.0, 1e-9);               // 10 K below 200 K
    EXPECT_NEAR(trust("Al", "cr").upper, 933.61 * 1.02, 1e-2);       // superheated by 2 %
    EXPECT_NEAR(trust("Al", "l").lower, 933.61 * 0.78, 1e-2);        // undercooled
    EXPECT_NEAR(trust("Fe", "cr,gamma").lower, 1184.0 * 0.95, 1e-2); // beside another modification
    EXPECT_NEAR(trust("Fe", "cr,gamma").upper, 1665.0 * 1.05, 1e-2);
    EXPECT_EQ(trust("N2", "g").lower, 200.0);                        // a gas: the fit alone
    EXPECT_EQ(trust("N2", "g").upper, 20000.0);
    EXPECT_EQ(trust("H2O", "l").lower, 253.15);                      // as far as IAPWS SR6-08 goes
}

TEST(NasaSet, JoinedAndTold)
{
    const auto symbols = [](const char* name) {
        std::string list;
        for (const registry::Phase& phase : registry::find_substance(name).substance->phases)
            list += (list.empty() ? "" : " ") + std::string(phase.symbol);
        return list;
    };
    EXPECT_EQ(symbols("Fe"), "cr,alpha cr,gamma cr,delta l g");
    EXPECT_EQ(symbols("SiO2"), "cr,alpha-quartz cr,beta-quartz cr,beta-cristobalite l g");
    EXPECT_EQ(symbols("C"), "cr,graphite g");
    EXPECT_EQ(symbols("SnS"), "cr,rhombic cr,cubic l g");
    EXPECT_EQ(symbols("ZrO2"), "cr,III cr,II cr,I l g");
    EXPECT_EQ(symbols("PbO"), "cr,red cr,yellow l g");
    EXPECT_EQ(symbols("H2O"), "cr l g");
    EXPECT_EQ(symbols("CO"), "g");
    EXPECT_EQ(symbols("Co"), "cr,alpha cr,beta l g");
    EXPECT_EQ(symbols("C6H6"), "l g");
    EXPECT_EQ(symbols("C8H18,n-octane"), "l g");
    EXPECT_EQ(symbols("air"), "g");
    // Ions and the electron are left out.
    for (const char* ion : {"e-", "Na+", "OH-", "H3O+"})
        EXPECT_EQ(registry::find_substance(ion).substance, nullptr) << ion;
}

} // namespace
} // namespace entropy_ledger::testing
