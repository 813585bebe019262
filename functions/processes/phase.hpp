// A phase changes at a given temperature, at equilibrium or away from it.
#pragma once

#include "functions/processes/state_change.hpp"

namespace entropy_ledger::functions::processes {

template <class Number>
class Phase : public StateChange<Number> {
public:
    template <class Reader>
    static Phase read(Reader& reader)
    {
        Phase process;
        process.substance_ = reader.substance(Key::material);
        const State before = reader.state(process.substance_, Key::from);
        const State after = reader.state(process.substance_, Key::to);
        process.start_.T = process.end_.T = reader.temperature(Key::T);
        process.amount_ = reader.amount(Key::amount, process.substance_);
        process.start_.p = process.end_.p = reader.pressure(Key::p, standard_pressure);
        if (reader.refused())
            return process;
        process.start_.phase = &before.at(value_of(process.start_.T));
        process.end_.phase = &after.at(value_of(process.end_.T));
        if (process.start_.phase == process.end_.phase)
            reader.refuse(ErrorCode::unusable_argument, Key::to,
                          [&] { return std::string("is the same phase as before the change"); });
        reader.admit(process.substance_, *process.start_.phase, process.start_.T, process.start_.p, Key::T);
        reader.admit(process.substance_, *process.end_.phase, process.end_.T, process.end_.p, Key::T);
        return process;
    }
};

} // namespace entropy_ledger::functions::processes
