// Sources of the factors, named beside each:
//   SI      BIPM, The International System of Units (SI Brochure), 9th ed., 2019: tables 4, 7 and 8, section 2.3.1.
//   SP811   A. Thompson, B. N. Taylor, NIST Special Publication 811, 2008 edition, appendix B.
//   UCUM    The Unified Code for Units of Measure, https://ucum.org: also the origin of the codes.
// They are written from memory; tests/unit/units.cpp checks them against the decimals published in SP811 and against
// Boost.Units where it has the unit. Most are exact by definition and are written as whole numbers with a power of ten.
#include "functions/unit_table.hpp"

#include <array>
#include <cstddef>
#include <cstdint>

namespace entropy_ledger::functions {

namespace {

using namespace dimensions;

constexpr Dimension frequency{0, 0, -1, 0, 0};

constexpr Unit plain(Dimension dimension, int power_of_ten = 0, double numerator = 1.0, double denominator = 1.0)
{
    return {dimension, power_of_ten, numerator, denominator, 0.0, 0.0};
}

// Exact definitions that several units share (SP811, B.8 and footnotes):
// pound 0.45359237 kg, standard gravity 9.80665 m/s2, hence pound-force 4.4482216152605 N; inch 0.0254 m.
constexpr double pound_e8 = 45359237.0;
constexpr double pound_force_e13 = 44482216152605.0;
// Conventional millimetre of mercury: 13595.1 kg/m3 * 9.80665 m/s2 * 0.001 m = 133.322387415 Pa (SP811, B.8: 133.3224).
constexpr double metre_of_mercury_e6 = 133322387415.0;
constexpr double btu_it_e8 = 105505585262.0;

// SI 2.3.1: t/°C = T/K - 273.15. SP811, B.8: t/°C = (t/°F - 32)/1.8; T/K = (T/°R)/1.8.
constexpr Unit celsius{temperature, 0, 1.0, 1.0, 0.0, 273.15};
constexpr Unit fahrenheit{temperature, 0, 5.0, 9.0, 32.0, 273.15};
constexpr Unit rankine = plain(temperature, 0, 5.0, 9.0);
constexpr Unit mercury = plain(pressure, -6, metre_of_mercury_e6);
constexpr Unit inch_of_mercury = plain(pressure, -10, metre_of_mercury_e6 * 254.0);
constexpr Unit metre_of_water = plain(pressure, -2, 980665.0);          // 1000 kg/m3 * 9.80665 m/s2 * 1 m
constexpr Unit inch_of_water = plain(pressure, -6, 980665.0 * 254.0);
constexpr Unit psi = plain(pressure, -5, pound_force_e13, 254.0 * 254.0);
constexpr Unit technical_atmosphere = plain(pressure, -1, 980665.0);
constexpr Unit btu_it = plain(energy, -8, btu_it_e8);
constexpr Unit btu_th = plain(energy, -2, 105435.0);
constexpr Unit pound = plain(mass, -8, pound_e8);
constexpr Unit tonne = plain(mass, 3);
constexpr Unit litre = plain(volume, -3);
constexpr Unit inch = plain(length, -4, 254.0);
constexpr Unit foot = plain(length, -4, 3048.0);
constexpr Unit hour = plain(duration, 0, 3600.0);
constexpr Unit day = plain(duration, 0, 86400.0);

constexpr std::array units{
    // Base units (SI 2.3.1); the gram stands for the kilogram, as in UCUM, so that it takes the prefixes.
    NamedUnit{"m", Prefixes::all, plain(length)},
    NamedUnit{"s", Prefixes::all, plain(duration)},
    NamedUnit{"g", Prefixes::all, plain(mass, -3)},
    NamedUnit{"K", Prefixes::all, plain(temperature)},
    NamedUnit{"mol", Prefixes::all, plain(amount_of_substance)},
    NamedUnit{"°K", Prefixes::none, plain(temperature)},  // spelling given up in 1967, still met
    NamedUnit{"sec", Prefixes::none, plain(duration)},        // usual spelling

    // Coherent derived units with special names (SI table 4).
    NamedUnit{"Hz", Prefixes::all, plain(frequency)},
    NamedUnit{"N", Prefixes::all, plain(force)},
    NamedUnit{"Pa", Prefixes::all, plain(pressure)},
    NamedUnit{"J", Prefixes::all, plain(energy)},
    NamedUnit{"W", Prefixes::all, plain(power)},

    // Temperature scales.
    NamedUnit{"Cel", Prefixes::none, celsius},
    NamedUnit{"°C", Prefixes::none, celsius},
    NamedUnit{"degC", Prefixes::none, celsius},
    NamedUnit{"[degF]", Prefixes::none, fahrenheit},
    NamedUnit{"°F", Prefixes::none, fahrenheit},
    NamedUnit{"degF", Prefixes::none, fahrenheit},
    NamedUnit{"[degR]", Prefixes::none, rankine},
    NamedUnit{"°R", Prefixes::none, rankine},
    NamedUnit{"degR", Prefixes::none, rankine},

    // Time (SI table 8; weeks and years UCUM: the year is the Julian year of 365.25 d).
    NamedUnit{"min", Prefixes::none, plain(duration, 0, 60.0)},
    NamedUnit{"h", Prefixes::none, hour},
    NamedUnit{"hr", Prefixes::none, hour},
    NamedUnit{"d", Prefixes::none, day},
    NamedUnit{"day", Prefixes::none, day},
    NamedUnit{"wk", Prefixes::none, plain(duration, 0, 604800.0)},
    NamedUnit{"a", Prefixes::none, plain(duration, 0, 31557600.0)},
    NamedUnit{"a_j", Prefixes::none, plain(duration, 0, 31557600.0)},

    // Length and volume (SI table 8; SP811, B.8: international inch, foot, yard; gallons 231 in3 and 4.546 09 L).
    NamedUnit{"[in_i]", Prefixes::none, inch},
    NamedUnit{"in", Prefixes::none, inch},
    NamedUnit{"[ft_i]", Prefixes::none, foot},
    NamedUnit{"ft", Prefixes::none, foot},
    NamedUnit{"[yd_i]", Prefixes::none, plain(length, -4, 9144.0)},
    NamedUnit{"L", Prefixes::all, litre},
    NamedUnit{"l", Prefixes::all, litre},
    NamedUnit{"[cin_i]", Prefixes::none, plain(volume, -12, 16387064.0)},
    NamedUnit{"[cft_i]", Prefixes::none, plain(volume, -12, 28316846592.0)},
    NamedUnit{"[gal_us]", Prefixes::none, plain(volume, -12, 3785411784.0)},
    NamedUnit{"[gal_br]", Prefixes::none, plain(volume, -8, 454609.0)},

    // Mass (SI table 8; SP811, B.8: avoirdupois pound, ounce 1/16 lb, grain 1/7000 lb, tons of 2000 lb and 2240 lb).
    NamedUnit{"t", Prefixes::multiples, tonne},
    NamedUnit{"tonne", Prefixes::none, tonne},
    NamedUnit{"tonnes", Prefixes::none, tonne},
    NamedUnit{"[lb_av]", Prefixes::none, pound},
    NamedUnit{"lb", Prefixes::none, pound},
    NamedUnit{"lbs", Prefixes::none, pound},
    NamedUnit{"lbm", Prefixes::none, pound},
    NamedUnit{"[oz_av]", Prefixes::none, plain(mass, -8, pound_e8, 16.0)},
    NamedUnit{"[gr]", Prefixes::none, plain(mass, -11, 6479891.0)},
    NamedUnit{"[ston_av]", Prefixes::none, plain(mass, -8, pound_e8 * 2000.0)},
    NamedUnit{"[lton_av]", Prefixes::none, plain(mass, -8, pound_e8 * 2240.0)},

    // Amount of substance: the pound-mole has as many moles as the pound has grams.
    NamedUnit{"lbmol", Prefixes::none, plain(amount_of_substance, -5, pound_e8)},

    // Force (SP811, B.8; g_n = 9.80665 m/s2 exactly).
    NamedUnit{"dyn", Prefixes::all, plain(force, -5)},
    NamedUnit{"gf", Prefixes::all, plain(force, -8, 980665.0)},
    NamedUnit{"[lbf_av]", Prefixes::none, plain(force, -13, pound_force_e13)},
    NamedUnit{"lbf", Prefixes::none, plain(force, -13, pound_force_e13)},

    // Pressure (bar: SI 4; atm 101 325 Pa, Torr atm/760, at = kgf/cm2, psi = lbf/in2: SP811, B.8).
    // Columns of mercury and water are the conventional ones of SP811, B.8. UCUM rounds m[Hg] to 133.322 kPa, which is
    // smaller by 2.9 parts in a million.
    NamedUnit{"bar", Prefixes::all, plain(pressure, 5)},
    NamedUnit{"atm", Prefixes::none, plain(pressure, 0, 101325.0)},
    NamedUnit{"att", Prefixes::none, technical_atmosphere},
    NamedUnit{"[psi]", Prefixes::none, psi},
    NamedUnit{"psi", Prefixes::none, psi},
    NamedUnit{"Torr", Prefixes::none, plain(pressure, 0, 101325.0, 760.0)},
    NamedUnit{"torr", Prefixes::none, plain(pressure, 0, 101325.0, 760.0)},
    NamedUnit{"m[Hg]", Prefixes::all, mercury},
    NamedUnit{"mHg", Prefixes::all, mercury},
    NamedUnit{"m[H2O]", Prefixes::all, metre_of_water},
    NamedUnit{"mH2O", Prefixes::all, metre_of_water},
    NamedUnit{"[in_i'Hg]", Prefixes::none, inch_of_mercury},
    NamedUnit{"inHg", Prefixes::none, inch_of_mercury},
    NamedUnit{"[in_i'H2O]", Prefixes::none, inch_of_water},
    NamedUnit{"inH2O", Prefixes::none, inch_of_water},

    // Energy. Watt-hour 3600 J; erg 1e-7 J; electronvolt 1.602 176 634e-19 J (SI table 8, exact since 2019).
    // "cal" is the thermochemical calorie 4.184 J, as in UCUM; steam tables used the International Table calorie,
    // 4.1868 J, code cal_IT (SP811, B.8, both exact).
    NamedUnit{"Wh", Prefixes::all, plain(energy, 0, 3600.0)},
    NamedUnit{"erg", Prefixes::all, plain(energy, -7)},
    NamedUnit{"eV", Prefixes::all, plain(energy, -28, 1602176634.0)},
    NamedUnit{"cal", Prefixes::all, plain(energy, -3, 4184.0)},
    NamedUnit{"cal_th", Prefixes::all, plain(energy, -3, 4184.0)},
    NamedUnit{"cal_IT", Prefixes::all, plain(energy, -4, 41868.0)},
    // British thermal units. The UCUM code [Btu] stands for [Btu_th], there 1.054 350 kJ (SP811, B.8: 1.054 350 E+03),
    // rounded from 4.184 J * 453.592 37 * 5/9 = 1054.350 26 J.
    // The symbol "Btu" in engineering use means the International Table unit, 1055.055 852 62 J (SP811, B.8,
    // footnote 9), so that is what it means here: the code and the symbol differ by 0.067 %, on purpose.
    NamedUnit{"[Btu]", Prefixes::none, btu_th},
    NamedUnit{"[Btu_th]", Prefixes::none, btu_th},
    NamedUnit{"[Btu_IT]", Prefixes::none, btu_it},
    NamedUnit{"Btu", Prefixes::none, btu_it},
    NamedUnit{"BTU", Prefixes::none, btu_it},
    NamedUnit{"kBtu", Prefixes::none, plain(energy, -5, btu_it_e8)},
    NamedUnit{"MMBtu", Prefixes::none, plain(energy, -2, btu_it_e8)},
    NamedUnit{"MMBTU", Prefixes::none, plain(energy, -2, btu_it_e8)},

    // Power: mechanical horsepower, 550 ft.lbf/s = 745.6999 W (SP811, B.8; UCUM).
    NamedUnit{"[HP]", Prefixes::none, plain(power, -15, pound_force_e13 * 16764.0)},

    // Numbers.
    NamedUnit{"%", Prefixes::none, plain(dimensionless, -2)},
    NamedUnit{"[ppm]", Prefixes::none, plain(dimensionless, -6)},
    NamedUnit{"ppm", Prefixes::none, plain(dimensionless, -6)},
};

struct Prefix {
    std::string_view symbol;
    int power_of_ten;
};

// SI table 7. "u" stands for µ, as in UCUM; the reader turns µ into it.
constexpr std::array prefix_list{
    Prefix{"Y", 24},  Prefix{"Z", 21},  Prefix{"E", 18},  Prefix{"P", 15},   Prefix{"T", 12},
    Prefix{"G", 9},   Prefix{"M", 6},   Prefix{"k", 3},   Prefix{"h", 2},    Prefix{"da", 1},
    Prefix{"d", -1},  Prefix{"c", -2},  Prefix{"m", -3},  Prefix{"u", -6},   Prefix{"n", -9},
    Prefix{"p", -12}, Prefix{"f", -15}, Prefix{"a", -18}, Prefix{"z", -21},  Prefix{"y", -24},
};

// Names that mean several things, or something else than their writer means.
struct Advice {
    std::string_view name;
    std::string_view reason;
};

constexpr std::array advice_list{
    Advice{"C", "\"C\" is the coulomb: write °C"},
    Advice{"F", "\"F\" is the farad: write °F"},
    Advice{"deg", "write °C or °F, or the codes Cel or [degF]"},
    Advice{"°", "\"°\" is a plane angle: write °C or °F"},
    Advice{"Cal", "\"Cal\" has been used for the kilocalorie: write cal or kcal"},
    Advice{"MBtu", "\"MBtu\" may be a thousand or a million Btu: write kBtu or MMBtu"},
    Advice{"MBTU", "\"MBTU\" may be a thousand or a million Btu: write kBtu or MMBtu"},
    Advice{"ton", "there are several tons: write t, [ston_av] (2000 lb) or [lton_av] (2240 lb)"},
    Advice{"tons", "there are several tons: write t, [ston_av] (2000 lb) or [lton_av] (2240 lb)"},
    Advice{"hp", "there are several horsepowers: write kW, or [HP] for 550 ft.lbf/s"},
    Advice{"HP", "there are several horsepowers: write kW, or [HP] for 550 ft.lbf/s"},
    Advice{"gal", "there are several gallons: write L, [gal_us] or [gal_br]"},
    Advice{"at", "write att (kgf/cm2) or atm"},
    Advice{"Nm", "write N.m, or m3 for a volume"},
    Advice{"yr", "write the code a for 365.25 d, or 8760 h"},
    Advice{"year", "write the code a for 365.25 d, or 8760 h"},
    Advice{"[psig]", "gauge pressure: give absolute pressure"},
};

// The most usual texts in full, so that they need no reading: up to eight bytes compared as one number.
constexpr std::uint64_t packed(std::string_view text)
{
    std::uint64_t value = 0;
    for (const char c : text)
        value = (value << 8) | static_cast<unsigned char>(c);
    return value;
}

struct UsualUnit {
    std::uint64_t text;
    Unit unit;
};

constexpr std::array usual_units{
    UsualUnit{packed("°C"), celsius},
    UsualUnit{packed("K"), plain(temperature)},
    UsualUnit{packed("bar"), plain(pressure, 5)},
    UsualUnit{packed("kg"), plain(mass)},
    UsualUnit{packed("kg/s"), plain(mass_rate)},
    UsualUnit{packed("kW"), plain(power, 3)},
    UsualUnit{packed("kJ"), plain(energy, 3)},
    UsualUnit{packed("mol"), plain(amount_of_substance)},
    UsualUnit{packed("kPa"), plain(pressure, 3)},
    UsualUnit{packed("kJ/K"), plain(heat_capacity, 3)},
    UsualUnit{packed("W"), plain(power)},
    UsualUnit{packed("J"), plain(energy)},
};

constexpr std::uint32_t hash(std::string_view name)  // FNV-1a, 32 bit
{
    std::uint32_t value = 2166136261u;
    for (const char c : name)
        value = (value ^ static_cast<unsigned char>(c)) * 16777619u;
    return value ^ (value >> 15);
}

// Open addressing: index + 1 into `units`, 0 where free. Built by the compiler, which also refuses a name given twice.
constexpr std::size_t slots = 512;
static_assert(units.size() < 255 && units.size() * 2 < slots);

consteval std::array<std::uint8_t, slots> make_index()
{
    std::array<std::uint8_t, slots> index{};
    for (std::size_t i = 0; i < units.size(); ++i) {
        std::size_t slot = hash(units[i].name) % slots;
        while (index[slot] != 0) {
            if (units[index[slot] - 1u].name == units[i].name)
                throw "a unit is named twice";
            slot = (slot + 1) % slots;
        }
        index[slot] = static_cast<std::uint8_t>(i + 1);
    }
    return index;
}

constexpr auto index_of_units = make_index();

const NamedUnit* find_named_unit(std::string_view name)
{
    for (std::size_t slot = hash(name) % slots; index_of_units[slot] != 0; slot = (slot + 1) % slots) {
        const NamedUnit& candidate = units[index_of_units[slot] - 1u];
        if (candidate.name == name)
            return &candidate;
    }
    return nullptr;
}

bool takes(const NamedUnit& named, const Prefix& prefix)
{
    return named.prefixes == Prefixes::all || (named.prefixes == Prefixes::multiples && prefix.power_of_ten > 0);
}

constexpr char lower(char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c; }

bool same_but_for_case(std::string_view a, std::string_view b)
{
    if (a.size() != b.size())
        return false;
    for (std::size_t i = 0; i < a.size(); ++i)
        if (lower(a[i]) != lower(b[i]))
            return false;
    return true;
}

} // namespace

std::span<const NamedUnit> named_units() noexcept { return units; }

bool find_unit(std::string_view name, Unit& unit) noexcept
{
    if (const NamedUnit* named = find_named_unit(name)) {
        unit = named->unit;
        return true;
    }
    for (const Prefix& prefix : prefix_list) {
        if (!name.starts_with(prefix.symbol))
            continue;
        const NamedUnit* named = find_named_unit(name.substr(prefix.symbol.size()));
        if (!named || !takes(*named, prefix))
            continue;
        unit = named->unit;
        unit.power_of_ten += prefix.power_of_ten;
        return true;
    }
    return false;
}

const Unit* find_usual_unit(std::string_view text) noexcept
{
    if (text.size() > 8 || text.starts_with('\0'))  // a NUL in front would vanish in packed()
        return nullptr;
    const std::uint64_t key = packed(text);
    for (const UsualUnit& usual : usual_units)
        if (usual.text == key)
            return &usual.unit;
    return nullptr;
}

Spelling right_spelling(std::string_view name) noexcept
{
    Spelling found;
    Unit meant;
    bool several = false;
    const auto consider = [&](const Spelling& spelling, const Unit& unit) {
        if (found.name.empty()) {
            found = spelling;
            meant = unit;
        }
        several = several || !(meant == unit);
    };
    for (const NamedUnit& named : units) {
        if (same_but_for_case(name, named.name))
            consider({{}, named.name}, named.unit);
        if (name.size() <= named.name.size())
            continue;
        const std::string_view head = name.substr(0, name.size() - named.name.size());
        if (!same_but_for_case(name.substr(head.size()), named.name))
            continue;
        for (const Prefix& prefix : prefix_list) {
            if (!takes(named, prefix) || !same_but_for_case(head, prefix.symbol))
                continue;
            Unit unit = named.unit;
            unit.power_of_ten += prefix.power_of_ten;
            consider({prefix.symbol, named.name}, unit);
        }
    }
    return several ? Spelling{} : found;
}

std::string_view advice_on(std::string_view name) noexcept
{
    for (const Advice& advice : advice_list)
        if (advice.name == name)
            return advice.reason;
    return {};
}

} // namespace entropy_ledger::functions
