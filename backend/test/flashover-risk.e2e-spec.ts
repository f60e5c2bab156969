import { contract, type FlashoverRiskInput } from '@bellgap/common/api';
import { TestApp } from './support/test-app';

const { flashoverRisk } = contract;

/** Deviations of 80 and, by 6 %, 60 kV make 100 kV together; the means lie 300 kV apart. */
const THREE_DEVIATIONS: FlashoverRiskInput = {
  front: 'slow',
  stressMeanKvPeak: 700,
  stressDeviationKvPeak: 80,
  fiftyPercentKvPeak: 1000,
  deviationPercent: null,
  gapCount: 200,
};

describe('the risk of flashover', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await TestApp.start();
  });
  afterAll(() => test.stop());

  it('of one gap is the printed normal distribution, with the rate of many gaps and the working beside', async () => {
    const { client: reader } = await test.signedIn({ roles: ['reader'] });
    const { status, answer } = await reader.call(flashoverRisk, { body: THREE_DEVIATIONS });
    expect(status).toBe(200);
    const [gaussian, truncated] = answer.byTail;
    // Abramowitz and Stegun, Table 26.1: 0.00134989803163 at three deviations.
    expect(gaussian!.singleGapProbability).toBeCloseTo(0.00134989803163, 11);
    expect(gaussian!.switchingFlashoverProbability).toBe(gaussian!.gapsProbability / 2);
    expect(truncated!.gapsProbability).toBeLessThan(gaussian!.gapsProbability);
    expect(answer.trace.map(({ id }) => id)).toEqual(
      expect.arrayContaining(['risk.single-gap', 'risk.browns-estimate']),
    );
    expect(answer.cautions.map(({ code }) => code)).toEqual(['risk.usual-deviation']);
  });

  it('refuses what cannot be read beside its field', async () => {
    const { client } = await test.signedIn({ roles: ['engineer'] });
    const body = { ...THREE_DEVIATIONS, front: 'square', stressDeviationKvPeak: 0, gapCount: 1.5, colour: 'red' };
    const { status, problem } = await client.call(flashoverRisk, { body });
    expect(status).toBe(422);
    expect(problem.errors.map(({ path }) => path).sort()).toEqual([
      'colour',
      'front',
      'gapCount',
      'stressDeviationKvPeak',
    ]);
    const { deviationPercent: _left, ...short } = THREE_DEVIATIONS;
    const left = await client.call(flashoverRisk, { body: short });
    expect(left.problem.errors.map(({ path }) => path)).toEqual(['deviationPercent']);
  });

  it('is told to nobody who is not signed in', async () => {
    expect((await test.stranger().call(flashoverRisk, { body: THREE_DEVIATIONS })).status).toBe(401);
  });
});
