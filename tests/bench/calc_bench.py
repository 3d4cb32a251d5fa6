#!/usr/bin/python3
"""What a cell costs in real Calc, beside an add-in that does nothing.

    tests/bench/calc_bench.py build/release [--cells 100000] [--repeats 5]

One office, one run, every figure the best of several full recalculations with changed inputs, so that
ratios mean something; the time is the processor time of the office, so that other work on the machine
disturbs it less. Prints nanoseconds a cell and the ratio to the yardstick of each line; then the
office's memory over ten recalculations of changed stream cells, and its start-up with and without the
extension. Build with -DBUSBAR_BENCH=ON first.
"""

import argparse
import os
import sys

sys.path.insert(0, os.path.join(os.path.dirname(os.path.abspath(__file__)), "..", "sheet"))

from harness.office import Office  # noqa: E402
from harness.profile import Profile, run_unopkg  # noqa: E402

# Calc's transport costs about a tenth more for each argument of the signature, given or not: each
# yardstick has as many as what it is held against, the last one (the options) left out.
EMPTY_NUMBER = "=EMPTY_THREE(A1;B1)"
EMPTY_TEXT = "=EMPTY_TEXT(A1;B1;55)"
EMPTY_TEXT_BACK = "=EMPTY_TEXT(D1;4;0.88)"
EMPTY_TEXT_BACK_THREE = "=EMPTY_TEXT_THREE(D1;4)"

# name, formula in the first row, name of its yardstick
LINES = [
    ("built-in SQRT(A)*B", "=SQRT(A1)*B1", None),
    ("empty, 2 numbers in", EMPTY_NUMBER, None),
    ("CARNOT", "=CARNOT(B1;20)", "empty, 2 numbers in"),
    ("STEAM_ENTHALPY", "=STEAM_ENTHALPY(A1;B1)", "empty, 2 numbers in"),
    ("STEAM_ENTROPY", "=STEAM_ENTROPY(A1;B1)", "empty, 2 numbers in"),
    ("STEAM_TEMPERATURE_AT_ENTHALPY", "=STEAM_TEMPERATURE_AT_ENTHALPY(A1;C1)", "empty, 2 numbers in"),
    ("empty, text out", EMPTY_TEXT, None),
    ("STEAM", "=STEAM(A1;B1;55)", "empty, text out"),
    ("empty, text, 2 numbers in, text out", EMPTY_TEXT_BACK, None),
    ("TURBINE_OUT", "=TURBINE_OUT(D1;4;0.88)", "empty, text, 2 numbers in, text out"),
    ("empty, text and number in, text out", EMPTY_TEXT_BACK_THREE, None),
    ("SET_FLOW", "=SET_FLOW(D1;60)", "empty, text and number in, text out"),
    ("VALVE_OUT", "=VALVE_OUT(D1;4)", "empty, text and number in, text out"),
    ("empty, text in, number out", "=EMPTY_TWO(D1)", None),
    ("ENTHALPY_OF", "=ENTHALPY_OF(D1)", "empty, text in, number out"),
    ("ENTROPY_OF", "=ENTROPY_OF(D1)", "empty, text in, number out"),
]

ARRAYS = [
    ("empty array, numbers", "EMPTY_TABLE", None),
    ("STEAM_ENTHALPY array", "STEAM_ENTHALPY", "empty array, numbers"),
    ("empty array, texts", "EMPTY_TEXT_TABLE", None),
    ("STEAM array", "STEAM", "empty array, texts"),
]


def states(count, turn):
    """Pressure (bar), temperature (°C), enthalpy (kJ/kg): spread over a plant, new at every turn."""
    rows = []
    for i in range(count):
        a = (i * 0.6180339887 + turn * 0.137) % 1
        b = (i * 0.7548776662 + turn * 0.291) % 1
        rows.append((20 + 140 * a, 380 + 180 * b, 300 + 3200 * b))
    return tuple(rows)


def processor_seconds(office):
    """User and system time of the office so far."""
    with open(f"/proc/{office.process.pid}/stat", encoding="ascii") as stat:
        fields = stat.read().rpartition(")")[2].split()
    return (int(fields[11]) + int(fields[12])) / os.sysconf("SC_CLK_TCK")


def best(document, inputs, count, repeats):
    """Least seconds of a hard recalculation with changed inputs."""
    least = None
    for turn in range(repeats):
        inputs.setDataArray(states(count, turn))
        begun = processor_seconds(document.office)
        document.recalculate()
        spent = processor_seconds(document.office) - begun
        least = spent if least is None else min(least, spent)
    return least


def resident(office):
    with open(f"/proc/{office.process.pid}/status", encoding="ascii") as status:
        for line in status:
            if line.startswith("VmRSS"):
                return int(line.split()[1]) / 1024
    return 0


def report(name, nanoseconds, base):
    ratio = "" if base is None else f"{nanoseconds / base:8.2f}"
    print(f"{name:38s}{nanoseconds:10.0f} ns{ratio}", flush=True)


def measure_cells(office, count, repeats):
    """One column of `count` formulas at a time, in a document of its own."""
    known = {}
    for name, formula, yardstick in LINES:
        with office.new() as document:
            inputs = document.range(f"A1:C{count}")
            inputs.setDataArray(states(count, 0))
            if "D1" in formula:
                # The streams that are read are typed texts, so that only one column computes.
                document.set("D1", "=STEAM(A1;B1;55)").fill_down(f"D1:D{count}")
                column = document.range(f"D1:D{count}")
                column.setDataArray(column.getDataArray())
            document.set("E1", formula).fill_down(f"E1:E{count}")
            if document.error(f"E{count}"):
                raise RuntimeError(f"{formula} fails: {document.error(f'E{count}')}")
            spent = best(document, inputs, count, repeats)
        known[name] = spent / count * 1e9
        report(name, known[name], known.get(yardstick))


def measure_arrays(office, count, repeats):
    known = {}
    for name, function, yardstick in ARRAYS:
        with office.new() as document:
            inputs = document.range(f"A1:C{count}")
            inputs.setDataArray(states(count, 0))
            document.set_array(f"E1:E{count}", f"={function}(A1:A{count};B1:B{count})")
            spent = best(document, inputs, count, repeats)
            if document.error(f"E{count}"):
                raise RuntimeError(f"{function} fails: {document.error(f'E{count}')}")
        known[name] = spent / count * 1e9
        report(name, known[name], known.get(yardstick))


def measure_memory(office, count):
    with office.new() as document:
        inputs = document.range(f"A1:C{count}")
        inputs.setDataArray(states(count, 0))
        document.set("E1", "=STEAM(A1;B1;55)").fill_down(f"E1:E{count}")
        document.recalculate()
        print(f"memory with {count} stream cells: {resident(office):.0f} MB", end="", flush=True)
        for turn in range(1, 11):
            inputs.setDataArray(states(count, turn))
            document.recalculate()
        print(f", after ten recalculations of changed cells: {resident(office):.0f} MB")


def start_seconds(folder, tries):
    least = None
    for _ in range(tries):
        with Office(folder) as office:
            document = office.new()
            document.close()
            least = office.start_seconds if least is None else min(least, office.start_seconds)
    return least


def main():
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("build", help="build folder")
    parser.add_argument("--cells", type=int, default=100000)
    parser.add_argument("--repeats", type=int, default=5)
    arguments = parser.parse_args()
    busbar = os.path.join(arguments.build, "addin", "busbar.oxt")
    empty = os.path.join(arguments.build, "tests", "bench", "empty_addin", "empty.oxt")
    with Profile() as plain, Profile() as profile:
        Office(plain.folder).close()
        profile.with_extension(busbar)
        without, with_it = start_seconds(plain.folder, 5), start_seconds(profile.folder, 5)
        print(f"start-up: {without:.2f} s without, {with_it:.2f} s with the extension"
              f" ({with_it / without:.3f})")
        run_unopkg(profile.folder, "add", "-s", "-f", os.path.abspath(empty))
        Office(profile.folder).close()
        with Office(profile.folder) as office:
            print(f"{arguments.cells} cells, best of {arguments.repeats}; ratio to the yardstick above")
            measure_cells(office, arguments.cells, arguments.repeats)
            measure_arrays(office, arguments.cells, arguments.repeats)
            measure_memory(office, arguments.cells)


if __name__ == "__main__":
    main()
