import { Sample } from "../../core/sample/sample";

const remembered = new WeakMap<readonly number[], Sample>();

/** The sample with these numbers: one list handed to several functions is sorted and summed once. */
export function sampleOf(numbers: readonly number[]): Sample {
  let sample = remembered.get(numbers);
  if (!sample) remembered.set(numbers, (sample = new Sample(Float64Array.from(numbers))));
  return sample;
}
