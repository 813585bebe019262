"""Compiles the property data into one C++ file of constant tables.

Usage: compile_data.py DATA_DIR OUT.cpp

Reads every *.txt of DATA_DIR; their form is described in data/README.md. The tables are constant-initialised: nothing
is read, allocated or constructed at run time. Exits with "file:line: what is wrong" on bad data.
"""
import pathlib
import sys
from dataclasses import dataclass, field
from decimal import Decimal, InvalidOperation

import heat_capacity

CODE_MODELS = {"liquid-water": "LiquidWater", "ice-ih": "IceIh", "steam": "Steam"}
OWN_REFERENCE = "heat-capacity-polynomial"  # its constants of integration are worked out here
MODELS = {"nasa-polynomial", "constant-heat-capacity", OWN_REFERENCE, *CODE_MODELS}
AMBIGUOUS = 0xFFFF   # as in compiled_tables.hpp
LONGEST_NAME = 64    # bytes, as in compiled_tables.hpp


class BadData(Exception):
    pass


@dataclass
class Line:
    file: str
    number: int
    keyword: str
    rest: str

    def fail(self, what):
        raise BadData(f"{self.file}:{self.number}: {what}")

    def number_of(self, text):
        try:
            value = Decimal(text)
        except InvalidOperation:
            self.fail(f"'{text}' is no number")
        if not value.is_finite():
            self.fail(f"'{text}' is not finite")
        return value

    def numbers(self, count):
        texts = self.rest.split()
        if len(texts) != count:
            self.fail(f"{self.keyword}: {count} numbers are wanted, there are {len(texts)}")
        for text in texts:
            self.number_of(text)
        return texts

    def range(self):
        lower, upper = self.numbers(2)
        if not 0 < Decimal(lower) < Decimal(upper):
            self.fail(f"{self.keyword}: not an ascending range of temperatures above 0 K")
        return lower, upper

    def text(self):
        if not self.rest:
            self.fail(f"{self.keyword}: a value is missing")
        return self.rest


@dataclass
class Block:
    line: Line
    values: dict = field(default_factory=dict)

    def set(self, line, value):
        if line.keyword in self.values:
            line.fail(f"{line.keyword}: stated twice")
        self.values[line.keyword] = value

    def need(self, *keywords):
        for keyword in keywords:
            if keyword not in self.values:
                self.line.fail(f"{self.line.keyword} {self.line.rest}: {keyword} is missing")


@dataclass
class Interval:
    line: Line
    bounds: tuple
    a: list = None
    b: list = None


@dataclass
class Phase(Block):
    symbol: str = ""
    aggregation: str = ""
    intervals: list = field(default_factory=list)  # with a and b as stated
    pieces: list = field(default_factory=list)     # heat_capacity.Piece: with b worked out

    @property
    def tables(self):
        return self.pieces or self.intervals


@dataclass
class Transition:
    line: Line
    below: str
    above: str
    temperature: str
    enthalpy: str = None  # J/kg


@dataclass
class Substance(Block):
    name: str = ""
    aliases: list = field(default_factory=list)  # (line, name)
    phases: list = field(default_factory=list)
    transitions: list = field(default_factory=list)  # Transition


class Data:
    def __init__(self):
        self.sources, self.uncertainties, self.substances = {}, {}, {}
        self.names = []  # (line, substance, names)


def lines_of(path):
    try:
        text = path.read_text(encoding="utf-8")
    except UnicodeDecodeError as error:
        raise BadData(f"{path.name}: not UTF-8: {error}") from None
    for number, text in enumerate(text.split("\n"), 1):
        if text.strip() and not text.startswith("#"):
            keyword, _, rest = text.strip().partition(" ")
            yield Line(path.name, number, keyword, rest.strip()), text


def new_entry(table, line, entry):
    if line.text() in table:
        line.fail(f"{line.keyword} {line.rest}: stated twice")
    table[line.rest] = entry
    return entry


def read_file(path, data):
    block = phase = None
    for line, text in lines_of(path):
        if not text[0].isspace():
            phase = None
            if line.keyword == "source":
                block = new_entry(data.sources, line, Block(line))
            elif line.keyword == "uncertainty":
                block = new_entry(data.uncertainties, line, Block(line))
            elif line.keyword == "substance":
                block = new_entry(data.substances, line, Substance(line, name=line.rest))
            else:
                line.fail(f"unknown keyword '{line.keyword}' at the beginning of a block")
        elif block is None:
            line.fail("a statement before the first block")
        elif not isinstance(block, Substance):
            read_plain(block, line)
        elif line.keyword == "phase":
            phase = new_phase(block, line)
        elif line.keyword == "transition":
            block.transitions.append(new_transition(line))
        elif phase is not None:
            read_phase(phase, line)
        else:
            read_substance(block, line)


def read_plain(block, line):
    known = {"source": ("key", "citation", "declared"),
             "uncertainty": ("relative", "growth", "origin", "reason", "declared")}[block.line.keyword]
    if line.keyword not in known:
        line.fail(f"unknown keyword '{line.keyword}' in {block.line.keyword}")
    if line.keyword in ("relative", "growth") and Decimal(line.numbers(1)[0]) < 0:
        line.fail(f"{line.keyword}: below zero")
    if line.keyword == "origin" and line.rest not in ("stated", "derived", "assigned"):
        line.fail("origin: stated, derived or assigned")
    block.set(line, line.text())


def read_substance(substance, line):
    if line.keyword == "alias":
        substance.aliases.append((line, line.text()))
    elif line.keyword == "molar-mass":
        value, _, unit = line.text().partition(" ")
        if unit not in ("g/mol", "kg/mol"):
            line.fail("molar-mass: in g/mol or kg/mol")
        mass = line.number_of(value)
        if mass <= 0:
            line.fail("molar-mass: not above zero")
        substance.set(line, mass.scaleb(-3) if unit == "g/mol" else mass)
    elif line.keyword in ("formula", "title", "source"):
        substance.set(line, line.text())
    else:
        line.fail(f"unknown keyword '{line.keyword}' in substance")


def new_phase(substance, line):
    parts = line.rest.split()
    if len(parts) != 2 or parts[1] not in ("crystal", "liquid", "gas"):
        line.fail("phase: a state symbol and crystal, liquid or gas are wanted")
    symbol, aggregation = parts
    if symbol.split(",")[0] != {"crystal": "cr", "liquid": "l", "gas": "g"}[aggregation]:
        line.fail(f"the state symbol {symbol} is none of {aggregation}")
    if any(p.symbol == symbol for p in substance.phases):
        line.fail(f"phase {symbol}: stated twice")
    if substance.phases and substance.phases[-1].aggregation == "gas":
        line.fail("the gas is the last phase")
    substance.phases.append(Phase(line, symbol=symbol, aggregation=aggregation))
    return substance.phases[-1]


def new_transition(line):
    parts = line.rest.split()
    if len(parts) != 3 and (len(parts) != 5 or parts[3] != "enthalpy"):
        line.fail("transition: two state symbols, a temperature, and perhaps enthalpy with a number are wanted")
    line.number_of(parts[2])
    if len(parts) == 5 and line.number_of(parts[4]) <= 0:
        line.fail("transition: the enthalpy is not above zero")
    return Transition(line, *parts[:3], *parts[4:])


def read_phase(phase, line):
    keyword = line.keyword
    if keyword == "model":
        if line.text() not in MODELS:
            line.fail(f"unknown model '{line.rest}'")
        phase.set(line, line.rest)
    elif keyword == "interval":
        phase.intervals.append(Interval(line, line.range()))
    elif keyword in ("a", "b"):
        if not phase.intervals or getattr(phase.intervals[-1], keyword) is not None:
            line.fail(f"{keyword}: no interval before it, or a second one")
        setattr(phase.intervals[-1], keyword, line.numbers(7 if keyword == "a" else 2))
    elif keyword == "trust" and " in " in line.rest:
        values, zero = heat_capacity.with_scale(line)
        line.rest = " ".join(str(value + zero) for value in values)
        phase.set(line, line.range())
    elif keyword in ("trust", "fit"):
        phase.set(line, line.range())
    elif keyword == "heat-capacity" and " in " in line.rest:
        heat_capacity.read_polynomial(phase.pieces, line)
    elif keyword == "heat-capacity-table":
        heat_capacity.read_table(phase.pieces, line)
    elif keyword == "inverse":
        heat_capacity.read_inverse(phase.pieces, line)
    elif keyword == "heat-capacity":
        phase.set(line, line.numbers(1)[0])
    elif keyword == "reference":
        phase.set(line, line.numbers(3))
    elif keyword in ("uncertainty", "remark", "source"):
        phase.set(line, line.text())
    else:
        line.fail(f"unknown keyword '{keyword}' in phase")


def read_names(path, data):
    for line, text in lines_of(path):
        substance, equals, names = text.strip().partition(" = ")
        if not equals:
            line.fail("'substance = name; name' is wanted")
        data.names.append((line, substance.strip(), [name.strip() for name in names.split(";")]))


def check_phase(data, substance, phase):
    phase.need("model", "uncertainty")
    model, line = phase.values["model"], phase.line
    statements = {"nasa-polynomial": {"trust"}, OWN_REFERENCE: {"trust"},
                  "constant-heat-capacity": {"heat-capacity", "reference", "fit", "trust"}}.get(model, set())
    phase.need(*sorted(statements))
    extra = {"trust", "fit", "heat-capacity", "reference"} & set(phase.values) - statements
    if extra:
        line.fail(f"model {model} has no statement {min(extra)}")
    if (model == "nasa-polynomial") != bool(phase.intervals):
        line.fail(f"model {model} {'without' if not phase.intervals else 'with'} an interval")
    if model == "nasa-polynomial":
        check_intervals(phase)
        if "molar-mass" not in substance.values:
            substance.line.fail("molar-mass is missing")
    if (model == OWN_REFERENCE) != bool(phase.pieces):
        line.fail(f"model {model} {'without' if not phase.pieces else 'with'} a range of heat capacity")
    if phase.pieces and phase.aggregation == "gas":
        line.fail(f"model {model} is for condensed phases only")
    if phase.tables:
        phase.values["fit"] = phase.tables[0].bounds[0], phase.tables[-1].bounds[1]
    if statements:
        (lower, upper), (least, most) = phase.values["fit"], phase.values["trust"]
        if not (Decimal(least) <= Decimal(lower) and Decimal(upper) <= Decimal(most)):
            line.fail("trust does not hold the whole fit")
        source = phase.values.setdefault("source", substance.values.get("source"))
        if source is None:
            line.fail("source is missing")
        if source not in data.sources:
            line.fail(f"unknown source '{source}'")
    elif "source" in phase.values:
        line.fail(f"model {model} knows its sources itself")
    parts = phase.values["uncertainty"].split()
    if parts[0] not in data.uncertainties:
        line.fail(f"unknown class of uncertainty '{parts[0]}'")
    if parts[1:] and (len(parts) != 3 or parts[1] != "growth" or line.number_of(parts[2]) < 0):
        line.fail("uncertainty: a class, and perhaps growth with a number")


def check_intervals(phase):
    for interval in phase.intervals:
        if interval.a is None or interval.b is None:
            interval.line.fail("interval without a or b")
    for below, above in zip(phase.intervals, phase.intervals[1:]):
        if Decimal(below.bounds[1]) != Decimal(above.bounds[0]):
            above.line.fail(f"a gap or an overlap: the interval before ends at {below.bounds[1]} K")


def check(data):
    for source in data.sources.values():
        source.need(*(() if "declared" in source.values else ("key", "citation")))
    for uncertainty in data.uncertainties.values():
        if "declared" not in uncertainty.values:
            uncertainty.need("relative", "growth", "origin", "reason")
    for substance in data.substances.values():
        if not substance.phases:
            substance.line.fail("no phase")
        for phase in substance.phases:
            check_phase(data, substance, phase)
        check_transitions(substance)
        link_phases(substance)
    for line, name, names in data.names:
        if name not in data.substances:
            line.fail(f"unknown substance '{name}'")
        data.substances[name].values.setdefault("title", names[0])
        data.substances[name].aliases += [(line, alias) for alias in names]


def check_transitions(substance):
    symbols = [p.symbol for p in substance.phases]
    last = Decimal(0)
    for transition in substance.transitions:
        line = transition.line
        if transition.below not in symbols or transition.above not in symbols:
            line.fail("transition of a phase that the substance does not have")
        upper = symbols.index(transition.above)
        if upper != symbols.index(transition.below) + 1 or substance.phases[upper].aggregation == "gas":
            line.fail("transition of phases that are no neighbouring condensed ones")
        if Decimal(transition.temperature) <= last:
            line.fail("transitions do not ascend in temperature")
        last = Decimal(transition.temperature)


def link_phases(substance):
    """The constants of integration of a substance whose phases state heat capacities alone."""
    phases = substance.phases
    if not any(phase.pieces for phase in phases):
        for transition in substance.transitions:
            if transition.enthalpy is not None:
                transition.line.fail(f"enthalpy: only between phases of model {OWN_REFERENCE}; others bring their own")
        return
    for phase in phases:
        if not phase.pieces:
            phase.line.fail(f"a phase of another model beside one of {OWN_REFERENCE}: they share no reference")
    changes = []
    for below, above in zip(phases, phases[1:]):
        found = [t for t in substance.transitions if (t.below, t.above) == (below.symbol, above.symbol)]
        if not found:
            above.line.fail(f"no transition from {below.symbol} to {above.symbol}: the phases share no reference")
        transition = found[0]
        if transition.enthalpy is None:
            transition.line.fail("transition: the enthalpy is missing")
        for phase in (below, above):
            least, most = map(Decimal, phase.values["trust"])
            if not least <= Decimal(transition.temperature) <= most:
                transition.line.fail(f"transition: not within the trust of {phase.symbol}")
        changes.append((Decimal(transition.temperature), Decimal(transition.enthalpy)))
    heat_capacity.link_phases([phase.pieces for phase in phases], changes)


def folded(name):
    return "".join(c.lower() if c.isascii() else c for c in name)


def name_tables(data, ordered):
    """Spellings to substance index, as written and with ASCII case folded; AMBIGUOUS where several fit."""
    index = {s.name: i for i, s in enumerate(ordered)}
    exact = dict(index)
    formulas = {}
    for s in ordered:
        for formula in {s.values.get("formula"), s.values.get("formula", "").replace("-", "")} - {None, ""}:
            formulas.setdefault(formula, set()).add(index[s.name])
    aliases = {}
    for s in ordered:
        for line, alias in s.aliases:
            if not alias or any(not c.isprintable() for c in alias):
                line.fail("an empty or unprintable name")
            if index.get(alias, index[s.name]) != index[s.name] or aliases.get(alias, index[s.name]) != index[s.name]:
                line.fail(f"the name '{alias}' already stands for another substance")
            if formulas.get(alias, {index[s.name]}) != {index[s.name]}:
                line.fail(f"the name '{alias}' is a formula of another substance")
            aliases[alias] = index[s.name]
    for alias, i in aliases.items():
        exact.setdefault(alias, i)
    for formula, found in formulas.items():
        exact.setdefault(formula, min(found) if len(found) == 1 else AMBIGUOUS)
    folds = {}
    for name, i in exact.items():
        folds.setdefault(folded(name), set()).add(i)
    for alias, i in aliases.items():  # "Tin" is a word with its capital, not titanium nitride
        if len(folds[folded(alias)]) > 1:
            exact.setdefault(alias[0].upper() + alias[1:], i)
    fold = {name: min(found) if len(found) == 1 else AMBIGUOUS for name, found in folds.items()}
    return exact, fold


def fnv1a(text):
    value = 0xCBF29CE484222325
    for byte in text.encode("utf-8"):
        value = (value ^ byte) * 0x100000001B3 & 0xFFFFFFFFFFFFFFFF
    return value


def hash_table(names):
    """Open addressing with linear probing, at most a third full; the size is a power of two."""
    size = 1 << (3 * len(names)).bit_length()
    slots = [None] * size
    for name in sorted(names):
        at = fnv1a(name) & (size - 1)
        while slots[at] is not None:
            at = (at + 1) & (size - 1)
        slots[at] = (name, names[name])
    return slots


def quoted(text):
    """A C++ string literal of ASCII; other bytes as octal escapes."""
    out = ""
    for byte in text.encode("utf-8"):
        c = chr(byte)
        out += "\\" + c if c in '"\\?' else c if 32 <= byte < 127 else f"\\{byte:03o}"
    return f'"{out}"'


def floating(text):
    """A C++ literal of double with the same digits; of a number that was worked out, the nearest double."""
    text = repr(float(text)) if isinstance(text, Decimal) and len(text.as_tuple().digits) > 20 else str(text)
    return text if any(c in text for c in ".eE") else text + ".0"


def model_text(data, substance, phase, first_interval, first_bound):
    model = phase.values["model"]
    if model in CODE_MODELS:
        return f"{CODE_MODELS[model]}{{}}"
    trust = ", ".join(map(floating, phase.values["trust"]))
    source = data.sources[phase.values["source"]].cpp
    if phase.tables:
        gas = "true" if phase.aggregation == "gas" else "false"
        constant = "1.0" if phase.pieces else f"nasa_gas_constant / {floating(substance.values['molar-mass'])}"
        return (f"NasaPolynomial{{intervals + {first_interval}, bounds + {first_bound}, {len(phase.tables)}, "
                f"{constant}, {gas}, {{{trust}}}, &{source}}}")
    fit = ", ".join(map(floating, phase.values["fit"]))
    reference = ", ".join(map(floating, phase.values["reference"]))
    return (f"ConstantHeatCapacity{{{floating(phase.values['heat-capacity'])}, {reference}, {{{fit}}}, {{{trust}}}, "
            f"&{source}}}")


def uncertainty_text(data, phase):
    name, *growth = phase.values["uncertainty"].split()
    base = data.uncertainties[name].cpp
    if not growth:
        return base
    return f"{{{base}.relative, {floating(growth[1])}, {floating(growth[1])}, {base}.origin, {base}.reason}}"


def emit(data):
    ordered = sorted(data.substances.values(), key=lambda s: (folded(s.name), s.name))
    if len(ordered) >= AMBIGUOUS:
        raise BadData("too many substances for a 16-bit index")
    exact, fold = name_tables(data, ordered)
    for name in exact:
        if len(name.encode("utf-8")) > LONGEST_NAME:
            raise BadData(f"the name '{name}' is longer than {LONGEST_NAME} bytes")
    out = ["// Written by compile_data.py from the property data; not to be edited.",
           '#include "registry/compiled_tables.hpp"', '#include "registry/models/water_uncertainty.hpp"', "",
           "namespace entropy_ledger::registry::compiled {", "namespace {", ""]
    for i, source in enumerate(data.sources.values()):
        source.cpp = source.values.get("declared", f"source_{i}")
        if "declared" not in source.values:
            out.append(f"constexpr Source source_{i}{{{quoted(source.values['key'])}, "
                       f"{quoted(source.values['citation'])}}};")
    for i, item in enumerate(data.uncertainties.values()):
        item.cpp = item.values.get("declared", f"uncertainty_{i}")
        if "declared" not in item.values:
            out.append(f"constexpr Uncertainty uncertainty_{i}{{{floating(item.values['relative'])}, "
                       f"{floating(item.values['growth'])}, {floating(item.values['growth'])}, Origin::{item.values['origin']}, "
                       f"{quoted(item.values['reason'])}}};")
    intervals, bounds, phases, transitions, substances = [], [], [], [], []
    for substance in ordered:
        first_phase, first_transition = len(phases), len(transitions)
        for phase in substance.phases:
            model = model_text(data, substance, phase, len(intervals), len(bounds))
            bounds += [floating(interval.bounds[1]) + "," for interval in phase.tables[:-1]]
            for interval in phase.tables:
                ends, a, b = (", ".join(map(floating, x)) for x in (interval.bounds, interval.a, interval.b))
                intervals.append(f"{{{ends}, {{{a}}}, {b}}},")
            phases.append(f"{{{quoted(phase.symbol)}, Aggregation::{phase.aggregation}, {model}, "
                          f"{uncertainty_text(data, phase)}, {quoted(phase.values.get('remark', ''))}}},")
        symbols = [p.symbol for p in substance.phases]
        for t in substance.transitions:
            transitions.append(f"{{{symbols.index(t.below)}, {symbols.index(t.above)}, {floating(t.temperature)}}},")
        spans = f"{{phases + {first_phase}, {len(substance.phases)}}}, "
        count = len(substance.transitions)
        spans += f"{{transitions + {first_transition}, {count}}}" if count else "{}"
        substances.append(f"{{{quoted(substance.name)}, {quoted(substance.values.get('formula', ''))}, "
                          f"{quoted(substance.values.get('title', ''))}, "
                          f"{floating(substance.values.get('molar-mass', '0'))}, {spans}}},")
    for kind, name, rows in (("NasaInterval", "intervals", intervals), ("double", "bounds", bounds), ("Phase", "phases", phases),
                             ("Transition", "transitions", transitions), ("Substance", "all", substances)):
        out += ["", f"constinit const {kind} {name}[] = {{", *rows, "};"] if rows else []
    for name, table in (("exact", exact), ("folded", fold)):
        slots = hash_table(table)
        out += ["", f"constinit const NameEntry {name}[] = {{"]
        out += ["{{}, 0}," if slot is None else f"{{{quoted(slot[0])}, {slot[1]}}}," for slot in slots] + ["};"]
    out += ["", "} // namespace", "",
            "constinit const std::span<const Substance> substances{all};",
            "constinit const std::span<const NameEntry> names_as_written{exact};",
            "constinit const std::span<const NameEntry> names_without_case{folded};",
            "",
            "} // namespace entropy_ledger::registry::compiled", ""]
    return "\n".join(out)


def main(arguments):
    if len(arguments) != 2:
        sys.exit(__doc__)
    data = Data()
    try:
        for path in sorted(pathlib.Path(arguments[0]).glob("*.txt")):
            (read_names if path.name == "names.txt" else read_file)(path, data)
        if not data.substances:
            raise BadData(f"{arguments[0]}: no substance")
        check(data)
        text = emit(data)
    except BadData as error:
        sys.exit(str(error))
    pathlib.Path(arguments[1]).write_text(text, encoding="ascii")


if __name__ == "__main__":
    main(sys.argv[1:])
