import { expect, test } from "vitest";
import { putInventedScores } from "../../src/taskpane/column/inventedScores";
import { fakePort } from "./fakePort";

test("invented scores go on a sheet of their own, said to be invented, and are selected", async () => {
  const port = fakePort({ "Invented scores": [["mine"]] }, "'Invented scores'!A1");
  await putInventedScores(port, "Invented scores", "score (invented)");
  const { address, values } = (await port.selection())!;
  expect(address).toBe("'Invented scores 2'!A2:A49");
  expect(values.every(([score]) => typeof score === "number" && score >= 0 && score <= 100 && score % 0.5 === 0)).toBe(
    true,
  );
  expect((await port.read("'Invented scores 2'!A1")).values).toEqual([["score (invented)"]]);
  expect((await port.read("'Invented scores'!A1")).values).toEqual([["mine"]]);
});
