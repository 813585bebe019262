// The models that a phase can have. A new model is one file beside this one and one entry here.
//
// A model is a literal type with
//   template <class Number> Number entropy(const Number& T, const Number& p) const;        // J/(kg K)
//   template <class Number> Number enthalpy(const Number& T, const Number& p) const;       // J/kg
//   template <class Number> Number heat_capacity(const Number& T, const Number& p) const;  // J/(kg K)
//   Limits limits(double p) const;                                                         // K, at p in Pa
//   const Source& source(double T, double p) const;
//   std::span<const Source* const> sources() const;          // all that may answer
//   std::string_view formulation(double T, double p) const;  // optional: which of several equations answers
//   static constexpr bool holds_heat_capacity;  // beyond the fit, a condensed phase's heat capacity is held
// T in K, p in Pa. Within `limits(p).fit` the three functions follow the cited equation.
#pragma once

#include "registry/models/constant_heat_capacity.hpp"
#include "registry/models/ice.hpp"
#include "registry/models/liquid_water.hpp"
#include "registry/models/nasa_polynomial.hpp"
#include "registry/models/steam.hpp"
#include "registry/models/tabulated_heat_capacity.hpp"

#include <variant>

namespace entropy_ledger::registry {

using Model = std::variant<ConstantHeatCapacity, NasaPolynomial, LiquidWater, IceIh, Steam, TabulatedHeatCapacity>;

} // namespace entropy_ledger::registry
