"""Every function of the catalogue in a real office: known by its name, described, answering, and stored by its name."""

import unittest
import zipfile

from examples import FUNCTIONS, formula, prepare
from office_session import OfficeSession, extensions_folder
from office_test import DocumentTest
from sheets import CellError, cell, set_formula, value


def describe(office) -> dict:
    """The function wizard's entries by name, each as a dictionary."""
    entries = office.service("com.sun.star.sheet.FunctionDescriptions")
    described = {}
    for i in range(entries.Count):
        entry = {p.Name: p.Value for p in entries.getByIndex(i)}
        described[entry["Name"]] = entry
    return described


def fill(document) -> dict:
    """Calls every function from a row of its own, with all arguments; gives the names by address."""
    prepare(document)
    addresses = {}
    for row, function in enumerate(FUNCTIONS, start=1):
        addresses[f"A{row}"] = function.name
        set_formula(document, f"A{row}", formula(function))
    return addresses


class Functions(DocumentTest):
    def check_answer(self, function, text):
        answer = value(set_formula(self.document, "A1", text))
        self.assertNotIsInstance(answer, CellError, text)
        if function.result == "number":
            self.assertIsInstance(answer, float, text)
        elif function.result == "text":
            self.assertIsInstance(answer, str, text)
            self.assertNotEqual(answer, "", text)

    def test_each_answers_with_all_arguments(self):
        prepare(self.document)
        for function in FUNCTIONS:
            with self.subTest(function.name):
                self.check_answer(function, formula(function))

    def test_each_answers_with_required_arguments(self):
        prepare(self.document)
        for function in FUNCTIONS:
            with self.subTest(function.name):
                self.check_answer(function, formula(function, optional=False))

    def test_each_is_described_in_the_wizard(self):
        described = describe(self.office)
        for function in FUNCTIONS:
            with self.subTest(function.name):
                entry = described[function.name]
                self.assertEqual(entry["Description"], function.text)
                shown = [(a.Name, a.Description) for a in entry["Arguments"]]
                expected = [(a.name, a.text) for a in function.arguments]
                if function.arguments[-1].repeated:
                    expected.append(expected[-1])  # the items after the first one
                self.assertEqual(shown, expected)

    def check_stored_names(self, ending, part, spelling):
        addresses = fill(self.document)
        before = {a: value(cell(self.document, a)) for a in addresses}
        self.document, path = self.office.reload(self.document, ending)
        with zipfile.ZipFile(path) as archive:
            stored = archive.read(part).decode("utf-8")
        for address, name in addresses.items():
            with self.subTest(name):
                self.assertIn(spelling.format(name), stored)
                loaded = cell(self.document, address)
                self.assertTrue(loaded.getPropertyValue("FormulaLocal").startswith(f"={name}("))
        self.document.calculateAll()
        self.assertEqual({a: value(cell(self.document, a)) for a in addresses}, before)

    def test_ods_stores_the_names_on_screen(self):
        self.check_stored_names(".ods", "content.xml", '"of:={}(')

    def test_xlsx_stores_the_names_on_screen(self):
        self.check_stored_names(".xlsx", "xl/worksheets/sheet1.xml", ">{}(")


class GermanOffice(unittest.TestCase):
    def test_names_are_the_same_in_every_language(self):
        with OfficeSession(extensions_folder(), locale="de-DE", ui="de") as office:
            described = describe(office)
            document = office.new_document()
            for address, name in fill(document).items():
                with self.subTest(name):
                    self.assertIn(name, described)
                    written = cell(document, address)
                    self.assertNotIsInstance(value(written), CellError)
                    self.assertTrue(written.getPropertyValue("FormulaLocal").startswith(f"={name}("))


if __name__ == "__main__":
    unittest.main()
