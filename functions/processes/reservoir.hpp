// Heat Q enters a reservoir at constant temperature: dS = Q / T.
#pragma once

#include "functions/processes/step.hpp"
#include "functions/reader.hpp"

namespace entropy_ledger::functions::processes {

template <class Number>
class Reservoir {
public:
    template <class Reader>
    static Reservoir read(Reader& reader)
    {
        Reservoir process;
        process.heat_ = reader.heat(Key::heat);
        process.T_ = reader.reservoir_temperature(Key::T);
        return process;
    }

    Term<Number> entropy() const
    {
        const Number change = heat_.value / T_;
        return {change, std::abs(value_of(change))};
    }

    Term<Number> heat() const { return {heat_.value, std::abs(value_of(heat_.value))}; }

    bool rate() const { return heat_.rate; }

    void steps(const StepVisitor& visit) const
    {
        const double T = value_of(T_);
        visit({value_of(heat_.value) < 0.0 ? "heat leaves" : "heat enters", "reservoir", T, T, 0.0,
               value_of(heat_.value), value_of(entropy().value), {}});
    }

    void remarks(Remarks& remarks) const
    {
        remarks.source("heat given in the sheet");
        remarks.ask_about_celsius("T", value_of(T_));
        if (value_of(heat_.value) == 0.0)
            remarks.reserve("heat is 0, or its cell is empty");
    }

private:
    Flow<Number> heat_{0.0, false};
    Number T_ = 300.0;
};

} // namespace entropy_ledger::functions::processes
