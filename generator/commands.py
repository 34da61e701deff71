"""The repository's commands, run inside the project's environment.

Takes the words typed after ``python3 -m generator``; gives the exit status.
``pipeline`` builds and checks, ``serve`` serves, ``selftest`` runs the tests.
"""

import argparse
import subprocess
import sys
import time
from pathlib import Path

from generator.errors import GeneratorError, SetUpError
from generator.selftest import run_tests
from generator.serve import serve

ROOT = Path(__file__).resolve().parents[1]
SITE = ROOT / "build" / "site"
BUILD = (sys.executable, "-m", "generator", "build")


def run(arguments: list[str]) -> int:
    """The exit status of one command; errors in four parts are printed, one a paragraph."""
    try:
        return _dispatch(arguments)
    except* GeneratorError as problems:
        print("\n\n".join(messages(problems)), file=sys.stderr)
        return_code = 1
    except* KeyboardInterrupt:
        return_code = 130
    return return_code


def messages(problems: BaseExceptionGroup[GeneratorError]) -> list[str]:
    """The message of each error of a group and of the groups in it, in order."""
    listed = []
    for problem in problems.exceptions:
        listed += messages(problem) if isinstance(problem, BaseExceptionGroup) else [str(problem)]
    return listed


def _dispatch(arguments: list[str]) -> int:
    options, others = _parser().parse_known_args(arguments)
    if others and options.command not in {"test", "bench"}:
        todo = "Run it with --help for its options."
        raise SetUpError(f"command {options.command}", " ".join(others), "nothing more", todo)
    match options.command:
        case "build":
            return _build()
        case "check":
            return _check()
        case "serve":
            return serve(ROOT, port=options.port, build=BUILD)
        case "test":
            return run_tests(ROOT, build=BUILD, others=others)
        case _:
            return _bench(others)


def _parser() -> argparse.ArgumentParser:
    parser = argparse.ArgumentParser(prog="python3 -m generator", description="From the spec to the site.")
    commands = parser.add_subparsers(dest="command", required=True)
    commands.add_parser("build", help="make build/site and build/wheel from the spec")
    commands.add_parser("check", help="check the spec and write nothing")
    server = commands.add_parser("serve", help="build, serve the site on this machine, build again on each change")
    server.add_argument("--port", type=int, help="the port to serve on (default: 8000, or the next that is free)")
    commands.add_parser("test", help="build and test everything; further words go to pytest; --all for the full counts")
    commands.add_parser("bench", help="build and measure; further words go to the measurements")
    return parser


def _build() -> int:
    from generator.pipeline import build  # noqa: PLC0415 - loads sympy, which the other commands do without

    start = time.monotonic()
    build(ROOT)
    print(f"Built in {time.monotonic() - start:.0f} s: {SITE / 'index.html'}")
    return 0


def _check() -> int:
    from generator.pipeline import check  # noqa: PLC0415 - loads sympy, which the other commands do without

    print(check(ROOT))
    return 0


def _bench(others: list[str]) -> int:
    status = subprocess.call(BUILD, cwd=ROOT)
    return status or subprocess.call([sys.executable, "-m", "tests.bench", *others], cwd=ROOT)
