// A change of one substance between two states. Every process on a substance is one: what differs is what is given.
//
// All phases of a substance share one reference, so entropy and heat are differences of the end states' own
// functions, whatever the path. The path, through the phase changes at equilibrium where it can, is laid out in
// state_path.cpp for whoever wants to see the steps.
#pragma once

#include "functions/processes/step.hpp"
#include "functions/reader.hpp"
#include "registry/substance.hpp"

namespace entropy_ledger::functions {

// A phase at a temperature in K and a pressure in Pa.
template <class Number>
struct Point {
    const registry::Phase* phase = nullptr;
    Number T = 300.0;
    Number p = standard_pressure;
};

// Lays out the path of a change of `mass` kg and visits its steps.
void visit_path(const registry::Substance& substance, const Point<double>& start, const Point<double>& end, double mass,
                const StepVisitor& visit);

// Sources, reservations and cautions of a change.
void remark_on_change(const registry::Substance& substance, const Point<double>& start, const Point<double>& end,
                      Remarks& remarks);

template <class Number>
class StateChange {
public:
    Term<Number> entropy() const
    {
        const Number before = registry::entropy(*start_.phase, start_.T, start_.p);
        const Number after = registry::entropy(*end_.phase, end_.T, end_.p);
        return difference(before, after);
    }

    Term<Number> heat() const
    {
        const Number before = registry::enthalpy(*start_.phase, start_.T, start_.p);
        const Number after = registry::enthalpy(*end_.phase, end_.T, end_.p);
        return difference(before, after);
    }

    bool rate() const { return amount_.rate; }

    TemperatureSpan span() const { return {value_of(start_.T), value_of(end_.T)}; }

    void steps(const StepVisitor& visit) const
    {
        visit_path(*substance_, plain(start_), plain(end_), value_of(amount_.mass), visit);
    }

    void remarks(Remarks& remarks) const { remark_on_change(*substance_, plain(start_), plain(end_), remarks); }

protected:
    const registry::Substance* substance_ = nullptr;
    Point<Number> start_, end_;
    Amount<Number> amount_{1.0, false};

private:
    Term<Number> difference(const Number& before, const Number& after) const
    {
        return {amount_.mass * (after - before),
                value_of(amount_.mass)
                    * (std::abs(value_of(before)) + std::abs(value_of(after)))};
    }

    static Point<double> plain(const Point<Number>& point)
    {
        return {point.phase, value_of(point.T), value_of(point.p)};
    }
};

} // namespace entropy_ledger::functions
