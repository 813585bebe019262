// The water models against python3-iapws and python3-gsw on random states: 1e-9 relative where the formulation is the
// same, the stated deviation where it is another one. The file is written by water_reference.py, see water.cmake.
#include "registry/models/ice.hpp"
#include "registry/models/iapws_sr6.hpp"
#include "registry/models/liquid_water.hpp"
#include "registry/models/steam.hpp"

#include <gtest/gtest.h>

#include <cstdlib>
#include <fstream>
#include <functional>
#include <map>
#include <sstream>
#include <string>

namespace {

using namespace entropy_ledger::registry;
using Function = std::function<double(double T, double p)>;

#define SCOPE(name, scope)                                                                                            \
    {name ".entropy", [](double T, double p) { return scope::entropy(T, p); }},                                       \
    {name ".enthalpy", [](double T, double p) { return scope::enthalpy(T, p); }},                                     \
    {name ".heat_capacity", [](double T, double p) { return scope::heat_capacity(T, p); }}

#define MODEL(name, model)                                                                                            \
    {name ".entropy", [](double T, double p) { return model().entropy(T, p); }},                                      \
    {name ".enthalpy", [](double T, double p) { return model().enthalpy(T, p); }},                                    \
    {name ".heat_capacity", [](double T, double p) { return model().heat_capacity(T, p); }}

const std::map<std::string, Function>& functions()
{
    static const std::map<std::string, Function> table{
        SCOPE("region1", iapws_r7::region1),
        SCOPE("region2", iapws_r7::region2::Equation),
        SCOPE("region5", iapws_r7::region5),
        SCOPE("sr6", iapws_sr6),
        SCOPE("ice", iapws_r10),
        MODEL("region3", LiquidWater),
        MODEL("region3_liquid", LiquidWater),
        MODEL("region3_vapour", Steam),
        MODEL("liquid", LiquidWater),
        {"region1.volume", [](double T, double p) { return iapws_r7::region1::volume(T, p); }},
        {"region2.volume", [](double T, double p) { return iapws_r7::region2::Equation::volume(T, p); }},
        {"region5.volume", [](double T, double p) { return iapws_r7::region5::volume(T, p); }},
        {"sr6.volume", [](double T, double) { return iapws_sr6::volume(T); }},
        {"ice.volume", [](double T, double p) { return iapws_r10::volume(T, p); }},
        {"saturation_pressure", [](double T, double) { return iapws_r7::saturation_pressure(T); }},
        {"saturation_temperature", [](double, double p) { return iapws_r7::saturation_temperature(p); }},
    };
    return table;
}

TEST(WaterReference, AgreesWithIndependentPrograms)
{
    std::ifstream file(WATER_REFERENCE_FILE);
    ASSERT_TRUE(file.is_open()) << WATER_REFERENCE_FILE;
    std::map<std::string, int> seen;
    std::string line;
    while (std::getline(file, line)) {
        std::istringstream fields(line);
        std::string what;
        std::string number[4];
        std::getline(fields, what, ',');
        for (std::string& n : number)
            std::getline(fields, n, ',');
        const double T = std::strtod(number[0].c_str(), nullptr);
        const double p = std::strtod(number[1].c_str(), nullptr);
        const double value = std::strtod(number[2].c_str(), nullptr);
        const double tolerance = std::strtod(number[3].c_str(), nullptr);
        ++seen[what];
        if (what == "melting") {
            // the end of the fit lies on the melting curve or up to 0.022 K above
            const double end = IceIh().limits(p).fit.upper;
            EXPECT_GE(end, T - 1e-9) << line;
            EXPECT_LE(end, T + tolerance) << line;
            continue;
        }
        if (what == "sublimation") {
            EXPECT_TRUE(Steam().limits(p).trust.contains(T)) << line;
            continue;
        }
        const auto function = functions().find(what);
        ASSERT_NE(function, functions().end()) << what;
        EXPECT_NEAR(function->second(T, p), value, tolerance) << line;
    }
    for (const auto& [name, function] : functions())
        EXPECT_GE(seen[name], 50) << name;
    EXPECT_EQ(seen["melting"], 200);
    EXPECT_EQ(seen["sublimation"], 100);
}

} // namespace
