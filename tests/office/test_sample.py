"""The sample ledger in a real office: no error cell, the same figures after recalculation, and it follows its inputs."""

import unittest
from pathlib import Path

from office_test import OfficeTest
from sheets import CellError, value

SAMPLES = Path(__file__).resolve().parents[2] / "samples"


def by_position(document):
    """All cells that hold something, by sheet and position."""
    found = {}
    for sheet in document.Sheets:
        cursor = sheet.createCursor()
        cursor.gotoEndOfUsedArea(False)
        last = cursor.RangeAddress
        for r in range(last.EndRow + 1):
            for c in range(last.EndColumn + 1):
                cell = sheet.getCellByPosition(c, r)
                if cell.Type.value != "EMPTY":
                    found[sheet.Name, r, c] = value(cell)
    return found


class AllSamples(OfficeTest):
    def test_recalculation_changes_nothing(self):
        samples = sorted(SAMPLES.glob("*.ods"))
        self.assertGreaterEqual(len(samples), 2)
        for sample in samples:
            document = self.office.load(sample)
            stored = by_position(document)
            document.calculateAll()
            now = by_position(document)
            self.assertEqual(stored.keys(), now.keys())
            for place, before in stored.items():
                with self.subTest(sample=sample.name, place=place):
                    self.assertNotIsInstance(before, CellError)
                    if isinstance(before, float):
                        self.assertAlmostEqual(now[place], before, delta=1e-12 * abs(before) + 1e-12)
                    else:
                        self.assertEqual(now[place], before)


class DairyLedger(OfficeTest):
    def setUp(self):
        super().setUp()
        self.document = self.office.load(SAMPLES / "dairy-ledger.ods")
        self.ledger = self.document.Sheets.getByName("Ledger")

    def row(self, item):
        cells = [self.ledger.getCellByPosition(1, r) for r in range(60)]
        return next(r for r, cell in enumerate(cells) if cell.String == item)

    def figure(self, item, column):
        return value(self.ledger.getCellByPosition(ord(column) - ord("A"), self.row(item)))

    def test_the_ledger_has_what_it_promises(self):
        self.document.calculateAll()
        verdicts = [value(self.ledger.getCellByPosition(15, r)) for r in range(9, 40)]
        self.assertGreaterEqual(verdicts.count("can occur"), 14)
        self.assertEqual(verdicts.count("cannot occur"), 1)
        self.assertEqual(self.figure("Total of the duties", "P"), "0 cannot occur")
        self.assertEqual(self.figure("Free cooling", "P"), "cannot occur")
        self.assertLess(self.figure("Free cooling", "N"), 0.0)
        duties = [value(self.ledger.getCellByPosition(13, r)) for r in range(9, self.row("Total of the duties"))]
        self.assertAlmostEqual(self.figure("Total of the duties", "N"), sum(duties), places=9)

    def test_it_follows_its_inputs(self):
        row = self.row("Ice bank, by night")
        before = self.figure("Ice bank, by night", "N")
        self.ledger.getCellByPosition(8, row).setValue(-15.0)
        self.assertGreater(self.figure("Ice bank, by night", "N"), before)
        self.ledger.getCellByPosition(8, self.row("Free cooling")).setValue(-3.0)
        self.assertEqual(self.figure("Free cooling", "P"), "can occur")


if __name__ == "__main__":
    unittest.main()
