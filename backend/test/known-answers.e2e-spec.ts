import { contract } from '@bellgap/common/api';
import { METHOD_EDITION } from '@bellgap/common/engine';
import { TestApp } from './support/test-app';

describe('known answers', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await TestApp.start();
  });
  afterAll(() => test.stop());

  it('are run by the server with what is printed, what was obtained and why the tolerance', async () => {
    const { client } = await test.signedIn({ roles: ['reader'] });
    const { status, answer } = await client.call(contract.runKnownAnswers);
    expect(status).toBe(200);
    expect(answer.methodEdition).toBe(METHOD_EDITION);
    expect(answer.items.length).toBeGreaterThan(40);
    expect(answer.items.filter(({ verdict }) => verdict === 'missed')).toEqual([]);
    expect(new Set(answer.items.map(({ id }) => id)).size).toBe(answer.items.length);
    const density = answer.items.find(({ title }) => title.startsWith('relative air density at 37'))!;
    expect(density).toMatchObject({ status: 'seen', figures: [{ expected: 0.9327, tolerance: 0.0001, met: true }] });
    expect(answer.leftOut.length).toBeGreaterThan(10);
    for (const { why } of answer.leftOut) expect(why.length).toBeGreaterThan(20);
  });
});
