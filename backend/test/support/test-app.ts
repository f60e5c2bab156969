import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import type { Server } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { createTestDatabase, type TestDatabase } from '@bellgap/database';
import { contract } from '@bellgap/common/api';
import { AppModule } from '../../src/app.module';
import { ApiAdapter } from '../../src/platform/api-adapter';
import { loadConfig } from '../../src/platform/config';
import { configureApp } from '../../src/platform/configure-app';
import { People, type NewPerson, type TestPerson } from './people';
import { TestClient } from './test-client';
import { TestClock } from './test-clock';

/** The product in this process, over a database of its own. */
export class TestApp {
  readonly people: People;

  private constructor(
    readonly app: NestExpressApplication,
    readonly database: TestDatabase,
    readonly clock: TestClock,
    private readonly frontendFolder: string,
  ) {
    this.people = new People(database.owner);
  }

  static async start(env: Record<string, string> = {}): Promise<TestApp> {
    const database = await createTestDatabase();
    const frontendFolder = makeFrontend();
    const clock = new TestClock();
    const config = loadConfig({
      NODE_ENV: 'test',
      DATABASE_URL: database.url,
      PASSWORD_COST: '4',
      REQUEST_LOG: 'no',
      ROLE: 'web',
      FRONTEND_FOLDER: frontendFolder,
      ...env,
    });
    const app = await NestFactory.create<NestExpressApplication>(AppModule.with({ config, clock }), new ApiAdapter(), {
      bodyParser: false,
      logger: ['error', 'warn'],
      abortOnError: false,
    });
    configureApp(app, config);
    await app.init();
    return new TestApp(app, database, clock, frontendFolder);
  }

  get server(): Server {
    return this.app.getHttpServer() as Server;
  }

  /** Somebody who is not signed in. */
  stranger(): TestClient {
    return new TestClient(this.server);
  }

  /** A new person of these roles, signed in. */
  async signedIn(person: NewPerson): Promise<{ client: TestClient; person: TestPerson }> {
    const made = await this.people.add(person);
    return { client: await this.signIn(made), person: made };
  }

  async signIn({ email, password }: { email: string; password: string }): Promise<TestClient> {
    const client = this.stranger();
    const { status } = await client.call(contract.signIn, { body: { email, password } });
    if (status !== 201) throw new Error(`${email} could not sign in: ${status}`);
    return client;
  }

  async stop(): Promise<void> {
    await this.app.close();
    await this.database.close();
    rmSync(this.frontendFolder, { recursive: true });
  }
}

function makeFrontend(): string {
  const folder = mkdtempSync(path.join(tmpdir(), 'bellgap-pages-'));
  mkdirSync(path.join(folder, 'assets'));
  writeFileSync(path.join(folder, 'index.html'), '<!doctype html><title>Bellgap</title>');
  writeFileSync(path.join(folder, 'assets', 'index-3f9a.js'), 'export {};');
  return folder;
}
