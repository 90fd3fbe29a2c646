/** Time per call of each contestant, measured in turn so that a noisy machine is noisy for all of them. */
export interface Contestant {
  readonly name: string;
  /** Operations that one run does. */
  readonly operations: number;
  run(): unknown;
}

export interface Result {
  readonly name: string;
  /** Median seconds per operation. */
  readonly seconds: number;
}

/** Keeps results from being optimised away. */
export const sink: { value: unknown } = { value: 0 };

/** Runs all contestants round after round and takes each one's median. */
export function race(contestants: readonly Contestant[], rounds = 15): Result[] {
  const times = contestants.map(() => [] as number[]);
  for (let round = -3; round < rounds; round++) {
    for (const [i, contestant] of contestants.entries()) {
      const start = process.hrtime.bigint();
      sink.value = contestant.run();
      const seconds = Number(process.hrtime.bigint() - start) / 1e9;
      if (round >= 0) times[i]?.push(seconds / contestant.operations);
    }
  }
  return contestants.map(({ name }, i) => ({ name, seconds: median(times[i] ?? []) }));
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? NaN;
}

/** Seconds in a unit that reads well. */
export function readable(seconds: number): string {
  if (seconds < 1e-6) return `${(seconds * 1e9).toFixed(1)} ns`;
  if (seconds < 1e-3) return `${(seconds * 1e6).toFixed(2)} µs`;
  if (seconds < 1) return `${(seconds * 1e3).toFixed(2)} ms`;
  return `${seconds.toFixed(2)} s`;
}

/** Prints a race as a table with ratios to its first entry. */
export function report(title: string, results: readonly Result[]): void {
  process.stdout.write(`\n${title}\n`);
  const first = results[0]?.seconds ?? NaN;
  for (const { name, seconds } of results) {
    process.stdout.write(`  ${name.padEnd(58)} ${readable(seconds).padStart(10)}  ×${(seconds / first).toFixed(2)}\n`);
  }
}
