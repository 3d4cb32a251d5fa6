#!/usr/bin/python3
"""Builds the sample workbooks anew with the extension: build.py busbar.oxt [--out FOLDER]

Needs the Python of LibreOffice's UNO bridge (Debian: /usr/bin/python3 with python3-uno).
"""

import argparse
import os
import shutil
import sys
import tempfile

HERE = os.path.dirname(os.path.abspath(__file__))
SAMPLES = os.path.dirname(HERE)
sys.path[:0] = [HERE, os.path.join(os.path.dirname(SAMPLES), "tests", "sheet")]

from harness.office import Document, Office  # noqa: E402
from harness.profile import Profile  # noqa: E402

import generator_losses  # noqa: E402
import steam_process  # noqa: E402
import supplier_check  # noqa: E402

WORKBOOKS = (supplier_check, steam_process, generator_losses)


def shown(office):
    """A new spreadsheet that is not hidden: of a hidden one, frozen panes would not be stored."""
    return Document(
        office, office.desktop.loadComponentFromURL("private:factory/scalc", "_blank", 0, ())
    )


def main():
    parser = argparse.ArgumentParser(description="builds the sample workbooks")
    parser.add_argument("oxt", help="the extension whose functions the workbooks use")
    parser.add_argument("--out", default=SAMPLES, metavar="FOLDER", help="where they go")
    parser.add_argument("--profile", metavar="FOLDER", help="a profile that has the extension already")
    given = parser.parse_args()
    os.makedirs(given.out, exist_ok=True)
    with Profile(given.profile) as profile:
        if not given.profile:
            profile.with_extension(given.oxt)
        with Office(profile.folder) as office, tempfile.TemporaryDirectory() as scratch:
            for workbook in WORKBOOKS:
                fresh = os.path.join(scratch, workbook.FILE)
                with shown(office) as document:
                    workbook.build(document)
                    document.save(fresh)
                # Not saved in place: an office that has the old file open holds a lock on it.
                print(shutil.copy(fresh, given.out))


if __name__ == "__main__":
    main()
