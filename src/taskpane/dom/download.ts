import { element } from "./element";

const KEPT_FOR_MS = 10_000;

/** Hands a file to the browser as a download. */
export function download(blob: Blob, name: string): void {
  const link = element("a", { href: URL.createObjectURL(blob), download: name.replace(/[\\/:*?"<>|]+/g, "-") });
  link.click();
  setTimeout(() => URL.revokeObjectURL(link.href), KEPT_FOR_MS);
}
