"""Every function as users meet it in a sheet: array formulas, multiple operations, files, another locale, bad input."""

import unittest

from examples import CELLS, FUNCTIONS, formula, prepare
from office_session import OfficeSession, extensions_folder
from office_test import DocumentTest
from sheets import CellError, cell, evaluate, set_array_formula, set_formula, set_values, value, values

# Arguments that take one cell each, with two values that both make sense, for ranges and multiple operations.
PAIRS = {"T": ["272.15", "272.65"], "T_start": ["268.15", "270.15"], "T_end": ["283.15", "293.15"], "T_from": ["350", "400"],
         "generation": ["1.5", "2.5"], "total": ["1.5", "-2.5"], "heat": ["1000", "2000"], "work": ["1000", "2000"],
         "heat_balance": ["1000", "2000"], "heat_capacity": ["500", "600"], "state": ["water(l)", "N2(g)"],
         "material": ["water", "Al"]}
SPREADABLE = [f for f in FUNCTIONS if f.result != "table" and any(a.key in PAIRS for a in f.arguments)
              and not any(a.kind in ("items", "amounts", "substances", "capacities", "temperatures") for a in f.arguments)]


def varied(function):
    """The argument to vary, and its two values as cells hold them."""
    key = next(a.key for a in function.arguments if a.key in PAIRS)
    return key, [[float(v) if v.lstrip("-").replace(".", "").isdigit() else v] for v in PAIRS[key]]


class Sheets(DocumentTest):
    def setUp(self):
        super().setUp()
        prepare(self.document)

    def test_array_formulas_give_what_single_cells_give(self):
        self.assertGreater(len(SPREADABLE), 40)
        for function in SPREADABLE:
            with self.subTest(function.name):
                key, cells = varied(function)
                set_values(self.document, "C1:C2", cells)
                area = set_array_formula(self.document, "D1:D2", formula(function, **{key: "C1:C2"}))
                together = values(self.document, "D1:D2")
                area.clearContents(1023)
                single = [[evaluate(self.document, formula(function, **{key: f"C{row}"}), "E1")] for row in (1, 2)]
                self.assertEqual(together, single)
                self.assertNotIsInstance(single[0][0], CellError)

    def test_tables_fill_array_formulas(self):
        for function in FUNCTIONS:
            if function.result != "table":
                continue
            with self.subTest(function.name):
                area = set_array_formula(self.document, "D1:O6", formula(function))
                rows = values(self.document, "D1:O6")
                area.clearContents(1023)
                self.assertIsInstance(rows[0][0], str)
                self.assertNotIsInstance(rows[1][0], CellError)

    # The programming interface calls MULTIPLE.OPERATIONS by another name: TABLE.
    def test_multiple_operations_give_what_single_cells_give(self):
        for function in SPREADABLE:
            with self.subTest(function.name):
                key, cells = varied(function)
                set_values(self.document, "C1:C3", [cells[0], cells[0], cells[1]])
                set_formula(self.document, "D1", formula(function, **{key: "C1"}))
                for row in (2, 3):
                    what_if = evaluate(self.document, f"=TABLE(D1;C1;C{row})", f"E{row}")
                    direct = evaluate(self.document, formula(function, **{key: f"C{row}"}), "F1")
                    self.assertEqual(what_if, direct)

    def test_multiple_operations_reach_functions_of_ranges_and_tables(self):
        # The ranges hold formulas of the varied cell; a range that holds the varied cell itself Calc refuses, for SUM too.
        set_values(self.document, "C1:C2", [[1.0], [5.0]])
        set_formula(self.document, "P1", '=C1&" mol"')
        set_formula(self.document, "P2", '="3 mol"')
        set_formula(self.document, "Q1", "=C1*100")
        set_values(self.document, "Q2", [[300.0]])
        set_values(self.document, "R1:R2", [[350.0], [290.0]])
        calls = ["ENTROPY.TOTAL(Q1:Q2)", "HEAT.CLOSURE(Q1:Q2)", "TEMPERATURE.COMMON(Q1:Q2;R1:R2)", "ENTROPY.MIXING(P1:P2)",
                 "HEAT.MIXING(P1:P2)", "CHECK.MIXING(P1:P2)", "SOURCE.MIXING(P1:P2)", "INDEX(STEPS.MIXING(P1:P2);2;7)",
                 'INDEX(DATA.LIST("water";"l";C1+273);2;4)']
        calls += [f"INDEX({formula(f, **{key: 'C1+270' if key.startswith('T') else 'C1*100'})[1:]};2;7)" for f, key in
                  ((f, next(a.key for a in f.arguments if a.key in PAIRS and a.key != "material")) for f in FUNCTIONS
                   if f.view == "STEPS" and f.method != "MIXING")]
        for call in calls:
            with self.subTest(call):
                set_values(self.document, "C1", [[1.0]])
                set_formula(self.document, "D1", f"={call}")
                what_if = evaluate(self.document, "=TABLE(D1;C1;C2)", "E1")
                set_values(self.document, "C1", [[5.0]])
                self.assertEqual(what_if, value(cell(self.document, "D1")))
                self.assertNotIsInstance(what_if, CellError)

    def test_a_two_way_what_if_table(self):
        set_values(self.document, "C1:D1", [[268.15, 260.15]])
        set_formula(self.document, "E1", '=GENERATION.PHASE("water";"l";"cr";C1;1;D1)')
        for T, T_reservoir in ((267.15, 262.15), (272.15, 258.15)):
            set_values(self.document, "F1:G1", [[T, T_reservoir]])
            what_if = evaluate(self.document, "=TABLE(E1;C1;F1;D1;G1)", "H1")
            direct = evaluate(self.document, f'=GENERATION.PHASE("water";"l";"cr";{T};1;{T_reservoir})', "I1")
            self.assertEqual(what_if, direct)

    def check_array_after_reload(self, ending):
        set_values(self.document, "C1:C3", [[270.0], [280.0], [290.0]])
        set_array_formula(self.document, "D1:D3", '=GENERATION.SENSIBLE("water(l)";C1:C3;300;2;280)')
        before = values(self.document, "D1:D3")
        self.assertTrue(all(isinstance(row[0], float) for row in before))
        self.document, _ = self.office.reload(self.document, ending)
        self.document.calculateAll()
        self.assertEqual(values(self.document, "D1:D3"), before)
        self.assertTrue(cell(self.document, "D2").getPropertyValue("FormulaLocal").startswith("{=GENERATION.SENSIBLE("))

    def test_array_formulas_survive_ods(self):
        self.check_array_after_reload(".ods")

    def test_array_formulas_survive_xlsx(self):
        self.check_array_after_reload(".xlsx")

    def test_bad_input_shows_its_error(self):
        set_formula(self.document, "C2", "=NA()")
        set_formula(self.document, "C3", "=1/0")
        for arguments, code in (('"watr(l)";280;290;1', 502), ('"N2(l)";280;290;1', 32767), ('"water(l)";0;290;1', 502),
                                ('"water(l)";-5;290;1', 502), ('"water(l)";280;290;-1', 502),
                                ('"water(l)";"280";290;1', 502), ('"water(l)";"2 bar";290;1', 502),
                                ('"water(l)";280;900;1', 32767), ('"water(l)";C1;290;1', 502),  # C1 is empty
                                ('"water(l)";280;290;C1', 502), ('C1;280;290;1', 502), ('"water(l)";C2;290;1', 32767),
                                ('"water(l)";C3;290;1', 532)):
            with self.subTest(arguments):
                self.assertEqual(evaluate(self.document, f"=ENTROPY.SENSIBLE({arguments})"), CellError(code))
                self.assertEqual(evaluate(self.document, f"=1+ENTROPY.SENSIBLE({arguments})"), CellError(code))
        self.assertIn("T_start", evaluate(self.document, '=CHECK.SENSIBLE("water(l)";C1;290;1)'))

    def test_ranges_of_unequal_shape(self):
        set_values(self.document, "C1:C3", [[280.0], [281.0], [282.0]])
        set_values(self.document, "E1:E2", [[1.0], [2.0]])
        set_array_formula(self.document, "F1:F3", '=HEAT.SENSIBLE("water(l)";C1:C3;290;E1:E2)')
        rows = values(self.document, "F1:F3")
        self.assertIsInstance(rows[1][0], float)
        self.assertEqual(rows[2][0], CellError(32767))

    def test_one_bad_row_spoils_only_itself(self):
        set_values(self.document, "C1:C3", [[280.0], [-1.0], ["17 °C"]])
        set_array_formula(self.document, "D1:D3", '=HEAT.SENSIBLE("water(l)";C1:C3;300;1)')
        rows = [row[0] for row in values(self.document, "D1:D3")]
        self.assertEqual(rows[1], CellError(502))
        self.assertIsInstance(rows[0], float)
        self.assertIsInstance(rows[2], float)

    def test_a_million_rows(self):
        last = 1048576
        sheet = self.document.Sheets.getByIndex(0)
        set_values(self.document, "J1:J2", [[280.0], [280.00001]])
        sheet.getCellRangeByName(f"J1:J{last}").fillAuto(0, 2)
        set_array_formula(self.document, f"K1:K{last}", f'=ENTROPY.SENSIBLE("N2(g)";J1:J{last};300;1)')
        first, end = value(cell(self.document, "K1")), value(cell(self.document, f"K{last}"))
        self.assertEqual(first, evaluate(self.document, '=ENTROPY.SENSIBLE("N2(g)";J1;300;1)'))
        self.assertEqual(end, evaluate(self.document, f'=ENTROPY.SENSIBLE("N2(g)";J{last};300;1)'))
        self.assertGreater(first, end)


class GermanSheets(unittest.TestCase):
    def test_decimal_comma_and_units(self):
        with OfficeSession(extensions_folder(), locale="de-DE", ui="de") as office:
            document = office.new_document()
            target = cell(document, "A1")

            def local(text):
                target.setPropertyValue("FormulaLocal", text)
                return value(target)
            self.assertEqual(local('=ENTROPY.RESERVOIR(601,5;300,75)'), 2.0)
            self.assertEqual(local('=ENTROPY.RESERVOIR("0,6015 kJ";"27,6 °C")'), 2.0)
            self.assertEqual(local('=ENTROPY.RESERVOIR("0.6015 kJ";"27.6 °C")'), 2.0)
            self.assertIsInstance(local('=GENERATION.PHASE("water";"l";"cr";"-6,5 °C";1,5;"-9,25 °C")'), float)
            document, _ = office.reload(document, ".xlsx")
            document.calculateAll()
            stored = cell(document, "A1").getPropertyValue("FormulaLocal")
            self.assertEqual(stored, '=GENERATION.PHASE("water";"l";"cr";"-6,5 °C";1,5;"-9,25 °C")')
            self.assertIsInstance(value(cell(document, "A1")), float)


if __name__ == "__main__":
    unittest.main()
