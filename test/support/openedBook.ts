import { xlsxFile } from "./xlsxFile";

const MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const PACKAGE = "http://schemas.openxmlformats.org/package/2006/relationships";
const OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";

/** Number formats, bold and wrapped letters, and a filled cell, as ECMA-376 writes them. */
const STYLES = `<styleSheet xmlns="${MAIN}"><numFmts count="2"><numFmt numFmtId="164" formatCode="0.0&quot; points&quot;"/><numFmt numFmtId="165" formatCode="General"/></numFmts><fonts count="2"><font><sz val="11"/></font><font><b/><sz val="11"/></font></fonts><fills count="3"><fill/><fill/><fill><patternFill patternType="solid"><fgColor theme="4"/></patternFill></fill></fills><borders count="1"><border/></borders><cellStyleXfs count="1"><xf numFmtId="9" fontId="1"/></cellStyleXfs><cellXfs count="6"><xf/><xf numFmtId="164"/><xf numFmtId="14"/><xf fontId="1"/><xf numFmtId="10"><alignment wrapText="1"/></xf><xf numFmtId="165" fillId="2"/></cellXfs></styleSheet>`;

/** A workbook with what a real one has beside plain numbers: ours in stored spelling, spills, tables, names, dates, formats, widths. */
export const OPENED_BOOK = xlsxFile({
  strings: ["entry", "score", "=no formula"],
  names: `<definedName name="fraction">0.1</definedName><definedName name="marks">Bids!$B$2:$B$4</definedName><definedName name="here" localSheetId="1">Notes!$A$1</definedName>`,
  sheets: [
    {
      name: "Bids",
      rows: `<row r="1"><c r="A1" s="3" t="s"><v>0</v></c><c r="B1" s="3" t="s"><v>1</v></c></row>
<row r="2"><c r="A2" t="s"><v>2</v></c><c r="B2" s="1"><v>71.4</v></c><c r="D2"><f>[2]!_xldudf_WEIR_SAMPLES_FOR_SD_PRECISION(fraction)</f><v>193</v></c></row>
<row r="3" ht="30" customHeight="1"><c r="A3" t="b"><v>1</v></c><c r="B3" s="1"><v>65.5</v></c><c r="D3"><f>_xlfn.STDEV.S(marks)</f><v>3.1</v></c></row>
<row r="4"><c r="A4" t="e"><v>#N/A</v></c><c r="B4" s="1"><v>68</v></c><c r="D4" s="2"><v>45000</v></c></row>
<row r="5"><c r="D5"><f>SUM(Offers[score])</f><v>204.9</v></c><c r="E5"><f>NO.SUCH.FUNCTION(B2)</f><v>12</v></c></row>
<row r="6"><c r="D6" cm="1"><f t="array" ref="D6:E7">_xlfn.SEQUENCE(2,2)</f><v>1</v></c><c r="E6"><v>2</v></c></row>
<row r="7"><c r="D7"><v>3</v></c><c r="E7"><v>4</v></c></row>
<row r="8"><c r="D8"><f>SUM(_xlfn.ANCHORARRAY(D6))</f><v>10</v></c><c r="E8" s="4"><f>[1]Other!A1</f><v>0.25</v></c></row>`,
      behind: `<mergeCells count="1"><mergeCell ref="A10:B11"/></mergeCells><conditionalFormatting sqref="B2:B4"/>`,
      tables: [
        `<table xmlns="${MAIN}" id="1" name="Offers" displayName="Offers" ref="A1:B4"><tableColumns count="2"><tableColumn id="1" name="entry"/><tableColumn id="2" name="score"/></tableColumns></table>`,
      ],
    },
    { name: "Notes", state: "hidden", rows: `<row r="1"><c r="A1" s="5"><v>1</v></c></row>` },
  ],
  parts: {
    "xl/styles.xml": STYLES,
    "xl/charts/chart1.xml": "<c/>",
    "xl/media/image1.png": "x",
    "xl/_rels/workbook.xml.rels": `<Relationships xmlns="${PACKAGE}"><Relationship Id="rId1" Type="${OFFICE}/worksheet" Target="worksheets/sheet1.xml"/><Relationship Id="rId2" Type="${OFFICE}/worksheet" Target="worksheets/sheet2.xml"/><Relationship Id="rId100" Type="${OFFICE}/sharedStrings" Target="sharedStrings.xml"/><Relationship Id="rId101" Type="${OFFICE}/sheetMetadata" Target="metadata.xml"/><Relationship Id="rId102" Type="${OFFICE}/styles" Target="styles.xml"/></Relationships>`,
  },
});
