"""The sheet "Chain": from resistances and test losses to the busbar, step by step."""

from generator_losses import figures
from writer import Page

NAME = "Chain"
LOSSES = ("Friction and windage", "Core", "Stator copper", "Stray load", "Field copper", "Excitation")


class Chain:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)
        self.row = 2

    def build(self):
        page = self.page
        page.widths({"A": 6.6, **{column: 2.35 for column in "BCDEFGHIJKL"}, "C": 3.3})
        page.put("A1", "Chain", "title")
        page.height(1, 0.95)
        page.put("A2", '=site_name&"; "&test_name', "subtitle")
        self._rated()
        self._run()
        self._house()
        self._transformer()
        self._busbar()
        page.freeze(1, 2)

    def _block(self, text):
        self.row += 1
        self.page.put(f"A{self.row}", text, "block", merge=f"L{self.row}")

    def _line(self, label, formula, fmt, unit, how, name, key=False):
        self.row += 1
        page, row = self.page, self.row
        page.put(f"A{row}", label, "label")
        page.put(f"B{row}", formula, "key" if key else "result", fmt, name=name)
        page.put(f"C{row}", unit, "result centred")
        page.put(f"D{row}", how, "result text", merge=f"L{row}")

    def _rated(self):
        self._block("Losses at rated load, windings at the reference temperature")
        line = self._line
        line("Poles", "=POLE_COUNT(stated_rated_frequency;stated_rated_speed)", "general", figures.NONE,
             "from frequency and rated speed", "poles")
        line("Rated current", "=RATED_CURRENT(stated_rated_apparent_power;stated_rated_voltage)", "flow", "A",
             "from rated apparent power and voltage", "rated_current")
        line("Reference temperature", "=WINDING_REFERENCE_TEMPERATURE(stated_thermal_class)", "temperature", "°C",
             "IEC 60034-2-1 by thermal class", "reference_temperature")
        first = self.row + 1
        for label, formula, how, name in (
            ("Friction and windage", "=stated_friction_and_windage", "as tested", "loss_friction"),
            ("Core", "=stated_core_loss", "as tested", "loss_core"),
            ("Stator copper",
             "=STATOR_COPPER_LOSS(rated_current;stated_stator_resistance;stated_cold_temperature;reference_temperature)",
             "1.5 I² R between lines, corrected with 235 + t", "loss_stator"),
            ("Stray load", "=stated_stray_load_loss", "as tested", "loss_stray"),
            ("Field copper",
             "=FIELD_COPPER_LOSS(stated_rated_field_current;stated_field_resistance;stated_cold_temperature;reference_temperature)",
             "I² R, corrected with 235 + t", "loss_field"),
            ("Excitation", "=stated_excitation_loss", "exciter and rectifier, as tested", "loss_excitation"),
        ):
            line(label, formula, "power", "kW", how, name)
        self.page.name_range("rated_losses", self.page.reference(f"B{first}:B{self.row}"))
        line("All losses at rated load", "=SUM(rated_losses)", "power", "kW", "sum", "rated_total", True)
        line("Efficiency at rated load",
             "=GENERATOR_EFFICIENCY_FROM_LOSSES(stated_rated_apparent_power*stated_rated_power_factor;rated_losses)",
             "percent2", figures.NONE, "summation of losses, IEC 60034-2-1", "rated_efficiency", True)
        line("Least within the tolerance",
             "=TOLERATED_EFFICIENCY(stated_guaranteed_efficiency;stated_rated_apparent_power*stated_rated_power_factor)",
             "percent2", figures.NONE, "IEC 60034-1: less 10 % of (1 - guaranteed), where the contract grants it",
             "tolerated")
        line("Field current, no load over rated", "=stated_no_load_field_current/stated_rated_field_current",
             "dryness", figures.NONE, "fits the phasor diagram of the field current", "field_ratio")
        line("Best load",
             "=GENERATOR_BEST_LOAD(stated_rated_apparent_power;stated_rated_power_factor;rated_losses;field_ratio)",
             "percent", figures.NONE, "of rated apparent power, at any power factor", "best_load")

    def _run(self):
        self.row += 1
        self._block("The run")
        line = self._line
        line("Apparent power", "=THREE_PHASE_APPARENT_POWER(stated_line_voltage;stated_line_current)", "power2", "MVA",
             "from voltage and current", "run_apparent")
        line("Power factor",
             "=THREE_PHASE_POWER_FACTOR(stated_gross_power;stated_line_voltage;stated_line_current)", "dryness",
             figures.NONE, "from power, voltage and current; lagging", "run_factor")
        line("Load", "=run_apparent/stated_rated_apparent_power", "percent", figures.NONE,
             "of rated apparent power", "run_load")
        page = self.page
        self.row += 1
        row = self.row
        page.height(row, 1.35)
        formats = ("dryness", "dryness", "power2", *("power",) * 7, "power2", "percent2")
        for column, fmt in zip("ABCDEFGHIJKL", formats):
            page.put(f"{column}{row}", None, "heading")
            page.put(f"{column}{row + 1}", None, "result", fmt)
        page.put_array(
            f"A{row}:L{row + 1}",
            "=GENERATOR_LOSS_TABLE(stated_rated_apparent_power;stated_rated_power_factor;rated_losses;"
            'field_ratio;run_load;run_factor;"lagging")',
        )
        self.row = row + 1
        page.name_range("run_losses", page.reference(f"D{self.row}:I{self.row}"))
        page.name_range("run_total", page.reference(f"J{self.row}"))
        line("Power at the coupling", "=stated_gross_power+run_total/1000", "power2", "MW",
             "gross power and all losses at this load", "coupling_power", True)
        line("Efficiency at this load", "=GENERATOR_EFFICIENCY_FROM_LOSSES(stated_gross_power;run_losses)",
             "percent2", figures.NONE, "summation of losses", "run_efficiency", True)

    def _house(self):
        page = self.page
        self.row += 1
        self._block("House load")
        self.row += 1
        for column, text in zip("ABCD", ("Driven machine", "Shaft, kW", "Efficiency", "Input, kW")):
            page.put(f"{column}{self.row}", text, "heading left" if column == "A" else "heading")
        page.put(f"E{self.row}", "Efficiency from", "heading left", merge=f"L{self.row}")
        first = self.row + 1
        for index, (name, *_) in enumerate(figures.AUXILIARIES, 1):
            self.row += 1
            row = self.row
            stated = f"INDEX(motor_efficiencies;{index})"
            page.put(f"A{row}", name, "label")
            page.put(f"B{row}", f"=INDEX(motor_shaft_powers;{index})", "result", "power")
            page.put(
                f"C{row}",
                f"=IF(ISNUMBER({stated});{stated};MOTOR_IE_EFFICIENCY({stated};INDEX(motor_ratings;{index});4;50))",
                "result",
                "percent",
            )
            page.put(f"D{row}", f"=B{row}/C{row}", "result", "power")
            page.put(
                f"E{row}",
                f'=IF(ISNUMBER({stated});"stated on the motor schedule";"least of class "&{stated}&", IEC 60034-30-1")',
                "result text",
                merge=f"L{row}",
            )
        self._line("Motors", f"=HOUSE_LOAD(B{first}:B{self.row};C{first}:C{self.row})", "power2", "MW",
                   "shaft powers over efficiencies", "motor_power")
        self._line("House load", "=motor_power+stated_auxiliary_transformer/1000", "power2", "MW",
                   "with the unit auxiliary transformer; taken at the generator terminals", "house_load", True)
        self._line("Share of gross power", "=house_load/stated_gross_power", "percent2", figures.NONE, "house load over gross power",
                   "house_share")

    def _transformer(self):
        self.row += 1
        self.page.break_before(self.row + 1)
        self._block("Step-up transformer")
        line = self._line
        line("Load loss, stated",
             "=TRANSFORMER_LOAD_LOSS_AT_TEMPERATURE(stated_step_up_load;stated_step_up_resistance;"
             'stated_step_up_measured_at;stated_step_up_stated_at;"copper")',
             "power", "kW", "I²R part with the resistance, the rest against it", "step_up_load_loss")
        line("Active power into it", "=stated_gross_power-house_load", "power2", "MW", "gross less house load",
             "step_up_power")
        line("Reactive power into it",
             "=REACTIVE_POWER(stated_gross_power;run_factor)-REACTIVE_POWER(house_load;stated_house_power_factor)",
             "power2", "Mvar", "generator less house load", "step_up_reactive")
        line("Load", "=SQRT(step_up_power^2+step_up_reactive^2)/stated_step_up_rating", "percent", figures.NONE,
             "of rated apparent power, at rated voltage", "step_up_share")
        first = self.row + 1
        line("No-load loss", "=stated_step_up_no_load", "power", "kW", "as tested, with cooling", "step_up_p0")
        line("Load loss at this load",
             "=TRANSFORMER_LOSS(stated_step_up_no_load;step_up_load_loss;step_up_share)-stated_step_up_no_load",
             "power", "kW", "with the square of the load", "step_up_pk")
        self.page.name_range("step_up_losses", self.page.reference(f"B{first}:B{self.row}"))

    def _busbar(self):
        page = self.page
        self.row += 1
        self._block("From shaft to busbar, by SHAFT_TO_BUSBAR")
        row = self.row + 1
        page.height(row, 0.95)
        for column, (style, fmt) in zip(
            "ABCDEF",
            (("label", None), ("key", "power2"), ("label", None), ("result", "power"),
             ("result", "percent2"), ("result", "percent2")),
        ):
            page.put(f"{column}{row}", None, "heading left" if column in "AC" else "heading")
            for below in range(row + 1, row + 5):
                page.put(f"{column}{below}", None, style, fmt)
        page.put_array(
            f"A{row}:F{row + 4}",
            "=SHAFT_TO_BUSBAR(coupling_power;run_losses;house_load;step_up_losses)",
        )
        page.name_range("busbar_table", page.reference(f"A{row}:F{row + 4}"))
        page.name_range("busbar_power", page.reference(f"B{row + 4}"))
        self.row = row + 4
