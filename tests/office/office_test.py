"""The base of tests in a real office with the extension."""

import unittest

from office_session import OfficeSession, extensions_folder


class OfficeTest(unittest.TestCase):
    """One office for a class of tests; documents that a test leaves open are closed after it."""

    @classmethod
    def setUpClass(cls):
        cls.office = cls.enterClassContext(OfficeSession(extensions_folder()))

    def setUp(self):
        self.addCleanup(self.office.close_all)


class DocumentTest(OfficeTest):
    """Each test begins with a new document."""

    def setUp(self):
        super().setUp()
        self.document = self.office.new_document()
