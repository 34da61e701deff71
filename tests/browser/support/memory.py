"""A folder that lives in memory, where the machine has one.

Browsers write their profiles through to the disk, which takes seconds on a slow one. Takes nothing; gives a path for
`tempfile`, or None for its own choice. Next: conftest.py puts profiles there.
"""

import os
import shutil
from pathlib import Path

SHARED = Path("/dev/shm")  # noqa: S108 - only temporary folders with names of their own are made in it
LEAST_BYTES = 2 * 10**9


def folder_in_memory() -> Path | None:
    """Give the folder, or None where there is none or little room in it."""
    if os.access(SHARED, os.W_OK) and shutil.disk_usage(SHARED).free >= LEAST_BYTES:
        return SHARED
    return None
