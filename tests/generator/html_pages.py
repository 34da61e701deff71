"""The pages of a site folder, read far enough to check them.

Takes HTML text; gives the elements with their attributes, the ids, and the text between tags.
"""

from html.parser import HTMLParser
from pathlib import Path
from typing import NamedTuple

VOID = {"meta", "link", "input", "br", "hr", "img"}


class Element(NamedTuple):
    """A start tag with its attributes; ``path`` names the tags it stands in, from the outermost."""

    tag: str
    attributes: dict[str, str]
    path: tuple[str, ...]


class Reader(HTMLParser):
    """Collects elements and text of one page."""

    def __init__(self) -> None:
        """Start with nothing read."""
        super().__init__(convert_charrefs=True)
        self.elements: list[Element] = []
        self.texts: list[tuple[str, str]] = []
        self._open: list[str] = []

    def handle_starttag(self, tag: str, attrs: list[tuple[str, str | None]]) -> None:
        """Note the element."""
        self.elements.append(Element(tag, {name: value or "" for name, value in attrs}, tuple(self._open)))
        if tag not in VOID:
            self._open.append(tag)

    def handle_startendtag(self, tag: str, attrs: list[tuple[str, str | None]]) -> None:
        """Note the element, which holds nothing."""
        self.elements.append(Element(tag, {name: value or "" for name, value in attrs}, tuple(self._open)))

    def handle_endtag(self, tag: str) -> None:
        """Leave the element; an end tag that closes nothing is a broken page."""
        while self._open and self._open.pop() != tag:
            continue

    def handle_data(self, data: str) -> None:
        """Note the text with the tag it stands in."""
        self.texts.append((self._open[-1] if self._open else "", data))


def read_page(path: Path) -> Reader:
    """Read one page."""
    reader = Reader()
    reader.feed(path.read_text(encoding="utf-8"))
    reader.close()
    return reader


def list_pages(folder: Path) -> list[Path]:
    """Every page of the folder, sorted."""
    return sorted(folder.rglob("*.html"))
