import { Body, Controller, Param, Req } from '@nestjs/common';
import type { Request } from 'express';
import { contract, type BodyOf } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { IfMatch, Route } from '../platform/route';
import { ApprovalService } from './approval.service';
import { IssueService } from './issue.service';
import { addressOf, type RevisionParams } from './revision-params';
import { WithdrawalsService } from './withdrawals.service';

@Controller()
export class IssueController {
  constructor(
    private readonly approvals: ApprovalService,
    private readonly issues: IssueService,
    private readonly withdrawals: WithdrawalsService,
  ) {}

  @Route(contract.approval)
  approval(@CurrentPerson() person: SignedIn, @Param() params: RevisionParams) {
    return this.approvals.of(person, addressOf(params));
  }

  @Route(contract.issueRevision)
  issue(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @IfMatch() version: number,
    @Body() body: BodyOf<typeof contract.issueRevision>,
    @Req() request: Request,
  ) {
    return this.issues.issue(person, addressOf(params), version, body, request.ip ?? '');
  }

  @Route(contract.withdrawSheet)
  withdraw(
    @CurrentPerson() person: SignedIn,
    @Param('id') id: string,
    @Body() body: BodyOf<typeof contract.withdrawSheet>,
    @Req() request: Request,
  ) {
    return this.withdrawals.withdraw(person, id, body, request.ip ?? '');
  }
}
