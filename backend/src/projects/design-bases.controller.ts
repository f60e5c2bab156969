import { Body, Controller, Param } from '@nestjs/common';
import { contract, type AnswerOf, type BodyOf, type StandingBasis } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { IfMatch, Route } from '../platform/route';
import { Versioned } from '../platform/versions';
import { DesignBasesService } from './design-bases.service';

/** A project without a basis stands at version 0. */
@Controller()
export class DesignBasesController {
  constructor(private readonly bases: DesignBasesService) {}

  @Route(contract.designBasis)
  async designBasis(
    @CurrentPerson() person: SignedIn,
    @Param('code') code: string,
  ): Promise<Versioned<AnswerOf<typeof contract.designBasis>>> {
    const history = await this.bases.history(person, code);
    return new Versioned(history, history.current?.revision ?? 0);
  }

  @Route(contract.saveDesignBasis)
  async saveDesignBasis(
    @CurrentPerson() person: SignedIn,
    @Param('code') code: string,
    @IfMatch() version: number,
    @Body() body: BodyOf<typeof contract.saveDesignBasis>,
  ): Promise<Versioned<StandingBasis>> {
    const basis = await this.bases.save(person, code, version, body);
    return new Versioned(basis, basis.revision);
  }
}
