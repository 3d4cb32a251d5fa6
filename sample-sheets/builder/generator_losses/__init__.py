"""The workbook generator-losses.ods: an invented generator from its test losses to the busbar."""

from generator_losses import chain, curve, evidence, figures, inputs, losses
from styles import Styles, set_up_page

FILE = "generator-losses.ods"
FOOTER = (
    "For appraisal only; never for the setting of protection. High voltage: local codes and licensed "
    "practice govern."
)


def build(document):
    """Fills an empty document."""
    model = document.model
    model.lockControllers()
    model.enableAutomaticCalculation(False)
    sheets = (losses, chain, curve, inputs, evidence)
    document.sheet(0).setName(sheets[0].NAME)
    for module in sheets[1:]:
        document.add_sheet(module.NAME)
    styles = Styles(model)

    front = losses.Losses(document, styles)
    parts = (
        inputs.Inputs(document, styles),
        chain.Chain(document, styles),
        curve.Curve(document, styles),
        front,
        evidence.Evidence(document, styles),
    )
    for part in parts:
        part.build()
    for part in parts:
        part.page.write()
    for module in sheets:
        sheet = document.sheet(module.NAME)
        set_up_page(model, sheet, f"Generator losses: {figures.SITE} (invented)", FOOTER)
        if module is losses:
            # A chart as wide as its columns would otherwise print one column more.
            sheet.setPrintAreas((sheet.getCellRangeByName(losses.PRINTED).RangeAddress,))
    model.enableAutomaticCalculation(True)
    model.unlockControllers()
    document.recalculate()
    front.draw()
    document.model.CurrentController.setActiveSheet(document.sheet(0))
    document.select(f"{losses.NAME}.A1")
