"""Ranges as arguments: one call for a table of results, in array formulas and inside others."""

from catalogue import engine
from harness.case import SheetCase

PRESSURES = [100.0, 50.0, 10.0]
TEMPERATURES = [540.0, 400.0, 300.0, 200.0]

# 10,000 readings, of which these rows cannot be: 37, at uneven distances.
READINGS = 10000
BAD_ROWS = [17 + 271 * i for i in range(37)]


class Arrays(SheetCase):
    def engine(self, name, *arguments):
        """The same call through the C interface, which the cells are compared with here."""
        return engine(self.oxt).call(name, *arguments)

    def fill_axes(self):
        """Pressures down from A2, temperatures to the right from B1."""
        self.document.fill("A2", [(p,) for p in PRESSURES])
        self.document.fill("B1", [tuple(TEMPERATURES)])

    def test_column_against_column(self):
        self.document.fill("A1", list(zip(PRESSURES, TEMPERATURES)))
        self.document.set_array("C1:C3", "=STEAM_ENTHALPY(A1:A3;B1:B3)")
        for row, (p, t) in enumerate(zip(PRESSURES, TEMPERATURES), 1):
            self.assertEqual(self.document.value(f"C{row}"), self.engine("STEAM_ENTHALPY", p, t))

    def test_column_against_row_is_a_table(self):
        self.fill_axes()
        self.document.set_array("B2:E4", "=STEAM_ENTHALPY(A2:A4;B1:E1)")
        table = self.document.table("B2:E4")
        for r, p in enumerate(PRESSURES):
            for c, t in enumerate(TEMPERATURES):
                self.assertEqual(table[r][c], self.engine("STEAM_ENTHALPY", p, t))

    def test_single_cells_and_literals_spread(self):
        self.fill_axes()
        self.document.set_array("B2:B4", "=STEAM_ENTHALPY(A2:A4;B1)")
        self.document.set_array("C2:C4", "=STEAM_ENTHALPY(A2:A4;540)")
        self.assertEqual(self.document.table("B2:B4"), self.document.table("C2:C4"))

    def test_streams_and_words_are_lifted_too(self):
        self.document.fill("A1", [(100.0, "psia"), (50.0, "kPa"), (10.0, "MPa")])
        self.document.set_array("C1:C3", "=STEAM(A1:A3;540)")
        self.document.set_array("D1:D3", "=ENTHALPY_OF(C1:C3)")
        self.document.set_array("E1:E3", '=CONVERT_UNIT(A1:A3;"bar";B1:B3)')
        for row, (p, unit) in enumerate(zip(PRESSURES, ("psia", "kPa", "MPa")), 1):
            self.assertEqual(self.document.text(f"C{row}"), self.engine("STEAM", p, 540))
            self.assertEqual(self.document.value(f"D{row}"), self.engine("STEAM_ENTHALPY", p, 540))
            self.assertEqual(
                self.document.value(f"E{row}"), self.engine("CONVERT_UNIT", p, "bar", unit)
            )

    def test_ranges_that_do_not_fit(self):
        self.document.fill("A1", [(100.0, 540.0), (50.0, 400.0), (10.0, 300.0)])
        self.document.set_array("D1:D3", "=STEAM_ENTHALPY(A1:A3;B1:B2)")
        for row in (1, 2, 3):
            self.assert_error(f"D{row}", "#VALUE!")
            self.assert_told(f"D{row}", "temperature has 2 rows and 1 columns, which fits no other")
        self.document.set("E1", "=STEAM_ENTHALPY(A1:B2;A1:B3)")
        self.assert_error("E1", "#VALUE!")
        self.assert_told("E1", "temperature has 3 rows and 2 columns, which fits no other")

    def test_ranges_that_do_not_fit_fail_whatever_stands_in_them(self):
        # The first cells would fail by themselves too, but the call never came to read them.
        self.document.fill("A1", [(-5.0, 540.0), ("x", 400.0), (10.0, 300.0)])
        self.document.set_array("D1:D3", "=STEAM_ENTHALPY(A1:A3;B1:B2)")
        for row in (1, 2, 3):
            self.assert_told(f"D{row}", "temperature has 2 rows and 1 columns")

    def assert_told(self, cell, words):
        """WHY says it of this cell, in the engine's words."""
        answer = self.why(cell)
        self.assertTrue(answer.startswith(f"{cell}: STEAM"), answer)
        self.assertIn(words, answer)

    def test_a_range_of_unit_sets_is_refused(self):
        self.document.fill("A1", [("us",), ("si",)])
        self.document.set("B1", "=STEAM(100;540;;A1:A2)")
        self.assert_error("B1", "#VALUE!")
        self.assert_told("B1", "options is a range; one cell with the unit set is needed")
        self.document.fill("A1", [("x",), ("y",)])
        self.assert_told("B1", "options is a range; one cell with the unit set is needed")

    def test_inline_arrays(self):
        # In this locale rows of an inline array are set apart by a semicolon, columns by a comma.
        self.document.set_array("A1:B2", "=STEAM_ENTHALPY({100;50};{540,400})")
        self.assertEqual(
            [list(row) for row in self.document.table("A1:B2")],
            [[self.engine("STEAM_ENTHALPY", p, t) for t in (540, 400)] for p in (100, 50)],
        )
        self.document.set("C1", "=EFFICIENCY_CHAIN({0.9,0.5;0.8,0.5})")
        self.assertAlmostEqual(self.document.value("C1"), 0.18, places=15)  # 0.9*0.5*0.8*0.5

    def test_larger_and_smaller_targets(self):
        self.document.fill("A1", [(p,) for p in PRESSURES])
        self.document.set_array("C1:D5", "=STEAM_ENTHALPY(A1:A3;540)")
        self.document.set_array("F1:F2", "=STEAM_ENTHALPY(A1:A3;540)")
        expected = [self.engine("STEAM_ENTHALPY", p, 540) for p in PRESSURES]
        # Calc's rules: a single column repeats to the right, what lies beyond is #N/A.
        for row, value in enumerate(expected, 1):
            self.assertEqual(self.document.value(f"C{row}"), value)
            self.assertEqual(self.document.value(f"D{row}"), value)
        self.assert_error("C4", "#N/A")
        self.assert_error("D5", "#N/A")
        self.assertEqual([row[0] for row in self.document.table("F1:F2")], expected[:2])
        self.document.set("G1", "=STEAM_ENTHALPY(A1:A3;540)")
        self.assertEqual(self.document.value("G1"), expected[0])

    def test_results_inside_calc_functions(self):
        self.document.fill("A1", [(p,) for p in PRESSURES])
        expected = [self.engine("STEAM_ENTHALPY", p, 540) for p in PRESSURES]
        self.document.set("C1", "=SUMPRODUCT(STEAM_ENTHALPY(A1:A3;540);A1:A3)")
        self.document.set_array("C2", "=SUM(STEAM_ENTHALPY(A1:A3;540))")
        self.document.set("C3", "=MAX(STEAM_ENTHALPY(A1:A3;540))")
        self.document.set("C4", "=INDEX(STEAM_ENTHALPY(A1:A3;540);2)")
        self.document.set("C5", "=ROWS(STEAM_ENTHALPY(A1:A3;540))")
        self.document.set("C6", "=SUM(STEAM_ENTHALPY(A1:A3;540))")
        weighted = sum(h * p for h, p in zip(expected, PRESSURES))
        self.assertAlmostEqual(self.document.value("C1"), weighted, delta=1e-12 * weighted)
        self.assertAlmostEqual(self.document.value("C2"), sum(expected), delta=1e-9)
        self.assertEqual(self.document.value("C3"), max(expected))
        self.assertEqual(self.document.value("C4"), expected[1])
        self.assertEqual(self.document.value("C5"), 3)
        # A range means the whole range in a plain formula as well.
        self.assertEqual(self.document.value("C6"), self.document.value("C2"))

    def test_nested_array_calls(self):
        self.document.fill("A1", [(p,) for p in PRESSURES])
        self.document.set_array("C1:C3", "=TEMPERATURE_OF(VALVE_OUT(STEAM(A1:A3;540);A1:A3/2))")
        for row, p in enumerate(PRESSURES, 1):
            self.document.set("D1", f"=TEMPERATURE_OF(VALVE_OUT(STEAM({p};540);{p / 2}))")
            self.assertEqual(self.document.value(f"C{row}"), self.document.value("D1"))


class Readings(SheetCase):
    """A column of plant readings, some of them impossible."""

    def setUp(self):
        super().setUp()
        rows = [[100.0 + 0.001 * i, 500.0 + 0.002 * i] for i in range(READINGS)]
        for row in BAD_ROWS:
            rows[row][1] = -40.0  # a broken thermocouple
        self.document.fill("A1", rows)

    def test_failures_inside_a_range_stay_where_they_are(self):
        self.document.set_array(
            f"C1:C{READINGS}", f"=STEAM_ENTHALPY(A1:A{READINGS};B1:B{READINGS})"
        )
        table = self.document.table(f"C1:C{READINGS}")
        failed = [row for row, (value,) in enumerate(table) if value is None]
        self.assertEqual(failed, BAD_ROWS)
        self.assert_error(f"C{BAD_ROWS[0] + 1}", "Err:502")
        self.assertIn("temperature -40 °C is below 0 °C", self.why(f"C{BAD_ROWS[0] + 1}"))
        for row in (0, 1, READINGS // 2, READINGS - 1):
            expected = engine(self.oxt).call(
                "STEAM_ENTHALPY", 100.0 + 0.001 * row, 500.0 + 0.002 * row
            )
            self.assertEqual(table[row][0], expected)

    def test_errors_inside_iferror(self):
        call = f"STEAM_ENTHALPY(A1:A{READINGS};B1:B{READINGS})"
        self.document.set_array(f"C1:C{READINGS}", f'=IFERROR({call};"")')
        self.document.set("D1", f'=COUNTIF(C1:C{READINGS};"")')
        self.document.set("D2", f"=COUNT(C1:C{READINGS})")
        self.document.set_array("D3", f"=SUM(ISERROR({call})*1)")
        self.document.set_array("D4", f'=AVERAGE(IFERROR({call};""))')
        self.assertEqual(self.document.value("D2"), READINGS - 37)
        self.assertEqual(self.document.value("D3"), 37)
        empty = sum(1 for (value,) in self.document.table(f"C1:C{READINGS}") if value == "")
        self.assertEqual(empty, 37)
        self.assert_error("D4", "")

    def test_an_error_cell_in_the_readings_stops_the_call(self):
        # Calc calls no add-in with a range that holds an error.
        for row in BAD_ROWS:
            self.document.set(f"B{row + 1}", "=NA()")
        call = f"STEAM_ENTHALPY(A1:A{READINGS};B1:B{READINGS})"
        self.document.set_array(f"C1:C{READINGS}", f"={call}")
        self.assert_error("C1", "Err:504")
        self.assertIn(f"passes on the error of B{BAD_ROWS[0] + 1}", self.why("C1"))
        # The way out, as the help says: give the error cells a text first.
        cured = f'STEAM_ENTHALPY(A1:A{READINGS};IFERROR(B1:B{READINGS};""))'
        self.document.set_array(f"C1:C{READINGS}", f'=IFERROR({cured};"")')
        empty = sum(1 for (value,) in self.document.table(f"C1:C{READINGS}") if value == "")
        self.assertEqual(empty, 37)


class Tables(SheetCase):
    """Functions that take a whole range of streams."""

    def setUp(self):
        super().setUp()
        self.document.set_all(
            {
                "A1": '=TAGGED(STEAM(100;540;55);"LBA10")',
                "A2": "=STEAM_AT_DRYNESS(0.05;0.88;50)",
                "A3": "=STEAM(10;100)",
            }
        )

    def test_stream_table(self):
        self.document.set_array("C1:J4", "=STREAM_TABLE(A1:A3)")
        self.assertEqual(
            [self.document.text(f"{column}1") for column in "CDEFGHIJ"],
            [
                "tag",
                "flow, kg/s",
                "pressure, bar",
                "temperature, °C",
                "enthalpy, kJ/kg",
                "entropy, kJ/(kg K)",
                "volume, m³/kg",
                "dryness",
            ],
        )
        self.assertEqual(self.document.text("C2"), "LBA10")
        self.assertEqual(self.document.value("D2"), 55)
        self.assertEqual(self.document.value("J3"), 0.88)
        readers = {
            "E": "PRESSURE",
            "F": "TEMPERATURE",
            "G": "ENTHALPY",
            "H": "ENTROPY",
            "I": "VOLUME",
        }
        for row in (2, 3, 4):
            for column, reader in readers.items():
                self.document.set("L1", f"={reader}_OF(A{row - 1})")
                self.assertEqual(self.document.value(f"{column}{row}"), self.document.value("L1"))
        # No flow, no tag, no dryness: empty, never 0.
        for cell in ("C4", "D4", "J2", "J4"):
            self.assertEqual(self.document.content(cell), "", cell)

    def test_stream_table_in_other_units(self):
        self.document.set_array("C1:J4", '=STREAM_TABLE(A1:A3;"us")')
        self.assertEqual(self.document.text("E1"), "pressure, psia")
        # NIST SP 811, appendix B.8: 1 psi = 6.894757 E+03 Pa; 1 bar = 1 E+05 Pa.
        self.assertAlmostEqual(self.document.value("E2"), 100e5 / 6.894757e3, delta=2e-4)
        self.assertAlmostEqual(self.document.value("F2"), 540 * 9 / 5 + 32, delta=1e-9)

    def test_a_table_takes_a_row_and_a_block(self):
        self.document.set_all({"B1": "=A3", "B2": "=A1", "B3": "=A2"})
        self.document.set_array("D1:K7", "=STREAM_TABLE(A1:B3)")
        # Row by row: A1, B1, A2, B2, A3, B3.
        self.assertEqual(self.document.value("F2"), 100)
        self.assertEqual(self.document.value("F3"), 10)
        self.assertEqual(self.document.value("F4"), 0.05)
        self.assertEqual(self.document.value("F7"), 0.05)

    def test_a_failing_stream_fails_the_table(self):
        self.document.set("A2", None)
        self.document.set_array("C1:J4", "=STREAM_TABLE(A1:A3)")
        self.assert_error("C1", "#N/A")
        self.assertIn("streams in row 2, column 1 of its range is blank", self.why("C1"))

    def test_mix_out_over_a_range(self):
        # Mass and energy in balance: Moran and Shapiro, Fundamentals of Engineering Thermodynamics,
        # 5th ed., section 4.3, mixing chambers.
        flows = [5.0, 3.0, 2.0]
        self.document.fill("A1", [(5.0,), (3.0,), (2.0,)])
        self.document.set_array("B1:B3", "=STEAM({10;10;8};{300;200;250};A1:A3)")
        self.document.set_all(
            {"D1": "=MIX_OUT(B1:B3)", "D2": "=FLOW_OF(D1)", "D3": "=ENTHALPY_OF(D1)"}
        )
        self.document.set_array("C1:C3", "=ENTHALPY_OF(B1:B3)")
        self.assertEqual(self.document.value("D2"), 10)
        enthalpies = [row[0] for row in self.document.table("C1:C3")]
        mean = sum(m * h for m, h in zip(flows, enthalpies)) / 10
        self.assertAlmostEqual(self.document.value("D3"), mean, delta=1e-10 * mean)
        self.document.set("D4", "=PRESSURE_OF(D1)")
        self.assertEqual(self.document.value("D4"), 8)
