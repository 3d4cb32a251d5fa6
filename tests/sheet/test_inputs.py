"""Whatever a cell may hold, in every argument of every function: a Calc error, a WHY sentence that
names function, argument and limit, and an office that lives on.

The errors expected: #N/A for a missing value, #VALUE! for a wrong kind, Err:502 for a zero or blank
that cannot be and for what is out of range, Err:523 for an iteration at its cap. The limits are the
ones that the catalogue states for each argument.
"""

import collections
import math
import re

import catalogue
from catalogue import engine
from harness.case import SheetCase
from harness.office import shown_error

# The one optional word so far is what the air is saturated over below 0 °C.
GOOD_OPTIONS = {catalogue.NUMBER: "55", catalogue.WORD: '"ice"', catalogue.OPTIONS: '"metric"'}

# Cells that every test of the grid finds.
INPUTS = {
    "blank": ("AA1", None),
    "empty text": ("AA2", '=""'),
    "text": ("AA3", "abc"),
    "logical": ("AA4", "=TRUE()"),
    "error": ("AA5", "=1/0"),
    "huge": ("AA6", 1e308),
    "negative": ("AA7", -1),
    "zero": ("AA8", 0),
    "giant text": ("AA9", "x" * 60000),
    "damaged stream": ("AA10", None),  # filled from a stream that Busbar wrote
    "stream": ("AA11", "=STEAM(100;540;55)"),
}
NUMBERS = {"blank": 0.0, "logical": 1.0, "huge": 1e308, "negative": -1.0, "zero": 0.0}
SET_APART = {"WHY", "WHY_CALL"}  # a reference, and any number of anything: tested by hand below
WORKS = ""
NUMERAL = re.compile(r"-?\d+(\.\d*)?$")
# What no sentence may hold: marks of a defect, and numbers that are none.
UNWANTED = re.compile(r"defect|cannot take its|finds no part|\{[012]\}|\bnan\b|\binf\b")


# "HERE" in the words stands for the cell that the formula is put into.
Case = collections.namedtuple("Case", "label formula allowed words")
AT_ONCE = 100


def place_inputs(document):
    for address, content in INPUTS.values():
        document.set(address, content)
    stream = document.text("AA11")
    document.set("AA10", stream[:40] + stream[41:])


class Inputs(SheetCase):
    """The grid: function x argument x input."""

    def setUp(self):
        super().setUp()
        place_inputs(self.document)

    def functions(self):
        """(function, good arguments) of everything in the catalogue, the cells of its example put in
        place: what is asked of a function must be asked before the next one is taken."""
        for function in engine(self.oxt).functions:
            if function.name in SET_APART:
                continue
            for address, content in function.given.items():
                self.document.set(address, "=" + content)
            yield function, function.example_arguments()

    def check_all(self, cases_of):
        """Checks cases_of(function, argument number, good arguments); how many there were."""
        count = 0
        for function, good in self.functions():
            cases = []
            for index in range(len(function.arguments)):
                cases.extend(cases_of(function, index, good))
            self.check(cases)
            count += len(cases)
        return count

    def call(self, function, index, good, cell, last_option=None):
        """The formula with one argument replaced; optional ones before it are left out."""
        arguments = list(good)
        wanted = max(index + 1, len(function.arguments) if last_option else 0)
        while len(arguments) < wanted:
            arguments.append("")
        arguments[index] = cell
        if last_option:
            arguments[-1] = f'"{last_option}"'
        return f"={function.name}({';'.join(arguments)})"

    @staticmethod
    def in_range(function, good, unit_set):
        """The arguments with their numbers moved to where this unit set takes them."""
        moved = list(good)
        for i, text in enumerate(good):
            argument = function.arguments[i]
            if argument.kind not in (catalogue.NUMBER, catalogue.NUMBERS) or not NUMERAL.match(text):
                continue
            if not argument.takes(float(text), unit_set):
                low, high, _ = argument.limits(unit_set)
                moved[i] = repr((low + high) / 2 if math.isfinite(high) else 1.1 * low + 1)
        return moved

    def check(self, cases):
        """Each formula shows one of the errors allowed, and WHY then holds every one of the words.
        The cells are written and read many at a time: a call into the office costs milliseconds."""
        names = "|".join(f.name for f in engine(self.oxt).functions)
        stored = re.compile(rf"\b({names})\(")
        for start in range(0, len(cases), AT_ONCE):
            part = cases[start : start + AT_ONCE]
            area = self.document.range(f"F1:H{len(part)}")
            rows = []
            for row, case in enumerate(part, 1):
                formula = stored.sub(r"BUSBAR.\1(", case.formula)
                why, error = f"=BUSBAR.WHY(F{row})", f"=IFERROR(ERRORTYPE(F{row});0)"
                rows.append((formula, why, error))
            area.setFormulaArray(tuple(rows))
            for row, (case, read) in enumerate(zip(part, area.getDataArray()), 1):
                with self.subTest(case.label):
                    self.check_one(case, f"F{row}", read[1], shown_error(int(read[2])))
            area.clearContents(1 | 4 | 16)  # values, texts, formulas

    def check_one(self, case, here, why, shown):
        self.assertIsInstance(why, str, f"{case.formula}: WHY fails")
        self.assertIn(shown, case.allowed, f"{case.formula}: {why}")
        self.assertTrue(why.startswith(here), why)
        self.assertLess(len(why), 1500, case.formula)
        self.assertNotRegex(why, UNWANTED, case.formula)
        if shown != WORKS:
            for word in case.words:
                self.assertIn(re.sub(r"\bHERE\b", here, word), why, case.formula)

    def expectation(self, function, argument, name):
        """(errors that may be shown, words that WHY must hold if one is shown)"""
        who = f"HERE: {function.name}: {argument.name} "
        if name == "error":
            return {"#DIV/0!"}, ["HERE passes on the error of AA5: #DIV/0!"]
        if name == "empty text":
            return {"#N/A"} if argument.kind != catalogue.OPTIONS else {"#N/A"}, [who]
        kind = argument.kind
        if kind in (catalogue.NUMBER, catalogue.NUMBERS):
            if name not in NUMBERS:
                return {"#VALUE!"}, [who, "is a text where a number is needed"]
            number = NUMBERS[name]
            if argument.takes(number):
                # Inside its own limits; other arguments may still make it impossible, and one number
                # may be too few for a range.
                few = {"#VALUE!"} if kind == catalogue.NUMBERS else set()
                return {WORKS, "Err:502", "#N/A"} | few, [f"HERE: {function.name}: "]
            return {"Err:502"}, [who, self.limit_words(argument, number)]
        if kind in (catalogue.STREAM, catalogue.STREAMS):
            if name in ("blank", "zero"):
                return {"Err:502"}, [who, "zero or blank where a stream is needed"]
            if name == "stream":
                # #VALUE! where steam stands in the place of a gas, or one stream for several.
                return {WORKS, "Err:502", "#N/A", "#VALUE!"}, [f"HERE: {function.name}: "]
            if name in NUMBERS:
                return {"#VALUE!"}, [who, "is a number where a stream is needed"]
            words = {"damaged stream": "damaged", "giant text": "no stream text is longer than"}
            return {"#VALUE!"}, [who, words.get(name, "text of a stream")]
        if kind == catalogue.OPTIONS:
            if name in ("blank", "zero"):
                return {"Err:502"}, [who, "zero or blank", '"metric", "us" or "si"']
            return {"#VALUE!"}, [who, '"metric", "us" or "si"']
        if kind == catalogue.COMPOSITION:
            if name in ("blank", "zero"):
                return {"Err:502"}, [who, "zero or blank where a composition is needed"]
            return {"#VALUE!"}, [who]
        self.assertEqual(kind, catalogue.WORD)
        if name in ("blank", "zero"):
            return {"Err:502"}, [who, "zero or blank where a word is needed"]
        if name in NUMBERS:
            return {"#VALUE!"}, [who, "is a number where a word is needed"]
        if argument.name == "tag":
            return {WORKS, "#VALUE!"}, [who]  # almost any short text is a plant code
        return {"#VALUE!"}, [who]

    @staticmethod
    def limit_words(argument, number, unit_set="metric"):
        low, high, unit = argument.limit_texts(unit_set)
        if number > argument.limits(unit_set)[1]:
            return f"above {high} {unit}".strip()
        if not argument.limits(unit_set)[2]:
            if number == 0:
                return "zero or blank"
            return f"not above {low} {unit}" if unit in ("°C", "°F", "K") else "not above zero"
        return f"below {low} {unit}".strip()

    def test_every_input_in_every_argument(self):
        def cases_of(function, index, good):
            argument = function.arguments[index]
            for name, (address, _) in INPUTS.items():
                formula = self.call(function, index, good, address)
                allowed, words = self.expectation(function, argument, name)
                yield Case(f"{argument.name} is {name}", formula, allowed, words)

        self.assertGreater(self.check_all(cases_of), 1500)
        self.assertTrue(self.office.alive())

    def test_limits_are_told_in_the_units_of_the_caller(self):
        def cases_of(function, index, good):
            argument = function.arguments[index]
            if argument.kind not in (catalogue.NUMBER, catalogue.NUMBERS):
                return
            for unit_set in ("us", "si") if function.has_options else ():
                low, high, _ = argument.limits(unit_set)
                others = self.in_range(function, good, unit_set)
                for number in (high * 1.01 + 1, low - abs(low) * 0.01 - 1):
                    if not math.isfinite(number):
                        continue
                    words = [argument.name, self.limit_words(argument, number, unit_set)]
                    formula = self.call(function, index, others, repr(number), unit_set)
                    yield Case(f"{argument.name} in {unit_set}", formula, {"Err:502"}, words)

        self.assertGreater(self.check_all(cases_of), 60)

    def test_left_out_arguments(self):
        def cases_of(function, index, good):
            if index >= len(good):
                return
            argument = function.arguments[index]
            allowed = {"#N/A"}
            words = [f"HERE: {function.name}: {argument.name} is left out"]
            if argument.optional:
                # Some are needed because of what another argument says.
                allowed = {WORKS, "#N/A"}
                words = [f"HERE: {function.name}: "]
            # A gap in the middle, then everything from there on missing.
            yield Case("gap", self.call(function, index, good, ""), allowed, words)
            cut = f"={function.name}({';'.join(good[:index])})"
            yield Case("cut", cut, allowed, words)

        self.check_all(cases_of)

    def test_optional_arguments_make_no_difference_when_left_out(self):
        for function, example in self.functions():
            if not function.has_options:
                continue
            last = len(function.arguments) - 1
            good = example[:last]
            gaps = [""] * (last - len(good))
            same = [
                good,
                [*good, *gaps, ""],
                [*good, *gaps, '"metric"'],
                [*good, *gaps, '" METRIC "'],
            ]
            formulas = [f"={function.name}({';'.join(arguments)})" for arguments in same]
            with self.subTest(function=function.name):
                for row, formula in enumerate(formulas, 1):
                    self.document.set(f"F{row}", formula)
                shown = {row[0] for row in self.document.table("F1:F4")}
                self.assertEqual(len(shown), 1, shown)
                self.assertNotIn(None, shown)

    def test_too_many_arguments(self):
        # Calc itself refuses them with Err:504; WHY says how many there may be.
        def cases_of(function, index, good):
            if index:
                return
            full = list(good)
            while len(full) < len(function.arguments):
                full.append(GOOD_OPTIONS.get(function.arguments[len(full)].kind, ""))
            most = f"{len(full)} arguments at the most; {len(full) + 1} were given"
            if len(full) == 1:
                most = "one argument; 2 were given"
            if function.arguments[0].kind in (catalogue.NUMBERS, catalogue.STREAMS):
                most = f"one range, not a list of {len(full) + 1} arguments"
            formula = f"={function.name}({';'.join([*full, '1'])})"
            words = [f"HERE: {function.name}: takes {most}."]
            yield Case("one too many", formula, {"Err:504"}, words)

        self.check_all(cases_of)


class Kinds(SheetCase):
    """Cells of every kind that a user may point to."""

    def test_digits_in_a_text_cell_are_no_number(self):
        # Imported tables are full of them; Calc's own arithmetic would take them for numbers.
        self.document.set_all({"A1": "100", "B1": "=STEAM_ENTHALPY(A1;540)"})
        self.assert_error("B1", "#VALUE!")
        self.assertIn('pressure "100" is a text', self.why("B1"))
        self.document.set("B2", "=STEAM_ENTHALPY(VALUE(A1);540)")
        self.assert_error("B2", "")

    def test_percentages_and_dates_are_their_numbers(self):
        self.document.set_all({"A1": "=88%", "A2": "=DATE(2020;1;1)", "A3": "=TIME(12;0;0)"})
        self.document.set_all(
            {
                "B1": "=TURBINE_OUT(STEAM(100;540);0.05;A1)",
                "C1": "=TURBINE_OUT(STEAM(100;540);0.05;0.88)",
                "B2": "=STEAM(A2;540)",
                "B3": "=STEAM_AT_DRYNESS(1;A3)",
                "C3": "=STEAM_AT_DRYNESS(1;0.5)",
            }
        )
        self.assertEqual(self.document.text("B1"), self.document.text("C1"))
        self.assertEqual(self.document.text("B3"), self.document.text("C3"))
        self.assert_error("B2", "Err:502")
        self.assertIn("pressure 43831 bar is above 1000 bar", self.why("B2"))

    def test_every_error_goes_through(self):
        for formula, shown in {
            "=1/0": "#DIV/0!",
            "=NA()": "#N/A",
            '="a"+1': "#VALUE!",
            "=SQRT(-1)": "Err:502",
            "=NOSUCHNAME": "#NAME?",
        }.items():
            with self.subTest(formula):
                self.document.set_all(
                    {"A1": formula, "B1": "=STEAM(A1;540)", "B2": "=ENTHALPY_OF(B1)"}
                )
                self.assert_error("B1", shown)
                self.assert_error("B2", shown)
                self.assertTrue(self.why("B2").startswith("B2 passes on the error of A1: "))

    def test_a_sum_over_a_failure_breaks(self):
        self.document.set_all({"A1": "=STEAM_ENTHALPY(100;540)", "A2": "=STEAM_ENTHALPY(2000;540)"})
        self.document.set("A3", "=SUM(A1:A2)")
        self.assert_error("A3", "Err:502")

    def test_no_convergence_is_told_apart(self):
        # Err:523 from Calc's own iteration goes through as it is.
        self.document.model.IsIterationEnabled = True
        self.document.model.IterationCount = 3
        self.document.set_all({"A1": "=A2+1", "A2": "=A1+1", "B1": "=STEAM(A1;540)"})
        self.assert_error("B1", "Err:523")


class Ranges(SheetCase):
    """Ranges in the place of single cells, and the other way round."""

    def test_no_implicit_intersection(self):
        # A plain formula beside a range gives the first element, not the one in its own row: a
        # range always means the whole range.
        self.document.fill("A1", [(100.0,), (50.0,), (10.0,)])
        self.document.set_all({"B2": "=STEAM_ENTHALPY(A1:A3;540)", "C2": "=STEAM_ENTHALPY(A1;540)"})
        self.assertEqual(self.document.value("B2"), self.document.value("C2"))

    def test_a_single_cell_is_a_range_of_one(self):
        self.document.set_all(
            {"A1": 0.9, "B1": "=EFFICIENCY_CHAIN(A1)", "B2": "=EFFICIENCY_CHAIN(A1:A1)"}
        )
        self.assertEqual(self.document.value("B1"), 0.9)
        self.assertEqual(self.document.value("B2"), 0.9)
        self.document.set_all({"A2": "=STEAM(10;300;5)", "B3": "=FLOW_OF(MIX_OUT(A2))"})
        self.assertEqual(self.document.value("B3"), 5)

    def test_blank_and_empty_cells_of_a_range_are_missing(self):
        self.document.fill("A1", [(0.9,), ("",), (0.8,)])
        self.document.set("B1", "=EFFICIENCY_CHAIN(A1:A3)")
        self.assert_error("B1", "#N/A")
        self.assertIn("links in row 2, column 1 of its range is blank", self.why("B1"))
        self.document.set_all(
            {"C1": "=STEAM(10;300;5)", "C3": "=STEAM(10;200;3)", "D1": "=MIX_OUT(C1:C3)"}
        )
        self.assert_error("D1", "#N/A")
        self.assertIn("streams in row 2, column 1 of its range is blank", self.why("D1"))

    def test_the_failing_cell_of_a_range_is_named(self):
        self.document.fill("A1", [(0.9, 0.95), (88.0, 0.8)])
        self.document.set("D1", "=EFFICIENCY_CHAIN(A1:B2)")
        self.assert_error("D1", "Err:502")
        self.assertIn("links in row 2, column 1 of its range 88 is above 1", self.why("D1"))

    def test_whole_columns(self):
        self.document.set_all({"A1": 100, "A2": 50})
        for formula in (
            "=STEAM_ENTHALPY(A:A;540)",  # numbers, one by one
            "=EFFICIENCY_CHAIN(A:A)",  # numbers, all at once
            "=MIX_OUT(A:A)",  # streams, all at once
            '=CONVERT_UNIT(1;A:A;"psi")',  # words
            "=STEAM(100;540;;A:A)",  # options
        ):
            with self.subTest(formula):
                self.document.set_all({"D1": formula, "E1": "=WHY(D1)"})
                self.document.text("D1")
                self.assertTrue(self.document.text("E1").startswith("D1"))
        self.document.set_array("F1", "=SUM(IFERROR(STEAM_ENTHALPY(A1:A1048576;540);0))")
        self.document.set_all({"G1": "=STEAM_ENTHALPY(100;540)+STEAM_ENTHALPY(50;540)"})
        self.assertEqual(self.document.value("F1"), self.document.value("G1"))

    def test_a_range_larger_than_one_call_takes(self):
        # Nine columns of a million rows: more cells than the engine takes (busbar_cell_limit).
        self.document.set_all({"A1": "=EFFICIENCY_CHAIN(B1:J1048576)", "A2": "=WHY(A1)"})
        self.assertTrue(self.document.error("A1"))
        self.assertTrue(self.document.text("A2").startswith("A1"))

    def test_unions_and_ragged_arrays(self):
        self.document.set_all({"A1": 100, "A2": 50})
        for formula in ("=STEAM_ENTHALPY(A1~A2;540)", "=EFFICIENCY_CHAIN({0.9,0.8;0.7})"):
            with self.subTest(formula):
                self.document.set("B1", formula)
                self.assertTrue(self.document.error("B1"))
                self.assertTrue(self.why("B1").startswith("B1"))

    def test_ranges_over_sheets(self):
        self.document.add_sheet("Second")
        self.document.set_all({"A1": 0.9, "Second.A1": 0.8})
        self.document.set("C1", "=EFFICIENCY_CHAIN(Sheet1.A1:Second.A1)")
        self.document.text("C1")
        self.assertTrue(self.why("C1").startswith("C1"))


class Mistakes(SheetCase):
    """What somebody types who has never seen Busbar, and what he is told."""

    def assert_told(self, formula, shown, *words):
        with self.subTest(formula):
            self.document.set("B2", formula)
            self.assert_error("B2", shown)
            answer = self.why("B2")
            for word in words:
                self.assertIn(word, answer)

    def test_percentages_for_fractions(self):
        self.assert_told(
            "=TURBINE_OUT(STEAM(100;540);0.05;88)",
            "Err:502",
            "isentropic efficiency 88",
            "a fraction is meant, 0.88",
        )
        self.assert_told("=HEAT_RATE(38)", "Err:502", "efficiency 38 is above 1", "0.38")
        self.assert_told("=STEAM_AT_DRYNESS(0.05;88)", "Err:502", "dryness 88", "0.88")
        self.assert_told('=EFFICIENCY_ON_BASIS(55;"LHV";"HHV";55.5;50)', "Err:502", "0.55")

    def test_gauge_for_absolute_pressure(self):
        self.assert_told(
            "=STEAM(-0.95;33)",
            "Err:502",
            "pressure -0.95 bar is not above zero",
            "ABSOLUTE_PRESSURE",
        )
        self.assert_told("=ABSOLUTE_PRESSURE(99)", "#N/A", "ambient is left out")
        self.assert_told(
            "=ABSOLUTE_PRESSURE(99;1013)", "Err:502", "ambient 1013 bar is above 1.1 bar"
        )
        self.assert_told('=CONVERT_UNIT(100;"barg";"bar")', "#VALUE!", "ABSOLUTE_PRESSURE")

    def test_kelvin_fahrenheit_and_pascal_under_metric(self):
        self.assert_told(
            "=STEAM(10000000;813.15)", "Err:502", "pressure 10000000 bar is above 1000 bar"
        )
        self.assert_told("=STEAM(100;-459)", "Err:502", "temperature -459 °C is below 0 °C")
        self.assert_told(
            "=SATURATION_PRESSURE(453.15)", "Err:502", "temperature 453.15 °C is above 373.946 °C"
        )
        self.assert_told('=STEAM(100;27;;"si")', "Err:502", "temperature 27 K is below 273.15 K")

    def test_unit_set_in_the_wrong_place(self):
        # The commonest slip of all: the gap for the flow is forgotten.
        self.assert_told('=STEAM(1450;1004;"us")', "#VALUE!", 'flow "us"', "options")
        self.assert_told('=STEAM(100;540;;"imperial")', "#VALUE!", 'options "imperial"', '"us"')
        self.assert_told('=STEAM(100;540;;"bar")', "#VALUE!", 'options "bar"')

    def test_streams_and_numbers_mixed_up(self):
        self.assert_told(
            "=STEAM_ENTHALPY(STEAM(100;540);540)", "#VALUE!", "pressure", "a number is needed"
        )
        self.assert_told(
            "=ENTHALPY_OF(100)", "#VALUE!", "stream is a number where a stream is needed"
        )
        self.assert_told(
            "=TURBINE_OUT(100;0.05;0.88)", "#VALUE!", "inlet is a number where a stream"
        )
        self.assert_told(
            "=TURBINE_OUT(STEAM(100;540);STEAM(0.05;33);0.88)", "#VALUE!", "outlet pressure"
        )
        self.assert_told('=ENTHALPY_OF("steam at 100 bar")', "#VALUE!", "not the text of a stream")

    def test_separators(self):
        # A decimal comma in a point locale is a further argument.
        self.assert_told("=STEAM_ENTHALPY(100;540,5)", "#VALUE!", "options")
        self.assert_told("=CARNOT(540,5;30)", "#VALUE!", "options")
        self.assert_told('=STEAM("100,5";540)', "#VALUE!", 'pressure "100,5"')

    def test_bases_and_boundaries(self):
        self.assert_told(
            '=EFFICIENCY_ON_BASIS(0.38;"net";"gross";30;28)',
            "#VALUE!",
            'from basis "net"',
            "boundary",
        )
        self.assert_told(
            '=EFFICIENCY_ON_BASIS(0.38;"HHV";"LHV";28;30)',
            "Err:502",
            "lower heating value 30",
            "28",
        )
        self.assert_told("=EFFICIENCY_ON_BASIS(0.38)", "#N/A", "from basis is left out")
        self.assert_told("=NET_POWER(100;0)", "Err:502", "auxiliary power is zero or blank")

    def test_ends_swapped(self):
        self.assert_told(
            "=CARNOT(30;540)",
            "Err:502",
            "cold temperature 540 °C is not below the hot temperature 30 °C",
        )
        self.assert_told(
            "=TURBINE_OUT(STEAM(10;300);100;0.88)", "Err:502", "outlet pressure 100 bar", "10 bar"
        )
        self.assert_told("=PUMP_OUT(STEAM(100;540);120;0.8)", "Err:502", "inlet", "steam")
        self.assert_told("=STEAM(540;100000)", "Err:502", "temperature 100000 °C")

    def test_a_space_beside_a_stream(self):
        self.document.set("A1", "=STEAM(100;540)")
        for ends in ('A1&" "', '" "&A1', "A1&CHAR(10)"):
            self.assert_told(
                f"=ENTHALPY_OF({ends})", "#VALUE!", "a space or a line end before or after it"
            )

    def test_a_list_of_streams_instead_of_a_range(self):
        self.document.set_all({"A1": "=STEAM(100;540;5)", "A2": "=STEAM(10;300;3)"})
        self.assert_told(
            "=STREAM_TABLE(A1;A2)", "#VALUE!", 'options "steam 3 kg/s" is a stream', "one range"
        )
        self.assert_told("=STREAM_TABLE(A1;A2;A1)", "Err:504", "takes one range")
        self.assert_told("=STREAM_TABLE(A1:A2;A1:A2)", "#VALUE!", "second range where the options belong")
        self.assert_told("=MIX_OUT(A1;A2)", "Err:504", "takes one range")

    def test_flows_forgotten(self):
        self.assert_told(
            "=FLUID_POWER(STEAM(100;540);STEAM(10;300))",
            "#N/A",
            "inlet carries no flow",
            "SET_FLOW",
        )
        self.assert_told("=STEAM(100;540;0)", "Err:502", "flow is zero or blank")
        self.assert_told(
            "=FLUID_POWER(STEAM(100;540;5);STEAM(10;300;6))", "Err:502", "6 kg/s", "5 kg/s"
        )

    def test_units_misspelt(self):
        self.assert_told('=CONVERT_UNIT(100;"bar";"kW")', "#VALUE!", 'to "kW"')
        self.assert_told('=CONVERT_UNIT(100;"brr";"psi")', "#VALUE!", 'from "brr"')
        for unit, advice in {
            "C": '"°C"',
            "F": '"°F"',
            "kpa": '"kPa"',
            "BTU/LB": '"lb"',
            "kg/cm2": '"kgf/cm2"',
            "psi": '"psia" or "psig"',
        }.items():
            told = f'CONVERT_UNIT: from "{unit}" '
            self.assert_told(f'=CONVERT_UNIT(1;"{unit}";"bar")', "#VALUE!", told, "write", advice)
        self.assert_told('=PUBLISHED_SOURCE("STEEM")', "#VALUE!", "STEEM")
        self.assert_told('=WHY_CALL("STEEM";1)', "#VALUE!", "STEEM")

    def test_a_list_of_links_instead_of_a_range(self):
        self.assert_told("=EFFICIENCY_CHAIN(0.9;0.8)", "Err:504", "EFFICIENCY_CHAIN", "range")

    def test_names_misspelt(self):
        self.assert_told("=STEEM(100;540)", "#NAME?", "does not know")

    def test_a_fraction_that_came_out_too_high_is_no_percentage(self):
        self.document.set("B2", "=HEAT_RATE(1.05)")
        self.assertIn("efficiency 1.05 is above 1", self.why("B2"))
        self.assertNotIn("percentage", self.why("B2"))

    def test_a_slip_of_ten_in_a_heating_value(self):
        self.assert_told(
            '=EFFICIENCY_ON_BASIS(0.42;"HHV";"LHV";55;5)',
            "Err:502",
            "lower heating value does not go with the higher one",
            "4.62",
        )

    def test_impossible_measurements_are_computed_and_said(self):
        # The second law: Moran and Shapiro, 5th ed., section 6.8, isentropic efficiencies.
        self.document.set("B2", "=PUMP_EFFICIENCY(STEAM(1;30);STEAM(120;29))")
        self.assertGreater(self.document.value("B2"), 1)
        self.assertIn("the second law rules out", self.why("B2"))
        self.document.set("B3", "=TURBINE_EFFICIENCY(STEAM(100;540);STEAM_AT_DRYNESS(0.05;0.78))")
        self.assertGreater(self.document.value("B3"), 1)
        self.assertIn("the second law rules out", self.why("B3"))

    def test_why_of_no_cell(self):
        for formula in (
            "=WHY()",
            "=WHY(5)",
            "=WHY(STEAM(1;2))",
            '=WHY("A1")',
            "=WHY(A1:B2)",
            "=WHY(A1;A2)",
        ):
            with self.subTest(formula):
                self.document.set("B2", formula)
                self.assertTrue(self.document.error("B2") or "range" in self.document.text("B2"))
        self.assertTrue(self.office.alive())
