"""The sample workbook generator-losses.ods: its key figures by hand, and what it draws."""

import math
import zipfile

from harness.workbook import WorkbookCase, builder, cells, sample

WORKBOOK = sample("generator-losses.ods")
SHEETS = ("Losses", "Chain", "Curve", "Inputs", "Evidence")


class GeneratorLossesCase(WorkbookCase):
    FILE = "generator-losses.ods"

    def assert_value(self, name, expected, digits=9):
        value = self.workbook.value(name)
        self.assertAlmostEqual(value, expected, delta=abs(expected) * 10**-digits, msg=name)


class TestAsCommitted(GeneratorLossesCase):
    def test_no_cell_is_in_error(self):
        self.document.recalculate()
        wrong = [
            (sheet, row + 1, column, cell.getString())
            for sheet in SHEETS
            for row, column, cell in cells(self.document.sheet(sheet))
            if cell.getError()
        ]
        self.assertEqual(wrong, [])

    def test_no_macro_and_no_link(self):
        with zipfile.ZipFile(WORKBOOK) as archive:
            self.assertFalse([n for n in archive.namelist() if n.startswith(("Basic", "Scripts"))])
            content = archive.read("content.xml").decode("utf-8")
        self.assertNotIn('xlink:href="file:', content)

    def test_every_input_has_document_page_and_revision(self):
        sheet = self.document.sheet("Inputs")
        for row, column, cell in cells(sheet):
            if column == 1 and cell.CellStyle == "Busbar input":
                for place in (4, 5, 6):
                    self.assertTrue(sheet.getCellByPosition(place, row).getString(), (row + 1, place))


class TestByHand(GeneratorLossesCase):
    """The figures of the inputs worked out anew, without the extension."""

    def test_losses_and_efficiency_at_rated_load(self):
        self.document.recalculate()
        current = 190e6 / (math.sqrt(3) * 15750)
        correction = (235 + 95) / (235 + 21)  # IEC 60034-1
        stator = 1.5 * current**2 * 0.00447 * correction / 1e3
        field = 1610**2 * 0.142 * correction / 1e3
        total = 478 + 345 + stator + 260 + field + 48
        self.assert_value("loss_stator", stator)
        self.assert_value("loss_field", field)
        self.assert_value("rated_efficiency", 152e3 / (152e3 + total))
        self.assert_value("tolerated", 0.986 - 0.1 * 0.014)
        self.assertEqual(self.workbook.text("verdict"), "met")

    def test_the_run_from_readings_to_the_busbar(self):
        self.document.recalculate()
        apparent = math.sqrt(3) * 15.75 * 6.715
        factor, load = 150.2 / apparent, apparent / 190
        self.assert_value("run_factor", factor)
        # Field current: |1 + j x exp(-j phi)| with the x that fits no load and rated load.
        ratio = 620 / 1610
        reactance = -0.6 + math.sqrt(0.36 + 1 / ratio**2 - 1)
        field = (ratio * abs(1 + 1j * reactance * load * complex(factor, -math.sqrt(1 - factor**2)))) ** 2
        stator, field_copper = self.workbook.value("loss_stator"), self.workbook.value("loss_field")
        total = 478 + 345 + (stator + 260) * load**2 + (field_copper + 48) * field
        self.assert_value("run_total", total)
        house = 0.074 + sum(
            shaft / efficiency / 1e3
            for shaft, efficiency in (
                (3640, 0.966), (410, 0.955), (2180, 0.958), (940, 0.957), (1420, 0.960), (610, 0.956),
                # IEC 60034-30-1: IE3 of 315 and 90 kW, IE2 of 55 kW, 4 poles, 50 Hz
                (660, 0.960), (150, 0.952), (220, 0.935),
            )
        )
        self.assert_value("house_load", house)
        warmer = (235 + 75) / (235 + 24)
        load_loss = 372 * warmer + (430 - 372) / warmer  # IEC 60076-1, annex E
        reactive = math.sqrt(apparent**2 - 150.2**2) - house * math.sqrt(1 / 0.85**2 - 1)
        share = math.hypot(150.2 - house, reactive) / 200
        net = 150.2 - house - (88 + load_loss * share**2) / 1e3
        self.assert_value("busbar_power", net)
        self.assert_value("coupling_power", 150.2 + total / 1e3)

    def test_the_table_closes(self):
        rows = self.document.table("Curve.A5:L61")
        for row in rows:
            self.assertAlmostEqual(sum(row[3:9]), row[9], 6)
            self.assertAlmostEqual(row[2] + row[9] / 1000, row[10], 9)
            self.assertAlmostEqual(row[2] / row[10], row[11], 12)


class TestChanges(GeneratorLossesCase):
    def test_a_missed_guarantee_is_said(self):
        self.workbook.set("stated_guaranteed_efficiency", 0.9875)
        self.assertEqual(self.workbook.text("verdict"), "within tolerance")
        self.workbook.set("stated_guaranteed_efficiency", 0.99)
        self.assertEqual(self.workbook.text("verdict"), "missed")

    def test_a_percentage_or_a_blank_breaks_the_figures(self):
        self.workbook.set("stated_guaranteed_efficiency", 98.6)
        self.assertNotEqual(self.workbook.cell("tolerated").getError(), 0)
        self.workbook.set("stated_stator_resistance", None)
        self.assertNotEqual(self.workbook.cell("busbar_power").getError(), 0)

    def test_the_curve_peaks_at_the_best_load(self):
        best = self.workbook.value("best_load")
        rows = self.document.table("Curve.A5:L61")
        for factor in (0.8, 0.9, 1.0):
            part = [row for row in rows if row[0] == factor]
            peak = max(part, key=lambda row: row[11])
            self.assertLessEqual(abs(peak[1] - best), 0.05)


class TestBuilder(GeneratorLossesCase):
    def test_the_committed_file_is_what_the_builder_makes(self):
        self.assert_built("generator_losses", SHEETS)

    def test_it_prints_one_page_wide_on_a4(self):
        report = builder("report")
        written = report.draw(self.document, self.folder, "losses")
        self.assertEqual(len(written) - 1, 8)  # pages
