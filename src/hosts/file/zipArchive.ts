import { Inflate } from "fflate";
import { UnusableFile } from "./unusableFile";
import { readZipEntries, type ZipEntry } from "./zipEntries";

const MOST_BYTES_OF_A_PART = 512 * 2 ** 20;
const MOST_BYTES_IN_ALL = 1024 * 2 ** 20;
/** A sheet of a million cells packs some 10 to 60 times; only what was made to burst packs more than this once it is large. */
const MOST_PACKING = 250;
const LARGE = 32 * 2 ** 20;
const STEP = 16 * 2 ** 10;

/**
 * The parts of a zip archive, unpacked one by one in pieces of bounded size. What a part claims is checked before anything is unpacked,
 * and what really comes out is counted while it does, since a claim can lie.
 */
export class ZipArchive {
  readonly #entries: ReadonlyMap<string, ZipEntry>;
  #unpacked = 0;

  constructor(private readonly bytes: Uint8Array) {
    this.#entries = readZipEntries(bytes);
  }

  get names(): string[] {
    return [...this.#entries.keys()];
  }

  has(name: string): boolean {
    return this.#entries.has(name);
  }

  /** Hands the unpacked bytes of a part to `take`, piece by piece; false where there is no such part. */
  unpack(name: string, take: (piece: Uint8Array) => void): boolean {
    const entry = this.#entries.get(name);
    if (!entry) return false;
    this.#checkSize(name, entry, entry.size, "claims to unpack to");
    const packed = this.bytes.subarray(entry.start, entry.start + entry.packedSize);
    let size = 0;
    const count = (piece: Uint8Array) => {
      size += piece.length;
      this.#checkSize(name, entry, size, "unpacks to");
      if (piece.length > 0) take(piece);
    };
    if (entry.method === 0) count(packed);
    else inflate(packed, count, name);
    if (size !== entry.size)
      throw new UnusableFile(`The file is damaged: ${name} holds ${size} bytes, not ${entry.size}.`);
    this.#unpacked += size;
    return true;
  }

  /** A part as a whole; undefined where there is none. */
  whole(name: string): Uint8Array | undefined {
    const entry = this.#entries.get(name);
    if (!entry) return undefined;
    const pieces: Uint8Array[] = [];
    this.unpack(name, (piece) => pieces.push(piece.slice()));
    const bytes = new Uint8Array(entry.size);
    let at = 0;
    for (const piece of pieces) {
      bytes.set(piece, at);
      at += piece.length;
    }
    return bytes;
  }

  #checkSize(name: string, { packedSize }: ZipEntry, size: number, what: string): void {
    const most = Math.min(MOST_BYTES_OF_A_PART, MOST_BYTES_IN_ALL - this.#unpacked);
    const shown = `${(size / 2 ** 20).toFixed(0)} MB`;
    if (size > most)
      throw new UnusableFile(`The file is refused: its part ${name} ${what} ${shown}, more than is read of one file.`);
    if (size > LARGE && size > MOST_PACKING * packedSize)
      throw new UnusableFile(
        `The file is refused: its part ${name} ${what} ${shown} out of ${packedSize} bytes, as only a file made to burst does.`,
      );
  }
}

function inflate(packed: Uint8Array, take: (piece: Uint8Array) => void, name: string): void {
  let refusal: unknown;
  const stream = new Inflate((piece) => {
    try {
      take(piece);
    } catch (failure) {
      refusal = failure;
      throw failure;
    }
  });
  try {
    for (let at = 0; at < packed.length || at === 0; at += STEP)
      stream.push(packed.subarray(at, at + STEP), at + STEP >= packed.length);
  } catch (failure) {
    if (refusal !== undefined) throw refusal;
    throw new UnusableFile(`The file is damaged: its part ${name} can't be unpacked (${(failure as Error).message}).`);
  }
}
