import { evaluate } from '@bellgap/common/engine';
import { contextOfBench } from './context';
import { perSecondSync, type Figure } from './harness';
import { sampleInput } from './sample';

/** Evaluations in process, no trace, beside the bare cost of reading the input and writing the answer as JSON. */
export const engineFigures: Figure[] = [
  {
    name: 'evaluations-in-process',
    unit: '/s without trace',
    besideUnit: '/s with trace',
    aim: null,
    measure: () => {
      const context = contextOfBench();
      let step = 0;
      const value = perSecondSync(() => evaluate(sampleInput(step++), context, { trace: false }));
      const beside = perSecondSync(() => evaluate(sampleInput(step++), context, { trace: true }));
      return Promise.resolve({ value, beside });
    },
  },
];
