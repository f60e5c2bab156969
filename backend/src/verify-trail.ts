import { parseArgs } from 'node:util';
import { createKnex } from '@bellgap/database';
import { verificationWords } from '@bellgap/common/api';
import { knownSealSchema } from '@bellgap/common/schemas';
import { SystemClock } from './platform/clock';
import { loadConfig } from './platform/config';
import { ConfigError } from './platform/config-values';
import { DomainError } from './platform/domain-error';
import { assertValid } from './platform/yup-validation';
import { TrailVerifier, type KnownSeal } from './trail/trail-verifier';

const USAGE = 'npm run verify-trail [-- --number 4711 --hash 0a1b2c3d4e5f]';

/** Checks the whole trail and says what is wrong with it; ends with 1 where something is. */
async function main(): Promise<void> {
  const { values } = parseArgs({ options: { number: { type: 'string' }, hash: { type: 'string' } } });
  const known = knownSealOf(values);
  const { databaseUrl } = loadConfig(process.env);
  const knex = createKnex({ url: databaseUrl, poolMax: 1, applicationName: 'bellgap verify-trail' });
  try {
    const verification = await new TrailVerifier(knex, new SystemClock()).verify(known);
    console.log(verificationWords(verification).join('\n'));
    if (!verification.sound) process.exitCode = 1;
  } finally {
    await knex.destroy();
  }
}

function knownSealOf({ number, hash }: { number?: string; hash?: string }): KnownSeal | null {
  if (number === undefined && hash === undefined) return null;
  const known = { number: Number(number), hash: hash?.toLowerCase() };
  assertValid(knownSealSchema, known);
  return known as KnownSeal;
}

main().catch((error: unknown) => {
  if (error instanceof DomainError) {
    for (const { message } of error.options.errors ?? [{ message: error.message }]) console.error(message);
    console.error(`Usage: ${USAGE}`);
  } else {
    console.error(error instanceof ConfigError ? error.message : error);
  }
  process.exitCode = 1;
});
