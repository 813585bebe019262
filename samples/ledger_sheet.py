"""Lays out a second-law ledger as a workbook: inputs and results, chart, remarks and sources."""

import re

import dairy
from sample_document import SampleDocument
from com.sun.star.awt import Rectangle
from com.sun.star.beans import PropertyValue
from com.sun.star.chart.ChartAxisPosition import END
from com.sun.star.drawing.FillStyle import NONE
from com.sun.star.sheet.ConditionOperator import FORMULA
from com.sun.star.table import CellRangeAddress
from com.sun.star.table.CellHoriJustify import CENTER, LEFT

# heading, width in 1/100 mm, number format, whether it is an input
COLUMNS = [
    ("No.", 900, "0", False),
    ("Item", 4300, None, False),
    ("What happens", 7200, None, False),
    ("State", 3100, None, True),
    ("Amount", 1700, "#,##0", True),
    ("Unit", 1200, None, True),
    ("From,\n°C", 1400, "0.0", True),
    ("To,\n°C", 1400, "0.0", True),
    ("Surround-\nings, °C", 1900, "0.0", True),
    ("Pressure,\nbar", 1800, "0.000", True),
    ("Heat taken\nup, MJ", 2100, "#,##0.0", False),
    ("Entropy of\nsystem,\nkJ/K", 2200, "#,##0.000", False),
    ("Entropy of\nsurround-\nings, kJ/K", 2200, "#,##0.000", False),
    ("Generated,\nkJ/K", 2100, "#,##0.000", False),
    ("Lost work,\nkWh", 2000, "#,##0.00", False),
    ("Verdict", 2500, None, False),
]
LAST = "P"
HEADING_ROW = 9  # 1-based
FIRST_ROW = HEADING_ROW + 1


def kelvin(cell: str) -> str:
    return f"{cell}+273.15"


def row_formulas(duty: dairy.Duty, r: int) -> dict[str, str]:
    """The calculated cells of a row, by column; and under "call" what follows the view's name."""
    amount, start, end, around = f"E{r}", kelvin(f"G{r}"), kelvin(f"H{r}"), kelvin(f"I{r}")
    pressure = f"J{r}*100000"
    system = {
        "body": ("BODY", f"{amount}*1000;{start};{end}", ""),
        "sensible": ("SENSIBLE", f"D{r};{start};{end};{amount}", f";{pressure}"),
        "phase": ("PHASE", f'"{duty.substance}";"{duty.to.partition(" → ")[0]}";"{duty.to.partition(" → ")[2]}";'
                           f"{start};{amount}", f";{pressure}"),
        "change": ("CHANGE", f'"{duty.substance}";{start};"{duty.to}";{end};{amount}', f";{pressure}"),
    }.get(duty.process)
    cells = {"O": f"=WORK.LOST(N{r}*1000;{kelvin('Ambient')})/3600000", "P": f"=ENTROPY.VERDICT(N{r}*1000)"}
    if system:
        process, arguments, rest = system
        cells["K"] = f"=HEAT.{process}({arguments}{rest})/1000000"
        cells["L"] = f"=ENTROPY.{process}({arguments}{rest})/1000"
        cells["M"] = f"=ENTROPY.RESERVOIR(-K{r}*1000000;{around})/1000"
        cells["N"] = f"=GENERATION.{process}({arguments};{around}{rest})/1000"
        call = f"{process}({arguments};{around}{rest})"
    elif duty.process == "transfer":
        cells["K"] = f"={amount}"
        # The system is the one that takes the heat up.
        cells["L"] = f"=ENTROPY.RESERVOIR({amount}*1000000;{end})/1000"
        cells["M"] = f"=ENTROPY.RESERVOIR(-{amount}*1000000;{start})/1000"
        call = f"TRANSFER({amount}*1000000;{start};{end})"
        cells["N"] = f"=ENTROPY.{call}/1000"
    else:
        cells["K"] = f"={amount}"
        cells["L"] = f"=ENTROPY.RESERVOIR({amount}*1000000;{start})/1000"
        call = f"DISSIPATION({amount}*1000000;{start})"
        cells["N"] = f"=ENTROPY.{call}/1000"
    return cells | {"call": call}


class LedgerSheet(SampleDocument):
    def __init__(self, document) -> None:
        super().__init__(document, dairy.TITLE)
        sheets = document.Sheets
        sheets.getByIndex(0).Name = "Ledger"
        sheets.insertNewByName("Lost work", 1)
        sheets.insertNewByName("Remarks", 2)
        self.ledger, self.chart_sheet, self.remarks = (sheets.getByIndex(i) for i in range(3))

    def name(self, name: str, address: str) -> None:
        cell = self.ledger.getCellRangeByName(address).getCellAddress()
        self.document.NamedRanges.addNewByName(name, f"$Ledger.${address[0]}${address[1:]}", cell, 0)

    # Ledger

    def make_ledger(self) -> None:
        sheet = self.ledger
        for index, (_, width, _, _) in enumerate(COLUMNS):
            sheet.Columns.getByIndex(index).Width = width
        self.put(sheet, "A1", dairy.TITLE, "LedgerTitle")
        sheet.Rows.getByIndex(0).Height = 900
        self.put(sheet, "A2", dairy.NOTICE, "LedgerCaution").IsTextWrapped = False
        self.merged_text(sheet, f"A3:{LAST}3", dairy.ANSWERS, "LedgerNote", 600)
        sheet.getCellRangeByName("B5:C5").merge(True)
        self.put(sheet, "B5", "Ambient temperature, °C", "LedgerWords")
        sheet.getCellRangeByName("C5").CellStyle = "LedgerWords"
        self.put(sheet, "D5", dairy.AMBIENT, "LedgerInput", "0.0")
        self.put(sheet, "B7", "Shaded cells are inputs; change one and the ledger follows.", "LedgerNote").IsTextWrapped = False
        self.name("Ambient", "D5")
        for index, (heading, _, _, _) in enumerate(COLUMNS):
            sheet.getCellByPosition(index, HEADING_ROW - 1).setString(heading)
        sheet.getCellRangeByName(f"A{HEADING_ROW}:{LAST}{HEADING_ROW}").CellStyle = "LedgerHeading"
        sheet.Rows.getByIndex(HEADING_ROW - 1).Height = 1350

        self.rows = []  # (duty, row)
        r = FIRST_ROW
        for number, duty in enumerate(dairy.DUTIES, 1):
            self.make_row(number, duty, r)
            r += 1
        last = r - 1
        self.last_duty_row = last
        self.put(sheet, f"B{r}", "Total of the duties")
        self.put(sheet, f"N{r}", f"=ENTROPY.TOTAL(N{FIRST_ROW}:N{last})", code="#,##0.000")
        self.put(sheet, f"O{r}", f"=WORK.LOST(N{r}*1000;{kelvin('Ambient')})/3600000", code="#,##0.00")
        # A total of many duties has no verdict of its own: one that cannot occur must not hide in it.
        self.put(sheet, f"P{r}", f'=COUNTIF(P{FIRST_ROW}:P{last};"cannot occur")&" cannot occur"')
        sheet.getCellRangeByName(f"A{r}:{LAST}{r}").CellStyle = "LedgerTotal"
        sheet.getCellRangeByName(f"N{r}").NumberFormat = self.number_format("#,##0.000")
        sheet.getCellRangeByName(f"O{r}").NumberFormat = self.number_format("#,##0.00")
        sheet.getCellRangeByName(f"P{r}").HoriJustify = CENTER
        self.put(sheet, f"B{r + 1}", "Closing check: system and surroundings less generated, largest, kJ/K", "LedgerNote").IsTextWrapped = False
        self.put(sheet, f"N{r + 1}", f"=SUMPRODUCT(MAX(ABS(L{FIRST_ROW}:L{last}+M{FIRST_ROW}:M{last}-N{FIRST_ROW}:N{last})))",
                 "LedgerNote", "0.0E+00")
        r += 3
        self.put(sheet, f"A{r}", "Proposals under examination (not in the total)")
        sheet.getCellRangeByName(f"A{r}:{LAST}{r}").CellStyle = "LedgerGroup"
        r += 1
        for number, duty in enumerate(dairy.PROPOSALS, len(dairy.DUTIES) + 1):
            self.make_row(number, duty, r)
            r += 1
        r += 1
        row_of = {duty.item: row for _, duty, row, _ in self.rows}
        for before, item, after in dairy.FINDINGS:
            self.merged_text(sheet, f"B{r}:{LAST}{r}", "", "LedgerNote", 480)
            n = row_of[item]
            self.put(sheet, f"B{r}", f'="{before}"&P{n}&" as specified: "&TEXT(N{n};"0.0")&" kJ/K generated. {after}"')
            r += 1
        for caution in dairy.CAUTIONS:
            self.merged_text(sheet, f"B{r}:{LAST}{r}", caution, "LedgerCaution", 480)
            r += 1
        self.print_area(sheet, f"A1:{LAST}{r - 1}")

    def make_row(self, number: int, duty: dairy.Duty, r: int) -> None:
        sheet = self.ledger
        state = {"body": "racks", "phase": f"{duty.substance}, {duty.to}", "change": f"{duty.substance} → {duty.to}"}.get(
            duty.process, duty.substance)
        unit = {"transfer": "MJ", "dissipation": "MJ", "body": "kJ/K"}.get(duty.process, "kg")
        has_pressure = duty.process in ("sensible", "phase", "change")
        contents = [number, duty.item, duty.happens, state, duty.amount, unit, duty.start, duty.end, duty.surroundings,
                    (duty.pressure or 1.0) if has_pressure else None]
        formulas = row_formulas(duty, r)
        for index, (_, _, code, is_input) in enumerate(COLUMNS):
            column = chr(ord("A") + index)
            content = contents[index] if index < len(contents) else formulas.get(column)
            style = "LedgerInput" if is_input and content is not None and column not in "DF" else "LedgerResult"
            if column in "BCDF":
                style = "LedgerWords"
            cell = self.put(sheet, f"{column}{r}", content, style, code)
            if column == "D" and duty.process == "sensible":
                cell.CellStyle, cell.HoriJustify, cell.ParaIndent = "LedgerInput", LEFT, 200
        sheet.getCellRangeByName(f"P{r}").HoriJustify = CENTER
        self.alarm(sheet.getCellRangeByName(f"N{r}:P{r}"), f'$P{r}="cannot occur"')
        self.rows.append((number, duty, r, formulas["call"]))

    def alarm(self, area, condition: str) -> None:
        entries = area.ConditionalFormat
        entries.clear()
        entries.addNew((PropertyValue(Name="Operator", Value=FORMULA), PropertyValue(Name="Formula1", Value=condition),
                        PropertyValue(Name="SourcePosition", Value=area.getCellByPosition(0, 0).CellAddress),
                        PropertyValue(Name="StyleName", Value="LedgerAlarm")))
        area.ConditionalFormat = entries

    # Chart

    def make_chart(self) -> None:
        sheet = self.chart_sheet
        self.put(sheet, "A1", "Lost work by item", "LedgerTitle")
        sheet.Rows.getByIndex(0).Height = 900
        self.put(sheet, "A2", dairy.NOTICE, "LedgerCaution").IsTextWrapped = False
        first, last = FIRST_ROW - 1, self.last_duty_row - 1
        index = self.ledger.RangeAddress.Sheet
        ranges = (CellRangeAddress(index, 1, first, 1, last), CellRangeAddress(index, 14, first, 14, last))
        sheet.Charts.addNewByName("LostWork", Rectangle(0, 1700, 25500, 14500), ranges, False, True)
        chart = sheet.Charts.getByName("LostWork").EmbeddedObject
        chart.lockControllers()
        diagram = chart.createInstance("com.sun.star.chart.BarDiagram")
        chart.setDiagram(diagram)
        diagram.Vertical = True  # bars lie
        chart.HasMainTitle = False
        chart.HasLegend = False
        diagram.HasYAxisTitle = True
        diagram.YAxisTitle.String = "Lost work in a day, kWh"
        diagram.YAxis.LinkNumberFormatToSource = False
        diagram.YAxis.NumberFormat = self.chart_number_format(chart, "#,##0")
        diagram.XAxis.ReverseDirection = True
        diagram.YAxis.CrossoverPosition = END  # the scale at the foot, with the first item on top
        diagram.Wall.FillStyle = NONE
        diagram.YMainGrid.LineColor = 0xD5DDE1
        diagram.getDataRowProperties(0).FillColor = 0x2F6F7E
        diagram.getDataRowProperties(0).DataCaption = 1
        diagram.getDataRowProperties(0).NumberFormat = self.chart_number_format(chart, "#,##0.0")
        diagram.XAxis.CharHeight = diagram.YAxis.CharHeight = 10.0
        chart.unlockControllers()
        for column in range(11):
            sheet.Columns.getByIndex(column).Width = 2350
        self.print_area(sheet, "A1:K38")

    def chart_number_format(self, chart, code: str) -> int:
        formats = chart.NumberFormats
        key = formats.queryKey(code, self.english, False)
        return key if key != -1 else formats.addNew(code, self.english)

    # Remarks

    def make_remarks(self) -> None:
        sheet = self.remarks
        for index, width in enumerate((900, 4300, 11500, 8800)):
            sheet.Columns.getByIndex(index).Width = width
        self.put(sheet, "A1", "Remarks and data sources", "LedgerTitle")
        sheet.Rows.getByIndex(0).Height = 900
        self.put(sheet, "A2", dairy.NOTICE, "LedgerCaution").IsTextWrapped = False
        for column, heading in zip("ABCD", ("No.", "Item", "Check", "Source")):
            self.put(sheet, f"{column}4", heading, "LedgerHeading")
        r = 5
        for number, duty, row, call in self.rows:
            there = re.sub(r"\b([D-J])(\d+)\b", r"$Ledger.\1\2", call)
            self.put(sheet, f"A{r}", f"=$Ledger.A{row}", "LedgerResult", "0")
            self.put(sheet, f"B{r}", f"=$Ledger.B{row}", "LedgerText")
            self.put(sheet, f"C{r}", f"=CHECK.{there}", "LedgerText")
            self.put(sheet, f"D{r}", f"=SOURCE.{there}", "LedgerText")
            r += 1
        for row in range(3, r):
            sheet.Rows.getByIndex(row).OptimalHeight = True
        self.print_area(sheet, f"A1:D{r - 1}")
        sheet.setTitleRows(CellRangeAddress(sheet.RangeAddress.Sheet, 0, 3, 0, 3))
        sheet.setPrintTitleRows(True)

    def make(self) -> None:
        self.make_ledger()
        self.make_chart()
        self.document.calculateAll()
        self.make_remarks()
