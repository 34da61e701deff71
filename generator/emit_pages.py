"""Every page of the site: views drawn by templates, framed by the theme, written by mkdocs.

Takes the ``SiteView`` and the folder ``site_src``; gives a folder of HTML, CSS and the search entries.
``pack`` adds the browser code and the engine beside them, ``write`` puts the whole in place.
"""

import json
import logging
from collections.abc import Iterator
from contextlib import contextmanager
from pathlib import Path
from typing import NamedTuple

from jinja2 import Environment, FileSystemLoader, StrictUndefined
from mkdocs.commands.build import build
from mkdocs.config import load_config
from mkdocs.config.defaults import MkDocsConfig
from mkdocs.exceptions import Abort
from mkdocs.plugins import BasePlugin
from mkdocs.structure.files import File, Files
from mkdocs.structure.pages import Page

from generator.errors import SpecError
from generator.search_entries import write_entries
from generator.symbol_html import write_chemical, write_symbols
from generator.views import SheetView, SiteView

TEMPLATES = Path(__file__).parent / "templates"
POLICY = (
    "default-src 'none'; base-uri 'none'; form-action 'none'; style-src 'self'; img-src 'self' data: blob:; "
    "script-src 'self' 'wasm-unsafe-eval' blob:; worker-src blob:; connect-src blob:"
)
SECTIONS = (
    ("sheets", "Today", "sheets.html"),
    ("laws", "Laws", "laws.html"),
    ("gases", "Gases", "gases.html"),
    ("tables", "Tables", "tables.html"),
    ("about", "About", "about.html"),
)


class Body(NamedTuple):
    """A generated page before the theme frames it: address below the site, which part of the site, its HTML."""

    source: str
    section: str
    title: str
    html: str


def emit_pages(view: SiteView, site_src: Path, out: Path) -> None:
    """Write all pages and their styles to ``out``, which is emptied first.

    Raises:
        ExceptionGroup of SpecError: one for each warning of mkdocs, such as a page that links to nothing.
    """
    config = load_config(str(site_src / "mkdocs.yml"), site_dir=str(out), extra=frame_values(view))
    config.plugins["pages"] = PagesPlugin(tuple(draw_bodies(view)), write_entries(view))
    with collect_warnings() as warnings:
        try:
            build(config)
        except Abort as stopped:
            raise ExceptionGroup("pages", [tell_warning(text) for text in warnings or [str(stopped)]]) from None


class WarningKeeper(logging.Handler):
    """Keeps the texts of what is logged."""

    def __init__(self, level: int) -> None:
        """Start with nothing kept."""
        super().__init__(level)
        self.texts: list[str] = []

    def emit(self, record: logging.LogRecord) -> None:
        """Keep one text."""
        self.texts.append(record.getMessage())


@contextmanager
def collect_warnings() -> Iterator[list[str]]:
    """Give the warnings of mkdocs as they come, and keep them and its chatter off the terminal."""
    keeper = WarningKeeper(logging.WARNING)
    logger = logging.getLogger("mkdocs")
    logger.addHandler(keeper)
    propagate, logger.propagate = logger.propagate, False
    try:
        yield keeper.texts
    finally:
        logger.removeHandler(keeper)
        logger.propagate = propagate


def tell_warning(text: str) -> SpecError:
    """A warning of mkdocs as an error in four parts."""
    todo = "Correct the page in site_src/pages, or the template in generator/templates."
    return SpecError("pages", text, "pages that mkdocs writes without a warning", todo)


def frame_values(view: SiteView) -> dict[str, object]:
    """What the theme draws round every page."""
    return {"policy": POLICY, "sections": SECTIONS, "version": view.version, "digest": view.digest}


def draw_bodies(view: SiteView) -> Iterator[Body]:
    """Every generated page, in the order of the site."""
    env = make_environment()
    env.globals["site"] = view
    env.globals["groups"] = group_sheets(view)
    env.globals["formulas"] = {law.key: law.text for family in view.families for law in family.relations}
    env.globals["titles"] = {law.key: law.title for family in view.families for law in family.relations}
    env.globals["laws"] = frozenset(law.key for family in view.families for law in family.relations)
    yield Body("index.md", "home", "Gaswright", env.get_template("home.html").render(root=""))
    yield Body("sheets.md", "sheets", "Sheets", env.get_template("sheets.html").render(root=""))
    yield Body("laws.md", "laws", "Laws", env.get_template("laws.html").render(root=""))
    yield Body("gases.md", "gases", "Gases", env.get_template("gases.html").render(root=""))
    yield Body("tables.md", "tables", "Tables", env.get_template("tables.html").render(root=""))
    for family in view.families:
        for law in family.relations:
            html = env.get_template("law.html").render(root="../", law=law)
            yield Body(f"laws/{law.key}.md", "laws", law.title, html)
    for page in view.tables:
        html = env.get_template("table_page.html").render(root="../", page=page)
        yield Body(f"tables/{page.key}.md", "tables", page.title, html)
    for gas in view.gases:
        yield Body(f"gases/{gas.key}.md", "gases", gas.title, env.get_template("gas.html").render(root="../", gas=gas))


def group_sheets(view: SiteView) -> dict[str, list[SheetView]]:
    """Sheets by the group of jobs they belong to, in the order in which the groups first come up."""
    groups: dict[str, list[SheetView]] = {}
    for sheet in view.sheets:
        groups.setdefault(sheet.group, []).append(sheet)
    return groups


def make_environment() -> Environment:
    """Templates of the page bodies: every text escaped, a name that is not there is an error."""
    env = Environment(
        loader=FileSystemLoader(TEMPLATES),
        autoescape=True,
        undefined=StrictUndefined,
        trim_blocks=True,
        lstrip_blocks=True,
    )
    env.filters["symbols"] = write_symbols
    env.filters["chemical"] = write_chemical
    return env


class PagesPlugin(BasePlugin[MkDocsConfig]):  # type: ignore[no-untyped-call]  # mkdocs leaves it untyped
    """Hands the generated pages to mkdocs, and keeps out of the site what carries a date."""

    def __init__(self, bodies: tuple[Body, ...], entries: str) -> None:
        """Take the pages, and the text of the script of search entries."""
        self.bodies = {body.source: body for body in bodies}
        self.entries = entries

    def on_config(self, config: MkDocsConfig) -> MkDocsConfig:
        """Drop mkdocs's own pages: the site map carries today's date."""
        config.theme.static_templates.clear()
        return config

    def on_files(self, files: Files, /, *, config: MkDocsConfig) -> Files:
        """Add the generated pages and the search entries."""
        for body in self.bodies.values():
            head = f"---\ntitle: {json.dumps(body.title)}\nsection: {body.section}\n---\n"
            files.append(File.generated(config, body.source, content=head))
        files.append(File.generated(config, "search/entries.js", content=self.entries))
        return Files([file for file in files if not file.src_uri.startswith("sitemap.xml")])

    def on_page_content(self, html: str, /, *, page: Page, config: MkDocsConfig, files: Files) -> str:
        """Put the drawn body where the page has one; hand-written pages keep their own."""
        del config, files
        body = self.bodies.get(page.file.src_uri)
        return f'<article class="prose">{html}</article>' if body is None else body.html
