/** One figure of the benchmark: what is measured, beside what, and what is aimed at. */
export interface Figure {
  name: string;
  unit: string;
  measure: () => Promise<{ value: number; beside: number | null }>;
  besideUnit?: string;
  /** What the ratio value/beside, or the value itself where nothing stands beside it, should reach or keep under. */
  aim: { ratioAtLeast: number } | { ratioAtMost: number } | { valueAtMost: number } | null;
}

function figureText(value: number): string {
  return value >= 100 ? value.toFixed(0) : value.toPrecision(3);
}

function aimText(aim: Figure['aim'], unit: string): string {
  if (!aim) return '-';
  if ('ratioAtLeast' in aim) return `ratio >= ${aim.ratioAtLeast.toFixed(2)}`;
  if ('ratioAtMost' in aim) return `ratio <= ${aim.ratioAtMost.toFixed(2)}`;
  return `<= ${aim.valueAtMost} ${unit}`;
}

function isMet(aim: NonNullable<Figure['aim']>, value: number, ratio: number | null): boolean {
  if ('ratioAtLeast' in aim) return ratio !== null && ratio >= aim.ratioAtLeast;
  if ('ratioAtMost' in aim) return ratio !== null && ratio <= aim.ratioAtMost;
  return value <= aim.valueAtMost;
}

type Verdict = 'met' | 'short' | '-';

async function measured({ name, unit, besideUnit, aim, measure }: Figure): Promise<Verdict> {
  const { value, beside } = await measure();
  const ratio = beside === null ? null : value / beside;
  const verdict = aim === null ? '-' : isMet(aim, value, ratio) ? 'met' : 'short';
  const cells = [
    name,
    `${figureText(value)} ${unit}`,
    beside === null ? '-' : `${figureText(beside)} ${besideUnit ?? unit}`,
    ratio === null ? '-' : ratio.toFixed(2),
    aimText(aim, unit),
    verdict,
  ];
  console.log(cells.join(' | '));
  return verdict;
}

/** Measures the figures in order, or the one named, and prints a line each, then the tally. */
export async function report(figures: readonly Figure[], only: string | undefined): Promise<void> {
  const chosen = only ? figures.filter(({ name }) => name === only) : figures;
  if (chosen.length === 0) {
    throw new Error(`No figure is called ${only}; there are: ${figures.map(({ name }) => name).join(', ')}`);
  }
  const verdicts: Verdict[] = [];
  for (const figure of chosen) {
    try {
      verdicts.push(await measured(figure));
    } catch (error) {
      console.error(error);
      console.log(`${figure.name} | not measured | - | - | ${aimText(figure.aim, figure.unit)} | short`);
      verdicts.push('short');
      process.exitCode = 1;
    }
  }
  const count = (verdict: Verdict) => verdicts.filter((one) => one === verdict).length;
  console.log(`${count('met')} met, ${count('short')} short`);
}
