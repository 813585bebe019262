// A substance from heat capacities given at temperatures: a user's own table.
#pragma once

#include "registry/substance.hpp"

#include <memory>
#include <string>
#include <vector>

namespace entropy_ledger::registry {

struct TabulatedPhase {
    std::string symbol;            // IUPAC state symbol in normal form
    Aggregation aggregation;
    std::vector<double> T;         // K, ascending, at least two
    std::vector<double> cp;        // J/(kg K), above 0, as many
    double transition_temperature; // K; to the phase before; of no meaning for the first
    double transition_enthalpy;    // J/kg, taken up on heating from the phase before; likewise
};

struct SubstanceTable {
    std::string name;
    std::string citation;          // of the source
    double molar_mass = 0.0;       // kg/mol; 0 when unknown
    double uncertainty = 0.0;      // relative standard uncertainty of the heat capacities
    bool uncertainty_given = false;
    bool smooth = false;
    std::vector<TabulatedPhase> phases; // in order of stability on heating
};

// Owns what its Substance points to, and stays where it is.
class TabulatedSubstance {
public:
    // The caller has checked the table: see functions/user_table.cpp. The first phase has h = 0 and s = 0 at 298.15 K
    // or the end of its range next to that; at each transition the next phase takes its enthalpy up and the Gibbs
    // energies meet.
    explicit TabulatedSubstance(SubstanceTable table);
    TabulatedSubstance(const TabulatedSubstance&) = delete;
    TabulatedSubstance& operator=(const TabulatedSubstance&) = delete;

    const Substance& substance() const { return substance_; }

private:
    struct Curve {
        std::vector<TableKnot> knots;
        std::vector<double> bounds;
    };

    SubstanceTable table_;
    Source source_;
    std::vector<Curve> curves_;
    std::vector<Phase> phases_;
    std::vector<Transition> transitions_;
    Substance substance_;
};

// How far beyond its table a phase may be used, assigned here: a crystal 3 % of the end temperature but at least 5 K; a
// liquid 10 % below, since undercooling is its usual case, and 5 % above; a gas 3 % below
// and nothing above.
Range trust_of_table(const TabulatedPhase& phase);

} // namespace entropy_ledger::registry
