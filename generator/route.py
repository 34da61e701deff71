"""Find a way through every sheet for every row that may be asked for.

Takes ``Checked``; gives ``Routed``: for each question the steps in order, and where rows depend on one another a block
torn at one row. A row the structure cannot determine is a SpecError. Next: generator.emit_sheets.
"""

from collections.abc import Iterator, Mapping
from dataclasses import dataclass
from itertools import product

import networkx as nx

from generator.check import Checked
from generator.errors import SpecError
from spec.model import Sheet


@dataclass(frozen=True, slots=True, kw_only=True)
class Step:
    """The use, by its place in the sheet, that gives ``row`` by its relation's form for ``unknown``."""

    use: int
    unknown: str
    row: str


@dataclass(frozen=True, slots=True, kw_only=True)
class Block:
    """Rows that depend on one another: guess ``torn``, take ``steps``, until the residual of ``use`` is zero."""

    torn: str
    use: int
    steps: tuple[Step, ...]


Route = tuple[Step | Block, ...]


@dataclass(frozen=True, slots=True, kw_only=True)
class Routed:
    """The checked spec with a route for each question of each sheet."""

    checked: Checked
    routes: Mapping[str, Mapping[str, Route]]


def route(checked: Checked) -> Routed:
    """Route every sheet; every row that cannot be found is reported in one ExceptionGroup."""
    routes: dict[str, dict[str, Route]] = {}
    mistakes: list[SpecError] = []
    for sheet in checked.loaded.sheets:
        mistakes.extend(_misbound(sheet))
        routes[sheet.key] = {}
        for find in [] if mistakes else sheet.finds:
            try:
                routes[sheet.key][find.row] = route_sheet(sheet, find.row)
            except SpecError as mistake:
                mistakes.append(mistake)
    if mistakes:
        raise ExceptionGroup("a sheet cannot be routed", mistakes)
    return Routed(checked=checked, routes=routes)


def _misbound(sheet: Sheet) -> Iterator[SpecError]:
    for place, use in enumerate(sheet.uses):
        names = {symbol.name for symbol in use.relation.where if not hasattr(use.relation.where[symbol], "value")}
        for name in names ^ set(use.rows):
            yield SpecError(
                f"sheet {sheet.key}, use {place + 1} of {use.relation.key}",
                f"the variable {name} bound on one side only",
                f"rows for exactly {', '.join(sorted(names))}",
                "bind every variable of the relation once",
            )
        for row in [row for row in use.rows.values() if row not in sheet.rows]:
            yield SpecError(
                f"sheet {sheet.key}, use {place + 1} of {use.relation.key}",
                f"the row {row}",
                "a row of the sheet",
                f"add {row} to rows or correct the name",
            )


def route_sheet(sheet: Sheet, find: str) -> Route:
    """Give the route that finds ``find`` from the other readings of ``sheet``."""
    unknowns = [name for name, row in sheet.rows.items() if name == find or not (row.reading or row.of_gas)]
    matching = _match(sheet, range(len(sheet.uses)), unknowns)
    if matching is None:
        raise SpecError(
            f"sheet {sheet.key}, row {find}",
            f"{len(sheet.uses)} uses for {len(unknowns)} rows to work out, which do not determine one another",
            "one use for each row that is worked out and for the row to find",
            f"add the relation that is missing, or take {find} out of finds",
        )
    parts: list[Step | Block] = []
    for uses in _ordered(sheet, matching):
        if len(uses) == 1:
            parts.append(_step(sheet, uses[0], matching[uses[0]]))
        else:
            parts.append(_tear(sheet, find, sorted(uses), sorted(matching[use] for use in uses)))
    return tuple(parts)


def _step(sheet: Sheet, use: int, row: str) -> Step:
    unknown = next(name for name, bound in sheet.uses[use].rows.items() if bound == row)
    return Step(use=use, unknown=unknown, row=row)


def _match(sheet: Sheet, uses: range | list[int], rows: list[str]) -> Mapping[int, str] | None:
    """Give each use the row it works out, or None where there is no perfect matching."""
    graph = nx.Graph()
    graph.add_nodes_from(("use", use) for use in uses)
    graph.add_nodes_from(("row", row) for row in rows)
    graph.add_edges_from(
        (("use", use), ("row", row))
        for use in uses
        for row in rows
        if list(sheet.uses[use].rows.values()).count(row) == 1
    )
    if len(rows) != len(uses):
        return None
    found = nx.bipartite.maximum_matching(graph, top_nodes=[("use", use) for use in uses])
    matching = {use: found[("use", use)][1] for use in uses if ("use", use) in found}
    return matching if len(matching) == len(rows) else None


def _ordered(sheet: Sheet, matching: Mapping[int, str]) -> Iterator[list[int]]:
    """Give the strongly connected groups of uses, each after those it depends on."""
    graph = nx.DiGraph()
    graph.add_nodes_from(sorted(matching))
    giver = {row: use for use, row in matching.items()}
    for use in sorted(matching):
        for row in sheet.uses[use].rows.values():
            if row in giver and giver[row] != use:
                graph.add_edge(giver[row], use)
    groups = nx.condensation(graph)
    for group in nx.lexicographical_topological_sort(groups, key=lambda node: min(groups.nodes[node]["members"])):
        yield sorted(groups.nodes[group]["members"])


def _tear(sheet: Sheet, find: str, uses: list[int], rows: list[str]) -> Block:
    """Guess one row of a block so that the rest follows step by step; the row to be found comes first as the guess."""
    guesses = sorted(rows, key=lambda row: (row != find, not sheet.rows[row].reading, row))
    for torn, kept in product(guesses, reversed(uses)):
        rest_uses = [use for use in uses if use != kept]
        rest_rows = [row for row in rows if row != torn]
        matching = _match(sheet, rest_uses, rest_rows)
        if matching is None or (torn not in sheet.uses[kept].rows.values() and not rest_rows):
            continue
        order = list(_ordered(sheet, matching))
        if all(len(group) == 1 for group in order):
            steps = tuple(_step(sheet, group[0], matching[group[0]]) for group in order)
            return Block(torn=torn, use=kept, steps=steps)
    raise SpecError(
        f"sheet {sheet.key}, row {find}",
        f"the rows {', '.join(rows)}, which one guess does not untie",
        "a block that one guessed row makes explicit",
        "split the block with a relation that gives one of its rows",
    )
