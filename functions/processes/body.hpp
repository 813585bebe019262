// A body of constant heat capacity C is heated or cooled: dS = C ln(T_end / T_start), Q = C (T_end - T_start).
#pragma once

#include "functions/processes/step.hpp"
#include "functions/reader.hpp"

namespace entropy_ledger::functions::processes {

template <class Number>
class Body {
public:
    template <class Reader>
    static Body read(Reader& reader)
    {
        Body process;
        process.capacity_ = reader.heat_capacity(Key::heat_capacity);
        process.T_start_ = reader.temperature(Key::T_start);
        process.T_end_ = reader.temperature(Key::T_end);
        return process;
    }

    Term<Number> entropy() const
    {
        using std::log;
        const Number change = capacity_.value * log(T_end_ / T_start_);
        return {change, std::abs(value_of(change))};
    }

    Term<Number> heat() const
    {
        const Number change = capacity_.value * (T_end_ - T_start_);
        return {change, value_of(capacity_.value) * value_of(T_end_ + T_start_)};
    }

    bool rate() const { return capacity_.rate; }

    TemperatureSpan span() const { return {value_of(T_start_), value_of(T_end_)}; }

    void steps(const StepVisitor& visit) const
    {
        const double from = value_of(T_start_);
        const double to = value_of(T_end_);
        visit({to < from ? "cooling" : "heating", "body", from, to, 0.0, value_of(heat().value),
               value_of(entropy().value), "given in the sheet"});
    }

    void remarks(Remarks& remarks) const
    {
        remarks.source("heat capacity given in the sheet, taken as constant");
        remarks.ask_about_celsius("T_start", value_of(T_start_));
        remarks.ask_about_celsius("T_end", value_of(T_end_));
    }

private:
    Flow<Number> capacity_{1.0, false};
    Number T_start_ = 300.0, T_end_ = 300.0;
};

} // namespace entropy_ledger::functions::processes
