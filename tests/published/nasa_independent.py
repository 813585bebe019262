"""Evaluates every phase of the data file nasa-glenn.txt by quadrature, for comparison with the property core.

Usage: nasa_independent.py DATA_FILE OUTPUT
Reads the file by its own reader. Heat capacity: the sum of NASA/TP-2002-211556 equation (1). Enthalpy and entropy:
the values of equations (2) and (3) at the lower end of the interval, summed by math.fsum, plus SciPy's quadrature of cp
and of cp/T from there on. Beyond the fit of a condensed phase, cp held at its value at the end.
Each line of OUTPUT: state, T/K, p/Pa, cp, h, s; J/(kg K), J/kg, J/(kg K); separated by tabs.
"""
import math
import sys

from scipy.integrate import quad

R = 8.314510       # J/(mol K), the value of the set
STANDARD = 1.0e5   # Pa
PLACES = (0.06, 0.47, 0.94)  # of the range of the fit
PRESSURES = (1.0e5, 5.0e5, 2.0e4)  # Pa


def phases(path):
    """Yields substance, symbol, aggregation, molar mass in kg/mol, trust, [(lower, upper, a, b)]."""
    substance = molar_mass = phase = None
    with open(path, encoding="utf-8") as file:
        for line in file:
            word, *rest = line.split() or [""]
            if word in ("substance", "phase") and phase:
                yield phase
                phase = None
            if word == "substance":
                substance = rest[0]
            elif word == "molar-mass":
                molar_mass = float(rest[0]) * {"g/mol": 1e-3, "kg/mol": 1.0}[rest[1]]
            elif word == "phase":
                phase = [substance, rest[0], rest[1], molar_mass, None, []]
            elif word == "trust":
                phase[4] = tuple(map(float, rest))
            elif word == "interval":
                phase[5].append([*map(float, rest)])
            elif word in ("a", "b"):
                phase[5][-1].append([*map(float, rest)])
    yield phase


def heat_capacity(interval, T):
    return math.fsum(a * T ** (k - 2) for k, a in enumerate(interval[2]))


def at_lower_end(interval):
    T, _, a, b = interval
    h = [-a[0] / T, a[1] * math.log(T), a[2] * T] + [a[k] * T ** (k - 1) / (k - 1) for k in (3, 4, 5, 6)]
    s = [-a[0] / (2 * T * T), -a[1] / T, a[2] * math.log(T)] + [a[k] * T ** (k - 2) / (k - 2) for k in (3, 4, 5, 6)]
    return math.fsum(h + [b[0]]), math.fsum(s + [b[1]])


def evaluate(intervals, T):
    """cp/R, h/R, s/R within the fit."""
    interval = next((i for i in intervals if T < i[1]), intervals[-1])
    h, s = at_lower_end(interval)
    lower = interval[0]
    if T > lower:
        h += quad(lambda t: heat_capacity(interval, t), lower, T, epsabs=0, epsrel=1e-13, limit=200)[0]
        s += quad(lambda t: heat_capacity(interval, t) / t, lower, T, epsabs=0, epsrel=1e-13, limit=200)[0]
    return heat_capacity(interval, T), h, s


def held(intervals, end, T):
    cp, h, s = evaluate(intervals, end)
    return cp, h + cp * (T - end), s + cp * math.log(T / end)


def main(data_file, output):
    with open(output, "w", encoding="utf-8") as out:
        for substance, symbol, aggregation, molar_mass, trust, intervals in phases(data_file):
            lower, upper = intervals[0][0], intervals[-1][1]
            points = [(T, evaluate(intervals, T)) for T in (lower + place * (upper - lower) for place in PLACES)]
            if trust[0] < lower:
                T = 0.5 * (trust[0] + lower)
                points.append((T, held(intervals, lower, T)))
            if trust[1] > upper:
                T = 0.5 * (trust[1] + upper)
                points.append((T, held(intervals, upper, T)))
            for k, (T, (cp, h, s)) in enumerate(points):
                p = PRESSURES[k % len(PRESSURES)]
                if aggregation == "gas":
                    s -= math.log(p / STANDARD)
                values = (R / molar_mass * x for x in (cp, h, s))
                out.write("\t".join([f"{substance}({symbol})", repr(T), repr(p), *map(repr, values)]) + "\n")


if __name__ == "__main__":
    if len(sys.argv) != 3:
        sys.exit(__doc__)
    import warnings

    warnings.filterwarnings("ignore")  # quadrature to the last digit warns of rounding
    main(*sys.argv[1:])
