import { Injectable, type OnModuleInit } from '@nestjs/common';
import { SpecificationsService } from '../specifications/specifications.service';
import { TrailVeils } from '../trail/trail.module';

/** Fields of a revision in the trail that tell no figures: inputs, and how it went on. */
const PLAIN =
  /^(input|overrides|title|number|kind|label|state|basisId|basisRevision|contentCode|checkCategory|dueOn)(\.|$)/;

/** Hides from a checker, until he has entered his own, what the trail tells of figures, checks, notes and remarks. */
@Injectable()
export class FiguresVeil implements OnModuleInit {
  constructor(
    private readonly veils: TrailVeils,
    private readonly specifications: SpecificationsService,
  ) {}

  onModuleInit(): void {
    this.veils.add(async (person, records) => {
      const ids = new Set(records.map(({ revisionId }) => revisionId).filter((id) => id !== null));
      const hidden = await this.specifications.hiddenAmong(person, [...ids]);
      return ({ entity, revisionId }, path) =>
        revisionId !== null && hidden.has(revisionId) && !(entity === 'revision' && PLAIN.test(path));
    });
  }
}
