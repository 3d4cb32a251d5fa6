#!/usr/bin/python3
"""Runs the sheet tests in a headless office with the built extension.

    run.py busbar.oxt [-k PATTERN] [-v] [--keep-profile FOLDER]

Makes a throw-away profile, installs the extension, runs every tests/sheet/test_*.py with one shared
office, and ends with the line `N passed, N failed` (skipped tests count as neither).
"""

import argparse
import os
import signal
import sys
import unittest

HERE = os.path.dirname(os.path.abspath(__file__))
TESTS = os.path.dirname(HERE)


def arguments():
    parser = argparse.ArgumentParser(description="sheet tests in a headless office")
    parser.add_argument("oxt", help="the extension to test")
    parser.add_argument("-k", dest="patterns", action="append", help="only tests with this name")
    parser.add_argument("-v", dest="verbose", action="store_true", help="one line a test")
    parser.add_argument("--keep-profile", metavar="FOLDER", help="use and keep this profile")
    parser.add_argument("--log", default=os.devnull, help="where the office's own output goes")
    return parser.parse_args()


def suite(patterns):
    loader = unittest.TestLoader()
    if patterns:
        loader.testNamePatterns = [p if "*" in p else f"*{p}*" for p in patterns]
    return loader.discover(TESTS, pattern="test_*.py", top_level_dir=TESTS)


def main():
    given = arguments()
    sys.path.insert(0, TESTS)
    # So that the office, too, is ended when a time limit ends this process.
    signal.signal(signal.SIGTERM, lambda *_: sys.exit(143))
    try:
        from harness.case import SheetCase
        from harness.office import Office
        from harness.profile import CannotInstall, Profile
    except ImportError as error:
        print(f"No UNO bridge in this Python ({error}): use /usr/bin/python3 with python3-uno.")
        return 2

    with Profile(given.keep_profile) as profile:
        try:
            profile.with_extension(given.oxt)
        except CannotInstall as reason:
            print(reason)
            return 2
        SheetCase.oxt = os.path.abspath(given.oxt)
        SheetCase.office = Office(profile.folder, log=given.log)
        print(f"office started in {SheetCase.office.start_seconds:.1f} s")
        try:
            runner = unittest.TextTestRunner(
                stream=sys.stdout, verbosity=2 if given.verbose else 1, buffer=False
            )
            result = runner.run(suite(given.patterns))
        finally:
            SheetCase.office.close()
    failed = len(result.failures) + len(result.errors) + len(result.unexpectedSuccesses)
    passed = result.testsRun - failed - len(result.skipped)
    if result.skipped:
        print(f"{len(result.skipped)} skipped")
    print(f"{max(passed, 0)} passed, {failed} failed")
    return 1 if failed or passed <= 0 else 0


if __name__ == "__main__":
    sys.exit(main())
