import { describe } from "vitest";
import { testCases } from "../support/cases";

describe("the public cases of the cutoff functions", () => testCases("cutoff.json"));
