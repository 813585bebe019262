// Heat Q passes from one reservoir to another: dS = Q (1/T_to - 1/T_from). From the warmer to the colder it can occur
// by itself and dS is positive; the other way dS is negative.
#pragma once

#include "functions/processes/step.hpp"
#include "functions/reader.hpp"

namespace entropy_ledger::functions::processes {

template <class Number>
class Transfer {
public:
    template <class Reader>
    static Transfer read(Reader& reader)
    {
        Transfer process;
        process.heat_ = reader.heat(Key::heat_moved);
        process.T_from_ = reader.reservoir_temperature(Key::T_from);
        process.T_to_ = reader.reservoir_temperature(Key::T_to);
        return process;
    }

    Term<Number> entropy() const
    {
        // One difference of temperatures, so that no digits are lost where the two are close.
        const Number change = heat_.value * (T_from_ - T_to_) / (T_from_ * T_to_);
        return {change, std::abs(value_of(change))};
    }

    // What one reservoir gives the other takes.
    Term<Number> heat() const { return {heat_.value - heat_.value, 0.0}; }

    bool rate() const { return heat_.rate; }

    void steps(const StepVisitor& visit) const
    {
        const double Q = value_of(heat_.value);
        const double from = value_of(T_from_);
        const double to = value_of(T_to_);
        visit({"heat leaves", "reservoir", from, from, 0.0, -Q, -Q / from, {}});
        visit({"heat enters", "reservoir", to, to, 0.0, Q, Q / to, {}});
    }

    void remarks(Remarks& remarks) const
    {
        remarks.source("heat given in the sheet");
        remarks.ask_about_celsius("T_from", value_of(T_from_));
        remarks.ask_about_celsius("T_to", value_of(T_to_));
        if (value_of(heat_.value) == 0.0)
            remarks.reserve("heat is 0, or its cell is empty");
        if (value_of(entropy().value) < 0.0)
            remarks.reserve("the entropy change is negative: heat does not pass by itself from the colder to the "
                            "warmer; the duty cannot occur as specified");
    }

private:
    Flow<Number> heat_{0.0, false};
    Number T_from_ = 300.0, T_to_ = 300.0;
};

} // namespace entropy_ledger::functions::processes
