"""Pages of a small site: what must hold on every page of every build.

Takes the views of ``sample_views``; the pages are read as a browser would find them in the folder.
"""

import json
import re
import shutil
from pathlib import Path
from urllib.parse import urlsplit

import pytest

from generator.emit_pages import POLICY, emit_pages
from generator.errors import SpecError
from tests.generator.html_pages import Element, Reader, list_pages, read_page
from tests.generator.sample_views import make_site

ROOT = Path(__file__).parents[2]
SITE_SRC = ROOT / "site_src"
# The policy as the design fixes it, letter for letter.
FIXED_POLICY = (
    "default-src 'none'; base-uri 'none'; form-action 'none'; style-src 'self'; img-src 'self' data: blob:; "
    "script-src 'self' 'wasm-unsafe-eval' blob:; worker-src blob:; connect-src blob:"
)
LOADING = {"src", "href", "srcset", "poster", "data", "action", "formaction"}
ADDED_BY_PACK = {"app/page.js", "notices.txt"}


@pytest.fixture(scope="module")
def site(tmp_path_factory: pytest.TempPathFactory) -> Path:
    """Emit the small site once."""
    out = tmp_path_factory.mktemp("site")
    emit_pages(make_site(), SITE_SRC, out)
    return out


@pytest.fixture(scope="module")
def pages(site: Path) -> dict[str, Reader]:
    """Every page by its address in the site."""
    return {page.relative_to(site).as_posix(): read_page(page) for page in list_pages(site)}


def test_pages_are_those_of_the_contract(pages: dict[str, Reader]) -> None:
    """Addresses are fixed: other parts and people's bookmarks name them."""
    fixed = {"index.html", "sheets.html", "laws.html", "gases.html", "tables.html", "about.html", "hosting.html"}
    assert set(pages) == fixed | {
        "laws/boyle.html",
        "laws/force_pressure.html",
        "gases/nitrogen.html",
        "tables/units.html",
    }


def test_every_link_leads_to_a_file_and_a_place_in_it(site: Path, pages: dict[str, Reader]) -> None:
    """A folder is a listing on file://, so a link to one is broken too."""
    ids = {name: {element.attributes.get("id") for element in page.elements} for name, page in pages.items()}
    broken = []
    for name, page in pages.items():
        for address in list_addresses(page):
            path, fragment = resolve(site, name, address)
            where = path.relative_to(site).as_posix() if path.is_relative_to(site) else str(path)
            is_there = path.is_file() or where in ADDED_BY_PACK
            if not is_there or (fragment and fragment not in ids.get(where, set())):
                broken.append(f"{name}: {address}")
    assert not broken


def test_search_entries_lead_to_pages_and_places(site: Path, pages: dict[str, Reader]) -> None:
    """The entries are no links that the other test could see."""
    text = (site / "search/entries.js").read_text(encoding="utf-8")
    entries = json.loads(text.removeprefix("globalThis.gaswrightEntries=").removesuffix(";\n"))
    assert len({entry["id"] for entry in entries}) == len(entries) > 5
    for entry in entries:
        path, _, fragment = entry["href"].partition("#")
        assert path in pages
        assert not fragment or fragment in {element.attributes.get("id") for element in pages[path].elements}


def test_every_page_carries_the_policy_before_anything_that_loads(pages: dict[str, Reader]) -> None:
    """A policy after the first script would not bind it."""
    assert POLICY == FIXED_POLICY
    for name, page in pages.items():
        metas = [element for element in page.elements if "http-equiv" in element.attributes]
        assert [meta.attributes["http-equiv"] for meta in metas] == ["Content-Security-Policy"], name
        assert metas[0].attributes["content"] == FIXED_POLICY
        first = next(element for element in page.elements if LOADING & set(element.attributes))
        assert page.elements.index(metas[0]) < page.elements.index(first), name


def test_nothing_is_inline(pages: dict[str, Reader]) -> None:
    """The policy forbids inline scripts and styles; one would be a console error and a dead page."""
    for name, page in pages.items():
        for element in page.elements:
            assert element.tag != "style", name
            assert "style" not in element.attributes, (name, element)
            assert not [key for key in element.attributes if key.startswith("on")], (name, element)
            if element.tag == "script":
                assert element.attributes.keys() == {"defer", "src"}, (name, element)
        assert not [text for tag, text in page.texts if tag == "script" and text.strip()], name


def test_nothing_is_loaded_from_elsewhere(site: Path, pages: dict[str, Reader]) -> None:
    """No address of another host in anything that loads, styles included."""
    for name, page in pages.items():
        foreign = [address for address in list_addresses(page, all_schemes=True) if urlsplit(address).netloc]
        assert not foreign, name
    for sheet in sorted(site.rglob("*.css")):
        text = sheet.read_text(encoding="utf-8")
        assert "@import" not in text
        assert all(url.strip("\"'").startswith("data:") for url in re.findall(r"url\(([^)]*)", text)), sheet


def test_two_builds_are_the_same_bytes_and_name_no_folder(site: Path, tmp_path: Path) -> None:
    """Built in another folder from another copy of the sources."""
    copy = tmp_path / "elsewhere"
    shutil.copytree(SITE_SRC, copy, ignore=shutil.ignore_patterns("node_modules", "engine"))
    again = tmp_path / "again"
    emit_pages(make_site(), copy, again)
    first, second = read_folder(site), read_folder(again)
    assert first == second
    assert not [name for name in first if name.startswith("sitemap")]
    for name, content in first.items():
        for folder in (site, copy, ROOT):
            assert str(folder).encode() not in content, name


def test_build_refuses_a_broken_link_in_a_hand_written_page(tmp_path: Path) -> None:
    """Strict: a page that links to nothing stops the build."""
    copy = tmp_path / "site_src"
    shutil.copytree(SITE_SRC, copy, ignore=shutil.ignore_patterns("node_modules", "engine"))
    with (copy / "pages/about.md").open("a", encoding="utf-8") as page:
        page.write("\n[nowhere](nowhere.md)\n")
    with pytest.raises(ExceptionGroup) as problems:
        emit_pages(make_site(), copy, tmp_path / "out")
    (problem,) = problems.value.exceptions
    assert isinstance(problem, SpecError)
    assert str(problem) == (
        "pages: found Doc file 'about.md' contains a link 'nowhere.md', but the target is not found among "
        "documentation files.; expected pages that mkdocs writes without a warning. "
        "Correct the page in site_src/pages, or the template in generator/templates."
    )


def test_texts_of_views_are_escaped(site: Path) -> None:
    """A gas called "Helium <He>" must not open a tag."""
    sheets = (site / "sheets.html").read_text(encoding="utf-8")
    assert "Helium &lt;He&gt;" in sheets
    assert "<He>" not in sheets
    assert "F = 250 N &lt;tag&gt;" in (site / "laws/boyle.html").read_text(encoding="utf-8")


def test_every_page_says_what_it_is(pages: dict[str, Reader]) -> None:
    """Language, title, one heading of the first rank per view, and a word for those without scripts."""
    for name, page in pages.items():
        tags = [element.tag for element in page.elements]
        assert page.elements[0].attributes["lang"] == "en"
        assert "".join(text for tag, text in page.texts if tag == "title").strip(), name
        views = sum("view" in element.attributes.get("class", "").split() for element in page.elements)
        assert tags.count("h1") == max(views, 1), name
        assert tags.count("noscript") == tags.count("main") == 1, name


def test_every_field_has_a_name(pages: dict[str, Reader]) -> None:
    """A field without a label is a guess for whoever cannot see it."""
    for name, page in pages.items():
        labelled = {
            element.attributes["for"]
            for element in page.elements
            if element.tag == "label" and "for" in element.attributes
        }
        for element in list_fields(page):
            own = element.attributes
            assert "label" in element.path or "aria-label" in own or own.get("id") in labelled, (name, own)


def test_no_field_is_a_spinner(pages: dict[str, Reader]) -> None:
    """Number fields are text fields: a glove or a wheel must not change a reading."""
    kinds = {
        element.attributes.get("type") for page in pages.values() for element in page.elements if element.tag == "input"
    }
    assert kinds <= {"text", "hidden", "radio"}


def test_ids_are_unique_and_those_of_the_contract(pages: dict[str, Reader]) -> None:
    """Tests and styles find fields by these ids."""
    for name, page in pages.items():
        ids = [element.attributes["id"] for element in page.elements if "id" in element.attributes]
        assert len(ids) == len(set(ids)), name
    fields = {element.attributes.get("id", "") for element in pages["sheets.html"].elements}
    for suffix in ("", "-unit", "-reference", "-instrument", "-says"):
        assert f"bank_endurance-pg_start{suffix}" in fields
    assert {"sheet-bank_endurance", "bank_endurance-find-count", "bank_endurance-T_gas-sign", "decimal"} <= fields
    assert {"law", "boyle-p", "boyle-find-F"} <= {
        element.attributes.get("id") for element in pages["laws/boyle.html"].elements
    }


def test_worked_example_is_readable_without_scripts(pages: dict[str, Reader]) -> None:
    """Figure, best estimate, verdict and cautions are in the page itself, the row to find at the foot."""
    for name in ("sheets.html", "laws/boyle.html"):
        text = " ".join(text for _, text in pages[name].texts)
        for said in (
            "18 h 55 min",
            "Best estimate 19.9 h ± 1.0 h (k = 2).",
            "needed for 12 h 00 min",
            "5.4 % too long",
        ):
            assert said in text, name
    rows = [element for element in pages["sheets.html"].elements if element.attributes.get("data-order")]
    found = [element for element in rows if "is-found" in element.attributes["class"].split()]
    assert found == rows[-1:]
    assert found[0].attributes["data-row"] == "t"


def list_fields(page: Reader) -> list[Element]:
    """Fields a person fills in."""
    fields = [element for element in page.elements if element.tag in {"input", "select", "textarea"}]
    return [field for field in fields if field.attributes.get("type") != "hidden"]


def list_addresses(page: Reader, *, all_schemes: bool = False) -> list[str]:
    """Addresses that the page links to or loads; data addresses left out unless all are wanted."""
    found = [value for element in page.elements for key, value in element.attributes.items() if key in LOADING]
    return [address for address in found if all_schemes or not address.startswith("data:")]


def resolve(site: Path, page: str, address: str) -> tuple[Path, str]:
    """The file an address leads to from a page, and the place in it."""
    parts = urlsplit(address)
    assert not parts.scheme, address
    assert not parts.path.startswith("/"), address
    path = (site / page).parent / parts.path if parts.path else site / page
    return Path(*path.parts).resolve(), parts.fragment


def read_folder(folder: Path) -> dict[str, bytes]:
    """Every file of the folder by its relative name."""
    return {
        path.relative_to(folder).as_posix(): path.read_bytes() for path in sorted(folder.rglob("*")) if path.is_file()
    }
