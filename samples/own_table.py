"""A worked sheet on one's own property table: an invented storage wax, melted by day and frozen by night."""

from com.sun.star.table.CellHoriJustify import LEFT
from sample_document import SampleDocument

TITLE = "Heat store with its own property table"
NOTICE = "Invented material and figures, for demonstration."
ANSWERS = ("This sheet answers: what do charging and discharging of a heat store generate and destroy, with property data of one's own "
           "in the sheet, and how does undercooling change that?")

TABLE = [
    ("substance", "storage wax (invented)", None),
    ("molar mass", "254.5 g/mol", None),
    ("source", "data sheet of an invented supplier", None),
    ("uncertainty", "3 %", None),
    ("interpolation", "linear", None),
    ("phase", "cr", None),
    ("temperature, °C", "heat capacity, kJ/(kg K)", None),
    (-10.0, 1.75, None), (5.0, 1.83, None), (20.0, 2.02, None), (26.0, 2.2, None),
    ("transition", "27.5 °C", "212 kJ/kg"),
    ("phase", "l", None),
    ("temperature, °C", "heat capacity, kJ/(kg K)", None),
    (15.0, 2.18, None), (30.0, 2.23, None), (50.0, 2.31, None), (80.0, 2.42, None),
]
FIRST = 8  # row of the table

INPUTS = [("Mass of wax, kg", 800.0, "#,##0"), ("Ambient temperature, °C", 12.0, "0.0"), ("Store, cold, °C", 18.0, "0.0"),
          ("Store, hot, °C", 45.0, "0.0"), ("Charging water, °C", 60.0, "0.0"), ("Heating circuit, °C", 16.0, "0.0")]

UNDERCOOLING = [0.0, 2.0, 4.0, 6.0, 8.0, 10.0]


class OwnTableSheet(SampleDocument):
    def __init__(self, document) -> None:
        super().__init__(document, TITLE)
        self.sheet = document.Sheets.getByIndex(0)
        self.sheet.Name = "Store"

    def heading(self, r: int, columns: str, texts) -> None:
        for column, text in zip(columns, texts):
            self.put(self.sheet, f"{column}{r}", text, "LedgerHeading")

    def make(self) -> None:
        sheet = self.sheet
        for index, width in enumerate((4600, 5200, 2600, 800, 5600, 3000, 3000, 3000, 3000, 3000)):
            sheet.Columns.getByIndex(index).Width = width
        self.put(sheet, "A1", TITLE, "LedgerTitle")
        sheet.Rows.getByIndex(0).Height = 900
        self.put(sheet, "A2", NOTICE, "LedgerCaution").IsTextWrapped = False
        self.merged_text(sheet, "A3:J3", ANSWERS, "LedgerNote", 600)
        self.heading(FIRST - 1, "ABC", ("The own table", "", "enthalpy"))
        self.heading(FIRST - 1, "EF", ("Inputs", ""))
        for r, row in enumerate(TABLE, FIRST):
            for column, content in zip("ABC", row):
                self.put(sheet, f"{column}{r}", content, "LedgerInput", "0.00" if column == "B" else "0.0").HoriJustify = LEFT
        last = FIRST + len(TABLE) - 1
        for r, (label, figure, code) in enumerate(INPUTS, FIRST):
            self.put(sheet, f"E{r}", label, "LedgerWords")
            self.put(sheet, f"F{r}", figure, "LedgerInput", code)
        self.table = f"$A${FIRST}:$C${last}"
        mass, ambient, cold, hot, water, circuit = (f"$F${FIRST + i}" for i in range(len(INPUTS)))
        self.make_cycle(FIRST + len(INPUTS) + 1, mass, ambient, cold, hot, water, circuit)
        self.make_undercooling(FIRST + len(INPUTS) + 6, mass, ambient, circuit)
        r = last + 2
        for formula in (f'="Source: "&SOURCE.PHASE({self.table};"cr";"l";300;{mass})',
                        f'="Check at 4 K of undercooling: "&CHECK.PHASE({self.table};"l";"cr";27.5+273.15-4;{mass};{circuit}+273.15)'):
            self.merged_text(sheet, f"A{r}:J{r}", "", "LedgerNote", 900)
            self.put(sheet, f"A{r}", formula)
            r += 1
        self.print_area(sheet, f"A1:J{r - 1}")

    def make_cycle(self, r: int, mass, ambient, cold, hot, water, circuit) -> None:
        sheet = self.sheet
        self.heading(r, "EFGHI", ("Charging and discharging", "Heat taken up, MJ", "Generated, kJ/K", "Lost work, kWh", "Verdict"))
        for name, T_from, T_to, around in (("Charging by hot water", cold, hot, water), ("Discharging to the circuit", hot, cold, circuit)):
            r += 1
            call = f"CHANGE({self.table};{T_from}+273.15;{self.table};{T_to}+273.15;{mass}"
            self.put(sheet, f"E{r}", name, "LedgerWords")
            self.put(sheet, f"F{r}", f"=HEAT.{call})/1000000", "LedgerResult", "#,##0.0")
            self.put(sheet, f"G{r}", f"=GENERATION.{call};{around}+273.15)/1000", "LedgerResult", "#,##0.000")
            self.put(sheet, f"H{r}", f"=WORK.LOST(G{r}*1000;{ambient}+273.15)/3600000", "LedgerResult", "#,##0.00")
            self.put(sheet, f"I{r}", f"=ENTROPY.VERDICT(G{r}*1000)", "LedgerWords")

    def make_undercooling(self, r: int, mass, ambient, circuit) -> None:
        sheet = self.sheet
        self.heading(r, "EFGHI", ("Freezing undercooled by, K", "Heat given off, MJ", "Generated, kJ/K",
                                  "in the wax, kJ/K", "Lost work, kWh"))
        for undercooling in UNDERCOOLING:
            r += 1
            call = f'PHASE({self.table};"l";"cr";27.5+273.15-E{r};{mass}'
            self.put(sheet, f"E{r}", undercooling, "LedgerInput", "0.0").HoriJustify = LEFT
            self.put(sheet, f"F{r}", f"=-HEAT.{call})/1000000", "LedgerResult", "#,##0.0")
            self.put(sheet, f"G{r}", f"=GENERATION.{call};{circuit}+273.15)/1000", "LedgerResult", "#,##0.000")
            self.put(sheet, f"H{r}", f"=GENERATION.{call};27.5+273.15-E{r})/1000", "LedgerResult", "#,##0.000")
            self.put(sheet, f"I{r}", f"=WORK.LOST(G{r}*1000;{ambient}+273.15)/3600000", "LedgerResult", "#,##0.00")
