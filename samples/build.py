"""Rebuilds the sample workbooks.

usage: build.py EXTENSIONS    the folder that holds the unpacked extension, such as build/extension/unpacked
"""

import sys
from pathlib import Path

HERE = Path(__file__).resolve().parent
sys.path.insert(0, str(HERE.parent / "tests" / "office"))

from office_session import OfficeSession  # noqa: E402


def main() -> None:
    with OfficeSession(extensions=Path(sys.argv[1])) as office:
        from ledger_sheet import LedgerSheet  # these need the office's types
        from own_table import OwnTableSheet
        for make, name in ((LedgerSheet, "dairy-ledger.ods"), (OwnTableSheet, "own-table.ods")):
            document = office.new_document()
            make(document).make()
            document.calculateAll()
            office.store(document, HERE / name)


main()
