"""The site served on this machine, built again on each change of its sources.

Takes the project's folder and the command that builds; serves until Ctrl-C.
A broken spec leaves the last good site in its folder; pages then show the build's message until the next good build.
"""

import errno
import html
import signal
import subprocess
import sys
from collections.abc import Iterable, Iterator, Sequence
from functools import partial
from http import HTTPStatus
from http.server import SimpleHTTPRequestHandler, ThreadingHTTPServer
from os import PathLike
from pathlib import Path
from threading import Thread
from typing import override

from watchfiles import DefaultFilter, watch
from watchfiles.main import FileChange

from generator.errors import SetUpError

HOST = "127.0.0.1"
FIRST_PORT = 8000
_PORTS = range(FIRST_PORT, FIRST_PORT + 100)
_SOURCES = ("spec", "generator", "site_src")
_SECURITY = "default-src 'none'; base-uri 'none'; form-action 'none'"
_PAGE = """<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><title>The site could not be built</title></head>
<body>
<h1>The site could not be built</h1>
<pre>{text}</pre>
<p>The last good site is still in build/site.
Correct the source: it is built again at once; then load this page again.</p>
</body>
</html>
"""


class Builder:
    """Runs the build in a process of its own and remembers what a failed one said."""

    def __init__(self, root: Path, command: Sequence[str]) -> None:
        """Keep the folder and the command."""
        self.root = root
        self.command = command
        self.failure: str | None = None

    def build(self) -> None:
        """Build once; the output goes to the terminal, and to ``failure`` where the build failed."""
        done = subprocess.run(
            list(self.command),
            cwd=self.root,
            stdout=subprocess.PIPE,
            stderr=subprocess.STDOUT,
            encoding="utf-8",
            errors="replace",
            check=False,
        )
        said = done.stdout.strip()
        print(said, flush=True)
        self.failure = (said or f"The build ended with status {done.returncode}.") if done.returncode else None


class Server(ThreadingHTTPServer):
    """A static server on this machine alone."""

    daemon_threads = True
    # Elsewhere this lets a port be taken again at once; on Windows it would let two servers share one.
    allow_reuse_address = sys.platform != "win32"

    def __init__(self, port: int, *, site: Path, builder: Builder) -> None:
        """Take the port (0: any free one) and keep what is served.

        Raises:
            OSError: the port is not free.
        """
        self.builder = builder
        super().__init__((HOST, port), partial(Handler, directory=str(site)))


class Handler(SimpleHTTPRequestHandler):
    """Answers with files of the site, or with the build's message where it failed."""

    server: Server
    # The site's own types, whatever this machine's registry of types says.
    extensions_map = {  # noqa: RUF012 - the base class declares it as an instance's
        ".css": "text/css; charset=utf-8",
        ".csv": "text/csv; charset=utf-8",
        ".html": "text/html; charset=utf-8",
        ".ico": "image/vnd.microsoft.icon",
        ".js": "text/javascript; charset=utf-8",
        ".json": "application/json",
        ".pdf": "application/pdf",
        ".png": "image/png",
        ".svg": "image/svg+xml",
        ".toml": "application/toml",
        ".txt": "text/plain; charset=utf-8",
        ".wasm": "application/wasm",
        ".whl": "application/zip",
        ".woff2": "font/woff2",
        ".xml": "application/xml",
        ".zip": "application/zip",
        "": "application/octet-stream",
    }

    @override
    def do_GET(self) -> None:
        if not self._tell_failure():
            super().do_GET()

    @override
    def do_HEAD(self) -> None:
        if not self._tell_failure():
            super().do_HEAD()

    def _tell_failure(self) -> bool:
        """Whether the build's message was sent in place of a page."""
        # Without this header no answer is "not modified": a page after a build is never an old one.
        del self.headers["If-Modified-Since"]
        failure = self.server.builder.failure
        if failure is None or not self._is_page():
            return False
        page = _PAGE.format(text=html.escape(failure)).encode()
        self.send_response(HTTPStatus.INTERNAL_SERVER_ERROR)
        self.send_header("Content-Type", self.extensions_map[".html"])
        self.send_header("Content-Length", str(len(page)))
        self.send_header("Content-Security-Policy", _SECURITY)
        self.end_headers()
        if self.command == "GET":
            self.wfile.write(page)
        return True

    def _is_page(self) -> bool:
        return self.path.partition("?")[0].endswith(("/", ".html"))

    @override
    def end_headers(self) -> None:
        self.send_header("Cache-Control", "no-store")
        super().end_headers()

    @override
    def list_directory(self, path: str | PathLike[str]) -> None:
        self.send_error(HTTPStatus.NOT_FOUND)

    @override
    def log_message(self, format: str, *args: object) -> None:
        """Keep the terminal for the builds."""


def serve(root: Path, *, port: int | None, build: Sequence[str]) -> int:
    """Build, then serve ``build/site`` and build again on each change, until Ctrl-C.

    Raises:
        SetUpError: the port asked for, or every usual one, is taken.
    """
    # A shell that starts it in the background leaves the interrupt ignored; it is the way to stop here.
    signal.signal(signal.SIGINT, signal.default_int_handler)
    builder = Builder(root, build)
    site = root / "build" / "site"
    try:
        builder.build()
        with open_server(port, site=site, builder=builder) as server:
            Thread(target=server.serve_forever, daemon=True).start()
            print(f"Serving http://{HOST}:{server.server_port}/ (Ctrl-C stops).", flush=True)
            print(f"Without a server, double-click {site / 'index.html'}", flush=True)
            rebuild_on_change(builder, watch_sources(root))
            server.shutdown()
    except KeyboardInterrupt:
        print()
    return 0


def open_server(port: int | None, *, site: Path, builder: Builder) -> Server:
    """A server on the port asked for, or on the first usual one that is free.

    Raises:
        SetUpError: none is free.
    """
    ports = _PORTS if port is None else (port,)
    for each in ports:
        try:
            return Server(each, site=site, builder=builder)
        except OSError as problem:
            if problem.errno not in {errno.EADDRINUSE, errno.EACCES}:
                raise
    asked = f"port {port}" if port is not None else f"ports {_PORTS[0]} to {_PORTS[-1]}"
    raise SetUpError("serve", f"{asked} taken or not allowed", "a free port", "Name another one: serve --port NUMBER.")


def watch_sources(root: Path) -> Iterator[set[FileChange]]:
    """The changes of the sources, a batch at a time, until Ctrl-C."""
    folders = [root / name for name in _SOURCES if (root / name).is_dir()]
    return watch(*folders, watch_filter=DefaultFilter(), raise_interrupt=True)


def rebuild_on_change(builder: Builder, changes: Iterable[set[FileChange]]) -> None:
    """Build once for each batch of changes, and name one of the files that changed."""
    for batch in changes:
        name = min(Path(path).relative_to(builder.root).as_posix() for _, path in batch)
        print(f"{name} changed: building ...", flush=True)
        builder.build()
