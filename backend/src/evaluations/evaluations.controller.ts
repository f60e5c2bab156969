import { Body, Controller } from '@nestjs/common';
import type { BodyOf, FlashoverRiskInput, SpecificationInput, WorksheetInput } from '@bellgap/common/api';
import { contract } from '@bellgap/common/api';
import { Route } from '../platform/route';
import { EvaluationsService } from './evaluations.service';

@Controller()
export class EvaluationsController {
  constructor(private readonly evaluations: EvaluationsService) {}

  @Route(contract.evaluate)
  evaluate(@Body() { input, trace = true }: BodyOf<typeof contract.evaluate>) {
    return this.evaluations.evaluate(input as SpecificationInput, { trace });
  }

  @Route(contract.evaluateBatch)
  evaluateBatch(@Body() { inputs, trace = true }: BodyOf<typeof contract.evaluateBatch>) {
    return this.evaluations.evaluateAll(inputs as SpecificationInput[], { trace });
  }

  @Route(contract.insulationLevelWorksheet)
  worksheet(@Body() body: BodyOf<typeof contract.insulationLevelWorksheet>) {
    return this.evaluations.worksheet(body as WorksheetInput);
  }

  @Route(contract.flashoverRisk)
  flashoverRisk(@Body() body: BodyOf<typeof contract.flashoverRisk>) {
    return this.evaluations.flashoverRisk(body as FlashoverRiskInput);
  }

  @Route(contract.sweep)
  sweep(@Body() { input, ...asked }: BodyOf<typeof contract.sweep>) {
    return this.evaluations.sweep(input as SpecificationInput, asked);
  }

  @Route(contract.whatIf)
  whatIf(@Body() { input, otherCode }: BodyOf<typeof contract.whatIf>) {
    return this.evaluations.whatIf(input as SpecificationInput, otherCode);
  }
}
