import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { cell, figures, heading, paragraph, type Block, type Row } from '../blocks';
import type { SheetContent } from '../content';
import { near, NOT_STATED, plain, up, withUnit } from '../words';

/** What the supplier must guarantee of a unit and prove of the complete string. */
export function supplierProof({ evaluation, context }: SheetContent): Block[] {
  const answer = evaluation.string;
  const unit = context.insulator;
  if (!answer || !unit) return [];
  const { lightningDryKvPeak, switchingWetKvPeak, powerFrequencyWetKvRms } = answer.testLevels;
  const row = (what: string, value: string, how: string): Row => ({
    cells: [cell(what), figures(value), cell(how, { tone: 'soft' })],
  });
  const post = unit.kind === 'line-post';
  const whole = post ? 'post' : 'string';
  const string = `complete ${whole} with its fittings, referred to standard atmosphere, phase to earth`;
  const rows: Row[] = [
    row('Lightning impulse withstand, dry', withUnit(near(lightningDryKvPeak), 'kV peak'), string),
    ...(switchingWetKvPeak === null
      ? []
      : [row('Switching impulse withstand, wet', withUnit(near(switchingWetKvPeak), 'kV peak'), string)]),
    ...(powerFrequencyWetKvRms === null
      ? []
      : [row('Power-frequency withstand, wet', withUnit(near(powerFrequencyWetKvRms), 'kV rms'), string)]),
    row(
      `Creepage of the ${whole}, at least`,
      withUnit(up(answer.creepageRequiredMm), 'mm'),
      unitsWords(answer.units, unit.creepageIsNominal),
    ),
    row(
      `Dry arc of the ${whole}, at least`,
      withUnit(up(answer.dryArcRequiredMm), 'mm'),
      'with the devices named on page 1',
    ),
    post
      ? row(
          'Bending (cantilever) strength of a post, at least',
          unit.cantileverStrengthKn == null ? NOT_STATED : `${plain(unit.cantileverStrengthKn)} kN`,
          'specified failing load in bending, acting at the tip',
        )
      : row(
          'Failing load of a unit',
          `${plain(unit.failingLoadKn)} kN`,
          'specified mechanical or electromechanical failing load',
        ),
    ...(unit.routineTestLoadKn === null
      ? []
      : [row('Routine test load', `${plain(unit.routineTestLoadKn)} kN`, 'each unit')]),
    row(
      unit.kind === 'cap-and-pin' ? 'Spacing' : post ? 'Length of a post' : 'Length of a unit',
      `${plain(unit.spacingMm)} mm`,
      'tolerance of its standard',
    ),
    row('Diameter', withUnit(plain(unit.diameterMm), unit.diameterMm === null ? '' : 'mm'), 'largest shed or shell'),
    row('Creepage of a unit', `${plain(unit.creepageMm)} mm`, unit.creepageIsNominal ? 'nominal' : 'at least'),
    post
      ? row('Fixing at the tip', unit.coupling ?? 'not stated', 'for the conductor')
      : row('Coupling', unit.coupling ?? 'not stated', 'with locking device'),
  ];
  const { insulatorKind, insulatorProfile } = CHOICE_LABELS;
  return [
    heading(1, 'What the supplier guarantees and proves'),
    paragraph(
      `${unit.code}, ${insulatorKind[unit.kind].toLowerCase()}, ${unit.material ? CHOICE_LABELS.insulatorMaterial[unit.material].toLowerCase() : 'material not stated'}, ` +
        `profile: ${insulatorProfile[unit.profile].toLowerCase()}, catalogue version ${unit.version}.`,
    ),
    {
      kind: 'table',
      summary: 'Values that the supplier guarantees and proves',
      columns: [
        { head: 'what', share: 2.4 },
        { head: 'value', share: 1.4, align: 'right' },
        { head: 'how', share: 3.6 },
      ],
      rows,
    },
  ];
}

function unitsWords(units: number | null, nominal: boolean): string {
  const count = units === null ? 'the string' : `${units} ${units === 1 ? 'unit' : 'units'}`;
  return nominal ? `by ${count}; the catalogue figure is nominal` : `by ${count}`;
}
