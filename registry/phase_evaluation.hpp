// Evaluation of a phase: its model, and beyond the fitted range of a condensed phase the held heat capacity.
// Included by phase.hpp.
#pragma once

#include <cmath>
#include <variant>

namespace entropy_ledger::registry {

namespace detail {

// True when the plain value of T lies beyond the fit, so that the held heat capacity comes in. Kept apart so that the
// usual case costs one comparison.
template <class ModelType>
bool beyond_fit(const ModelType& model, double T, double p)
{
    return ModelType::holds_heat_capacity && !model.limits(p).fit.contains(T);
}

} // namespace detail

template <class Number>
Number entropy(const Phase& phase, const Number& T, const Number& p)
{
    return std::visit(
        [&](const auto& model) -> Number {
            using std::log;
            if (!detail::beyond_fit(model, value_of(T), value_of(p)))
                return model.entropy(T, p);
            const Range fit = model.limits(value_of(p)).fit;
            const Number edge = clamp_to(T, fit.lower, fit.upper);
            return model.entropy(edge, p) + model.heat_capacity(edge, p) * log(T / edge);
        },
        phase.model);
}

template <class Number>
Number enthalpy(const Phase& phase, const Number& T, const Number& p)
{
    return std::visit(
        [&](const auto& model) -> Number {
            if (!detail::beyond_fit(model, value_of(T), value_of(p)))
                return model.enthalpy(T, p);
            const Range fit = model.limits(value_of(p)).fit;
            const Number edge = clamp_to(T, fit.lower, fit.upper);
            return model.enthalpy(edge, p) + model.heat_capacity(edge, p) * (T - edge);
        },
        phase.model);
}

template <class Number>
Number heat_capacity(const Phase& phase, const Number& T, const Number& p)
{
    return std::visit(
        [&](const auto& model) -> Number {
            if (!detail::beyond_fit(model, value_of(T), value_of(p)))
                return model.heat_capacity(T, p);
            const Range fit = model.limits(value_of(p)).fit;
            return model.heat_capacity(clamp_to(T, fit.lower, fit.upper), p);
        },
        phase.model);
}

inline Limits limits_of(const Phase& phase, double p)
{
    return std::visit([&](const auto& model) { return model.limits(p); }, phase.model);
}

inline const Source& source_of(const Phase& phase, double T, double p)
{
    return std::visit([&](const auto& model) -> const Source& { return model.source(T, p); }, phase.model);
}

inline bool is_ideal_gas(const Phase& phase)
{
    const auto* polynomial = std::get_if<NasaPolynomial>(&phase.model);
    const auto* table = std::get_if<TabulatedHeatCapacity>(&phase.model);
    return (polynomial && polynomial->gas) || (table && table->gas_constant > 0.0);
}

inline bool depends_on_pressure(const Phase& phase)
{
    return std::visit(
        [](const auto& model) {
            if constexpr (requires { model.gas; })
                return model.gas;
            else if constexpr (requires { model.gas_constant; })
                return model.gas_constant > 0.0;
            else
                return !model.holds_heat_capacity;
        },
        phase.model);
}

inline std::span<const Source* const> sources_of(const Phase& phase)
{
    return std::visit([](const auto& model) { return model.sources(); }, phase.model);
}

inline std::string_view formulation_of(const Phase& phase, double T, double p)
{
    return std::visit(
        [&](const auto& model) -> std::string_view {
            if constexpr (requires { model.formulation(T, p); })
                return model.formulation(T, p);
            else
                return {};
        },
        phase.model);
}

} // namespace entropy_ledger::registry
