import { describe } from "vitest";
import { testCases } from "../support/cases";
describe("the public cases", () => {
  testCases("watch.json");
});
