#include "functions/remarks.hpp"

#include "functions/wording.hpp"

#include <algorithm>

namespace entropy_ledger::functions {

namespace {

std::string joined(const std::vector<std::string>& list)
{
    std::string text;
    for (const std::string& item : list)
        text += (text.empty() ? "" : "; ") + item;
    return text;
}

} // namespace

void Remarks::add(std::vector<std::string>& list, std::string text)
{
    if (std::find(list.begin(), list.end(), text) == list.end())
        list.push_back(std::move(text));
}

void Remarks::source(const registry::Source& source, std::string_view state, std::string_view what_it_says_of_it)
{
    add(sources_, std::string(source.citation));
    if (!what_it_says_of_it.empty())
        add(sources_, std::string(state) + ": " + std::string(what_it_says_of_it));
}

void Remarks::source(std::string_view text) { add(sources_, std::string(text)); }
void Remarks::note(std::string text) { add(notes_, std::move(text)); }
void Remarks::reserve(std::string text) { add(reservations_, std::move(text)); }
void Remarks::caution(std::string text) { add(cautions_, std::move(text)); }

void Remarks::ask_about_celsius(std::string_view argument, double kelvin)
{
    constexpr double coldest_usual = 120.0; // K; common practice, no source
    if (kelvin < coldest_usual)
        reserve(std::string(argument) + " is " + shown_temperature(kelvin) + ", perhaps meant in °C");
}

std::string Remarks::sources() const { return joined(sources_); }

std::string Remarks::summary() const
{
    std::string text;
    const auto sentence = [&](const char* opening, const std::vector<std::string>& list) {
        if (!list.empty())
            text += (text.empty() ? "" : ". ") + std::string(opening) + joined(list);
    };
    sentence("CAUTION: ", cautions_);
    if (!cautions_.empty())
        text += "; follow the local code and a licensed engineer";
    sentence("note: ", reservations_);
    if (text.empty())
        text = "ok";
    if (!notes_.empty())
        text += (text == "ok" ? ": " : ". ") + joined(notes_);
    return text;
}

} // namespace entropy_ledger::functions
