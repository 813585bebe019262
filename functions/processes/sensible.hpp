// One phase is heated or cooled at constant pressure.
#pragma once

#include "functions/processes/state_change.hpp"

#include "functions/wording.hpp"

namespace entropy_ledger::functions::processes {

template <class Number>
class Sensible : public StateChange<Number> {
public:
    template <class Reader>
    static Sensible read(Reader& reader)
    {
        Sensible process;
        const State state = reader.state(Key::substance);
        process.substance_ = state.substance;
        process.start_.T = reader.temperature(Key::T_start);
        process.end_.T = reader.temperature(Key::T_end);
        process.amount_ = reader.amount(Key::amount, state.substance);
        process.start_.p = process.end_.p = reader.pressure(Key::p, standard_pressure);
        if (reader.refused())
            return process;
        const registry::Phase& before = state.at(value_of(process.start_.T));
        const registry::Phase& after = state.at(value_of(process.end_.T));
        if (&before != &after)
            reader.refuse(ErrorCode::unusable_argument, Key::T_end, [&] {
                return "between the two temperatures " + shown_state(*state.substance, before) + " changes to "
                     + shown_state(*state.substance, after) + "; use CHANGE, or name the modification";
            });
        process.start_.phase = process.end_.phase = &before;
        reader.admit(state.substance, before, process.start_.T, process.start_.p, Key::T_start);
        reader.admit(state.substance, before, process.end_.T, process.end_.p, Key::T_end);
        return process;
    }
};

} // namespace entropy_ledger::functions::processes
