"""Writes what Calc and the service manager read about the add-ins:

    generate_config.py CATALOGUE TRANSLATIONS_FOLDER LIBRARY CALCADDINS.xcu LIBRARY.components

A translation is a file LANGUAGE.toml in the folder, such as de.toml: [functions] with a text for a function's name,
[arguments] with a text and [shown] with a shown name for an argument's key. What it leaves out stays English.
"""

import sys
import tomllib
from pathlib import Path
from xml.sax.saxutils import escape, quoteattr

import addins

# One of the categories that Calc knows by name: it is listed as "Add-in" in the function wizard.
CATEGORY = "Add-In"


class Texts:
    """The English texts of the catalogue and their translations."""

    def __init__(self, folder: Path) -> None:
        self.translations = {file.stem: tomllib.loads(file.read_text(encoding="utf-8"))
                             for file in sorted(folder.glob("*.toml"))}

    def property(self, indent: str, name: str, english: str, table: str, key: str) -> str:
        texts = {"en": english}
        for language, tables in self.translations.items():
            if key in tables.get(table, {}):
                texts[language] = tables[table][key]
        values = "".join(f"<value xml:lang={quoteattr(l)}>{escape(t)}</value>" for l, t in texts.items())
        return f"{indent}<prop oor:name={quoteattr(name)}>{values}</prop>\n"


def plain(indent: str, name: str, value: str) -> str:
    return f"{indent}<prop oor:name={quoteattr(name)}><value>{escape(value)}</value></prop>\n"


def function_node(method: addins.Method, texts: Texts) -> str:
    indent = " " * 8
    name = method.function.name
    lines = [
        f'      <node oor:name={quoteattr(method.name)} oor:op="replace">\n',
        # Shown and stored names are one and the same in every language, so they are no texts to translate.
        f'{indent}<prop oor:name="DisplayName"><value xml:lang="en">{escape(name)}</value></prop>\n',
        texts.property(indent, "Description", method.function.text, "functions", name),
        plain(indent, "Category", CATEGORY),
        f'{indent}<prop oor:name="CompatibilityName"><value xml:lang="en">{escape(name)}</value></prop>\n',
        f'{indent}<node oor:name="Parameters">\n',
    ]
    for parameter in method.parameters:
        lines += [
            f'{indent}  <node oor:name={quoteattr(parameter.name)} oor:op="replace">\n',
            texts.property(indent + "    ", "DisplayName", parameter.shown, "shown", parameter.key),
            texts.property(indent + "    ", "Description", parameter.text, "arguments", parameter.key),
            f"{indent}  </node>\n",
        ]
    lines += [f"{indent}</node>\n", "      </node>\n"]
    return "".join(lines)


def configuration(loaded: tuple[addins.AddIn, ...], texts: Texts) -> str:
    parts = ['<?xml version="1.0" encoding="UTF-8"?>\n'
             '<oor:component-data xmlns:oor="http://openoffice.org/2001/registry"'
             ' oor:name="CalcAddIns" oor:package="org.openoffice.Office">\n'
             '  <node oor:name="AddInInfo">\n']
    for a in loaded:
        parts.append(f'    <node oor:name={quoteattr(a.view)} oor:op="replace">\n'
                     '     <node oor:name="AddInFunctions">\n')
        parts += [function_node(m, texts) for m in a.methods]
        parts.append("     </node>\n    </node>\n")
    parts.append("  </node>\n</oor:component-data>\n")
    return "".join(parts)


def components(loaded: tuple[addins.AddIn, ...], library: str) -> str:
    # single-instance: the service manager keeps the one object of each add-in and disposes of it at the end.
    nodes = "".join(
        f'    <implementation name={quoteattr(a.view)} constructor={quoteattr(a.constructor)} single-instance="true">\n'
        f'      <service name={quoteattr(a.view)}/>\n    </implementation>\n' for a in loaded)
    return ('<?xml version="1.0" encoding="UTF-8"?>\n'
            '<components xmlns="http://openoffice.org/2010/uno-components">\n'
            f'  <component loader="com.sun.star.loader.SharedLibrary" environment="gcc3" uri={quoteattr(library)}>\n'
            f"{nodes}  </component>\n</components>\n")


def main(catalogue_path: str, translations: str, library: str, xcu: str, components_file: str) -> None:
    loaded = addins.load(Path(catalogue_path))
    Path(xcu).write_text(configuration(loaded, Texts(Path(translations))), encoding="utf-8")
    Path(components_file).write_text(components(loaded, library), encoding="utf-8")


if __name__ == "__main__":
    main(*sys.argv[1:])
