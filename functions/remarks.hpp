// What there is to say about a duty beside its numbers: the sources, and in plain words the reservations and cautions.
#pragma once

#include "registry/source.hpp"

#include <string>
#include <string_view>
#include <vector>

namespace entropy_ledger::functions {

class Remarks {
public:
    // Keeps each source once, in the order of first mention.
    void source(const registry::Source& source, std::string_view state, std::string_view what_it_says_of_it);
    // A source that is no publication, such as "given in the sheet".
    void source(std::string_view text);

    void note(std::string text);    // which data answer; not a reservation
    void reserve(std::string text); // the value is given, with this reservation
    void caution(std::string text); // the state can hurt someone

    // A reservation where a temperature in K is so low that °C may have been meant.
    void ask_about_celsius(std::string_view argument, double kelvin);

    // All sources, separated by "; ".
    std::string sources() const;
    // "ok", or "ok: " with the notes; with cautions or reservations those in its place, cautions first, under
    // "CAUTION: " and "note: ". Cautions refer to the local code and a licensed engineer.
    std::string summary() const;

private:
    static void add(std::vector<std::string>& list, std::string text);
    std::vector<std::string> sources_, notes_, reservations_, cautions_;
};

} // namespace entropy_ledger::functions
