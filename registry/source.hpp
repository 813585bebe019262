// Citations of the property data.
#pragma once

#include <string_view>

namespace entropy_ledger::registry {

struct Source {
    std::string_view key;       // short and stable: "IAPWS R7-97"
    std::string_view citation;  // full
};

namespace sources {
inline constexpr Source iapws_r7{"IAPWS R7-97",
    "IAPWS R7-97(2012), Revised Release on the IAPWS Industrial Formulation 1997 for the Thermodynamic Properties of "
    "Water and Steam"};
inline constexpr Source iapws_sr6{"IAPWS SR6-08",
    "IAPWS SR6-08(2011), Revised Supplementary Release on Properties of Liquid Water at 0.1 MPa"};
inline constexpr Source iapws_r10{"IAPWS R10-06",
    "IAPWS R10-06(2009), Revised Release on the Equation of State 2006 for H2O Ice Ih"};
inline constexpr Source nasa_glenn{"NASA/TP-2002-211556",
    "B. J. McBride, M. J. Zehe, S. Gordon, NASA Glenn Coefficients for Calculating Thermodynamic Properties of "
    "Individual Species, NASA/TP-2002-211556 (2002), data set revision of 9/09/04"};
} // namespace sources

} // namespace entropy_ledger::registry
