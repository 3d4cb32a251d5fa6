"""The sample workbook steam-process.ods: its figures by another road, and what its charts draw."""

import zipfile

from harness.workbook import WorkbookCase, builder, cells, sample

WORKBOOK = sample("steam-process.ods")
PRINTED = ("Process", "Cycle", "Balance", "Inputs", "Evidence")


class SteamProcessCase(WorkbookCase):
    FILE = "steam-process.ods"

    def column(self, address):
        """Numbers of a range as a chart names it; None at an empty cell, where the pen is lifted."""
        rows = self.document.table(address.replace("$", ""))
        return [row[0] if isinstance(row[0], float) else None for row in rows]

    def series(self, sheet, chart):
        """{name or x range: (x, y)} of the lines of a chart."""
        model = self.document.sheet(sheet).Charts.getByName(chart).EmbeddedObject
        kind = model.getFirstDiagram().CoordinateSystems[0].ChartTypes[0]
        found = {}
        for entry in kind.getDataSeries():
            x, y = (part.Values.SourceRangeRepresentation for part in entry.getDataSequences())
            if ":" in x:
                found[x] = (self.column(x), self.column(y))
        return found


class TestAsCommitted(SteamProcessCase):
    def test_no_cell_is_in_error(self):
        self.document.recalculate()
        wrong = [
            (sheet, row + 1, column, cell.getString())
            for sheet in PRINTED
            for row, column, cell in cells(self.document.sheet(sheet))
            if cell.getError()
        ]
        area = self.document.sheet("Lines")
        wrong += [
            ("Lines", row, column)
            for row, values in enumerate(area.getCellRangeByName("A1:AZ700").getDataArray())
            for column, value in enumerate(values)
            if value is None
        ]
        self.assertEqual(wrong, [])

    def test_the_file_holds_what_it_recalculates_to(self):
        stored = {name: self.workbook.text(name) for name in ("efficiency_hp", "exhaust_moisture")}
        self.document.recalculate()
        for name, text in stored.items():
            self.assertEqual(self.workbook.text(name), text)

    def test_no_macro_and_no_link(self):
        with zipfile.ZipFile(WORKBOOK) as archive:
            self.assertFalse([n for n in archive.namelist() if n.startswith(("Basic", "Scripts"))])
            content = archive.read("content.xml").decode("utf-8")
        self.assertNotIn('xlink:href="file:', content)

    def test_headings_stay_in_sight(self):
        with zipfile.ZipFile(WORKBOOK) as archive:
            settings = archive.read("settings.xml").decode("utf-8")
        frozen = settings.count('config:name="VerticalSplitMode" config:type="short">2<')
        self.assertEqual(frozen, len(PRINTED) + 1)

    def test_every_input_has_unit_document_page_and_revision(self):
        sheet = self.document.sheet("Inputs")
        inputs = 0
        for row, column, cell in cells(sheet):
            if column != 3 or cell.CellStyle != "Busbar input":
                continue
            inputs += 1
            for place in (4, 6, 7, 8):
                self.assertTrue(sheet.getCellByPosition(place, row).getString(), (row + 1, place))
        figures = builder("steam_process.figures")
        self.assertEqual(inputs, len(figures.READINGS) + len(figures.PLANT))

    def test_the_engine_is_named(self):
        self.assertRegex(self.workbook.text("engine_version"), r"^Busbar \d+\.\d+\.\d+; IAPWS-IF97$")


class TestSecondOpinion(SteamProcessCase):
    """An independent library on the same readings: Debian's python3-iapws, IAPWS-IF97."""

    def test_stages_and_exhaust(self):
        from iapws import IAPWS97

        figures = builder("steam_process.figures")
        to_bar = {"bar": 1.0, "mbar": 0.001}
        read, flows = {}, {}
        for key, what, value, unit, reference, *_ in figures.READINGS:
            if what == "pressure":
                value = value * to_bar[unit] + (1.013 if reference == "gauge" else 0.0)
            read[key, what] = value
            if what == "flow":
                flows[key] = value / 3.6
        h, s = {}, {}
        for _, _, key in figures.POINTS:
            pressure = read[key, "pressure"] / 10
            if (key, "temperature") in read:
                state = IAPWS97(P=pressure, T=read[key, "temperature"] + 273.15)
            elif (key, "dryness") in read:
                state = IAPWS97(P=pressure, x=read[key, "dryness"])
            else:
                continue
            h[key], s[key] = state.h, state.s
        plant = {key: value for key, _, value, *_ in figures.PLANT}
        fluid = (plant["gross_power"] + plant["generator_losses"] / 1000) / plant["mechanical_efficiency"]
        self.assertAlmostEqual(self.workbook.value("fluid_power"), fluid, 9)

        # The same balance over the casing: what goes in less what comes out.
        main, reheat = flows["main_steam"], flows["hot_reheat"]
        bled = flows["ip_extraction"]
        low = flows["lp_extraction_upper"] + flows["lp_extraction_lower"] + flows["lp_exhaust"]
        crossover = reheat - bled - low  # leaves for the deaerator
        out = (
            bled * h["ip_extraction"]
            + crossover * h["ip_exhaust"]
            + flows["lp_extraction_upper"] * h["lp_extraction_upper"]
            + flows["lp_extraction_lower"] * h["lp_extraction_lower"]
        )
        drop = main * (h["main_steam"] - h["hp_exhaust"]) + reheat * h["hot_reheat"] - out
        h["lp_exhaust"] = (drop - fluid * 1000) / flows["lp_exhaust"]
        self.assertAlmostEqual(self.workbook.value("exhaust_enthalpy"), h["lp_exhaust"], 3)
        pressure = read["lp_exhaust", "pressure"] / 10
        water, steam = IAPWS97(P=pressure, x=0), IAPWS97(P=pressure, x=1)
        dryness = (h["lp_exhaust"] - water.h) / (steam.h - water.h)
        self.assertAlmostEqual(self.workbook.value("exhaust_moisture"), 1 - dryness, 6)

        for _, key, inlet, outlet in figures.STAGES:
            ideal = IAPWS97(P=read[outlet, "pressure"] / 10, s=s[inlet]).h
            efficiency = (h[inlet] - h[outlet]) / (h[inlet] - ideal)
            self.assertAlmostEqual(self.workbook.value(f"efficiency_{key}"), efficiency, 5)

    def test_the_figures_are_those_of_the_trade(self):
        """Ranges met in the trade (common practice, no source)."""
        for key, low, high in (("hp", 0.85, 0.92), ("ip", 0.90, 0.94), ("lp", 0.86, 0.91)):
            self.assertTrue(low < self.workbook.value(f"efficiency_{key}") < high, key)
        self.assertTrue(0.06 < self.workbook.value("exhaust_moisture") < 0.12)


class TestChanges(SteamProcessCase):
    def test_a_warmer_crossover_moves_drop_from_ip_to_lp(self):
        before = {key: self.workbook.value(f"efficiency_{key}") for key in ("hp", "ip", "lp")}
        self.workbook.set("stated_ip_exhaust_temperature", 272.7)
        self.assertEqual(self.workbook.value("efficiency_hp"), before["hp"])
        self.assertLess(self.workbook.value("efficiency_ip"), before["ip"])
        self.assertGreater(self.workbook.value("efficiency_lp"), before["lp"])

    def test_the_moisture_follows_the_power_as_it_says(self):
        before = self.workbook.value("exhaust_moisture")
        slope = self.workbook.value("moisture_per_percent")
        power = self.workbook.value("stated_gross_power")
        losses = self.workbook.value("stated_generator_losses") / 1000
        self.workbook.set("stated_gross_power", 1.01 * (power + losses) - losses)
        self.assertAlmostEqual(self.workbook.value("exhaust_moisture") - before, slope, 9)

    def test_a_gauge_reading_is_not_taken_for_absolute(self):
        before = self.workbook.value("main_steam_pressure")
        self.workbook.set("stated_main_steam_pressure_reference", "absolute")
        self.assertAlmostEqual(before - self.workbook.value("main_steam_pressure"), 1.013, 9)

    def test_a_blank_reading_is_an_error_and_not_a_figure(self):
        self.workbook.set("stated_hot_reheat_pressure", None).set(
            "stated_hot_reheat_pressure_reference", "absolute"
        )
        self.assertNotEqual(self.workbook.cell("efficiency_ip").getError(), 0)
        self.assertEqual(self.workbook.cell("efficiency_hp").getError(), 0)


class TestDiagrams(SteamProcessCase):
    def lines_of(self, values):
        """The parts between the empty rows."""
        parts = [[]]
        for value in values:
            if value is None:
                parts.append([])
            else:
                parts[-1].append(value)
        return parts

    def test_one_series_draws_each_family(self):
        points = builder("steam_process.points")
        drawn = self.series("Process", "mollier")
        sizes = [[len(part) for part in self.lines_of(x)] for x, _ in drawn.values()]
        self.assertIn([40] * len(points.ISOBARS), sizes)
        self.assertIn([30] * len(points.ISOTHERMS), sizes)
        self.assertIn([40] * len(points.DRYNESSES), sizes)
        self.assertIn([120], sizes)

    def test_the_process_passes_through_its_states(self):
        states = [
            (self.workbook.value(f"{key}_entropy"), self.workbook.value(f"{key}_enthalpy"))
            for _, _, key in builder("steam_process.figures").POINTS[:8]
        ]
        drawn = {
            (round(x, 9), round(y, 6))
            for xs, ys in self.series("Process", "mollier").values()
            for x, y in zip(xs, ys)
            if x is not None and len(xs) < 70 and len(xs) != len(states)
        }
        for entropy, enthalpy in states:
            self.assertIn((round(entropy, 9), round(enthalpy, 6)), drawn)

    def test_the_states_lie_in_the_windows(self):
        points = builder("steam_process.points")
        for _, _, key in builder("steam_process.figures").POINTS[:8]:
            entropy, enthalpy = (self.workbook.value(f"{key}_{what}") for what in ("entropy", "enthalpy"))
            self.assertTrue(points.ENTROPY[0] < entropy < points.ENTROPY[1], key)
            self.assertTrue(points.ENTHALPY[0] < enthalpy < points.ENTHALPY[1], key)

    def test_the_domes_have_the_critical_point(self):
        # R7-97(2012), equations 2; SR4-04(2014), section 4.3: 373.946 °C, 2087.546845 kJ/kg.
        for sheet, chart, critical in (
            ("Process", "mollier", 2087.546845),
            ("Cycle", "temperature_entropy", 373.946),
        ):
            ys = [y for xs, ys in self.series(sheet, chart).values() if len(xs) == 120 for y in ys]
            self.assertLess(min(abs(y - critical) for y in ys), 1e-6, chart)

    def test_lines_follow_their_constants(self):
        first = self.series("Process", "mollier")
        self.document.set("Lines.A7", 150)
        self.assertNotEqual(first, self.series("Process", "mollier"))


class TestBuilder(SteamProcessCase):
    def test_the_committed_file_is_what_the_builder_makes(self):
        self.assert_built("steam_process", PRINTED)

    def test_it_prints_one_page_wide_on_a4(self):
        report = builder("report")
        written = report.draw(self.document, self.folder, "process")
        self.assertEqual(len(written), 1 + len(PRINTED))  # the PDF, and a page a sheet
        with open(written[1], "rb") as image:
            header = image.read(24)
        width, height = (int.from_bytes(header[at : at + 4], "big") for at in (16, 20))
        # ISO 216: A4 is 210 mm by 297 mm, here on its side.
        self.assertAlmostEqual(width / report.DOTS_PER_INCH * 25.4, 297, delta=1)
        self.assertAlmostEqual(height / report.DOTS_PER_INCH * 25.4, 210, delta=1)
