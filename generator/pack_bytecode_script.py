"""The bare process that compiles: run as a script, with the standard library only.

Takes an archive of sources on standard input and their folder as its argument; gives the archive of compiled files on
standard output.
``pack_bytecode`` runs it.
"""

import importlib.util
import io
import marshal
import sys
import zipfile

#: PEP 552: marked by the source's hash rather than its date, and the hash is not looked at on loading.
_UNCHECKED_HASH = (1).to_bytes(4, "little")


def compile_source(source: bytes, path: str) -> bytes:
    """The content of the ``.pyc`` file of one source."""
    code = compile(source, path, "exec", dont_inherit=True, optimize=0)
    return importlib.util.MAGIC_NUMBER + _UNCHECKED_HASH + importlib.util.source_hash(source) + marshal.dumps(code)


def main(folder: str) -> None:
    """Compile the archive on standard input to the one on standard output."""
    result = io.BytesIO()
    with zipfile.ZipFile(io.BytesIO(sys.stdin.buffer.read())) as sources, zipfile.ZipFile(result, "w") as compiled:
        for name in sources.namelist():
            content = sources.read(name)
            if name.endswith(".py"):
                compiled.writestr(f"{name}c", compile_source(content, folder + name))
            else:
                compiled.writestr(name, content)
    sys.stdout.buffer.write(result.getvalue())


if __name__ == "__main__":
    main(sys.argv[1])
