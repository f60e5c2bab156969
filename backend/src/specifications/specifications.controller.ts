import { Body, Controller, Param, Query } from '@nestjs/common';
import type { BodyOf, QueryOf, Revision, SpecificationInput } from '@bellgap/common/api';
import { contract } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { IfMatch, Route } from '../platform/route';
import { Versioned } from '../platform/versions';
import { SpecificationsService } from './specifications.service';

interface RevisionParams {
  code: string;
  number: string;
  label: string;
}

const addressOf = ({ code, number, label }: RevisionParams) => ({ projectCode: code, number, label });
const versioned = (revision: Revision) => new Versioned(revision, revision.lockVersion);

@Controller()
export class SpecificationsController {
  constructor(private readonly specifications: SpecificationsService) {}

  @Route(contract.specifications)
  list(
    @CurrentPerson() person: SignedIn,
    @Param('code') code: string,
    @Query() query: QueryOf<typeof contract.specifications>,
  ) {
    return this.specifications.list(person, code, query);
  }

  @Route(contract.createSpecification)
  async create(
    @CurrentPerson() person: SignedIn,
    @Param('code') code: string,
    @Body() body: BodyOf<typeof contract.createSpecification>,
  ) {
    return versioned(await this.specifications.create(person, code, body));
  }

  @Route(contract.revision)
  async get(@CurrentPerson() person: SignedIn, @Param() params: RevisionParams) {
    return versioned(await this.specifications.get(person, addressOf(params)));
  }

  @Route(contract.saveRevision)
  async save(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @IfMatch() version: number,
    @Body() { input, ...body }: BodyOf<typeof contract.saveRevision>,
  ) {
    const draft = { ...body, input: input as SpecificationInput };
    return versioned(await this.specifications.save(person, addressOf(params), version, draft));
  }

  @Route(contract.takeBasis)
  async takeBasis(@CurrentPerson() person: SignedIn, @Param() params: RevisionParams, @IfMatch() version: number) {
    return versioned(await this.specifications.takeBasis(person, addressOf(params), version));
  }
}
