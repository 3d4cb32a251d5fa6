"""Every example of the catalogue as a cell: it shows what the function reference prints for it."""

import re

from catalogue import engine
from harness.case import SheetCase

NUMBER = re.compile(r"-?\d+(\.\d+)?$")


class Examples(SheetCase):
    def test_every_example_shows_its_answer(self):
        functions = engine(self.oxt).functions
        self.assertGreater(len(functions), 50)
        for function in functions:
            with self.subTest(function=function.name), self.office.new() as document:
                for address, content in function.given.items():
                    document.set(address, "=" + content)
                document.set("D9", "=" + function.example)
                self.assertEqual(document.error("D9"), "", function.example)
                if NUMBER.match(function.answer):
                    # Half a unit of the last digit that is printed.
                    decimals = len(function.answer.partition(".")[2])
                    self.assertAlmostEqual(
                        document.value("D9"),
                        float(function.answer),
                        delta=0.5000001 * 10.0**-decimals,
                        msg=function.example,
                    )
                else:
                    shown = document.text("D9")
                    self.assertTrue(
                        shown.startswith(function.answer), f"{function.example}: {shown}"
                    )

    def test_every_example_holds_its_function(self):
        # An example that does not call its function would prove nothing of it.
        for function in engine(self.oxt).functions:
            with self.subTest(function=function.name):
                self.assertIn(function.name + "(", function.example)
                self.assertEqual(bool(function.example_arguments()), bool(function.arguments))

    def test_the_c_interface_and_the_cell_give_the_same_bits(self):
        for name, arguments in (
            ("STEAM_ENTHALPY", (100, 540)),
            ("STEAM_VOLUME", (0.05, 500)),
            ("STEAM_TEMPERATURE_AT_ENTROPY", (30, 0.5)),
            ("CARNOT", (540, 30)),
            ("CURZON_AHLBORN", (565, 25)),
            ("CONVERT_UNIT", (1450, "psia", "bar")),
            ("STEAM", (100, 540, 55)),
        ):
            with self.subTest(function=name):
                cells = ";".join(f'"{a}"' if isinstance(a, str) else str(a) for a in arguments)
                self.document.set("A1", f"={name}({cells})")
                self.assertEqual(
                    self.document.content("A1"), engine(self.oxt).call(name, *arguments)
                )

    def test_why_answers_every_example(self):
        for function in engine(self.oxt).functions:
            with self.subTest(function=function.name), self.office.new() as document:
                for address, content in function.given.items():
                    document.set(address, "=" + content)
                document.set_all({"D9": "=" + function.example, "E9": "=WHY(D9)"})
                answer = document.text("E9")
                self.assertTrue(answer.startswith("D9: "), answer)
                if function.name == "WHY":
                    self.assertIn("holds the answer of WHY", answer)
                else:
                    self.assertIn(" works", answer)
                    self.assertNotIn("cannot take", answer)
