import { Injectable } from '@nestjs/common';
import type {
  BodyOf,
  Evaluation,
  EvaluationContext,
  FlashoverRisk,
  FlashoverRiskInput,
  SpecificationInput,
  Sweep,
  WhatIf,
  WorksheetAnswer,
  WorksheetInput,
  contract,
} from '@bellgap/common/api';
import {
  evaluate,
  flashoverRisk,
  inputFaults,
  insulationLevelWorksheet,
  isPollutionClass,
  nextProfileOf,
  sweep,
  whatIf,
} from '@bellgap/common/engine';
import { CatalogueService } from '../catalogue/catalogue.service';
import { invalid } from '../platform/domain-error';
import type { Database } from '../platform/knex';
import { EvaluationContextService } from './evaluation-context.service';

type SweepAsked = Omit<BodyOf<typeof contract.sweep>, 'input'>;

export interface Evaluated {
  context: EvaluationContext;
  evaluation: Evaluation;
}

/** The one place where the product asks the engine. */
@Injectable()
export class EvaluationsService {
  constructor(
    private readonly contexts: EvaluationContextService,
    private readonly catalogue: CatalogueService,
  ) {}

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

  /** The insulation level step by step, with the company's own rows beside the table's. */
  async worksheet(input: WorksheetInput): Promise<WorksheetAnswer> {
    const { settings, confirmations } = await this.contexts.recentRules();
    return insulationLevelWorksheet(input, { companyLevels: settings.insulationLevels, confirmations });
  }

  /** The risk of flashover for a surge and gaps of one's own figures. */
  async flashoverRisk(input: FlashoverRiskInput): Promise<FlashoverRisk> {
    const { confirmations } = await this.contexts.recentRules();
    return flashoverRisk(input, confirmations);
  }

  /** Units by altitude and class, all from one look at the catalogue and the company's rules. */
  async sweep(input: SpecificationInput, { altitudesM, classes }: SweepAsked): Promise<Sweep> {
    const iec = input.basis === 'north-american' ? false : input.basis === 'iec' ? true : isPollutionClass(classes[0]!);
    const wrong = classes.findIndex((one) => isPollutionClass(one) !== iec);
    if (wrong >= 0) {
      const message = iec
        ? 'Classes: on this basis a class letter, a to e; levels are never converted'
        : 'Classes: on this basis a contamination level; class letters are never converted';
      throw invalid([{ path: `classes[${wrong}]`, message }]);
    }
    const context = await this.contexts.recent(input);
    refuseFaults(input, context, 'input');
    return { cells: sweep(input, context, { altitudesM, classes }) };
  }

  /** A few other cases beside the input as it is. */
  async whatIf(input: SpecificationInput, otherCode: string | null): Promise<WhatIf> {
    const context = await this.contexts.recent(input);
    refuseFaults(input, context, 'input');
    const { insulator } = context;
    const [candidates, other] = await Promise.all([
      insulator ? this.catalogue.unitsLike(insulator) : [],
      otherCode ? this.catalogue.findInsulator(otherCode) : null,
    ]);
    const nextProfile = insulator && nextProfileOf(insulator, candidates);
    return { cases: whatIf(input, context, { nextProfile, other, otherCode: otherCode || null }) };
  }
}

function answer(input: SpecificationInput, context: EvaluationContext, trace: boolean, at: string): Evaluation {
  refuseFaults(input, context, at);
  return evaluate(input, context, { trace });
}

function refuseFaults(input: SpecificationInput, context: EvaluationContext, at: string): void {
  const faults = inputFaults(input, context);
  if (faults.length > 0) throw invalid(faults.map(({ path, message }) => ({ path: `${at}.${path}`, message })));
}
