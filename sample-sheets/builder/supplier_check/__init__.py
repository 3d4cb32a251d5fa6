"""The workbook supplier-check.ods: an invented supplier's sheet, recomputed and judged."""

from styles import Styles, set_up_page
from supplier_check import claims, evidence, figures, recomputation, uncertainty, verdicts

FILE = "supplier-check.ods"
FOOTER = "For appraisal only; never for the setting of safety devices. Local codes and licensed practice govern."


def build(document):
    """Fills an empty document."""
    model = document.model
    model.lockControllers()
    model.enableAutomaticCalculation(False)
    sheets = (verdicts, recomputation, claims, uncertainty, evidence)
    document.sheet(0).setName(sheets[0].NAME)
    for module in sheets[1:]:
        document.add_sheet(module.NAME)
    styles = Styles(model)

    front = verdicts.Verdicts(document, styles)
    proof = evidence.Evidence(document, styles)
    check = recomputation.Recomputation(document, styles)
    tests = claims.Tests(document, styles)
    weights = uncertainty.Uncertainty(document, styles)
    check.build()
    weights.build(check.formulas)
    tests.build()
    front.build(tests)
    proof.build()
    for part in (front, check, tests, weights, proof):
        part.page.write()

    for module in sheets:
        sheet = document.sheet(module.NAME)
        title = f"Supplier check: {figures.SITE} (invented)"
        set_up_page(model, sheet, title, FOOTER)
    model.enableAutomaticCalculation(True)
    model.unlockControllers()
    document.recalculate()
    controller = model.CurrentController
    controller.setActiveSheet(document.sheet(0))
    document.select(f"{verdicts.NAME}.A1")
