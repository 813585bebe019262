"""An example for every argument of the catalogue, so that tests can call every function."""

import sys
from pathlib import Path

from sheets import set_values

sys.path.insert(0, str(Path(__file__).resolve().parents[2] / "functions"))
import catalogue  # noqa: E402  (found through the line above)

# What prepare() puts into cells, for the arguments that are ranges.
CELLS = {
    "Z1:Z4": [[1.0], [2.0], [""], [4.0]],  # an empty cell among numbers
    "Y1:Y2": [["3 mol"], ["1 mol"]],
    "X1:X2": [["N2"], ["O2"]],
    "W1:W2": [[500.0], ["1.5 kJ/K"]],
    "V1:V2": [[350.0], ["7 °C"]],
}

# What a formula holds for an argument, by its key in the catalogue. Together they make sense for every process:
# water, as ice at 268.15 K and as liquid at 283.15 K; liquid water may be supercooled to 268.15 K.
EXAMPLES = {
    "substance": '"water(l)"', "material": '"water"', "state": '"water(l)"',
    "from": '"cr"', "to": '"l"', "start": '"water(cr)"', "end": '"water(l)"',
    "T": "272.15", "T_start": "268.15", "T_end": "283.15", "T_from": "350", "T_to": "300",
    "T_reservoir": '"20 °C"', "T_ambient": "293.15",
    "amount": '"2 kg"',
    "p": "100000", "p_start": "100000", "p_end": '"1 bar"', "p_from": "100000", "p_to": '"2 bar"',
    "heat_capacity": "500", "heat": "1000", "heat_moved": '"1 kJ"', "heat_balance": "1000", "work": "1000",
    "items": "Z1:Z4", "heat_items": "Z1:Z4", "amounts": "Y1:Y2", "substances": "X1:X2",
    "capacities": "W1:W2", "temperatures": "V1:V2", "way": '"reversible"',
    "total": "1.5", "generation": "1.5", "entropy_change": "3.5", "uncertainty": "0.1", "coverage": "2",
    "filter": '"water"', "symbol": '"l"', "T_within": "300", "which": '"lower"',
}

FUNCTIONS = catalogue.load().functions


def prepare(document) -> None:
    for address, rows in CELLS.items():
        set_values(document, address, rows)


def formula(function: catalogue.Function, optional: bool = True, **instead: str) -> str:
    """A call of the function; `instead` replaces examples by the arguments' keys."""
    if not optional:
        # Those in front of a required argument are left out by an empty place, those at the end altogether.
        required = max((i + 1 for i, a in enumerate(function.arguments) if not a.optional), default=0)
    arguments = ["" if a.optional and not optional else instead.get(a.key, EXAMPLES[a.key])
                 for a in function.arguments[:None if optional else required]]
    return f"={function.name}({';'.join(arguments)})"
