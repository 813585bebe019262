"""The scenario of the sample ledger. The plant, its duties and all figures are invented.

Each duty is one row of the ledger. `process` decides which cell functions the row uses; the other entries become its
input cells: temperatures in °C, pressure in bar, amount in the unit beside it.
"""

from dataclasses import dataclass

TITLE = "Second-law ledger of heat and cold: Weidenau dairy"
NOTICE = "Invented plant and figures, for demonstration. One working day."
ANSWERS = ("This sheet answers: how much entropy does each heating, cooling, melting, freezing, boiling and condensing duty "
           "generate, how much work does that destroy, and can each duty happen as specified?")
AMBIENT = 20.0           # °C


@dataclass(frozen=True)
class Duty:
    item: str
    happens: str
    process: str              # body, sensible, phase, change, transfer, dissipation
    amount: float             # kg; kJ/K for a body; MJ for transfer and dissipation
    start: float              # °C
    end: float | None         # °C
    surroundings: float | None  # °C
    substance: str = ""       # state, or substance for a phase change
    to: str = ""              # state at the end of a change; "l → cr" for a phase change
    pressure: float | None = None  # bar; none: 1 bar


DUTIES = [
    Duty("Milk reception", "Raw milk is cooled by ice water", "sensible", 12000, 34, 6, 2, "whole milk(l)"),
    Duty("Ice bank, by day", "Ice melts and cools the ice water", "phase", 3950, 0, None, 2, "water", "cr → l"),
    Duty("Ice bank, by night", "Undercooled water freezes on the coil", "phase", 3950, -3, None, -9, "water", "l → cr"),
    Duty("Pasteuriser, heating", "Milk is heated by condensing steam", "sensible", 12000, 60, 74, 121, "whole milk(l)"),
    Duty("Pasteuriser, cooling", "Milk is cooled by ice water", "sensible", 12000, 20, 5, 2, "whole milk(l)"),
    Duty("Boiler", "Feed water becomes steam; heat from flue gas", "change", 900, 15, 121, 800, "water(l)", "water(g)", 2),
    Duty("Chimney", "Flue gas, taken as air, cools to ambient", "sensible", 1500, 220, 20, 20, "air(g)"),
    Duty("Cleaning water, heating", "Water is heated by condensing steam", "sensible", 3000, 15, 80, 121, "water(l)", "", 3),
    Duty("Cleaning water, drain", "Used water cools to ambient", "sensible", 3000, 60, 20, 20, "water(l)"),
    Duty("Cheese moulds", "Aluminium moulds are warmed by hot water", "sensible", 600, 18, 65, 70, "Al(cr)"),
    Duty("Ripening racks", "Racks of known heat capacity are washed warm", "body", 240, 18, 60, 70),
    Duty("Whey evaporator", "Water boils under vacuum; heat from hot water", "phase", 500, 60, None, 75, "water", "l → g", 0.19946),
    Duty("Vapour condenser", "Vapour condenses 3 K below saturation", "phase", 500, 57, None, 25, "water", "g → l", 0.19946),
    Duty("Nitrogen for packing", "Cold nitrogen gas warms to the hall", "sensible", 200, -70, 15, 20, "N2(g)"),
    Duty("Cold store, walls", "Heat leaks in from ambient", "transfer", 350, 20, -22, None),
    Duty("Cold store, fans", "Fan work is turned to heat in the store", "dissipation", 95, -22, None, None),
    Duty("Pumps and separator", "Shaft work is turned to heat in the milk", "dissipation", 180, 50, None, None),
]

PROPOSALS = [
    Duty("Free cooling", "Freeze the ice bank with winter air of +3 °C", "phase", 3950, 0, None, 3, "water", "l → cr"),
    Duty("Warmer coil", "Freeze undercooled water on a coil of -4 °C", "phase", 3950, -3, None, -4, "water", "l → cr"),
]

# Before the verdict, the duty whose verdict and generation are shown, and after them.
FINDINGS = [
    ("Free cooling ", "Free cooling", "Water at 0 °C gives heat only to what is colder."),
    ("A warmer coil ", "Warmer coil", "It destroys less work by night than today's coil."),
    ("Undercooled water on the coil ", "Ice bank, by night",
     "Freezing away from equilibrium generates entropy even where the coil is as warm as the water."),
]

CAUTIONS = [
    "Steam and hot water under pressure scald and can burst vessels; undercooled water can freeze all at once. Follow the local code "
    "and have the work done and judged by licensed people.",
    "That a duty can occur does not say how fast. The figures are for an audit, not for the design of protective equipment.",
]
