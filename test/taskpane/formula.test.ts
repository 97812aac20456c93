import { expect, test } from "vitest";
import { formulaText, localFormula } from "../../src/taskpane/formula";

test("a formula leaves out what stands at its end and was left out", () => {
  expect(formulaText("CUTOFF_REPORT", [{ reference: "Bids!F2:F61" }, 0.05, undefined, undefined, undefined])).toBe(
    "=WEIR.CUTOFF_REPORT(Bids!F2:F61,0.05)",
  );
  expect(formulaText("CUTOFF_LIMITS", [{ reference: "A2:A9" }, 0.05, undefined, "logit(0,100)", "low", "cutoff"])).toBe(
    '=WEIR.CUTOFF_LIMITS(A2:A9,0.05,,"logit(0,100)","low","cutoff")',
  );
});

test("quotes inside a text are doubled, so that the text can't end the argument", () => {
  expect(formulaText("RELEASE", ['a"b'])).toBe('=WEIR.RELEASE("a""b")');
});

test("a user with decimal comma sees commas and semicolons, texts and sheet names untouched", () => {
  const local = { decimal: ",", argument: ";" } as const;
  expect(localFormula("=WEIR.CUTOFF_LIMITS('A, 1.5'!A2:A9,0.05,,\"logit(0.5,100)\")", local)).toBe(
    "=WEIR.CUTOFF_LIMITS('A, 1.5'!A2:A9;0,05;;\"logit(0.5,100)\")",
  );
});
