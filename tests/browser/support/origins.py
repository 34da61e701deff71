"""Which requests leave the reader's own copy of the site.

Takes request addresses as the browsers report them. Gives the foreign ones. Next: tab.py.
"""

from collections.abc import Iterable
from urllib.parse import urlsplit

# Made by the page or read from the reader's own disk; the last three are the browser's built-in pages.
LOCAL_SCHEMES = frozenset({"file", "blob", "data", "about", "chrome", "resource"})


def origin_of(address: str) -> str:
    """Scheme, host and port of an address, as `http://127.0.0.1:8000`; `file://` for a file."""
    parts = urlsplit(address)
    return f"{parts.scheme}://{parts.netloc}"


def select_foreign(requested: Iterable[str], own: Iterable[str]) -> list[str]:
    """Addresses in `requested` that are neither local nor of an origin in `own`, in order, each once."""
    own_origins = frozenset(own)
    foreign = (
        address
        for address in requested
        if urlsplit(address).scheme not in LOCAL_SCHEMES and origin_of(address) not in own_origins
    )
    return list(dict.fromkeys(foreign))
