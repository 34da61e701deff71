"""Where the browsers are looked for, and what is said where one is missing."""

from pathlib import Path

import pytest

from generator import browsers
from generator.errors import SetUpError


def test_the_path_comes_first(tmp_path: Path) -> None:
    (tmp_path / "Mozilla Firefox").mkdir()
    (tmp_path / "Mozilla Firefox" / "firefox.exe").touch()
    variables = {"PROGRAMFILES": str(tmp_path)}
    found = browsers.find(browsers.FIREFOX, which={"firefox": "/usr/bin/firefox"}.get, variables=variables)
    assert found == Path("/usr/bin/firefox")


def test_the_usual_places_come_next(tmp_path: Path) -> None:
    program = tmp_path / "Mozilla Firefox" / "firefox.exe"
    program.parent.mkdir()
    program.touch()
    found = browsers.find(browsers.FIREFOX, which=lambda _: None, variables={"PROGRAMFILES": str(tmp_path)})
    assert found == program


def test_a_missing_browser_is_an_error_that_says_what_to_install(monkeypatch: pytest.MonkeyPatch) -> None:
    monkeypatch.setattr(browsers, "find", lambda _: None)
    monkeypatch.setattr(browsers, "_can_install", lambda: False)
    with pytest.raises(SetUpError) as caught:
        browsers.get(browsers.FIREFOX)
    assert str(caught.value) == (
        "browser tests, Firefox: found no such program on the PATH or in its usual place; "
        "expected one of firefox-esr, firefox. "
        "Install Firefox (on Debian: apt-get install firefox-esr); then run the same command again."
    )


def test_a_missing_browser_is_installed_where_that_can_be_done(monkeypatch: pytest.MonkeyPatch) -> None:
    installed: list[str] = []
    monkeypatch.setattr(browsers, "find", lambda _: Path("/usr/bin/chromium") if installed else None)
    monkeypatch.setattr(browsers, "_can_install", lambda: True)
    monkeypatch.setattr(browsers, "_install", installed.append)
    assert browsers.get(browsers.CHROMIUM) == Path("/usr/bin/chromium")
    assert installed == ["chromium"]
