"""Writes the add-ins' implementations: generate_services.py CATALOGUE OUTPUT.cpp"""

import sys
from pathlib import Path

import addins

CPP_TYPES = {
    "any": "const Any&",
    "range": "const Reference<XCellRange>&",
    "more": "const Sequence<Any>&",
}

HEAD = """// Generated from functions/catalogue.toml by extension/generate_services.py.
#include "extension/adapter.hpp"
#include "extension/addin.hpp"
#include "functions/function_id.hpp"

{includes}#include <com/sun/star/uno/XComponentContext.hpp>

namespace {{

using com::sun::star::table::XCellRange;
using com::sun::star::uno::Any;
using com::sun::star::uno::Reference;
using com::sun::star::uno::Sequence;
using entropy_ledger::extension::AddIn;
using entropy_ledger::extension::answer;
using entropy_ledger::functions::FunctionId;
"""

SERVICE = """
class {view} final : public AddIn<{module}::{interface}> {{
public:
    {view}() : AddIn("{view}") {{}}
{methods}}};
"""

METHOD = """
    Any SAL_CALL {name}({parameters}) override
    {{
        return answer(FunctionId::{identifier}, {{{fixed}}}{rest});
    }}
"""

CONSTRUCTOR = """
extern "C" SAL_DLLPUBLIC_EXPORT com::sun::star::uno::XInterface* {constructor}(
    com::sun::star::uno::XComponentContext*, const Sequence<Any>&)
{{
    return entropy_ledger::extension::create<{view}>();
}}
"""


def method(m: addins.Method) -> str:
    parameters = ", ".join(f"{CPP_TYPES[p.type]} {p.name}" for p in m.parameters)
    fixed = ", ".join(f"&{p.name}" for p in m.parameters if p.type == "any")
    rest = "".join(f", {p.name}" for p in m.parameters if p.type != "any")
    return METHOD.format(name=m.name, parameters=parameters, identifier=m.function.identifier, fixed=fixed, rest=rest)


def main(catalogue_path: str, output: str) -> None:
    loaded = addins.load(Path(catalogue_path))
    parts = [HEAD.format(includes="".join(f"#include <{addins.MODULE}/{a.interface}.hpp>\n" for a in loaded))]
    for a in loaded:
        parts.append(SERVICE.format(view=a.view, module=addins.MODULE, interface=a.interface,
                                    methods="".join(method(m) for m in a.methods)))
    parts.append("\n} // namespace\n")
    parts += [CONSTRUCTOR.format(constructor=a.constructor, view=a.view) for a in loaded]
    Path(output).write_text("".join(parts), encoding="utf-8")


if __name__ == "__main__":
    main(*sys.argv[1:])
