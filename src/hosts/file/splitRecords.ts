import { UnusableFile } from "./unusableFile";

const QUOTE = 34;
const LINE_FEED = 10;
const RETURN = 13;

/**
 * Parts delimited text into records of fields (RFC 4180): quotes around a field, a quote in it doubled, line ends CR LF, LF or CR, also
 * inside quotes. `most` records at the most. A quote that is never closed is refused with its line, since everything behind it would be lost in one field.
 */
export function splitRecords(text: string, separator: string, most = Infinity): string[][] {
  const records: string[][] = [];
  const separatorCode = separator.charCodeAt(0);
  const end = text.length;
  let at = 0;
  let record: string[] = [];
  const endsField = (code: number) => code === separatorCode || code === LINE_FEED || code === RETURN;
  while (at < end && records.length < most) {
    let field = "";
    if (text.charCodeAt(at) === QUOTE) {
      const opened = at++;
      for (;;) {
        const close = text.indexOf('"', at);
        if (close < 0) throw unclosed(text, opened);
        field += text.slice(at, close);
        at = close + 1;
        if (text.charCodeAt(at) !== QUOTE) break;
        field += '"';
        at++;
      }
    }
    const from = at;
    while (at < end && !endsField(text.charCodeAt(at))) at++;
    record.push(field + text.slice(from, at));
    if (at < end && text.charCodeAt(at) === separatorCode) {
      at++;
      // A separator as the very last character opens one more, empty field.
      if (at < end) continue;
      record.push("");
    }
    at += text.startsWith("\r\n", at) ? 2 : 1;
    records.push(record);
    record = [];
  }
  return records;
}

function unclosed(text: string, opened: number): UnusableFile {
  const line = text.slice(0, opened).split(/\r\n|\r|\n/).length;
  return new UnusableFile(
    `The quote opened in line ${line} is never closed, so the fields behind it can't be told apart.`,
  );
}
