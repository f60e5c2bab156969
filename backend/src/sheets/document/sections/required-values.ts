import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { heading, paragraph, type Block, type Pairs } from '../blocks';
import type { SheetContent } from '../content';
import { down, near, plain, up, withUnit } from '../words';

const VOLTAGE_BASIS = { 'phase-to-earth': 'phase to earth', 'line-to-line': 'line to line' } as const;

/** Why the count is what it is, in one or two sentences. */
export function governing({ evaluation }: SheetContent): Block[] {
  const answer = evaluation.string;
  if (!answer?.governedBy) return [];
  const criterion = answer.criteria.find((row) => row.criterion === answer.governedBy);
  const names = [answer.governedBy, ...answer.tiedWith.filter((name) => name !== answer.governedBy)].map(
    (name) => CHOICE_LABELS.criterion[name],
  );
  const margin = criterion?.marginPercent;
  const sentences = [
    names.length > 1 ? `${names.join(', ')} need the same and govern.` : `${names[0]} governs.`,
    ...(criterion?.verdict === 'short' ? ['Requirement not met.'] : []),
    ...(margin === null || margin === undefined ? [] : [`Margin ${down(margin, 1)} %.`]),
  ];
  const open = answer.criteria.filter((row) => row.applies && row.state === 'not-assessed');
  if (open.length > 0)
    sentences.push(
      `Not assessed: ${open.map((row) => CHOICE_LABELS.criterion[row.criterion].toLowerCase()).join(', ')}.`,
    );
  return [paragraph(sentences.join(' '), { face: 'semibold', tone: 'glaze', size: 9.5 })];
}

/** What the string must have, and has: each voltage with its basis, both ways of counting creepage. */
export function requiredValues({ evaluation, context, input }: SheetContent): Block[] {
  const answer = evaluation.string;
  const rows: Pairs['rows'] = [];
  const add = (label: string, value: string, note?: string, strong = false): void => {
    rows.push({ label, value, ...(note ? { note } : {}), ...(strong ? { strong } : {}) });
  };
  if (answer) {
    const count = [answer.unitsBeforeExtra, answer.extraUnits];
    const isPost = context.insulator?.kind === 'line-post';
    add(
      isPost ? 'Posts in series' : 'Units in the string',
      near(answer.units),
      count[1] ? `${near(count[0])} and ${near(count[1])} extra` : undefined,
      true,
    );
    add('Creepage needed', withUnit(up(answer.creepageRequiredMm), 'mm'), undefined, true);
    add('Creepage provided', withUnit(down(answer.creepageProvidedMm), 'mm'));
    const basis = answer.creepageVoltageBasis ? VOLTAGE_BASIS[answer.creepageVoltageBasis] : undefined;
    add('Creepage voltage', withUnit(near(answer.creepageVoltageKv, 1), 'kV rms'), basis);
    const unified = (label: string, value: number | null, turn: typeof up): void =>
      add(label, withUnit(turn(value, 1), 'mm/kV'), basis);
    unified('USCD needed', answer.uscdRequiredMmPerKv, up);
    unified('USCD provided', answer.uscdProvidedMmPerKv, down);
    add('SCD of 1986 needed', withUnit(up(answer.scd1986RequiredMmPerKvUm, 1), 'mm/kV'), 'line to line');
    add('SCD of 1986 provided', withUnit(down(answer.scd1986ProvidedMmPerKvUm, 1), 'mm/kV'), 'line to line');
    if (answer.leakageInPerKvLineToGround !== null)
      add('Leakage', withUnit(near(answer.leakageInPerKvLineToGround, 2), 'in/kV'), 'line to ground');
    add('Section length', withUnit(plain(answer.sectionLengthMm), 'mm'));
    add('Dry arc needed', withUnit(up(answer.dryArcRequiredMm), 'mm'));
    add('Dry arc provided', withUnit(down(answer.dryArcMm), 'mm'), devicesWords(input.string?.arcingDevices));
    if (answer.dryArcWithDevicesMm !== null)
      add('Dry arc with devices', withUnit(down(answer.dryArcWithDevicesMm), 'mm'));
    const [least, most] = [answer.stringLengthWithFittingsMinMm, answer.stringLengthWithFittingsMaxMm];
    add(
      'Length with fittings',
      least === null || most === null ? 'not assessed' : `${near(least)} to ${near(most)} mm`,
    );
    add('Mass of a string', withUnit(near(answer.massKg, 1), 'kg'));
    if (answer.massPerSetKg !== null && answer.massPerSetKg !== answer.massKg)
      add('Mass of the set', withUnit(near(answer.massPerSetKg, 1), 'kg'));
  }
  const unit = context.insulator;
  if (unit?.kind === 'line-post') {
    add(
      'Bending strength of a post',
      unit.cantileverStrengthKn == null ? 'not stated' : `${plain(unit.cantileverStrengthKn)} kN`,
      'load at its tip',
    );
    add('Fixing at the tip', unit.coupling ?? 'not stated');
  } else if (unit) {
    add('Failing load of a unit', `${plain(unit.failingLoadKn)} kN`);
    add('Coupling', unit.coupling ?? 'not stated');
  }
  const { phaseToEarthMm = null, phaseToPhaseMm = null } = evaluation.clearances ?? {};
  add('Distance to earth', withUnit(up(phaseToEarthMm), 'mm'), undefined, true);
  add('Between phases', withUnit(up(phaseToPhaseMm), 'mm'), undefined, true);
  return [heading(2, 'Required values'), { kind: 'pairs', rows, labelShare: 0.47 }];
}

function devicesWords(devices: 'none' | 'horns' | 'rings' | null | undefined): string | undefined {
  if (!devices) return undefined;
  return devices === 'none' ? 'no devices' : `without ${devices}`;
}
