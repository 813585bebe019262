// The views: what is asked of a process. Each has
//   template <class Process> static Result show(const Process&, std::optional<double> T_reservoir);
//   static Result refused(const Refusal&);
//   static constexpr bool wants_words;  // whether reasons of refusals are worth making
#pragma once

#include "functions/processes/step.hpp"
#include "functions/refusal.hpp"
#include "functions/value.hpp"
#include "functions/views/generation.hpp"
#include "functions/wording.hpp"

#include <cmath>
#include <optional>

namespace entropy_ledger::functions::views {

// Whether the numbers of a process, and of its reservoir, fit into a double: a huge amount may overflow.
template <class Process>
bool is_finite(const Process& process, std::optional<double> T_reservoir)
{
    const double heat = process.heat().value;
    return std::isfinite(process.entropy().value) && std::isfinite(heat)
        && (!T_reservoir || std::isfinite(heat / *T_reservoir));
}

struct NumberView {
    static constexpr bool wants_words = false;
    static Result refused(const Refusal& refusal) { return refusal.error; }
};

struct Entropy : NumberView {
    template <class Process>
    static Result show(const Process& process, std::optional<double>)
    {
        return finite_or_error(process.entropy().value);
    }
};

struct Heat : NumberView {
    template <class Process>
    static Result show(const Process& process, std::optional<double>)
    {
        return finite_or_error(process.heat().value);
    }
};

struct Generation : NumberView {
    template <class Process>
    static Result show(const Process& process, std::optional<double> T_reservoir)
    {
        return finite_or_error(generation(process.entropy(), process.heat(), *T_reservoir));
    }
};

// Table of the steps. With a reservoir its own row comes last, so that the entropy column adds up to the generation.
Result steps_table(const std::function<void(const StepVisitor&)>& steps, bool rate, double heat,
                   std::optional<double> T_reservoir);

struct Steps : NumberView {
    template <class Process>
    static Result show(const Process& process, std::optional<double> T_reservoir)
    {
        if (!is_finite(process, T_reservoir))
            return error_number(ErrorCode::unusable_argument);
        return steps_table([&](const StepVisitor& visit) { process.steps(visit); }, process.rate(),
                           process.heat().value, T_reservoir);
    }
};

struct Source : NumberView {
    template <class Process>
    static Result show(const Process& process, std::optional<double> T_reservoir)
    {
        if (!is_finite(process, T_reservoir))
            return error_number(ErrorCode::unusable_argument);
        Remarks remarks;
        process.remarks(remarks);
        return remarks.sources();
    }
};

// What there is to say about the heat exchange with a reservoir at T_reservoir (K) while the system goes through `span`.
void remark_on_reservoir(Remarks& remarks, const TemperatureSpan& span, const Term<double>& entropy, const Term<double>& heat,
                         std::optional<double> T_reservoir);

struct Check {
    static constexpr bool wants_words = true;

    static Result refused(const Refusal& refusal) { return "refused: " + refusal.reason; }

    template <class Process>
    static Result show(const Process& process, std::optional<double> T_reservoir)
    {
        if (!is_finite(process, T_reservoir))
            return "refused: the result is too large for a number; the amount or the heat is out of all bounds";
        Remarks remarks;
        process.remarks(remarks);
        if constexpr (requires { process.span(); })
            remark_on_reservoir(remarks, process.span(), process.entropy(), process.heat(), T_reservoir);
        return remarks.summary();
    }
};

} // namespace entropy_ledger::functions::views
