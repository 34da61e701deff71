"""The wheel of the engine, in the layout of the Binary Distribution Format (PEP 427, PyPA specifications).

Takes the files of the package ``gaswright`` and what is said about it; gives the wheel's name and bytes.
``pack`` writes it for native use, and in compiled form for the browser.
"""

import base64
import hashlib
import re
from collections.abc import Mapping
from dataclasses import dataclass

from generator.errors import SpecError
from generator.pack_zip import write_zip

_NAME = "gaswright"
_PLAIN_VERSION = re.compile(r"\d+(\.\d+)*((a|b|rc)\d+)?(\.post\d+)?(\.dev\d+)?")


@dataclass(frozen=True, slots=True, kw_only=True)
class Wheel:
    """A wheel file: its name and its bytes."""

    name: str
    content: bytes

    @property
    def sha256(self) -> str:
        """The digest that a lock file states, in hex."""
        return hashlib.sha256(self.content).hexdigest()


@dataclass(frozen=True, slots=True, kw_only=True)
class WheelFacts:
    """What the wheel says of itself: its version, its tag (as in the file name) and its licence's text."""

    version: str
    tag: str
    licence: bytes


def build_wheel(package: Mapping[str, bytes], facts: WheelFacts, *, compressed: bool) -> Wheel:
    """The wheel of ``package``, whose names are relative to the folder that holds ``gaswright/``.

    Raises:
        SpecError: the version is not one that an installer reads as written.
    """
    _require_plain_version(facts.version)
    info = f"{_NAME}-{facts.version}.dist-info"
    files = {name: package[name] for name in sorted(package)}
    files |= {f"{info}/{name}": content for name, content in _metadata(facts).items()}
    files[f"{info}/RECORD"] = _record(files, f"{info}/RECORD")
    return Wheel(name=f"{_NAME}-{facts.version}-{facts.tag}.whl", content=write_zip(files, compressed=compressed))


def _require_plain_version(version: str) -> None:
    if _PLAIN_VERSION.fullmatch(version):
        return
    where, expected = "version of the engine", "a version in the normal form of PEP 440, such as 0.1.0"
    raise SpecError(where, repr(version), expected, "Correct it in the house file.")


def _metadata(facts: WheelFacts) -> dict[str, bytes]:
    return {
        "METADATA": _METADATA.format(version=facts.version).encode(),
        "WHEEL": _WHEEL.format(tag=facts.tag).encode(),
        "entry_points.txt": _ENTRY_POINTS.encode(),
        "licenses/LICENSE.txt": facts.licence,
        "top_level.txt": f"{_NAME}\n".encode(),
    }


def _record(files: Mapping[str, bytes], own_name: str) -> bytes:
    lines = [f"{name},sha256={_record_digest(content)},{len(content)}\n" for name, content in files.items()]
    return "".join([*lines, f"{own_name},,\n"]).encode()


def _record_digest(content: bytes) -> str:
    return base64.urlsafe_b64encode(hashlib.sha256(content).digest()).decode().rstrip("=")


_METADATA = """\
Metadata-Version: 2.4
Name: gaswright
Version: {version}
Summary: Gas laws solved for every unknown, real gases, and job sheets for gas field crews.
License-Expression: MIT
License-File: LICENSE.txt
Requires-Python: >=3.13
"""

_WHEEL = """\
Wheel-Version: 1.0
Generator: gaswright
Root-Is-Purelib: true
Tag: {tag}
"""

_ENTRY_POINTS = """\
[console_scripts]
gaswright = gaswright.__main__:main
"""
