"""The errors of set-up and build, each told in four parts.

Takes the facts of what went wrong; gives exceptions that keep them as attributes.
Every stage of the generator raises these; ``commands`` prints them. Any Python from 3.6 on reads this module.
"""


class GeneratorError(ValueError):
    """An error told in four parts: where, what was found, what was expected, what to do."""

    def __init__(self, where: str, found: str, expected: str, todo: str) -> None:
        """Keep the four parts as attributes and join them into one message."""
        self.where = where
        self.found = found
        self.expected = expected
        self.todo = todo
        super().__init__("{}: found {}; expected {}. {}".format(where, found, expected, todo))

    def __reduce__(self) -> "tuple[type, tuple[str, str, str, str]]":
        """Travel between the processes of a build whole."""
        return type(self), (self.where, self.found, self.expected, self.todo)


class SpecError(GeneratorError):
    """A mistake in the spec, or in what the build makes of it."""


class SetUpError(GeneratorError):
    """Something the machine lacks, or that could not be installed."""
