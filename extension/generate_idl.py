"""Writes the UNO interfaces of the add-ins: generate_idl.py CATALOGUE OUTPUT.idl"""

import sys
from pathlib import Path

import addins

TYPES = {
    "any": "any",
    "range": "com::sun::star::table::XCellRange",
    "more": "sequence<any>",
}


def interface(addin: addins.AddIn) -> str:
    methods = []
    for method in addin.methods:
        parameters = ", ".join(f"[in] {TYPES[p.type]} {p.name}" for p in method.parameters)
        methods.append(f"    any {method.name}({parameters});\n")
    return f"interface {addin.interface} {{\n{''.join(methods)}}};\n"


def main(catalogue_path: str, output: str) -> None:
    loaded = addins.load(Path(catalogue_path))
    text = f"module {addins.MODULE} {{\n\n" + "\n".join(interface(a) for a in loaded) + "\n};\n"
    Path(output).write_text(text, encoding="utf-8")


if __name__ == "__main__":
    main(*sys.argv[1:])
