import { Body, Controller, Param, Req } from '@nestjs/common';
import type { Request } from 'express';
import { contract, type BodyOf, type Check } from '@bellgap/common/api';
import { SignaturesService } from '../auth/signatures.service';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { IfMatch, Route } from '../platform/route';
import { Versioned } from '../platform/versions';
import { ChecksService } from './checks.service';
import { addressOf, type RevisionParams } from './revision-params';

/** The version is that of the asker's own record; none before it is begun. */
const versioned = (check: Check) => new Versioned(check, check.mine?.lockVersion ?? 0);

@Controller()
export class CheckController {
  constructor(
    private readonly checks: ChecksService,
    private readonly signatures: SignaturesService,
  ) {}

  @Route(contract.check)
  async get(@CurrentPerson() person: SignedIn, @Param() params: RevisionParams) {
    return versioned(await this.checks.get(person, addressOf(params)));
  }

  @Route(contract.enterOwnFigures)
  async enterOwnFigures(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @Body() body: BodyOf<typeof contract.enterOwnFigures>,
  ) {
    return versioned(await this.checks.enterOwnFigures(person, addressOf(params), body));
  }

  @Route(contract.saveCheck)
  async save(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @IfMatch() version: number,
    @Body() body: BodyOf<typeof contract.saveCheck>,
  ) {
    return versioned(await this.checks.save(person, addressOf(params), version, body));
  }

  @Route(contract.decideCheck)
  async decide(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @IfMatch() version: number,
    @Body() { password, ...verdict }: BodyOf<typeof contract.decideCheck>,
    @Req() request: Request,
  ) {
    await this.signatures.confirm(person, password, request.ip ?? '');
    return versioned(await this.checks.decide(person, addressOf(params), version, verdict));
  }
}
