// Processes and the generation on a number that carries a derivative: the same definitions, no second version.
#include "functions/processes/body.hpp"
#include "functions/processes/change.hpp"
#include "functions/processes/dissipation.hpp"
#include "functions/processes/mixing.hpp"
#include "functions/processes/phase.hpp"
#include "functions/processes/pressure.hpp"
#include "functions/processes/reservoir.hpp"
#include "functions/processes/sensible.hpp"
#include "functions/processes/transfer.hpp"
#include "functions/views/generation.hpp"
#include "support/calling.hpp"
#include "support/dual.hpp"

namespace entropy_ledger::testing {
namespace {

using functions::Key;

// Reads what the usual reader reads; one argument carries the derivative 1.
class DualReader : public functions::Reader {
public:
    using Number = Dual;

    DualReader(const functions::Entry& entry, std::span<const Cell> cells, std::optional<Key> varied)
        : Reader(entry, cells, true), varied_(varied) {}

    Dual temperature(Key key) { return seeded(key, Reader::temperature(key)); }
    Dual reservoir_temperature(Key key) { return seeded(key, Reader::reservoir_temperature(key)); }
    Dual pressure(Key key, double usual) { return seeded(key, Reader::pressure(key, usual)); }
    Dual pressure_of(const functions::State& state, double T, Key key, double usual)
    {
        return seeded(key, Reader::pressure_of(state, T, key, usual));
    }
    Dual required_pressure(Key key) { return seeded(key, Reader::required_pressure(key)); }
    functions::Flow<Dual> heat(Key key) { return seeded(key, Reader::heat(key)); }
    functions::Flow<Dual> heat_capacity(Key key) { return seeded(key, Reader::heat_capacity(key)); }
    functions::Amount<Dual> amount(Key key, const registry::Substance* substance)
    {
        const auto read = Reader::amount(key, substance);
        return {seeded(key, read.mass), read.rate};
    }
    void admit(const registry::Substance* substance, const registry::Phase& phase, const Dual& T, const Dual& p, Key key)
    {
        Reader::admit(substance, phase, T.value, p.value, key);
    }

private:
    Dual seeded(Key key, double x) const { return {x, varied_ == key ? 1.0 : 0.0}; }
    functions::Flow<Dual> seeded(Key key, const functions::Flow<double>& x) const
    {
        return {seeded(key, x.value), x.rate};
    }

    std::optional<Key> varied_;
};

// The derivative of entropy, heat and generation by each numeric argument, against central differences.
template <template <class> class Process>
void check(const char* name, std::vector<Cell> cells)
{
    SCOPED_TRACE(name);
    const functions::Entry& entry = functions::entry_of(static_cast<std::size_t>(*function_named(name)));
    constexpr double T_reservoir = 290.0;
    struct Three {
        Dual entropy, heat, generation;
    };
    const auto at = [&](const std::vector<Cell>& arguments, std::optional<Key> varied) -> Three {
        DualReader reader(entry, arguments, varied);
        const auto process = Process<Dual>::read(reader);
        EXPECT_FALSE(reader.refused()) << reader.refusal().reason;
        const auto s = process.entropy();
        const auto q = process.heat();
        return {s.value, q.value, functions::generation(s, q, Dual(T_reservoir))};
    };
    for (std::size_t i = 0; i < cells.size(); ++i) {
        if (cells[i].kind != Cell::Kind::number)
            continue;
        SCOPED_TRACE(std::string(entry.arguments[i].name));
        const Three here = at(cells, entry.arguments[i].key);
        const double step = 1e-5 * cells[i].number;
        std::vector<Cell> lower = cells, upper = cells;
        lower[i].number -= step;
        upper[i].number += step;
        const Three below = at(lower, std::nullopt), above = at(upper, std::nullopt);
        const auto compare = [&](Dual exact, Dual low, Dual high, Dual value) {
            const double difference = (high.value - low.value) / (2.0 * step);
            EXPECT_NEAR(exact.slope, difference, 1e-6 * std::abs(difference) + 1e-7 * std::abs(value.value / cells[i].number));
        };
        compare(here.entropy, below.entropy, above.entropy, here.entropy);
        compare(here.heat, below.heat, above.heat, here.heat);
        compare(here.generation, below.generation, above.generation, here.entropy);
    }
}

TEST(NumberTypes, ProcessesCarryDerivatives)
{
    check<functions::processes::Sensible>("ENTROPY.SENSIBLE", {text("N2(g)"), number(900), number(1100), number(2), number(2e5)});
    check<functions::processes::Sensible>("ENTROPY.SENSIBLE", {text("water(l)"), number(262), number(350), number(2), number(1e5)});
    check<functions::processes::Phase>("ENTROPY.PHASE", {text("water"), text("l"), text("cr"), number(268), number(3), number(1e5)});
    check<functions::processes::Change>("ENTROPY.CHANGE", {text("water(cr)"), number(250), text("water(g)"), number(450), number(1),
                                                           number(1e5), number(2e5)});
    check<functions::processes::Pressure>("ENTROPY.PRESSURE", {text("water(g)"), number(500), number(1e5), number(3e5), number(2)});
    check<functions::processes::Body>("ENTROPY.BODY", {number(500), number(300), number(400)});
    check<functions::processes::Reservoir>("ENTROPY.RESERVOIR", {number(500), number(300)});
    check<functions::processes::Transfer>("ENTROPY.TRANSFER", {number(500), number(400), number(300)});
    check<functions::processes::Dissipation>("ENTROPY.DISSIPATION", {number(500), number(300)});
}

// Reads amounts as the usual reader; the first carries the derivative 1.
class DualWholeReader {
public:
    using Number = Dual;
    explicit DualWholeReader(functions::WholeReader& reader) : reader_(reader) {}

    struct Row {
        functions::Reader& reader;
        bool varied;
        const registry::Substance* substance(Key key) { return reader.substance(key); }
        functions::Flow<Dual> moles(Key key, const registry::Substance* substance, bool converts)
        {
            const auto read = reader.moles(key, substance, converts);
            return {{read.value, varied ? 1.0 : 0.0}, read.rate};
        }
        bool refused() const { return reader.refused(); }
    };

    bool refused() const { return reader_.refused(); }
    bool given(Key key) const { return reader_.given(key); }
    std::size_t count(Key key) const { return reader_.count(key); }
    void require_equal(Key key, Key other) { reader_.require_equal(key, other); }
    void refuse(ErrorCode code, Key key, std::string_view why) { reader_.refuse(code, key, why); }
    template <class Read>
    void row(std::size_t index, Read&& read)
    {
        reader_.row(index, [&](functions::Reader& reader) {
            Row row{reader, index == 0};
            read(row);
        });
    }

private:
    functions::WholeReader& reader_;
};

TEST(NumberTypes, MixingCarriesDerivatives)
{
    const functions::Entry& entry = functions::entry_of(static_cast<std::size_t>(*function_named("ENTROPY.MIXING")));
    const auto at = [&](double first) {
        const Range amounts = Range::column({number(first), number(3.0)});
        const std::vector<Argument> arguments{Input(amounts)};
        functions::WholeReader reader(entry, arguments, true);
        DualWholeReader dual(reader);
        return functions::processes::Mixing<Dual>::read(dual).entropy().value;
    };
    const double difference = (at(1.00001).value - at(0.99999).value) / 2e-5;
    EXPECT_NEAR(at(1.0).slope, difference, 1e-6 * difference);
    EXPECT_NEAR(at(1.0).slope, 8.314462618 * std::log(4.0), 1e-12) << "-R ln x";
}

} // namespace
} // namespace entropy_ledger::testing
