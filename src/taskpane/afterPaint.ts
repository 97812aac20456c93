const PATIENCE_MS = 500;

/**
 * Puts work off until the answer that matters most has been painted; asked for many times before that, it is done once. A page that is not
 * painted (in the background) does it after half a second.
 */
export function afterPaint(work: () => void): () => void {
  let waiting = false;
  const run = () => {
    if (!waiting) return;
    waiting = false;
    work();
  };
  return () => {
    if (waiting) return;
    waiting = true;
    requestAnimationFrame(() => setTimeout(run));
    setTimeout(run, PATIENCE_MS);
  };
}
