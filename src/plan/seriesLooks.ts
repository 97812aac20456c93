import type { PlanSeries } from "./chartTable";

/** Lines that differ in width and dash as well, so that the picture survives a black-and-white printer. */
export const SERIES_LOOKS: Readonly<
  Record<
    PlanSeries["look"],
    { readonly colour: string; readonly width: number; readonly dash: "solid" | "dash" | "sysDot" }
  >
> = {
  bars: { colour: "8A959E", width: 1, dash: "solid" },
  curve: { colour: "1C2126", width: 1.5, dash: "solid" },
  mark: { colour: "0B4A6B", width: 3, dash: "solid" },
  safe: { colour: "0B4A6B", width: 2, dash: "dash" },
  limit: { colour: "565E66", width: 1.5, dash: "sysDot" },
};
