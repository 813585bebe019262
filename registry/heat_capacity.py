"""Heat capacities given as powers of temperature or as tables, made into the intervals of a NASA polynomial.

Used by compile_data.py for the model heat-capacity-polynomial. A NasaInterval with specific gas constant 1 carries
  cp = a1/T^2 + a2/T + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4           J/(kg K)
  h  = -a1/T + a2 ln T + a3 T + a4 T^2/2 + a5 T^3/3 + ... + b1         J/kg
  s  = -a1/(2 T^2) - a2/T + a3 ln T + a4 T + a5 T^2/2 + ... + b2       J/(kg K)
The constants b1 and b2 are worked out here: the first phase has h = 0 and s = 0 at 298.15 K or, where it does not reach
there, at its nearest end; h and s run on without a step from range to range; and each phase change takes up the stated
enthalpy with equal Gibbs energies at its temperature. So all phases of the substance share one reference.

Decimals of 50 digits; the coefficients are rounded to double first, so that the constants fit what is evaluated.
"""
from dataclasses import dataclass
from decimal import Context, Decimal, localcontext
from math import comb

REFERENCE_TEMPERATURE = Decimal("298.15")  # K
ZERO_CELSIUS = Decimal("273.15")           # K
SCALES = {"K": Decimal(0), "°C": ZERO_CELSIUS}
HIGHEST_POWER = 4                          # a7 T^4
SAMPLES = 64                               # of each range, to see that the heat capacity is above zero
PRECISION = Context(prec=50)


@dataclass
class Piece:
    """One range with its seven coefficients and, once linked, its two constants."""
    line: object
    lower: Decimal  # K
    upper: Decimal  # K
    a: list         # a1 to a7
    b: list = None  # b1, b2

    @property
    def bounds(self):
        return self.lower, self.upper

    def heat_capacity(self, T):
        a = self.a
        return a[0] / T ** 2 + a[1] / T + sum(c * T ** k for k, c in enumerate(a[2:]))

    def enthalpy_part(self, T):
        a = self.a
        return -a[0] / T + a[1] * T.ln() + sum(c * T ** (k + 1) / (k + 1) for k, c in enumerate(a[2:]))

    def entropy_part(self, T):
        a = self.a
        return (-a[0] / (2 * T ** 2) - a[1] / T + a[2] * T.ln()
                + sum(c * T ** k / k for k, c in enumerate(a[3:], 1)))


def with_scale(line):
    """The values before 'in K' or 'in °C' as decimals, and the zero of that scale in K."""
    values, separator, scale = line.rest.rpartition(" in ")
    if not separator or scale not in SCALES:
        line.fail(f"{line.keyword}: 'in K' or 'in °C' is wanted at the end")
    return [line.number_of(text) for text in values.split()], SCALES[scale]


def add_piece(pieces, line, lower, upper, powers, zero):
    """A range; `powers` are the coefficients of (T - zero)^0, ^1, ..."""
    if not 0 < lower < upper:
        line.fail(f"{line.keyword}: not an ascending range of temperatures above 0 K")
    if pieces and pieces[-1].upper != lower:
        line.fail(f"{line.keyword}: a gap or an overlap: the range before ends at {pieces[-1].upper} K")
    with localcontext(PRECISION):
        in_kelvin = [sum((c * comb(n, k) * (-zero) ** (n - k) if n > k else c
                          for n, c in enumerate(powers) if n >= k), Decimal(0))
                     for k in range(HIGHEST_POWER + 1)]
        pieces.append(Piece(line, lower, upper, [Decimal(float(c)) for c in [0, 0, *in_kelvin]]))


def read_polynomial(pieces, line):
    """heat-capacity LOWER UPPER c0 [c1 ... c4] in SCALE"""
    values, zero = with_scale(line)
    if not 3 <= len(values) <= 3 + HIGHEST_POWER:
        line.fail(f"{line.keyword}: two temperatures and one to {HIGHEST_POWER + 1} coefficients are wanted")
    add_piece(pieces, line, values[0] + zero, values[1] + zero, values[2:], zero)


def read_inverse(pieces, line):
    """inverse c-2 c-1: terms c-2/T^2 + c-1/T, T in K, added to the range before."""
    values = [line.number_of(text) for text in line.numbers(2)]
    if not pieces or pieces[-1].line.keyword != "heat-capacity" or any(pieces[-1].a[:2]):
        line.fail("inverse: no range by heat-capacity before it, or a second one")
    pieces[-1].a[:2] = [Decimal(float(c)) for c in values]


def read_table(pieces, line):
    """heat-capacity-table T c T c ... in SCALE: linear between the knots"""
    values, zero = with_scale(line)
    if len(values) < 4 or len(values) % 2:
        line.fail(f"{line.keyword}: pairs of temperature and heat capacity are wanted, two at least")
    knots = [(T + zero, c) for T, c in zip(values[::2], values[1::2])]
    for (T1, c1), (T2, c2) in zip(knots, knots[1:]):
        if T2 <= T1:
            line.fail(f"{line.keyword}: the temperatures do not ascend at {T2 - zero}")
        with localcontext(PRECISION):
            slope = (c2 - c1) / (T2 - T1)
            powers = [c1 - slope * T1, slope]
        add_piece(pieces, line, T1, T2, powers, Decimal(0))


def check_above_zero(pieces):
    for piece in pieces:
        for i in range(SAMPLES + 1):
            T = piece.lower + (piece.upper - piece.lower) * i / SAMPLES
            if piece.heat_capacity(T) <= 0:
                piece.line.fail(f"{piece.line.keyword}: the heat capacity is not above zero at {T.normalize():f} K")


def at(pieces, T):
    """Enthalpy and entropy of linked pieces; beyond their ends the heat capacity is held, as phase.hpp has it."""
    edge = min(max(T, pieces[0].lower), pieces[-1].upper)
    piece = next(p for p in pieces if edge <= p.upper)
    held = piece.heat_capacity(edge)
    return (piece.enthalpy_part(edge) + piece.b[0] + held * (T - edge),
            piece.entropy_part(edge) + piece.b[1] + held * (T / edge).ln())


def link_pieces(pieces, T, enthalpy, entropy):
    """Constants with which the pieces have these values at T, and no step where they meet."""
    pieces[0].b = [Decimal(0), Decimal(0)]
    for below, above in zip(pieces, pieces[1:]):
        above.b = [f(below) + c - f(above) for f, c in ((lambda p, t=above.lower: p.enthalpy_part(t), below.b[0]),
                                                        (lambda p, t=above.lower: p.entropy_part(t), below.b[1]))]
    h, s = at(pieces, T)
    for piece in pieces:
        piece.b = [piece.b[0] + enthalpy - h, piece.b[1] + entropy - s]


def link_phases(phases, changes):
    """Constants of all phases, lists of pieces in order of stability; `changes` between them: (temperature, enthalpy)."""
    with localcontext(PRECISION):
        for pieces in phases:
            check_above_zero(pieces)
        first = phases[0]
        link_pieces(first, min(max(REFERENCE_TEMPERATURE, first[0].lower), first[-1].upper), Decimal(0), Decimal(0))
        for below, above, (T, enthalpy) in zip(phases, phases[1:], changes):
            h, s = at(below, T)
            link_pieces(above, T, h + enthalpy, s + enthalpy / T)
