#include "functions/views/views.hpp"

namespace entropy_ledger::functions::views {

namespace {

constexpr std::size_t columns = 8;

// A temperature or a pressure; 0 stands for one without meaning.
void append_positive(MixedTable& table, double x)
{
    if (x > 0.0)
        table.cells.emplace_back(x);
    else
        table.cells.emplace_back(std::string());
}

void append(MixedTable& table, const Step& step)
{
    table.cells.emplace_back(step.what);
    table.cells.emplace_back(step.state);
    append_positive(table, step.T_start);
    append_positive(table, step.T_end);
    append_positive(table, step.p);
    table.cells.emplace_back(step.heat);
    table.cells.emplace_back(step.entropy);
    table.cells.emplace_back(step.source);
    ++table.rows;
}

} // namespace

Result steps_table(const std::function<void(const StepVisitor&)>& steps, bool rate, double heat,
                   std::optional<double> T_reservoir)
{
    MixedTable table;
    table.columns = columns;
    for (const char* heading : {"step", "state", "from, K", "to, K", "pressure, Pa", rate ? "heat, W" : "heat, J",
                                rate ? "entropy, W/K" : "entropy, J/K", "source"})
        table.cells.emplace_back(std::string(heading));
    table.rows = 1;
    bool finite = true; // a step can overflow where their sum does not
    steps([&](const Step& step) {
        finite = finite && std::isfinite(step.heat) && std::isfinite(step.entropy);
        append(table, step);
    });
    if (!finite)
        return error_number(ErrorCode::unusable_argument);
    if (T_reservoir) {
        const double T = *T_reservoir;
        append(table, {heat > 0.0 ? "heat leaves" : "heat enters", "reservoir", T, T, 0.0, -heat, -heat / T, {}});
    }
    return table;
}

} // namespace entropy_ledger::functions::views
