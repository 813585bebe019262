"""How the catalogue's functions become add-ins of Calc. Used by the generators of this folder.

One view (prefix) is one add-in: an implementation named as the prefix, with one interface and one method a function.
Calc stores and shows "IMPLEMENTATION.METHOD", so that name is the same in files and on screen.
"""

import re
import sys
from dataclasses import dataclass
from pathlib import Path

sys.path.insert(0, str(Path(__file__).resolve().parent.parent / "functions"))
import catalogue  # noqa: E402  (found through the line above)

MODULE = "entropyledger"  # of the UNO types


@dataclass(frozen=True)
class Parameter:
    """One parameter of a UNO method. Calc's names for the kinds: com::sun::star::sheet::AddIn."""
    name: str   # in the IDL; the configuration's node has the same name, by which Calc finds the texts
    type: str   # "any", "range" (must be a reference) or "more" (any number of values)
    shown: str
    text: str
    key: str    # the entry of the catalogue's arguments


@dataclass(frozen=True)
class Method:
    function: catalogue.Function
    parameters: tuple[Parameter, ...]

    @property
    def name(self) -> str:
        return self.function.method.lower()


@dataclass(frozen=True)
class AddIn:
    view: str
    methods: tuple[Method, ...]

    @property
    def interface(self) -> str:
        return "X" + self.view.capitalize()

    @property
    def constructor(self) -> str:
        return f"{MODULE}_{self.view.lower()}_get_implementation"


def _parameters(function: catalogue.Function) -> tuple[Parameter, ...]:
    parameters = []

    def add(argument: catalogue.Argument, type_: str) -> None:
        # Numbered, so that the order by name, in which the configuration hands out its nodes, is the right one.
        # UNO's identifiers have no underscores.
        name = f"a{len(parameters) + 1:02}{re.sub('[^A-Za-z0-9]', '', argument.name.title())}"
        parameters.append(Parameter(name, type_, argument.name, argument.text, argument.key))

    for argument in function.arguments:
        if argument.repeated:
            # In an `any`, an empty cell and a formula that returns "" look the same. A range parameter lets the
            # adapter ask the cells themselves. It cannot repeat, so what follows the first item comes as `any`.
            add(argument, "range")
            add(argument, "more")
        else:
            add(argument, "any")
    return tuple(parameters)


def load(path: Path) -> tuple[AddIn, ...]:
    by_view: dict[str, list[Method]] = {}
    for function in catalogue.load(path).functions:
        by_view.setdefault(function.view, []).append(Method(function, _parameters(function)))
    return tuple(AddIn(view, tuple(methods)) for view, methods in by_view.items())
