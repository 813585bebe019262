"""Bad property data is refused with file and line, and good data of every kind is compiled.

Usage: nasa_data_refusals.py REGISTRY_DIR
"""
import sys

from data_compiler import Checks

SUBSTANCE = """substance Xx
  formula Xx
  title exium
  molar-mass 10 g/mol
  source s
  phase cr,alpha crystal
    model nasa-polynomial
    trust 190 410
    uncertainty u
    interval 200 300
      a 0 0 1.5 0 0 0 0
      b 1 2
    interval 300 400
      a 0 0 1.5 0 0 0 0
      b 1 2
  phase l liquid
    model constant-heat-capacity
    heat-capacity 4000
    reference 400 0 0
    fit 400 500
    trust 350 500
    uncertainty u growth 0.002
    remark said "so"
  phase g gas
    model steam
    uncertainty u
  transition cr,alpha l 400
"""

checks = Checks(sys.argv[1], SUBSTANCE, "Xx = exium; examplium\n")
check, compiled, refused = checks.check, checks.compiled, checks.refused


code, said, out = compiled(SUBSTANCE)
check(f"good data: {said}", code == 0 and not said)
for part in ("ConstantHeatCapacity{4000.0, 400.0, 0.0, 0.0, {400.0, 500.0}, {350.0, 500.0}, &source_0}", "Steam{}",
             "NasaPolynomial{intervals + 0, bounds + 0, 2, nasa_gas_constant / 0.010, false, {190.0, 410.0}, "
             "&source_0}", r'"said \"so\""',
             '"examplium"'):
    check(f"good data without {part}", part in out)

refused("data.txt:2: unknown keyword 'fromula'", "  formula", "  fromula")
refused("data.txt:1: unknown keyword 'matter'", "substance Xx", "matter Xx")
refused("data.txt:13: a gap or an overlap", "interval 300 400", "interval 301 400")
refused("data.txt:10: interval: not an ascending range", "interval 200 300", "interval 300 200")
refused("data.txt:11: a: 7 numbers are wanted, there are 6", "a 0 0 1.5 0 0 0 0", "a 0 0 1.5 0 0 0")
refused("data.txt:11: 'x' is no number", "a 0 0 1.5", "a 0 x 1.5")
refused("data.txt:11: 'nan' is not finite", "a 0 0 1.5", "a 0 nan 1.5")
refused("data.txt:10: interval without a or b", "      b 1 2\n", "")
refused("data.txt:6: trust does not hold the whole fit", "trust 190 410", "trust 210 410")
refused("data.txt:7: unknown model 'magic'", "model nasa-polynomial", "model magic")
refused("data.txt:6: unknown class of uncertainty 'v'", "uncertainty u", "uncertainty v")
refused("data.txt:6: unknown source 'none'", "source s", "source none")
refused("data.txt:5: source is missing", "  source s\n", "")
refused("data.txt:4: molar-mass: in g/mol or kg/mol", "10 g/mol", "10")
refused("data.txt:1: molar-mass is missing", "  molar-mass 10 g/mol\n", "")
refused("data.txt:16: phase cr,alpha: stated twice", "phase l liquid", "phase cr,alpha crystal")
refused("data.txt:16: the state symbol l is none of gas", "phase l liquid", "phase l gas")
refused("data.txt:27: transition of a phase that", "transition cr,alpha l", "transition cr l")
refused("data.txt:27: transition of phases that are no neighbouring", "transition cr,alpha l", "transition l g")
refused("data.txt:28: substance Xx: stated twice", "cr,alpha l 400\n", "cr,alpha l 400\nsubstance Xx\n")
refused("names.txt:1: unknown substance 'Yy'", "Xx", "Xx", "Yy = whyium\n")
refused("names.txt:1: 'substance = name; name' is wanted", "Xx", "Xx", "Xx\n")

OTHER = SUBSTANCE + SUBSTANCE.replace("Xx", "Yy").replace("exium", "whyium")
code, said, _ = compiled(OTHER, "Xx = exium\nYy = exium\n")
check(f"a name of two substances: {said}",
      code != 0 and said == "names.txt:2: the name 'exium' already stands for another substance")
code, said, out = compiled(OTHER.replace("formula Yy", "formula Xx"))
check(f"a formula that is another's name: {said}", code == 0 and '{"Yy", 1},' in out and '{"Xx", 0},' in out)

checks.end()
