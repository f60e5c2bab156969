import { Injectable } from '@nestjs/common';
import type { AnswerOf, contract } from '@bellgap/common/api';
import type { SignedIn } from '../platform/person';
import { SpecificationsService } from '../specifications/specifications.service';

/** What waits for a person. */
@Injectable()
export class DeskService {
  constructor(private readonly specifications: SpecificationsService) {}

  async of(person: SignedIn): Promise<AnswerOf<typeof contract.desk>> {
    const [drafts, outdated] = await Promise.all([
      this.specifications.ownDrafts(person),
      this.specifications.outdatedDrafts(person),
    ]);
    return { waiting: [], returned: [], drafts, outdated, issued: [], endingConcessions: [] };
  }
}
