// Work W is turned wholly to heat at temperature T: dS = W / T, never negative.
#pragma once

#include "functions/processes/step.hpp"
#include "functions/reader.hpp"
#include "functions/wording.hpp"

namespace entropy_ledger::functions::processes {

template <class Number>
class Dissipation {
public:
    template <class Reader>
    static Dissipation read(Reader& reader)
    {
        Dissipation process;
        process.work_ = reader.heat(Key::work);
        process.T_ = reader.reservoir_temperature(Key::T);
        if (!reader.refused() && value_of(process.work_.value) < 0.0)
            reader.refuse(ErrorCode::unusable_argument, Key::work, [&] {
                return "is " + shown(value_of(process.work_.value))
                     + " J; work that is turned to heat is not negative: heat at one temperature does not turn "
                       "wholly to work";
            });
        return process;
    }

    Term<Number> entropy() const
    {
        const Number change = work_.value / T_;
        return {change, std::abs(value_of(change))};
    }

    Term<Number> heat() const { return {work_.value, std::abs(value_of(work_.value))}; }

    bool rate() const { return work_.rate; }

    void steps(const StepVisitor& visit) const
    {
        const double T = value_of(T_);
        visit({"work turned to heat", "reservoir", T, T, 0.0, value_of(work_.value),
               value_of(entropy().value), {}});
    }

    void remarks(Remarks& remarks) const
    {
        remarks.source("work given in the sheet");
        remarks.ask_about_celsius("T", value_of(T_));
        if (value_of(work_.value) == 0.0)
            remarks.reserve("work is 0, or its cell is empty");
    }

private:
    Flow<Number> work_{0.0, false};
    Number T_ = 300.0;
};

} // namespace entropy_ledger::functions::processes
