"""The two diagrams: which lines, in which colour, on which axes."""

from charts import DOT, STROKE, Chart
from steam_process.points import ENTHALPY, ENTROPY, ISOBARS, TS_ENTROPY, TS_TEMPERATURE
from styles import INK, OCHRE, PLUM, SLATE

TEAL = 0x2F6F73  # dryness
FAINT = 0x8796A5  # isobars


def mollier(document, sheet, lines, place, size):
    width, height = size
    chart = Chart(document, sheet, "mollier", place, size)
    chart.title("Expansion of the reheat turbine on the h-s diagram")
    chart.axis("X", "Specific entropy s, kJ/(kg K)", *ENTROPY, "0.0")
    chart.axis("Y", "Specific enthalpy h, kJ/kg", *ENTHALPY, "0")
    at = lines.ranges
    chart.line(*at["isobars"], FAINT, 18, at["legend_isobars"])
    chart.line(*at["isotherms"], OCHRE, 18, at["legend_isotherms"])
    chart.line(*at["drynesses"], TEAL, 18, at["legend_dryness"], STROKE)
    chart.line(*at["dome"], INK, 60, at["legend_dome"])
    _process(chart, at, "", SLATE)
    corners = {"S1": "right", "S2": "left", "S3": "right", "S4": "right", "S5": "right",
               "S6": "right", "S7": "right", "S8": "right"}
    tops = sum(1 for pressure in ISOBARS if pressure >= 4)
    isobars = 0
    for kind, x, y, text in lines.labels:
        if kind == "isobar":
            chart.label(x, y, text, SLATE, "top" if isobars < tops else "right", 7.0)
            isobars += 1
        elif kind == "isotherm":
            chart.label(x, y, text, OCHRE, "top left", 7.0)
        elif kind == "dryness":
            chart.label(x, y, text, TEAL, "bottom right", 7.0)
        elif kind.startswith("point "):
            chart.label(x, y, text, PLUM, corners[kind[6:]], 9.0, True)
    chart.finish()
    chart.plot_area(1.9, 1.6, width - 3.6, height - 4.2)
    chart.legend()
    return chart


def temperature_entropy(document, sheet, lines, place, size):
    width, height = size
    chart = Chart(document, sheet, "temperature_entropy", place, size)
    chart.title("The cycle on the T-s diagram")
    chart.axis("X", "Specific entropy s, kJ/(kg K)", *TS_ENTROPY, "0")
    chart.axis("Y", "Temperature, °C", *TS_TEMPERATURE, "0")
    at = lines.ranges
    chart.line(*at["ts isobars"], FAINT, 18, at["legend_isobars"])
    chart.line(*at["ts drynesses"], TEAL, 18, at["legend_dryness"], STROKE)
    chart.line(*at["ts dome"], INK, 60, at["legend_dome"])
    chart.line(*at["ts cycle"], OCHRE, 75, at["legend_cycle"])
    _process(chart, at, "ts ", OCHRE)
    corners = {"S1": "left", "S2": "left", "S3": "right", "S4": "right", "S5": "right",
               "S6": "right", "S7": "right", "S8": "bottom"}
    for kind, x, y, text in lines.labels:
        if kind == "ts_isobar":
            chart.label(x, y, text, SLATE, "right", 7.0)
        elif kind == "ts_dryness":
            chart.label(x, y, text, TEAL, "bottom", 7.0)
        elif kind.startswith("ts point "):
            chart.label(x, y, text, PLUM, corners[kind[9:]], 9.0, True)
    chart.finish()
    chart.plot_area(1.9, 1.6, width - 3.6, height - 4.2)
    chart.legend()
    return chart


def _process(chart, at, prefix, heat):
    chart.line(*at[prefix + "isentropes"], PLUM, 35, at["legend_isentropic"], DOT)
    chart.line(*at[prefix + "reheat"], heat, 60, at["legend_heat"], STROKE)
    chart.line(*at[prefix + "hp"], PLUM, 90, at["legend_expansion"])
    chart.line(*at[prefix + "ip_lp"], PLUM, 90)
    chart.points(*at[prefix + "states"], PLUM, 220)
