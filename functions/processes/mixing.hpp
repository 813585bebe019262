// Components mix at constant temperature and pressure, as ideal gases or in an ideal solution:
// dS = -R sum(n_i ln x_i), no heat. Equal substances are one component: their mixing changes nothing.
#pragma once

#include "functions/processes/step.hpp"
#include "functions/whole_reader.hpp"
#include "registry/constants.hpp"

#include <algorithm>
#include <vector>

namespace entropy_ledger::functions::processes {

template <class Number>
class Mixing {
public:
    template <class Reader>
    static Mixing read(Reader& reader)
    {
        Mixing process;
        reader.require_equal(Key::amounts, Key::substances);
        const bool named = reader.given(Key::substances);
        const std::size_t count = reader.refused() ? 0 : reader.count(Key::amounts);
        for (std::size_t i = 0; i < count; ++i) {
            reader.row(i, [&](auto& row) {
                const registry::Substance* substance = named ? row.substance(Key::substances) : nullptr;
                const auto moles = row.moles(Key::amounts, substance, named);
                if (!row.refused())
                    process.add(substance, moles);
            });
        }
        if (!reader.refused() && process.components_.empty())
            reader.refuse(ErrorCode::unusable_argument, Key::amounts, "holds no amount");
        if (!reader.refused() && process.mixed_rates_)
            reader.refuse(ErrorCode::unusable_argument, Key::amounts, "holds amounts and rates together");
        return process;
    }

    Term<Number> entropy() const
    {
        Number change = 0.0;
        for (const Component& component : components_)
            change = change + part(component);
        return {change, std::abs(value_of(change))};
    }

    Term<Number> heat() const { return {Number(0.0), 0.0}; }

    bool rate() const { return rate_; }

    void steps(const StepVisitor& visit) const
    {
        for (const Component& component : components_)
            visit({"mixing", component.substance ? std::string(component.substance->name) : "component", 0.0, 0.0, 0.0, 0.0,
                   value_of(part(component)), {}});
    }

    void remarks(Remarks& remarks) const
    {
        remarks.source("amounts given in the sheet; ideal mixing");
        remarks.note("the components are taken to mix ideally; whether they do is not checked");
    }

private:
    struct Component {
        const registry::Substance* substance;
        Number moles;
    };

    void add(const registry::Substance* substance, const Flow<Number>& moles)
    {
        mixed_rates_ = mixed_rates_ || (!components_.empty() && moles.rate != rate_);
        rate_ = moles.rate;
        total_ = total_ + moles.value;
        const auto same = std::find_if(components_.begin(), components_.end(), [&](const Component& component) {
            return substance && component.substance == substance;
        });
        if (same != components_.end())
            same->moles = same->moles + moles.value;
        else
            components_.push_back({substance, moles.value});
    }

    // The component's share of the entropy of mixing; nothing of a component adds nothing.
    Number part(const Component& component) const
    {
        using std::log;
        if (!(value_of(component.moles) > 0.0))
            return Number(0.0);
        return registry::molar_gas_constant * component.moles * log(total_ / component.moles);
    }

    std::vector<Component> components_;
    Number total_ = 0.0;
    bool rate_ = false;
    bool mixed_rates_ = false;
};

} // namespace entropy_ledger::functions::processes
