const KEY = "weirmark-trial-settings";

/** The settings kept beside the workbook; none where the browser keeps nothing. */
export function readSettings(): Record<string, unknown> {
  try {
    return JSON.parse(localStorage.getItem(KEY) ?? "{}") as Record<string, unknown>;
  } catch {
    return {};
  }
}

/** Apart from the workbook: a question asked in the pane is no change of it, and an unchanged one follows the next release. */
export function keepSettings(settings: Record<string, unknown>): void {
  try {
    localStorage.setItem(KEY, JSON.stringify(settings));
  } catch {
    // A browser that keeps nothing says so already where the workbook is kept.
  }
}

export function forgetSettings(): void {
  try {
    localStorage.removeItem(KEY);
  } catch {
    return;
  }
}
