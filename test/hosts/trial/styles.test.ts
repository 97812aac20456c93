import { BorderStyleTypes, HorizontalAlign, WrapStrategy } from "@univerjs/core";
import fc from "fast-check";
import { expect, test } from "vitest";
import type { RoleLook } from "../../../src/sheet/cellLook";
import { CELL_ROLES, ROLE_LOOKS } from "../../../src/sheet/cellLook";
import { lookOfStyle, styleOfLook } from "../../../src/hosts/trial/styles";

test("a look is styled by the engine's own numbers", () => {
  const rule = { side: "box", colour: "0B4A6B", thick: true } as const;
  const style = styleOfLook({ format: "0.0%", look: { wrap: true, align: "right", rule, bold: true } });
  expect(style).toMatchObject({ n: { pattern: "0.0%" }, bl: 1, tb: WrapStrategy.WRAP, ht: HorizontalAlign.RIGHT });
  expect(style.bd!.l!.s).toBe(BorderStyleTypes.MEDIUM);
  expect(styleOfLook({ look: { rule: { side: "left", colour: "000000" } } }).bd).toEqual({
    l: { s: BorderStyleTypes.THIN, cl: { rgb: "#000000" } },
  });
});

test.each(CELL_ROLES)("the look of the role %s comes back as it was", (role) => {
  expect(lookOfStyle(styleOfLook({ look: ROLE_LOOKS[role] }))?.look ?? {}).toEqual(ROLE_LOOKS[role]);
});

test("law: any look comes back as it was", () => {
  const colour = fc.integer({ min: 0, max: 0xffffff }).map((one) => one.toString(16).padStart(6, "0").toUpperCase());
  const yes = fc.constant(true);
  const look: fc.Arbitrary<RoleLook> = fc.record(
    {
      size: fc.integer({ min: 11, max: 40 }),
      bold: yes,
      italic: yes,
      ink: colour,
      fill: colour,
      wrap: yes,
      indent: fc.integer({ min: 1, max: 15 }),
      align: fc.constantFrom("left", "center", "right" as const),
      rule: fc.record({ side: fc.constantFrom("bottom", "box", "left" as const), colour }),
    },
    { requiredKeys: [] },
  ) as fc.Arbitrary<RoleLook>;
  fc.assert(
    fc.property(look, (one) => {
      expect(lookOfStyle(styleOfLook({ look: one }))?.look ?? {}).toEqual(one);
    }),
    { numRuns: 200 },
  );
});
