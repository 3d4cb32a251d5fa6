"""One sheet under construction: contents, styles, number formats, names."""

import unicodedata

from com.sun.star.sheet.ValidationAlertStyle import STOP
from com.sun.star.sheet.ValidationType import LIST

from styles import PREFIX

CENTIMETRE = 1000  # the API counts in hundredths of a millimetre


class Page:
    """A sheet under construction. Rows and columns are addressed as a user sees them ("B7")."""

    def __init__(self, document, styles, name):
        self.document = document
        self.styles = styles
        self.name = name
        self.sheet = document.sheet(name)
        self._contents = []

    def widths(self, centimetres):
        """{column letters: width}"""
        for letters, width in centimetres.items():
            self.sheet.Columns.getByName(letters).Width = round(width * CENTIMETRE)

    def height(self, row, centimetres):
        self.sheet.Rows.getByIndex(row - 1).Height = round(centimetres * CENTIMETRE)

    def put(self, address, content=None, style="text", fmt=None, name=None, merge=None):
        """Content as a user types it; stands in the cell after `write`."""
        cell = self.sheet.getCellRangeByName(address)
        area = self.sheet.getCellRangeByName(f"{address}:{merge}") if merge else cell
        if merge:
            area.merge(True)
        area.CellStyle = PREFIX + style
        if fmt:
            area.NumberFormat = self.styles.number_format(fmt)
        if content is not None:
            self._contents.append((address, content))
        if name:
            self.name_range(name, self.reference(address))

    def put_array(self, area, formula):
        """An array formula over a range that has its styles already."""
        self._contents.append((area, formula))

    def write(self):
        """Writes the contents. A formula is read when it is typed, so every name on every sheet
        has to stand before the first formula does."""
        for address, content in self._contents:
            put = self.document.set_array if ":" in address else self.document.set
            put(f"'{self.name}'.{address}", content)
        self._contents.clear()

    def reference(self, address):
        """"B7" as "$Sheet.$B$7", "B7:C9" likewise."""
        first, _, last = address.partition(":")
        return f"${self.name}.{absolute(first)}" + (f":{absolute(last)}" if last else "")

    def name_range(self, name, reference):
        """Names a cell or range. Names read like words: letters, digits and underscores."""
        assert name.isidentifier() and unicodedata.is_normalized("NFC", name)
        origin = self.sheet.getCellByPosition(0, 0).CellAddress
        self.document.model.NamedRanges.addNewByName(name, reference, origin, 0)

    def allow(self, address, words, title, message):
        """Only these words may be typed, from a list."""
        area = self.sheet.getCellRangeByName(address)
        rule = area.Validation
        rule.Type = LIST
        rule.setFormula1(";".join(f'"{word}"' for word in words))
        rule.IgnoreBlankCells = True
        rule.ShowErrorMessage = True
        rule.ErrorAlertStyle = STOP
        rule.ErrorTitle = title
        rule.ErrorMessage = message
        area.Validation = rule

    def freeze(self, columns, rows):
        controller = self.document.model.CurrentController
        controller.setActiveSheet(self.sheet)
        controller.freezeAtPosition(columns, rows)

    def repeat_rows(self, first, last):
        """These rows stand on top of every printed page."""
        area = self.sheet.getCellRangeByName(f"A{first}:A{last}").RangeAddress
        self.sheet.setTitleRows(area)
        self.sheet.setPrintTitleRows(True)

    def break_before(self, row):
        self.sheet.Rows.getByIndex(row - 1).IsStartOfNewPage = True


def absolute(address):
    letters = address.rstrip("0123456789")
    return f"${letters}${address[len(letters):]}"
