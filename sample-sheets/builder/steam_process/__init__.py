"""The workbook steam-process.ods: an invented turbine test on an h-s and a T-s diagram."""

from steam_process import balance, cycle, evidence, figures, inputs, points, process
from styles import Styles, set_up_page

FILE = "steam-process.ods"
FOOTER = "For appraisal only; never for the setting of safety devices. Local codes and licensed practice govern."


def build(document):
    """Fills an empty document."""
    model = document.model
    model.lockControllers()
    model.enableAutomaticCalculation(False)
    sheets = (process, cycle, balance, inputs, evidence, points)
    document.sheet(0).setName(sheets[0].NAME)
    for module in sheets[1:]:
        document.add_sheet(module.NAME)
    styles = Styles(model)

    front = process.Process(document, styles)
    second = cycle.Cycle(document, styles)
    heat = balance.Balance(document, styles)
    register = inputs.Inputs(document, styles)
    proof = evidence.Evidence(document, styles)
    lines = points.Lines(document, styles)
    parts = (register, heat, lines, front, second, proof)
    for part in parts:
        part.build()
    for part in parts:
        part.page.write()

    for module in sheets:
        sheet = document.sheet(module.NAME)
        set_up_page(model, sheet, f"Steam process: {figures.SITE} (invented)", FOOTER)
        # The points of the lines are never printed.
        sheet.setPrintAreas((_used(sheet, module.COLUMNS),) if module is not points else ())
    model.enableAutomaticCalculation(True)
    model.unlockControllers()
    document.recalculate()
    front.draw(lines)
    second.draw(lines)
    controller = model.CurrentController
    controller.setActiveSheet(document.sheet(0))
    document.select(f"{process.NAME}.A1")


def _used(sheet, columns):
    """The used rows in so many columns; a chart alone would not count."""
    cursor = sheet.createCursor()
    cursor.gotoEndOfUsedArea(False)
    return sheet.getCellRangeByPosition(0, 0, columns - 1, cursor.RangeAddress.EndRow).RangeAddress
