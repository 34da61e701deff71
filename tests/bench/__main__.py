"""Every measurement, one after the other.

Takes nothing; prints each and fails when one that has a budget exceeds it. ``python3 -m generator bench`` runs this.
"""

import subprocess
import sys

MEASUREMENTS = ("start", "answers", "gas_density")


def main() -> int:
    """Run every measurement in a process of its own and give 1 where one failed."""
    failed = [name for name in MEASUREMENTS if subprocess.call([sys.executable, "-m", f"tests.bench.{name}"])]
    if failed:
        print(f"over budget or failed: {', '.join(failed)}")
    return 1 if failed else 0


if __name__ == "__main__":
    sys.exit(main())
