"""The look of every sample workbook: palette, cell styles, number formats, page set-up.

Kinds of cells differ in lightness and in their borders or letters, not in hue alone, so that a grey
print and a colour-blind reader lose nothing.
"""

from com.sun.star.awt.FontSlant import ITALIC
from com.sun.star.awt.FontWeight import BOLD
from com.sun.star.lang import Locale
from com.sun.star.sheet.ConditionOperator import EQUAL
from com.sun.star.table import BorderLine2
from com.sun.star.table.CellHoriJustify import CENTER, LEFT, RIGHT
from com.sun.star.table.CellVertJustify2 import CENTER as MIDDLE
from com.sun.star.table.CellVertJustify2 import TOP

from harness.office import properties

FONT = "Liberation Sans"

INK = 0x1D2733
SLATE = 0x33475B
MIST = 0xDFE5EA
HAIR = 0xA9B4BE
SAND = 0xFFF0CC
OCHRE = 0x9A6A12
PLUM = 0x5E1738
AMBER = 0xF0C75E
ICE = 0xE3EFF6
WHITE = 0xFFFFFF

PREFIX = "Busbar "

# Number formats take the size of a number from the number itself, because the unit set changes it:
# 130 bar, 1885 psia and 13,000,000 Pa stand in the same cell. Calc drops the sign of
# a negative number in any but the first part of such a format, so the first part takes them.
FORMATS = {
    "general": "General",
    "percent": "0.0 %",
    "percent2": "0.00 %",
    "pressure": "[<10]0.000;[<10000]0.0;#,##0",
    "temperature": "0.0",
    "dryness": "0.000",
    "flow": "[<10000]0.00;#,##0",
    "enthalpy": "[<10000]0.0;#,##0",
    "entropy": "[<100]0.0000;#,##0.0",
    "power": "[<10000]0.0;#,##0",
    "power2": "[<10000]0.00;#,##0",
    "heat_rate": "[<10]0.000;#,##0",
    "heat_rate2": "#,##0.0##",
    "ratio": "0.0",
    "ratio2": "0.00",
    "volume": "0.00000",
    "small": "[<100]0.000;#,##0",
    "given": "0.###",
}


def _line(color, width):
    line = BorderLine2()
    line.Color = color
    line.OuterLineWidth = width
    line.LineWidth = width
    return line


def _box(color, width):
    line = _line(color, width)
    return {side + "Border": line for side in ("Top", "Bottom", "Left", "Right")}


# name: (parent, properties)
CELL_STYLES = {
    "text": (
        "Default",
        {"CharHeight": 9.0, "CharColor": INK, "ParaLeftMargin": 90, "ParaRightMargin": 90},
    ),
    "title": ("text", {"CharHeight": 18.0, "CharWeight": BOLD, "CharColor": SLATE}),
    "subtitle": ("text", {"CharHeight": 10.0}),
    "block": (
        "text",
        {"CharWeight": BOLD, "CharColor": WHITE, "CellBackColor": SLATE, "CharHeight": 10.0},
    ),
    "heading": (
        "text",
        {
            "CharWeight": BOLD,
            "CellBackColor": MIST,
            "IsTextWrapped": True,
            "HoriJustify": CENTER,
            **_box(HAIR, 9),
        },
    ),
    "heading left": ("heading", {"HoriJustify": LEFT}),
    "label": ("text", {"HoriJustify": LEFT, "ShrinkToFit": True, **_box(HAIR, 9)}),
    "label wrapped": ("label", {"ShrinkToFit": False, "IsTextWrapped": True}),
    "input": (
        "text",
        {
            "CellBackColor": SAND,
            "HoriJustify": RIGHT,
            "ShrinkToFit": True,
            **_box(OCHRE, 26),
            "LeftBorder": _line(OCHRE, 71),
        },
    ),
    "input text": ("input", {"HoriJustify": CENTER}),
    "input left": ("input", {"HoriJustify": LEFT}),
    "allowance": ("input", {"CellBackColor": WHITE, "CharPosture": ITALIC}),
    "result": ("text", {"HoriJustify": RIGHT, "ShrinkToFit": True, **_box(HAIR, 9)}),
    "result text": ("result", {"HoriJustify": LEFT}),
    "result centred": ("result", {"HoriJustify": CENTER}),
    "key": ("result", {"CharWeight": BOLD}),
    "key centred": ("key", {"HoriJustify": CENTER}),
    "stream": ("result", {"HoriJustify": LEFT, "CharHeight": 8.0, "ShrinkToFit": False}),
    "exact": (
        "result",
        {"HoriJustify": LEFT, "CharHeight": 8.0, "ShrinkToFit": False, "IsTextWrapped": True},
    ),
    "note": (
        "text",
        {
            "CharHeight": 8.0,
            "IsTextWrapped": True,
            "HoriJustify": LEFT,
            "VertJustify": TOP,
            "CharPosture": ITALIC,
        },
    ),
    "meaning": ("note", {"VertJustify": MIDDLE}),
    "caution": (
        "text",
        {
            "IsTextWrapped": True,
            "HoriJustify": LEFT,
            "VertJustify": MIDDLE,
            "CellBackColor": MIST,
            **_box(SLATE, 53),
        },
    ),
    "reason": (
        "text",
        {"CharHeight": 8.5, "IsTextWrapped": True, "HoriJustify": LEFT, **_box(HAIR, 9)},
    ),
    "unstated": ("result", {"HoriJustify": CENTER, "CharWeight": BOLD, **_box(INK, 53)}),
    "zero": ("result", {"CharColor": HAIR}),
    "impossible": (
        "result",
        {"HoriJustify": CENTER, "CellBackColor": PLUM, "CharColor": WHITE, "CharWeight": BOLD},
    ),
    "not shown impossible": (
        "result",
        {"HoriJustify": CENTER, "CellBackColor": AMBER, "CharPosture": ITALIC},
    ),
    "consistent": ("result", {"HoriJustify": CENTER, "CellBackColor": ICE}),
}

VERDICTS = ("impossible", "not shown impossible", "consistent")


class Styles:
    """The styles of one document; created in it at once."""

    def __init__(self, model):
        self._model = model
        self._formats = {}
        default = model.StyleFamilies.getByName("CellStyles").getByName("Default")
        default.CharFontName = FONT
        default.CharHeight = 9.0
        default.VertJustify = MIDDLE
        default.CharLocale = Locale("en", "GB", "")
        for name, (parent, values) in CELL_STYLES.items():
            self._create(name, parent, values)

    def _create(self, name, parent, values):
        style = self._model.createInstance("com.sun.star.style.CellStyle")
        self._model.StyleFamilies.getByName("CellStyles").insertByName(PREFIX + name, style)
        style.setParentStyle(parent if parent == "Default" else PREFIX + parent)
        for key, value in values.items():
            setattr(style, key, value)

    def number_format(self, name):
        """The key of a number format of FORMATS in this document."""
        if name not in self._formats:
            formats = self._model.NumberFormats
            locale = Locale("en", "GB", "")
            code = FORMATS[name]
            key = formats.queryKey(code, locale, False)
            self._formats[name] = formats.addNew(code, locale) if key < 0 else key
        return self._formats[name]


def style_by_content(area, cases):
    """Conditional style: {text or number that the cell shows: style}."""
    entries = area.ConditionalFormat
    for content, style in cases.items():
        formula = f'"{content}"' if isinstance(content, str) else str(content)
        entries.addNew(
            properties(
                {
                    "Operator": EQUAL,
                    "Formula1": formula,
                    "StyleName": PREFIX + style,
                }
            )
        )
    area.ConditionalFormat = entries


def style_verdicts(area):
    """Cells that hold a verdict take the style of that verdict."""
    style_by_content(area, {verdict: verdict for verdict in VERDICTS})


def set_up_page(model, sheet, title, caution, landscape=True):
    """A4, one page wide, title above, caution and page number below, headings in `sheet` repeat."""
    family = model.StyleFamilies.getByName("PageStyles")
    name = PREFIX + sheet.Name
    style = model.createInstance("com.sun.star.style.PageStyle")
    family.insertByName(name, style)
    short, long = 21000, 29700
    style.IsLandscape = landscape
    style.Width, style.Height = (long, short) if landscape else (short, long)
    for side in ("Left", "Right", "Top", "Bottom"):
        setattr(style, side + "Margin", 900)
    style.HeaderIsOn = style.FooterIsOn = True
    style.FirstPageNumber = 0  # goes on from the sheet before
    style.HeaderBodyDistance = style.FooterBodyDistance = 150
    style.ScaleToPagesX = 1
    style.ScaleToPagesY = 0
    style.CenterHorizontally = True
    _band(model, style, "RightPageHeaderContent", (title, "", sheet.Name))
    _band(model, style, "RightPageFooterContent", (caution, "", PAGE_OF))
    sheet.PageStyle = name


PAGE_OF = ("Page ", "PageNumber", " of ", "PageCount")  # texts and fields by turns


def _band(model, style, which, parts):
    content = getattr(style, which)
    for place, part in zip((content.LeftText, content.CenterText, content.RightText), parts):
        place.setString("")
        cursor = place.createTextCursor()
        for piece in (part,) if isinstance(part, str) else part:
            cursor.gotoEnd(False)
            if piece in ("PageNumber", "PageCount"):
                field = model.createInstance("com.sun.star.text.TextField." + piece)
                place.insertTextContent(cursor, field, False)
            else:
                place.insertString(cursor, piece, False)
        cursor.gotoStart(False)
        cursor.gotoEnd(True)
        cursor.CharFontName = FONT
        cursor.CharHeight = 8.0
    setattr(style, which, content)
