export interface Coalesced {
  /** Asks for a run within `delayMs`; requests before it, or during a run, become one. */
  request(delayMs: number): void;
  stop(): void;
}

/** Runs `task` once for a burst of requests, never twice at a time; failures go to `failed`. */
export function coalesced(task: () => Promise<void>, failed: (error: unknown) => void): Coalesced {
  let timer: ReturnType<typeof setTimeout> | undefined;
  let dueAt = Number.POSITIVE_INFINITY;
  let running = false;
  let again: number | undefined;
  let stopped = false;

  const run = () => {
    timer = undefined;
    dueAt = Number.POSITIVE_INFINITY;
    running = true;
    task()
      .catch(failed)
      .finally(() => {
        running = false;
        if (again === undefined) return;
        const delayMs = again;
        again = undefined;
        request(delayMs);
      });
  };

  const request = (delayMs: number) => {
    if (stopped) return;
    if (running) {
      again = Math.min(again ?? delayMs, delayMs);
      return;
    }
    const wanted = Date.now() + delayMs;
    if (wanted >= dueAt) return;
    clearTimeout(timer);
    dueAt = wanted;
    timer = setTimeout(run, delayMs);
  };

  return {
    request,
    stop() {
      stopped = true;
      clearTimeout(timer);
    },
  };
}
