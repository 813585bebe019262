"""The add-ins called as a macro calls them, with values that Calc never passes: an answer, never an exception."""

import math
import struct
import unittest

import uno
from office_session import OfficeSession, extensions_folder
from sheets import first_sheet, set_formula, set_values


def error_code(number):
    """The code in a number that stands for an error."""
    assert math.isnan(number)
    return struct.unpack("<Q", struct.pack("<d", number))[0] & 0xFFFF_FFFF


def rows(*values):
    return tuple(tuple(row) for row in values)


class DirectCalls(unittest.TestCase):
    @classmethod
    def setUpClass(cls):
        # This process must know the types to talk about them; the office knows them from the package.
        types = extensions_folder() / "entropy-ledger.oxt" / "entropy_ledger.rdb"
        manager = uno.getComponentContext().getByName(
            "/singletons/com.sun.star.reflection.theTypeDescriptionManager")
        manager.insert(types.resolve().as_uri())
        cls.office = cls.enterClassContext(OfficeSession(extensions_folder()))
        cls.entropy = cls.office.service("ENTROPY")

    def test_each_add_in_is_one_object_named_as_its_prefix(self):
        self.assertEqual(self.entropy, self.office.service("ENTROPY"))
        self.assertEqual(self.entropy.getImplementationName(), "ENTROPY")
        self.assertEqual(self.entropy.getSupportedServiceNames(), ("ENTROPY",))

    def test_whole_numbers_count_as_numbers(self):
        self.assertEqual(self.entropy.reservoir(600, 300), 2.0)
        self.assertEqual(self.entropy.reservoir(6 * 10**12, 3000), 2e9)

    def test_nothing_at_all_is_unusable(self):
        self.assertEqual(error_code(self.entropy.body(None, None, None)), 502)
        self.assertEqual(error_code(self.entropy.total(None, ())), 502)

    def test_a_value_of_another_kind_is_unusable(self):
        self.assertEqual(error_code(self.entropy.reservoir(uno.getTypeByName("long"), 300.0)), 502)
        self.assertEqual(error_code(self.entropy.reservoir(self.office.desktop, 300.0)), 502)

    def test_an_error_passes_through_and_another_nan_is_unusable(self):
        not_available = struct.unpack("<d", struct.pack("<Q", 0x7FF8_0000_0000_7FFF))[0]
        self.assertEqual(error_code(self.entropy.reservoir(not_available, 300.0)), 32767)
        self.assertEqual(error_code(self.entropy.reservoir(math.nan, 300.0)), 502)
        self.assertEqual(error_code(self.entropy.reservoir(math.inf, 300.0)), 502)

    def test_rows_of_unequal_length_have_empty_cells(self):
        ragged = uno.Any("[][]any", (("300 J", "600 J"), ("900 J",)))
        answer = uno.invoke(self.entropy, "reservoir", (ragged, 300.0))
        self.assertEqual(answer[0], (1.0, 2.0))
        self.assertEqual(answer[1][0], 3.0)
        self.assertTrue(math.isnan(answer[1][1]))

    def test_rows_of_numbers_are_a_range(self):
        numbers = uno.Any("[][]double", ((300.0,), (600.0,)))
        self.assertEqual(uno.invoke(self.entropy, "reservoir", (numbers, 300.0)), rows([1.0], [2.0]))

    def test_rows_without_cells_are_unusable(self):
        for empty in ((), ((),)):
            answer = uno.invoke(self.entropy, "reservoir", (uno.Any("[][]any", empty), 300.0))
            self.assertEqual(error_code(answer), 502, empty)

    def test_a_cell_range_object_keeps_its_shape(self):
        document = self.office.new_document()
        self.addCleanup(self.office.close_all)
        set_values(document, "A1:B3", [[280.0, 1.0], ["", 2.0], [282.0, 3.0]])
        cells = first_sheet(document)
        T, amounts = cells.getCellRangeByName("A1:A3"), cells.getCellRangeByName("B1:B3")
        answer = self.entropy.sensible("water(l)", T, 300.0, amounts, None)
        self.assertEqual(answer[2][0], self.entropy.sensible("water(l)", 282.0, 300.0, 3.0, None))
        self.assertTrue(math.isnan(answer[1][0]))

    def test_a_cell_range_object_is_a_range(self):
        document = self.office.new_document()
        self.addCleanup(self.office.close_all)
        set_values(document, "A1:A2", [[1.0], [2.0]])
        set_formula(document, "A3", '=""')
        cells = first_sheet(document)
        self.assertEqual(self.entropy.total(cells.getCellRangeByName("A1:A2"), (cells.getCellRangeByName("A1"),)), 4.0)
        self.assertEqual(error_code(self.entropy.total(cells.getCellRangeByName("A1:A3"), ())), 502)


if __name__ == "__main__":
    unittest.main()
