"""Workbooks in files: saved and loaded, with values from another file, and in an office that does
not have the extension."""

from harness.case import SheetCase
from harness.office import Office, file_url
from harness.profile import Profile

# Formulas of every kind, each with the form in which files keep it.
CELLS = {
    "A1": (100, None),
    "A2": (540, None),
    "B1": ("=STEAM(A1;A2;55)", "=BUSBAR.STEAM(A1;A2;55)"),
    "B2": ("=ENTHALPY_OF(B1)", "=BUSBAR.ENTHALPY_OF(B1)"),
    "B3": ("=TURBINE_OUT(B1;0.05;0.88)", "=BUSBAR.TURBINE_OUT(B1;0.05;0.88)"),
    "B4": ("=FLUID_POWER(B1;B3)", "=BUSBAR.FLUID_POWER(B1;B3)"),
    "B5": ('=TAGGED(STEAM(14.5;1000;;"us");"LBA10")', None),
    "B6": ("=STEAM(2000;540)", "=BUSBAR.STEAM(2000;540)"),
    "B7": ("=WHY(B6)", "=BUSBAR.WHY(B6)"),
    "B8": ('=IFERROR(ENTHALPY_OF(B6);"none")', None),
    "B9": ('=WHY_CALL("STEAM";1200;540)', '=BUSBAR.WHY_CALL("STEAM";1200;540)'),
}
ARRAYS = {
    "D1:D2": "=STEAM_ENTHALPY(A1;{500;540})",
    "F1:M3": "=STREAM_TABLE(B1:B1)",
    "D4:D5": "=STEAM({100;50};540)",
}
SHOWN = [*CELLS, "D1", "D2", "D4", "D5", "F1", "H1", "H2", "H3", "M2"]
# What shows an error, and must show the same one after every trip.
ERRORS = {"B6": "Err:502", "H3": "#N/A"}


def fill(document):
    for address, (content, _) in CELLS.items():
        document.set(address, content)
    for address, formula in ARRAYS.items():
        document.set_array(address, formula)


def contents(document):
    return {address: document.content(address) for address in SHOWN}


class RoundTrips(SheetCase):
    def setUp(self):
        super().setUp()
        fill(self.document)
        self.before = contents(self.document)

    def check(self, suffix):
        path = self.path("book" + suffix)
        self.document.save(path)
        with self.office.load(path) as again:
            for address, (_, stored) in CELLS.items():
                if stored:
                    self.assertEqual(again.cell(address).Formula, stored)
            for address in ARRAYS:
                self.assertTrue(again.cell(address).Formula.startswith("{=BUSBAR."))
            again.recalculate()
            self.assertEqual(contents(again), self.before)
            for address, shown in ERRORS.items():
                self.assertEqual(again.error(address), shown)
            # Alive, not only shown.
            again.set("A1", 90)
            self.assertTrue(again.text("B1").startswith("steam 55 kg/s, 90 bar, 540 °C ["))

    def test_ods(self):
        self.check(".ods")

    def test_xlsx(self):
        self.check(".xlsx")

    def test_flat_ods(self):
        self.check(".fods")

    def test_xls(self):
        self.check(".xls")

    def test_xlsx_keeps_stale_values_until_it_is_recalculated(self):
        # Calc does not compute an .xlsx anew on loading: what was saved is what is shown.
        path = self.path("book.xlsx")
        self.document.save(path)
        with self.office.load(path) as again:
            self.assertEqual(again.text("B1"), self.before["B1"])
            self.assertEqual(again.error("B6"), "Err:502")

    def test_csv_carries_streams(self):
        # The text is the whole state: through a plain text file and back.
        path = self.path("book.csv")
        self.document.save(path, FilterOptions="59,34,76,1")
        with self.office.load(
            path, FilterName="Text - txt - csv (StarCalc)", FilterOptions="59,34,76,1"
        ) as again:
            again.set("Z1", "=ENTHALPY_OF(B1)")
            self.assertEqual(again.value("Z1"), self.before["B2"])
            again.set("Z2", "=TEMPERATURE_OF(B5)")
            self.assertEqual(again.error("Z2"), "")


class OtherFiles(SheetCase):
    """Values from another workbook. Calc hands a reference into another file to no add-in
    (Err:504); the value must stand in a cell of its own first, or pass through an operator."""

    def setUp(self):
        super().setUp()
        fill(self.document)
        self.number, self.stream = self.document.value("B2"), self.document.text("B1")
        path = self.path("plant.ods")
        self.document.save(path)
        self.there = f"'{file_url(path)}'#$Sheet1."
        self.document.close()
        self.document = self.office.new()

    def test_a_direct_reference_is_refused_with_a_reason(self):
        for formula in (
            f"=ENTHALPY_OF({self.there}B1)",
            f"=STEAM_ENTHALPY({self.there}A1;540)",
            f"=EFFICIENCY_CHAIN({self.there}A1:A2)",
        ):
            with self.subTest(formula):
                self.document.set("A1", formula)
                self.assert_error("A1", "Err:504")
                self.assertIn("another file", self.why("A1"))
                self.assertIn("a cell of its own", self.why("A1"))

    def test_a_cell_of_its_own(self):
        self.document.set_all({"A1": f"={self.there}B1", "A2": "=ENTHALPY_OF(A1)"})
        self.assertEqual(self.document.text("A1"), self.stream)
        self.assertEqual(self.document.value("A2"), self.number)
        self.document.set_all({"B1": f"={self.there}A1", "B2": "=STEAM_ENTHALPY(B1;540)"})
        self.assertEqual(self.document.value("B2"), self.number)

    def test_through_an_operator(self):
        self.document.set("A1", f'=ENTHALPY_OF({self.there}B1&"")')
        self.document.set("A2", f"=STEAM_ENTHALPY({self.there}A1+0;{self.there}A2+0)")
        self.assertEqual(self.document.value("A1"), self.number)
        self.assertEqual(self.document.value("A2"), self.number)

    def test_an_error_from_there(self):
        self.document.set_all({"A1": f"={self.there}B6", "A2": "=ENTHALPY_OF(A1)"})
        self.assertNotEqual(self.document.error("A2"), "")
        self.assertTrue(self.why("A2").startswith("A2 passes on the error of A1: "))


class WithoutTheExtension(SheetCase):
    """A colleague without Busbar opens the workbook, saves it, and sends it back."""

    @classmethod
    def setUpClass(cls):
        super().setUpClass()
        cls.plain_profile = Profile()
        cls.addClassCleanup(cls.plain_profile.remove)
        cls.plain = Office(cls.plain_profile.folder)
        cls.addClassCleanup(lambda: cls.plain.close())

    def setUp(self):
        super().setUp()
        if not self.plain.alive():
            type(self).plain = Office(self.plain_profile.folder)
        fill(self.document)
        self.before = contents(self.document)

    def there_and_back(self, suffix):
        """The workbook in the plain office, and again in this one after it was saved there."""
        sent, returned = self.path("sent" + suffix), self.path("returned" + suffix)
        self.document.save(sent)
        with self.plain.load(sent) as visitor:
            seen = {a: (visitor.cell(a).Formula, visitor.content(a)) for a in SHOWN}
            visitor.save(returned)
        again = self.office.load(returned)
        self.addCleanup(again.close)
        again.recalculate()
        return seen, again

    def test_ods(self):
        seen, again = self.there_and_back(".ods")
        self.assertEqual(seen["B2"], ("=busbar.enthalpy_of(B1)", "#NAME?"))
        self.assertEqual(contents(again), self.before)
        self.assertEqual(again.cell("B2").Formula, "=BUSBAR.ENTHALPY_OF(B1)")

    def test_xlsx(self):
        seen, again = self.there_and_back(".xlsx")
        formula, shown = seen["B2"]
        self.assertEqual(formula, "=busbar.enthalpy_of(B1)")
        self.assertAlmostEqual(shown, self.before["B2"], delta=1e-10)
        self.assertEqual(contents(again), self.before)

    def test_stream_texts_need_no_extension(self):
        # What the colleague sees of a stream is readable, and survives as it is.
        self.document.save(self.path("sent.xlsx"))
        with self.plain.load(self.path("sent.xlsx")) as visitor:
            self.assertTrue(visitor.text("B1").startswith("steam 55 kg/s, 100 bar, 540 °C ["))

    def test_a_new_sheet_of_the_colleague_is_understood(self):
        # Typed without the extension in the form that files keep: alive as soon as it is here.
        path = self.path("typed.ods")
        with self.plain.new() as visitor:
            visitor.cell("A1").Formula = "=BUSBAR.STEAM_ENTHALPY(100;540)"
            self.assertEqual(visitor.error("A1"), "#NAME?")
            visitor.save(path)
        with self.office.load(path) as again:
            again.recalculate()
            self.assertEqual(again.value("A1"), self.before["B2"])
