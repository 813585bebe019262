"""Writes the table of cell functions into a Markdown file, between its two marks, from the catalogue.

usage: generate_reference.py FILE           rewrite the table in FILE
       generate_reference.py FILE --check   exit with 1 when the table in FILE is not up to date
"""

import sys
from pathlib import Path

from catalogue import Function, load

BEGIN = "<!-- functions: generated from functions/catalogue.toml -->\n"
END = "<!-- end of functions -->\n"


def signature(f: Function) -> str:
    def shown(a):
        name = a.name + ("…" if a.repeated else "")
        return f"[{name}]" if a.optional else name
    return f"`{f.name}({'; '.join(shown(a) for a in f.arguments)})`"


def table() -> str:
    catalogue = load()
    lines = ["**Views of a process.** Each function is called `VIEW.PROCESS`; every view is there for every process that it "
             "makes sense for.", "", "| view | result |", "|---|---|"]
    lines += [f"| `{name}.` | {view['text']} |" for name, view in catalogue.views.items()]
    lines += ["", "| process | what happens | with the view `ENTROPY.` or `HEAT.` | with the other views |", "|---|---|---|---|"]
    for name, process in catalogue.processes.items():
        by_view = {f.view: f for f in catalogue.functions if f.process == name}
        other = by_view.get("GENERATION")
        others = signature(other).replace(other.view + ".", "….") if other else "the same; no `GENERATION.`"
        lines.append(f"| `{name}` | {process['text']} | {signature(by_view['ENTROPY'])} | {others} |")
    lines += ["", "`T_reservoir` is required by `GENERATION.` and optional for `STEPS.`, `SOURCE.` and `CHECK.`. "
              "TRANSFER, DISSIPATION and MIXING need no reservoir: their `ENTROPY.` is the entropy generated. `ENTROPY.RESERVOIR` is the "
              "entropy change of the reservoir alone, and `HEAT.TRANSFER` is 0: what one reservoir gives the other takes.",
              "", "**Plain functions.**", "", "| function | result |", "|---|---|"]
    lines += [f"| {signature(f)} | {f.text} |" for f in catalogue.functions if not f.process]
    return "\n".join(lines) + "\n"


def main() -> int:
    path = Path(sys.argv[1])
    text = path.read_text(encoding="utf-8")
    before, _, rest = text.partition(BEGIN)
    _, found, after = rest.partition(END)
    if not found:
        print(f"{path}: the marks for the table are missing", file=sys.stderr)
        return 1
    wanted = before + BEGIN + table() + END + after
    if "--check" in sys.argv[2:]:
        if wanted != text:
            print(f"{path}: the table of functions is not up to date; run functions/generate_reference.py {path}",
                  file=sys.stderr)
        return int(wanted != text)
    path.write_text(wanted, encoding="utf-8")
    return 0


sys.exit(main())
