"""Packs a folder into an archive whose bytes depend on the files' names and content only: pack.py FOLDER ARCHIVE

(CMake's own archiver stores the times of the last access and change as well.)
"""

import sys
import zipfile
from pathlib import Path


def main(folder: str, archive: str) -> None:
    root = Path(folder)
    with zipfile.ZipFile(archive, "w") as packed:
        for file in sorted(f for f in root.rglob("*") if f.is_file()):
            entry = zipfile.ZipInfo(file.relative_to(root).as_posix(), date_time=(2000, 1, 1, 0, 0, 0))
            entry.compress_type = zipfile.ZIP_DEFLATED
            entry.external_attr = 0o644 << 16
            packed.writestr(entry, file.read_bytes())


if __name__ == "__main__":
    main(*sys.argv[1:])
