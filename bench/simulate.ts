/*
 * How fast searches are played, in milliseconds of processor time, so that what else the machine does counts little: `npx esbuild bench/simulate.ts --bundle --platform=node | node -`.
 * A look is one entry assessed, learning or searching. The first lines are what a cell computes, the last ones what the pane plays in the background.
 */
import { playSearches } from "../src/core/method/simulateSearch";
import type { SearchPlan } from "../src/core/method/searchPlan";
import { weightSway } from "../src/core/method/weightSway";
import { panelScores } from "../src/core/method/panelScores";

const CELL: SearchPlan = { fraction: 0.1, learnCount: 60, method: "plain", runs: 10_000, seed: 1, mostLooks: 10_000 };
const PLANS: readonly [name: string, plan: SearchPlan][] = [
  ["a cell with all defaults", CELL],
  ["5 %, safe mark", { ...CELL, fraction: 0.05, method: "safe" }],
  ["a cell at its limit, mostly learning", { ...CELL, learnCount: 1970 }],
  ["a cell at its limit, mostly searching", { ...CELL, fraction: 0.0016, learnCount: 100 }],
  ["a cell at its limit, two scores learnt", { ...CELL, learnCount: 2, runs: 625_000 }],
  ["a million runs", { ...CELL, runs: 1_000_000 }],
  [
    "searching alone: 1 in 10,000, safe",
    { ...CELL, fraction: 0.0001, method: "safe", runs: 20_000, mostLooks: 30_000 },
  ],
];

const clock = () => process.cpuUsage().user / 1000;

for (const [name, plan] of PLANS) {
  playSearches({ ...plan, runs: Math.min(plan.runs, 1000) });
  const started = clock();
  const { looksPlayed } = playSearches(plan);
  const milliseconds = clock() - started;
  const looks = looksPlayed + plan.runs * plan.learnCount;
  const perSecond = (looks / milliseconds / 1000).toFixed(0);
  console.log(
    `${name}: ${milliseconds.toFixed(0)} ms, ${(looks / 1e6).toFixed(1)} million looks, ${perSecond} million a second`,
  );
}

function timed(name: string, work: () => unknown): void {
  work();
  const started = clock();
  work();
  console.log(`${name}: ${(clock() - started).toFixed(0)} ms`);
}

const numbers = (count: number) => Float64Array.from({ length: count }, (_, i) => (i * 7919) % 1009);
timed("WEIGHT_SWAY, 100 entries × 20 criteria × 10,000 runs", () =>
  weightSway(
    numbers(2000),
    numbers(20).map((x) => x + 1),
    10,
  ),
);
timed("WEIGHT_SWAY, 1000 entries × 2 criteria × 10,000 runs", () =>
  weightSway(numbers(2000), Float64Array.of(3, 2), 10),
);
timed("PANEL_SCORE, 100,000 entries × 5 raters", () => panelScores(numbers(500_000), 5));
timed("PANEL_SCORE, 316 entries × 316 raters", () => panelScores(numbers(316 * 316), 316));
timed("PANEL_SCORE, 1024 entries × 1024 raters", () => panelScores(numbers(1024 * 1024), 1024));
