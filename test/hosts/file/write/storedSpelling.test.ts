import { describe, expect, test } from "vitest";
import { storedSpelling } from "../../../../src/hosts/file/write/storedSpelling";

/* Spellings as the format's own description has them: [MS-XLSX] 2.2.2 (formulas) and 2.3.3 (future functions). */
describe("a typed formula in the spelling of a file", () => {
  test.each([
    ["=WEIR.SAFE_CUTOFF(B2:B61,5%)", "_xldudf_WEIR_SAFE_CUTOFF(B2:B61,5%)"],
    ["weir.release()", "_xldudf_WEIR_RELEASE()"],
    ["_xldudf_weir_release()", "_xldudf_WEIR_RELEASE()"],
    ["=\"WEIR.X(\"&'WEIR.Y('!A1", "\"WEIR.X(\"&'WEIR.Y('!A1"],
    ["=stdev.s(A1:A9)+STDEV(A1:A9)", "_xlfn.STDEV.S(A1:A9)+STDEV(A1:A9)"],
    ["=SORT(FILTER(A1:A9,B1:B9>0))", "_xlfn._xlws.SORT(_xlfn._xlws.FILTER(A1:A9,B1:B9>0))"],
    ["=AGGREGATE(9,6,A1:A9)", "AGGREGATE(9,6,A1:A9)"],
    ["=LET(a,1,b,a+1,a*b+other)", "_xlfn.LET(_xlpm.a,1,_xlpm.b,_xlpm.a+1,_xlpm.a*_xlpm.b+other)"],
    ["=MAP(A1:A3,LAMBDA(x,x^2))", "_xlfn.MAP(A1:A3,_xlfn.LAMBDA(_xlpm.x,_xlpm.x^2))"],
    ["=SUM(A1#)+@B2:B9", "SUM(_xlfn.ANCHORARRAY(A1))+_xlfn.SINGLE(B2:B9)"],
    ["=@WEIR.RELEASE()", "_xldudf_WEIR_RELEASE()"],
    ["=SUM(Bids[Score])", "SUM(Bids[Score])"],
  ])("%s", (typed, stored) => {
    expect(storedSpelling(typed)).toBe(stored);
    // What is already stored stays as it is, but for the sign of a whole call.
    expect(storedSpelling(stored)).toBe(stored);
  });
});
