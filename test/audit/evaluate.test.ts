import { describe, expect, test } from "vitest";
import { evaluate, type FormulaPlace } from "../../src/audit/evaluate";
import { readFunctionName } from "../../src/audit/functionName";
import type { Cell } from "../../src/sheet/cell";
import { Sheet, type Workbook } from "../../src/sheet/workbook";

/* By hand. Bids: A name, B score with a gap, C weight; a spill at E2:F3. */
function makeBook(): Workbook {
  const bids = new Sheet("Bids");
  const rows: Cell[][] = [
    ["name", "score", "weight"],
    ["Rope", 70, 1],
    ["Tar", null, 2],
    ["Cable", 80, 3],
    ["Hemp", 90, 4],
  ];
  rows.forEach((row, r) => row.forEach((cell, c) => cell !== null && bids.set(r, c, cell)));
  const spill = { top: 1, left: 4, bottom: 2, right: 5 };
  [1, 2, 3, 4].forEach((value, i) => bids.set(1 + (i >> 1), 4 + (i & 1), value));
  bids.addFormula({ row: 1, column: 4, formula: "SEQUENCE(2,2)", array: spill, dynamic: true, calculated: true });
  bids.set(8, 0, { code: "#DIV/0!" });
  bids.addFormula({ row: 9, column: 0, formula: "NOW()", dynamic: false, calculated: false });
  const second = new Sheet("Round 2");
  second.set(0, 0, 5);
  const third = new Sheet("Round 3");
  third.set(0, 0, 6);
  return {
    sheets: [bids, second, third],
    names: [
      { name: "marks", formula: "Bids!$B$2:$B$5" },
      { name: "rate", formula: "0.05" },
      { name: "rate", formula: "0.1", sheet: "Round 2" },
      { name: "twice", formula: "2*rate" },
      { name: "left", formula: "Bids!A1" },
      { name: "loop", formula: "pool+1" },
      { name: "pool", formula: "loop+1" },
      { name: "boom0", formula: "boom1+boom1" },
      ...Array.from({ length: 30 }, (_, i) => ({ name: `boom${i + 1}`, formula: `boom${i + 2}+boom${i + 2}` })),
    ],
    tables: [
      {
        name: "Offers",
        sheet: "Bids",
        area: { top: 0, left: 0, bottom: 4, right: 2 },
        columns: ["name", "score", "weight"],
        headerRows: 1,
        totalsRows: 0,
      },
    ],
    date1904: false,
  };
}

const book = makeBook();
const at = (changes: Partial<FormulaPlace> = {}): FormulaPlace => ({
  workbook: book,
  sheet: book.sheets[0]!,
  row: 3,
  column: 9,
  ...changes,
});
const value = (formula: string, changes?: Partial<FormulaPlace>) => evaluate(formula, at(changes));

describe("what a formula refers to", () => {
  test.each<[string, Cell | Cell[][]]>([
    ["=B2", 70],
    ["=$B$4", 80],
    ["=B3", 0],
    ["=B2:B4", [[70], [0], [80]]],
    ["=B4:B2", [[70], [0], [80]]],
    ["=INDEX(B2:B5,{4;1})", [[90], [70]]],
    ["=SUM(INDEX(A2:C5,{1;3},{2,3}))", 70 + 1 + 80 + 3],
    ["=SUM(B:B)", 240],
    ["=ROWS(B:B)", 1_048_576],
    ["=SUM(2:2)", 70 + 1 + 1 + 2],
    ["='Round 2'!A1", 5],
    ["='Round 2'!A1+'ROUND 3'!$A$1", 11],
    ["=SUM('Round 2:Round 3'!A1)", 11],
    ["=SUM(marks)", 240],
    ["=twice", 0.1],
    ["=left", 0],
    ["=SUM(Offers[score])", 240],
    ["=SUM(Offers[[score]:[weight]])", 250],
    ["=Offers[[#Headers],[score]]", "score"],
    ["=Offers[[#This Row],[score]]", 80],
    ["=ROWS(Offers)", 4],
    ["=ROWS(Offers[#All])", 5],
    ["=SUM((B2,B4:B5))", 240],
    ["=SUM(B2:C5 A4:C4)", 83],
    ["=SUM(B2:INDEX(B:B,4))", 150],
    ["=SUM(E2#)", 10],
    ["=SUM(_xlfn.ANCHORARRAY(E2))", 10],
    ["=@B2:B5", 80],
    ["=_xlfn.SINGLE(B2:B5)", 80],
    ["=SUM({1,2;3,4})", 10],
    [
      '={1,"a";TRUE,#N/A}',
      [
        [1, "a"],
        [true, { code: "#N/A" }],
      ],
    ],
  ])("%s", (formula, expected) => expect(value(formula)).toEqual({ value: expected }));

  test("a name of the sheet goes before one of the workbook", () => {
    expect(value("=rate")).toEqual({ value: 0.05 });
    expect(value("=rate", { sheet: book.sheets[1]! })).toEqual({ value: 0.1 });
    expect(value("='Round 2'!rate")).toEqual({ value: 0.1 });
  });

  test("a shared formula moves its relative references", () => {
    expect(value("B2+$B$2", { shift: { rows: 2, columns: 0 } })).toEqual({ value: 150 });
    expect(value("B2", { shift: { rows: -2, columns: 0 } })).toMatchObject({ value: { code: "#REF!" } });
  });

  test("an old-style formula takes the cell in line with its own", () => {
    expect(value("=B2:B5*2", { single: true })).toEqual({ value: 160 });
    expect(value("=B2:B5", { single: true })).toEqual({ value: 80 });
    expect(value("=B2:B5*2", { single: true, row: 20 })).toMatchObject({ value: { code: "#VALUE!" } });
    expect(value("=SUMPRODUCT(C2:C5*2)", { single: true })).toEqual({ value: 20 });
  });
});

describe("what a formula works out", () => {
  test.each<[string, Cell | Cell[][]]>([
    ["=1+2*3^2", 19],
    ["=-2^2", 4],
    ["=2^3^2", 64],
    ["=50%*4", 2],
    ["=10%%", 0.001],
    [
      "=B2:B4+{1,2}",
      [
        [71, 72],
        [1, 2],
        [81, 82],
      ],
    ],
    ["={1,2,3}+{1,2}", [[2, 4, { code: "#N/A" }]]],
    ["=LET(x,2,y,x+1,x*y)", 6],
    ["=_xlfn.LET(_xlpm.x,2,_xlpm.y,_xlpm.x+1,_xlpm.x*_xlpm.y)", 6],
    ["=LET(all,B2:B5,SUM(all)+ROWS(all))", 244],
    ['=IF(B2>60,"clears",1/0)', "clears"],
    ['=IF(B2:B5>75,"y","n")', [["n"], ["n"], ["y"], ["y"]]],
    ["=IFERROR(A9,7)", 7],
    ['=IFERROR(WEIR.RELEASE("nonsense"),7)', 7],
    ["=SORT(B2:B5,1,-1)", [[90], [80], [70], [0]]],
    ["=FILTER(A2:A5,B2:B5>75)", [["Cable"], ["Hemp"]]],
    ['=UNIQUE({"a";"A";"b"})', [["a"], ["b"]]],
    [
      "=TRANSPOSE({1,2;3,4})",
      [
        [1, 3],
        [2, 4],
      ],
    ],
    [
      "=VSTACK({1,2},3)",
      [
        [1, 2],
        [3, { code: "#N/A" }],
      ],
    ],
    [
      "=HSTACK({1;2},3)",
      [
        [1, 3],
        [2, { code: "#N/A" }],
      ],
    ],
    ["=TAKE(B2:C5,-1)", [[90, 4]]],
    ["=DROP(B2:C5,2,1)", [[3], [4]]],
    [
      "=CHOOSECOLS(A2:C3,3,1)",
      [
        [1, "Rope"],
        [2, "Tar"],
      ],
    ],
    ["=CHOOSEROWS(C2:C5,-1,1)", [[4], [1]]],
    [
      "=SEQUENCE(2,2,10,5)",
      [
        [10, 15],
        [20, 25],
      ],
    ],
    ["=TOCOL({1,2;3,4})", [[1], [2], [3], [4]]],
    ["=MAP({1,2,3},LAMBDA(x,x*x))", [[1, 4, 9]]],
    ["=_xlfn.MAP({1,2},{3,4},_xlfn.LAMBDA(_xlpm.a,_xlpm.b,_xlpm.a*_xlpm.b))", [[3, 8]]],
    ["=REDUCE(0,B2:B5,LAMBDA(sum,x,sum+x))", 240],
    ["=SCAN(0,{1,2,3},LAMBDA(sum,x,sum+x))", [[1, 3, 6]]],
    ["=BYROW({1,2;3,4},LAMBDA(line,SUM(line)))", [[3], [7]]],
    ["=BYCOL({1,2;3,4},LAMBDA(line,SUM(line)))", [[4, 6]]],
    [
      "=MAKEARRAY(2,2,LAMBDA(i,j,10*i+j))",
      [
        [11, 12],
        [21, 22],
      ],
    ],
    ["=MAP({1,2},LAMBDA(x,{1,2}))", [[{ code: "#CALC!" }, { code: "#CALC!" }]]],
    ["=SUM(1+2+3+4)", 10],
    ["=(((1)))", 1],
    ['=WEIR.RELEASE("revision")+0', 1],
    ['=NOT(WEIR.BLANK_CHECK(B3)="")', true],
  ])("%s", (formula, expected) => expect(value(formula)).toEqual({ value: expected }));

  test("a sum of a thousand terms is no depth", () => {
    expect(value(`=${Array.from({ length: 1000 }, () => "C2").join("+")}`)).toEqual({ value: 1000 });
  });
});

describe("our functions, in every spelling that a file may hold", () => {
  test.each([
    "WEIR.RELEASE",
    "weir.release",
    "_xldudf_WEIR_RELEASE",
    "[2]!_xldudf_WEIR_RELEASE",
    "_xldudf_weir_release",
    "_XLDUDF_WEIR.RELEASE",
    "weir_release",
    "@WEIR.RELEASE",
  ])("%s", (name) => expect(value(`=${name}("revision")`)).toEqual({ value: 1 }));

  test("the prefix of another workbook is dropped before ours alone, and never in a text", () => {
    expect(value('="[2]!_xldudf_WEIR_RELEASE"')).toEqual({ value: "[2]!_xldudf_WEIR_RELEASE" });
    expect(value("=[2]Sheet1!A1")).toEqual({ notKnown: "it refers to another workbook" });
  });

  test("a name that the table doesn't have is #NAME? with the nearest", () => {
    const answer = value("=WEIR.RELAESE()");
    expect(answer).toMatchObject({ value: { code: "#NAME?", message: expect.stringContaining("WEIR.RELEASE") } });
    expect(readFunctionName("WEIR.")).toMatchObject({ kind: "unknown" });
  });

  test("a misspelt name in an argument is #NAME?, not a complaint about the argument", () => {
    expect(value("=WEIR.BLANK_CHECK(mraks)")).toMatchObject({
      value: { code: "#NAME?", message: expect.stringContaining("the nearest is marks") },
    });
  });

  test("two areas are not one range", () => {
    expect(value('=WEIR.SCORE_SUMMARY((B2,B4:B5),"mean")')).toMatchObject({ value: { code: "#VALUE!" } });
  });
});

describe("what can't be known is said to be so, never guessed", () => {
  test.each<[string, RegExp]>([
    ["=FROBNICATE(1)", /FROBNICATE is not known/],
    ["=XLOOKUP(70,B2:B5,A2:A5,0,{0;1})", /hands an array to where one number is taken/],
    ["=SUM(INDEX(A2:C5,{1;2},0))", /picks whole rows or columns by an array/],
    ["=IFERROR(FROBNICATE(1),2)", /FROBNICATE is not known/],
    ["=NOW()", /something else each time/],
    ["=OFFSET(A1,1,1)", /OFFSET is not known/],
    ["=A10+1", /Bids!A10 holds a formula without a stored value/],
    ["=SUM(A1:A20)", /Bids!A10 holds a formula without a stored value/],
    ["=loop", /leads back to itself/],
    ["=boom0", /too many steps|more than 32 deep|There is no name/],
    ["=LAMBDA(x,x+1)(2)", /LAMBDA/],
    ['="2024-01-15"+1', /may be a date/],
    ['=TEXT(45306,"dd.mm.yyyy")', /number format/],
    ["=SUM(SEQUENCE(1000000,100))", /array of 1000000 rows/],
  ])("%s", (formula, reason) => {
    const start = performance.now();
    const answer = value(formula);
    expect("notKnown" in answer ? answer.notKnown : JSON.stringify(answer)).toMatch(reason);
    expect(performance.now() - start).toBeLessThan(5_000);
  });

  test("what is not needed is not asked for", () => {
    expect(value("=IF(TRUE,1,FROBNICATE(1))")).toEqual({ value: 1 });
    expect(value("=CHOOSE(2,FROBNICATE(1),5)")).toEqual({ value: 5 });
  });

  test("a function of the host mistyped comes with the nearest", () => {
    const answer = value("=SUMM(B2)");
    expect("unknownFunction" in answer && answer.unknownFunction!.nearest).toBe("SUM");
  });
});

describe("a text that is no formula is said to be so", () => {
  test.each<[string, RegExp]>([
    ["=SUM(B2", /a bracket is not closed/],
    ["=SUM(B2))", /never opened/],
    ["=SUM(B2;B3)", /parted by commas/],
    ["=1,5", /parted by commas/],
    ["=", /empty/],
    ["=*", /./],
    [`=${"(".repeat(1000)}1${")".repeat(1000)}`, /nested more than 128 deep/],
    [`=${"IF(1,".repeat(1000)}1${")".repeat(1000)}`, /nested more than 128 deep/],
    [`=${"-".repeat(5000)}1`, /nested more than 128 deep/],
    [`="${"x".repeat(9000)}"`, /9003 characters/],
  ])("%s", (formula, reason) => {
    const answer = value(formula);
    expect("unreadable" in answer ? answer.unreadable : JSON.stringify(answer)).toMatch(reason);
  });
});
