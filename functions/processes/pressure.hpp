// The pressure of one phase changes at constant temperature, in steady flow without shaft work.
#pragma once

#include "functions/processes/state_change.hpp"

namespace entropy_ledger::functions::processes {

template <class Number>
class Pressure : public StateChange<Number> {
public:
    template <class Reader>
    static Pressure read(Reader& reader)
    {
        Pressure process;
        const State state = reader.state(Key::substance);
        process.substance_ = state.substance;
        process.start_.T = process.end_.T = reader.temperature(Key::T);
        process.start_.p = reader.required_pressure(Key::p_from);
        process.end_.p = reader.required_pressure(Key::p_to);
        process.amount_ = reader.amount(Key::amount, state.substance);
        if (reader.refused())
            return process;
        const registry::Phase& phase = state.at(value_of(process.start_.T));
        process.start_.phase = process.end_.phase = &phase;
        reader.admit(state.substance, phase, process.start_.T, process.start_.p, Key::T);
        reader.admit(state.substance, phase, process.end_.T, process.end_.p, Key::T);
        return process;
    }

    void remarks(Remarks& remarks) const
    {
        StateChange<Number>::remarks(remarks);
        if (!registry::depends_on_pressure(*this->start_.phase))
            remarks.reserve(shown_state(*this->substance_, *this->start_.phase)
                            + ": the source gives no dependence on pressure; taken as none");
    }
};

} // namespace entropy_ledger::functions::processes
