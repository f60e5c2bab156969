import { Controller } from '@nestjs/common';
import { contract } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { DeskService } from './desk.service';

@Controller()
export class DeskController {
  constructor(private readonly desk: DeskService) {}

  @Route(contract.desk)
  mine(@CurrentPerson() person: SignedIn) {
    return this.desk.of(person);
  }
}
