"""The test case that sheet tests derive from: one office for the whole run, a document a test."""

import os
import tempfile
import unittest

from harness.office import Office


class SheetCase(unittest.TestCase):
    """`self.office` is shared; `self.document` is new for every test; `self.folder` is scratch."""

    office = None  # set by the runner
    oxt = None  # the extension under test

    @classmethod
    def setUpClass(cls):
        if SheetCase.office is None:
            raise unittest.SkipTest("start these tests with tests/sheet/harness/run.py")
        if not SheetCase.office.alive():
            # A crash fails the test that caused it; the others still deserve an office.
            SheetCase.office = Office(SheetCase.office.profile)

    def setUp(self):
        if not self.office.alive():
            SheetCase.office = Office(SheetCase.office.profile)
        scratch = tempfile.TemporaryDirectory(prefix="busbar-sheet-")
        self.addCleanup(scratch.cleanup)
        self.folder = scratch.name
        self.document = self.office.new()

    def tearDown(self):
        if not self.office.alive():
            self.fail("the office died in this test")
        self.document.close()

    def path(self, name):
        return os.path.join(self.folder, name)

    def assert_shows(self, address, text):
        self.assertEqual(self.document.text(address), text, f"cell {address}")

    def assert_error(self, address, shown):
        self.assertEqual(self.document.error(address), shown, f"cell {address}")

    def why(self, address):
        """The answer of WHY about a cell."""
        scratch = "AMA1000"
        self.document.set(scratch, f"=WHY({address})")
        answer = self.document.text(scratch)
        self.document.set(scratch, None)
        return answer
