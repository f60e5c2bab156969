import { isDeepStrictEqual } from 'node:util';
import { Inject, Injectable, type OnApplicationBootstrap } from '@nestjs/common';
import type { CatalogueUnit } from '@bellgap/common/api';
import { notFound } from '../platform/domain-error';
import { KNEX, type Database } from '../platform/knex';
import type { Page } from '../platform/list';
import { ConductorsRepository, type Conductor } from './conductors.repository';
import { InsulatorsRepository, type InsulatorsQuery } from './insulators.repository';
import { standardUnits } from './standard-units';

/** Units and conductors; a change of one is a new version, and what was specified with the old one keeps it. */
@Injectable()
export class CatalogueService implements OnApplicationBootstrap {
  constructor(
    @Inject(KNEX) private readonly knex: Database,
    private readonly units: InsulatorsRepository,
    private readonly conductorsRepository: ConductorsRepository,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    await this.addStandardUnits();
  }

  insulators(asked: InsulatorsQuery): Promise<Page<CatalogueUnit>> {
    return this.units.list(asked);
  }

  async insulator(code: string): Promise<CatalogueUnit> {
    const unit = await this.units.newestOf(code);
    if (!unit) throw notFound('insulator unit');
    return unit;
  }

  /** The unit of an input: null where the code names none, which the engine then reports. */
  findInsulator(code: string, db?: Database): Promise<CatalogueUnit | null> {
    return this.units.newestOf(code, db);
  }

  /** Units of the same family, kind and strength in their newest versions, the unit itself among them. */
  unitsLike(unit: CatalogueUnit): Promise<CatalogueUnit[]> {
    return this.units.newestLike(unit);
  }

  conductors(): Promise<Conductor[]> {
    return this.conductorsRepository.newest();
  }

  /** The classes of the standards stand in the engine's tables; where a table has changed, a new version is added. */
  async addStandardUnits(): Promise<void> {
    await this.knex.transaction(async (transaction) => {
      const held = await this.units.newestOfFamilies(['iec-60305', 'ansi-c29.2'], transaction);
      const byCode = new Map(held.map((unit) => [unit.code, unit]));
      const changed = standardUnits().flatMap((unit) => {
        const known = byCode.get(unit.code);
        if (!known) return [unit];
        const { version, withdrawn } = known;
        const same = isDeepStrictEqual({ ...unit, version, withdrawn }, known);
        return same ? [] : [{ ...unit, version: version + 1 }];
      });
      await this.units.add(changed, transaction);
    });
  }
}
