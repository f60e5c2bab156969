import { Body, Controller, Param, Req } from '@nestjs/common';
import type { Request } from 'express';
import { contract, type BodyOf } from '@bellgap/common/api';
import { notFound } from '../platform/domain-error';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { BasisMovesService } from './basis-moves.service';

@Controller()
export class BasisMovesController {
  constructor(private readonly moves: BasisMovesService) {}

  @Route(contract.moveBasis)
  move(
    @CurrentPerson() person: SignedIn,
    @Param() { code, revision }: { code: string; revision: string },
    @Body() body: BodyOf<typeof contract.moveBasis>,
    @Req() request: Request,
  ) {
    if (!/^\d{1,6}$/.test(revision)) throw notFound('revision of the design basis');
    return this.moves.move(person, { code, revision: Number(revision) }, body, request.ip ?? '');
  }
}
