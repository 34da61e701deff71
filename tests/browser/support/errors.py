"""What a failed step in a browser says.

Takes the four facts of a failure. Gives `BrowserError`. Next: raised by tab.py and the two drivers.
"""


class BrowserError(Exception):
    """A step in the browser did not go as the test asked: where, found, expected, what to do."""

    def __init__(self, *, where: str, found: str, expected: str, todo: str) -> None:
        """Keep the four parts as attributes; the message has one line for each."""
        self.where = where
        self.found = found
        self.expected = expected
        self.todo = todo
        super().__init__(f"{where}\n  found: {found}\n  expected: {expected}\n  what to do: {todo}")
