"""Generates, from the catalogue, the C++ table of the cell functions.

usage: generate_entries.py OUTPUT_DIRECTORY
Writes function_id.hpp (the identifiers), keys.hpp (the arguments) and entries.inc (the table, included by call.cpp).
"""

import sys
from pathlib import Path

from catalogue import WHOLE_RANGES, load


def quoted(text: str) -> str:
    return '"' + text.replace("\\", "\\\\").replace('"', '\\"') + '"'


def write(path: Path, text: str) -> None:
    if not path.exists() or path.read_text(encoding="utf-8") != text:
        path.write_text(text, encoding="utf-8")


def main() -> None:
    out = Path(sys.argv[1])
    out.mkdir(parents=True, exist_ok=True)
    catalogue = load()
    head = "// Generated from functions/catalogue.toml.\n"

    ids = ",\n".join(f"    {f.identifier}" for f in catalogue.functions)
    write(out / "function_id.hpp", f"""{head}#pragma once

#include <cstddef>
#include <cstdint>

namespace entropy_ledger::functions {{

enum class FunctionId : std::uint16_t {{
{ids}
}};

inline constexpr std::size_t function_count = {len(catalogue.functions)};

}} // namespace entropy_ledger::functions
""")

    takes_table = " || ".join(f"key == Key::{k}" for k, kind in catalogue.argument_kinds.items()
                              if kind in ("state", "substance"))
    keys = ",\n".join(f"    {k}" for k in catalogue.argument_kinds)
    write(out / "keys.hpp", f"""{head}#pragma once

#include <cstddef>
#include <cstdint>

namespace entropy_ledger::functions {{

// The arguments of the catalogue.
enum class Key : std::uint8_t {{
{keys}
}};

inline constexpr std::size_t key_count = {len(catalogue.argument_kinds)};

// Whether a range may stand in the argument's place as the user's own property table.
constexpr bool takes_table(Key key)
{{
    return {takes_table};
}}

}} // namespace entropy_ledger::functions
""")

    lines = [head]
    for f in catalogue.functions:
        lines.append(f"constexpr ArgumentEntry arguments_{f.identifier}[] = {{")
        for a in f.arguments:
            flag = "repeated" if a.repeated else "optional" if a.optional else "required"
            lines.append(f"    {{Key::{a.key}, {quoted(a.name)}, Need::{flag}}},")
        lines.append("};")
    lines.append("constexpr Entry entries[] = {")
    for f in catalogue.functions:
        whole = any(a.kind in WHOLE_RANGES for a in f.arguments)
        if f.process:
            show = "show_whole_process" if whole else "show_process"
            function = f"&{show}<views::{f.view.capitalize()}, processes::{f.process.capitalize()}>"
        else:
            function = f"&plain::{f.identifier}"
        handler, group = ("nullptr", function) if whole else (function, "nullptr")
        lines.append(f"    {{{quoted(f.name)}, arguments_{f.identifier}, "
                     f"places(arguments_{f.identifier}), ResultKind::{f.result}, {handler}, {group}}},")
    lines.append("};")
    write(out / "entries.inc", "\n".join(lines) + "\n")


main()
