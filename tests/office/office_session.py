"""A real LibreOffice for the tests: headless, with a profile of its own and the extension bundled.

    with OfficeSession(extensions_folder()) as office:
        document = office.new_document()

It starts one process group, ends that one only, and no wait in it is without bound. Needs the python3 that has `uno`.
"""

import os
import shutil
import signal
import subprocess
import tempfile
import threading
import time
import uuid
from pathlib import Path

import uno
from com.sun.star.beans import PropertyValue
from com.sun.star.connection import NoConnectException
from com.sun.star.uno import Exception as UnoException

FILTERS = {".ods": "calc8", ".fods": "OpenDocument Spreadsheet Flat XML", ".xlsx": "Calc MS Excel 2007 XML",
           ".csv": "Text - txt - csv (StarCalc)"}

_SETTINGS = """<?xml version="1.0" encoding="UTF-8"?>
<oor:items xmlns:oor="http://openoffice.org/2001/registry" xmlns:xs="http://www.w3.org/2001/XMLSchema"
           xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance">
{items}</oor:items>
"""
_SETTING = '<item oor:path="{}"><prop oor:name="{}" oor:op="fuse"><value>{}</value></prop></item>\n'


def find_office() -> Path:
    """The soffice program: the folder in ENTROPY_LEDGER_OFFICE, or what the search path has."""
    folder = os.environ.get("ENTROPY_LEDGER_OFFICE")
    if folder:
        return Path(folder) / "program" / "soffice"
    found = shutil.which("soffice")
    if not found:
        raise FileNotFoundError("soffice is not on the search path and ENTROPY_LEDGER_OFFICE is not set")
    return Path(found).resolve()


def extensions_folder() -> Path:
    """The folder with the unpacked extension under test, as the build hands it over."""
    return Path(os.environ["ENTROPY_LEDGER_EXTENSIONS"])


def properties(**values) -> tuple:
    return tuple(PropertyValue(Name=name, Value=value) for name, value in values.items())


class OfficeSession:
    def __init__(self, extensions: Path | None, locale: str = "en-US", ui: str | None = None,
                 start_limit: float = 90.0, limit: float = 600.0) -> None:
        """`extensions`: the folder that holds unpacked extensions; none: an office without ours.
        `locale` decides on decimal signs, `ui` on the language of names and texts (as `locale` when left out).
        After `limit` seconds the office is ended, so that a call that hangs fails instead of hanging the tests."""
        self._extensions = extensions
        self._locale = locale
        self._ui = ui or locale
        self._start_limit = start_limit
        self._limit = limit
        self._process = None
        self._watchdog = None
        self.desktop = None

    # Start and end

    def __enter__(self) -> "OfficeSession":
        self.folder = Path(tempfile.mkdtemp(prefix="entropy-ledger-office-"))
        try:
            self._start()
            self.context = self._connect()
            self.desktop = self.service("com.sun.star.frame.Desktop")
        except BaseException:
            self._end()
            raise
        return self

    def __exit__(self, *_) -> None:
        self._end()

    def _start(self) -> None:
        user = self.folder / "profile" / "user"
        user.mkdir(parents=True)
        settings = _SETTINGS.format(items="".join(_SETTING.format(*setting) for setting in (
            ("/org.openoffice.Setup/L10N", "ooLocale", self._ui),
            ("/org.openoffice.Setup/L10N", "ooSetupSystemLocale", self._locale),
            ("/org.openoffice.Office.Linguistic/General", "UILocale", self._ui),
            ("/org.openoffice.Office.Common/Misc", "FirstRun", "false"))))
        (user / "registrymodifications.xcu").write_text(settings, encoding="utf-8")
        self._pipe = "entropyledger" + uuid.uuid4().hex
        command = [str(find_office()), "--headless", "--invisible", "--norestore", "--nologo", "--nodefault",
                   "--nofirststartwizard", "--nolockcheck", f"--accept=pipe,name={self._pipe};urp;",
                   f"-env:UserInstallation={(self.folder / 'profile').as_uri()}"]
        # A folder without extensions keeps those of the machine out as well.
        bundled = self._extensions or self.folder / "no-extensions"
        bundled.mkdir(exist_ok=True)
        command.append(f"-env:BUNDLED_EXTENSIONS={Path(bundled).resolve().as_uri()}")
        temporary = self.folder / "temporary"
        temporary.mkdir()
        self._log = open(self.folder / "office.log", "wb")
        self._process = subprocess.Popen(command, stdin=subprocess.DEVNULL, stdout=self._log, stderr=self._log,
                                         start_new_session=True, env={**os.environ, "TMPDIR": str(temporary)})
        self._watchdog = threading.Timer(self._limit, self._signal, [signal.SIGKILL])
        self._watchdog.daemon = True
        self._watchdog.start()

    def _connect(self):
        local = uno.getComponentContext()
        resolver = local.ServiceManager.createInstanceWithContext("com.sun.star.bridge.UnoUrlResolver", local)
        url = f"uno:pipe,name={self._pipe};urp;StarOffice.ComponentContext"
        end = time.monotonic() + self._start_limit
        while True:
            try:
                return resolver.resolve(url)
            except NoConnectException:
                if self._process.poll() is not None:
                    raise RuntimeError(f"soffice ended with {self._process.returncode}: {self.log()}") from None
                if time.monotonic() > end:
                    raise TimeoutError(f"soffice did not answer in {self._start_limit} s: {self.log()}") from None
                time.sleep(0.1)

    def _signal(self, number: int) -> None:
        # The process leads a group of its own, which holds whatever it started.
        if self._process is not None:
            try:
                os.killpg(self._process.pid, number)
            except ProcessLookupError:
                pass

    def _wait(self, seconds: float) -> bool:
        try:
            self._process.wait(seconds)
            return True
        except subprocess.TimeoutExpired:
            return False

    def _end(self) -> None:
        if self._process is not None:
            try:
                if self.desktop is not None:
                    self.close_all()
                    self.desktop.terminate()
            except UnoException:
                pass  # it is gone already, or goes by the signal below
            self.ended_by_itself = self.desktop is not None and self._wait(30.0)
            self.exit_code = self._process.poll()
            for number in (signal.SIGTERM, signal.SIGKILL):
                if self._wait(0.0):
                    break
                self._signal(number)
                self._wait(10.0)
            self._signal(signal.SIGKILL)  # what the first process may have left behind in its group
            self._watchdog.cancel()
            self._log.close()
            self._process = None
        shutil.rmtree(self.folder, ignore_errors=True)

    def log(self) -> str:
        return (self.folder / "office.log").read_text(encoding="utf-8", errors="replace")

    # What tests do with it

    def service(self, name: str):
        return self.context.ServiceManager.createInstanceWithContext(name, self.context)

    def new_document(self):
        return self.desktop.loadComponentFromURL("private:factory/scalc", "_blank", 0, properties(Hidden=True))

    def load(self, path: Path):
        document = self.desktop.loadComponentFromURL(Path(path).resolve().as_uri(), "_blank", 0,
                                                     properties(Hidden=True))
        if document is None:
            raise RuntimeError(f"{path} did not load")
        return document

    def store(self, document, path: Path) -> Path:
        """Stores a copy; the kind of file follows the ending of its name."""
        path = Path(path).resolve()
        document.storeToURL(path.as_uri(), properties(FilterName=FILTERS[path.suffix]))
        return path

    def reload(self, document, ending: str):
        """Stores as a file of this kind in the session's folder, closes, and opens that file."""
        path = self.store(document, self.folder / f"{uuid.uuid4().hex}{ending}")
        document.close(True)
        return self.load(path), path

    def close_all(self) -> None:
        components = self.desktop.Components.createEnumeration()
        while components.hasMoreElements():
            components.nextElement().close(True)
