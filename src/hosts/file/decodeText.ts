import { UnusableFile } from "./unusableFile";

/** The text of a file in UTF-8 (with or without a byte order mark) or in UTF-16 with one; anything else is refused, not guessed at. */
export function decodeText(bytes: Uint8Array): string {
  const utf16 =
    bytes[0] === 0xff && bytes[1] === 0xfe ? "utf-16le" : bytes[0] === 0xfe && bytes[1] === 0xff && "utf-16be";
  let text: string;
  try {
    text = new TextDecoder(utf16 || "utf-8", { fatal: true }).decode(bytes);
  } catch {
    throw new UnusableFile("The file is not text in UTF-8: save it once more as “CSV UTF-8”.");
  }
  if (text.includes("\0")) throw new UnusableFile("The file is not text: it holds bytes that no list of cells has.");
  return text;
}
