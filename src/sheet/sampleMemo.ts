import { Sample } from "../core/sample/sample";

/*
 * The same range handed to several functions is worked through once: samples are remembered by content, so that what one call
 * sorted or summed is there for the next. Bounded by the number of cells kept; the oldest go first.
 */
const MOST_CELLS = 2_500_000;
const remembered = new Map<number, Sample[]>();
const byArray = new WeakMap<Float64Array, Sample>();
let cellsKept = 0;

/** The sample with just these values: a remembered one where there is one. Never changes `values`, but may keep it. */
export function sampleOf(values: Float64Array): Sample {
  const same = byArray.get(values);
  if (same) return same;
  const key = contentKey(values);
  const bucket = remembered.get(key);
  const known = bucket?.find((sample) => sameBits(sample.values, values));
  if (known) {
    // Last used goes last out.
    remembered.delete(key);
    remembered.set(key, bucket!);
    byArray.set(values, known);
    return known;
  }
  const sample = new Sample(values);
  byArray.set(values, sample);
  if (values.length > MOST_CELLS) return sample;
  remembered.set(key, [...(bucket ?? []), sample]);
  cellsKept += values.length;
  for (const [oldest, samples] of remembered) {
    if (cellsKept <= MOST_CELLS) break;
    remembered.delete(oldest);
    for (const one of samples) cellsKept -= one.values.length;
  }
  return sample;
}

function contentKey(values: Float64Array): number {
  const words = new Int32Array(values.buffer, values.byteOffset, values.length * 2);
  let hash = values.length | 0;
  for (let i = 0; i < words.length; i++) hash = (Math.imul(hash, 0x01000193) ^ words[i]!) | 0;
  return hash;
}

function sameBits(a: Float64Array, b: Float64Array): boolean {
  if (a.length !== b.length) return false;
  for (let i = 0; i < a.length; i++) if (!Object.is(a[i], b[i])) return false;
  return true;
}
