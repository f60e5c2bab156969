import startTestCluster from '../../database/src/testing/global-setup';
import stopTestCluster from '../../database/src/testing/global-teardown';
import { browserFigures } from './browser.bench';
import { engineFigures } from './engine.bench';
import { report } from './harness';
import { httpFigures } from './http.bench';
import { sheetFigures } from './sheet.bench';
import { startFigures } from './start.bench';

async function main(): Promise<void> {
  startTestCluster();
  try {
    await report([...engineFigures, ...httpFigures, ...sheetFigures, ...browserFigures, ...startFigures]);
  } finally {
    stopTestCluster();
  }
}

main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
