import type { TraceLine } from '@bellgap/common/api';
import { WORKSHEET_CHOICES, WORKSHEET_WORDS } from '@bellgap/common/schemas';

export interface WorksheetStep {
  line: TraceLine;
  /** What the step is for: "external insulation, to earth". */
  of: string;
}

export interface WorksheetStage {
  title: string;
  steps: WorksheetStep[];
}

const TARGETS: Record<string, string> = {
  'power-frequency': 'to power frequency',
  lightning: 'to lightning',
  switching: 'to switching',
};
const WORDS: Record<string, string> = { ...WORKSHEET_WORDS.insulation, ...WORKSHEET_WORDS.distance, ...TARGETS };

/** A line is named `formula:stress:insulation:place:distance`, with what it needs of these. */
function stageOf(line: TraceLine): string {
  const [formula = '', ...parts] = line.id.split(':');
  const has = (stress: string) => parts.includes(stress) || formula.startsWith(`worksheet.${stress}`);
  if (has('temporary')) return WORKSHEET_WORDS.stress.temporary;
  if (has('slow-front')) {
    const place = parts.find((part): part is keyof typeof WORKSHEET_CHOICES.place => part in WORKSHEET_CHOICES.place);
    const where = place ? `, ${WORKSHEET_CHOICES.place[place].toLowerCase()}` : '';
    return WORKSHEET_WORDS.stress['slow-front'] + where;
  }
  if (has('fast-front') || formula === 'worksheet.outage-length') return WORKSHEET_WORDS.stress['fast-front'];
  return formula === 'worksheet.one-per-unit' ? 'Voltage' : 'Level';
}

/** The steps in the order of the calculation, those of one stress and place together. */
export function worksheetStages(trace: readonly TraceLine[]): WorksheetStage[] {
  const stages = new Map<string, WorksheetStep[]>();
  for (const line of trace) {
    const title = stageOf(line);
    const of = line.id
      .split(':')
      .slice(1)
      .flatMap((part) => WORDS[part] ?? [])
      .join(', ');
    stages.set(title, [...(stages.get(title) ?? []), { line, of }]);
  }
  return [...stages].map(([title, steps]) => ({ title, steps }));
}
