"""Solve a small system of linear equations.

Takes a square matrix as rows and a right side; gives the solution. gaswright.network differentiates with it.
"""

from gaswright.errors import NoSolutionError

SMALLEST = 1e-14


def solve_linear(matrix: list[list[float]], right: list[float], where: str) -> list[float]:
    """Give x with ``matrix @ x = right`` by elimination with scaled pivots.

    Raises NoSolutionError where the rows do not determine the answer (the matrix is singular).
    """
    rows = [[*line, value] for line, value in zip(matrix, right, strict=True)]
    _scale_rows(rows)
    columns = _scale_columns(rows)
    size = len(rows)
    for column in range(size):
        pivot = max(range(column, size), key=lambda line: abs(rows[line][column]))
        if abs(rows[pivot][column]) < SMALLEST:
            raise NoSolutionError(
                where,
                "readings that do not fix it",
                "readings on which the answer depends in one way only",
                "Check the readings, or ask for another row.",
            )
        rows[column], rows[pivot] = rows[pivot], rows[column]
        for line in range(column + 1, size):
            factor = rows[line][column] / rows[column][column]
            if factor:
                rows[line] = [a - factor * b for a, b in zip(rows[line], rows[column], strict=True)]
    return [part * scale for part, scale in zip(_back(rows), columns, strict=True)]


def _scale_rows(rows: list[list[float]]) -> None:
    for place, line in enumerate(rows):
        largest = max(map(abs, line[:-1])) or 1.0
        rows[place] = [part / largest for part in line]


def _scale_columns(rows: list[list[float]]) -> list[float]:
    scales = [1 / (max(abs(line[column]) for line in rows) or 1.0) for column in range(len(rows))]
    for line in rows:
        for column, scale in enumerate(scales):
            line[column] *= scale
    return scales


def _back(rows: list[list[float]]) -> list[float]:
    size = len(rows)
    found = [0.0] * size
    for line in range(size - 1, -1, -1):
        rest = sum(rows[line][column] * found[column] for column in range(line + 1, size))
        found[line] = (rows[line][size] - rest) / rows[line][line]
    return found
