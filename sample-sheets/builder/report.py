#!/usr/bin/python3
"""Opens a sample workbook in headless Calc with the extension, recalculates it hard, prints its
verdict table and leaves it as PDF and PNG.

    report.py busbar.oxt workbook.ods FOLDER

A workbook without a verdict table is only drawn.

Ends with 0 when every verdict was worked out, whatever the verdicts are; with 1 when a cell of the
table failed or a file was not written; with 2 when the extension could not be installed.
"""

import argparse
import glob
import os
import shutil
import subprocess
import sys
import textwrap

HERE = os.path.dirname(os.path.abspath(__file__))
sys.path.insert(0, os.path.join(os.path.dirname(os.path.dirname(HERE)), "tests", "sheet"))

from harness.office import Office, shown_error  # noqa: E402
from harness.profile import CannotInstall, Profile  # noqa: E402

TABLE = "verdict_table"  # named range: a heading row, then one row a claim, the reason last
DOTS_PER_INCH = 150


def read_table(document):
    """Rows of what the cells of the verdict table show, and the faults found in them."""
    names = document.model.NamedRanges
    if not names.hasByName(TABLE):
        return [], [f"the workbook has no range named {TABLE}"]
    area = names.getByName(TABLE).getReferredCells()
    rows, faults = [], []
    for row in range(area.Rows.Count):
        cells = [area.getCellByPosition(column, row) for column in range(area.Columns.Count)]
        rows.append([cell.getString() for cell in cells])
        for column, cell in enumerate(cells):
            if cell.getError():
                claim = rows[-1][0] or f"row {row + 1}"
                faults.append(f"{claim}, {rows[0][column]}: {shown_error(cell.getError())}")
    return rows, faults


def aligned(rows, width):
    """The table as text: a line a claim, its reason wrapped below it."""
    columns = len(rows[0]) - 1
    widths = [max(len(row[column]) for row in rows) for column in range(columns)]
    numbers = range(3, columns - 1)
    lines = []
    for row in rows:
        cells = [
            row[column].rjust(widths[column]) if column in numbers else row[column].ljust(widths[column])
            for column in range(columns)
        ]
        lines.append("  ".join(cells).rstrip())
        if row is rows[0]:
            lines.append("-" * min(width, max(len(lines[0]), width // 2)))
        else:
            indent = " " * (widths[0] + 2)
            lines += textwrap.wrap(row[-1], width, initial_indent=indent, subsequent_indent=indent)
    return lines


def summary(rows):
    """"3 impossible, 2 not shown impossible, 8 consistent"."""
    verdicts = [row[-2] for row in rows[1:]]
    order = ("impossible", "not shown impossible", "consistent")
    return ", ".join(f"{verdicts.count(verdict)} {verdict}" for verdict in order)


def draw(document, folder, name):
    """PDF and PNG of the workbook; the files written. Page 1 is name.png, the others name-2.png..."""
    pdf = os.path.join(folder, name + ".pdf")
    document.save(pdf)
    stem = os.path.join(folder, name)
    for old in glob.glob(glob.escape(stem) + "*.png"):
        os.unlink(old)
    subprocess.run(
        ["pdftoppm", "-r", str(DOTS_PER_INCH), "-png", pdf, stem + "-page"], check=True, timeout=120
    )
    written = [pdf]
    for number, page in enumerate(sorted(glob.glob(glob.escape(stem) + "-page-*.png")), 1):
        target = f"{stem}.png" if number == 1 else f"{stem}-{number}.png"
        os.replace(page, target)
        written.append(target)
    return written


def report(document, workbook, folder):
    """Prints and draws; the number of faults."""
    document.recalculate()
    judged = document.model.NamedRanges.hasByName(TABLE)
    rows, faults = read_table(document) if judged else ([], [])
    width = shutil.get_terminal_size((120, 40)).columns
    if rows:
        print("\n".join(aligned(rows, max(60, min(width, 160)))))
        print(f"\n{len(rows) - 1} claims: {summary(rows)}")
    name = os.path.splitext(os.path.basename(workbook))[0]
    for path in draw(document, folder, name):
        if os.path.getsize(path) == 0:
            faults.append(f"{path} is empty")
        else:
            print(min(path, os.path.relpath(path), key=len))
    for fault in faults:
        print(f"FAILED: {fault}", file=sys.stderr)
    return len(faults)


def main():
    parser = argparse.ArgumentParser(description="prints and draws a sample workbook")
    parser.add_argument("oxt", help="the extension")
    parser.add_argument("workbook")
    parser.add_argument("folder", help="where PDF and PNG go")
    given = parser.parse_args()
    if shutil.which("pdftoppm") is None:
        print("pdftoppm is missing: install poppler-utils.", file=sys.stderr)
        return 2
    os.makedirs(given.folder, exist_ok=True)
    with Profile() as profile:
        try:
            profile.with_extension(given.oxt)
        except CannotInstall as reason:
            print(reason, file=sys.stderr)
            return 2
        # A copy, so that no lock file is left beside the workbook.
        copy = shutil.copy(given.workbook, profile.folder)
        with Office(profile.folder) as office, office.load(copy) as document:
            return 1 if report(document, given.workbook, given.folder) else 0


if __name__ == "__main__":
    sys.exit(main())
