"""Headless Calc for tests: see office.py (an office and its documents), profile.py (a throw-away
profile with the extension in it), case.py (the test case to derive from) and run.py (the runner)."""
