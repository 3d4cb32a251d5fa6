"""Fuel analyses in cells: a range with its heading, a text, and what WHY says of a bad one."""

from harness.case import SheetCase

ANALYSIS = [
    ("part", "mass % as received"),
    ("C", 60.0),
    ("H", 4.0),
    ("O", 8.0),
    ("ash", 8.0),
    ("moisture", 20.0),
]


class FuelsInSheets(SheetCase):
    def test_range_and_text_of_it_are_one(self):
        self.document.fill("A1", ANALYSIS)
        self.document.set("D1", '=FUEL_ANALYSIS_ON_BASIS(A1:B6;"dry")')
        self.document.set("D2", '=FUEL_ANALYSIS_SHARE(D1;"C")')
        self.document.set("D3", '=FUEL_HHV_BY_CORRELATION(A1:B6;"Boie";"dry")')
        self.document.set("D4", '=FUEL_HHV_BY_CORRELATION(D1;"Boie";"dry")')
        self.assertAlmostEqual(self.document.value("D2"), 0.75, 15)
        self.assertAlmostEqual(self.document.value("D3"), self.document.value("D4"), 12)

    def test_why_says_by_how_much_an_analysis_does_not_close(self):
        self.document.fill("A1", ANALYSIS)
        self.document.fill("B4", [(11.0,)])
        self.document.set("D1", '=FUEL_ANALYSIS_SHARE(A1:B6;"C")')
        self.assert_error("D1", "Err:502")
        self.assertIn("add to 1.03, 0.03 too much", self.why("D1"))

    def test_typical_fuel_serves_when_asked(self):
        self.document.set("A1", '=TYPICAL_FUEL("wood, beech (Ghugare 2014)")')
        self.document.set("A2", '=FUEL_LHV_FROM_HHV(A1;20;"dry";"ar";"ISO 18125";0.4)')
        self.assertTrue(self.document.text("A1").startswith("[typical: "))
        self.assertGreater(self.document.value("A2"), 9)
