import type { DesignBasis } from '@bellgap/common/api';
import { CHOICE_LABELS, fieldOf, type FieldPath } from '@bellgap/common/schemas';
import { worksheetRows } from './worksheet-groups';

export interface BasisRow {
  label: string;
  text: string | null;
}

function valueAt(holder: unknown, path: string): unknown {
  return path
    .split('.')
    .reduce<unknown>((part, key) => (part as Record<string, unknown> | null | undefined)?.[key], holder);
}

const MEASURES: FieldPath[] = [
  'system.nominalVoltageKv',
  'system.highestVoltageKv',
  'system.frequencyHz',
  'system.insulationLevel.lightningKv',
  'system.insulationLevel.switchingKv',
  'system.insulationLevel.switchingPhaseRatio',
  'system.insulationLevel.powerFrequencyKv',
  'system.insulationLevel.levelHoldsToM',
  'system.overvoltages.slowFrontPhaseToEarthKvPeak',
  'system.overvoltages.slowFrontPhaseToPhaseKvPeak',
  'system.overvoltages.earthFaultFactor',
  'system.faultCurrentKa',
  'system.faultDurationS',
];

function choiceRow(basis: DesignBasis, path: FieldPath, labels: Record<string, string>): BasisRow {
  const value = valueAt(basis, path);
  return { label: fieldOf(path)?.label ?? path, text: typeof value === 'string' ? (labels[value] ?? value) : null };
}

function measureRow(basis: DesignBasis, path: FieldPath): BasisRow {
  const field = fieldOf(path);
  const value = valueAt(basis, path);
  const label = [field?.label ?? path, field?.basis].filter(Boolean).join(', ');
  return { label, text: typeof value === 'number' ? [String(value), field?.unit].filter(Boolean).join(' ') : null };
}

const countRow = (label: string, value: number | null): BasisRow => ({
  label,
  text: value === null ? null : String(value),
});

/** A design basis as named values, in the order in which it is read. */
export function basisRows(basis: DesignBasis): BasisRow[] {
  return [
    choiceRow(basis, 'basis', CHOICE_LABELS.basis),
    ...MEASURES.slice(0, 3).map((path) => measureRow(basis, path)),
    choiceRow(basis, 'system.neutralEarthing', CHOICE_LABELS.neutralEarthing),
    choiceRow(basis, 'system.earthFault', CHOICE_LABELS.earthFault),
    ...MEASURES.slice(3).map((path) => measureRow(basis, path)),
    countRow('Units out for live work', basis.rules.unitsOutForLiveWork),
    countRow('Most kinds of string', basis.rules.maximumStringKinds),
  ];
}

interface BasisChange {
  label: string;
  from: string;
  to: string;
}

function changesOf(earlier: readonly BasisRow[], later: readonly BasisRow[]): BasisChange[] {
  return later.flatMap(({ label, text }, row) => {
    const from = earlier[row]?.text ?? null;
    return from === text ? [] : [{ label, from: from ?? 'not set', to: text ?? 'not set' }];
  });
}

function worksheetChanges(before: DesignBasis['worksheet'], after: DesignBasis['worksheet']): BasisChange[] {
  if (!before && !after) return [];
  if (before && after) {
    const rowsOf = (worksheet: typeof before) =>
      worksheetRows(worksheet).flatMap(({ title, rows }) =>
        rows.map(({ label, text }) => ({ label: `Worksheet, ${title.toLowerCase()}: ${label.toLowerCase()}`, text })),
      );
    return changesOf(rowsOf(before), rowsOf(after));
  }
  const words = (worksheet: DesignBasis['worksheet']) => (worksheet ? 'kept' : 'none');
  return [{ label: 'Insulation level worksheet', from: words(before), to: words(after) }];
}

/** What a revision changed over the one before it. */
export function basisChanges(before: DesignBasis, after: DesignBasis): BasisChange[] {
  return [...changesOf(basisRows(before), basisRows(after)), ...worksheetChanges(before.worksheet, after.worksheet)];
}
