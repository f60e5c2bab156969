import { Body, Controller } from '@nestjs/common';
import { contract, type AnswerOf, type BodyOf } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { IfMatch, Route } from '../platform/route';
import { Versioned } from '../platform/versions';
import { CompanySettingsService } from './company-settings.service';

type Answer = Versioned<AnswerOf<typeof contract.companySettings>>;

@Controller()
export class CompanySettingsController {
  constructor(private readonly settings: CompanySettingsService) {}

  @Route(contract.companySettings)
  async companySettings(): Promise<Answer> {
    const answer = await this.settings.inForce();
    return new Versioned(answer, answer.version);
  }

  @Route(contract.saveCompanySettings)
  async saveCompanySettings(
    @CurrentPerson() person: SignedIn,
    @IfMatch() version: number,
    @Body() body: BodyOf<typeof contract.saveCompanySettings>,
  ): Promise<Answer> {
    const answer = await this.settings.save(person, version, body);
    return new Versioned(answer, answer.version);
  }
}
