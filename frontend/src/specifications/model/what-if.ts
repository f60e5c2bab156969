import type { SpecificationInput, WhatIf } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { formatNumber, type NumberFormat } from '../../ui/figure';

export type WhatIfCase = WhatIf['cases'][number];
export type CaseFigures = WhatIfCase['before'];

export interface ChangedFigure {
  name: keyof CaseFigures;
  label: string;
  before: string;
  after: string;
  changed: boolean;
}

const number =
  (unit: string, format: NumberFormat = {}) =>
  (value: number | null): string =>
    value === null ? 'not known' : `${formatNumber(value, format)}${unit === '' ? '' : `\u00a0${unit}`}`;

const ROWS: { [Name in keyof CaseFigures]: readonly [string, (value: CaseFigures[Name]) => string] } = {
  insulatorCode: ['Unit', (code) => code ?? 'none'],
  units: ['Units', number('')],
  governedBy: ['Governs', (criterion) => (criterion ? CHOICE_LABELS.criterion[criterion] : 'nothing yet')],
  marginPercent: ['Margin', number('%', { decimals: 1, round: 'down' })],
  creepageRequiredMm: ['Creepage needed', number('mm', { round: 'up' })],
  phaseToEarthMm: ['Distance to earth', number('mm', { round: 'up' })],
  worst: ['Gravest caution', (severity) => (severity ? CHOICE_LABELS.severity[severity] : 'none')],
};

function row<Name extends keyof CaseFigures>(name: Name, before: CaseFigures, after: CaseFigures): ChangedFigure {
  const [label, words] = ROWS[name];
  const [was, is] = [words(before[name]), words(after[name])];
  return { name, label, before: was, after: is, changed: was !== is };
}

/** Every key figure before and after, in a fixed order; a figure that reads the same has not changed. */
export function changedFigures(before: CaseFigures, after: CaseFigures): ChangedFigure[] {
  return (Object.keys(ROWS) as (keyof CaseFigures)[]).map((name) => row(name, before, after));
}

/** Altitudes of a sweep, with the site's own among them. */
const ALTITUDES_M = [0, 500, 1000, 1500, 2000, 2500, 3000, 3500, 4000] as const;
const NEAR_M = 1;

export function sweepAltitudes(siteM: number | null): number[] {
  const known = siteM !== null && siteM >= -430 && siteM <= 9000;
  const others = ALTITUDES_M.filter((altitude) => !known || Math.abs(altitude - siteM) >= NEAR_M);
  return [...others, ...(known ? [siteM] : [])].sort((a, b) => a - b);
}

/** The scale of pollution that the basis uses. */
export function sweepClasses({ basis }: SpecificationInput): { value: string; label: string }[] {
  if (basis === null) return [];
  const scale = basis === 'north-american' ? CHOICE_LABELS.contamination : CHOICE_LABELS.pollutionClass;
  return Object.entries(scale).map(([value, label]) => ({ value, label }));
}

export function siteClass({ site }: SpecificationInput): string | null {
  const pollution = site?.pollution;
  if (!pollution) return null;
  return 'contamination' in pollution ? pollution.contamination : pollution.class;
}
