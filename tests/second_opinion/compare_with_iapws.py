#!/usr/bin/python3
"""A second opinion on water and steam: the engine beside the independent library python3-iapws
(Debian), on a grid of random states that is new at every run.

    compare_with_iapws.py path/to/libbusbar.so [--seed N] [--states N]

Both follow IAPWS R7-97(2012), so they must agree to rounding: both solve region 3 for its density until
nothing changes. Saturated states above 16.5 MPa are left out, where the library stops early. The seed is printed, so that a failure can be repeated. Prints `N passed, N
failed`.
"""

import argparse
import ctypes
import math
import random
import sys
import time

from iapws.iapws97 import IAPWS97, _PSat_T, _TSat_P

# Relative agreement that the engine promises: rounding through powers up to 41, and its own stopping
# rule.
ROUNDING = 1e-10

# The same for second derivatives.
SECOND_ORDER = 1e-9


class Engine:
    """Calls of functions of numbers through the C interface."""

    def __init__(self, path):
        library = ctypes.CDLL(path)
        self._library = library
        library.busbar_number.restype = ctypes.c_void_p
        library.busbar_number.argtypes = [ctypes.c_double]
        library.busbar_get_number.restype = ctypes.c_double
        library.busbar_get_number.argtypes = [ctypes.c_void_p, ctypes.c_size_t, ctypes.c_size_t]
        library.busbar_kind.argtypes = [ctypes.c_void_p, ctypes.c_size_t, ctypes.c_size_t]
        library.busbar_value_free.argtypes = [ctypes.c_void_p]
        library.busbar_call_by_name.argtypes = [
            ctypes.c_char_p,
            ctypes.c_size_t,
            ctypes.POINTER(ctypes.c_void_p),
            ctypes.c_size_t,
            ctypes.POINTER(ctypes.c_void_p),
        ]

    def __call__(self, name, *numbers):
        """The number that a function gives in metric units, or None when it gives an error."""
        library = self._library
        values = (ctypes.c_void_p * len(numbers))(*[library.busbar_number(x) for x in numbers])
        result = ctypes.c_void_p()
        status = library.busbar_call_by_name(
            name.encode(), len(name), values, len(numbers), ctypes.byref(result)
        )
        for value in values:
            library.busbar_value_free(value)
        if status != 0:
            raise RuntimeError(f"{name}: status {status}")
        number = None
        if library.busbar_kind(result, 0, 0) == 1:
            number = library.busbar_get_number(result, 0, 0)
        library.busbar_value_free(result)
        return number


def boundary_23(temperature):
    """MPa; R7-97(2012), equation 5."""
    return 348.05185628969 - 1.1671859879975 * temperature + 1.0192970039326e-3 * temperature**2


def random_state(rng):
    """Pressure (MPa), temperature (K) anywhere in the range of IAPWS-IF97, clear of its edges."""
    temperature = rng.uniform(273.16, 2273.1) if rng.random() < 0.2 else rng.uniform(273.16, 1073.1)
    most = 50.0 if temperature > 1073.15 else 100.0
    pressure = math.exp(rng.uniform(math.log(1e-3), math.log(most * 0.999)))
    return pressure, temperature


def near_a_seam(pressure, temperature):
    """Within rounding of a boundary the two sides may choose differently."""
    if abs(temperature - 623.15) < 1e-6 or abs(temperature - 1073.15) < 1e-6:
        return True
    if temperature < 647.096 and abs(pressure / _PSat_T(temperature) - 1) < 1e-6:
        return True
    return 623.15 < temperature < 863.15 and abs(pressure / boundary_23(temperature) - 1) < 1e-6


class Comparison:
    def __init__(self):
        self.passed = 0
        self.failed = 0
        self.worst = {}

    def check(self, what, ours, theirs, tolerance, floor):
        """Relative agreement, with an absolute floor where the quantity passes through zero."""
        if ours is None:
            error = math.inf
        else:
            error = abs(ours - theirs) / max(abs(theirs), floor)
        group = what.split(" at ")[0]
        self.worst[group] = max(self.worst.get(group, 0), error)
        if error <= tolerance:
            self.passed += 1
            return
        self.failed += 1
        if self.failed <= 20:
            print(f"differs: {what}: {ours!r} against {theirs!r}, {error:.2e}", file=sys.stderr)


def main():
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("library")
    parser.add_argument("--seed", type=int, default=time.time_ns() % 2**32)
    parser.add_argument("--states", type=int, default=1500)
    arguments = parser.parse_args()
    print(f"seed {arguments.seed}")
    rng = random.Random(arguments.seed)
    busbar = Engine(arguments.library)
    compared = Comparison()

    for _ in range(arguments.states):
        pressure, temperature = random_state(rng)
        if near_a_seam(pressure, temperature):
            continue
        theirs = IAPWS97(P=pressure, T=temperature)
        place = f"region {theirs.region} at {pressure!r} MPa, {temperature!r} K"
        bar, celsius = pressure * 10, temperature - 273.15
        # Floors: 1e-3 of R T* of the region's equation, as the release's zero of h and s is a
        # convention.
        compared.check(f"h {place}", busbar("STEAM_ENTHALPY", bar, celsius), theirs.h, ROUNDING, 1.0)
        compared.check(f"s {place}", busbar("STEAM_ENTROPY", bar, celsius), theirs.s, ROUNDING, 1e-2)
        compared.check(f"v {place}", busbar("STEAM_VOLUME", bar, celsius), theirs.v, ROUNDING, 0)
        for name, value, floor in (
            ("STEAM_INTERNAL_ENERGY", theirs.u, 1.0),
            ("STEAM_HELMHOLTZ_ENERGY", theirs.a, 1.0),
            ("STEAM_GIBBS_ENERGY", theirs.g, 1.0),
            ("STEAM_HEAT_CAPACITY", theirs.cp, 0),
            ("STEAM_ISOCHORIC_HEAT_CAPACITY", theirs.cv, 0),
            ("STEAM_SPEED_OF_SOUND", theirs.w, 0),
            # Per K; zero at the greatest density of water.
            ("STEAM_ISOBARIC_EXPANSION", theirs.alfav, 1e-4),
            # Per MPa and K/kPa there, per bar and K/bar here. In thin vapour the coefficient there is a
            # small difference of large numbers.
            ("STEAM_ISOTHERMAL_COMPRESSIBILITY", theirs.xkappa / 10, 0),
            ("STEAM_JOULE_THOMSON_COEFFICIENT", theirs.joule * 100, 0.1),
        ):
            compared.check(f"{name} {place}", busbar(name, bar, celsius), value, SECOND_ORDER, floor)
        if temperature <= 1173.15:
            viscosity = busbar("STEAM_VISCOSITY", bar, celsius)
            compared.check(f"STEAM_VISCOSITY {place}", viscosity, theirs.mu * 1e6, ROUNDING, 0)
        # Region 5 has no critical enhancement in R15-11's formulation for industrial use.
        if theirs.region != 5:
            conductivity = busbar("STEAM_THERMAL_CONDUCTIVITY", bar, celsius)
            compared.check(
                f"STEAM_THERMAL_CONDUCTIVITY {place}", conductivity, theirs.k, SECOND_ORDER, 0
            )

    for _ in range(arguments.states // 5):
        temperature = rng.uniform(273.16, 647.0)
        pressure = math.exp(rng.uniform(math.log(6.12e-4), math.log(22.06)))
        dryness = rng.random()
        compared.check(
            f"saturation pressure at {temperature!r} K",
            busbar("SATURATION_PRESSURE", temperature - 273.15),
            _PSat_T(temperature) * 10,
            ROUNDING,
            0,
        )
        compared.check(
            f"saturation temperature at {pressure!r} MPa",
            busbar("SATURATION_TEMPERATURE", pressure * 10),
            _TSat_P(pressure) - 273.15,
            ROUNDING,
            1.0,
        )
        if pressure > 16.5:
            continue
        wet = IAPWS97(P=pressure, x=dryness)
        compared.check(
            f"dryness from h at {pressure!r} MPa, {dryness!r}",
            busbar("STEAM_DRYNESS_AT_ENTHALPY", pressure * 10, wet.h),
            dryness,
            ROUNDING,
            1e-2,
        )
        compared.check(
            f"dryness from s at {pressure!r} MPa, {dryness!r}",
            busbar("STEAM_DRYNESS_AT_ENTROPY", pressure * 10, wet.s),
            dryness,
            ROUNDING,
            1e-2,
        )

    for group in sorted(compared.worst):
        print(f"largest difference, {group}: {compared.worst[group]:.1e}")
    print(f"{compared.passed} passed, {compared.failed} failed")
    return 1 if compared.failed else 0


if __name__ == "__main__":
    sys.exit(main())
