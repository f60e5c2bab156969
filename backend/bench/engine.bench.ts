import { evaluate } from '@bellgap/common/engine';
import { sampleContext } from './context';
import type { Figure } from './harness';
import { inTurn, sideBySide } from './rates';
import { sampleInput } from './sample';

/** Evaluations in this process: as typing asks for them, beside the same with every step of the working written down. */
export const engineFigures: readonly Figure[] = [
  {
    name: 'evaluations-in-process',
    unit: '/s without trace',
    besideUnit: '/s with trace',
    aim: null,
    measure: () => {
      const context = sampleContext();
      return sideBySide(
        inTurn((step) => evaluate(sampleInput(step), context, { trace: false })),
        inTurn((step) => evaluate(sampleInput(step), context, { trace: true })),
      );
    },
  },
];
