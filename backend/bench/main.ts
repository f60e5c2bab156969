import { availableParallelism, loadavg } from 'node:os';
import { engineFigures } from './engine.bench';
import { report } from './harness';
import { httpFigures } from './http.bench';
import { pageFigures } from './page.bench';
import { stopProduct } from './product';
import { registerFigures } from './register.bench';
import { sheetFigures } from './sheet.bench';
import { startFigures } from './start.bench';
import { trailFigures } from './trail.bench';
import { typingFigures } from './typing.bench';

const FIGURES = [
  ...engineFigures,
  ...httpFigures,
  ...typingFigures,
  ...sheetFigures,
  ...pageFigures,
  ...startFigures,
  ...trailFigures,
  ...registerFigures,
] as const;

function sayWhatElseRuns(): void {
  const [load = 0] = loadavg();
  const cores = availableParallelism();
  if (load > cores / 2)
    console.error(
      `The machine is at work already: load ${load.toFixed(1)} on ${cores} cores. Times will be long, and ratios say little.`,
    );
}

async function main(): Promise<void> {
  sayWhatElseRuns();
  try {
    await report(FIGURES, process.env.ONLY || undefined);
  } finally {
    await stopProduct();
  }
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
