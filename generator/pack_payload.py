"""Payload scripts: the one form of file that a page may read beside itself wherever it is opened from.

Takes the content of one part of the engine; gives a classic script that carries it, gzip in base64.
``pack`` writes the scripts; app/runtime.ts reads them.
"""

import base64
import gzip
import hashlib
from dataclasses import dataclass


@dataclass(frozen=True, slots=True, kw_only=True)
class Payload:
    """One payload: its name in the loader, the script's text, and the SHA-256 (hex) of the gzip bytes it carries."""

    name: str
    script: bytes
    sha256: str

    @property
    def file(self) -> str:
        """The script's place below the site's folder."""
        return f"engine/{self.name}.js"


def make_payload(name: str, content: bytes) -> Payload:
    """The payload ``name`` of the given content; the gzip header holds no time."""
    packed = gzip.compress(content, compresslevel=9, mtime=0)
    script = f'gaswrightPayload("{name}","{base64.b64encode(packed).decode()}");\n'
    return Payload(name=name, script=script.encode(), sha256=hashlib.sha256(packed).hexdigest())
