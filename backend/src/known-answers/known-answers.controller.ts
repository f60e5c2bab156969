import { Controller } from '@nestjs/common';
import { contract } from '@bellgap/common/api';
import { Route } from '../platform/route';
import { KnownAnswersService } from './known-answers.service';

@Controller()
export class KnownAnswersController {
  constructor(private readonly knownAnswers: KnownAnswersService) {}

  @Route(contract.runKnownAnswers)
  run() {
    return this.knownAnswers.run();
  }
}
