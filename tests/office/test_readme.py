"""The first formulas of README.md show what it says they show."""

import re
import unittest
from pathlib import Path

from office_session import OfficeSession, extensions_folder
from sheets import evaluate

README = Path(__file__).resolve().parents[2] / "README.md"


class FirstFormulas(unittest.TestCase):
    def test_they_show_what_is_printed(self):
        section = README.read_text(encoding="utf-8").partition("## First formulas")[2].partition("\n## ")[0]
        rows = re.findall(r"^\| `(=[^`]+)` \| ([^|]+) \|", section, re.MULTILINE)
        self.assertGreaterEqual(len(rows), 5)
        with OfficeSession(extensions_folder()) as office:
            document = office.new_document()
            for formula, printed in rows:
                with self.subTest(formula):
                    shown = evaluate(document, formula)
                    if isinstance(shown, str):
                        self.assertTrue(shown.startswith(printed.strip().rstrip("…").strip()), shown)
                    else:
                        digits = len(printed.strip().partition(".")[2])
                        self.assertEqual(f"{shown:.{digits}f}", printed.strip())


if __name__ == "__main__":
    unittest.main()
