"""One headless office process and the few things that a sheet test needs from it.

Needs the Python that LibreOffice's UNO bridge was built for (Debian: /usr/bin/python3 with python3-uno).

    with Office(profile_folder) as office:
        document = office.new()
        document.set("A1", 100).set("A2", "=SQRT(A1)")
        document.value("A2"), document.text("A2"), document.error("A2")
        document.save("/tmp/x.ods")

Formulas are given as a user types them, in English, with `;` between arguments. Cells are named
"B7", "Stages.B7" or "'My sheet'.B7".
"""

import atexit
import ctypes
import os
import signal
import subprocess
import time
import uuid

import uno
from com.sun.star.beans import PropertyValue
from com.sun.star.connection import NoConnectException
from com.sun.star.lang import DisposedException
from com.sun.star.table.CellContentType import EMPTY, FORMULA, TEXT, VALUE

START_AGAIN = 81  # an office answers this on the first start of a profile
MOST_STARTS = 4

FILTERS = {
    ".ods": "calc8",
    ".fods": "OpenDocument Spreadsheet Flat XML",
    ".xlsx": "Calc MS Excel 2007 XML",
    ".xls": "MS Excel 97",
    ".csv": "Text - txt - csv (StarCalc)",
    ".pdf": "calc_pdf_Export",
    ".png": "calc_png_Export",
}

# What Calc shows for the error codes that tests meet.
SHOWN = {
    0: "",
    503: "#NUM!",
    519: "#VALUE!",
    524: "#REF!",
    525: "#NAME?",
    532: "#DIV/0!",
    32767: "#N/A",
}


def program_folder():
    """The folder of soffice.bin: $LIBREOFFICE_PROGRAM or where Debian puts it."""
    folder = os.environ.get("LIBREOFFICE_PROGRAM", "/usr/lib/libreoffice/program")
    if not os.path.exists(os.path.join(folder, "soffice.bin")):
        raise FileNotFoundError(
            f"no soffice.bin in {folder}: install libreoffice-calc or set LIBREOFFICE_PROGRAM"
        )
    return folder


def file_url(path):
    return uno.systemPathToFileUrl(os.path.abspath(path))


def property_value(name, value):
    return PropertyValue(name, 0, value, 0)


def properties(values):
    return tuple(property_value(name, value) for name, value in values.items())


def shown_error(code):
    """"Err:502" for 502, "#N/A" for 32767, "" for 0."""
    return SHOWN.get(code, f"Err:{code}")


def _end_with_parent():
    """The kernel ends the office when the test process dies, even by SIGKILL."""
    ctypes.CDLL(None).prctl(1, signal.SIGKILL)  # PR_SET_PDEATHSIG


class Office:
    """A running office on a profile of its own. `close()` ends it; so does leaving a `with` block."""

    def __init__(self, profile, log=os.devnull, timeout=60, headless=True, environment=None):
        self.profile = os.path.abspath(profile)
        self._pipe = "busbar" + uuid.uuid4().hex[:12]
        self._command = [
            os.path.join(program_folder(), "soffice.bin"),
            "-env:UserInstallation=" + file_url(self.profile),
            "--norestore",
            "--nologo",
            "--nodefault",
            "--nofirststartwizard",
            "--nolockcheck",
            f"--accept=pipe,name={self._pipe};urp;StarOffice.ComponentContext",
        ]
        self._environment = dict(os.environ, **(environment or {}))
        if headless:
            self._command.insert(1, "--headless")
            self._environment.setdefault("SAL_USE_VCLPLUGIN", "svp")
        self._log = open(log, "ab")
        self._starts = 0
        self.process = None
        atexit.register(self.kill)
        begun = time.monotonic()
        self._start()
        self.context = self._connect(begun + timeout)
        self.start_seconds = time.monotonic() - begun
        self.desktop = self.create("com.sun.star.frame.Desktop")

    def _start(self):
        # A profile that is ours alone: a lock in it was left by an office that was killed.
        lock = os.path.join(self.profile, ".lock")
        if os.path.exists(lock):
            os.unlink(lock)
        self._starts += 1
        self.process = subprocess.Popen(
            self._command,
            stdin=subprocess.DEVNULL,
            stdout=self._log,
            stderr=self._log,
            start_new_session=True,
            preexec_fn=_end_with_parent,
            env=self._environment,
        )

    def _connect(self, deadline):
        local = uno.getComponentContext()
        resolver = local.ServiceManager.createInstanceWithContext(
            "com.sun.star.bridge.UnoUrlResolver", local
        )
        while True:
            try:
                return resolver.resolve(
                    f"uno:pipe,name={self._pipe};urp;StarOffice.ComponentContext"
                )
            except NoConnectException:
                code = self.process.poll()
                if code == START_AGAIN and self._starts < MOST_STARTS:
                    self._start()
                elif code is not None:
                    raise RuntimeError(f"soffice ended with {code} before it answered") from None
                if time.monotonic() > deadline:
                    self.kill()
                    raise TimeoutError("soffice did not answer in time") from None
                time.sleep(0.02)

    def create(self, service):
        return self.context.ServiceManager.createInstanceWithContext(service, self.context)

    def new(self):
        """A new, hidden spreadsheet."""
        return Document(
            self,
            self.desktop.loadComponentFromURL(
                "private:factory/scalc", "_blank", 0, properties({"Hidden": True})
            ),
        )

    def load(self, path, **arguments):
        """The spreadsheet of a file, hidden."""
        model = self.desktop.loadComponentFromURL(
            file_url(path), "_blank", 0, properties({"Hidden": True, **arguments})
        )
        if model is None:
            raise RuntimeError(f"{path} does not load")
        return Document(self, model)

    def call(self, name, *arguments):
        """Calls a function the way a macro does."""
        return self.create("com.sun.star.sheet.FunctionAccess").callFunction(name, arguments)

    def functions(self):
        """{display name: {property: value}} of every function that Calc knows."""
        descriptions = self.create("com.sun.star.sheet.FunctionDescriptions")
        found = {}
        for index in range(descriptions.Count):
            entry = {item.Name: item.Value for item in descriptions.getByIndex(index)}
            found.setdefault(entry["Name"], []).append(entry)
        return found

    def alive(self):
        return self.process is not None and self.process.poll() is None

    def close(self, timeout=20):
        """Ends the office and returns its exit code."""
        if self.alive():
            try:
                self.desktop.terminate()
            except DisposedException:
                pass  # the bridge falls while the office ends
            try:
                self.process.wait(timeout)
            except subprocess.TimeoutExpired:
                self.kill()
        self._log.close()
        atexit.unregister(self.kill)
        return self.process.returncode

    def kill(self):
        if self.alive():
            try:
                os.killpg(self.process.pid, signal.SIGKILL)
            except ProcessLookupError:
                pass
            self.process.wait()

    def __enter__(self):
        return self

    def __exit__(self, *_):
        self.close()


class Document:
    """A spreadsheet. `model` is the UNO object for whatever is not here."""

    def __init__(self, office, model):
        self.office = office
        self.model = model

    # --- Sheets and cells

    def sheet(self, which=0):
        """A sheet by name or position."""
        sheets = self.model.Sheets
        return sheets.getByName(which) if isinstance(which, str) else sheets.getByIndex(which)

    def add_sheet(self, name):
        sheets = self.model.Sheets
        sheets.insertNewByName(name, sheets.Count)
        return sheets.getByName(name)

    def range(self, address):
        """The UNO range of "B7", "B7:C9" or "Stages.B7"."""
        sheet, dot, local = address.rpartition(".")
        if not dot:
            return self.sheet().getCellRangeByName(address)
        if sheet.startswith("'"):
            sheet = sheet[1:-1].replace("''", "'")
        return self.sheet(sheet).getCellRangeByName(local)

    def cell(self, address):
        return self.range(address).getCellByPosition(0, 0)

    # --- Writing; each returns the document, so that calls chain

    def set(self, address, content):
        """Number, text, None (blank), or a formula that begins with `=`."""
        cell = self.cell(address)
        if content is None:
            cell.setFormula("")
        elif isinstance(content, str) and content.startswith("="):
            cell.FormulaLocal = content
        elif isinstance(content, str):
            cell.setString(content)
        else:
            cell.setValue(float(content))
        return self

    def set_all(self, contents):
        """{address: content}"""
        for address, content in contents.items():
            self.set(address, content)
        return self

    def set_array(self, address, formula):
        """An array formula over a range, as a user types it with Ctrl+Shift+Enter."""
        # Array formulas have no local form in the API: the parser turns names into what files hold.
        area = self.range(address)
        area.setArrayFormula(self._stored(formula))
        return self

    def _stored(self, formula):
        """A formula with display names as the API's `Formula` property has it."""
        scratch = self.sheet().getCellByPosition(self.sheet().Columns.Count - 1, 1)
        scratch.FormulaLocal = formula
        stored = scratch.Formula
        scratch.setFormula("")
        return stored

    def fill(self, address, rows):
        """Numbers and texts, row by row, from the top left cell of `address`."""
        start = self.cell(address).CellAddress
        sheet = self.sheet(start.Sheet)
        area = sheet.getCellRangeByPosition(
            start.Column, start.Row, start.Column + len(rows[0]) - 1, start.Row + len(rows) - 1
        )
        area.setDataArray(tuple(tuple(row) for row in rows))
        return self

    def fill_down(self, address):
        """Copies the first cell of a range over the rest, as dragging its handle does."""
        self.range(address).fillAuto(uno.Enum("com.sun.star.sheet.FillDirection", "TO_BOTTOM"), 1)
        return self

    # --- Reading; reading a cell makes Calc compute it

    def value(self, address):
        """The number of a cell; 0 for text."""
        return self.cell(address).getValue()

    def text(self, address):
        """What a cell shows."""
        return self.cell(address).getString()

    def error(self, address):
        """What a cell shows for its error ("Err:502", "#N/A"), "" when it has none."""
        return shown_error(self.cell(address).getError())

    def content(self, address):
        """None, a number, a text, or an error as `error` gives it."""
        cell = self.cell(address)
        kind = cell.getType()
        if kind == EMPTY:
            return None
        if cell.getError():
            return self.error(address)
        if kind == VALUE:
            return cell.getValue()
        if kind == TEXT:
            return cell.getString()
        assert kind == FORMULA
        return cell.getValue() if cell.FormulaResultType2 == 1 else cell.getString()

    def table(self, address):
        """Rows of numbers and texts; None where a cell holds an error."""
        return self.range(address).getDataArray()

    def recalculate(self):
        """Everything, hard."""
        self.model.calculateAll()
        return self

    # --- Files and commands

    def save(self, path, filter_name=None, **arguments):
        """Stores a copy; the kind of file follows from its name."""
        name = filter_name or FILTERS[os.path.splitext(path)[1]]
        self.model.storeToURL(file_url(path), properties({"FilterName": name, **arguments}))
        return self

    def dispatch(self, command, **arguments):
        """Runs a command such as `.uno:Copy` on the document's window and returns its answer."""
        helper = self.office.create("com.sun.star.frame.DispatchHelper")
        return helper.executeDispatch(
            self.model.CurrentController.Frame, command, "", 0, properties(arguments)
        )

    def select(self, address):
        self.model.CurrentController.select(self.range(address))
        return self

    def close(self):
        self.model.close(True)

    def __enter__(self):
        return self

    def __exit__(self, *_):
        self.close()
