"""What the tests of registry/compile_data.py share: a run on data of their own, and the checks on what it says."""
import pathlib
import subprocess
import sys
import tempfile

# A source `s` and a class of uncertainty `u`, for the data of the tests.
COMMON = """source s
  key S 1
  citation Somebody, Somewhere, 2001

uncertainty u
  relative 0.01
  growth 0.001
  origin derived
  reason scatter of a fit
"""


class Checks:
    def __init__(self, registry, good, names=None):
        """`good`: data that compiles; `names`: what names.txt holds, if there shall be one."""
        self.compiler = pathlib.Path(registry) / "compile_data.py"
        self.good = good
        self.names = names
        self.failures = []

    def compiled(self, substance, names=None):
        """Exit code, what it said, and what it wrote."""
        names = names or self.names
        with tempfile.TemporaryDirectory() as directory:
            data = pathlib.Path(directory)
            (data / "common.txt").write_text(COMMON, encoding="utf-8")
            (data / "data.txt").write_text(substance, encoding="utf-8")
            if names:
                (data / "names.txt").write_text(names, encoding="utf-8")
            out = data / "out.cpp"
            run = subprocess.run([sys.executable, "-B", self.compiler, directory, out], capture_output=True, text=True)
            return run.returncode, run.stderr.strip(), out.read_text() if out.exists() else ""

    def check(self, what, holds):
        if not holds:
            self.failures.append(what)

    def refused(self, wanted, old, new, names=None):
        """With `old` replaced by `new` the good data is refused with words that begin with `wanted`."""
        assert old in self.good, old
        code, said, out = self.compiled(self.good.replace(old, new, 1), names)
        self.check(f"{new!r}: wanted {wanted!r}, said {said!r}", code != 0 and said.startswith(wanted) and not out)

    def end(self):
        for failure in self.failures:
            print(failure)
        sys.exit(bool(self.failures))
