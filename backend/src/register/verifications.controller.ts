import { Controller, Param, Req } from '@nestjs/common';
import type { Request } from 'express';
import { contract } from '@bellgap/common/api';
import { Route } from '../platform/route';
import { VerificationsService } from './verifications.service';

@Controller()
export class VerificationsController {
  constructor(private readonly verifications: VerificationsService) {}

  @Route(contract.verification)
  lookUp(@Param('verificationCode') code: string, @Req() request: Request) {
    return this.verifications.lookUp(code, request.ip ?? '');
  }
}
