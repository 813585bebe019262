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

// A phase at a temperature in K and a pressure in Pa; or a liquid with its vapour, of the given quality.
template <class Number>
struct Point {
    const registry::Phase* phase = nullptr;
    Number T = 300.0;
    Number p = standard_pressure;
    const registry::Phase* vapour = nullptr;
    double quality = 0.0; // mass of the vapour over that of both

    void set_phase(const State& state)
    {
        phase = &state.at(value_of(T));
        vapour = state.vapour;
        quality = state.quality;
    }
};

// Specific entropy, J/(kg K), and enthalpy, J/kg.
template <class Number>
Number entropy_at(const Point<Number>& point)
{
    const Number s = registry::entropy(*point.phase, point.T, point.p);
    return point.vapour ? s + point.quality * (registry::entropy(*point.vapour, point.T, point.p) - s) : s;
}

template <class Number>
Number enthalpy_at(const Point<Number>& point)
{
    const Number h = registry::enthalpy(*point.phase, point.T, point.p);
    return point.vapour ? h + point.quality * (registry::enthalpy(*point.vapour, point.T, point.p) - h) : h;
}

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
        return difference(entropy_at(start_), entropy_at(end_));
    }

    Term<Number> heat() const
    {
        return difference(enthalpy_at(start_), enthalpy_at(end_));
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
        return {point.phase, value_of(point.T), value_of(point.p), point.vapour, point.quality};
    }
};

} // namespace entropy_ledger::functions
