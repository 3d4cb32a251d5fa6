"""A chromatograph report in a sheet: ISO 6976:2016, annex D, example 1, the way users have it."""

from harness.case import SheetCase

REPORT = [
    ("component", "mole %", "standard uncertainty"),
    ("Methane", 93.3212, 0.0346),
    ("Ethane", 2.5656, 0.0243),
    ("Propane", 1.5368, 0.0148),
    ("Nitrogen", 1.035, 0.0195),
    ("CO2", 1.5414, 0.0111),
]


class ChromatographReport(SheetCase):
    def setUp(self):
        super().setUp()
        self.document.fill("A1", REPORT)

    def test_values_of_the_standard(self):
        self.document.set("E1", '=FUEL_GAS_HEATING_VALUE_BY_VOLUME(A1:B6;"HHV";15;15;1.01325)')
        self.document.set("E2", '=FUEL_GAS_HEATING_VALUE_BY_MASS(A1:B6;"HHV";15)')
        self.assertAlmostEqual(self.document.value("E1"), 38.410611, delta=5e-7)
        self.assertAlmostEqual(self.document.value("E2"), 52.113961, delta=5e-7)

    def test_fractions_shown_as_percent_and_a_text_are_the_same_gas(self):
        self.document.fill("A11", [("component", "mole")])
        for row, (name, percent, _) in enumerate(REPORT[1:], 12):
            self.document.set_all({f"A{row}": name, f"B{row}": percent / 100})
        self.document.set("E1", "=FUEL_GAS_MOLAR_MASS(A1:B6)")
        self.document.set("E2", "=FUEL_GAS_MOLAR_MASS(A11:B16)")
        self.document.set(
            "E3",
            '=FUEL_GAS_MOLAR_MASS("mole: CH4 0.933212, C2H6 0.025656, C3H8 0.015368,'
            ' N2 0.01035, CO2 0.015414")',
        )
        for cell in ("E1", "E2", "E3"):
            self.assertAlmostEqual(self.document.value(cell), 17.38843, delta=5e-6)

    def test_the_table_with_uncertainties(self):
        self.document.set_array(
            "E1:I14",
            '=FUEL_GAS_UNCERTAINTY_TABLE(A1:C6;"independent";15;15;1.01325)',
        )
        self.assert_shows("E9", "HHV by volume")
        self.assertEqual(self.document.text("G9"), "MJ/m³")
        self.assertAlmostEqual(self.document.value("F9"), 38.410611, delta=5e-7)
        self.assertAlmostEqual(self.document.value("H9"), 0.026267, delta=5e-7)

    def test_a_report_that_does_not_close_is_refused_until_it_is_normalised(self):
        self.document.set("B2", 93.3)
        self.document.set("E1", '=FUEL_GAS_HEATING_VALUE_BY_MASS(A1:B6;"LHV";25)')
        self.assert_error("E1", "Err:502")
        self.assertIn("0.000212 too little", self.why("E1"))
        self.document.set("E2", "=NORMALISED_COMPOSITION(A1:B6)")
        self.document.set("E1", '=FUEL_GAS_HEATING_VALUE_BY_MASS(E2;"LHV";25)')
        self.assertAlmostEqual(self.document.value("E1"), 46.9, delta=0.2)

    def test_a_name_that_is_not_known_is_pointed_at(self):
        self.document.set("A4", "C4H10")
        self.document.set("E1", "=FUEL_GAS_MOLAR_MASS(A1:B6)")
        self.assert_error("E1", "#VALUE!")
        self.assertIn('row 4, column 1 of its range "C4H10"', self.why("E1"))

    def test_a_volume_at_other_conditions(self):
        self.document.set("E1", "=FUEL_GAS_VOLUME_AT_CONDITIONS(1000;A1:B6;15;1.01325;0;1.01325)")
        self.assertAlmostEqual(self.document.value("E1"), 947.5, delta=0.1)
        self.document.set("E2", '=FUEL_GAS_DENSITY(A1:B6;"normal";1.01325)')
        self.assert_error("E2", "#VALUE!")
