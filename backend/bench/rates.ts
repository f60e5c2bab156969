/** Work that was done in a stretch of time. */
export interface Stretch {
  runs: number;
  ms: number;
}

/** Works for so many milliseconds and says how often it got through. */
export type Side = (ms: number) => Promise<Stretch>;

/** One run after the other, each given its number. */
export function inTurn(work: (step: number) => unknown): Side {
  let step = 0;
  return async (ms) => {
    const start = performance.now();
    let runs = 0;
    while (performance.now() - start < ms) {
      const result = work(step++);
      if (result instanceof Promise) await result;
      runs += 1;
    }
    return { runs, ms: performance.now() - start };
  };
}

const WARM_UP_MS = 2000;
const WARM_UP_MS_AT_MOST = 40_000;
const ROUNDS = 5;
const STRETCH_MS = 1200;

async function warmUp(side: Side, runsAtLeast: number): Promise<void> {
  let { runs, ms } = await side(WARM_UP_MS);
  while (runs < runsAtLeast && ms < WARM_UP_MS_AT_MOST) {
    const more = await side(WARM_UP_MS);
    runs += more.runs;
    ms += more.ms;
  }
}

/**
 * Runs per second of both sides, in turns, so that whatever else the machine does weighs on both alike. Each side is
 * warm before: a server is when some thousand requests have had its code compiled.
 */
export async function sideBySide(
  mine: Side,
  other: Side,
  { warmUpRuns = 0 } = {},
): Promise<{ value: number; beside: number }> {
  const totals = [mine, other].map((side) => ({ side, runs: 0, ms: 0 }));
  for (const { side } of totals) await warmUp(side, warmUpRuns);
  for (let round = 0; round < ROUNDS; round += 1) {
    for (const total of totals) {
      const { runs, ms } = await total.side(STRETCH_MS);
      total.runs += runs;
      total.ms += ms;
    }
  }
  const [value = 0, beside = 0] = totals.map(({ runs, ms }) => (runs * 1000) / ms);
  return { value, beside };
}
