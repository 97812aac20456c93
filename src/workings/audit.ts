import { NUMBERS_REVISION, RELEASE_NAME, RELEASE_VERSION } from "../core/release";
import { Steps, type Step } from "./steps";
import { pickItem } from "./pickItem";
import type { WorkingsCall } from "./workingsCall";

export function RELEASE(call: WorkingsCall): readonly Step[] {
  const steps = new Steps()
    .add("name", RELEASE_NAME, "", "the build itself")
    .add("version", RELEASE_VERSION, "", "the build itself")
    .add("revision", NUMBERS_REVISION, "", "the build itself");
  return pickItem(steps.rows, 3, call.cell("item"));
}
