"""Heat capacities as powers of temperature or as tables: bad data is refused with file and line, good data is compiled.

Usage: plant_data_refusals.py REGISTRY_DIR
"""
import math
import re
import sys

from data_compiler import Checks

SUBSTANCE = """substance wax
  source s
  phase cr crystal
    model heat-capacity-polynomial
    heat-capacity 250 280 1500 2 in K
    heat-capacity 6.85 20 900 1 2e-3 3e-5 4e-7 in °C
    trust 240 300 in K
    uncertainty u
  phase l liquid
    model heat-capacity-polynomial
    heat-capacity-table 290 2000  310 2100 in K
    heat-capacity 310 400 1900 0.5 in K
    inverse 3e6 2e4
    trust 10 140 in °C
    uncertainty u
  transition cr l 295 enthalpy 200000
"""

checks = Checks(sys.argv[1], SUBSTANCE)
check, compiled, refused = checks.check, checks.compiled, checks.refused


def intervals_of(text):
    rows = re.search(r"NasaInterval intervals\[\] = \{\n(.*?)\n\};", text, re.S).group(1).splitlines()
    return [[float(x) for x in re.findall(r"[-+0-9.eE]+", row)] for row in rows]


def values(interval, T):
    a, (b1, b2) = interval[2:9], interval[9:]
    cp = sum(c * T ** (k - 2) for k, c in enumerate(a))
    h = b1 - a[0] / T + a[1] * math.log(T) + sum(c * T ** (k + 1) / (k + 1) for k, c in enumerate(a[2:]))
    s = b2 - a[0] / (2 * T * T) - a[1] / T + a[2] * math.log(T) + sum(c * T ** k / k for k, c in enumerate(a[3:], 1))
    return cp, h, s


def near(what, ours, wanted, scale):
    check(f"{what}: {ours} for {wanted}", abs(ours - wanted) <= 1e-12 * scale)


code, said, out = compiled(SUBSTANCE)
check(f"good data: {said}", code == 0 and not said)
check("specific gas constant 1", "NasaPolynomial{intervals + 0, bounds + 0, 2, 1.0, false, {240.0, 300.0}" in out
      or "NasaPolynomial{intervals + 0, bounds + 0, 2, 1.0, false, {240, 300}" in out)
check("no molar mass", '{"wax", "", "", 0.0,' in out)
if out:
    first, second, table, last = intervals_of(out)
    check("the bounds", [i[:2] for i in (first, second, table, last)]
          == [[250, 280], [280, 293.15], [290, 310], [310, 400]])
    # By the statements themselves.
    near("a polynomial in K", values(first, 260)[0], 1500 + 2 * 260, 2000)
    near("a polynomial in °C", values(second, 273.15 + 15)[0],
         900 + 15 + 2e-3 * 15 ** 2 + 3e-5 * 15 ** 3 + 4e-7 * 15 ** 4, 2000)
    near("a table", values(table, 305)[0], 2075, 2000)
    near("inverse terms", values(last, 350)[0], 1900 + 175 + 3e6 / 350 ** 2 + 2e4 / 350, 2000)
    # The reference: 298.15 K lies beyond the crystal's ranges, so it is their end next to it.
    cp, h, s = values(second, 293.15)
    near("enthalpy of the reference", h, 0, cp * 293.15)
    near("entropy of the reference", s, 0, cp)
    for below, above, T in ((first, second, 280), (table, last, 310)):
        for k, scale in ((1, 2000 * T), (2, 2000)):
            near(f"no step at {T}", values(below, T)[k], values(above, T)[k], scale)
    # The transition at 295 K lies above the crystal's ranges, where the heat capacity is held.
    held = values(second, 293.15)[0]
    near("enthalpy of transition", values(table, 295)[1] - held * (295 - 293.15), 200000, 2000 * 295)
    near("entropy of transition", values(table, 295)[2] - held * math.log(295 / 293.15), 200000 / 295, 2000)

refused("data.txt:5: heat-capacity: not an ascending range", "250 280", "280 250")
refused("data.txt:5: heat-capacity: not an ascending range", "250 280", "-5 280")
refused("data.txt:6: heat-capacity: a gap or an overlap: the range before ends at 280 K", "6.85 20", "7 20")
refused("data.txt:6: heat-capacity: 'in K' or 'in °C' is wanted", "in °C", "in °F")
refused("data.txt:5: heat-capacity: two temperatures and one to 5", "1500 2 in K", "in K")
refused("data.txt:6: heat-capacity: two temperatures and one to 5", "4e-7", "4e-7 5e-9")
refused("data.txt:5: 'x' is no number", "1500 2 in K", "1500 x in K")
refused("data.txt:5: heat-capacity: the heat capacity is not above zero at", "1500 2 in K", "1500 -5.5 in K")
refused("data.txt:11: heat-capacity-table: the temperatures do not ascend at 280", "310 2100 in", "280 2100 in")
refused("data.txt:11: heat-capacity-table: pairs of temperature and heat capacity", "310 2100 in", "310 in")
refused("data.txt:11: heat-capacity-table: the heat capacity is not above zero at", "310 2100 in", "310 -1 in")
refused("data.txt:13: inverse: 2 numbers are wanted", "inverse 3e6 2e4", "inverse 3e6")
refused("data.txt:7: inverse: no range by heat-capacity before it", "    heat-capacity 6.85",
        "    inverse 0 1\n    inverse 0 1\n#")
refused("data.txt:12: inverse: no range by heat-capacity before it", "    heat-capacity 310", "    inverse 0 1\n#")
refused("data.txt:3: trust does not hold the whole fit", "trust 240 300", "trust 260 300")
refused("data.txt:16: transition: the enthalpy is missing", " enthalpy 200000", "")
refused("data.txt:16: transition: the enthalpy is not above zero", "enthalpy 200000", "enthalpy -1")
refused("data.txt:16: transition: two state symbols", "enthalpy 200000", "enthalpie 200000")
refused("data.txt:16: transition: not within the trust of cr", "l 295", "l 305")
refused("data.txt:9: no transition from cr to l", "  transition cr l 295 enthalpy 200000\n", "")
refused("data.txt:4: unknown model", "heat-capacity-polynomial", "heat-capacity-polynom")
refused("data.txt:3: model nasa-polynomial without an interval", "model heat-capacity-polynomial",
        "model nasa-polynomial")
refused("data.txt:3: model heat-capacity-polynomial with an interval", "    trust 240",
        "    interval 250 280\n    trust 240")
refused("data.txt:9: model heat-capacity-polynomial is for condensed phases only", "phase l liquid",
        "phase g gas")
refused("data.txt:3: model heat-capacity-polynomial without a range of heat capacity",
        "    heat-capacity 250 280 1500 2 in K\n    heat-capacity 6.85 20 900 1 2e-3 3e-5 4e-7 in °C\n", "")

GAS = "  phase g gas\n    model steam\n    uncertainty u\n"
code, said, out = compiled(SUBSTANCE.replace("  transition", GAS + "  transition"))
check(f"a gas with a reference of its own: {said}",
      code != 0 and not out and said.startswith("data.txt:16: a phase of another model beside one of"))

CONSTANT = """substance lump
  source s
  phase cr crystal
    model constant-heat-capacity
    heat-capacity 500
    reference 300 0 0
    fit 300 400
    trust 300 400
    uncertainty u
  phase l liquid
    model constant-heat-capacity
    heat-capacity 600
    reference 400 0 0
    fit 400 500
    trust 400 500
    uncertainty u
  transition cr l 400 enthalpy 1000
"""
code, said, out = compiled(CONSTANT)
check(f"an enthalpy beside models with their own: {said}",
      code != 0 and not out and said.startswith("data.txt:17: enthalpy: only between phases of model heat-cap"))

checks.end()
