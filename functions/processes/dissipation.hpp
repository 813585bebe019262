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
        if (!reader.refused() && registry::value_of(process.work_.value) < 0.0)
            reader.refuse(ErrorCode::unusable_argument, Key::work, [&] {
                return "is " + shown(registry::value_of(process.work_.value))
                     + " J; work that is turned to heat is not negative: heat at one temperature does not turn "
                       "wholly to work";
            });
        return process;
    }

    Term<Number> entropy() const
    {
        const Number change = work_.value / T_;
        return {change, std::abs(registry::value_of(change))};
    }

    Term<Number> heat() const { return {work_.value, std::abs(registry::value_of(work_.value))}; }

    bool rate() const { return work_.rate; }

    void steps(const StepVisitor& visit) const
    {
        const double T = registry::value_of(T_);
        visit({"work turned to heat", "reservoir", T, T, 0.0, registry::value_of(work_.value),
               registry::value_of(entropy().value), {}});
    }

    void remarks(Remarks& remarks) const { remarks.source("work given in the sheet"); }

private:
    Flow<Number> work_{0.0, false};
    Number T_ = 300.0;
};

} // namespace entropy_ledger::functions::processes
