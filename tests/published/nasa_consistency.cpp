// Whether the records of the NASA Glenn set agree with one another: the steps between the intervals of a phase, and
// what happens where one phase gives way to the next. What the source has rough is kept in nasa_rough_spots.txt, with
// its size; a new rough spot fails, and so does one that is gone or has changed.
#include "published/nasa_phases.hpp"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <cstdio>
#include <fstream>
#include <map>
#include <string>

namespace entropy_ledger::testing {
namespace {

using registry::Phase;
using registry::Substance;

// What is not worth listing, relative to R T for h and g, to R for s, to cp for cp.
constexpr double small_step = 1e-4;
constexpr double small_step_of_cp = 1e-3;

using Spots = std::map<std::string, std::vector<double>>; // kind, state and temperature; sizes

std::string key(const std::string& kind, const std::string& where, double T)
{
    char text[32];
    std::snprintf(text, sizeof text, "%.3f", T);
    return kind + "\t" + where + "\t" + text;
}

std::string shown(const std::pair<const std::string, std::vector<double>>& spot)
{
    std::string line = spot.first;
    for (const double size : spot.second) {
        char text[32];
        std::snprintf(text, sizeof text, "\t%.5g", size);
        line += text;
    }
    return line + "\n";
}

struct Values {
    double cp, h, s; // over R, R T, R
};

Values values(const registry::NasaPolynomial& model, std::size_t interval, double T)
{
    registry::NasaPolynomial one = model;
    one.intervals = model.intervals + interval;
    one.count = 1;
    const double R = model.specific_gas_constant;
    return {one.heat_capacity(T, bar) / R, one.enthalpy(T, bar) / (R * T), one.entropy(T, bar) / R};
}

void add_steps_between_intervals(Spots& spots)
{
    for (const NasaPhase& phase : nasa_phases()) {
        for (std::size_t i = 0; i + 1 < phase.model->count; ++i) {
            const double T = phase.model->intervals[i].upper;
            const Values below = values(*phase.model, i, T);
            const Values above = values(*phase.model, i + 1, T);
            const double cp = above.cp / below.cp - 1.0, h = above.h - below.h, s = above.s - below.s;
            if (std::abs(cp) > small_step_of_cp || std::abs(h) > small_step || std::abs(s) > small_step)
                spots[key("interval", phase.state(), T)] = {cp, h, s};
        }
    }
}

// The enthalpy and the Gibbs energy taken up in a transition, over R T.
struct Change {
    double h, g;
};

Change change(const Substance& substance, const registry::Transition& transition)
{
    const double T = transition.nominal_temperature;
    const Phase& below = substance.phases[transition.from];
    const Phase& above = substance.phases[transition.to];
    const double RT = registry::nasa_gas_constant / substance.molar_mass * T;
    const double h = registry::enthalpy(above, T, bar) - registry::enthalpy(below, T, bar);
    const double s = registry::entropy(above, T, bar) - registry::entropy(below, T, bar);
    return {h / RT, (h - T * s) / RT};
}

void add_transitions(Spots& spots)
{
    for (const Substance& substance : registry::substances()) {
        for (std::size_t i = 0; i + 1 < substance.phases.size(); ++i) {
            const auto* below = std::get_if<registry::NasaPolynomial>(&substance.phases[i].model);
            const auto* above = std::get_if<registry::NasaPolynomial>(&substance.phases[i + 1].model);
            if (!below || !above || above->gas || below->origin != &registry::sources::nasa_glenn)
                continue;
            const double end = below->intervals[below->count - 1].upper, begin = above->intervals[0].lower;
            const std::string where = std::string(substance.name) + "(" + std::string(substance.phases[i].symbol)
                                    + " to " + std::string(substance.phases[i + 1].symbol) + ")";
            const auto transition = std::find_if(substance.transitions.begin(), substance.transitions.end(),
                                                 [&](const registry::Transition& t) { return t.from == i; });
            if (transition == substance.transitions.end()) {
                spots[key("no transition", where, end)] = {end, begin};
                continue;
            }
            const double T = transition->nominal_temperature;
            const Change over = change(substance, *transition);
            if (over.h < -small_step)
                spots[key("gives off heat", where, T)] = {over.h};
            else if (over.h < small_step)
                spots[key("without enthalpy", where, T)] = {};
            if (std::abs(over.g) > small_step)
                spots[key("Gibbs energies apart", where, T)] = {over.g};
            if (end != begin)
                spots[key("ends apart", where, T)] = {end, begin};
        }
    }
}

TEST(NasaConsistency, RoughSpotsAreTheKnownOnes)
{
    Spots found;
    add_steps_between_intervals(found);
    add_transitions(found);

    Spots known;
    std::ifstream file(std::string(TEST_DATA_DIRECTORY) + "/nasa_rough_spots.txt");
    ASSERT_TRUE(file);
    for (std::string line; std::getline(file, line);) {
        if (line.empty() || line[0] == '#')
            continue;
        const auto fields = fields_of(line);
        ASSERT_GE(fields.size(), 3u) << line;
        auto& sizes = known[fields[0] + "\t" + fields[1] + "\t" + fields[2]];
        for (std::size_t i = 3; i < fields.size(); ++i)
            sizes.push_back(std::stod(fields[i]));
    }
    EXPECT_FALSE(known.empty());

    for (const auto& spot : found) {
        const auto entry = known.find(spot.first);
        EXPECT_TRUE(entry != known.end()) << "new: " << shown(spot);
        if (entry == known.end())
            continue;
        ASSERT_EQ(entry->second.size(), spot.second.size()) << shown(spot);
        for (std::size_t i = 0; i < spot.second.size(); ++i)
            EXPECT_NEAR(spot.second[i], entry->second[i], 0.01 * std::abs(entry->second[i]) + 1e-7) << shown(spot);
    }
    for (const auto& spot : known)
        EXPECT_TRUE(found.count(spot.first)) << "gone: " << shown(spot);
}

// None is listed: no transition of the set gives off heat on heating.
TEST(NasaConsistency, NoTransitionGivesOffHeatOnHeating)
{
    std::size_t seen = 0;
    for (const Substance& substance : registry::substances()) {
        for (const registry::Transition& transition : substance.transitions) {
            if (substance.molar_mass <= 0.0)
                continue;
            EXPECT_GT(change(substance, transition).h, -small_step)
                << substance.name << " at " << transition.nominal_temperature;
            ++seen;
        }
    }
    EXPECT_GT(seen, 400u);
}

TEST(NasaConsistency, HeatCapacitiesAreAboveZero)
{
    for (const NasaPhase& phase : nasa_phases()) {
        const registry::Range trust = registry::limits_of(*phase.phase, bar).trust;
        for (int i = 0; i <= 200; ++i) {
            const double T = trust.lower + (trust.upper - trust.lower) * i / 200.0;
            EXPECT_GT(registry::heat_capacity(*phase.phase, T, bar), 0.0) << phase.state() << " " << T;
        }
    }
}

} // namespace
} // namespace entropy_ledger::testing
