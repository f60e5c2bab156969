/** One figure of the benchmark: what is measured, beside what, and what is aimed at. */
export interface Figure {
  name: string;
  unit: string;
  /** Both sides are measured in the same run, one after the other. */
  measure: () => Promise<{ value: number; beside: number | null }>;
  besideUnit?: string;
  /** What the ratio value/beside, or the value itself where nothing stands beside it, should reach or keep under. */
  aim: { ratioAtLeast?: number; ratioAtMost?: number; valueAtMost?: number; valueAtLeast?: number } | null;
}

function figureText(value: number): string {
  return value >= 100 ? value.toFixed(0) : value.toPrecision(3);
}

function aimText(aim: Figure['aim']): string {
  if (!aim) return '-';
  if (aim.ratioAtLeast !== undefined) return `ratio >= ${aim.ratioAtLeast.toFixed(2)}`;
  if (aim.ratioAtMost !== undefined) return `ratio <= ${aim.ratioAtMost.toFixed(2)}`;
  if (aim.valueAtMost !== undefined) return `<= ${aim.valueAtMost}`;
  return `>= ${aim.valueAtLeast}`;
}

function reached(aim: NonNullable<Figure['aim']>, value: number, ratio: number | null): boolean {
  if (aim.ratioAtLeast !== undefined) return ratio !== null && ratio >= aim.ratioAtLeast;
  if (aim.ratioAtMost !== undefined) return ratio !== null && ratio <= aim.ratioAtMost;
  if (aim.valueAtMost !== undefined) return value <= aim.valueAtMost;
  return aim.valueAtLeast === undefined || value >= aim.valueAtLeast;
}

/** Measures the figures in order (or the one that ONLY names) and prints a line each, then the tally. */
export async function report(figures: Figure[]): Promise<void> {
  const only = process.env.ONLY;
  const chosen = only ? figures.filter((f) => f.name === only) : figures;
  if (only && chosen.length === 0) {
    console.error(`No figure is called ${only}; there are: ${figures.map((f) => f.name).join(', ')}`);
    process.exitCode = 1;
    return;
  }
  let met = 0;
  let short = 0;
  for (const { name, unit, besideUnit, aim, measure } of chosen) {
    const { value, beside } = await measure();
    const ratio = beside === null ? null : value / beside;
    const verdict = aim === null ? '-' : reached(aim, value, ratio) ? 'met' : 'short';
    if (verdict === 'met') met += 1;
    if (verdict === 'short') short += 1;
    const besideText = beside === null ? '-' : `${figureText(beside)} ${besideUnit ?? unit}`;
    console.log(
      [
        name,
        `${figureText(value)} ${unit}`,
        besideText,
        ratio === null ? '-' : ratio.toFixed(2),
        aimText(aim),
        verdict,
      ].join(' | '),
    );
  }
  console.log(`${met} met, ${short} short`);
}

/** Runs of `work` per second: warmed up, then for about `seconds`. */
export async function perSecond(work: () => unknown, seconds = 2): Promise<number> {
  const warmUntil = performance.now() + seconds * 250;
  while (performance.now() < warmUntil) await work();
  const start = performance.now();
  let runs = 0;
  while (performance.now() - start < seconds * 1000) {
    await work();
    runs += 1;
  }
  return (runs * 1000) / (performance.now() - start);
}

/** The same for work that is synchronous, without an await between runs. */
export function perSecondSync(work: () => unknown, seconds = 2): number {
  const warmUntil = performance.now() + seconds * 250;
  while (performance.now() < warmUntil) work();
  const start = performance.now();
  let runs = 0;
  while (performance.now() - start < seconds * 1000) {
    work();
    runs += 1;
  }
  return (runs * 1000) / (performance.now() - start);
}
