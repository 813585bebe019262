#include "functions/plain/plain.hpp"
#include "functions/reader.hpp"
#include "functions/wording.hpp"

#include <cmath>
#include <string>

namespace entropy_ledger::functions::plain {

namespace {

// A total this small counts as zero when no uncertainty is given: rounding of a sheet's sums. J/K.
constexpr double rounding_of_a_sheet = 1e-9;

constexpr double usual_coverage = 2.0; // JCGM 100:2008, 6.3.1

} // namespace

Result entropy_verdict(const Entry& entry, std::span<const Cell> cells)
{
    Reader reader(entry, cells, false);
    const double total = reader.entropy(Key::total).value;
    const bool has_uncertainty = reader.given(Key::uncertainty);
    const double uncertainty = has_uncertainty ? reader.entropy(Key::uncertainty).value : 0.0;
    const double coverage = reader.given(Key::coverage) ? reader.number(Key::coverage) : usual_coverage;
    if (!reader.refused() && uncertainty < 0.0)
        reader.refuse(ErrorCode::unusable_argument, Key::uncertainty, [] { return "is negative"; });
    if (!reader.refused() && !(coverage > 0.0))
        reader.refuse(ErrorCode::unusable_argument, Key::coverage, [] { return "is not above 0"; });
    if (reader.refused())
        return reader.refusal().error;

    if (uncertainty > 0.0 && std::abs(total) <= coverage * uncertainty)
        return "undecided";
    if (std::abs(total) <= rounding_of_a_sheet)
        return "reversible";
    return total > 0.0 ? "can occur" : "cannot occur";
}

} // namespace entropy_ledger::functions::plain
