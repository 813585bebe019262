// The computer-program verification tables of the IAPWS releases, to all printed digits.
//
// R7-97 and R10-06 values are written from memory of the releases; python3-iapws gives the same digits
// (water_reference.py computes with it). Of the check values of SR6-08 the temperatures and the enthalpy at 260 K are
// from memory; the other figures are those of python3-iapws 1.5.2, rounded. water_reference.cpp checks the formulation
// further against python3-iapws and, with their deviations, against IAPWS-95 and TEOS-10.
#include "registry/models/iapws_r10.hpp"
#include "registry/models/iapws_r7_region1.hpp"
#include "registry/models/iapws_r7_region2.hpp"
#include "registry/models/iapws_r7_region3.hpp"
#include "registry/models/iapws_r7_region5.hpp"
#include "registry/models/iapws_r7_saturation.hpp"
#include "registry/models/iapws_sr6.hpp"

#include <gtest/gtest.h>

#include <cstdio>
#include <cstdlib>
#include <string>

namespace {

using namespace entropy_ledger::registry;

// A number in the form of the tables, "0.100215168e-2", with as many digits as `printed` has.
std::string rounded(double value, const char* printed)
{
    int digits = 0;
    bool leading = true;
    for (const char* c = printed; *c != '\0' && *c != 'e'; ++c) {
        if (*c == '.' || *c == '-' || (leading && *c == '0'))
            continue;
        leading = false;
        ++digits;
    }
    char text[64];
    std::snprintf(text, sizeof text, "%.*e", digits - 1, value);
    return text;
}

void expect_printed(double value, const char* printed, const char* what)
{
    EXPECT_EQ(rounded(value, printed), rounded(std::strtod(printed, nullptr), printed)) << what;
}

// One column of a table whose state is T and p: kJ units as printed.
struct Column {
    double T; // K
    double p; // MPa
    const char* v;
    const char* h;
    const char* u;
    const char* s;
    const char* cp;
};

template <class Volume, class Enthalpy, class Entropy, class HeatCapacity, class Gibbs>
void expect_column(const Column& c, Volume volume, Enthalpy enthalpy, Entropy entropy, HeatCapacity heat_capacity,
                   Gibbs gibbs_energy)
{
    const double p = c.p * 1e6;
    const double v = volume(c.T, p);
    const double h = enthalpy(c.T, p);
    const double s = entropy(c.T, p);
    expect_printed(v, c.v, "v");
    expect_printed(h / 1e3, c.h, "h");
    if (c.u != nullptr)
        expect_printed((h - p * v) / 1e3, c.u, "u");
    expect_printed(s / 1e3, c.s, "s");
    if (c.cp != nullptr)
        expect_printed(heat_capacity(c.T, p) / 1e3, c.cp, "cp");
    EXPECT_NEAR(gibbs_energy(c.T, p), h - c.T * s, 1e-6) << "g = h - T s";
}

#define EXPECT_COLUMN(column, scope)                                                                                  \
    expect_column(                                                                                                    \
        column, [](double T, double p) { return scope::volume(T, p); },                                               \
        [](double T, double p) { return scope::enthalpy(T, p); },                                                     \
        [](double T, double p) { return scope::entropy(T, p); },                                                      \
        [](double T, double p) { return scope::heat_capacity(T, p); },                                                \
        [](double T, double p) { return scope::gibbs_energy(T, p); })

// R7-97 Table 5
TEST(IapwsR7, Region1Table5)
{
    const Column table[] = {
        {300, 3, "0.100215168e-2", "0.115331273e3", "0.112324818e3", "0.392294792", "0.417301218e1"},
        {300, 80, "0.971180894e-3", "0.184142828e3", "0.106448356e3", "0.368563852", "0.401008987e1"},
        {500, 3, "0.120241800e-2", "0.975542239e3", "0.971934985e3", "0.258041912e1", "0.465580682e1"},
    };
    for (const Column& column : table)
        EXPECT_COLUMN(column, iapws_r7::region1);
}

// R7-97 Table 15
TEST(IapwsR7, Region2Table15)
{
    const Column table[] = {
        {300, 0.0035, "0.394913866e2", "0.254991145e4", "0.241169160e4", "0.852238967e1", "0.191300162e1"},
        {700, 0.0035, "0.923015898e2", "0.333568375e4", "0.301262819e4", "0.101749996e2", "0.208141274e1"},
        {700, 30, "0.542946619e-2", "0.263149474e4", "0.246861076e4", "0.517540298e1", "0.103505092e2"},
    };
    for (const Column& column : table)
        EXPECT_COLUMN(column, iapws_r7::region2::Equation);
}

// R7-97 Table 18
TEST(IapwsR7, MetastableVapourTable18)
{
    const Column table[] = {
        {450, 1, "0.192516540", "0.276881115e4", nullptr, "0.656660377e1", nullptr},
        {440, 1, "0.186212297", "0.274015123e4", nullptr, "0.650218759e1", nullptr},
        {450, 1.5, "0.121685206", "0.272134539e4", nullptr, "0.629170440e1", nullptr},
    };
    for (const Column& column : table)
        EXPECT_COLUMN(column, iapws_r7::metastable_vapour::Equation);
}

// R7-97 Table 33
TEST(IapwsR7, Region3Table33)
{
    struct {
        double T;       // K
        double density; // kg/m3
        const char* p;
        const char* h;
        const char* s;
        const char* cp;
    } const table[] = {
        {650, 500, "0.255837018e2", "0.186343019e4", "0.405427273e1", "0.138935717e2"},
        {650, 200, "0.222930643e2", "0.237512401e4", "0.485438792e1", "0.446579342e2"},
        {750, 500, "0.783095639e2", "0.225868845e4", "0.446971906e1", "0.634165359e1"},
    };
    for (const auto& column : table) {
        const iapws_r7::region3::State<double> state(column.density, column.T);
        expect_printed(state.pressure() / 1e6, column.p, "p");
        expect_printed(state.enthalpy() / 1e3, column.h, "h");
        expect_printed(state.entropy() / 1e3, column.s, "s");
        expect_printed(state.heat_capacity() / 1e3, column.cp, "cp");
        EXPECT_NEAR(state.gibbs_energy(), state.enthalpy() - column.T * state.entropy(), 1e-6);
    }
}

// R7-97 Table 42
TEST(IapwsR7, Region5Table42)
{
    const Column table[] = {
        {1500, 0.5, "0.138455090e1", "0.521976855e4", "0.452749310e4", "0.965408875e1", "0.261609445e1"},
        {1500, 30, "0.230761299e-1", "0.516723514e4", "0.447495124e4", "0.772970133e1", "0.272724317e1"},
        {2000, 30, "0.311385219e-1", "0.657122604e4", "0.563707038e4", "0.853640523e1", "0.288569882e1"},
    };
    for (const Column& column : table)
        EXPECT_COLUMN(column, iapws_r7::region5);
}

// R7-97 Table 35, saturation pressure
TEST(IapwsR7, SaturationPressureTable35)
{
    expect_printed(iapws_r7::saturation_pressure(300.0) / 1e6, "0.353658941e-2", "300 K");
    expect_printed(iapws_r7::saturation_pressure(500.0) / 1e6, "0.263889776e1", "500 K");
    expect_printed(iapws_r7::saturation_pressure(600.0) / 1e6, "0.123443146e2", "600 K");
}

// R7-97 Table 36, saturation temperature
TEST(IapwsR7, SaturationTemperatureTable36)
{
    expect_printed(iapws_r7::saturation_temperature(0.1e6), "0.372755919e3", "0.1 MPa");
    expect_printed(iapws_r7::saturation_temperature(1e6), "0.453035632e3", "1 MPa");
    expect_printed(iapws_r7::saturation_temperature(10e6), "0.584149488e3", "10 MPa");
}

// R7-97 section 4: the boundary between regions 2 and 3
TEST(IapwsR7, Boundary23)
{
    expect_printed(iapws_r7::boundary_23_pressure(623.15) / 1e6, "0.165291643e2", "623.15 K");
    expect_printed(iapws_r7::boundary_23_temperature(0.165291643e8), "0.623150000e3", "16.5291643 MPa");
}

// SR6-08, check values at 0.1 MPa
TEST(IapwsSr6, CheckValues)
{
    struct {
        double T; // K
        const char* g;
        const char* v;
        const char* s;
        const char* h;
        const char* cp;
    } const table[] = {
        {260.0, "-0.126598915e4", "0.100294026e-2", "-0.209985548e3", "-0.558622317e5", "0.430017472e4"},
        {298.15, "-0.456175371e4", "0.100296173e-2", "0.367201448e3", "0.104919358e6", "0.418144618e4"},
        {375.0, "-0.710588021e5", "0.104492148e-2", "0.132806616e4", "0.426966009e6", "0.421774697e4"},
    };
    for (const auto& row : table) {
        expect_printed(iapws_sr6::gibbs_energy(row.T, 1e5), row.g, "g");
        expect_printed(iapws_sr6::volume(row.T), row.v, "v");
        expect_printed(iapws_sr6::entropy(row.T, 1e5), row.s, "s");
        expect_printed(iapws_sr6::enthalpy(row.T, 1e5), row.h, "h");
        expect_printed(iapws_sr6::heat_capacity(row.T, 1e5), row.cp, "cp");
    }
}

// R10-06 Table 6
TEST(IapwsR10, Table6)
{
    struct {
        double T; // K
        double p; // Pa
        const char* g;
        const char* v;
        const char* s;
        const char* cp;
        const char* h;
    } const table[] = {
        {273.16, 611.657, "0.611784135", "0.109085812737e-2", "-0.122069433940e4", "0.209678431622e4",
         "-0.333444253966e6"},
        {273.152519, 101325, "0.10134274069e3", "0.109084388214e-2", "-0.122076932550e4", "0.209671391024e4",
         "-0.333354873637e6"},
        {100, 100e6, "-0.222296513088e6", "0.106193389260e-2", "-0.261195122589e4", "0.866333195517e3",
         "-0.483491635676e6"},
    };
    for (const auto& column : table) {
        expect_printed(iapws_r10::gibbs_energy(column.T, column.p), column.g, "g");
        expect_printed(iapws_r10::volume(column.T, column.p), column.v, "v");
        expect_printed(iapws_r10::entropy(column.T, column.p), column.s, "s");
        expect_printed(iapws_r10::heat_capacity(column.T, column.p), column.cp, "cp");
        expect_printed(iapws_r10::enthalpy(column.T, column.p), column.h, "h");
    }
}

} // namespace
