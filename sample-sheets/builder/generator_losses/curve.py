"""The sheet "Curve": all losses over loads and power factors; the chart draws from here."""

from generator_losses import figures
from writer import Page

NAME = "Curve"
FIRST = 5


class Curve:
    def __init__(self, document, styles):
        self.page = Page(document, styles, NAME)

    def build(self):
        page = self.page
        page.widths({**{column: 2.15 for column in "ABCDEFGHIJKL"}, "M": 0.5, "N": 2.0, "O": 4.2})
        page.put("A1", "Curve", "title")
        page.height(1, 0.95)
        page.put("A2", "All losses of the generator over load, at three power factors, lagging.", "subtitle")
        page.put("A3", "By GENERATOR_LOSS_TABLE", "block", merge="L3")
        page.put("N3", "Loads", "block")
        page.put("O3", "Power factors", "block")
        last = FIRST - 1 + len(figures.LOADS) * len(figures.POWER_FACTORS)
        formats = ("ratio2", "percent", "power2", *("power",) * 7, "power2", "percent2")
        page.height(FIRST - 1, 1.35)
        for column, fmt in zip("ABCDEFGHIJKL", formats):
            page.put(f"{column}{FIRST - 1}", None, "heading")
            for row in range(FIRST, last + 1):
                page.put(f"{column}{row}", None, "result", fmt)
        end = FIRST + len(figures.LOADS) - 1
        for column, text in (("N", "of rated"), ("O", "lagging")):
            page.put(f"{column}{FIRST - 1}", text, "heading")
        page.put("O8", "In the chart", "block")
        page.put("O14", "Points: load, efficiency", "block")
        for row, load in enumerate(figures.LOADS, FIRST):
            page.put(f"N{row}", load, "allowance", "percent")
        for row, factor in enumerate(figures.POWER_FACTORS, FIRST):
            page.put(f"O{row}", factor, "allowance", "ratio2")
            legend = f"legend_{row - FIRST + 1}"
            text = f'="power factor "&FIXED(O{row};2)'
            page.put(f"O{row + 4}", text, "result centred", name=legend)
        page.put("O12", "guaranteed", "result centred", name="legend_guarantee")
        page.put("O13", "the run", "result centred", name="legend_run")
        for row, name, x, y in (
            (15, "guarantee", "1", "stated_guaranteed_efficiency"),
            (17, "run", "run_load", "run_efficiency"),
        ):
            page.put(f"O{row}", f"={x}", "result", "percent", name=f"point_{name}_x")
            page.put(f"O{row + 1}", f"={y}", "result", "percent2", name=f"point_{name}_y")
        page.name_range("curve_loads", page.reference(f"N{FIRST}:N{end}"))
        page.name_range("curve_factors", page.reference(f"O{FIRST}:O{FIRST + 2}"))
        page.put_array(
            f"A{FIRST - 1}:L{last}",
            "=GENERATOR_LOSS_TABLE(stated_rated_apparent_power;stated_rated_power_factor;rated_losses;"
            'field_ratio;curve_loads;curve_factors;"lagging")',
        )
        page.repeat_rows(3, 4)
        page.break_before(FIRST + 2 * len(figures.LOADS))
        page.freeze(2, 4)


def lines():
    """(loads, efficiencies, legend cell) of each power factor, as a chart names them."""
    count = len(figures.LOADS)
    for index in range(len(figures.POWER_FACTORS)):
        first = FIRST + index * count
        last = first + count - 1
        yield f"${NAME}.$B${first}:$B${last}", f"${NAME}.$L${first}:$L${last}", f"${NAME}.$O${FIRST + 4 + index}"
