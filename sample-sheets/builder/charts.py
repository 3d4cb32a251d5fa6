"""XY charts of the sample workbooks: series by cell ranges, fixed axes, labels from cells."""

from com.sun.star.awt import Rectangle, Size
from com.sun.star.chart.ChartLegendPosition import BOTTOM
from com.sun.star.chart2 import DataPointLabel, Symbol
from com.sun.star.chart2.SymbolStyle import NONE, STANDARD
from com.sun.star.drawing import LineDash
from com.sun.star.drawing.DashStyle import ROUND
from com.sun.star.drawing.FillStyle import NONE as UNFILLED
from com.sun.star.drawing.LineStyle import DASH, SOLID
from com.sun.star.drawing.LineStyle import NONE as NO_LINE
from com.sun.star.lang import Locale
from com.sun.star.table import CellRangeAddress

from styles import FONT, HAIR, INK, MIST, WHITE

LEAVE_GAP = 0  # com.sun.star.chart.MissingValueTreatment: an empty row lifts the pen
# com.sun.star.chart.DataLabelPlacement
PLACEMENT = {"centre": 1, "top": 2, "top left": 3, "left": 4, "bottom left": 5, "bottom": 6,
             "bottom right": 7, "right": 8, "top right": 9}
DOT = "dotted"
STROKE = "dashed"


class Chart:
    """One chart on a sheet. Sizes and places in centimetres, ranges as "$Lines.$A$4:$A$90"."""

    def __init__(self, document, sheet, name, place, size):
        left, top, width, height = (round(1000 * part) for part in (*place, *size))
        address = CellRangeAddress(sheet.RangeAddress.Sheet, 0, 0, 1, 1)
        sheet.Charts.addNewByName(name, Rectangle(left, top, width, height), (address,), False, False)
        self.office = document.office
        self.model = sheet.Charts.getByName(name).EmbeddedObject
        self.model.setDiagram(self.model.createInstance("com.sun.star.chart.XYDiagram"))
        self.plain = self.model.Diagram
        self.plain.MissingValueTreatment = LEAVE_GAP
        self._series = []
        self._dashes()
        self._look()

    def _dashes(self):
        table = self.model.createInstance("com.sun.star.drawing.DashTable")
        table.insertByName(DOT, LineDash(ROUND, 1, 20, 0, 0, 70))
        table.insertByName(STROKE, LineDash(ROUND, 0, 0, 1, 220, 110))

    def _look(self):
        area, wall = self.model.Area, self.plain.Wall
        area.LineStyle = NO_LINE
        area.FillColor = WHITE
        wall.LineStyle = SOLID
        wall.LineColor = HAIR
        wall.FillColor = WHITE

    def title(self, text, size=12.0):
        self.model.HasMainTitle = True
        self.model.Title.String = text
        self._letters(self.model.Title, size, INK, True)

    def axis(self, which, title, low, high, step, fmt):
        """`which` is "X" or "Y"; `fmt` the number format of its figures."""
        setattr(self.plain, f"Has{which}AxisTitle", True)
        heading = getattr(self.plain, which + "AxisTitle")
        heading.String = title
        self._letters(heading, 9.5, INK, False)
        axis = getattr(self.plain, which + "Axis")
        axis.LinkNumberFormatToSource = False
        axis.NumberFormat = self._number_format(fmt)
        axis.Min, axis.Max, axis.StepMain = low, high, step
        axis.LineColor = INK
        self._letters(axis, 8.5, INK, False)
        setattr(self.plain, f"Has{which}AxisGrid", True)
        grid = getattr(self.plain, which + "MainGrid")
        grid.LineColor = MIST
        grid.LineWidth = 0

    def _number_format(self, code):
        formats, locale = self.model.NumberFormats, Locale("en", "GB", "")
        key = formats.queryKey(code, locale, False)
        return formats.addNew(code, locale) if key < 0 else key

    def plot_area(self, left, top, width, height):
        """The box inside the axes, in centimetres of the chart."""
        box = Rectangle(*(round(1000 * part) for part in (left, top, width, height)))
        self.plain.setDiagramPositionExcludingAxes(box)

    def line(self, x, y, color, width, name=None, dash=None):
        """A line through the points of two ranges; broken at rows without numbers. `width` in
        hundredths of a millimetre; `name` is the cell whose text stands in the legend."""
        series = self._new(x, y, name)
        series.Color = color
        series.LineWidth = width
        series.LineStyle = DASH if dash else SOLID
        if dash:
            series.LineDashName = dash
        series.Symbol = Symbol(Style=NONE)
        series.ShowLegendEntry = name is not None
        return series

    def points(self, x, y, color, size, name=None):
        """Marks without a line; `size` in hundredths of a millimetre."""
        series = self._new(x, y, name)
        series.Color = color
        series.LineStyle = NO_LINE
        mark = Symbol(Style=STANDARD, StandardSymbol=8)
        mark.Size = Size(size, size)
        mark.FillColor = color
        mark.BorderColor = WHITE
        series.Symbol = mark
        series.ShowLegendEntry = name is not None
        return series

    def label(self, x, y, text, color, place, size=7.5, bold=False):
        """The text of a cell beside the point of two cells."""
        series = self._new(x, y, text)
        series.Color = color
        series.LineStyle = NO_LINE
        series.Symbol = Symbol(Style=NONE)
        shown = DataPointLabel()
        shown.ShowSeriesName = True
        series.Label = shown
        series.LabelPlacement = PLACEMENT[place]
        series.CharColor = color
        series.CharHeight = size
        series.CharFontName = FONT
        if bold:
            series.CharWeight = 150.0
        series.ShowLegendEntry = False
        return series

    def legend(self):
        """Below the chart, as wide as it takes."""
        self.model.HasLegend = True
        legend = self.model.Legend
        legend.Alignment = BOTTOM
        self._letters(legend, 8.5, INK, False)
        legend.LineStyle = NO_LINE
        legend.FillStyle = UNFILLED

    def finish(self):
        """Puts the series into the chart; to be called when all are there."""
        kind = self.model.getFirstDiagram().CoordinateSystems[0].ChartTypes[0]
        kind.setDataSeries(tuple(self._series))

    def _new(self, x, y, name):
        provider = self.model.DataProvider
        sequences = []
        for role, cells in (("values-x", x), ("values-y", y)):
            values = provider.createDataSequenceByRangeRepresentation(cells)
            values.Role = role
            labelled = self.office.create("com.sun.star.chart2.data.LabeledDataSequence")
            labelled.setValues(values)
            if role == "values-y" and name:
                caption = provider.createDataSequenceByRangeRepresentation(name)
                caption.Role = "label"
                labelled.setLabel(caption)
            sequences.append(labelled)
        series = self.office.create("com.sun.star.chart2.DataSeries")
        series.setData(tuple(sequences))
        self._series.append(series)
        return series

    @staticmethod
    def _letters(shape, size, color, bold):
        shape.CharFontName = FONT
        shape.CharHeight = size
        shape.CharColor = color
        shape.CharWeight = 150.0 if bold else 100.0

