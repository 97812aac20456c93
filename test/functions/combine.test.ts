import { describe } from "vitest";
import { testCases } from "../support/cases";
describe("the public cases", () => {
  testCases("combine.json");
  testCases("combine-new.json", ["PANEL_SCORE"]);
});
