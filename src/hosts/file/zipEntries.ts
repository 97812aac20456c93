import { UnusableFile } from "./unusableFile";

/** One part of a zip archive: where its packed bytes stand and what it claims of itself. */
export interface ZipEntry {
  readonly method: number;
  readonly packedSize: number;
  readonly size: number;
  readonly start: number;
}

const END_SIGNATURE = 0x06054b50;
const ENTRY_SIGNATURE = 0x02014b50;
const LOCAL_SIGNATURE = 0x04034b50;
const END_64_LOCATOR = 0x07064b50;
const END_64_SIGNATURE = 0x06064b50;
const MOST_ENTRIES = 20_000;
const CUT_OFF = "The file is cut off or damaged: the list of its parts is missing. Copy or download it once more.";

/**
 * Reads the list of parts at the end of a zip archive (APPNOTE 6.3, with its 64-bit form). Refuses parts that overlap, are encrypted or
 * packed in another way than deflate, and places outside the file: an archive that says two things at once is read differently by every program.
 */
export function readZipEntries(bytes: Uint8Array): Map<string, ZipEntry> {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  try {
    return listEntries(bytes, view);
  } catch (failure) {
    // A place outside the file is a RangeError of the view.
    if (failure instanceof RangeError) throw new UnusableFile(CUT_OFF);
    throw failure;
  }
}

function listEntries(bytes: Uint8Array, view: DataView): Map<string, ZipEntry> {
  const { count, offset } = findList(view);
  if (count > MOST_ENTRIES) throw new UnusableFile(`The file is refused: it claims ${count} parts.`);
  const entries = new Map<string, ZipEntry>();
  let at = offset;
  for (let i = 0; i < count; i++) {
    if (view.getUint32(at, true) !== ENTRY_SIGNATURE) throw new UnusableFile(CUT_OFF);
    const flags = view.getUint16(at + 8, true);
    const method = view.getUint16(at + 10, true);
    const nameLength = view.getUint16(at + 28, true);
    const extraLength = view.getUint16(at + 30, true);
    const name = new TextDecoder().decode(bytes.subarray(at + 46, at + 46 + nameLength)).replace(/\\/g, "/");
    const sizes = entrySizes(view, at, at + 46 + nameLength, extraLength);
    if (flags & 1) throw new UnusableFile("The file is encrypted: save a copy without a password.");
    if (method !== 0 && method !== 8)
      throw new UnusableFile(`The file is refused: its part ${name} is packed in an unusual way.`);
    if (entries.has(name)) throw new UnusableFile(`The file is refused: it holds the part ${name} twice.`);
    entries.set(name, { method, packedSize: sizes.packedSize, size: sizes.size, start: dataStart(view, sizes.local) });
    at += 46 + nameLength + extraLength + view.getUint16(at + 32, true);
  }
  refuseOverlaps(entries, offset);
  return entries;
}

function findList(view: DataView): { count: number; offset: number } {
  const first = Math.max(0, view.byteLength - 65_557);
  for (let at = view.byteLength - 22; at >= first; at--) {
    if (view.getUint32(at, true) !== END_SIGNATURE) continue;
    const count = view.getUint16(at + 10, true);
    const offset = view.getUint32(at + 16, true);
    const long = count === 0xffff || offset === 0xffffffff;
    if (!long || at < 20 || view.getUint32(at - 20, true) !== END_64_LOCATOR) return { count, offset };
    const end64 = whole(view, at - 20 + 8);
    if (view.getUint32(end64, true) !== END_64_SIGNATURE) throw new UnusableFile(CUT_OFF);
    return { count: whole(view, end64 + 32), offset: whole(view, end64 + 48) };
  }
  throw new UnusableFile(CUT_OFF);
}

/** Sizes and place, from the 64-bit extra field where the short ones are full. */
function entrySizes(view: DataView, at: number, extra: number, extraLength: number) {
  const short = [view.getUint32(at + 24, true), view.getUint32(at + 20, true), view.getUint32(at + 42, true)];
  for (let field = extra; field + 4 <= extra + extraLength; field += 4 + view.getUint16(field + 2, true)) {
    if (view.getUint16(field, true) !== 1) continue;
    let value = field + 4;
    for (let i = 0; i < short.length; i++) {
      if (short[i] !== 0xffffffff) continue;
      short[i] = whole(view, value);
      value += 8;
    }
  }
  return { size: short[0]!, packedSize: short[1]!, local: short[2]! };
}

function dataStart(view: DataView, local: number): number {
  if (view.getUint32(local, true) !== LOCAL_SIGNATURE) throw new UnusableFile(CUT_OFF);
  return local + 30 + view.getUint16(local + 26, true) + view.getUint16(local + 28, true);
}

function refuseOverlaps(entries: ReadonlyMap<string, ZipEntry>, listStart: number): void {
  const inOrder = [...entries.values()].sort((a, b) => a.start - b.start);
  inOrder.forEach(({ start, packedSize }, index) => {
    const next = inOrder[index + 1]?.start ?? listStart;
    if (start + packedSize > next) throw new UnusableFile("The file is refused: its parts overlap.");
  });
}

function whole(view: DataView, at: number): number {
  return view.getUint32(at + 4, true) * 2 ** 32 + view.getUint32(at, true);
}
