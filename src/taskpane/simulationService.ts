import { simulateSearch } from "../core/method/simulateSearch";
import type { SimulationAnswer, SimulationRequest } from "./simulationProtocol";

/** Some 40 ms of play: long enough that reporting costs nothing, short enough that a cancel is obeyed at once. */
const DRAWS_PER_STEP = 4_000_000;

/**
 * Plays simulations in steps and reports each; `later` must let messages that wait be handled before it calls back, so that a cancel can come
 * between two steps. Returns what handles a request.
 */
export function simulationService(
  answer: (answer: SimulationAnswer) => void,
  later: (step: () => void) => void,
): (request: SimulationRequest) => void {
  let running: { readonly id: number } | undefined;

  const cancel = (): void => {
    if (running !== undefined) answer({ kind: "cancelled", id: running.id });
    running = undefined;
  };

  return (request) => {
    if (request.kind === "cancel") {
      if (request.id === running?.id) cancel();
      return;
    }
    cancel();
    const { id, plan } = request;
    const game = simulateSearch(plan, DRAWS_PER_STEP);
    // An object of its own, so that a start with a number used before doesn't wake up the steps of the one it cancelled.
    const mine = { id };
    running = mine;
    const step = (): void => {
      if (running !== mine) return;
      try {
        const next = game.next();
        if (next.done) {
          running = undefined;
          answer({ kind: "done", id, summary: next.value });
          return;
        }
        answer({ kind: "progress", id, runsPlayed: next.value.runsPlayed, runs: plan.runs });
      } catch (failure) {
        running = undefined;
        answer({ kind: "refused", id, message: failure instanceof Error ? failure.message : String(failure) });
        return;
      }
      later(step);
    };
    step();
  };
}
