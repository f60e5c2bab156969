import { Body, Controller, Param } from '@nestjs/common';
import { contract, type BodyOf, type Revision } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { IfMatch, Route } from '../platform/route';
import { Versioned } from '../platform/versions';
import { PresencesService } from './presences.service';
import { ReturnsService } from './returns.service';
import { addressOf, type RevisionParams } from './revision-params';
import { SubmissionsService } from './submissions.service';

const versioned = (revision: Revision) => new Versioned(revision, revision.lockVersion);

@Controller()
export class MovesController {
  constructor(
    private readonly submissions: SubmissionsService,
    private readonly returns: ReturnsService,
    private readonly presences: PresencesService,
  ) {}

  @Route(contract.startRevision)
  async start(@CurrentPerson() person: SignedIn, @Param() { code, number }: RevisionParams) {
    return versioned(await this.submissions.startNext(person, code, number));
  }

  @Route(contract.submitRevision)
  async submit(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @IfMatch() version: number,
    @Body() body: BodyOf<typeof contract.submitRevision>,
  ) {
    return versioned(await this.submissions.submit(person, addressOf(params), version, body));
  }

  @Route(contract.recallRevision)
  async recall(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @IfMatch() version: number,
    @Body() { reason }: BodyOf<typeof contract.recallRevision>,
  ) {
    return versioned(await this.returns.recall(person, addressOf(params), version, reason));
  }

  @Route(contract.refuseRevision)
  async refuse(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @IfMatch() version: number,
    @Body() { reason }: BodyOf<typeof contract.refuseRevision>,
  ) {
    return versioned(await this.returns.refuse(person, addressOf(params), version, reason));
  }

  @Route(contract.presence)
  presence(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @Body() { editing }: BodyOf<typeof contract.presence>,
  ) {
    return this.presences.seen(person, addressOf(params), editing);
  }
}
