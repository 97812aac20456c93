"""Writes byHand.xlsx and byHandStrict.xlsx: XML put together by hand after ECMA-376, in the ways that Excel writes it and that other writers may."""

import zipfile
from pathlib import Path

from values import SCORES, expected_trials, next_score_cutoff, tail_fraction, top_fraction_cutoff

HERE = Path(__file__).parent
HEAD = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\r\n'
OURS = "_xldudf_WEIR_"
LAST = len(SCORES) + 1
RANGE = f"$B$2:$B${LAST}"
TRANSITIONAL = {
    "main": "http://schemas.openxmlformats.org/spreadsheetml/2006/main",
    "office": "http://schemas.openxmlformats.org/officeDocument/2006/relationships",
}
STRICT = {
    "main": "http://purl.oclc.org/ooxml/spreadsheetml/main",
    "office": "http://purl.oclc.org/ooxml/officeDocument/relationships",
}
PACKAGE = "http://schemas.openxmlformats.org/package/2006"
TYPE = "application/vnd.openxmlformats-officedocument.spreadsheetml"


def relations(spaces, *entries):
    inside = "".join(f'<Relationship Id="rId{number}" Type="{spaces["office"]}/{kind}" Target="{target}"/>' for number, (kind, target) in enumerate(entries, 1))
    return f'{HEAD}<Relationships xmlns="{PACKAGE}/relationships">{inside}</Relationships>'


def write(name, parts):
    with zipfile.ZipFile(HERE / name, "w", zipfile.ZIP_DEFLATED) as file:
        for part, text in parts.items():
            file.writestr(zipfile.ZipInfo(part, (2026, 1, 5, 0, 0, 0)), text.encode(), zipfile.ZIP_DEFLATED)


def content_types(*overrides):
    inside = "".join(f'<Override PartName="/{part}" ContentType="{TYPE}.{kind}+xml"/>' for part, kind in overrides)
    return f'{HEAD}<Types xmlns="{PACKAGE}/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/>{inside}</Types>'


# --- As Excel writes it -------------------------------------------------------------------------------------------------------------------------

# Text 0 in runs with a reading aid, 1 with spaces that count, 2 with a character that XML can't hold.
STRINGS = [
    '<si><r><t>book</t></r><r><rPr><b/></rPr><t xml:space="preserve">case </t></r><rPh sb="0" eb="4"><t>ほん</t></rPh><phoneticPr fontId="1"/></si>',
    '<si><t xml:space="preserve"> oak </t></si>',
    "<si><t>two_x000A_lines</t></si>",
    "<si><t>score</t></si>",
]
rows = {row: "" for row in range(1, LAST + 1)}
rows[1] = '<c r="A1" t="s"><v>0</v></c><c r="B1" t="s"><v>3</v></c>'
for number, score in enumerate(SCORES):
    rows[number + 2] += f'<c r="A{number + 2}" t="s"><v>{1 + number % 2}</v></c>'
    rows[number + 2] += f'<c r="B{number + 2}" s="1"/>' if score is None else f'<c r="B{number + 2}" s="1"><v>{score}</v></c>'
# A shared formula, its group filled down; the last value of it is wrong.
for row in range(2, 9):
    value = 0.5 if row == 8 else repr(tail_fraction(SCORES[row - 2], 65, 8))
    formula = f'<f t="shared" ref="D2:D8" si="0">{OURS}TAIL_FRACTION($B2,65,8)</f>' if row == 2 else '<f t="shared" si="0"/>'
    rows[row] += f'<c r="D{row}">{formula}<v>{value}</v></c>'
mark = top_fraction_cutoff(SCORES, 0.1)
rows[2] += f'<c r="F2" cm="1"><f t="array" ref="F2:F6">_xlfn.ANCHORARRAY(H2)*1</f><v>1</v></c><c r="H2" cm="1"><f t="array" ref="H2:H6">_xlfn.SEQUENCE(5)</f><v>1</v></c>'
for row in range(3, 7):
    rows[row] += f'<c r="F{row}"><v>{row - 1}</v></c><c r="H{row}"><v>{row - 1}</v></c>'
rows[2] += f'<c r="J2"><f>{OURS}TOP_FRACTION_CUTOFF({RANGE},10%)</f><v>{mark!r}</v></c>'
rows[3] += f'<c r="J3" t="str"><f>IF(B3&gt;=[1]!{OURS}TOP_FRACTION_CUTOFF({RANGE},0.1),"clears","falls short")</f><v>falls short</v></c>'
rows[4] += f'<c r="J4" cm="1"><f t="array" ref="J4">{OURS}NEXT_SCORE_CUTOFF(INDEX($B$2:$B$11,_xlfn.SEQUENCE(_xlfn.SINGLE(10))),0.1)</f><v>{next_score_cutoff(SCORES[:10], 0.1)!r}</v></c>'
rows[5] += f'<c r="J5"><f>{OURS}EXPECTED_TRIALS_TO_HIT(MAX(_xlfn.ANCHORARRAY(F2))/100)</f><v>{expected_trials(0.05)}</v></c>'
rows[6] += f'<c r="J6" vm="1" t="e"><f>{OURS}TOP_FRACTION_CUTOFF({RANGE},10)</f><v>#VALUE!</v></c>'
sheet = f"""{HEAD}<worksheet xmlns="{TRANSITIONAL['main']}" xmlns:r="{TRANSITIONAL['office']}" xmlns:mc="http://schemas.openxmlformats.org/markup-compatibility/2006" mc:Ignorable="x14ac xr" xmlns:x14ac="http://schemas.microsoft.com/office/spreadsheetml/2009/9/ac" xmlns:xr="http://schemas.microsoft.com/office/spreadsheetml/2014/revision" xr:uid="{{00000000-0001-0000-0000-000000000000}}"><dimension ref="A1:J{LAST}"/><sheetViews><sheetView tabSelected="1" workbookViewId="0"/></sheetViews><sheetFormatPr defaultRowHeight="15" x14ac:dyDescent="0.25"/><sheetData>{''.join(f'<row r="{row}" spans="1:10" x14ac:dyDescent="0.25">{cells}</row>' for row, cells in rows.items())}</sheetData><phoneticPr fontId="1"/><pageMargins left="0.7" right="0.7" top="0.75" bottom="0.75" header="0.3" footer="0.3"/><mc:AlternateContent><mc:Choice Requires="x14"/><mc:Fallback><rowBreaks count="0" manualBreakCount="0"/></mc:Fallback></mc:AlternateContent><extLst><ext uri="{{78C0D931-6437-407d-A8EE-F0AAD7539E65}}" xmlns:x14="http://schemas.microsoft.com/office/spreadsheetml/2009/9/main"><x14:conditionalFormattings><x14:conditionalFormatting xmlns:xm="http://schemas.microsoft.com/office/excel/2006/main"><x14:cfRule type="expression" priority="1" id="{{00000000-0002-0000-0000-000000000000}}"><xm:f>$B2&gt;$J$2</xm:f><x14:dxf><font><b/></font></x14:dxf></x14:cfRule><xm:sqref>B2:B{LAST}</xm:sqref></x14:conditionalFormatting></x14:conditionalFormattings></ext></extLst></worksheet>"""
metadata = f'{HEAD}<metadata xmlns="{TRANSITIONAL["main"]}" xmlns:xda="http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray"><metadataTypes count="1"><metadataType name="XLDAPR" minSupportedVersion="120000" copy="1" pasteAll="1" pasteValues="1" merge="1" splitFirst="1" rowColShift="1" clearFormats="1" clearComments="1" assign="1" coerce="1" cellMeta="1"/></metadataTypes><futureMetadata name="XLDAPR" count="1"><bk><extLst><ext uri="{{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}}"><xda:dynamicArrayProperties fDynamic="1" fCollapsed="0"/></ext></extLst></bk></futureMetadata><cellMetadata count="1"><bk><rc t="1" v="0"/></bk></cellMetadata></metadata>'
write(
    "byHand.xlsx",
    {
        "[Content_Types].xml": content_types(
            ("xl/workbook.xml", "sheet.main"), ("xl/worksheets/sheet1.xml", "worksheet"), ("xl/sharedStrings.xml", "sharedStrings"),
            ("xl/styles.xml", "styles"), ("xl/metadata.xml", "sheetMetadata"), ("xl/calcChain.xml", "calcChain"),
        ),
        "_rels/.rels": relations(TRANSITIONAL, ("officeDocument", "xl/workbook.xml")),
        "xl/workbook.xml": f'{HEAD}<workbook xmlns="{TRANSITIONAL["main"]}" xmlns:r="{TRANSITIONAL["office"]}" xmlns:mc="http://schemas.openxmlformats.org/markup-compatibility/2006" mc:Ignorable="x15" xmlns:x15="http://schemas.microsoft.com/office/spreadsheetml/2010/11/main"><fileVersion appName="xl" lastEdited="7"/><workbookPr defaultThemeVersion="166925"/><mc:AlternateContent><mc:Choice Requires="x15"><x15ac:absPath url="C:\\offers\\" xmlns:x15ac="http://schemas.microsoft.com/office/spreadsheetml/2010/11/ac"/></mc:Choice></mc:AlternateContent><sheets><sheet name="Offers" sheetId="1" r:id="rId1"/></sheets><calcPr calcId="191029"/></workbook>',
        "xl/_rels/workbook.xml.rels": relations(
            TRANSITIONAL, ("worksheet", "worksheets/sheet1.xml"), ("sharedStrings", "sharedStrings.xml"),
            ("styles", "styles.xml"), ("sheetMetadata", "metadata.xml"), ("calcChain", "calcChain.xml"),
        ),
        "xl/worksheets/sheet1.xml": sheet,
        "xl/sharedStrings.xml": f'{HEAD}<sst xmlns="{TRANSITIONAL["main"]}" count="{LAST + 1}" uniqueCount="{len(STRINGS)}">{"".join(STRINGS)}</sst>',
        "xl/styles.xml": f'{HEAD}<styleSheet xmlns="{TRANSITIONAL["main"]}"><fonts count="2"><font><sz val="11"/></font><font><sz val="6"/></font></fonts><fills count="1"><fill><patternFill patternType="none"/></fill></fills><borders count="1"><border/></borders><cellStyleXfs count="1"><xf/></cellStyleXfs><cellXfs count="2"><xf/><xf numFmtId="2" applyNumberFormat="1"/></cellXfs></styleSheet>',
        "xl/metadata.xml": metadata,
        "xl/calcChain.xml": f'{HEAD}<calcChain xmlns="{TRANSITIONAL["main"]}">{"".join(f"""<c r="{cell}" i="1"/>""" for cell in ("D2", "D3", "D4", "D5", "D6", "D7", "D8", "F2", "H2", "J2", "J3", "J4", "J5", "J6"))}</calcChain>',
    },
)

# --- The strict form, with prefixes, cells that don't say where they are, texts in place, dates as dates of the 1904 system -----------------------

lines = ['<x:row r="1"><x:c t="inlineStr"><x:is><x:r><x:t>book</x:t></x:r><x:r><x:t>case</x:t></x:r><x:rPh sb="0" eb="4"><x:t>ほん</x:t></x:rPh></x:is></x:c><x:c t="inlineStr"><x:is><x:t>score</x:t></x:is></x:c><x:c t="inlineStr"><x:is><x:t>offered on</x:t></x:is></x:c></x:row>']
for number, score in enumerate(SCORES):
    shown = "<x:c/>" if score is None else f"<x:c><x:v>{score}</x:v></x:c>"
    extra = {
        0: f'<x:c><x:f>{OURS}TOP_FRACTION_CUTOFF({RANGE},10%)</x:f><x:v>{mark!r}</x:v></x:c>',
        1: f'<x:c><x:f><![CDATA[IF(B3<60,1,{OURS}TAIL_FRACTION(B3,65,8))]]></x:f><x:v><![CDATA[{tail_fraction(SCORES[1], 65, 8)!r}]]></x:v></x:c>',
        2: f'<x:c><x:f>{OURS}TAIL_FRACTION(DAY(C4)+60,65,8)</x:f><x:v>{tail_fraction(67, 65, 8)!r}</x:v></x:c>',
        # Wrong: the date taken in the other system, a day later.
        3: f'<x:c><x:f>{OURS}TAIL_FRACTION(DAY(C5)+60,65,8)</x:f><x:v>{tail_fraction(69, 65, 8)!r}</x:v></x:c>',
    }.get(number, "")
    lines.append(f'<x:row><x:c t="inlineStr"><x:is><x:t>case {number + 1}</x:t></x:is></x:c>{shown}<x:c t="d"><x:v>2026-01-{5 + number % 20:02d}</x:v></x:c>{extra}</x:row>')
write(
    "byHandStrict.xlsx",
    {
        "[Content_Types].xml": content_types(("xl/workbook.xml", "sheet.main"), ("xl/worksheets/sheet1.xml", "worksheet")),
        "_rels/.rels": relations(STRICT, ("officeDocument", "/xl/workbook.xml")),
        "xl/workbook.xml": f'{HEAD}<x:workbook xmlns:x="{STRICT["main"]}" xmlns:rel="{STRICT["office"]}" conformance="strict"><x:workbookPr date1904="true"/><x:sheets><x:sheet name="Offers" sheetId="1" rel:id="rId1"/></x:sheets></x:workbook>',
        "xl/_rels/workbook.xml.rels": relations(STRICT, ("worksheet", "/xl/worksheets/sheet1.xml")),
        "xl/worksheets/sheet1.xml": f'{HEAD}<x:worksheet xmlns:x="{STRICT["main"]}"><x:sheetData>{"".join(lines)}</x:sheetData></x:worksheet>',
    },
)
