"""The sample workbook supplier-check.ods: what it finds, and that it finds it by formulas."""

import zipfile
from xml.etree import ElementTree

from harness.workbook import Workbook, WorkbookCase, builder, cells, line, names_of, sample

WORKBOOK = sample("supplier-check.ods")

IMPOSSIBLE, OPEN, CONSISTENT = "impossible", "not shown impossible", "consistent"

# The invented scenario: what its author planted, see builder/supplier_check/figures.py.
PLANTED = {
    "hp": CONSISTENT,
    "ip": IMPOSSIBLE,  # a stage better than isentropic
    "lp": OPEN,  # rests on the exhaust of that stage
    "pump": OPEN,  # the readings are too coarse
    "terminal": CONSISTENT,
    "rejected": CONSISTENT,
    "generator": CONSISTENT,
    "gross": CONSISTENT,
    "net": CONSISTENT,
    "cycle": OPEN,  # boundary not stated
    "boiler": CONSISTENT,
    "unit": IMPOSSIBLE,  # stated on HHV, worked out on LHV
    "heat_rate": IMPOSSIBLE,  # stated as net, worked out as gross
}

NAMESPACES = {
    "office": "urn:oasis:names:tc:opendocument:xmlns:office:1.0",
    "table": "urn:oasis:names:tc:opendocument:xmlns:table:1.0",
    "text": "urn:oasis:names:tc:opendocument:xmlns:text:1.0",
}


class SupplierCheck(Workbook):
    """A supplier check, by the names of its cells."""

    def verdicts(self):
        return {key: self.text(f"verdict_{key}") for key in PLANTED}

    def reason(self, key):
        """The reason beside a claim in the table of the first sheet."""
        area = self.names.getByName("verdict_table").getReferredCells()
        row = 1 + list(PLANTED).index(key)
        return area.getCellByPosition(area.Columns.Count - 1, row).getString()


class SupplierCheckCase(WorkbookCase):
    FILE = "supplier-check.ods"
    NAMED = SupplierCheck

    def assert_verdicts(self, **changed):
        self.assertEqual(self.workbook.verdicts(), {**PLANTED, **changed})


class TestAsCommitted(SupplierCheckCase):
    def test_recalculates_to_the_planted_verdicts(self):
        self.document.recalculate()
        self.assert_verdicts()

    def test_the_file_holds_the_verdicts_that_it_recalculates_to(self):
        stored = stored_texts(WORKBOOK, "Verdicts")
        self.document.recalculate()
        area = self.document.model.NamedRanges.getByName("verdict_table").getReferredCells()
        table = [[cell.replace("\n", " ") for cell in row] for row in stored]
        for row in range(area.Rows.Count):
            shown = [area.getCellByPosition(c, row).getString() for c in range(area.Columns.Count)]
            self.assertIn(shown, table)

    def test_no_cell_is_in_error(self):
        self.document.recalculate()
        wrong = [
            (sheet, row + 1, column, cell.getString())
            for sheet in self.document.model.Sheets.ElementNames
            for row, column, cell in cells(self.document.sheet(sheet))
            if cell.getError()
        ]
        self.assertEqual(wrong, [])

    def test_verdicts_and_reasons_are_formulas(self):
        area = self.document.model.NamedRanges.getByName("verdict_table").getReferredCells()
        for row in range(1, area.Rows.Count):
            for column in range(2, area.Columns.Count):
                formula = area.getCellByPosition(column, row).getFormula()
                self.assertTrue(formula.startswith("="), (row, column))

    def test_no_macro_and_no_link(self):
        with zipfile.ZipFile(WORKBOOK) as archive:
            self.assertFalse([n for n in archive.namelist() if n.startswith(("Basic", "Scripts"))])
            content = archive.read("content.xml").decode("utf-8")
        self.assertNotIn("xlink:href=\"file:", content)

    def test_headings_stay_in_sight(self):
        with zipfile.ZipFile(WORKBOOK) as archive:
            settings = archive.read("settings.xml").decode("utf-8")
        frozen = settings.count('config:name="VerticalSplitMode" config:type="short">2<')
        self.assertEqual(frozen, 4)

    def test_reasons_say_what_was_found(self):
        self.assertIn("isentropic", self.workbook.reason("ip"))
        self.assertIn("gross on LHV", self.workbook.reason("unit"))
        self.assertIn("gross on LHV", self.workbook.reason("heat_rate"))
        self.assertIn("Boundary not stated", self.workbook.reason("cycle"))
        self.assertIn("C2", self.workbook.reason("lp"))


class TestRepairs(SupplierCheckCase):
    """A planted fault that is repaired turns its verdict, and no other one that does not rest on it."""

    def test_the_stage_better_than_isentropic(self):
        self.workbook.set("stated_ip_exhaust_temperature", 267.7)
        self.assert_verdicts(ip=CONSISTENT, lp=CONSISTENT)
        self.assertEqual(self.workbook.text("second_law_ip"), "holds")

    def test_the_unit_efficiency_on_the_basis_it_was_worked_out_on(self):
        self.workbook.set("claim_unit_basis", "LHV")
        self.assert_verdicts(unit=CONSISTENT)

    def test_the_unit_efficiency_on_the_basis_it_is_stated_on(self):
        self.workbook.set("stated_claim_unit", 0.400)
        self.assert_verdicts(unit=CONSISTENT)

    def test_the_heat_rate_as_gross(self):
        self.workbook.set("claim_heat_rate_boundary", "gross")
        self.assert_verdicts(heat_rate=CONSISTENT)

    def test_the_heat_rate_as_net(self):
        self.workbook.set("stated_claim_heat_rate", 9270)
        self.assert_verdicts(heat_rate=CONSISTENT)

    def test_the_boundary_stated_as_gross(self):
        self.workbook.set("claim_cycle_boundary", "gross")
        self.assert_verdicts(cycle=CONSISTENT)

    def test_the_boundary_stated_as_net(self):
        self.workbook.set("claim_cycle_boundary", "net")
        self.assert_verdicts(cycle=IMPOSSIBLE)

    def test_better_thermometers_settle_the_pump(self):
        self.workbook.set("stated_u_temperature", 0.05)
        self.assertEqual(self.workbook.verdicts()["pump"], CONSISTENT)


class TestNewFaults(SupplierCheckCase):
    def test_a_basis_withdrawn_is_reported(self):
        self.workbook.set("claim_boiler_basis", None)
        self.assert_verdicts(boiler=OPEN)
        self.assertIn("Heating value not stated", self.workbook.reason("boiler"))

    def test_an_unstated_basis_does_not_save_a_claim_that_fails_on_every_one(self):
        self.workbook.set("claim_unit_basis", None).set("claim_unit_boundary", None)
        self.assert_verdicts(unit=OPEN)
        self.workbook.set("stated_claim_unit", 0.45)
        self.assert_verdicts(unit=IMPOSSIBLE)

    def test_more_power_than_the_states_give(self):
        self.workbook.set("stated_gross_power", 156.0)
        self.assertEqual(self.workbook.verdicts()["gross"], IMPOSSIBLE)

    def test_a_modest_claim_is_not_called_impossible(self):
        self.workbook.set("stated_claim_boiler", 0.89)
        self.assert_verdicts(boiler=OPEN)
        self.assertIn("margin", self.workbook.reason("boiler"))

    def test_a_boiler_better_than_its_fuel(self):
        self.workbook.set("stated_claim_boiler", 1.08)
        self.assert_verdicts(boiler=IMPOSSIBLE)
        self.assertIn("past the limit", self.workbook.reason("boiler"))

    def test_a_heat_rate_below_carnot(self):
        self.workbook.set("stated_claim_heat_rate", 6000)
        self.assert_verdicts(heat_rate=IMPOSSIBLE)
        self.assertIn("Carnot", self.workbook.reason("heat_rate"))

    def test_a_condenser_colder_than_its_cooling_water(self):
        self.workbook.set("stated_cooling_outlet_temperature", 36.0)
        self.assert_verdicts(terminal=IMPOSSIBLE)

    def test_a_little_beyond_isentropic_is_within_the_uncertainty(self):
        # 244.5 °C is 0.2 K colder than isentropic; the readings are good to 1 K.
        self.workbook.set("stated_ip_exhaust_temperature", 244.5)
        self.assertGreater(self.workbook.value("efficiency_ip"), 1.0)
        self.assert_verdicts(ip=OPEN, lp=self.workbook.verdicts()["lp"])

    def test_a_gauge_pressure_is_not_taken_for_absolute(self):
        before = self.workbook.value("main_steam_pressure")
        self.workbook.set("stated_main_steam_reference", "gauge")
        self.assertAlmostEqual(self.workbook.value("main_steam_pressure") - before, 1.013, 9)

    def test_a_blank_reading_is_named(self):
        self.workbook.set("stated_main_steam_pressure", None)
        verdicts = self.workbook.verdicts()
        self.assertEqual(verdicts["hp"], OPEN)
        self.assertEqual(verdicts["ip"], IMPOSSIBLE)
        reason = self.workbook.reason("hp")
        self.assertIn("Cannot be recomputed", reason)
        self.assertIn("zero or blank", reason)

    def test_a_claim_withdrawn(self):
        self.workbook.set("stated_claim_net", None)
        self.assert_verdicts(net=OPEN)
        self.assertIn("claims nothing", self.workbook.reason("net"))


class TestUnits(SupplierCheckCase):
    FRACTIONS = (
        *(f"efficiency_{key}" for key in ("hp", "ip", "lp", "pump", "generator", "by_chain")),
        *(f"efficiency_{key}" for key in ("boiler_lhv", "gross_lhv", "gross_hhv", "net_lhv", "net_hhv")),
        "efficiency_turbine_gross",
        "carnot_limit",
        "carnot_peak",
        "curzon_ahlborn_value",
        "terminal_difference_kelvin",
    )

    def figures(self):
        return {name: self.workbook.value(name) for name in self.FRACTIONS}

    def test_the_unit_set_changes_no_physics(self):
        metric, verdicts = self.figures(), self.workbook.verdicts()
        for units in ("us", "si"):
            with self.subTest(units):
                self.workbook.set("unit_set", units)
                self.assertEqual(self.workbook.verdicts(), verdicts)
                for name, value in self.figures().items():
                    self.assertAlmostEqual(value, metric[name], delta=1e-9 * abs(metric[name]), msg=name)

    def test_headings_and_results_follow(self):
        metric = self.workbook.value("main_steam_pressure")
        self.workbook.set("unit_set", "us")
        # 1 psi = 6894.757 Pa: NIST SP 811 (2008), appendix B.8.
        self.assertAlmostEqual(self.workbook.value("main_steam_pressure"), metric * 1e5 / 6894.757, 2)
        self.assertEqual(self.document.text("Recomputation.I5"), "psia")
        self.assertIn("Btu/kWh", self.document.text("Verdicts.B22"))
        self.assertEqual(self.workbook.value("stated_main_steam_pressure"), 130.0)

    def test_stated_units_are_the_suppliers(self):
        """The same sheet typed in other units gives the same results."""
        before = self.figures()
        self.workbook.set("stated_unit_flow", "kg/s")
        figures = builder("supplier_check.figures")
        for *_, flow, key in figures.POINTS:
            self.workbook.set(f"stated_{key}_flow", flow / 3.6)
        for name, value in self.figures().items():
            self.assertAlmostEqual(value, before[name], delta=1e-9 * abs(before[name]), msg=name)


class TestUncertainty(SupplierCheckCase):
    def moved(self, name, step, key):
        """Half the change of a gap when the typed reading itself goes down and up."""
        before = self.workbook.value(name)
        gaps = []
        for sign in (1, -1):
            self.workbook.set(name, before + sign * step)
            gaps.append(self.workbook.value(f"gap_{key}"))
        self.workbook.set(name, before)
        return (gaps[0] - gaps[1]) / 2

    def share(self, label, key):
        """The cell of the uncertainty sheet for a reading and a claim."""
        sheet = self.document.sheet("Uncertainty")
        labels = [sheet.getCellByPosition(0, row).getString() for row in range(60)]
        return sheet.getCellByPosition(7 + list(PLANTED).index(key), labels.index(label)).getValue()

    def test_each_share_is_what_moving_the_reading_does(self):
        for name, step, key, label in (
            ("stated_ip_exhaust_temperature", 1.0, "ip", "S5 IP exhaust, crossover, temperature"),
            ("stated_main_steam_pressure", 0.325, "hp", "S1 Main steam, pressure"),
            ("stated_main_steam_flow", 428 * 0.006, "cycle", "S1 Main steam, flow"),
            ("stated_fuel_flow", 0.516, "heat_rate", "Fuel flow"),
            ("stated_lp_exhaust_dryness", 0.004, "rejected", "S8 LP exhaust, dryness"),
            ("stated_lp_exhaust_pressure", 0.002, "terminal", "S8 LP exhaust, pressure"),
            ("stated_lower_heating_value", 25.05 * 0.005, "boiler", "Lower heating value"),
        ):
            with self.subTest(label):
                share = self.share(label, key)
                self.assertNotEqual(share, 0.0)
                moved = self.moved(name, step, key)
                self.assertAlmostEqual(share, moved, delta=1e-6 * abs(moved))

    def test_shares_add_as_squares(self):
        sheet = self.document.sheet("Uncertainty")
        for index, key in enumerate(PLANTED):
            total = self.workbook.value(f"uncertainty_{key}")
            last = self.workbook.cell(f"uncertainty_{key}").CellAddress.Row
            shares = [sheet.getCellByPosition(7 + index, row).getValue() for row in range(4, last)]
            self.assertAlmostEqual(total, sum(s * s for s in shares) ** 0.5, delta=1e-12 * total)

    def test_an_unstated_uncertainty_is_marked_as_the_auditors(self):
        self.assertEqual(self.workbook.text("u_dryness_from"), "allowance")
        self.workbook.set("stated_u_dryness", 0.002)
        self.assertEqual(self.workbook.text("u_dryness_from"), "supplier")
        self.assertEqual(self.workbook.value("u_dryness"), 0.002)


class TestSecondOpinion(SupplierCheckCase):
    """An independent library on the same states: Debian's python3-iapws, IAPWS-IF97."""

    def test_stages_and_mean_temperature(self):
        from iapws import IAPWS97

        figures = builder("supplier_check.figures")
        states, flows = {}, {}
        for _, _, pressure, reference, temperature, dryness, flow, key in figures.POINTS:
            bar = pressure + (1.013 if reference == "gauge" else 0.0)
            fixed = {"x": dryness} if dryness is not None else {"T": temperature + 273.15}
            states[key] = IAPWS97(P=bar / 10, **fixed)
            flows[key] = flow / 3.6

        def stage(inlet, outlet):
            ideal = IAPWS97(P=states[outlet].P, s=states[inlet].s).h
            return (states[inlet].h - states[outlet].h) / (states[inlet].h - ideal)

        # The library finds states at (p, s) to about 1e-4 kJ/kg of the drops here, of 100s of kJ/kg.
        for key, inlet, outlet in (
            ("hp", "main_steam", "hp_exhaust"),
            ("ip", "hot_reheat", "ip_exhaust"),
            ("lp", "ip_exhaust", "lp_exhaust"),
        ):
            self.assertAlmostEqual(self.workbook.value(f"efficiency_{key}"), stage(inlet, outlet), 5)

        heat = entropy = 0.0
        for inlet, outlet in (("final_feed", "main_steam"), ("hp_exhaust", "hot_reheat")):
            heat += flows[outlet] * (states[outlet].h - states[inlet].h)
            entropy += flows[outlet] * (states[outlet].s - states[inlet].s)
        self.assertAlmostEqual(self.workbook.value("heat_added"), heat / 1000, 4)
        self.assertAlmostEqual(self.workbook.value("mean_heating"), heat / entropy - 273.15, 4)
        carnot = 1 - states["lp_exhaust"].T * entropy / heat
        self.assertAlmostEqual(self.workbook.value("carnot_limit"), carnot, 6)


class TestBuilder(SupplierCheckCase):
    def test_the_committed_file_is_what_the_builder_makes(self):
        builder("supplier_check").build(self.empty)
        self.document.recalculate()
        self.assertEqual(
            self.empty.model.Sheets.ElementNames, self.document.model.Sheets.ElementNames
        )
        self.assertEqual(names_of(self.empty), names_of(self.document))
        for sheet in self.document.model.Sheets.ElementNames:
            fresh, committed = (
                [line(cell) for _, _, cell in cells(document.sheet(sheet))]
                for document in (self.empty, self.document)
            )
            self.assertEqual(len(fresh), len(committed), sheet)
            for new, old in zip(fresh, committed):
                self.assertEqual(new[:3], old[:3])
                self.assertAlmostEqual(new[3], old[3], delta=1e-9 * abs(old[3]))

    def test_the_report_prints_every_claim(self):
        report = builder("report")
        self.document.recalculate()
        rows, faults = report.read_table(self.document)
        self.assertEqual(faults, [])
        self.assertEqual([row[-2] for row in rows[1:]], list(PLANTED.values()))
        text = "\n".join(report.aligned(rows, 120))
        self.assertLessEqual(max(len(part) for part in text.splitlines()), 120)
        self.assertEqual(
            report.summary(rows), "3 impossible, 3 not shown impossible, 7 consistent"
        )

    def test_the_report_fails_on_a_cell_in_error(self):
        report = builder("report")
        self.workbook.set("stated_main_steam_pressure", None)
        _, faults = report.read_table(self.document)
        self.assertTrue(any(fault.startswith("C1, Recomputed") for fault in faults), faults)

    def test_it_prints_one_page_wide_on_a4(self):
        report = builder("report")
        written = report.draw(self.document, self.folder, "check")
        self.assertGreaterEqual(len(written), 6)
        with open(written[1], "rb") as image:
            header = image.read(24)
        width, height = (int.from_bytes(header[at : at + 4], "big") for at in (16, 20))
        # ISO 216: A4 is 210 mm by 297 mm, here on its side.
        self.assertAlmostEqual(width / report.DOTS_PER_INCH * 25.4, 297, delta=1)
        self.assertAlmostEqual(height / report.DOTS_PER_INCH * 25.4, 210, delta=1)


def stored_texts(path, sheet):
    """Rows of the texts that an .ods file itself holds for a sheet."""
    with zipfile.ZipFile(path) as archive:
        root = ElementTree.fromstring(archive.read("content.xml"))
    tables = root.findall(".//table:table", NAMESPACES)
    name = "{%s}name" % NAMESPACES["table"]
    found = next(table for table in tables if table.get(name) == sheet)
    return [
        ["".join(text.itertext()) for text in row.findall("table:table-cell", NAMESPACES)]
        for row in found.iter("{%s}table-row" % NAMESPACES["table"])
    ]
