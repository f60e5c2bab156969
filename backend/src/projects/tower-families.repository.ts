import { Inject, Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { AnswerOf, contract } from '@bellgap/common/api';
import { KNEX } from '../platform/knex';

export type TowerFamily = AnswerOf<typeof contract.towerFamilies>[number];

@Injectable()
export class TowerFamiliesRepository {
  constructor(@Inject(KNEX) private readonly knex: Knex) {}

  async ofProject(project: { id: string; code: string }): Promise<TowerFamily[]> {
    const rows = (await this.knex('tower_families as t')
      .where('t.project_id', project.id)
      .orderBy('t.code')
      .select(
        't.code',
        't.function',
        't.layout',
        't.phase_spacing_min_m as phaseSpacingM',
        't.vertical_gap_m as verticalGapM',
        't.horizontal_offset_m as horizontalOffsetM',
        't.max_string_mm as maximumStringMm',
        't.max_swing_deg as maximumSwingDeg',
        't.attachment_strength_kn as attachmentKn',
        't.coupling',
      )) as Omit<TowerFamily, 'projectCode'>[];
    return rows.map((row) => ({ ...row, projectCode: project.code }));
  }
}
