"""Carries the NASA Glenn thermodynamic set over into the registry's own form.

Usage: carry_over_nasa.py PUBLISHED_SET DATA_FILE [FINGERPRINT_FILE]

Source: B. J. McBride, M. J. Zehe, S. Gordon, NASA Glenn Coefficients for Calculating Thermodynamic Properties of
Individual Species, NASA/TP-2002-211556 (2002), revision of 9/09/04, in its published fixed-column form.
DATA_FILE is written in the form described in data/README.md. Every neutral species with a heat capacity is taken; ions,
the electron and records without a heat capacity are left out. Each coefficient keeps its published digits.
FINGERPRINT_FILE holds a checksum of each published interval, for the test that everything came over.

Run once for a revision of the set; the results are kept in the repository.
"""
import math
import re
import sys
from dataclasses import dataclass, field
from decimal import Decimal

# Names that the 18 columns of the source cut short, in full.
FULL_NAMES = {
    "C2H4O,ethylen-o": "C2H4O,ethylene-oxide",
    "C3H3,1-propynl": "C3H3,1-propynyl",
    "C3H3,2-propynl": "C3H3,2-propynyl",
    "C3H4,cyclo-": "C3H4,cyclopropene",
    "C3H6,cyclo-": "C3H6,cyclopropane",
    "C3H6O,propylox": "C3H6O,propylene-oxide",
    "C3H8O,1propanol": "C3H8O,1-propanol",
    "C3H8O,2propanol": "C3H8O,2-propanol",
    "C4H4,1,3-cyclo-": "C4H4,1,3-cyclobutadiene",
    "C4H6,1butyne": "C4H6,1-butyne",
    "C4H6,2butyne": "C4H6,2-butyne",
    "C4H6,butadiene": "C4H6,1,3-butadiene",
    "C4H6,cyclo-": "C4H6,cyclobutene",
    "C4H8,cis2-buten": "C4H8,cis-2-butene",
    "C4H8,cyclo-": "C4H8,cyclobutane",
    "C4H8,tr2-butene": "C4H8,trans-2-butene",
    "C5H10,cyclo-": "C5H10,cyclopentane",
    "C5H6,1,3cyclo-": "C5H6,1,3-cyclopentadiene",
    "C5H8,cyclo-": "C5H8,cyclopentene",
    "C6H10,cyclo-": "C6H10,cyclohexene",
    "C6H12,cyclo-": "C6H12,cyclohexane",
    "C7H16,2-methylh": "C7H16,2-methylhexane",
    "C7H8O,cresol-mx": "C7H8O,cresol-mixture",
    "C8H10,ethylbenz": "C8H10,ethylbenzene",
    "C10H8,naphthale": "C10H8,naphthalene",
    "C12H9,o-bipheny": "C12H9,o-biphenylyl",
    "HCHO,formaldehy": "HCHO,formaldehyde",
    "Fe.947O": "Fe0.947O",
    "Air": "air",
}

# Modifications of crystals by the source's designation. Letters count up from the form stable at low temperature, or
# down; where the source's comment has the Greek letter, the comment is followed.
LETTERS = {"a": "alpha", "b": "beta", "c": "gamma", "d": "delta", "a'": "alpha'"}
DESIGNATIONS = {
    "cr": "", "gr": "graphite", "an": "andalusite", "a-qz": "alpha-quartz", "b-qz": "beta-quartz",
    "b-crt": "beta-cristobalite", "II-r": "red", "I-y": "yellow", "crI": "I", "crII": "II", "III,II": "III-II",
}
SYSTEMS = ("cubic", "tetragonal", "rhombic", "hexagonal", "monoclinic", "triclinic")

# One phase under two designations: cut at 298.15 K, where h, s and cp are continuous. The comment of the first names
# both forms, since its fit also covers the form below about 230 K.
ONE_PHASE = {("KOH", "a"): "b"}

# AlN(L) begins at 1800 K with an interval that continues the crystal in h, s and cp; h rises by 68 kJ/mol at 2700 K
# only. That interval is the crystal's.
OF_THE_CRYSTAL = {"ALN(L)": 1}

# Liquids whose lower end is no melting temperature, so that the rule for undercooling does not hold.
NOT_FROM_MELTING = {"SCL2(L)", "S2CL2(L)", "Jet-A(L)", "N2H4(L)"}

# Where two records leave a gap or overlap: the temperature at which their Gibbs energies meet, K. Mg(OH)2: the liquid
# continues the curve of the crystal across the gap, without an enthalpy of melting; no transition.
MEET_AT = {"LiNO3": "526.000", "Mg(OH)2": None, "Mg2SiO4": "2171.000", "SiC": "3103.000", "SrCl2": "990.000"}

# How far a fit is trusted. Assigned by this project, no source, except where a comment says otherwise.
BESIDE_CRYSTAL = Decimal("0.05")     # of a crystal's bound, except above its last
ABOVE_LAST_CRYSTAL = Decimal("0.02")  # superheating of a crystal is rare
LEAST_MARGIN = Decimal(5)            # K
UNDERCOOLED_TO = Decimal("0.78")     # of the melting temperature; clean melts reach about 0.8: common practice
ABOVE_LIQUID = Decimal("0.05")
LEAST_GROWTH = 0.0005                # of the heat capacity's relative uncertainty, 1/K
MOST_MISSED = 0.25                   # of the heat capacity, by holding it where the fit has a slope

# The heat capacity of supercooled water rises steeply: trusted as far down as IAPWS SR6-08 goes, where its cp is 2.6 %
# above that at 273.15 K. At its other end the fit nears the critical point: not trusted beyond.
WATER_LIQUID = ("253.150", "600.000")


@dataclass
class Interval:
    lower: str
    upper: str
    numbers: list  # nine published texts: a1 to a7, b1, b2


@dataclass
class Record:
    line: int
    published: str
    elements: dict
    order: int      # 0: gas
    molar_mass: str
    remark: str
    intervals: list
    name: str = ""
    designation: str = ""


@dataclass
class Phase:
    symbol: str
    aggregation: str
    intervals: list
    remarks: list
    designation: str
    published: set
    trust: tuple = ()
    growth: str = ""


@dataclass
class Substance:
    name: str
    formula: str
    molar_mass: str
    atoms: float
    phases: list = field(default_factory=list)
    transitions: list = field(default_factory=list)


class Polynomial:
    """Cp/R, H/R and S/R of an interval, NASA/TP-2002-211556 equations (1) to (3)."""

    def __init__(self, interval):
        *self.a, self.b1, self.b2 = (float(text.replace("D", "e")) for text in interval.numbers)

    def cp(self, T):
        return sum(a * T ** (i - 2) for i, a in enumerate(self.a))

    def slope(self, T):
        return sum((i - 2) * a * T ** (i - 3) for i, a in enumerate(self.a))

    def h(self, T):
        powers = sum(a * T ** (i - 1) / (i - 1) for i, a in enumerate(self.a) if i != 1)
        return powers + self.a[1] * math.log(T) + self.b1

    def s(self, T):
        powers = sum(a * T ** (i - 2) / (i - 2) for i, a in enumerate(self.a) if i != 2)
        return powers + self.a[2] * math.log(T) + self.b2


def read_records(path):
    with open(path, encoding="ascii") as file:
        lines = file.read().splitlines()
    at = next(i for i, line in enumerate(lines) if line.startswith("thermo")) + 2
    while at < len(lines):
        head = lines[at]
        if not head.strip() or head.startswith(("!", "END")):
            at += 1
            continue
        about = lines[at + 1]
        count = int(about[0:2])
        elements = {}
        for k in range(5):
            pair = about[10 + 8 * k:18 + 8 * k]
            if pair[:2].strip() and float(pair[2:]) != 0:
                elements[pair[:2].strip().capitalize()] = Decimal(pair[2:].strip())
        record = Record(at + 1, head[:18].strip(), elements, int(about[50:52]), about[52:65].strip(),
                        re.sub(r"\s*\bReact?\.?$", "", " ".join(head[18:80].split())), [])
        at += 2
        for _ in range(count):
            head_of_interval, first, second = lines[at:at + 3]
            if head_of_interval[22:63].split() != "7 -2.0 -1.0  0.0  1.0  2.0  3.0  4.0  0.0".split():
                raise ValueError(f"line {at + 1}: other exponents than -2 to 4")
            if second[32:48].strip(" 0.D+"):
                raise ValueError(f"line {at + 3}: an eighth coefficient")
            numbers = [first[16 * k:16 * k + 16].strip() for k in range(5)]
            numbers += [second[16 * k:16 * k + 16].strip() for k in (0, 1, 3, 4)]
            if not all(re.fullmatch(r"-?\d\.\d{9}D[+-]\d\d", number) for number in numbers):
                raise ValueError(f"line {at + 2}: a coefficient in another form")
            record.intervals.append(Interval(head_of_interval[:11].strip(), head_of_interval[11:22].strip(), numbers))
            at += 3
        if count == 0:
            at += 1
        yield record


def with_proper_symbols(name, elements):
    """The source writes Al and Cl as AL and CL; which they are, the list of elements tells."""
    for element in ("Al", "Cl"):
        if element in elements:
            name = name.replace(element.upper(), element)
    return name


def composition(formula):
    """Element counts of a formula with brackets, or None where the text is no formula."""
    position = 0

    def group():
        nonlocal position
        total = {}
        while position < len(formula) and formula[position] != ")":
            if formula[position] == "(":
                position += 1
                part = group()
                if position >= len(formula):
                    raise ValueError
                position += 1
            else:
                element = re.compile(r"[A-Z][a-z]?").match(formula, position)
                if not element:
                    raise ValueError
                position = element.end()
                part = {element[0]: Decimal(1)}
            digits = re.compile(r"\d*\.?\d*").match(formula, position)
            position = digits.end()
            for element, count in part.items():
                total[element] = total.get(element, 0) + count * Decimal(digits[0] or 1)
        return total

    try:
        total = group()
    except ValueError:
        return None
    return total if position == len(formula) else None


def formula_of(record):
    """The name where it is a formula of the record's composition, else the composition in Hill order."""
    if record.published in ("Air",):
        return ""
    base = record.name.split(",")[0].replace("-", "")
    if composition(base) == record.elements or record.published.startswith("Fe.947O"):  # the columns hold two decimals
        return base
    order = sorted(record.elements, key=lambda e: ("CH".find(e) if "C" in record.elements and e in "CH" else 9, e))
    return "".join(e + ("" if record.elements[e] == 1 else f"{record.elements[e].normalize():f}") for e in order)


def name_record(record):
    """Splits a condensed record's name into substance and designation."""
    name = with_proper_symbols(record.published, record.elements)
    if record.order or name.endswith("(g)"):
        match = re.fullmatch(r"(.+)\(([^()]+)\)(,.*)?", name)
        record.designation = match[2]
        name = match[1] + (match[3] or "")
    record.name = FULL_NAMES.get(name, name)


def symbol_of(record):
    if record.designation == "L":
        return "l"
    modification = DESIGNATIONS.get(record.designation, record.designation)
    if record.designation in LETTERS:
        modification = LETTERS[record.designation]
        spoken = re.findall(r"\b(alpha|beta|gamma|delta)\b'?", record.remark, re.IGNORECASE)
        if len(spoken) == 1 and not modification.startswith(spoken[0].lower()):
            modification = spoken[0].lower()
    return "cr," + modification if modification else "cr"


def continuous(below, above):
    """Whether two records continue one another: h and s within 0.001 R T and 0.001 R, and g."""
    if below.intervals[-1].upper != above.intervals[0].lower:
        return False
    T = float(above.intervals[0].lower)
    a, b = Polynomial(below.intervals[-1]), Polynomial(above.intervals[0])
    return abs(b.h(T) - a.h(T)) < 1e-3 * T and abs(b.s(T) - a.s(T)) < 1e-3


def phases_of(records):
    """The phases of a substance from its records in the source's order; pieces of one phase are joined."""
    phases = []
    for record in records:
        intervals = list(record.intervals)
        for _ in range(OF_THE_CRYSTAL.get(record.published, 0)):
            phases[-1].intervals.append(intervals.pop(0))
            phases[-1].published.add(record.published)
            phases[-1].remarks.append(f"from {Decimal(phases[-1].intervals[-1].lower).normalize():f} K the first "
                                      f"interval of the record {record.published}, which continues the crystal")
        last = phases[-1] if phases else None
        joined = last and (last.designation == record.designation
                           or ONE_PHASE.get((record.name, last.designation)) == record.designation)
        if record.order and joined and continuous(last, record):
            last.intervals += intervals
            last.remarks.append(f"from {Decimal(intervals[0].lower).normalize():f} K: {record.remark}")
            last.published.add(record.published)
            last.symbol = symbol_of(record)
            last.designation = record.designation
            continue
        if record.order == 0:
            phases.append(Phase("g", "gas", intervals, [record.remark], "g", {record.published}))
        else:
            aggregation = "liquid" if record.designation == "L" else "crystal"
            phases.append(Phase(symbol_of(record), aggregation, intervals, [record.remark], record.designation,
                                {record.published}))
    symbols = [phase.symbol for phase in phases]
    for phase in phases:
        if symbols.count(phase.symbol) > 1:  # told apart by the crystal system in the comment
            system = next(s for s in SYSTEMS if re.search(s, phase.remarks[0], re.IGNORECASE))
            phase.symbol += "," + system
    return phases


def rounded_up(x):
    """x with two significant digits, not less than x."""
    exact = Decimal(str(x))
    place = Decimal(1).scaleb(exact.adjusted() - 1)
    return f"{(exact / place).to_integral_value('ROUND_CEILING') * place:f}"


def text_of(x):
    return f"{x.quantize(Decimal('0.001')):f}"


def assign_trust(substance):
    condensed = [p for p in substance.phases if p.aggregation != "gas"]
    for phase in substance.phases:
        lower, upper = Decimal(phase.intervals[0].lower), Decimal(phase.intervals[-1].upper)
        if phase.aggregation == "gas":
            phase.trust = (lower, upper)
            continue
        ends = ((Polynomial(phase.intervals[0]), float(lower)), (Polynomial(phase.intervals[-1]), float(upper)))
        slope = max(abs(p.slope(T) / p.cp(T)) for p, T in ends)
        if phase.aggregation == "liquid":
            from_melting = not phase.published & NOT_FROM_MELTING
            below = lower * (1 - UNDERCOOLED_TO) if from_melting else max(lower * BESIDE_CRYSTAL, LEAST_MARGIN)
            above = upper * ABOVE_LIQUID
        else:
            at = condensed.index(phase)
            another = at + 1 < len(condensed) and condensed[at + 1].aggregation == "crystal"
            below = max(lower * BESIDE_CRYSTAL, LEAST_MARGIN)
            above = max(upper * (BESIDE_CRYSTAL if another else ABOVE_LAST_CRYSTAL), LEAST_MARGIN)
        growth = max(LEAST_GROWTH, slope)
        if slope > LEAST_GROWTH:
            below, above = (min(margin, Decimal(MOST_MISSED / slope)) for margin in (below, above))
        phase.trust = (lower - below, upper + above)
        if substance.name == "H2O" and phase.symbol == "l":
            phase.trust = tuple(map(Decimal, WATER_LIQUID))
            growth = abs(ends[0][0].slope(ends[0][1]) / ends[0][0].cp(ends[0][1]))
        phase.growth = rounded_up(growth)


def uncertainty_class(substance, phase):
    if phase.aggregation != "gas":
        return phase.aggregation
    return "gas-small" if substance.atoms <= 3 else "gas-medium" if substance.atoms <= 8 else "gas-large"


def substances_of(records):
    groups = {}
    for record in records:
        if record.intervals and "E" not in record.elements:
            name_record(record)
            groups.setdefault(record.name, []).append(record)
    for name in [n for n in groups if groups[n][0].order and "," in n]:  # a liquid's name is cut shorter than the gas's
        whole = [n for n in groups if n.startswith(name) and groups[n][0].order == 0]
        if len(whole) != 1:
            raise ValueError(f"{name}: no single gas record to go with")
        for record in groups[name]:
            record.name = whole[0]
        groups[whole[0]] += groups.pop(name)
    substances = []
    for name, group in groups.items():
        group.sort(key=lambda r: (r.order == 0, r.order))
        first = group[0]
        if any(r.elements != first.elements or r.molar_mass != first.molar_mass for r in group):
            raise ValueError(f"{name}: records of different composition")
        atoms = 2.0 if first.published == "Air" else float(sum(first.elements.values()))
        substance = Substance(name, formula_of(first), first.molar_mass, atoms, phases_of(group))
        condensed = [p for p in substance.phases if p.aggregation != "gas"]
        for below, above in zip(condensed, condensed[1:]):
            ends = (below.intervals[-1].upper, above.intervals[0].lower)
            if ends[0] != ends[1] and name not in MEET_AT:
                raise ValueError(f"{name}: {ends[0]} and {ends[1]} do not meet")
            at = ends[0] if ends[0] == ends[1] else MEET_AT[name]
            if at:
                substance.transitions.append((below.symbol, above.symbol, at))
        assign_trust(substance)
        substances.append(substance)
    return sorted(substances, key=lambda s: (s.name.lower(), s.name))


def carried(number):
    return number.replace("D", "e")


def write_data(substances, path):
    with open(path, "w", encoding="utf-8") as out:
        out.write("# Written by carry_over_nasa.py from the NASA Glenn set; form: README.md beside this file.\n")
        for substance in substances:
            out.write(f"\nsubstance {substance.name}\n")
            if substance.formula:
                out.write(f"  formula {substance.formula}\n")
            out.write(f"  molar-mass {substance.molar_mass} g/mol\n  source nasa-glenn\n")
            for phase in substance.phases:
                out.write(f"  phase {phase.symbol} {phase.aggregation}\n    model nasa-polynomial\n")
                out.write(f"    trust {text_of(phase.trust[0])} {text_of(phase.trust[1])}\n")
                growth = f" growth {phase.growth}" if phase.growth else ""
                out.write(f"    uncertainty {uncertainty_class(substance, phase)}{growth}\n")
                out.write(f"    remark {'; '.join(phase.remarks)}\n")
                for interval in phase.intervals:
                    out.write(f"    interval {interval.lower} {interval.upper}\n")
                    out.write("      a " + " ".join(map(carried, interval.numbers[:7])) + "\n")
                    out.write("      b " + " ".join(map(carried, interval.numbers[7:])) + "\n")
            for below, above, temperature in substance.transitions:
                out.write(f"  transition {below} {above} {temperature}\n")


def fnv1a(text):
    """32-bit FNV-1a."""
    value = 0x811C9DC5
    for byte in text.encode("ascii"):
        value = (value ^ byte) * 0x01000193 & 0xFFFFFFFF
    return value


def write_fingerprint(records, substances, path):
    """One line a record: its published name, then for each interval the state that holds it and a checksum."""
    state_of = {id(i): f"{s.name}({p.symbol})" for s in substances for p in s.phases for i in p.intervals}
    taken = [r for r in records if any(id(i) in state_of for i in r.intervals)]
    with open(path, "w", encoding="utf-8") as out:
        out.write("# Written by registry/carry_over_nasa.py from the published set. A line a record: the published\n"
                  "# name, then for each interval the state of ours that holds it and, in hexadecimal, the 32-bit\n"
                  "# FNV-1a of 'molar-mass lower upper a1 ... a7 b1 b2' with the published digits, e for D.\n")
        out.write(f"records {len(taken)} intervals {sum(len(r.intervals) for r in taken)}\n")
        for record in taken:
            parts = [record.published]
            for interval in record.intervals:
                digits = [record.molar_mass, interval.lower, interval.upper, *map(carried, interval.numbers)]
                parts += [state_of[id(interval)], f"{fnv1a(' '.join(digits)):08x}"]
            out.write("\t".join(parts) + "\n")


def main(arguments):
    if len(arguments) not in (2, 3):
        sys.exit(__doc__)
    records = list(read_records(arguments[0]))
    substances = substances_of(records)
    write_data(substances, arguments[1])
    if len(arguments) == 3:
        write_fingerprint(records, substances, arguments[2])
    phases = [p for s in substances for p in s.phases]
    print(f"{len(records)} records read; {len(substances)} substances, {len(phases)} phases, "
          f"{sum(len(p.intervals) for p in phases)} intervals, "
          f"{sum(len(s.transitions) for s in substances)} transitions")


if __name__ == "__main__":
    main(sys.argv[1:])
