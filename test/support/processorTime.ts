/** Milliseconds of processor time that `work` takes: the clock on the wall would fail on a machine that is busy with something else. */
export function processorTime(work: () => unknown): number {
  const start = process.cpuUsage();
  work();
  return process.cpuUsage(start).user / 1000;
}
