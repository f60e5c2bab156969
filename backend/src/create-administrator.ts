import { parseArgs } from 'node:util';
import { NestFactory } from '@nestjs/core';
import { createUserSchema } from '@bellgap/common/schemas';
import { AppModule } from './app.module';
import { loadConfig } from './platform/config';
import { ConfigError } from './platform/config-values';
import { DomainError } from './platform/domain-error';
import { assertValid } from './platform/yup-validation';
import { UsersService } from './users/users.service';

const USAGE = 'npm run create-administrator -- --email name@company.example --name "Name"';

/** Makes an administrator, or a new link for one, and prints the link once. */
async function main(): Promise<void> {
  const { values } = parseArgs({ options: { email: { type: 'string' }, name: { type: 'string' } } });
  assertValid(createUserSchema, values);
  const { email = '', name = '' } = values;
  // The letter leaves with a process that works on the queue.
  const config = loadConfig({ ...process.env, ROLE: 'web' });
  const app = await NestFactory.createApplicationContext(AppModule.with({ config }), {
    logger: ['error', 'warn'],
    abortOnError: false,
  });
  try {
    const { user, link, expiresAt } = await app.get(UsersService).inviteAdministrator({ email, name });
    console.log(`${user.name} <${user.email}> chooses a password at this address, once, until ${expiresAt}:\n${link}`);
  } finally {
    await app.close();
  }
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
