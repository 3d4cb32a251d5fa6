#!/usr/bin/python3
"""Packs files into an .oxt, so that the same files always make the same bytes.

    pack.py OUT.oxt ARCHIVE/PATH=FILE_OR_FOLDER ...

A folder goes in with all it holds. Entries are sorted; each carries the time of SOURCE_DATE_EPOCH
(1980-01-01 where that is not set) and no other trace of the machine.
"""

import os
import sys
import time
import zipfile


def entries(arguments):
    found = {}
    for argument in arguments:
        inside, equals, outside = argument.partition("=")
        if not equals or not inside or inside.startswith("/"):
            raise SystemExit(f"pack.py: expected ARCHIVE/PATH=FILE, got {argument}")
        if os.path.isdir(outside):
            for folder, _, names in os.walk(outside):
                for name in names:
                    path = os.path.join(folder, name)
                    found[os.path.join(inside, os.path.relpath(path, outside))] = path
        else:
            found[inside] = outside
    return sorted(found.items())


def stamp():
    epoch = int(os.environ.get("SOURCE_DATE_EPOCH", "315532800"))
    return max(time.gmtime(epoch)[:6], (1980, 1, 1, 0, 0, 0))


def pack(out, arguments):
    when = stamp()
    fresh = out + ".part"
    with zipfile.ZipFile(fresh, "w", zipfile.ZIP_DEFLATED, compresslevel=9) as archive:
        for inside, outside in entries(arguments):
            info = zipfile.ZipInfo(inside, when)
            info.create_system = 3  # Unix, on every machine
            info.external_attr = 0o100644 << 16
            info.compress_type = zipfile.ZIP_DEFLATED
            with open(outside, "rb") as file:
                archive.writestr(info, file.read(), compresslevel=9)
    os.replace(fresh, out)


if __name__ == "__main__":
    if len(sys.argv) < 3:
        raise SystemExit(__doc__)
    pack(sys.argv[1], sys.argv[2:])
