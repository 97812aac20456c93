import { failureOutcome, plainResult, type CellFunction } from "../../sheet/invoke";

/** What the host's runtime gives for registering cell functions (the global `CustomFunctions`). */
export interface Registry {
  associate(id: string, cellFunction: (...cells: unknown[]) => unknown): void;
  Error?: new (code: any, message?: string) => unknown;
  ErrorCode?: { readonly invalidValue: string; readonly notAvailable: string };
}

/**
 * Registers every cell function with the host. The host has checked the arity and passes null for what was left out; what core throws
 * becomes the host's own error with its message, which is shown for #VALUE! and #N/A only.
 */
export function associateAll(
  registry: Registry,
  implementations: Readonly<Record<string, CellFunction>>,
  spilling: readonly string[],
): void {
  for (const [id, implementation] of Object.entries(implementations)) {
    const spills = spilling.includes(id);
    // A function declared to spill must hand over rows also where it gives one value.
    const handOver = (result: unknown) => {
      const plain = plainResult(result);
      return spills && !Array.isArray(plain) ? [[plain]] : plain;
    };
    const refuse = (failure: unknown) => {
      throw hostError(registry, failure);
    };
    registry.associate(id, (...cells) => {
      try {
        const result = implementation(...cells);
        return result instanceof Promise ? result.then(handOver).catch(refuse) : handOver(result);
      } catch (failure) {
        return refuse(failure);
      }
    });
  }
}

function hostError(registry: Registry, failure: unknown): unknown {
  const { error, message } = failureOutcome(failure);
  const { Error: HostError, ErrorCode } = registry;
  // The plain runtime of the web page has no error class: any exception shows as #VALUE!.
  if (!HostError || !ErrorCode) return new Error(message);
  return new HostError(error === "#N/A" ? ErrorCode.notAvailable : ErrorCode.invalidValue, message);
}
