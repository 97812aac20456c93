import { runInNewContext } from "node:vm";
import { join } from "node:path";
import { buildSync } from "esbuild";
import { describe, expect, test } from "vitest";
import type { SearchPlan } from "../../src/core/method/searchPlan";
import { playSearches } from "../../src/core/method/simulateSearch";
import type { SimulationAnswer, SimulationRequest } from "../../src/taskpane/simulationProtocol";
import { simulationService } from "../../src/taskpane/simulationService";

const PLAN: SearchPlan = { fraction: 0.1, learnCount: 100, method: "plain", runs: 100_000, seed: 1, mostLooks: 1000 };

/** The service with its steps held back, so that a test decides when each is played. */
function held() {
  const answers: SimulationAnswer[] = [];
  const waiting: (() => void)[] = [];
  const handle = simulationService(
    (answer) => answers.push(answer),
    (step) => waiting.push(step),
  );
  const playOn = (most = Infinity) => {
    for (let i = 0; i < most && waiting.length > 0; i++) waiting.shift()!();
  };
  return { answers, handle, playOn };
}

describe("simulationService", () => {
  test("reports progress that grows, then the same summary that playing in one go gives", () => {
    const { answers, handle, playOn } = held();
    handle({ kind: "start", id: 7, plan: PLAN });
    playOn();
    const progress = answers.slice(0, -1).map((answer) => (answer.kind === "progress" ? answer.runsPlayed : NaN));
    expect(progress.length).toBeGreaterThan(3);
    expect(progress).toEqual([...progress].sort((a, b) => a - b));
    expect(progress.at(-1)).toBe(PLAN.runs);
    expect(answers.at(-1)).toEqual({ kind: "done", id: 7, summary: playSearches(PLAN) });
  });

  test("obeys a cancel between two steps and then plays no more", () => {
    const { answers, handle, playOn } = held();
    handle({ kind: "start", id: 1, plan: PLAN });
    playOn(1);
    handle({ kind: "cancel", id: 2 });
    expect(answers.at(-1)).toMatchObject({ kind: "progress", id: 1 });
    handle({ kind: "cancel", id: 1 });
    const before = answers.length;
    playOn();
    handle({ kind: "cancel", id: 1 });
    expect(answers).toHaveLength(before);
    expect(answers.at(-1)).toEqual({ kind: "cancelled", id: 1 });
  });

  test("a new start cancels the running one, also under the same number", () => {
    const { answers, handle, playOn } = held();
    handle({ kind: "start", id: 1, plan: PLAN });
    handle({ kind: "start", id: 1, plan: { ...PLAN, runs: 10 } });
    playOn();
    expect(answers.map(({ kind }) => kind)).toEqual(["progress", "cancelled", "progress", "done"]);
    expect(answers.at(-1)).toMatchObject({ summary: { runs: 10 } });
  });

  test("answers a plan that can't be played with the message that names the argument, and is ready for the next", () => {
    const { answers, handle, playOn } = held();
    handle({ kind: "start", id: 1, plan: { ...PLAN, learnCount: 1 } });
    expect(answers).toEqual([
      { kind: "refused", id: 1, message: "learn_count must be a whole number of at least 2; 1 was given." },
    ]);
    handle({ kind: "start", id: 2, plan: { ...PLAN, runs: 5 } });
    playOn();
    expect(answers.at(-1)).toMatchObject({ kind: "done", id: 2 });
  });
});

describe("simulationWorker", () => {
  test("bundled as it ships, it answers a message with progress and the summary", async () => {
    const entry = join(__dirname, "../../src/taskpane/simulationWorker.ts");
    const { outputFiles } = buildSync({
      entryPoints: [entry],
      bundle: true,
      write: false,
      target: "es2020",
      format: "iife",
    });
    const self: { postMessage(answer: SimulationAnswer): void; onmessage?(event: { data: SimulationRequest }): void } =
      {
        postMessage: () => undefined,
      };
    runInNewContext(outputFiles[0].text, { self, setTimeout });
    const done = new Promise<SimulationAnswer>((resolve) => {
      self.postMessage = (answer) => answer.kind === "done" && resolve(answer);
    });
    const plan = { ...PLAN, runs: 1000 };
    self.onmessage!({ data: { kind: "start", id: 3, plan } });
    expect(JSON.parse(JSON.stringify(await done))).toEqual({ kind: "done", id: 3, summary: playSearches(plan) });
  });
});
