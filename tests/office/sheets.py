"""Cells of a spreadsheet document, for tests."""

from dataclasses import dataclass

import uno  # noqa: F401  (makes the next line possible)
from com.sun.star.sheet.FormulaResult import STRING


@dataclass(frozen=True)
class CellError:
    """An error as Calc numbers it: 502, 523, 32767 for #N/A."""
    code: int


def first_sheet(document):
    return document.Sheets.getByIndex(0)


def cell(document, address: str):
    return first_sheet(document).getCellRangeByName(address).getCellByPosition(0, 0)


def set_formula(document, address: str, formula: str):
    """Formulas are given as files hold them: English names, semicolons between arguments, decimal point."""
    target = cell(document, address)
    target.setFormula(formula)
    return target


def set_array_formula(document, address: str, formula: str):
    target = first_sheet(document).getCellRangeByName(address)
    target.setArrayFormula(formula)
    return target


def set_values(document, address: str, rows) -> None:
    first_sheet(document).getCellRangeByName(address).setDataArray(tuple(tuple(row) for row in rows))


def value(source):
    """What the cell holds: a float, a text, or a CellError."""
    if source.getError():
        return CellError(source.getError())
    if source.FormulaResultType2 == STRING or source.Type.value == "TEXT":
        return source.getString()
    return source.getValue()


def values(document, address: str) -> list[list]:
    area = first_sheet(document).getCellRangeByName(address)
    rows, columns = area.Rows.Count, area.Columns.Count
    return [[value(area.getCellByPosition(c, r)) for c in range(columns)] for r in range(rows)]


def evaluate(document, formula: str, address: str = "A1"):
    """The value of a formula written into a cell."""
    return value(set_formula(document, address, formula))
