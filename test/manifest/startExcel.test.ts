import { describe, expect, test } from "vitest";
import { adviceFor } from "../../scripts/startExcel.mjs";

describe("npm run start:excel", () => {
  test("starts Excel on Windows and macOS", () => {
    expect([adviceFor("win32"), adviceFor("darwin")]).toEqual([undefined, undefined]);
  });

  test("says on Linux that there is no Excel, and what to do instead", () => {
    expect(adviceFor("linux")).toMatch(/no desktop Excel.*npm start.*Excel on the web/s);
  });
});
