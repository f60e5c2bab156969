import { NestFactory } from '@nestjs/core';
import { AppModule } from '../app.module';
import { loadConfig } from '../platform/config';
import { storytellersOf } from './acts';
import { StoryClock } from './story-clock';
import { tellStory } from './tell-story';

/** Makes the documents of the demonstration through the product's services. May run again without harm. */
async function main(): Promise<void> {
  // Letters of the story wait for the product that starts after it.
  const config = loadConfig({ ...process.env, ROLE: 'web' });
  if (config.production) throw new Error('The demonstration is never loaded in production.');
  const clock = new StoryClock();
  const app = await NestFactory.createApplicationContext(AppModule.with({ config, clock }), {
    logger: ['error', 'warn'],
  });
  try {
    const made = await tellStory(storytellersOf(app, clock));
    console.log(made.length > 0 ? `Demonstration: made ${made.join(', ')}` : 'Demonstration: all documents are there');
  } finally {
    await app.close();
  }
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
});
