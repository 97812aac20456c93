"""Writes xlsxWriter.xlsx: spilled results, functions newer than the format, a chart; computed by an older revision of the numbers."""

from datetime import datetime
from pathlib import Path

import xlsxwriter

from values import SCORES, cutoff_limits, curve, tail_fraction, top_fraction_cutoff

OURS = "=_xldudf_WEIR_"
LAST = len(SCORES) + 1
RANGE = f"B2:B{LAST}"

book = xlsxwriter.Workbook(Path(__file__).parent / "xlsxWriter.xlsx")
book.set_properties({"created": datetime(2026, 1, 5)})
sheet = book.add_worksheet("Offers")
bold = book.add_format({"bold": True})
sheet.write_row("A1", ["bookcase", "score", "wood"], bold)
woods = ["oak" if number % 3 else "pine" for number in range(len(SCORES))]
for number, score in enumerate(SCORES):
    sheet.write_row(number + 1, 0, [f"case {number + 1}", score, woods[number]])


def spill(first, last, formula, rows):
    sheet.write_dynamic_array_formula(f"{first}:{last}", formula, None, rows[0][0])
    column, row = ord(first[0]) - ord("A"), int(first[1:]) - 1
    for down, line in enumerate(rows):
        for across, value in enumerate(line):
            if down or across:
                sheet.write(row + down, column + across, value)


limits = cutoff_limits(SCORES, 0.1)
spill("E2", "F4", f"{OURS}CUTOFF_LIMITS({RANGE},0.1)", limits)
spill("H2", "H11", f"{OURS}TAIL_FRACTION(B2:B11,65,8)", [[tail_fraction(score, 65, 8)] for score in SCORES[:10]])
spill("E6", "F8", f"{OURS}RELEASE()", [["name", "Weirmark"], ["version", "0.0.9"], ["revision", 0]])
oak = [score for score, wood in zip(SCORES, woods) if wood == "oak" and score is not None]
filtered = f'{OURS}TOP_FRACTION_CUTOFF(_xlfn._xlws.FILTER({RANGE},(C2:C{LAST}="oak")*({RANGE}<>"")),0.1)'
sheet.write_dynamic_array_formula("J2:J2", filtered, None, top_fraction_cutoff(oak, 0.1))
anchored = f"{OURS}TAIL_FRACTION(INDEX(_xlfn.ANCHORARRAY(E2),2,2),65,8)"
sheet.write_dynamic_array_formula("J3:J3", anchored, None, tail_fraction(limits[1][1], 65, 8))
named = f"=_xlfn.LET(_xlpm.m,_xldudf_WEIR_TOP_FRACTION_CUTOFF({RANGE},0.1),_xlpm.m+1)"
sheet.write_dynamic_array_formula("J4:J4", named, None, limits[1][1] + 1)
# Not what comes out today, in a file that says it was computed by revision 0.
n, mean, sd = curve(SCORES)
sheet.write_formula("J5", f"{OURS}SAFE_CUTOFF({RANGE},0.1)", None, mean + 2.011 * sd)
# Old style: the one cell of the column that stands in line.
sheet.write_formula("J6", f"{OURS}TAIL_FRACTION(B2:B11,65,8)", None, tail_fraction(SCORES[0], 65, 8))
chart = book.add_chart({"type": "column"})
chart.add_series({"values": f"=Offers!$B$2:$B${LAST}"})
sheet.insert_chart("L2", chart)
sheet.conditional_format(RANGE, {"type": "cell", "criteria": ">=", "value": "$F$3", "format": bold})
sheet.data_validation("C2:C41", {"validate": "list", "source": ["oak", "pine"]})
book.close()
