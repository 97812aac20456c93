import { describe } from "vitest";
import { testCases } from "../support/cases";

describe("the public cases of the search functions", () => {
  testCases("search.json");
  testCases("search-new.json");
});
