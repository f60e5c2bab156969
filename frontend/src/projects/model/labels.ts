import type { Project } from '@bellgap/common/api';
import { PAPERS, PROJECT_KINDS } from '@bellgap/common/schemas';

export const PROJECT_KIND_LABELS: Record<(typeof PROJECT_KINDS)[number], string> = { line: 'Line', yard: 'Yard' };

export const KIND_CHOICES = PROJECT_KINDS.map((value) => ({ value, label: PROJECT_KIND_LABELS[value] }));
export const PAPER_CHOICES = PAPERS.map((value) => ({ value, label: value }));

export function voltageText(project: Pick<Project, 'nominalVoltageKv' | 'highestVoltageKv'>): string | null {
  const { nominalVoltageKv, highestVoltageKv } = project;
  if (nominalVoltageKv === null) return null;
  return highestVoltageKv === null ? `${nominalVoltageKv} kV` : `${nominalVoltageKv}/${highestVoltageKv} kV`;
}

/** Zones for choosing from: full hours by offset, which need no list of places, then the names that the browser knows. */
export function timeZoneChoices(): { value: string; label: string }[] {
  const offsets = Array.from({ length: 27 }, (_, step) => {
    const hours = step - 12;
    const value = `${hours < 0 ? '-' : '+'}${String(Math.abs(hours)).padStart(2, '0')}:00`;
    return { value, label: `UTC${value}` };
  });
  return [
    ...offsets,
    ...Intl.supportedValuesOf('timeZone').map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') })),
  ];
}

/** A zone as people write it: its offset from UTC, and its name where that says more. */
export function zoneText(zone: string): string {
  const parts = new Intl.DateTimeFormat('en-GB', { timeZone: zone, timeZoneName: 'longOffset' }).formatToParts();
  const offset = (parts.find(({ type }) => type === 'timeZoneName')?.value ?? zone).replace('GMT', 'UTC');
  return zone.startsWith('Etc/') || !zone.includes('/') ? offset : `${offset}, ${zone.replaceAll('_', ' ')}`;
}
