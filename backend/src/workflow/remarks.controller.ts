import { Body, Controller, Param } from '@nestjs/common';
import { contract, type BodyOf } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { RemarksService } from './remarks.service';
import { addressOf, type RevisionParams } from './revision-params';

type RemarkParams = RevisionParams & { remarkId: string };

@Controller()
export class RemarksController {
  constructor(private readonly remarks: RemarksService) {}

  @Route(contract.remarks)
  list(@CurrentPerson() person: SignedIn, @Param() params: RevisionParams) {
    return this.remarks.list(person, addressOf(params));
  }

  @Route(contract.raiseRemark)
  raise(
    @CurrentPerson() person: SignedIn,
    @Param() params: RevisionParams,
    @Body() body: BodyOf<typeof contract.raiseRemark>,
  ) {
    return this.remarks.raise(person, addressOf(params), body);
  }

  @Route(contract.answerRemark)
  answer(
    @CurrentPerson() person: SignedIn,
    @Param() params: RemarkParams,
    @Body() { text }: BodyOf<typeof contract.answerRemark>,
  ) {
    return this.remarks.answer(person, addressOf(params), params.remarkId, text);
  }

  @Route(contract.closeRemark)
  close(@CurrentPerson() person: SignedIn, @Param() params: RemarkParams) {
    return this.remarks.close(person, addressOf(params), params.remarkId);
  }
}
