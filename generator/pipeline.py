"""The stages of a build on one screen.

load -> check -> route -> describe -> emit -> stage -> views -> pages -> pack -> write

Takes the project's root; gives ``build/site`` and ``build/wheel``, or leaves the last good ones where a stage raises.
"""

import tomllib
from collections.abc import Mapping
from pathlib import Path

from generator.check import Checked
from generator.check import check as check_spec
from generator.describe import RelationText, describe
from generator.emit_engine import emit_relations
from generator.emit_pages import emit_pages
from generator.emit_sheets import emit_sheets
from generator.emit_tables import emit_tables
from generator.gas_equations import emit_gas_modules
from generator.load import Loaded, load
from generator.pack import pack
from generator.report import report
from generator.route import Routed, route
from generator.stage import spec_digest, stage_engine, use_engine, version_text
from generator.write import swap


def build(root: Path) -> None:
    """Build the wheel and the site. Raises ExceptionGroup of SpecError before anything of the last build is touched."""
    folder = root / "build"
    routed, texts = _prepare(root)
    modules = emit(routed, texts)
    version = read_version(root)
    digest = spec_digest(modules)
    engine = folder / "next" / "engine"
    stage_engine(engine, root / "site_src", {**modules, "gaswright/version.py": version_text(version, digest)})
    use_engine(engine)
    from generator.condition import check_conditioning  # noqa: PLC0415 - imports the engine just staged
    from generator.make_views import make_views  # noqa: PLC0415 - imports the engine just staged

    check_conditioning(routed)
    view = make_views(routed, texts, version=version, digest=digest)
    emit_pages(view, root / "site_src", folder / "next" / "site")
    pack(engine, root / "site_src", folder / "next", version)
    swap(folder / "next", folder)


def check(root: Path) -> str:
    """Check, solve and route the spec, write nothing, and give the report."""
    routed, texts = _prepare(root)
    return report(routed, texts)


def _prepare(root: Path) -> tuple[Routed, Mapping[str, RelationText]]:
    checked: Checked = check_spec(load(root))
    return route(checked), describe(checked, root / "build" / "cache" / "relations")


def emit(routed: Routed, texts: Mapping[str, RelationText]) -> Mapping[str, str]:
    """Give the text of every emitted module, by path in the engine folder."""
    loaded: Loaded = routed.checked.loaded
    python = {key: text.python for key, text in texts.items()}
    return {
        "gaswright/tables.py": emit_tables(loaded.units, loaded.kinds),
        **emit_relations(loaded.families, python),
        **emit_sheets(routed),
        **emit_gas_modules(loaded.gases),
    }


def read_version(root: Path) -> str:
    """Give the version that pyproject.toml states."""
    facts = tomllib.loads((root / "pyproject.toml").read_text(encoding="utf-8"))
    return str(facts["project"]["version"])
