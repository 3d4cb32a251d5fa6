"""The engine's catalogue, read from the library inside the extension under test.

Only the part of engine/abi/busbar.h that the sheet tests need: names, arguments, examples, and
calls whose results the cells are compared with.
"""

import ctypes
import dataclasses
import functools
import os
import re
import tempfile
import zipfile

NUMBER, STREAM, WORD, NUMBERS, STREAMS, CELL, REST, OPTIONS, COMPOSITION = range(9)  # BUSBAR_ARGUMENT_...
BLANK_CELL, NUMBER_CELL, TEXT_CELL, LOGICAL_CELL, ERROR_CELL = range(5)  # what a cell holds
NAME, CHAPTER, SUMMARY, NOTES, SOURCE, EXAMPLE, GIVEN, ANSWER, SINCE, RESULT = range(10)

# BUSBAR_ERROR_... and what Calc shows for it, as the header has it.
SHOWN = {1: "#N/A", 2: "#VALUE!", 3: "Err:502", 4: "Err:523", 5: "#VALUE!"}


@dataclasses.dataclass(frozen=True)
class Argument:
    name: str
    kind: int
    optional: bool
    ranges: dict  # unit set -> "bar, above 0, up to 1000"

    def limit_texts(self, unit_set="metric"):
        """(low, high, unit) as the catalogue prints them, "" where there is no limit."""
        unit, _, text = self.ranges[unit_set].partition(", ")
        if re.match(r"above |from |up to |-?\d", unit):  # a plain number has no unit before its range
            unit, text = "", self.ranges[unit_set]
        low = re.match(r"(?:above |from )?(-?[\d.]+)", text)
        high = re.search(r"to (-?[\d.]+)$", text)
        return (
            low[1] if low else "",
            high[1] if high else "",
            "" if unit in ("fraction", "any unit") else unit,
        )

    def limits(self, unit_set="metric"):
        """(low, high, low itself is allowed) of a number; infinities where there is no limit."""
        low, high, _ = self.limit_texts(unit_set)
        return float(low or "-inf"), float(high or "inf"), not re.search(r"(^|, )above ", self.ranges[unit_set])

    def takes(self, number, unit_set="metric"):
        low, high, closed = self.limits(unit_set)
        return (low <= number if closed else low < number) and number <= high


@dataclasses.dataclass(frozen=True)
class Function:
    name: str
    example: str
    given: dict  # address -> content without the equals sign
    answer: str
    source: str
    arguments: tuple

    @property
    def has_options(self):
        return bool(self.arguments) and self.arguments[-1].kind == OPTIONS

    def example_arguments(self):
        """The arguments of this function's own call in its example, as formula texts."""
        at = self.example.index(self.name + "(") + len(self.name) + 1
        parts = split_arguments(self.example[at:])
        return [] if parts == [""] else parts


def split_arguments(text):
    """Formula texts up to the bracket that closes the call."""
    parts, depth, quoted, part = [], 0, False, ""
    for character in text:
        if character == '"':
            quoted = not quoted
        if not quoted:
            if character == ")" and depth == 0:
                break
            if character in "({":
                depth += 1
            elif character in ")}":
                depth -= 1
            elif character == ";" and depth == 0:
                parts.append(part.strip())
                part = ""
                continue
        part += character
    return [*parts, part.strip()]


class Engine:
    """The engine library of an extension."""

    def __init__(self, oxt):
        self._folder = tempfile.TemporaryDirectory(prefix="busbar-engine-")
        with zipfile.ZipFile(oxt) as archive:
            name = next(n for n in archive.namelist() if n.startswith("libbusbar.so"))
            library = archive.extract(name, self._folder.name)
        self._library = ctypes.CDLL(os.path.abspath(library))
        self._declare()

    def _declare(self):
        pointer, size, integer = ctypes.c_void_p, ctypes.c_size_t, ctypes.c_int32
        text, number = ctypes.c_char_p, ctypes.c_double
        out = ctypes.POINTER(ctypes.c_void_p)
        for name, result, arguments in (
            ("function_count", size, ()),
            ("function_at", pointer, (size,)),
            ("function_text", text, (pointer, integer)),
            ("argument_count", size, (pointer,)),
            ("argument_text", text, (pointer, size, integer)),
            ("argument_kind", integer, (pointer, size)),
            ("argument_optional", integer, (pointer, size)),
            ("argument_range", size, (pointer, size, text, text, size)),
            ("value_create", pointer, (size, size)),
            ("value_free", None, (pointer,)),
            ("set_number", integer, (pointer, size, size, number)),
            ("set_text", integer, (pointer, size, size, text, size)),
            ("rows", size, (pointer,)),
            ("columns", size, (pointer,)),
            ("kind", integer, (pointer, size, size)),
            ("get_number", number, (pointer, size, size)),
            ("get_text", text, (pointer, size, size, pointer)),
            ("get_error", integer, (pointer, size, size)),
            ("call_by_name", integer, (text, size, pointer, size, out)),
        ):
            function = getattr(self._library, "busbar_" + name)
            function.restype, function.argtypes = result, arguments
            setattr(self, "_" + name, function)

    @functools.cached_property
    def functions(self):
        return tuple(self._function(self._function_at(i)) for i in range(self._function_count()))

    def function(self, name):
        return next(f for f in self.functions if f.name == name)

    def _function(self, handle):
        words = [self._function_text(handle, field).decode() for field in range(10)]
        given = dict(part.strip().split("=", 1) for part in words[GIVEN].split("|") if part.strip())
        arguments = tuple(self._argument(handle, i) for i in range(self._argument_count(handle)))
        return Function(words[NAME], words[EXAMPLE], given, words[ANSWER], words[SOURCE], arguments)

    def _argument(self, handle, index):
        ranges = {}
        for unit_set in ("metric", "us", "si"):
            buffer = ctypes.create_string_buffer(200)
            self._argument_range(handle, index, unit_set.encode(), buffer, len(buffer))
            ranges[unit_set] = buffer.value.decode()
        return Argument(
            self._argument_text(handle, index, 0).decode(),
            self._argument_kind(handle, index),
            self._argument_optional(handle, index) == 1,
            ranges,
        )

    def call(self, name, *arguments):
        """A number, a text, or the error as Calc shows it; rows of these for a table. An argument
        is a number, a text, None (left out) or rows of numbers and texts (None: a blank cell)."""
        values = [None if a is None else self._value(a) for a in arguments]
        handles = (ctypes.c_void_p * max(1, len(values)))(*values)
        result = ctypes.c_void_p()
        status = self._call_by_name(
            name.encode(), len(name), handles, len(values), ctypes.byref(result)
        )
        for value in values:
            if value is not None:
                self._value_free(value)
        if status != 0:
            raise RuntimeError(f"{name}: status {status}")
        rows = [
            [self._cell(result, r, c) for c in range(self._columns(result))]
            for r in range(self._rows(result))
        ]
        self._value_free(result)
        return rows[0][0] if len(rows) == 1 and len(rows[0]) == 1 else rows

    def _value(self, content):
        rows = content if isinstance(content, (list, tuple)) else [[content]]
        value = self._value_create(len(rows), len(rows[0]))
        for r, row in enumerate(rows):
            for c, cell in enumerate(row):
                if isinstance(cell, str):
                    data = cell.encode()
                    self._set_text(value, r, c, data, len(data))
                elif cell is not None:
                    self._set_number(value, r, c, float(cell))
        return value

    def _cell(self, value, row, column):
        kind = self._kind(value, row, column)
        if kind == ERROR_CELL:
            return SHOWN[self._get_error(value, row, column)]
        if kind == TEXT_CELL:
            return self._get_text(value, row, column, None).decode()
        return None if kind == BLANK_CELL else self._get_number(value, row, column)


@functools.lru_cache(maxsize=None)
def engine(oxt):
    return Engine(oxt)
