import { Body, Controller, Header, Param, Query, StreamableFile } from '@nestjs/common';
import { contract, type BodyOf, type QueryOf } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { trailFile } from './trail-file';
import { TrailVerificationsService } from './trail-verifications.service';
import { TrailService } from './trail.service';

@Controller()
export class TrailController {
  constructor(
    private readonly trail: TrailService,
    private readonly verifications: TrailVerificationsService,
  ) {}

  @Route(contract.trail)
  list(@CurrentPerson() person: SignedIn, @Query() query: QueryOf<typeof contract.trail>) {
    return this.trail.list(person, query);
  }

  @Route(contract.trailFile)
  @Header('X-Content-Type-Options', 'nosniff')
  async file(@CurrentPerson() person: SignedIn, @Query() query: QueryOf<typeof contract.trailFile>) {
    return new StreamableFile(trailFile(await this.trail.everything(person, query)), {
      type: contract.trailFile.file,
      disposition: 'attachment; filename="trail.csv"',
    });
  }

  @Route(contract.specificationTrail)
  ofSpecification(
    @CurrentPerson() person: SignedIn,
    @Param() { code, number }: { code: string; number: string },
    @Query() query: QueryOf<typeof contract.specificationTrail>,
  ) {
    return this.trail.ofSpecification(person, code, number, query);
  }

  @Route(contract.verifyTrail)
  verify(@CurrentPerson() person: SignedIn, @Body() { knownSeal }: BodyOf<typeof contract.verifyTrail>) {
    return this.verifications.verify(person, knownSeal ?? null);
  }
}
