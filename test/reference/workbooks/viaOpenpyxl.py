"""Writes openpyxl.xlsx (with values) and openpyxlUncalculated.xlsx (as openpyxl leaves it: formulas without values)."""

import re
import zipfile
from datetime import date, datetime, timedelta
from pathlib import Path

from openpyxl import Workbook
from openpyxl.comments import Comment
from openpyxl.utils.datetime import CALENDAR_MAC_1904
from openpyxl.workbook.defined_name import DefinedName
from openpyxl.worksheet.table import Table

from values import SCORES, expected_trials, hit_chance, next_score_cutoff, bound, tail_fraction, top_fraction_cutoff

HERE = Path(__file__).parent
OURS = "_xldudf_WEIR_"
LAST = len(SCORES) + 1
SPREAD = (65, 8)

book = Workbook()
book.epoch = CALENDAR_MAC_1904
book.properties.created = book.properties.modified = datetime(2026, 1, 5)
offers = book.active
offers.title = "Offers"
rules = book.create_sheet("Rules & marks")
prices = book.create_sheet("Prices")

offers.append(["bookcase", "score", "offered on", "chance of a better one"])
for number, score in enumerate(SCORES):
    offers.append([f"case {number + 1}", score, date(2026, 1, 5) + timedelta(days=number)])
for row in (9, 10):
    offers.row_dimensions[row].hidden = True
offers.auto_filter.ref = f"A1:D{LAST}"
offers["A2"].comment = Comment("oak, one shelf is missing", "library")

rules["A1"], rules["B1"] = "fraction", 0.05
rules["A2"], rules["B2"] = "confidence", 0.95
prices.append(["bid", "price"])
bids = [410, 365, 498, 382, 440, 455, 402, 377]
for number, price in enumerate(bids):
    prices.append([f"bid {number + 1}", price])
prices.add_table(Table(displayName="Bids", ref="A1:B9"))
book.defined_names["marks"] = DefinedName("marks", attr_text=f"Offers!$B$2:$B${LAST}")
book.defined_names["share"] = DefinedName("share", attr_text="'Rules & marks'!$B$1")
rules.defined_names["sure"] = DefinedName("sure", attr_text="'Rules & marks'!$B$2")

# By sheet and cell: formula, value. What differs is said beside it.
made = {("Offers", f"D{row}"): (f"{OURS}TAIL_FRACTION(B{row},65,8)", tail_fraction(SCORES[row - 2], *SPREAD)) for row in range(2, 12)}
made.update(
    {
        ("Rules & marks", "B4"): (f"{OURS}TOP_FRACTION_CUTOFF(Offers!$B$2:$B${LAST},B1)", top_fraction_cutoff(SCORES, 0.05)),
        ("Rules & marks", "B5"): (f"{OURS}SAFE_CUTOFF(marks,share,sure)", bound(SCORES, 0.05, 0.95)),
        ("Rules & marks", "B6"): (f"ROUND({OURS}NEXT_SCORE_CUTOFF(marks,share),1)", round(next_score_cutoff(SCORES, 0.05), 1)),
        ("Rules & marks", "B7"): (f'IF({OURS}HIT_CHANCE(share,59)>0.95,"enough","too few")', "enough"),
        ("Rules & marks", "B8"): (f"{OURS}EXPECTED_TRIALS_TO_HIT(share)", expected_trials(0.05)),
        ("Rules & marks", "B9"): (f'{OURS}TOP_FRACTION_CUTOFF(Bids[price],10%,,"low")', 2 * (sum(bids) / 8) - top_fraction_cutoff(bids, 0.1)),
        ("Rules & marks", "B10"): (f"{OURS}HIT_CHANCE(share,YEAR(Offers!C2)-1967)", hit_chance(0.05, 59)),
        # Wrong: blanks counted as 0.
        ("Rules & marks", "B11"): (f"{OURS}TOP_FRACTION_CUTOFF(marks,0.1)", top_fraction_cutoff(SCORES, 0.1, blank=0)),
        # Wrong: two digits changed places.
        ("Rules & marks", "B12"): (f"{OURS}HIT_CHANCE(share,30)", 0.7583),
    }
)
for (sheet, cell), (formula, _) in made.items():
    book[sheet][cell] = f"={formula}"
plain = HERE / "openpyxlUncalculated.xlsx"
book.save(plain)

# openpyxl leaves <v/> behind a formula: the value goes in there, and every other byte stays.
parts = {"Offers": "sheet1", "Rules & marks": "sheet2", "Prices": "sheet3"}
with zipfile.ZipFile(plain) as source, zipfile.ZipFile(HERE / "openpyxl.xlsx", "w", zipfile.ZIP_DEFLATED) as target:
    for name in source.namelist():
        text = source.read(name)
        for (sheet, cell), (_, value) in made.items():
            if name != f"xl/worksheets/{parts[sheet]}.xml":
                continue
            kind = b' t="str"' if isinstance(value, str) else b""
            pattern = rb'<c r="%s"( s="\d+")?><f>(.*?)</f><v ?/?>(</v>)?</c>' % cell.encode()
            filled = rb'<c r="%s"\1%s><f>\2</f><v>%s</v></c>' % (cell.encode(), kind, str(value).encode())
            text, count = re.subn(pattern, filled, text)
            assert count == 1, (sheet, cell, count)
        target.writestr(zipfile.ZipInfo(name, (2026, 1, 5, 0, 0, 0)), text, zipfile.ZIP_DEFLATED)
