import type { SearchPlan } from "../../core/method/searchPlan";
import type { SearchSummary } from "../../core/method/summariseSearches";
import type { SimulationAnswer, SimulationRequest } from "../simulationProtocol";

/** What a simulation tells while it runs. */
export interface TrialListener {
  progress(played: number, runs: number): void;
  done(summary: SearchSummary): void;
  cancelled(): void;
  failed(message: string): void;
}

export interface TrialRunner {
  start(plan: SearchPlan, listener: TrialListener): void;
  cancel(): void;
}

/** The one worker that plays simulations; made with the first of them. Answers to a simulation that is no longer the last are dropped. */
export function trialRunner(makeWorker: () => Worker): TrialRunner {
  let worker: Worker | undefined;
  let last = 0;
  let current: TrialListener | undefined;
  const send = (request: SimulationRequest) => worker?.postMessage(request);

  const hear = (answer: SimulationAnswer) => {
    if (answer.id !== last || !current) return;
    if (answer.kind === "progress") return current.progress(answer.runsPlayed, answer.runs);
    const listener = current;
    current = undefined;
    if (answer.kind === "done") listener.done(answer.summary);
    else if (answer.kind === "cancelled") listener.cancelled();
    else listener.failed(answer.message);
  };
  const open = (): Worker => {
    const made = makeWorker();
    made.onmessage = (event: MessageEvent<SimulationAnswer>) => hear(event.data);
    made.onerror = (event) => {
      const listener = current;
      current = undefined;
      // A worker that failed to load answers nothing ever again: the next start makes a new one.
      worker?.terminate();
      worker = undefined;
      listener?.failed(event.message || "worker");
    };
    return made;
  };
  return {
    start(plan, listener) {
      worker ??= open();
      current = listener;
      send({ kind: "start", id: ++last, plan });
    },
    cancel: () => send({ kind: "cancel", id: last }),
  };
}

export function simulationWorker(): Worker {
  return new Worker(new URL("../simulationWorker.ts", import.meta.url));
}
