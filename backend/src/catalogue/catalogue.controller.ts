import { Controller, Param, Query } from '@nestjs/common';
import { contract } from '@bellgap/common/api';
import { Route } from '../platform/route';
import { CatalogueService } from './catalogue.service';
import type { InsulatorsQuery } from './insulators.repository';

@Controller()
export class CatalogueController {
  constructor(private readonly catalogue: CatalogueService) {}

  @Route(contract.insulators)
  insulators(@Query() query: InsulatorsQuery) {
    return this.catalogue.insulators(query);
  }

  @Route(contract.insulator)
  insulator(@Param('code') code: string) {
    return this.catalogue.insulator(code);
  }

  @Route(contract.conductors)
  conductors() {
    return this.catalogue.conductors();
  }
}
