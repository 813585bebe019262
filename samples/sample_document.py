"""What the sample workbooks have in common: styles, cells, printed pages."""

from com.sun.star.awt.FontWeight import BOLD
from com.sun.star.lang import Locale
from com.sun.star.table import BorderLine2
from com.sun.star.table.CellHoriJustify import CENTER, LEFT
from com.sun.star.table.CellVertJustify2 import CENTER as MIDDLE

INK, PAPER_BLUE, SAND, RULE, ALARM = 0x1F2A33, 0xDCE6EA, 0xFBF1DC, 0x8FA3AD, 0xA6312B


class SampleDocument:
    def __init__(self, document, title: str) -> None:
        self.document = document
        self.title = title
        self.english = Locale("en", "GB", "")
        document.CharLocale = self.english
        self.make_styles()

    # Styles

    def number_format(self, code: str) -> int:
        formats = self.document.NumberFormats
        key = formats.queryKey(code, self.english, False)
        return key if key != -1 else formats.addNew(code, self.english)

    def style(self, name: str, **values) -> None:
        family = self.document.StyleFamilies.getByName("CellStyles")
        made = self.document.createInstance("com.sun.star.style.CellStyle")
        family.insertByName(name, made)
        made.ParentStyle = "Default"
        for key, value in values.items():
            setattr(made, key, value)

    def make_styles(self) -> None:
        default = self.document.StyleFamilies.getByName("CellStyles").getByName("Default")
        default.CharFontName, default.CharHeight, default.CharColor = "Liberation Sans", 9.0, INK
        default.VertJustify = MIDDLE
        line = BorderLine2(Color=RULE, OuterLineWidth=18, LineWidth=18)
        self.style("LedgerTitle", CharHeight=16.0, CharWeight=BOLD)
        self.style("LedgerNote", CharColor=0x55646D, IsTextWrapped=True)
        self.style("LedgerHeading", CharWeight=BOLD, CellBackColor=PAPER_BLUE, IsTextWrapped=True, HoriJustify=CENTER,
                   BottomBorder=line, TopBorder=line)
        self.style("LedgerGroup", CharWeight=BOLD, CellBackColor=PAPER_BLUE, BottomBorder=line, TopBorder=line)
        self.style("LedgerWords", BottomBorder=line, HoriJustify=LEFT, ParaIndent=200)
        self.style("LedgerInput", CellBackColor=SAND, BottomBorder=line)
        self.style("LedgerResult", BottomBorder=line)
        self.style("LedgerText", BottomBorder=line, IsTextWrapped=True, HoriJustify=LEFT, ParaIndent=200)
        self.style("LedgerTotal", CharWeight=BOLD, CellBackColor=PAPER_BLUE, TopBorder=line, BottomBorder=line)
        self.style("LedgerAlarm", CharWeight=BOLD, CharColor=ALARM, BottomBorder=line)
        self.style("LedgerCaution", CharColor=ALARM, IsTextWrapped=True)

    # Cells

    def put(self, sheet, address: str, content, style: str | None = None, code: str | None = None):
        cell = sheet.getCellRangeByName(address)
        if isinstance(content, str) and content.startswith("="):
            cell.setFormula(content)
        elif isinstance(content, str):
            cell.setString(content)
        elif content is not None:
            cell.setValue(content)
        if style:
            cell.CellStyle = style
        if code:
            cell.NumberFormat = self.number_format(code)
        return cell

    def merged_text(self, sheet, area: str, text: str, style: str, height: int | None = None) -> None:
        block = sheet.getCellRangeByName(area)
        block.merge(True)
        cell = block.getCellByPosition(0, 0)
        cell.setString(text)
        block.CellStyle = style
        if height:
            block.Rows.Height = height

    # Pages

    def print_area(self, sheet, area: str) -> None:
        sheet.setPrintAreas((sheet.getCellRangeByName(area).RangeAddress,))
        styles = self.document.StyleFamilies.getByName("PageStyles")
        page = styles.getByName("Default")
        page.IsLandscape, page.Width, page.Height = True, 29700, 21000
        page.LeftMargin = page.RightMargin = page.TopMargin = page.BottomMargin = 1200
        page.ScaleToPagesX, page.ScaleToPagesY = 1, 0
        page.HeaderIsOn = False
        page.CenterHorizontally = True
        footer = page.RightPageFooterContent
        footer.LeftText.String = self.title + " · invented"
        footer.CenterText.String = ""
        footer.RightText.String = ""
        page.RightPageFooterContent = footer
        sheet.PageStyle = "Default"
