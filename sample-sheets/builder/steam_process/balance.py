"""The sheet "Balance": states, the exhaust by energy balance, stages."""

from steam_process import figures
from styles import style_by_content
from writer import Page

NAME = "Balance"
COLUMNS = 10
FIRST_POINT = 5
BROKEN = "broken"


class Balance:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)
        self.row = 0

    def build(self):
        page = self.page
        page.widths(
            {
                "A": 1.2,
                "B": 6.2,
                "C": 2.5,
                "D": 2.7,
                "E": 2.3,
                "F": 2.3,
                "G": 8.8,
                "H": 2.5,
                "I": 2.7,
                "J": 2.4,
            }
        )
        page.put("A1", "Balance", "title")
        page.height(1, 0.95)
        page.put("A2", '=site_name&"; "&test_name', "subtitle")
        self._points()
        self._energy()
        self._stages()
        page.freeze(2, 4)

    def _headings(self, row, headings):
        for columns, text in headings.items():
            first, _, last = columns.partition(":")
            left = first in ("A", "B", "G")
            self.page.put(
                f"{first}{row}",
                text,
                "heading left" if left else "heading",
                merge=f"{last}{row}" if last else None,
            )

    # --- States

    def _points(self):
        page = self.page
        page.put("A3", "States, in absolute pressure", "block", merge="J3")
        self._headings(
            4,
            {
                "A": "",
                "B": "State",
                "C": "Pressure, bar",
                "D": "Temperature, °C",
                "E": "Dryness",
                "F": "Flow, kg/s",
                "G": "Stream",
                "H": "Enthalpy, kJ/kg",
                "I": "Entropy, kJ/(kg K)",
                "J": "Superheat, K",
            },
        )
        page.height(4, 0.95)
        given = {(point, what) for point, what, *_ in figures.READINGS}
        for offset, (tag, name, key) in enumerate(figures.POINTS):
            row = FIRST_POINT + offset
            page.put(f"A{row}", tag, "label")
            page.put(f"B{row}", name, "label")
            page.put(f"C{row}", self._pressure(key), "result", "pressure", name=f"{key}_pressure")
            stated = f"stated_{key}_"
            page.put(f"D{row}", f"=TEMPERATURE_OF(G{row})", "result", "temperature")
            page.put(f"E{row}", f'=IFERROR(DRYNESS_OF(G{row});"{figures.NONE}")', "result", "dryness")
            flow = "main_steam_flow" if key in ("hp_exhaust", "final_feed") else None
            if key == "ip_exhaust":
                flow = figures.SECTIONS[3][3]
            page.put(
                f"F{row}",
                f"={flow}" if flow else f'=CONVERT_UNIT({stated}flow;{stated}flow_unit;"kg/s")',
                "result",
                "flow",
                name=f"{key}_flow",
            )
            if (key, "temperature") in given:
                state = (
                    f"STEAM({key}_pressure;CONVERT_UNIT({stated}temperature;{stated}temperature_unit;"
                    f'"°C");{key}_flow)'
                )
            elif (key, "dryness") in given:
                state = f"STEAM_AT_DRYNESS({key}_pressure;{stated}dryness;{key}_flow)"
            else:
                state = f"STEAM_AT_ENTHALPY({key}_pressure;exhaust_enthalpy;{key}_flow)"
            page.put(f"G{row}", f"=TAGGED({state};A{row})", "stream", name=key)
            page.put(f"H{row}", f"=ENTHALPY_OF(G{row})", "result", "enthalpy", name=f"{key}_enthalpy")
            page.put(f"I{row}", f"=ENTROPY_OF(G{row})", "result", "entropy", name=f"{key}_entropy")
            page.put(
                f"J{row}", f'=IFERROR(SUPERHEAT_OF(G{row});"{figures.NONE}")', "result", "temperature"
            )
        self.row = FIRST_POINT + len(figures.POINTS) - 1

    @staticmethod
    def _pressure(key):
        stated = f"stated_{key}_pressure"
        converted = f'CONVERT_UNIT({stated};{stated}_unit;"bar")'
        ambient = 'CONVERT_UNIT(stated_ambient_pressure;stated_ambient_pressure_unit;"bar")'
        return (
            f'=IF({stated}_reference="absolute";{converted};'
            f'IF({stated}_reference="gauge";ABSOLUTE_PRESSURE({converted};{ambient});NA()))'
        )

    # --- Energy balance of the turbine

    def _energy(self):
        page = self.page
        row = self.row + 2
        page.put(f"A{row}", "Exhaust by the energy balance of the turbine", "block", merge=f"J{row}")
        row += 1
        self._headings(
            row,
            {
                "A": "",
                "B": "Section",
                "C": "From",
                "D": "To",
                "E": "",
                "F": "Flow, kg/s",
                "G": "How",
                "H": "Drop, kJ/kg",
                "I": "Power, MW",
                "J": "",
            },
        )
        first = row + 1
        tags = {key: tag for tag, _, key in figures.POINTS}
        for name, inlet, outlet, flow in figures.SECTIONS:
            row += 1
            self._section(row, name, tags[inlet], tags[outlet], flow)
            page.put(f"G{row}", "enthalpies of both states", "result text")
            page.put(f"H{row}", f"={inlet}_enthalpy-{outlet}_enthalpy", "result", "enthalpy")
            page.put(f"I{row}", f"=F{row}*H{row}/1000", "result", "power2")
        known = f"SUM(I{first}:I{row})"
        row += 1
        name, inlet, outlet, flow = figures.LAST_SECTION
        self._section(row, name, tags[inlet], tags[outlet], flow)
        page.put(f"G{row}", "what is left of the power of the fluid", "result text")
        page.put(f"H{row}", f"=I{row}/F{row}*1000", "result", "enthalpy", name="last_drop")
        page.put(f"I{row}", f"=fluid_power-{known}", "result", "power2")
        for label, formula, how, fmt, unit, key in (
            (
                "Power at the coupling",
                '=CONVERT_UNIT(stated_gross_power;stated_gross_power_unit;"MW")'
                '+CONVERT_UNIT(stated_generator_losses;stated_generator_losses_unit;"MW")',
                "generator terminals and generator losses",
                "power2",
                "MW",
                "coupling_power",
            ),
            (
                "Power of the fluid",
                "=coupling_power/stated_mechanical_efficiency",
                "over the mechanical efficiency",
                "power2",
                "MW",
                "fluid_power",
            ),
            (
                "Enthalpy of the exhaust",
                "=lp_extraction_lower_enthalpy-last_drop",
                "S7 less the drop of the last section",
                "enthalpy",
                "kJ/kg",
                "exhaust_enthalpy",
            ),
            (
                "Moisture of the exhaust",
                "=1-DRYNESS_OF(lp_exhaust)",
                "one less the dryness of S8",
                "percent",
                "of mass",
                "exhaust_moisture",
            ),
            (
                "Moisture for 1 % more power",
                "=1-DRYNESS_OF(STEAM_AT_ENTHALPY(lp_exhaust_pressure;"
                "exhaust_enthalpy-0.01*fluid_power*1000/lp_exhaust_flow))-exhaust_moisture",
                "how much hangs on the reading of the power",
                "percent",
                "points",
                "moisture_per_percent",
            ),
        ):
            row += 1
            page.put(f"A{row}", "", "label")
            page.put(f"B{row}", label, "label", merge=f"F{row}")
            page.put(f"G{row}", how, "result text")
            page.put(f"H{row}", formula, "key" if "exhaust" in key else "result", fmt, name=key)
            page.put(f"I{row}", unit, "result centred", merge=f"J{row}")
        self.row = row

    def _section(self, row, name, inlet, outlet, flow):
        page = self.page
        page.put(f"A{row}", "", "label")
        page.put(f"B{row}", name, "label")
        page.put(f"C{row}", inlet, "result centred")
        page.put(f"D{row}", outlet, "result centred")
        page.put(f"E{row}", "", "label")
        page.put(f"F{row}", f"={flow}", "result", "flow")
        page.put(f"J{row}", "", "label")

    # --- Stages

    def _stages(self):
        page = self.page
        row = self.row + 2
        page.put(f"A{row}", "Stages, against the isentropic expansion", "block", merge=f"J{row}")
        row += 1
        self._headings(
            row,
            {
                "A": "",
                "B": "Stage",
                "C": "Drop, kJ/kg",
                "D": "Isentropic drop, kJ/kg",
                "E": "Efficiency",
                "F": "Second law",
                "G": "Isentropic end",
                "H": "Enthalpy, kJ/kg",
                "I": "Entropy rise, kJ/(kg K)",
                "J": "Dryness",
            },
        )
        page.height(row, 0.95)
        first = row + 1
        for name, key, inlet, outlet in figures.STAGES:
            row += 1
            page.put(f"A{row}", "", "label")
            page.put(f"B{row}", name, "label")
            page.put(
                f"C{row}", f"={inlet}_enthalpy-{outlet}_enthalpy", "result", "enthalpy", name=f"drop_{key}"
            )
            page.put(
                f"D{row}",
                f"={inlet}_enthalpy-H{row}",
                "result",
                "enthalpy",
                name=f"isentropic_drop_{key}",
            )
            page.put(
                f"E{row}",
                f"=TURBINE_EFFICIENCY({inlet};{outlet})",
                "key",
                "percent",
                name=f"efficiency_{key}",
            )
            page.put(f"F{row}", f'=IF(I{row}<0;"{BROKEN}";"holds")', "result centred")
            page.put(
                f"G{row}",
                f"=TURBINE_OUT({inlet};{outlet}_pressure;1)",
                "stream",
                name=f"isentropic_{key}",
            )
            page.put(f"H{row}", f"=ENTHALPY_OF(G{row})", "result", "enthalpy")
            page.put(
                f"I{row}",
                f"={outlet}_entropy-{inlet}_entropy",
                "result",
                "entropy",
                name=f"entropy_rise_{key}",
            )
            page.put(f"J{row}", f'=IFERROR(DRYNESS_OF(G{row});"{figures.NONE}")', "result", "dryness")
        style_by_content(page.sheet.getCellRangeByName(f"F{first}:F{row}"), {BROKEN: "impossible"})
        row += 1
        page.put(
            f"A{row}",
            "Isentropic efficiency between the measured states; a wet end is held against a wet ideal, so "
            "that moisture, leaving loss and packing are inside the figure. The LP stage rests on the "
            "exhaust of the energy balance, and so on the reading of the power.",
            "note",
            merge=f"J{row}",
        )
        page.height(row, 0.75)
        self.row = row
