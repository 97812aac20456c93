import type { SimulationRequest } from "./simulationProtocol";
import { simulationService } from "./simulationService";

/* The entry of the background worker that plays long simulations, so that the pane stays alive: see simulationProtocol.ts for what it is told. */

const handle = simulationService(
  (answer) => self.postMessage(answer),
  (step) => setTimeout(step, 0),
);

self.onmessage = (event: MessageEvent<SimulationRequest>) => handle(event.data);
