// A substance goes from one state to another, through any phase changes.
#pragma once

#include "functions/processes/state_change.hpp"

namespace entropy_ledger::functions::processes {

template <class Number>
class Change : public StateChange<Number> {
public:
    template <class Reader>
    static Change read(Reader& reader)
    {
        Change process;
        const State before = reader.state_beside_table(Key::start, Key::end);
        const State after = reader.state_beside_table(Key::end, Key::start);
        process.substance_ = before.substance;
        process.start_.T = reader.temperature(Key::T_start);
        process.end_.T = reader.temperature(Key::T_end);
        process.amount_ = reader.amount(Key::amount, before.substance);
        process.start_.p = reader.pressure_of(before, value_of(process.start_.T), Key::p_start, standard_pressure);
        process.end_.p = reader.pressure_of(after, value_of(process.end_.T), Key::p_end, value_of(process.start_.p));
        if (reader.refused())
            return process;
        if (before.substance != after.substance) {
            reader.refuse(ErrorCode::unusable_argument, Key::end, [&] {
                return std::string(after.substance->name) + " is another substance than "
                     + std::string(before.substance->name) + "; a chemical reaction is no change of state";
            });
            return process;
        }
        process.start_.set_phase(before);
        process.end_.set_phase(after);
        reader.admit(before.substance, *process.start_.phase, process.start_.T, process.start_.p, Key::T_start);
        reader.admit(before.substance, *process.end_.phase, process.end_.T, process.end_.p, Key::T_end);
        return process;
    }
};

} // namespace entropy_ledger::functions::processes
