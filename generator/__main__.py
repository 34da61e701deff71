"""The repository's commands: ``python3 -m generator build | check | serve | test | bench``.

Takes the words after the module's name; gives the command's exit status.
``bootstrap`` makes the environment first. Any Python from 3.6 on reads this module.
"""

import sys

from generator.bootstrap import main

if __name__ == "__main__":
    sys.exit(main(sys.argv[1:]))
