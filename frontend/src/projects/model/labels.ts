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
