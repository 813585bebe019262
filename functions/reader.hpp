// Reads the cells of one call as the quantities and states that a process asks for, and keeps the first refusal.
// After a refusal every further reading is harmless and without meaning.
#pragma once

#include "functions/entry.hpp"
#include "functions/quantity.hpp"
#include "functions/refusal.hpp"
#include "functions/state.hpp"

#include <span>
#include <utility>

namespace entropy_ledger::functions {

inline constexpr double standard_pressure = 100000.0; // Pa; IUPAC Green Book, 3rd ed., 2.11.1 (v)

// A reservoir above this is refused: a pressure was probably meant.
inline constexpr double hottest_reservoir = 5000.0; // K

// A quantity that may be a rate: J or W, J/K or W/K. `rate` is false for a plain number.
template <class Number>
struct Flow {
    Number value;
    bool rate;
};

// A mass in kg, or a mass rate in kg/s.
template <class Number>
struct Amount {
    Number mass;
    bool rate;
};

class Reader {
public:
    using Number = double; // what this reader reads into; processes are templates over the reader's Number

    Reader(const Entry& entry, std::span<const Cell> cells, bool wants_words)
        : entry_(entry), cells_(cells), wants_words_(wants_words) {}

    bool refused() const { return refused_; }
    const Refusal& refusal() const { return refusal_; }

    // Whether the argument is there; an empty cell counts as given and is refused when read.
    bool given(Key key) const;

    double temperature(Key key);                     // K, above 0
    double reservoir_temperature(Key key);           // K, above 0 and at most hottest_reservoir
    double pressure(Key key, double when_left_out);  // Pa, above 0
    double required_pressure(Key key);               // Pa, above 0
    Flow<double> heat(Key key);                      // J or W
    Flow<double> heat_capacity(Key key);             // J/K or W/K, above 0
    Flow<double> entropy(Key key);                   // J/K or W/K
    double number(Key key);                          // without unit
    std::string_view text(Key key);

    const registry::Substance* substance(Key key);
    State state(Key key); // of one phase
    State state_or_wet(Key key);
    // The same where a state symbol alone ("l") means the substance of the table in `other`.
    State state_beside_table(Key key, Key other);
    // The pressure of a state of liquid and vapour together at temperature T: the equilibrium pressure, or the argument
    // `key` when it is given and fits it. For another state as pressure().
    double pressure_of(const State& state, double T, Key key, double when_left_out);
    State state(const registry::Substance* substance, Key symbol);
    Amount<double> amount(Key key, const registry::Substance* substance); // above 0

    // Amount in mol. With `converts`, a plain number is kg as usual and a mass is converted by the molar mass of
    // `substance`; without, a plain number is mol and a mass is refused. Not negative; 0 is allowed.
    Flow<double> moles(Key key, const registry::Substance* substance, bool converts);

    // Refuses unless `phase` has values at (T, p); `key` names the temperature argument.
    void admit(const registry::Substance* substance, const registry::Phase& phase, double T, double p, Key key);

    // Refuses a rate beside what is none, where both arguments say their units.
    void require_same_rate(Key first, bool first_is_rate, Key second, bool second_is_rate);

    // Keeps the first refusal. `words` makes the reason and is called only when it is wanted.
    template <class Words>
    void refuse(ErrorCode code, Key key, Words&& words)
    {
        if (!refused_)
            keep(error_number(code), wants_words_ ? std::string(name(key)) + ": " + words() : std::string());
    }

private:
    const Cell& cell(Key key) const;
    const UserTable* table(Key key);
    std::string_view name(Key key) const;
    void keep(double error, std::string reason);
    void pass_error_on(Key key); // of the argument's cell
    Quantity quantity(Key key, std::string_view unit_wanted);
    template <class Fits>
    Flow<double> flow(Key key, std::string_view wanted, Fits&& fits);

    const Entry& entry_;
    std::span<const Cell> cells_;
    Refusal refusal_;
    bool wants_words_;
    bool refused_ = false;
};

} // namespace entropy_ledger::functions
