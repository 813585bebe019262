// States as texts: a substance with its IUPAC state symbol, such as "water(l)" or "Fe(cr,alpha)".
#pragma once

#include "registry/substance.hpp"

#include <optional>
#include <string>
#include <string_view>

namespace entropy_ledger::functions {

// A state symbol in normal form: "cr", "l", "g", with a modification "cr,alpha". "s" is read as "cr", Greek letters by
// their names, blanks and case ignored; the words solid, crystal, ice, liquid, melt, gas, vapour, steam stand for their symbols.
// "l+g,x=0.85" is liquid and vapour together with a quality. Empty when the text is no state symbol. Bounded: over 40 bytes is none.
std::string normal_symbol(std::string_view text);

// The state of aggregation of a symbol in normal form.
registry::Aggregation aggregation_of_symbol(std::string_view symbol);

// A substance in a state. A symbol without a modification ("cr") stands for all the modifications of that state of
// aggregation; which of them is meant follows from the temperature. So it does for a user's table that names no state.
struct State {
    const registry::Substance* substance = nullptr;
    const registry::Phase* phase = nullptr;  // null: one of several
    registry::Aggregation aggregation = registry::Aggregation::gas;
    bool any_aggregation = false;
    const registry::Phase* vapour = nullptr; // of wet steam and its like, whose liquid `phase` is
    double quality = 0.0;                    // mass of the vapour over that of both

    // Whether `candidate` is one of the phases that may be meant.
    bool may_be(const registry::Phase& candidate) const;

    // The phase at temperature T: the one named, or of those that may be meant the one that is stable at T by the
    // registry's transitions.
    const registry::Phase& at(double T) const;
};

// Why a text is no state.
struct StateProblem {
    bool wants_reason = true; // whether `reason` is worth making
    bool no_data = false;     // the substance is known and the symbol readable, but there are no data for that state
    std::string reason;       // in plain words
};

// Splits "Ca(OH)2(cr)" into "Ca(OH)2" and "cr". The symbol is empty when there is none.
struct SplitState { std::string_view substance; std::string symbol; };
SplitState split_state(std::string_view text);

// A substance by name; fills `problem` and returns null when there is none. A state symbol after it is refused.
const registry::Substance* read_substance(std::string_view text, StateProblem& problem);

// The state of `substance` with `symbol` (as typed).
std::optional<State> state_of(const registry::Substance& substance, std::string_view symbol, StateProblem& problem);

// A whole state. A substance with a single phase needs no symbol.
std::optional<State> read_state(std::string_view text, StateProblem& problem);

// "water(l)"
std::string shown_state(const registry::Substance& substance, const registry::Phase& phase);

// "water(cr), water(l), water(g)"
std::string shown_states(const registry::Substance& substance);

} // namespace entropy_ledger::functions
