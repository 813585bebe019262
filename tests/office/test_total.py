"""ENTROPY.TOTAL over references: nothing that is not a number may be skipped, except cells that are truly empty."""

import unittest

from office_test import DocumentTest
from sheets import CellError, evaluate, set_formula, set_values, value

UNUSABLE = CellError(502)


class Total(DocumentTest):
    def setUp(self):
        super().setUp()
        set_values(self.document, "B1:B5", [[1.5], [""], [2.5], [""], [-1.0]])

    def total(self, arguments):
        return evaluate(self.document, f"=ENTROPY.TOTAL({arguments})")

    def test_empty_cells_are_skipped(self):
        self.assertEqual(self.total("B1:B5"), 3.0)

    def test_a_whole_column_costs_what_is_in_it(self):
        self.assertEqual(self.total("B1:B1048576"), 3.0)
        self.assertEqual(self.total("B1:XFD1048576"), 3.0)

    def test_a_formula_that_returns_an_empty_text_is_an_error(self):
        set_formula(self.document, "B2", '=IF(1=1;"";0)')
        self.assertEqual(self.total("B1:B5"), UNUSABLE)
        self.assertEqual(self.total("B2"), UNUSABLE)
        self.assertEqual(self.total("B1;B2"), UNUSABLE)
        self.assertEqual(self.total("B1;B2:B3"), UNUSABLE)

    def test_an_empty_range_is_nothing_whatever_stands_beside_it(self):
        for address in ("A1", "A7", "D1"):
            self.assertEqual(value(set_formula(self.document, address, "=ENTROPY.TOTAL(C1:C2;4)")), 4.0, address)
        self.assertEqual(value(set_formula(self.document, "A9", "=ENTROPY.TOTAL(E1:G5)")), 0.0)

    def test_a_range_over_several_sheets_is_refused(self):
        self.document.Sheets.insertNewByName("Second, with a 'name'.", 1)
        self.document.Sheets.getByIndex(1).getCellRangeByName("B1").setString("pending")
        self.assertEqual(self.total("$Sheet1.B1:$'Second, with a ''name''.'.B3"), UNUSABLE)
        self.assertEqual(self.total("$'Second, with a ''name''.'.C1:C2;4"), 4.0)

    def test_a_text_is_an_error(self):
        set_formula(self.document, "B2", "pending")
        self.assertEqual(self.total("B1:B5"), UNUSABLE)
        self.assertEqual(self.total("B1;B2"), UNUSABLE)

    def test_an_error_passes_through(self):
        set_formula(self.document, "B2", "=NA()")
        self.assertEqual(self.total("B1:B5"), CellError(32767))
        self.assertEqual(self.total("B1;B2"), CellError(32767))
        # In a range after the first item Calc refuses the call by itself.
        self.assertEqual(self.total("B1;B2:B3"), CellError(504))

    def test_items_after_the_first_are_numbers_references_and_inline_arrays(self):
        self.assertEqual(self.total("B1:B5;4;B3;{10;20|30;40}"), 109.5)

    def test_later_ranges_must_be_full(self):
        # There, Calc tells an empty cell and an empty text not apart; a missing item must not pass unseen.
        self.assertEqual(self.total("B1;B3:B3"), 4.0)
        self.assertEqual(self.total("B1;B2:B3"), UNUSABLE)

    def test_a_total_that_contains_itself_is_a_circular_reference(self):
        self.assertEqual(value(set_formula(self.document, "B4", "=ENTROPY.TOTAL(B1:B5)")), CellError(522))

    def test_a_change_in_the_range_changes_the_total(self):
        target = set_formula(self.document, "A1", "=ENTROPY.TOTAL(B1:B5)")
        set_values(self.document, "B2", [[10.0]])
        self.assertEqual(value(target), 13.0)


if __name__ == "__main__":
    unittest.main()
