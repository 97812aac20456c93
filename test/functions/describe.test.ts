import { describe } from "vitest";
import { testCases } from "../support/cases";

describe("describe: the worked values of the independent program", () => {
  testCases("describe.json");
  testCases("describe-new.json");
});
