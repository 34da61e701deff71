"""The server: what it answers, and what it shows while the spec is broken."""

import http.client
import signal
import subprocess
import sys
import time
from collections.abc import Iterator
from email.message import Message
from pathlib import Path
from threading import Thread

import pytest
from watchfiles import Change

from generator import serve
from generator.errors import SetUpError

# A build in small: it copies the spec's text into the site, or fails with a message in four parts.
BUILD = """
import pathlib, sys
text = pathlib.Path("spec/law.txt").read_text(encoding="utf-8")
if "broken" in text:
    sys.exit("boyle: found <broken>; expected a law. Mend it.")
site = pathlib.Path("build/site")
site.mkdir(parents=True, exist_ok=True)
(site / "index.html").write_text(text, encoding="utf-8")
(site / "app.js").write_text("'use strict';", encoding="utf-8")
"""
FAILURE = "boyle: found &lt;broken&gt;; expected a law. Mend it."


@pytest.fixture
def project(tmp_path: Path) -> Path:
    """A project whose spec is one good text."""
    (tmp_path / "spec").mkdir()
    write_spec(tmp_path, "p V")
    return tmp_path


@pytest.fixture
def builder(project: Path) -> serve.Builder:
    """The small build in that project, run once."""
    builder = serve.Builder(project, [sys.executable, "-c", BUILD])
    builder.build()
    return builder


@pytest.fixture
def server(builder: serve.Builder) -> Iterator[serve.Server]:
    """A server of that project on a free port."""
    with serve.Server(0, site=builder.root / "build" / "site", builder=builder) as server:
        Thread(target=server.serve_forever, args=(0.02,), daemon=True).start()
        yield server
        server.shutdown()


def write_spec(project: Path, text: str) -> None:
    """Put the text where the small build looks."""
    (project / "spec" / "law.txt").write_text(text, encoding="utf-8")


def get(port: int, path: str, method: str = "GET", **headers: str) -> tuple[int, Message, str]:
    """Status, headers and text of one answer."""
    connection = http.client.HTTPConnection("127.0.0.1", port, timeout=10)
    connection.request(method, path, headers={name.replace("_", "-"): value for name, value in headers.items()})
    answer = connection.getresponse()
    text = answer.read().decode()
    connection.close()
    return answer.status, answer.headers, text


def change(project: Path, text: str) -> set[tuple[Change, str]]:
    """Write the spec anew; gives the batch of changes that a watcher would report."""
    write_spec(project, text)
    return {(Change.modified, str(project / "spec" / "law.txt"))}


def test_pages_are_served_as_built_and_never_cached(server: serve.Server) -> None:
    status, headers, text = get(server.server_port, "/", If_Modified_Since="Fri, 01 Jan 2100 00:00:00 GMT")
    assert (status, text) == (200, "p V")
    assert headers["Cache-Control"] == "no-store"
    assert headers["Content-Type"] == "text/html; charset=utf-8"


@pytest.mark.parametrize(
    ("name", "kind"),
    [
        ("a.js", "text/javascript; charset=utf-8"),
        ("a.css", "text/css; charset=utf-8"),
        ("a.json", "application/json"),
        ("a.svg", "image/svg+xml"),
        ("a.whl", "application/zip"),
        ("a.unknown", "application/octet-stream"),
    ],
)
def test_types_are_the_servers_own(server: serve.Server, project: Path, name: str, kind: str) -> None:
    (project / "build" / "site" / name).touch()
    assert get(server.server_port, f"/{name}")[1]["Content-Type"] == kind


@pytest.mark.parametrize("path", ["/absent.html", "/folder/", "/../spec/law.txt", "/%2e%2e/spec/law.txt"])
def test_only_files_of_the_site_are_served(server: serve.Server, project: Path, path: str) -> None:
    (project / "build" / "site" / "folder").mkdir()
    assert get(server.server_port, path)[0] == 404


def test_it_answers_on_this_machine_alone(server: serve.Server) -> None:
    assert server.server_address[0] == "127.0.0.1"


def test_a_broken_spec_shows_the_message_and_keeps_the_last_good_site(
    server: serve.Server, builder: serve.Builder, project: Path, capsys: pytest.CaptureFixture[str]
) -> None:
    serve.rebuild_on_change(builder, [change(project, "broken")])
    status, headers, page = get(server.server_port, "/index.html?again")
    assert status == 500
    assert FAILURE in page
    assert "<script" not in page
    assert headers["Content-Security-Policy"].startswith("default-src 'none'")
    assert get(server.server_port, "/", method="HEAD")[0] == 500
    assert get(server.server_port, "/app.js")[0::2] == (200, "'use strict';")
    assert (project / "build" / "site" / "index.html").read_text(encoding="utf-8") == "p V"
    assert capsys.readouterr().out.endswith(
        "spec/law.txt changed: building ...\nboyle: found <broken>; expected a law. Mend it.\n"
    )


def test_the_next_good_build_takes_the_message_away(
    server: serve.Server, builder: serve.Builder, project: Path
) -> None:
    serve.rebuild_on_change(builder, (change(project, text) for text in ("broken", "p V = n R T")))
    assert get(server.server_port, "/")[0::2] == (200, "p V = n R T")


def test_a_build_that_dies_silently_is_still_told(project: Path) -> None:
    builder = serve.Builder(project, [sys.executable, "-c", "raise SystemExit(3)"])
    builder.build()
    assert builder.failure == "The build ended with status 3."


def test_the_next_free_port_is_taken(builder: serve.Builder, monkeypatch: pytest.MonkeyPatch) -> None:
    site = builder.root / "build" / "site"
    with serve.Server(0, site=site, builder=builder) as taken, serve.Server(0, site=site, builder=builder) as other:
        free = other.server_port
        other.server_close()
        monkeypatch.setattr(serve, "_PORTS", (taken.server_port, free))
        with serve.open_server(None, site=site, builder=builder) as server:
            assert server.server_port == free


def test_a_port_asked_for_and_taken_is_refused(builder: serve.Builder) -> None:
    site = builder.root / "build" / "site"
    with serve.Server(0, site=site, builder=builder) as taken:
        port = taken.server_port
        with pytest.raises(SetUpError) as caught:
            serve.open_server(port, site=site, builder=builder)
    assert str(caught.value) == (
        f"serve: found port {port} taken or not allowed; expected a free port. Name another one: serve --port NUMBER."
    )


def test_the_whole_command_builds_watches_recovers_and_ends_quietly(project: Path) -> None:
    write_spec(project, "broken")
    call = f"serve(Path.cwd(), port=None, build={[sys.executable, '-c', BUILD]!r})"
    code = f"from pathlib import Path; from generator.serve import serve; {call}"
    with subprocess.Popen(
        [sys.executable, "-c", code], cwd=project, stdout=subprocess.PIPE, stderr=subprocess.PIPE, text=True
    ) as process:
        assert process.stdout is not None
        lines = [process.stdout.readline() for _ in range(3)]
        assert lines[0] == "boyle: found <broken>; expected a law. Mend it.\n"
        assert lines[2] == f"Without a server, double-click {project / 'build' / 'site' / 'index.html'}\n"
        port = int(lines[1].removeprefix("Serving http://127.0.0.1:").partition("/")[0])
        assert get(port, "/")[0] == 500
        wait_for_build(project, port)
        process.send_signal(signal.SIGINT)
        _, said = process.communicate(timeout=20)
    assert (process.returncode, said) == (0, "")


def wait_for_build(project: Path, port: int) -> None:
    """Mend the spec, again and again until the watcher, which starts when it likes, has seen it."""
    deadline = time.monotonic() + 30
    while time.monotonic() < deadline:
        write_spec(project, "p V")
        time.sleep(1)
        if get(port, "/")[0::2] == (200, "p V"):
            return
    pytest.fail("the mended spec was not built within 30 s")
