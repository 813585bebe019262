"""The package as the office reads it."""

import os
import unittest
import zipfile
from pathlib import Path

from office_session import OfficeSession, extensions_folder, properties
from office_test import OfficeTest

IDENTIFIER = "vnd.entropy-ledger"
PROVIDER = "/singletons/com.sun.star.deployment.PackageInformationProvider"


class Package(OfficeTest):
    def test_the_office_lists_the_extension(self):
        provider = self.office.context.getByName(PROVIDER)
        versions = {identifier: version for identifier, version in provider.getExtensionList()}
        self.assertRegex(versions[IDENTIFIER], r"^\d+\.\d+\.\d+$")

    def test_the_office_can_draw_the_icon(self):
        provider = self.office.context.getByName(PROVIDER)
        icon = provider.getPackageLocation(IDENTIFIER) + "/icon.svg"
        graphic = self.office.service("com.sun.star.graphic.GraphicProvider").queryGraphic(properties(URL=icon))
        self.assertGreater(graphic.SizePixel.Width, 0)

    def test_the_archive_is_the_unpacked_folder(self):
        folder = extensions_folder() / "entropy-ledger.oxt"
        files = {str(f.relative_to(folder)): f.read_bytes() for f in folder.rglob("*") if f.is_file()}
        with zipfile.ZipFile(Path(os.environ["ENTROPY_LEDGER_PACKAGE"])) as archive:
            self.assertEqual({name: archive.read(name) for name in archive.namelist()}, files)

    def test_the_office_ends_by_itself(self):
        office = OfficeSession(extensions_folder())
        with office:
            document = office.new_document()
            document.Sheets.getByIndex(0).getCellByPosition(0, 0).setFormula("=ENTROPY.BODY(500;300;350)")
        self.assertTrue(office.ended_by_itself, "the office had to be ended")
        self.assertEqual(office.exit_code, 0)


if __name__ == "__main__":
    unittest.main()
