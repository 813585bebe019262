"""Opens a ledger in a headless office, recalculates everything, prints the ledger and writes PDF and PNG.

usage: audit.py EXTENSIONS WORKBOOK OUTPUT_DIRECTORY
"""

import subprocess
import sys
from pathlib import Path

HERE = Path(__file__).resolve().parent
sys.path.insert(0, str(HERE.parent / "tests" / "office"))

from office_session import OfficeSession, properties  # noqa: E402

SHOWN = {"No.": 4, "Item": 26, "Heat taken up, MJ": 9, "Entropy of system, kJ/K": 10, "Entropy of surroundings, kJ/K": 13,
         "Generated, kJ/K": 10, "Lost work, kWh": 9, "Verdict": 13}


def plain(heading: str) -> str:
    """A heading without its line breaks and hyphenation."""
    return heading.replace("-\n", "").replace("\n", " ")


def read_rows(sheet) -> list[list[str]]:
    cursor = sheet.createCursor()
    cursor.gotoEndOfUsedArea(False)
    last = cursor.RangeAddress
    return [[sheet.getCellByPosition(c, r).String for c in range(last.EndColumn + 1)] for r in range(last.EndRow + 1)]


def print_ledger(rows: list[list[str]]) -> None:
    start = next(i for i, row in enumerate(rows) if row[:2] == ["No.", "Item"])
    headings = [plain(h) for h in rows[start]]
    columns = [headings.index(name) for name in SHOWN]
    widths = list(SHOWN.values())

    def line(cells: list[str]) -> str:
        return "  ".join(c.ljust(w) if i == 1 else c.rjust(w) for i, (c, w) in enumerate(zip(cells, widths))).rstrip()

    print(rows[0][0], rows[1][0], sep="\n", end="\n\n")
    wrapped = [name.replace("Entropy of ", "Entropy of|").replace("Heat taken up", "Heat taken|up")
               .replace("surroundings", "surroundings").replace(", ", ",|").split("|") for name in SHOWN]
    depth = max(map(len, wrapped))
    for level in range(depth):
        print(line([([""] * (depth - len(w)) + w)[level] for w in wrapped]))
    print("-" * (sum(widths) + 2 * len(widths) - 2))
    for row in rows[start + 1:]:
        cells = [row[c] for c in columns]
        if row[0] and not row[1]:
            print("\n" + row[0])
        elif cells[1] and any(cells[2:]):
            if not row[0] and row[columns[-1]]:
                print("-" * (sum(widths) + 2 * len(widths) - 2))
            print(line(cells) if row[columns[-1]] else f"{row[1]}: {cells[5]}")
    print()
    for row in rows[start + 1:]:
        if row[1] and not any(row[2:]):
            print(row[1])


def errors(document) -> list[str]:
    found = []
    for sheet in document.Sheets:
        formulas = sheet.queryFormulaCells(4)  # com.sun.star.sheet.FormulaResult.ERROR
        for area in formulas.RangeAddresses:
            cell = sheet.getCellByPosition(area.StartColumn, area.StartRow)
            found.append(f"{cell.AbsoluteName}: {cell.String}")
    return found


def main() -> int:
    extensions, workbook, output = map(Path, sys.argv[1:4])
    output.mkdir(parents=True, exist_ok=True)
    pdf = output / (workbook.stem + ".pdf")
    with OfficeSession(extensions=extensions) as office:
        document = office.load(workbook)
        document.calculateAll()
        print_ledger(read_rows(document.Sheets.getByIndex(0)))
        found = errors(document)
        document.storeToURL(pdf.resolve().as_uri(), properties(FilterName="calc_pdf_Export"))
    pages = output / workbook.stem
    subprocess.run(["pdftoppm", "-r", "110", "-png", str(pdf), str(pages)], check=True)
    print("\nWritten:", pdf, *sorted(output.glob(workbook.stem + "-*.png")))
    for error in found:
        print("error in", error, file=sys.stderr)
    return 1 if found else 0


sys.exit(main())
