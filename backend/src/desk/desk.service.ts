import { Injectable } from '@nestjs/common';
import type { AnswerOf, contract } from '@bellgap/common/api';
import type { SignedIn } from '../platform/person';
import { ConcessionsService } from '../register/concessions.service';
import { RegisterService } from '../register/register.service';
import { SpecificationsService } from '../specifications/specifications.service';
import { WaitingService } from '../workflow/waiting.service';

const ENDING_WITHIN_DAYS = 60;

/** What waits for a person. */
@Injectable()
export class DeskService {
  constructor(
    private readonly specifications: SpecificationsService,
    private readonly waiting: WaitingService,
    private readonly register: RegisterService,
    private readonly concessions: ConcessionsService,
  ) {}

  async of(person: SignedIn): Promise<AnswerOf<typeof contract.desk>> {
    const [waiting, returned, drafts, outdated, issued, endingConcessions] = await Promise.all([
      this.waiting.of(person),
      this.waiting.returned(person),
      this.specifications.ownDrafts(person),
      this.specifications.outdatedDrafts(person),
      this.register.ofLate(person),
      this.concessions.ending(person, ENDING_WITHIN_DAYS),
    ]);
    return { waiting, returned, drafts, outdated, issued, endingConcessions };
  }
}
