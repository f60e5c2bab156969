import type { SpecificationInput } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { heading, type Block, type Pairs } from '../blocks';
import type { SheetContent } from '../content';
import { choice, inputWords, plain } from '../words';

type Pair = Pairs['rows'][number];

/** What the sheet holds for: system, site and string as they were entered. */
export function conditions({ input, basis, overrides }: SheetContent): Block[] {
  const marked = new Set(overrides.map(({ path }) => path));
  const rows = [...systemRows(input), ...siteRows(input), ...stringRows(input)].map(({ path, ...row }) =>
    [...marked].some((override) => override === path || path.startsWith(`${override}.`))
      ? { ...row, note: row.note ? `${row.note}; differs from basis` : 'differs from basis' }
      : row,
  );
  const from = basis ? `, basis ${basis.number} rev ${basis.revision}` : '';
  return [heading(2, `Conditions${from}`), { kind: 'pairs', rows, labelShare: 0.47 }];
}

type Placed = Pair & { path: string };

function systemRows({ system }: SpecificationInput): Placed[] {
  const kv = (path: string, label: string, value: number | null | undefined, note: string): Placed => ({
    path,
    label,
    value: inputWords(path, value),
    note,
  });
  const level = system?.insulationLevel;
  return [
    kv('system.nominalVoltageKv', 'Nominal voltage', system?.nominalVoltageKv, 'line to line'),
    kv('system.highestVoltageKv', 'Highest voltage', system?.highestVoltageKv, 'line to line'),
    { path: 'system.frequencyHz', label: 'Frequency', value: inputWords('system.frequencyHz', system?.frequencyHz) },
    {
      path: 'system.neutralEarthing',
      label: 'Neutral',
      value: choice(CHOICE_LABELS.neutralEarthing, system?.neutralEarthing),
    },
    { path: 'system.earthFault', label: 'Earth fault', value: choice(CHOICE_LABELS.earthFault, system?.earthFault) },
    kv('system.insulationLevel.lightningKv', 'Lightning withstand', level?.lightningKv, 'phase to earth'),
    ...(level?.switchingKv == null
      ? []
      : [kv('system.insulationLevel.switchingKv', 'Switching withstand', level.switchingKv, 'phase to earth')]),
    ...(level?.powerFrequencyKv == null
      ? []
      : [kv('system.insulationLevel.powerFrequencyKv', 'Power frequency', level.powerFrequencyKv, 'phase to earth')]),
    ...(level?.levelHoldsToM == null
      ? []
      : [
          {
            path: 'system.insulationLevel.levelHoldsToM',
            label: 'Level holds to',
            value: `${plain(level.levelHoldsToM)} m`,
          },
        ]),
  ];
}

function siteRows({ site }: SpecificationInput): Placed[] {
  const pollution = site?.pollution;
  const rows: Placed[] = [
    { path: 'site.altitudeM', label: 'Altitude', value: inputWords('site.altitudeM', site?.altitudeM) },
  ];
  if (pollution && 'contamination' in pollution) {
    rows.push({
      path: 'site.pollution',
      label: 'Contamination',
      value: choice(CHOICE_LABELS.contamination, pollution.contamination),
    });
  } else {
    rows.push(
      {
        path: 'site.pollution',
        label: 'Pollution class',
        value: choice(CHOICE_LABELS.pollutionClass, pollution?.class),
      },
      { path: 'site.pollution', label: 'Pollution type', value: choice(CHOICE_LABELS.pollutionType, pollution?.type) },
    );
  }
  return [
    ...rows,
    { path: 'site.pollution', label: 'How known', value: choice(CHOICE_LABELS.pollutionBasis, pollution?.basis) },
    { path: 'site.pollution', label: 'Re-check by', value: pollution?.recheckBy ?? 'no date set' },
  ];
}

function stringRows({ string }: SpecificationInput): Placed[] {
  if (!string) return [];
  const angles =
    string.arrangement === 'v-suspension'
      ? [
          {
            path: 'string',
            label: 'Legs from vertical',
            value: `${plain(string.vAngleWindwardDeg)}° and ${plain(string.vAngleLeewardDeg)}°`,
          },
        ]
      : [];
  const post =
    typeof string.postAngleDeg === 'number'
      ? [{ path: 'string', label: 'Post above the horizontal', value: `${plain(string.postAngleDeg)}°` }]
      : [];
  return [
    { path: 'string', label: 'Arrangement', value: choice(CHOICE_LABELS.arrangement, string.arrangement) },
    ...angles,
    ...post,
    {
      path: 'string',
      label: 'Strings in parallel',
      value: inputWords('string.parallelStrings', string.parallelStrings),
    },
    { path: 'string', label: 'Surroundings', value: choice(CHOICE_LABELS.surroundings, string.surroundings) },
    {
      path: 'string',
      label: 'Arcing devices',
      value: choice(CHOICE_LABELS.arcingDevices, string.arcingDevices),
      ...(string.arcGapMm === null || string.arcGapMm === undefined
        ? {}
        : { note: `gap ${plain(string.arcGapMm)} mm` }),
    },
    {
      path: 'string',
      label: 'Length of fittings',
      value: inputWords('string.hardwareLengthMm', string.hardwareLengthMm),
    },
  ];
}
