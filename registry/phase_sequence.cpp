#include "registry/phase_sequence.hpp"

#include "registry/equilibrium.hpp"

namespace entropy_ledger::registry {

std::optional<PhaseSequence> phase_sequence(const Substance& substance, const Phase& first, const Phase& last, double p,
                                            bool directly)
{
    PhaseSequence path;
    auto i = static_cast<std::size_t>(&first - substance.phases.data());
    const auto end = static_cast<std::size_t>(&last - substance.phases.data());
    const bool upwards = i < end;
    for (; i != end; i = upwards ? i + 1 : i - 1) {
        if (!directly || path.phases.empty())
            path.phases.push_back(&substance.phases[i]);
    }
    path.phases.push_back(&last);
    for (;;) {
        path.temperatures.clear();
        for (std::size_t k = 0; k + 1 < path.phases.size(); ++k) {
            const auto T = equilibrium_temperature(substance, *path.phases[k], *path.phases[k + 1], p);
            if (!T)
                return std::nullopt;
            path.temperatures.push_back(*T);
        }
        std::size_t k = 0;
        while (k + 1 < path.temperatures.size()
               && (upwards ? path.temperatures[k] <= path.temperatures[k + 1]
                           : path.temperatures[k] >= path.temperatures[k + 1]))
            ++k;
        if (k + 1 >= path.temperatures.size())
            return path;
        path.phases.erase(path.phases.begin() + static_cast<std::ptrdiff_t>(k + 1));
    }
}

} // namespace entropy_ledger::registry
