"""A static server on this machine, for tests over http.

Takes a folder and a path under which to serve it. Gives the address. Next: conftest.py.
"""

import functools
import threading
from collections.abc import Iterator
from contextlib import contextmanager
from http import HTTPStatus
from http.server import SimpleHTTPRequestHandler, ThreadingHTTPServer
from pathlib import Path


class FolderHandler(SimpleHTTPRequestHandler):
    """Serves a folder under one path, and nothing outside that path, as a site in a corner of a server would be."""

    def __init__(self, *arguments: object, prefix: str, directory: str) -> None:
        """Answer one connection; `prefix` starts and ends with a slash."""
        self._prefix = prefix
        super().__init__(*arguments, directory=directory)  # type: ignore[arg-type]  # handed on by the server unchanged

    def send_head(self) -> object:  # type: ignore[override]  # the type stubs name a private stream type
        """Answer below the prefix; 404 elsewhere."""
        if not self.path.startswith(self._prefix):
            self.send_error(HTTPStatus.NOT_FOUND)
            return None
        self.path = self.path.removeprefix(self._prefix.removesuffix("/"))
        return super().send_head()

    def log_message(self, *arguments: object) -> None:
        """Say nothing: the tests' output is theirs."""


@contextmanager
def serve_folder(folder: Path, *, prefix: str = "/") -> Iterator[str]:
    """Address of the folder, ending in a slash, while it is served from a free port of 127.0.0.1."""
    handler = functools.partial(FolderHandler, prefix=prefix, directory=str(folder))
    with ThreadingHTTPServer(("127.0.0.1", 0), handler) as server:
        thread = threading.Thread(target=server.serve_forever, kwargs={"poll_interval": 0.05})
        thread.start()
        try:
            yield f"http://127.0.0.1:{server.server_port}{prefix}"
        finally:
            server.shutdown()
            thread.join()
