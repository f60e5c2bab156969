import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module';
import { ApiAdapter } from './platform/api-adapter';
import { loadConfig, type Config } from './platform/config';
import { ConfigError } from './platform/config-values';
import { configureApp } from './platform/configure-app';

async function main(): Promise<void> {
  const config = loadConfig(process.env);
  if (config.role === 'worker') return work(config);
  const app = await NestFactory.create<NestExpressApplication>(AppModule.with({ config }), new ApiAdapter(), {
    bodyParser: false,
    logger: ['error', 'warn'],
  });
  configureApp(app, config);
  await app.listen(config.port, config.host);
  console.log(`Bellgap listens on ${await app.getUrl()}, its address is ${config.publicUrl.origin}`);
}

/** Does without a port: the queue is in the database. */
async function work(config: Config): Promise<void> {
  const app = await NestFactory.createApplicationContext(AppModule.with({ config }), { logger: ['error', 'warn'] });
  app.enableShutdownHooks();
  console.log('Bellgap works on its queue');
}

main().catch((error: unknown) => {
  console.error(wordsFor(error));
  process.exit(1);
});

function wordsFor(error: unknown): unknown {
  if (error instanceof ConfigError) return error.message;
  const { code, port } = (error ?? {}) as { code?: unknown; port?: unknown };
  return code === 'EADDRINUSE' ? `PORT ${String(port)} is taken; give another one.` : error;
}
