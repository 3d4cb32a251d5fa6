"""An office with a decimal comma: numbers are typed and shown with it, streams and sentences stay
the same byte for byte, and files go both ways."""

import os

from harness.case import SheetCase
from harness.office import Office
from harness.profile import Profile

GERMAN = (
    '<item oor:path="/org.openoffice.Setup/L10N"><prop oor:name="ooSetupSystemLocale" '
    'oor:op="fuse"><value>de-DE</value></prop></item>'
)


def in_german(profile):
    """Makes German the locale of a profile that has been started before."""
    path = os.path.join(profile.folder, "user", "registrymodifications.xcu")
    with open(path, encoding="utf-8") as file:
        settings = file.read()
    assert "</oor:items>" in settings
    with open(path, "w", encoding="utf-8") as file:
        file.write(settings.replace("</oor:items>", GERMAN + "</oor:items>"))


class DecimalComma(SheetCase):
    @classmethod
    def setUpClass(cls):
        super().setUpClass()
        cls.profile = Profile()
        cls.addClassCleanup(cls.profile.remove)
        cls.profile.with_extension(cls.oxt)
        in_german(cls.profile)
        cls.german_office = Office(cls.profile.folder)
        cls.addClassCleanup(lambda: cls.german_office.close())

    def setUp(self):
        super().setUp()
        if not self.german_office.alive():
            # A crash fails the test that caused it, and that one alone.
            type(self).german_office = Office(self.profile.folder)
        self.german = self.german_office.new()
        self.addCleanup(self.german.close)

    def type(self, address, text):
        """As typed on the keyboard: the office reads numbers in its own locale."""
        self.german.select(address).dispatch(".uno:EnterString", StringName=text)

    def test_the_locale_is_what_it_should_be(self):
        self.type("A1", "100,5")
        self.assertEqual(self.german.value("A1"), 100.5)
        self.assertEqual(self.german.text("A1"), "100,5")
        self.document.set("A1", 100.5)
        self.assertEqual(self.document.text("A1"), "100.5")

    def test_streams_and_values_are_the_same(self):
        self.type("A1", "100,5")
        self.type("A2", "=STEAM(A1;540;55,25)")
        self.type("A3", "=ENTHALPY_OF(A2)")
        self.document.set_all({"A1": 100.5, "A2": "=STEAM(A1;540;55.25)", "A3": "=ENTHALPY_OF(A2)"})
        self.assertEqual(self.german.text("A2"), self.document.text("A2"))
        self.assertTrue(self.german.text("A2").startswith("steam 55.25 kg/s, 100.5 bar, 540 °C ["))
        self.assertEqual(self.german.value("A3"), self.document.value("A3"))
        self.assertIn(",", self.german.text("A3"))
        self.assertEqual(self.german.cell("A2").FormulaLocal, "=STEAM(A1;540;55,25)")
        self.assertEqual(self.german.cell("A2").Formula, "=BUSBAR.STEAM(A1;540;55.25)")

    def test_a_stream_from_the_other_locale_is_read(self):
        self.document.set("A1", "=STEAM(100.5;540.25;55.25)")
        text = self.document.text("A1")
        self.type("A1", text)
        self.german.set("A2", "=TEMPERATURE_OF(A1)")
        self.assertEqual(self.german.value("A2"), 540.25)

    def test_sentences_are_the_same(self):
        for comma, point in (
            ("=STEAM(1450,5;540)", "=STEAM(1450.5;540)"),
            ("=STEAM(100;540,5)", "=STEAM(100;540.5)"),
            ("=TURBINE_OUT(STEAM(100;540);0,05;88)", "=TURBINE_OUT(STEAM(100;540);0.05;88)"),
            ("=STEAM(A9;540)", "=STEAM(A9;540)"),
            ("=1/0", "=1/0"),
            ('=CONVERT_UNIT(0,5;"bar";"kW")', '=CONVERT_UNIT(0.5;"bar";"kW")'),
            ("=EFFICIENCY_CHAIN({0,9|7})", "=EFFICIENCY_CHAIN({0.9;7})"),
        ):
            with self.subTest(comma):
                self.german.set_all({"C3": comma, "D3": "=WHY(C3)"})
                self.document.set_all({"C3": point, "D3": "=WHY(C3)"})
                self.assertEqual(self.german.text("D3"), self.document.text("D3"))
                self.assertEqual(self.german.error("C3"), self.document.error("C3"))

    def test_a_decimal_point_is_no_number_here(self):
        self.german.set_all({"A1": "100.5", "A2": "=STEAM_ENTHALPY(A1;540)", "A3": "=WHY(A2)"})
        self.assertEqual(self.german.error("A2"), "#VALUE!")
        self.assertIn('pressure "100.5" is a text where a number is needed', self.german.text("A3"))

    def test_units_and_options_are_words_in_any_locale(self):
        self.type("A1", '=CONVERT_UNIT(1450,5;"psia";"bar")')
        self.document.set("A1", '=CONVERT_UNIT(1450.5;"psia";"bar")')
        self.assertEqual(self.german.value("A1"), self.document.value("A1"))
        self.type("A2", '=STEAM(14,5;1000;;"us")')
        self.assertTrue(self.german.text("A2").startswith("steam 14.5 psia, 1000 °F ["))

    def test_files_go_both_ways(self):
        self.type("A1", "100,5")
        self.type("B1", "=STEAM(A1;540,5)")
        self.type("B2", "=ENTHALPY_OF(B1)")
        for suffix in (".ods", ".xlsx"):
            with self.subTest(suffix):
                self.german.save(self.path("german" + suffix))
                with self.office.load(self.path("german" + suffix)) as here:
                    here.recalculate()
                    self.assertEqual(here.text("B1"), self.german.text("B1"))
                    self.assertEqual(here.value("B2"), self.german.value("B2"))
                    here.save(self.path("back" + suffix))
                with self.german_office.load(self.path("back" + suffix)) as back:
                    back.recalculate()
                    self.assertEqual(back.text("B1"), self.german.text("B1"))

    def test_examples_hold_their_values(self):
        # In the form that files keep, which has no locale.
        for formula in (
            "=BUSBAR.STEAM_ENTHALPY(30;26.85)",
            "=BUSBAR.CARNOT(540.5;30.25)",
            "=BUSBAR.EFFICIENCY_CHAIN({0.9|0.5|0.98})",
            '=BUSBAR.EFFICIENCY_ON_BASIS(0.55;"LHV";"HHV";55.5;50)',
        ):
            with self.subTest(formula):
                for document in (self.german, self.document):
                    document.cell("A1").Formula = formula
                self.assertEqual(self.german.error("A1"), "")
                self.assertEqual(self.german.value("A1"), self.document.value("A1"))
