"""The errors a person may meet, each told in four parts.

Takes the facts of what went wrong; gives exceptions that keep them as attributes.
Every other module of the engine raises these and nothing else for bad input.
"""


class GaswrightError(ValueError):
    """An error told in four parts: where, what was found, what was expected, what to do."""

    def __init__(self, where: str, found: str, expected: str, todo: str) -> None:
        """Keep the four parts as attributes and join them into one message."""
        self.where = where
        self.found = found
        self.expected = expected
        self.todo = todo
        super().__init__(f"{where}: found {found}; expected {expected}. {todo}")


class ReadingError(GaswrightError):
    """A reading that cannot be taken as typed.

    ``question`` is true where the reading has more than one meaning and the person is asked;
    ``offers`` then holds the spellings to choose from.
    """

    def __init__(self, where: str, found: str, expected: str, todo: str, *, offers: tuple[str, ...] = ()) -> None:
        """Keep the four parts and the spellings offered."""
        super().__init__(where, found, expected, todo)
        self.offers = offers
        self.question = bool(offers)


class NoSolutionError(GaswrightError):
    """The readings are fine one by one, but no value of the row to find agrees with them all."""


class OutsideRangeError(GaswrightError):
    """A state where the relation or the gas model says nothing, so no figure is given."""
