/** The kept language, else the first of the user's own among those offered, else English. */
export function languageFor(kept: unknown, preferred: readonly string[], offered: readonly string[]): string {
  const wanted = [...(typeof kept === "string" ? [kept] : []), ...preferred];
  return wanted.map((tag) => tag.slice(0, 2).toLowerCase()).find((code) => offered.includes(code)) ?? "en";
}
