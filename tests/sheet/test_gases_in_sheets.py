"""Compositions and gas streams as cells hold them: ranges, inline arrays, texts, and what WHY says
of them."""

from harness.case import SheetCase


class Compositions(SheetCase):
    def table(self, basis="mole %", last=21):
        self.document.set_all(
            {"A1": "species", "B1": basis, "A2": "N2", "B2": 79, "A3": "O2", "B3": last}
        )

    def test_a_range_with_blank_lines_at_its_end(self):
        self.table()
        self.document.set("D1", "=GAS_MOLAR_MASS(A1:B9)")
        self.assertAlmostEqual(self.document.value("D1"), 28.850334, places=9)

    def test_an_inline_array_and_a_text_are_the_same(self):
        # In this locale rows of an inline array are set apart by a semicolon, columns by a comma.
        self.document.set("D1", '=GAS_MOLAR_MASS({"species","mole %";"N2",79;"O2",21})')
        self.document.set("D2", '=GAS_MOLAR_MASS("mole: N2 0.79, O2 0.21")')
        self.assertEqual(self.document.value("D1"), self.document.value("D2"))

    def test_one_composition_for_a_column_of_temperatures(self):
        self.table()
        self.document.set_all({"C1": 100, "C2": 500, "C3": 900})
        self.document.set_array("D1:D3", "=GAS_HEAT_CAPACITY(A1:B3;C1:C3)")
        for row in "123":
            self.document.set(f"E{row}", f"=GAS_HEAT_CAPACITY(A$1:B$3;C{row})")
            self.assertEqual(self.document.value(f"D{row}"), self.document.value(f"E{row}"))

    def test_a_column_of_texts_is_lifted_over(self):
        self.document.set_all({"A1": "mole: N2 1", "A2": "mole: Xy 1", "A3": "dry air, NASA"})
        self.document.set_array("B1:B3", "=GAS_MOLAR_MASS(A1:A3)")
        self.assertAlmostEqual(self.document.value("B1"), 28.0134, places=9)
        self.assert_error("B2", "#VALUE!")
        self.assertAlmostEqual(self.document.value("B3"), 28.9651159, places=6)
        self.assertIn('"Xy"', self.why("B2"))

    def test_why_names_the_cell_of_the_table(self):
        self.table(last=20)
        self.document.set("D1", "=GAS_MOLAR_MASS(A1:B3)")
        self.assert_error("D1", "Err:502")
        self.assertIn("sums to 0.99, 0.01 too little", self.why("D1"))
        self.table(basis="%")
        self.assertIn('row 1, column 2 of its range "%"', self.why("D1"))
        self.table()
        self.document.set("A3", "Oxygenium")
        self.assertIn('row 3, column 1 of its range "Oxygenium"', self.why("D1"))

    def test_normalised_on_request(self):
        self.table(last=20)
        self.document.set("D1", "=NORMALISED_COMPOSITION(A1:B3)")
        self.document.set("D2", '=SPECIES_FRACTION(D1;"O2";"mole")')
        self.assertAlmostEqual(self.document.value("D2"), 20 / 99, places=12)


class GasStreams(SheetCase):
    def test_through_a_gas_turbine(self):
        self.document.set_all(
            {
                "A1": "=AIR(1.013;15;0.6;650)",
                "A2": "=COMPRESSOR_OUT(A1;18;0.88)",
                "A3": "=GAS(COMPOSITION_OF(A1;\"mole\");18;1300;650)",
                "A4": "=TURBINE_OUT(A3;1.05;0.9)",
                "B1": "=FLUID_POWER(A3;A4)+FLUID_POWER(A1;A2)",
                "B2": "=COMPRESSOR_EFFICIENCY(A1;A2)",
            }
        )
        self.assertTrue(self.document.text("A4").startswith("gas 650 kg/s, 1.05 bar, "))
        self.assertGreater(self.document.value("B1"), 100)
        self.assertAlmostEqual(self.document.value("B2"), 0.88, places=9)

    def test_the_datum_is_told_and_switched(self):
        self.document.set_all(
            {
                "A1": '=GAS("mole: N2 0.79, O2 0.21";1;25;;"datum=25 °C")',
                "B1": "=ENTHALPY_OF(A1)",
                "B2": '=ENTHALPY_OF(A1;"datum=0 °C")',
            }
        )
        self.assertAlmostEqual(self.document.value("B1"), 0, places=9)
        # By hand: (0.79 x 29.12 + 0.21 x 29.3) J/(mol K) over 28.85 g/mol, times 25 K.
        self.assertAlmostEqual(self.document.value("B2"), 25.27, places=2)
        self.assertIn("zero at 25 °C", self.why("B1"))

    def test_an_edited_composition_is_refused(self):
        self.document.set("A1", '=GAS("mole: N2 0.75, O2 0.25";1;25)')
        text = self.document.text("A1")
        self.document.set("A2", text.replace("N2=0.75 O2=0.25", "N2=0.25 O2=0.75"))
        self.document.set("B2", "=ENTHALPY_OF(A2)")
        self.assert_error("B2", "#VALUE!")
        self.assertIn("check digits", self.why("B2"))

    def test_below_the_dew_point_the_result_says_so(self):
        self.document.set_all(
            {"A1": '=GAS("mole: N2 0.9, H2O 0.1";1;20)', "A2": '=GAS("mole: N2 0.9, H2O 0.1";1;90)'}
        )
        self.assert_error("A1", "Err:502")
        self.assertIn("dew point 45.8", self.why("A1"))
        self.document.set("B2", "=CONDENSATE_OUT(A2;20)")
        self.assertTrue(self.document.text("B2").startswith("water "))
