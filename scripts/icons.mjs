// Draws the icons as PNG from nothing but their geometry: `node scripts/icons.mjs` writes manifest/icons.
// A thin curve over a baseline and an upright line where the mark stands: ink and the deep water blue of the pane.
import { mkdirSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { deflateSync } from "node:zlib";

const folder = join(dirname(fileURLToPath(import.meta.url)), "../manifest/icons");
const INK = [0x22, 0x2a, 0x33];
const ACCENT = [0x0b, 0x4f, 0x6c];
const WHITE = [0xff, 0xff, 0xff];

mkdirSync(folder, { recursive: true });
for (const size of [16, 32, 64, 80, 192])
  writeFileSync(
    join(folder, `icon-${size}.png`),
    png(size, (x, y) => colourAt(x, y, size)),
  );
writeFileSync(
  join(folder, "outline-32.png"),
  png(32, (x, y) => outlineAt(x, y, 32)),
);

/** Colour of a point of the unit square, as [r, g, b, a]: the curve, what lies beyond the mark filled, the mark. */
function colourAt(x, y, size) {
  const ink = Math.max(0.05, 1.3 / size);
  const curve = 0.86 - 0.66 * Math.exp(-0.5 * ((x - 0.42) / 0.17) ** 2);
  if (Math.abs(x - 0.66) < ink * 0.8 && y > 0.12 && y < 0.88) return [...ACCENT, 255];
  if (x > 0.66 && x < 0.94 && y > curve && y < 0.88) return [...ACCENT, 150];
  if (y > 0.86 && y < 0.86 + ink && x > 0.06 && x < 0.94) return [...INK, 255];
  const slope = (0.66 * (x - 0.42) * Math.exp(-0.5 * ((x - 0.42) / 0.17) ** 2)) / 0.17 ** 2;
  if (Math.abs(y - curve) / Math.hypot(1, slope) < ink * 0.6 && x > 0.06 && x < 0.94) return [...INK, 255];
  return [0, 0, 0, 0];
}

function outlineAt(x, y, size) {
  const [, , , alpha] = colourAt(x, y, size);
  return [...WHITE, alpha];
}

/** A PNG of size × size, each pixel the mean of 4 × 4 points. */
function png(size, colour) {
  const rows = [];
  for (let row = 0; row < size; row++) {
    const line = Buffer.alloc(1 + size * 4);
    for (let column = 0; column < size; column++) {
      const sum = [0, 0, 0, 0];
      for (let i = 0; i < 16; i++) {
        const [r, g, b, a] = colour(
          (column + ((i % 4) + 0.5) / 4) / size,
          (row + (Math.floor(i / 4) + 0.5) / 4) / size,
        );
        sum[0] += r * a;
        sum[1] += g * a;
        sum[2] += b * a;
        sum[3] += a;
      }
      for (let channel = 0; channel < 3; channel++)
        line[1 + column * 4 + channel] = sum[3] ? Math.round(sum[channel] / sum[3]) : 0;
      line[1 + column * 4 + 3] = Math.round(sum[3] / 16);
    }
    rows.push(line);
  }
  const header = Buffer.alloc(13);
  header.writeUInt32BE(size, 0);
  header.writeUInt32BE(size, 4);
  header.set([8, 6, 0, 0, 0], 8);
  const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  return Buffer.concat([
    signature,
    chunk("IHDR", header),
    chunk("IDAT", deflateSync(Buffer.concat(rows), { level: 9 })),
    chunk("IEND", Buffer.alloc(0)),
  ]);
}

function chunk(type, data) {
  const body = Buffer.concat([Buffer.from(type, "latin1"), data]);
  const framed = Buffer.alloc(body.length + 8);
  framed.writeUInt32BE(data.length, 0);
  body.copy(framed, 4);
  framed.writeUInt32BE(crc32(body), body.length + 4);
  return framed;
}

function crc32(bytes) {
  let crc = 0xffffffff;
  for (const byte of bytes) {
    crc ^= byte;
    for (let bit = 0; bit < 8; bit++) crc = (crc >>> 1) ^ (crc & 1 ? 0xedb88320 : 0);
  }
  return (crc ^ 0xffffffff) >>> 0;
}
