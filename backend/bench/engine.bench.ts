import { evaluate } from '@bellgap/common/engine';
import { sampleContext } from './context';
import type { Figure } from './harness';
import { inTurn, sideBySide } from './rates';
import { sampleInput } from './sample';

const BATCH = 10_000;
const SHORT = 1000;
const LONG = 100_000;
/** Stretches of the long batch; a short one is run after each, so that other work weighs on both alike. */
const STRETCHES = 20;

/** Strings evaluated one after the other, each with its own altitude and class, and their counts kept. */
class Batch {
  private readonly context = sampleContext();
  private readonly unitCounts: number[] = [];
  ms = 0;

  run(evaluations: number): this {
    const start = performance.now();
    for (let done = 0; done < evaluations; done += 1) {
      const units = evaluate(sampleInput(this.unitCounts.length), this.context, { trace: false }).string?.units;
      if (!units) throw new Error('A string of the batch came out without a count');
      this.unitCounts.push(units);
    }
    this.ms += performance.now() - start;
    return this;
  }
}

/** Evaluations in this process: as typing asks for them, with every step of the working, and many at a time. */
export const engineFigures: readonly Figure[] = [
  {
    name: 'evaluations-in-process',
    unit: '/s without trace',
    besideUnit: '/s with trace',
    aim: { ratioAtMost: 3 },
    measure: () => {
      const context = sampleContext();
      return sideBySide(
        inTurn((step) => evaluate(sampleInput(step), context, { trace: false })),
        inTurn((step) => evaluate(sampleInput(step), context, { trace: true })),
      );
    },
  },
  {
    name: 'batch-of-10000',
    unit: 'ms for 10,000 evaluations',
    aim: null,
    measure: async () => {
      new Batch().run(SHORT);
      return { value: new Batch().run(BATCH).ms, beside: null };
    },
  },
  {
    name: 'growth-to-100000',
    unit: 'µs an evaluation of 100,000',
    besideUnit: 'µs of 1,000',
    aim: { ratioAtMost: 1.1 },
    measure: async () => {
      new Batch().run(SHORT);
      const long = new Batch();
      let shortMs = 0;
      for (let stretch = 0; stretch < STRETCHES; stretch += 1) {
        long.run(LONG / STRETCHES);
        shortMs += new Batch().run(SHORT).ms;
      }
      return { value: (long.ms * 1000) / LONG, beside: (shortMs * 1000) / (SHORT * STRETCHES) };
    },
  },
];
