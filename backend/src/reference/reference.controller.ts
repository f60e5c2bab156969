import { Controller, Query } from '@nestjs/common';
import type { QueryOf } from '@bellgap/common/api';
import { contract } from '@bellgap/common/api';
import { Route } from '../platform/route';
import { ReferenceService } from './reference.service';

@Controller()
export class ReferenceController {
  constructor(private readonly reference: ReferenceService) {}

  @Route(contract.insulationLevels)
  insulationLevels(@Query() { basis }: QueryOf<typeof contract.insulationLevels>) {
    return this.reference.insulationLevels(basis);
  }
}
