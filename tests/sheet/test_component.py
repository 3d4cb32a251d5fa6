"""The extension as Calc sees it: registration, calls, WHY on real cells, menu, files.

What a function computes is tested against published figures elsewhere; here the reason that WHY gives
for a cell is compared with what the engine itself says of the same call (WHY_CALL).
"""

import ctypes
import html
import os
import posixpath
import re
import tempfile
import unittest
import zipfile
import xml.etree.ElementTree as ElementTree

import uno
from com.sun.star.table import CellAddress

from harness.case import SheetCase
from harness.office import Office, file_url
from harness.profile import Profile

REGISTRY = "{http://openoffice.org/2001/registry}"


def registered(oxt):
    """{function: [(argument, description)]} as the extension registers them."""
    with zipfile.ZipFile(oxt) as archive:
        root = ElementTree.fromstring(archive.read("CalcAddIns.xcu"))
    found = {}
    for function in root.iter("node"):
        arguments = [n for n in function.findall("node") if n.get(REGISTRY + "name") == "Parameters"]
        if not arguments:
            continue
        found[function.get(REGISTRY + "name")] = [
            tuple(
                prop.find("value").text
                for prop in parameter.findall("prop")
                if prop.get(REGISTRY + "name") in ("DisplayName", "Description")
            )
            for parameter in arguments[0].findall("node")
        ]
    return found


class Registration(SheetCase):
    def test_every_function_is_in_the_wizard_with_its_arguments(self):
        wizard = self.office.functions()
        catalogue = registered(self.oxt)
        self.assertGreater(len(catalogue), 50)
        for name, arguments in catalogue.items():
            with self.subTest(function=name):
                self.assertIn(name, wizard)
                entry = wizard[name][0]
                self.assertTrue(entry["Description"])
                shown = [(a.Name, a.Description) for a in entry["Arguments"] or ()]
                self.assertEqual(shown, arguments)
                for argument, description in shown:
                    self.assertTrue(argument and description)
                    self.assertNotIn("###", argument + description)

    def test_no_name_is_taken_twice(self):
        # A name that Calc or another add-in has too would lose against it.
        wizard = self.office.functions()
        for name in registered(self.oxt):
            self.assertEqual(len(wizard[name]), 1, name)

    def test_optional_arguments_say_so(self):
        arguments = dict(registered(self.oxt)["STEAM"])
        self.assertTrue(arguments["options"].endswith("Optional."))
        self.assertTrue(arguments["pressure"].endswith("Required."))
        self.assertIn("bar", arguments["pressure"])

    def test_the_extension_is_described(self):
        with zipfile.ZipFile(self.oxt) as archive:
            names = archive.namelist()
            description = archive.read("description.xml").decode()
        self.assertEqual(names, sorted(names), "entries are sorted")
        for needed in ("LICENSE", "icon.png", "help/index.html", "licenses/Boost.txt"):
            self.assertIn(needed, names)
        self.assertIn('LibreOffice-minimal-version value="7.4"', description)

    def test_every_function_has_a_help_page(self):
        with zipfile.ZipFile(self.oxt) as archive:
            names = archive.namelist()
            index = archive.read("help/index.html").decode()
        for name in registered(self.oxt):
            self.assertIn(f"help/functions/{name}.html", names)
            self.assertIn(f"functions/{name}.html", index)


class HelpPages(SheetCase):
    """The page of the help that is written by hand."""

    PAGE = "help/working-in-a-sheet.html"

    def read(self, name):
        with zipfile.ZipFile(self.oxt) as archive:
            return archive.read(name).decode()

    def formulas(self):
        """Every formula that the page shows, as a user would type it."""
        found = re.findall(r"<(?:code|pre)>(=.*?)</(?:code|pre)>", self.read(self.PAGE))
        return [html.unescape(formula) for formula in found]

    def test_the_index_and_every_function_lead_to_it(self):
        self.assertIn('href="working-in-a-sheet.html"', self.read("help/index.html"))
        for name in registered(self.oxt):
            page = self.read(f"help/functions/{name}.html")
            self.assertIn('href="../working-in-a-sheet.html"', page, name)

    def test_every_link_leads_somewhere(self):
        with zipfile.ZipFile(self.oxt) as archive:
            pages = [n for n in archive.namelist() if n.startswith("help/") and n.endswith(".html")]
        texts = {name: self.read(name) for name in pages}
        links = 0
        for name, text in texts.items():
            for link in re.findall(r'href="([^"]*\.html[^"]*|#[^"]*)"', text):
                target, _, place = link.partition("#")
                path = posixpath.normpath(posixpath.join(posixpath.dirname(name), target))
                self.assertIn(path if target else name, texts, f"{name}: {link}")
                if place:
                    self.assertIn(f'id="{place}"', texts[path if target else name], f"{name}: {link}")
                links += 1
        self.assertGreater(links, 100)

    def test_it_is_well_formed_and_says_what_it_must(self):
        page = self.read(self.PAGE)
        # HTML that an XML parser takes too has every tag closed.
        body = re.sub(r'<meta [^>]*>|<link [^>]*>|<!DOCTYPE[^>]*>', "", page).replace("&nbsp;", " ")
        ElementTree.fromstring(body)
        self.assertNotIn("{{", page)
        self.assertNotIn("<!--", page)
        for words in ("SUM gives 0", "Err:504", "first element", "safety device", "1000 steps"):
            self.assertIn(words, page)

    def test_its_formulas_are_ones_that_calc_reads(self):
        formulas = self.formulas()
        self.assertGreater(len(formulas), 20)
        self.document.fill("A1", [(100.0, 540.0)] * 9)
        for formula in formulas:
            with self.subTest(formula):
                self.document.set("H20", formula)
                self.document.text("H20")
                # Cells hold numbers where some formulas want streams: that is #VALUE!, no more.
                self.assertIn(self.document.error("H20"), ("", "#VALUE!", "#N/A", "Err:502"))

    def test_its_stream_is_the_one_that_calc_shows(self):
        self.document.set("A1", "=STEAM(100; 540; 55)")
        self.assertIn("<pre>" + self.document.text("A1") + "</pre>", self.read(self.PAGE))

    def test_its_circle_settles(self):
        circle = next(f for f in self.formulas() if f.startswith("=IFERROR(STEAM("))
        self.document.model.IsIterationEnabled = True
        self.document.model.IterationCount = 1000
        self.document.set_all(
            {
                "A1": "=STEAM(10;25;3)",
                "A3": "=MIX_OUT(A1:A2)",
                "A4": "=STEAM(10;TEMPERATURE_OF(A3)+10;FLOW_OF(A3))",
                "A2": circle,
                "B1": "=FLOW_OF(A4)",
            }
        )
        self.document.recalculate()
        # Half of what leaves returns: 3/(1 - 0.5) kg/s by the balance of mass.
        self.assertAlmostEqual(self.document.value("B1"), 6.0, delta=2e-6)

    def test_what_it_says_of_calc_is_so(self):
        self.document.set_all({"A2": "=STEAM(100;540;5)", "A3": "=STEAM(10;300;3)"})
        self.document.set_all({"A4": "=STEAM(1;200;2)", "B1": "=SUM(A2:A4)"})
        self.document.set_array("B2", "=SUM(FLOW_OF(A2:A4))")
        self.assertEqual(self.document.value("B1"), 0)
        self.assert_error("B1", "")
        self.assertEqual(self.document.value("B2"), 10)
        path = self.path("other.ods")
        self.document.save(path)
        there = f"'{file_url(path)}'#$Sheet1."
        with self.office.new() as reader:
            reader.set_all(
                {
                    "A1": f"=FLOW_OF({there}A2)",
                    "A2": f'=FLOW_OF({there}A2&"")',
                    "A3": f"=STEAM_ENTHALPY({there}B2+0;540)",
                }
            )
            self.assertEqual(reader.error("A1"), "Err:504")
            self.assertEqual(reader.value("A2"), 5)
            reader.set("A4", "=STEAM_ENTHALPY(10;540)")
            self.assertEqual(reader.value("A3"), reader.value("A4"))


class Calls(SheetCase):
    def test_numbers_and_streams(self):
        self.document.set_all({"A1": 100, "A2": 540, "B1": "=STEAM(A1;A2)"})
        self.document.set_all({"B2": "=ENTHALPY_OF(B1)", "B3": "=STEAM_ENTHALPY(A1;A2)"})
        self.assertTrue(self.document.text("B1").startswith("steam 100 bar, 540 °C ["))
        self.assertEqual(self.document.value("B2"), self.document.value("B3"))

    def test_omitted_arguments(self):
        self.document.set_all({"A1": "=STEAM(100;540;;)", "A2": "=STEAM(100;540)"})
        self.assertEqual(self.document.text("A1"), self.document.text("A2"))
        self.document.set("A3", '=STEAM(14.5;1000;;"us")')
        self.assertIn("psia", self.document.text("A3"))

    def test_errors_are_calc_errors(self):
        self.document.set_all(
            {
                "A1": "=STEAM_ENTHALPY(100;5000)",
                "A2": '=STEAM_ENTHALPY("high";540)',
                "A3": '=STEAM_ENTHALPY("";540)',
                "A4": "=STEAM_ENTHALPY(100)",
                "A5": "=STEAM_ENTHALPY(Z9;540)",
                "A6": "=SUM(A1;1)",
            }
        )
        for cell, shown in {
            "A1": "Err:502",
            "A2": "#VALUE!",
            "A3": "#N/A",
            "A4": "#N/A",
            "A5": "Err:502",
            "A6": "Err:502",
        }.items():
            self.assert_error(cell, shown)

    def test_a_range_gives_a_table(self):
        rows = [(100.0, 540.0), (50.0, 400.0), (10.0, 200.0)]
        self.document.fill("A1", rows)
        self.document.set_array("C1:C3", "=STEAM_ENTHALPY(A1:A3;B1:B3)")
        for row, (pressure, temperature) in enumerate(rows, 1):
            self.document.set("D1", f"=STEAM_ENTHALPY({pressure};{temperature})")
            self.assertEqual(self.document.value(f"C{row}"), self.document.value("D1"))

    def test_errors_and_texts_inside_a_table(self):
        self.document.fill("A1", [(100.0,), (-5.0,), ("",), ("x",)])
        self.document.set_array("B1:B4", "=STEAM_ENTHALPY(A1:A4;540)")
        self.document.set_array("C1:C4", "=STEAM(A1:A4;540)")
        for column in "BC":
            shown = [self.document.error(f"{column}{row}") for row in range(1, 5)]
            self.assertEqual(shown, ["", "Err:502", "#N/A", "#VALUE!"])

    def test_a_labelled_table(self):
        self.document.set_all({"A1": '=TAGGED(STEAM(100;540);"HP")', "A2": "=STEAM(10;300;5)"})
        self.document.set_array("C1:J3", "=STREAM_TABLE(A1:A2)")
        self.assertEqual(self.document.text("C2"), "HP")
        self.assertEqual(self.document.error("C3"), "")
        self.assertEqual(self.document.value("D3"), 5)

    def test_texts_outside_the_basic_plane_and_lone_surrogates(self):
        self.document.set("A1", '=TAGGED(STEAM(100;540);"LBA\u2082\U0001f525")')
        self.assertTrue(self.document.text("A1").startswith("LBA\u2082\U0001f525: steam"))
        # The first and last letters that one byte each would hold, and the first beyond.
        for tag in ("\u00a1\u00ff", "\u00ff\u0100", "K\u00fchler " + "\u00e9" * 14):
            self.document.set("A1", f'=TAGGED(STEAM(100;540);"{tag}")')
            self.assertTrue(self.document.text("A1").startswith(f"{tag}: steam"))
            self.document.set("B1", "=INDEX(STREAM_TABLE(A1);2;1)")
            self.assertEqual(self.document.text("B1"), tag)
        self.document.set("A2", '=TAGGED(STEAM(100;540);LEFT("\U0001f525";1))')
        self.document.text("A2")
        self.assertTrue(self.office.alive())

    def test_from_a_macro(self):
        enthalpy = self.office.call("STEAM_ENTHALPY", 100.0, 540.0)
        self.document.set("A1", "=STEAM_ENTHALPY(100;540)")
        self.assertEqual(enthalpy, self.document.value("A1"))


class Why(SheetCase):
    """(a) to (g): what WHY says, on cells of every kind."""

    def engine_says(self, function, *arguments):
        """The engine's own words about a call with these cells and literals."""
        given = "".join(f";{a}" for a in arguments)
        self.document.set("AMA999", f'=WHY_CALL("{function}"{given})')
        text = self.document.text("AMA999")
        self.document.set("AMA999", None)
        return text if text.endswith(".") else text + "."

    def assert_why(self, address, expected):
        self.assertEqual(self.why(address), expected)

    def test_own_call_that_fails(self):
        self.document.set_all({"A1": 100, "A2": 5000, "B7": "=STEAM(A1;A2)"})
        self.assert_why("B7", "B7: " + self.engine_says("STEAM", "A1", "A2"))
        self.assertIn("temperature", self.why("B7"))

    def test_own_call_that_works(self):
        self.document.set_all({"A1": 100, "A2": 540, "B7": "=STEAM_ENTHALPY(A1;A2)"})
        self.assert_why("B7", "B7: " + self.engine_says("STEAM_ENTHALPY", "A1", "A2"))
        self.assertIn("IAPWS", self.why("B7"))

    def test_units_of_the_call(self):
        self.document.set_all({"B7": '=STEAM_ENTHALPY(1000;5000;"us")'})
        self.assertIn("°F", self.why("B7"))

    def test_nested_call_is_named(self):
        self.document.set_all({"B7": "=ENTHALPY_OF(TURBINE_OUT(STEAM(100;540);0.05;1.5))"})
        self.document.set("A1", "=STEAM(100;540)")
        self.assert_why("B7", "B7: " + self.engine_says("TURBINE_OUT", "A1", "0.05", "1.5"))

    def test_operators_and_precedence(self):
        # -2^2 is 4 in Calc, and a sign binds closer than %.
        self.document.set_all({"A1": 3, "B7": "=STEAM((-2^2+A1*2-50%)*-1;540)"})
        self.assert_why("B7", "B7: " + self.engine_says("STEAM", "-9.5", "540"))

    def test_calc_functions_inside(self):
        self.document.fill("A1", [(400.0,), (500.0,), (600.0,)])
        self.document.set("B7", "=STEAM(SUM(A1:A3);MAX(A1:A3))")
        self.assert_why("B7", "B7: " + self.engine_says("STEAM", "1500", "600"))

    def test_conditions_take_one_branch(self):
        self.document.set("A1", 2)
        self.document.set("B7", "=IF(A1>1;STEAM(2000;1);STEAM(3000;1))")
        self.assert_why("B7", "B7: " + self.engine_says("STEAM", "2000", "1"))
        self.document.set("B8", "=CHOOSE(A1;STEAM(2000;1);STEAM(3000;1))")
        self.assert_why("B8", "B8: " + self.engine_says("STEAM", "3000", "1"))
        self.document.set("B9", "=IFS(A1=1;STEAM(2000;1);A1=2;STEAM(4000;1))")
        self.assert_why("B9", "B9: " + self.engine_says("STEAM", "4000", "1"))
        self.document.set("B10", '=SWITCH(A1;1;STEAM(2000;1);2;STEAM(5000;1);"")')
        self.assert_why("B10", "B10: " + self.engine_says("STEAM", "5000", "1"))

    def test_a_hidden_error_is_told(self):
        self.document.set("B7", '=IFERROR(STEAM(2000;1);"no")')
        answer = self.why("B7")
        self.assertIn("hides", answer)
        self.assertIn(self.engine_says("STEAM", "2000", "1"), answer)
        self.document.set_all({"A1": "=STEAM(2000;1)", "B8": "=IF(ISERROR(A1);0;1)"})
        self.assertTrue(self.why("B8").startswith("B8 hides the error of A1: STEAM"))

    def test_fallback_of_iferror_that_fails_too(self):
        self.document.set("B7", "=IFERROR(STEAM(2000;1);STEAM(3000;1))")
        self.assert_why("B7", "B7: " + self.engine_says("STEAM", "3000", "1"))

    def test_inline_array(self):
        self.document.set("B7", "=EFFICIENCY_CHAIN({0.9;7;0.8})")
        answer = self.why("B7")
        self.assertTrue(answer.startswith("B7: EFFICIENCY_CHAIN"), answer)
        self.assertIn("7", answer)

    def test_error_is_followed_to_the_first_failing_cell(self):
        self.document.add_sheet("Stages")
        self.document.set_all({"Stages.C4": "=STEAM(2000;540)", "A1": "=Stages.C4"})
        self.document.set_all({"A2": "=ENTHALPY_OF(A1)", "B7": "=A2*2"})
        reason = self.engine_says("STEAM", "2000", "540")
        self.assert_why("B7", "B7 passes on the error of Stages.C4: " + reason)
        self.assert_why("Stages.C4", "C4: " + reason)

    def test_sheet_names_with_spaces_and_quotes(self):
        self.document.add_sheet("Bob's data")
        self.document.set_all({"'Bob''s data'.A1": "=STEAM(2000;1)", "B7": "='Bob''s data'.A1"})
        self.assertTrue(self.why("B7").startswith("B7 passes on the error of 'Bob''s data'.A1: STEAM"))

    def test_error_inside_a_range(self):
        self.document.set_all({"A1": 0.9, "A2": "=STEAM_ENTHALPY(2000;1)", "A3": 0.8})
        self.document.set_all({"B7": "=EFFICIENCY_CHAIN(A1:A3)", "B8": "=SUM(A1:A3)"})
        self.assert_error("B7", "Err:504")
        reason = self.engine_says("STEAM_ENTHALPY", "2000", "1")
        self.assertTrue(self.why("B7").startswith("B7 passes on the error of A2: " + reason))
        self.assertIn("Err:504", self.why("B7"))
        self.assert_why("B8", "B8 passes on the error of A2: " + reason)

    def test_long_chain_and_depth_cap(self):
        self.document.set("A1", "=STEAM(2000;1)")
        self.document.set("A2", "=A1")
        self.document.fill_down("A2:A200")
        self.assertTrue(self.why("A50").startswith("A50 passes on the error of A1: STEAM"))
        self.assertIn("ask WHY about this one", self.why("A200"))

    def test_named_ranges_of_document_and_sheet(self):
        names = self.document.model.NamedRanges
        here = CellAddress(0, 0, 0)
        names.addNewByName("live_pressure", "$Sheet1.$A$1", here, 0)
        names.addNewByName("left_of_me", "Sheet1.A1", CellAddress(0, 1, 0), 0)
        names.addNewByName("unit_set", '"us"', here, 0)
        self.document.sheet().NamedRanges.addNewByName("hot", "$Sheet1.$A$2", here, 0)
        self.document.set_all({"A1": 2000, "A2": 540, "B2": "=STEAM(live_pressure;hot)"})
        self.assert_why("B2", "B2: " + self.engine_says("STEAM", "A1", "A2"))
        self.document.set("B1", "=STEAM(left_of_me;hot)")
        self.assert_why("B1", "B1: " + self.engine_says("STEAM", "A1", "A2"))
        self.document.set("B3", "=STEAM_ENTHALPY(100000;1;unit_set)")
        self.assertIn("psia", self.why("B3"))

    def test_a_name_for_a_failing_cell(self):
        self.document.model.NamedRanges.addNewByName("bad", "$Sheet1.$A$1", CellAddress(0, 0, 0), 0)
        self.document.set_all({"A1": "=STEAM(2000;1)", "B7": "=bad&bad"})
        self.assertTrue(self.why("B7").startswith("B7 passes on the error of A1: STEAM"))

    def test_element_of_an_array_formula(self):
        self.document.fill("A1", [(100.0,), (2000.0,), (3000.0,)])
        self.document.set_array("B1:B3", "=STEAM_ENTHALPY(A1:A3;540)")
        self.assert_why("B1", "B1: " + self.engine_says("STEAM_ENTHALPY", "100", "540"))
        self.assert_why("B3", "B3: " + self.engine_says("STEAM_ENTHALPY", "3000", "540"))
        self.document.set_array("C1:C3", "=STEAM_ENTHALPY(A1:A3;540)*2+A1:A3")
        self.assert_why("C2", "C2: " + self.engine_says("STEAM_ENTHALPY", "2000", "540"))

    def test_array_formula_beyond_its_result(self):
        self.document.fill("A1", [(100.0,), (50.0,)])
        self.document.set_array("B1:B3", "=STEAM_ENTHALPY(A1:A2;540)")
        self.assert_error("B3", "#N/A")
        self.assertIn("more cells than its result", self.why("B3"))

    def test_a_blank_in_a_range_is_missing(self):
        self.document.fill("A1", [(100.0,), ("",)])
        self.document.set_array("B1:B2", "=STEAM_ENTHALPY(A1:A2;540)")
        self.assertTrue(self.why("B2").startswith("B2: STEAM_ENTHALPY: pressure is"), self.why("B2"))

    def test_blank_cells_are_named(self):
        self.document.set("B7", "=STEAM(C3;540)")
        answer = self.why("B7")
        self.assertTrue(answer.endswith(" C3 is blank, which Calc hands over as 0."), answer)
        self.document.add_sheet("Site")
        self.document.set("B8", "=STEAM(C3*2+Site.A1;540)")
        self.assertIn("C3 and Site.A1 are blank", self.why("B8"))
        self.assertIn("blank", self.why("C3"))

    def test_errors_of_calc_itself(self):
        self.document.set_all({"A1": "=1/0", "A2": "=SQRT(-1)", "A3": "=A3+1", "A4": "=NOSUCH(1)"})
        self.assertIn("#DIV/0! comes from Calc's own part of the formula =1/0", self.why("A1"))
        self.assertIn("SQRT", self.why("A2"))
        self.assertIn("refers to itself", self.why("A3"))
        self.assertIn("does not know", self.why("A4"))
        self.document.set("B1", "=STEAM(A1;540)")
        self.assertTrue(self.why("B1").startswith("B1 passes on the error of A1: #DIV/0!"))
        self.document.set("B2", "=STEAM(1/0;540)")
        self.assertIn("#DIV/0!", self.why("B2"))

    def test_typed_cells(self):
        self.document.set_all({"A1": 12.5, "A2": "hello", "A3": "=STEAM(100;540)"})
        self.assertIn("a number that was typed in", self.why("A1"))
        self.assertIn("a text that was typed in", self.why("A2"))
        stream = self.document.text("A3")
        self.document.set("A4", stream)
        self.assertIn("stream", self.why("A4"))
        self.assertIn("IAPWS", self.why("A4"))
        self.document.set("A5", stream.replace("540 °C", "450 °C"))
        self.assertIn("edited", self.why("A5"))

    def test_what_calc_hands_to_no_add_in(self):
        self.document.set("B7", "=STEAM_ENTHALPY(A1~A2;540)")
        self.assertIn("~", self.why("B7"))
        path = self.path("other.ods")
        self.document.save(path)
        self.document.set("B8", f"=STEAM_ENTHALPY('{file_url(path)}'#$Sheet1.A1;540)")
        self.assertIn("another file", self.why("B8"))

    def test_what_cannot_be_taken_apart_is_said(self):
        self.document.set_all({"A1": 2000, "B7": "=STEAM(OFFSET(A1;0;0);540)"})
        answer = self.why("B7")
        self.assertIn("cannot take its formula apart", answer)
        self.assertIn("OFFSET", answer)
        self.document.set("B8", "=STEAM(" + "(" * 100 + "2000" + ")" * 100 + ";540)")
        self.assertIn("WHY", self.why("B8"))

    def test_a_plain_link_into_another_file(self):
        path = self.path("other.ods")
        with self.office.new() as other:
            other.set_all({"A1": 100, "B1": "=STEAM(100;540)", "C1": "=1/0"})
            other.save(path)
        there = f"='{file_url(path)}'#$Sheet1."
        self.document.set("B1", there + "A1")
        self.assert_why("B1", "B1: the cell shows a value of another file.")
        self.document.set("B2", there + "B1")
        self.assertTrue(self.why("B2").startswith("B2: the cell shows a value of another file. "))
        self.assertIn("IAPWS", self.why("B2"))
        self.document.set("B3", there + "C1")
        self.assertIn("which holds #DIV/0!: open that file", self.why("B3"))
        self.document.set("B4", f"='{file_url(path)}x'#$Sheet1.A1")
        self.assertIn("does not find the file", self.why("B4"))
        for row in range(1, 5):
            self.assertNotIn("cell of its own", self.why(f"B{row}"))
        # Inside a call that advice helps.
        self.document.set_all({"C1": there[0] + "STEAM(" + there[1:] + "A1+0;5400)"})
        self.assert_error("C1", "Err:502")
        self.assertIn("cell of its own", self.why("C1"))

    def test_why_of_the_name_of_a_cell(self):
        self.document.add_sheet("Stages")
        for formula, advice in {
            '=WHY("H1")': "write =WHY(H1), without quotation marks.",
            '=WHY("Stages.C4")': "write =WHY(Stages.C4), without quotation marks.",
            '=WHY("what")': "takes one cell by reference",
            "=WHY(5)": "takes one cell by reference",
            "=WHY()": "takes one cell by reference",
            "=WHY(A1;A2)": "takes one cell by reference",
        }.items():
            with self.subTest(formula):
                self.document.set("B7", formula)
                self.assert_error("B7", "Err:504")
                self.assertTrue(self.why("B7").startswith("B7: WHY takes one cell"), self.why("B7"))
                self.assertIn(advice, self.why("B7"))

    def test_names_that_calc_does_not_know(self):
        self.document.set("B7", "=STEAM(100;540;;us)")
        self.assertIn('does not know (#NAME?): us. A word', self.why("B7"))
        self.assertIn('stands in quotation marks: "us".', self.why("B7"))
        self.document.set("B8", "=STEAM(100;540;;'us')")
        self.assertIn('stands in quotation marks: "us".', self.why("B8"))
        self.document.set("B9", "=STEEM(100;540)")
        self.assertIn("extension that brings it is not installed", self.why("B9"))
        self.assertNotIn("quotation", self.why("B9"))
        # The cell behind passes it on.
        self.document.set("C1", "=B7*2")
        self.assertTrue(self.why("C1").startswith("C1 passes on the error of B7: the formula holds"))

    def test_units_typed_into_a_formula(self):
        for formula, shown, cause in (
            ("=STEAM(100;540 °C)", "Err:501", "illegal character"),
            ("=STEAM(100;540°C)", "Err:501", "illegal character"),
            ("=STEAM(100 bar;540)", "Err:508", "such as a unit"),
            ("=5 bar", "Err:509", "without an operator"),
        ):
            with self.subTest(formula):
                self.document.set_all({"B7": formula, "C1": "=B7*2"})
                self.assert_error("B7", shown)
                self.assertIn(f"B7: Calc cannot read the formula ({shown}): ", self.why("B7"))
                self.assertIn(cause, self.why("B7"))
                self.assertIn("Units are not typed into formulas", self.why("B7"))
                self.assertTrue(self.why("C1").startswith("C1 passes on the error of B7: Calc cannot"))
        self.document.set("B8", "=100+*3")
        self.assertIn("waits for a value", self.why("B8"))

    def test_a_circle_is_named_with_its_way_and_its_cure(self):
        self.document.set_all(
            {
                "A1": "=A1+1",
                "B1": "=B2+1",
                "B2": "=B1+1",
                "B3": "=B2*2",
                "B4": "=EFFICIENCY_CHAIN(B1:B2)",
                # IFERROR takes Calc's error away: some of these cells show a value.
                "C1": "=STEAM(10;25;3)",
                "C2": "=IFERROR(SPLIT_OUT(C4;0.5);STEAM(10;80;5))",
                "C3": "=MIX_OUT(C1:C2)",
                "C4": "=SET_FLOW(C3;5)",
            }
        )
        for cell, expected in {
            "A1": "A1: the formula refers to itself, a circle, ",
            "B1": "B1: the formula refers to itself through B2, a circle, ",
            "B3": "B3 passes on the error of B2: the formula refers to itself through B1, a circle, ",
            "B4": "B4 passes on the error of B1: the formula refers to itself through B2, a circle, ",
            "C2": "C2: the cell shows a value that may be a start value: the formula refers to itself "
            "through C4 and C3, a circle, ",
        }.items():
            with self.subTest(cell):
                answer = self.why(cell)
                self.assertTrue(answer.startswith(expected), answer)
                self.assertIn("iterations are off (Err:522)", answer)
                self.assertIn("Calculate > Iterations, with 1000 steps", answer)
                self.assertIn("=IFERROR(STEAM(10; ROUND(", answer)
        for cell in ("C3", "C4"):
            self.assertIn("the formula refers to itself through C", self.why(cell))
        self.document.model.IsIterationEnabled = True
        self.document.recalculate()
        self.assertTrue(self.why("C4").startswith("C4: SET_FLOW works."))
        self.assert_error("B1", "Err:523")
        self.assertIn("through B2, and Calc's iterations do not settle (Err:523)", self.why("B1"))

    def test_a_long_circle_names_some_of_its_cells(self):
        self.document.set_all({"A1": "=A300", "A2": "=A1"})
        self.document.fill_down("A2:A300")
        answer = self.why("A1")
        self.assertIn("A1: the formula refers to itself through A300, A299, A298 and 296 other", answer)

    def test_deleted_reference(self):
        self.document.set_all({"A1": 100, "D1": "=STEAM(A1;540)"})
        self.document.sheet().Columns.removeByIndex(0, 1)
        self.assertIn("deleted", self.why("C1"))

    def test_index_reads_one_cell(self):
        self.document.set_all({"A1": 100, "A2": "=STEAM(2000;1)", "A3": 2000})
        self.document.set("B7", "=STEAM(INDEX(A1:A3;3);540)")
        self.assert_why("B7", "B7: " + self.engine_says("STEAM", "2000", "540"))
        self.document.set("B8", "=STEAM(INDEX(A1:A3;2);540)")
        self.assertTrue(self.why("B8").startswith("B8 passes on the error of A2: STEAM"))

    def test_lookup(self):
        self.document.fill("A1", [("a", 100.0), ("b", 2000.0)])
        self.document.set("B7", '=STEAM(VLOOKUP("b";A1:B2;2;0);540)')
        self.assert_why("B7", "B7: " + self.engine_says("STEAM", "2000", "540"))

    def test_too_few_and_too_many_arguments(self):
        self.document.set_all({"B7": "=STEAM(100)", "B8": "=STEAM(100;540;5;\"metric\";1)"})
        self.assertIn("temperature", self.why("B7"))
        self.assertTrue(self.why("B8").startswith("B8: STEAM"))

    def test_a_cell_that_only_repeats_another(self):
        self.document.set_all({"A1": "=STEAM(100;540)", "B7": "=A1"})
        self.assertTrue(self.why("B7").startswith("B7 repeats A1: STEAM"))

    def test_a_range_is_refused(self):
        self.document.set("B7", "=WHY(A1:A3)")
        self.assertIn("A1:A3 is a range", self.document.text("B7"))

    def test_a_tag_is_named(self):
        self.document.set("A1", '=TAGGED(STEAM(100;540);"LBA10CP001")')
        self.document.set("B7", "=TEMPERATURE_OF(A1)")
        self.assertIn("LBA10CP001", self.why("B7"))

    def test_it_follows_a_change(self):
        self.document.set_all({"A1": 2000, "B7": "=STEAM(A1;540)", "C7": "=WHY(B7)"})
        self.assertIn("above", self.document.text("C7"))
        self.document.set("A1", 100)
        self.assertIn("works", self.document.text("C7"))

    def test_huge_text_and_huge_range(self):
        self.document.set("A1", "x" * 200000)
        self.document.set("B7", "=STEAM(A1;540)")
        self.assert_error("B7", "#VALUE!")
        self.assertLess(len(self.why("B7")), 4100)
        self.document.set("B8", "=EFFICIENCY_CHAIN(D:D)")
        self.assert_error("B8", "#N/A")
        self.assertTrue(self.why("B8").startswith("B8: EFFICIENCY_CHAIN"), self.why("B8"))

    def test_a_range_beyond_the_cells_in_use(self):
        self.document.set("B8", "=EFFICIENCY_CHAIN(C1:C9)")
        self.assertTrue(self.why("B8").startswith("B8: EFFICIENCY_CHAIN"), self.why("B8"))

    def test_many_operands(self):
        self.document.set("B7", "=STEAM(2000" + "+0" * 2000 + ";540)")
        self.assertIn("too long", self.why("B7"))


class MenuCommands(SheetCase):
    def run_command(self, name, **arguments):
        return self.document.dispatch("busbar.calc.menu:" + name, **arguments).Result

    def test_explain(self):
        self.document.set("B7", "=STEAM(2000;540)").select("B7")
        self.assertEqual(self.run_command("explain", Quiet=True), self.why("B7"))
        # With its window: a headless office closes it at once.
        self.assertEqual(self.run_command("explain"), self.why("B7"))

    def test_explain_while_a_range_is_selected(self):
        self.document.set("B7", "=STEAM(2000;540)").select("B7:D9")
        self.assertEqual(self.run_command("explain", Quiet=True), self.why("B7"))

    def test_help_opens_the_page_of_the_function(self):
        self.document.set("B7", "=2*ENTHALPY_OF(STEAM(100;540))").select("B7")
        page = self.run_command("help", Quiet=True)
        self.assertTrue(page.endswith("/help/functions/ENTHALPY_OF.html"), page)
        self.assertTrue(os.path.isfile(uno.fileUrlToSystemPath(page)))
        self.document.select("A1")
        self.assertTrue(self.run_command("help", Quiet=True).endswith("/help/index.html"))

    def test_about(self):
        text = self.run_command("about", Quiet=True)
        self.assertIn("Busbar", text)
        self.assertIn("safety device", text)
        self.run_command("about")

    def test_unknown_command(self):
        self.assertEqual(self.run_command("nonsense", Quiet=True), "")


class AnotherEngine(unittest.TestCase):
    """A component that was built for another catalogue than the engine beside it has."""

    def test_nothing_is_computed_and_why_says_so(self):
        if SheetCase.oxt is None:
            self.skipTest("start these tests with tests/sheet/harness/run.py")
        with tempfile.TemporaryDirectory(prefix="busbar-sheet-") as folder:
            changed = self.with_another_fingerprint(folder)
            with Profile() as profile:
                profile.with_extension(changed)
                with Office(profile.folder) as office, office.new() as document:
                    document.set_all({"A1": "=STEAM(100;540)", "A2": "=WHY(A1)"})
                    self.assertEqual(document.error("A1"), "#VALUE!")
                    self.assertIn("was built for engine version", document.text("A2"))

    @staticmethod
    def with_another_fingerprint(folder):
        """The extension with one bit of the component's fingerprint turned over."""
        changed = os.path.join(folder, "changed.oxt")
        with zipfile.ZipFile(SheetCase.oxt) as archive:
            engine_name = next(n for n in archive.namelist() if n.startswith("libbusbar.so"))
            engine = ctypes.CDLL(archive.extract(engine_name, folder))
            engine.busbar_catalogue_fingerprint.restype = ctypes.c_uint64
            fingerprint = engine.busbar_catalogue_fingerprint()
            component = archive.read("busbar.uno.so")
            known = fingerprint.to_bytes(8, "little")
            assert component.count(known) == 1, "the fingerprint is in the component once"
            component = component.replace(known, (fingerprint ^ 1).to_bytes(8, "little"))
            with zipfile.ZipFile(changed, "w") as out:
                for name in archive.namelist():
                    out.writestr(name, component if name == "busbar.uno.so" else archive.read(name))
        return changed


class Files(SheetCase):
    def test_round_trip(self):
        for suffix in (".ods", ".xlsx"):
            with self.subTest(suffix):
                self.document.set_all({"A1": 100, "B1": "=STEAM(A1;540)", "B2": "=WHY(B1)"})
                self.document.set_array("C1:C2", "=STEAM_ENTHALPY(A1;{500;540})")
                before = [self.document.content(a) for a in ("B1", "B2", "C1", "C2")]
                path = self.path("book" + suffix)
                self.document.save(path)
                with self.office.load(path) as again:
                    again.recalculate()
                    self.assertEqual(again.cell("B1").Formula, "=BUSBAR.STEAM(A1;540)")
                    after = [again.content(a) for a in ("B1", "B2", "C1", "C2")]
                self.assertEqual(after, before)


if __name__ == "__main__":
    unittest.main()
