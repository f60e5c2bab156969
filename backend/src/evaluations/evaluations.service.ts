import { Injectable } from '@nestjs/common';
import type { Evaluation, EvaluationContext, SpecificationInput } from '@bellgap/common/api';
import { evaluate, inputFaults } from '@bellgap/common/engine';
import { invalid } from '../platform/domain-error';
import type { Database } from '../platform/knex';
import { EvaluationContextService } from './evaluation-context.service';

export interface Evaluated {
  context: EvaluationContext;
  evaluation: Evaluation;
}

/** The one place where the product asks the engine. */
@Injectable()
export class EvaluationsService {
  constructor(private readonly contexts: EvaluationContextService) {}

  /** Evaluates and stores nothing; `at` is where the input stands in the body, for the paths of faults. */
  async evaluate(
    input: SpecificationInput,
    { trace, at = 'input' }: { trace: boolean; at?: string },
  ): Promise<Evaluation> {
    return answer(input, await this.contexts.recent(input), trace, at);
  }

  async evaluateAll(inputs: readonly SpecificationInput[], { trace }: { trace: boolean }): Promise<Evaluation[]> {
    const evaluations: Evaluation[] = [];
    for (const [i, input] of inputs.entries()) {
      evaluations.push(await this.evaluate(input, { trace, at: `inputs[${i}]` }));
    }
    return evaluations;
  }

  /** Evaluates what a transaction is about to store, with what it was evaluated from. */
  async evaluateForStore(input: SpecificationInput, db: Database): Promise<Evaluated> {
    const context = await this.contexts.now(input, db);
    return { context, evaluation: answer(input, context, true, 'input') };
  }
}

function answer(input: SpecificationInput, context: EvaluationContext, trace: boolean, at: string): Evaluation {
  const faults = inputFaults(input, context);
  if (faults.length > 0) throw invalid(faults.map(({ path, message }) => ({ path: `${at}.${path}`, message })));
  return evaluate(input, context, { trace });
}
