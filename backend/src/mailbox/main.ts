import { once } from 'node:events';
import { parseArgs } from 'node:util';
import { LetterStore } from './letter-store';
import { readingServer } from './reading-server';
import { receivingServer } from './receiving-server';

const LOOPBACK = '127.0.0.1';
const USAGE = 'node backend/dist/mailbox/main.js --folder FOLDER --smtp-port PORT --port PORT';

/** The post box of a product that runs on this computer: takes its letters and shows them, on loopback only. */
async function main(): Promise<void> {
  const { values } = parseArgs({
    options: { folder: { type: 'string' }, 'smtp-port': { type: 'string' }, port: { type: 'string' } },
  });
  const { folder, port } = values;
  const smtpPort = Number(values['smtp-port']);
  if (!folder || !smtpPort || !Number(port)) throw new Error(USAGE);
  const store = await LetterStore.open(folder);
  const receiving = receivingServer(store);
  receiving.on('error', (error: Error & { code?: string }) => {
    // A sender that hangs up in the middle is no reason to end.
    console.error(error.message);
    if (error.code === 'EADDRINUSE') process.exit(1);
  });
  const reading = readingServer(store);
  receiving.listen(smtpPort, LOOPBACK);
  reading.listen(Number(port), LOOPBACK);
  await once(reading, 'listening');
  console.log(`Letters are taken at smtp://${LOOPBACK}:${smtpPort} and read at http://${LOOPBACK}:${port}`);
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.once(signal, () => {
      reading.close();
      reading.closeAllConnections();
      receiving.close(() => process.exit(0));
    });
  }
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
});
