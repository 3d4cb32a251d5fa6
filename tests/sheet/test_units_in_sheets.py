"""One named cell with the unit set drives a whole model; the physics does not depend on it."""

from com.sun.star.table import CellAddress

from harness.case import SheetCase

# A small unit: live steam, an expansion, a pump, the powers and the limits. The inputs stand in
# metric units in column A; column B brings them into the units of the named cell `units`, and
# everything below reads column B.
INPUTS = {
    "A1": (100, "pressure", "bar", "psia", "Pa"),
    "A2": (540, "temperature", "°C", "°F", "K"),
    "A3": (55, "flow", "kg/s", "lb/h", "kg/s"),
    "A4": (0.05, "pressure", "bar", "psia", "Pa"),
    "A5": (30, "temperature", "°C", "°F", "K"),
}
MODEL = {
    "D1": "=STEAM(B1;B2;B3;units)",
    "D2": "=TURBINE_OUT(D1;B4;0.88;units)",
    "D3": "=STEAM_AT_DRYNESS(B4;0;B3;units)",
    "D4": "=PUMP_OUT(D3;B1;0.8;units)",
    "E1": "=PRESSURE_OF(D2;units)",
    "E2": "=TEMPERATURE_OF(D2;units)",
    "E3": "=ENTHALPY_OF(D1;units)",
    "E4": "=ENTROPY_OF(D1;units)",
    "E5": "=VOLUME_OF(D1;units)",
    "E6": "=FLOW_OF(D1;units)",
    "E7": "=FLUID_POWER(D1;D2;units)",
    "E8": "=HEAT_DUTY(D4;D1;units)",
    "E9": "=CARNOT(MEAN_HEATING_TEMPERATURE(D4;D1;units);B5;units)",
    "E10": "=HEAT_RATE(E7/E8;units)",
    "E11": "=DRYNESS_OF(D2)",
    "E12": "=TURBINE_EFFICIENCY(D1;D2)",
    "E13": "=EFFICIENCY_FROM_HEAT_RATE(E10;units)",
    "E14": "=DENSITY_OF(D1;units)",
}
# Unit of each result in the three sets; None where there is none.
RESULTS = {
    "E1": ("bar", "psia", "Pa"),
    "E2": ("°C", "°F", "K"),
    "E3": ("kJ/kg", "Btu/lb", "J/kg"),
    "E4": ("kJ/(kg K)", "Btu/(lb °F)", "J/(kg K)"),
    "E5": ("m3/kg", "ft3/lb", "m3/kg"),
    "E6": ("kg/s", "lb/h", "kg/s"),
    "E7": ("MW", "MW", "W"),
    "E8": ("MW", "MW", "W"),
    "E9": None,
    "E10": ("kJ/kWh", "Btu/kWh", "J/J"),
    "E11": None,
    "E12": None,
    "E13": None,
    "E14": ("kg/m3", "lb/ft3", "kg/m3"),
}
SETS = ("metric", "us", "si")


class OneNamedCell(SheetCase):
    def setUp(self):
        super().setUp()
        self.document.model.NamedRanges.addNewByName(
            "units", "$Sheet1.$H$1", CellAddress(0, 0, 0), 0
        )
        self.document.set("H1", "metric")
        for address, (value, _, *units) in INPUTS.items():
            self.document.set(address, value)
            # The unit of this row in each set, beside it, and the conversion by it.
            row = address[1:]
            self.document.fill(f"J{row}", [tuple(units)])
            wanted = f'INDEX(J{row}:L{row};MATCH(units;{{"metric","us","si"}};0))'
            self.document.set(f"B{row}", f"=CONVERT_UNIT(A{row};J{row};{wanted})")
        self.document.set_all(MODEL)

    def values(self, unit_set):
        self.document.set("H1", unit_set)
        values = {}
        for address in RESULTS:
            self.assert_error(address, "")
            values[address] = self.document.value(address)
        return values

    def test_the_physics_is_the_same_in_every_unit_set(self):
        metric = self.values("metric")
        for which, unit_set in enumerate(SETS):
            values = self.values(unit_set)
            for address, units in RESULTS.items():
                with self.subTest(set=unit_set, cell=MODEL[address]):
                    value = values[address]
                    if units and which:
                        self.document.set(
                            "M1", f'=CONVERT_UNIT({value!r};"{units[which]}";"{units[0]}")'
                        )
                        self.assert_error("M1", "")
                        value = self.document.value("M1")
                    self.assertAlmostEqual(
                        value, metric[address], delta=1e-11 * abs(metric[address])
                    )

    def test_the_numbers_differ_where_the_units_do(self):
        # The check above would pass if the unit set were not read at all.
        metric, us, si = (self.values(unit_set) for unit_set in SETS)
        # NIST SP 811 (2008), appendix B.8: 1 lb = 0.453 592 37 kg; 1 Btu(IT) = 1.055 055 852 62 kJ,
        # of which follows 1 Btu/lb = 2.326 kJ/kg exactly.
        self.assertAlmostEqual(us["E6"] * 0.45359237 / 3600, 55, delta=1e-10)
        self.assertAlmostEqual(us["E3"] * 2.326, metric["E3"], delta=1e-8)
        self.assertAlmostEqual(si["E3"] / 1000, metric["E3"], delta=1e-8)
        self.assertAlmostEqual(si["E7"] / 1e6, metric["E7"], delta=1e-10)
        self.assertAlmostEqual((us["E2"] - 32) / 1.8, metric["E2"], delta=1e-10)
        self.assertAlmostEqual(si["E2"] - 273.15, metric["E2"], delta=1e-10)
        # SI Brochure, 9th ed., table 8: 1 h = 3600 s, so 1 J/J is 3600 kJ/kWh.
        self.assertAlmostEqual(si["E10"] * 3600, metric["E10"], delta=1e-8)

    def test_stream_faces_follow(self):
        for unit_set, face in (
            ("metric", "steam 55 kg/s, 100 bar, 540 °C ["),
            ("us", "steam 436515 lb/h, 1450.38 psia, 1004 °F ["),
            ("si", "steam 55 kg/s, 10000000 Pa, 813.15 K ["),
        ):
            self.document.set("H1", unit_set)
            shown = self.document.text("D1")
            self.assertTrue(shown.startswith(face), shown)

    def test_a_stream_written_in_one_set_is_read_in_another(self):
        self.document.set_all({"H1": "us", "N1": '=PRESSURE_OF(D1;"metric")'})
        # Through psia and back: a few units in the last place.
        self.assertAlmostEqual(self.document.value("N1"), 100, delta=1e-12)

    def test_sentences_follow(self):
        self.document.set_all({"A2": 5000, "H1": "us"})
        self.assertIn("temperature 9032 °F is above 3632 °F", self.why("D1"))
        self.document.set("H1", "si")
        self.assertIn("temperature 5273.15 K is above 2273.15 K", self.why("D1"))

    def test_a_misspelt_unit_set_stops_the_whole_model(self):
        self.document.set("H1", "metrics")
        for address in MODEL:
            if address not in ("E11", "E12"):
                self.assertNotEqual(self.document.error(address), "", address)
        self.document.set("M2", "=STEAM(100;540;;units)")
        self.assert_error("M2", "#VALUE!")
        self.assertIn('options "metrics" is not a unit set', self.why("M2"))

    def test_a_blank_named_cell_is_no_unit_set(self):
        self.document.set_all({"H1": None, "M2": "=STEAM(100;540;;units)"})
        self.assert_error("M2", "Err:502")
        self.assertIn("options is zero or blank", self.why("M2"))
