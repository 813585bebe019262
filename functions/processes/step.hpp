// What every process offers to the views.
//
// A process is a template over the number type, with
//   template <class Reader> static Process read(Reader&);   // its arguments, checked
//   Term<Number> entropy() const;         // entropy change of the system, J/K
//   Term<Number> heat() const;            // heat taken up by the system, J
//   bool rate() const;                    // per second: W/K and W
//   void steps(const StepVisitor&) const; // the path, step by step; its sums are entropy() and heat()
//   void remarks(Remarks&) const;         // sources, reservations and cautions
//   TemperatureSpan span() const;         // of a system that exchanges its heat with a reservoir
// read() leaves a refusal in the reader; the other members are called only when there is none.
#pragma once

#include "functions/remarks.hpp"
#include "registry/number.hpp"

#include <cmath>
#include <functional>
#include <string>

namespace entropy_ledger::functions {

// For `double`; other number types bring their own, found by argument-dependent look-up.
using registry::value_of;

// A value and the size of the parts that it is the difference of: its rounding is a few units of the last place of
// `magnitude`, however small `value` is.
template <class Number>
struct Term {
    Number value;
    double magnitude;
};

// One step of a path.
struct Step {
    std::string what;        // "heating", "freezing"
    std::string state;       // "water(l)", "water(l) → water(cr)"
    double T_start = 0.0;    // K; 0 where it has no meaning
    double T_end = 0.0;      // K; likewise
    double p = 0.0;          // Pa; 0 where it has no meaning
    double heat = 0.0;       // J
    double entropy = 0.0;    // J/K
    std::string source;      // key of the source, empty where no data come in
};

// Temperatures of a system at the start and at the end, K.
struct TemperatureSpan {
    double start;
    double end;
};

using StepVisitor = std::function<void(const Step&)>;

} // namespace entropy_ledger::functions
