"""Sample workbooks under test: their files, their builder, and their cells by name."""

import importlib
import os
import shutil
import sys

from harness.case import SheetCase

ROOT = os.path.dirname(os.path.dirname(os.path.dirname(os.path.dirname(os.path.abspath(__file__)))))
SAMPLES = os.path.join(ROOT, "sample-sheets")
BUILDER = os.path.join(SAMPLES, "builder")


def sample(name):
    """The path of a sample workbook."""
    return os.path.join(SAMPLES, name)


def builder(name):
    """A module of the builder; it shares the names of its files with nobody."""
    if BUILDER not in sys.path:
        sys.path.insert(0, BUILDER)
    return importlib.import_module(name)


class Workbook:
    """A workbook by the names of its cells."""

    def __init__(self, document):
        self.document = document
        self.names = document.model.NamedRanges

    def cell(self, name):
        return self.names.getByName(name).getReferredCells().getCellByPosition(0, 0)

    def value(self, name):
        cell = self.cell(name)
        assert cell.getError() == 0, f"{name} shows {cell.getString()}"
        return cell.getValue()

    def text(self, name):
        return self.cell(name).getString()

    def set(self, name, content):
        cell = self.cell(name)
        if content is None:
            cell.setFormula("")
        elif isinstance(content, str):
            cell.setString(content)
        else:
            cell.setValue(content)
        return self


class WorkbookCase(SheetCase):
    """A fresh copy of a sample workbook in `document`, its cells by name in `workbook`, and an empty
    document in `empty`."""

    FILE = ""  # the file in sample-sheets
    NAMED = Workbook  # what gives the cells by name

    def setUp(self):
        super().setUp()
        self.empty = self.document
        self.document = self.office.load(shutil.copy(sample(self.FILE), self.folder))
        self.addCleanup(self._close_empty)
        self.workbook = self.NAMED(self.document)

    def _close_empty(self):
        if self.office.alive():
            self.empty.close()

    def assert_built(self, module, sheets):
        """The committed file is what the builder makes."""
        builder(module).build(self.empty)
        self.document.recalculate()
        self.assertEqual(
            self.empty.model.Sheets.ElementNames, self.document.model.Sheets.ElementNames
        )
        self.assertEqual(names_of(self.empty), names_of(self.document))
        for sheet in sheets:
            fresh, committed = (
                [line(cell) for _, _, cell in cells(document.sheet(sheet))]
                for document in (self.empty, self.document)
            )
            self.assertEqual(len(fresh), len(committed), sheet)
            for new, old in zip(fresh, committed):
                self.assertEqual(new[:3], old[:3])
                self.assertAlmostEqual(new[3], old[3], delta=1e-9 * abs(old[3]))


def cells(sheet):
    """Yields every cell of the used area of a sheet."""
    cursor = sheet.createCursor()
    cursor.gotoEndOfUsedArea(False)
    end = cursor.RangeAddress
    for row in range(end.EndRow + 1):
        for column in range(end.EndColumn + 1):
            yield row, column, sheet.getCellByPosition(column, row)


def line(cell):
    """Formula, shown text where it is a text, style, number."""
    text = cell.getString() if cell.getValue() == 0 else ""
    # Last digits in the exact tail of a stream may differ between processors' mathematics.
    return cell.FormulaLocal, text.partition(" [1 ")[0], cell.CellStyle, cell.getValue()


def names_of(document):
    ranges = document.model.NamedRanges
    return {name: ranges.getByName(name).getContent() for name in ranges.ElementNames}
