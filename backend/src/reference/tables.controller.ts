import { Body, Controller, Param, Query } from '@nestjs/common';
import type { BodyOf, QueryOf } from '@bellgap/common/api';
import { contract } from '@bellgap/common/api';
import { CurrentPerson, type SignedIn } from '../platform/person';
import { Route } from '../platform/route';
import { TablesService } from './tables.service';

@Controller()
export class TablesController {
  constructor(private readonly tables: TablesService) {}

  @Route(contract.tables)
  list() {
    return this.tables.list();
  }

  @Route(contract.table)
  get(@Param('key') key: string) {
    return this.tables.get(key);
  }

  @Route(contract.sourceDifferences)
  sourceDifferences() {
    return this.tables.sourceDifferences();
  }

  @Route(contract.altitudeConventions)
  altitudeConventions(@Query() { altitudeM }: QueryOf<typeof contract.altitudeConventions>) {
    return this.tables.altitudeConventions(Number(altitudeM));
  }

  @Route(contract.tableConfirmations)
  confirmations() {
    return this.tables.confirmations();
  }

  @Route(contract.confirmTable)
  confirm(@CurrentPerson() person: SignedIn, @Body() body: BodyOf<typeof contract.confirmTable>) {
    return this.tables.confirm(person, body);
  }
}
