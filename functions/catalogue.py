"""Reads the catalogue and expands it to the list of cell functions. Used by all generators."""

import tomllib
from dataclasses import dataclass
from pathlib import Path


# Kinds of arguments that take a range as a whole; ranges in other arguments are spread, one result a cell.
WHOLE_RANGES = {"items", "amounts", "substances", "capacities", "temperatures"}


@dataclass(frozen=True)
class Argument:
    key: str        # entry of [arguments]
    name: str       # as shown
    kind: str
    text: str
    optional: bool
    repeated: bool


@dataclass(frozen=True)
class Function:
    view: str       # the prefix: "ENTROPY"
    method: str     # "SENSIBLE"
    process: str | None  # the process, or None for a plain function
    text: str
    result: str     # "number", "text" or "table"
    arguments: tuple[Argument, ...]

    @property
    def name(self) -> str:
        return f"{self.view}.{self.method}"

    @property
    def identifier(self) -> str:
        """Name in C++ and IDL: entropy_sensible."""
        return f"{self.view}_{self.method}".lower()


@dataclass(frozen=True)
class Catalogue:
    functions: tuple[Function, ...]
    argument_kinds: dict[str, str]  # by key
    views: dict
    processes: dict


def load(path: Path = Path(__file__).with_name("catalogue.toml")) -> Catalogue:
    raw = tomllib.loads(Path(path).read_text(encoding="utf-8"))

    def argument(spelled: str) -> Argument:
        key = spelled.rstrip("?.")
        entry = raw["arguments"][key]
        optional = spelled.endswith("?")
        # Calc's wizard shows every argument of an add-in's free type as optional.
        text = entry["text"] if optional else entry["text"] + " Required."
        return Argument(key, entry.get("shown", key), entry["kind"], text, optional, spelled.endswith("..."))

    def with_reservoir(process: dict, need: str) -> list[str]:
        arguments = list(process["arguments"])
        if need != "none" and "reservoir_after" in process:
            place = arguments.index(process["reservoir_after"]) + 1
            arguments.insert(place, "T_reservoir" + ("?" if need == "optional" else ""))
        return arguments

    functions = []
    for view_name, view in raw["views"].items():
        for process_name, process in raw["processes"].items():
            if view["reservoir"] == "required" and "reservoir_after" not in process:
                continue  # the process needs no other reservoir than its own
            functions.append(Function(
                view_name, process_name, process_name, f"{view['text']}, {process['text']}.", view["result"],
                tuple(argument(a) for a in with_reservoir(process, view["reservoir"]))))
    for name, entry in raw["functions"].items():
        view_name, method = name.split(".")
        functions.append(Function(view_name, method, None, entry["text"], entry["result"],
                                  tuple(argument(a) for a in entry["arguments"])))

    names = [f.name for f in functions]
    if len(set(names)) != len(names):
        raise ValueError("catalogue: a function is listed twice")
    for f in functions:
        optional = False
        for a in f.arguments:
            if optional and not a.optional and a.key != "T_reservoir":
                raise ValueError(f"catalogue: {f.name}: a required argument follows an optional one")
            optional = optional or a.optional
            if a.repeated and a is not f.arguments[-1]:
                raise ValueError(f"catalogue: {f.name}: only the last argument can repeat")
    return Catalogue(tuple(functions), {key: entry["kind"] for key, entry in raw["arguments"].items()}, raw["views"], raw["processes"])
