"""A WebDriver BiDi connection: commands out, results and events in.

Takes the browser's web-socket address. Gives results of commands, and hands each event to a listener.
Source of the message forms: W3C WebDriver BiDi, sections 3 (protocol) and 7 (modules). Next: firefox.py.
"""

import itertools
import json
import time
from collections.abc import Callable
from contextlib import ExitStack
from typing import Any

from websockets.exceptions import ConnectionClosed
from websockets.sync.client import connect

from tests.browser.support.errors import BrowserError

COMMAND_TIMEOUT_S = 60.0

type Json = dict[str, Any]


class BidiConnection:
    """One web socket to one browser; used from one thread."""

    def __init__(self, address: str, listener: Callable[[str, Json], None]) -> None:
        """Connect; `listener` gets the method and parameters of every event, while a command or `listen` waits."""
        # No proxy: the browser is on this machine. No limit: a screenshot is one long message.
        self._open = ExitStack()
        self._socket = self._open.enter_context(connect(address, max_size=None, proxy=None))
        self._listener = listener
        self._numbers = itertools.count(1)

    def command(self, method: str, **parameters: object) -> Json:
        """Send a command and wait for its result."""
        number = next(self._numbers)
        self._socket.send(json.dumps({"id": number, "method": method, "params": parameters}))
        deadline = time.monotonic() + COMMAND_TIMEOUT_S
        while True:
            message = self._receive(deadline, method)
            if message.get("id") == number:
                return read_result(method, message)

    def listen(self, seconds: float) -> None:
        """Take in events for that long."""
        deadline = time.monotonic() + seconds
        while (left := deadline - time.monotonic()) > 0:
            try:
                self._take(self._socket.recv(left))
            except TimeoutError:
                return

    def close(self) -> None:
        """Close the socket."""
        self._open.close()

    def _receive(self, deadline: float, method: str) -> Json:
        try:
            return self._take(self._socket.recv(max(0.0, deadline - time.monotonic())))
        except TimeoutError:
            raise no_answer(method, f"no answer after {COMMAND_TIMEOUT_S} s") from None
        except ConnectionClosed as closed:
            raise no_answer(method, f"the browser ended the connection: {closed}") from None

    def _take(self, text: str | bytes) -> Json:
        message: Json = json.loads(text)
        if message["type"] == "event":
            self._listener(message["method"], message["params"])
        return message


def no_answer(method: str, found: str) -> BrowserError:
    """Describe a command that brought neither a result nor an error."""
    return BrowserError(
        where=f"firefox, command {method}",
        found=found,
        expected="an answer",
        todo="look for a page script that never ends, a browser that crashed, or a machine too busy to answer",
    )


def read_result(method: str, message: Json) -> Json:
    """Take the `result` out of an answer; raises `BrowserError` where the browser answered with an error."""
    if message["type"] == "error":
        raise BrowserError(
            where=f"firefox, command {method}",
            found=f"{message['error']}: {message['message']}",
            expected="success",
            todo="correct the address, the selector or the parameters of the step",
        )
    result: Json = message["result"]
    return result
