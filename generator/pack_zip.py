"""Archives whose bytes depend on nothing but what is in them.

Takes file names with their bytes, in the order wanted; gives a zip archive.
The wheel and the standard library are packed with it.
"""

import io
import zipfile
from collections.abc import Mapping
from types import MappingProxyType

#: The earliest date that a zip archive can hold: no build's own time goes in.
EPOCH = (1980, 1, 1, 0, 0, 0)
_UNIX = 3
_PLAIN_FILE = 0o100644 << 16


def write_zip(files: Mapping[str, bytes], *, compressed: bool) -> bytes:
    """The archive of ``files``, name to bytes, in the mapping's order, with fixed dates and permissions."""
    method = zipfile.ZIP_DEFLATED if compressed else zipfile.ZIP_STORED
    buffer = io.BytesIO()
    with zipfile.ZipFile(buffer, "w") as archive:
        for name, content in files.items():
            archive.writestr(_entry(name), content, compress_type=method, compresslevel=9)
    return buffer.getvalue()


def read_zip(content: bytes) -> Mapping[str, bytes]:
    """The files of an archive, name to bytes, in the archive's order; folders are left out."""
    with zipfile.ZipFile(io.BytesIO(content)) as archive:
        names = [entry.filename for entry in archive.infolist() if not entry.is_dir()]
        return MappingProxyType({name: archive.read(name) for name in names})


def _entry(name: str) -> zipfile.ZipInfo:
    entry = zipfile.ZipInfo(name, EPOCH)
    entry.create_system = _UNIX
    entry.external_attr = _PLAIN_FILE
    return entry
