import { tokenize } from "@borgar/fx/xlsx";

/** What came with the edition of 2021, and with that of 2024. */
const SINCE_2021 = /^(LET|SEQUENCE|UNIQUE|SORTBY|SORT|FILTER|XLOOKUP|XMATCH|RANDARRAY)$/;
const SINCE_2024 =
  /^(LAMBDA|MAP|REDUCE|SCAN|BYROW|BYCOL|MAKEARRAY|TAKE|DROP|VSTACK|HSTACK|TOCOL|TOROW|CHOOSECOLS|CHOOSEROWS|EXPAND|WRAPROWS|WRAPCOLS)$/;

/** The year of the oldest edition of the host that has every function of the formula; undefined where any recent one has. */
export function hostNeeded(formula: string): 2021 | 2024 | undefined {
  const names = tokenize(formula).flatMap(({ type, value }) =>
    type === "func" ? [value.replace(/^(_xlfn\.|_xlws\.)+/i, "").toUpperCase()] : [],
  );
  if (names.some((name) => SINCE_2024.test(name))) return 2024;
  return names.some((name) => SINCE_2021.test(name)) ? 2021 : undefined;
}
