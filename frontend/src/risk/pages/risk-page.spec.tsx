import { contract } from '@bellgap/common/api';
import { screen, within } from '@testing-library/react';
import { aPerson } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';
import { aFlashoverRisk } from '../testing/a-flashover-risk';

const server = () =>
  new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson() }))
    .on(contract.flashoverRisk, aFlashoverRisk);

async function open() {
  const { user } = openPage('/risk');
  await screen.findByRole('heading', { name: 'Risk of flashover' });
  const type = async (label: RegExp, text: string) => {
    const field = screen.getByLabelText(label);
    await user.clear(field);
    await user.type(field, text);
  };
  return {
    user,
    type,
    fill: async () => {
      await user.click(screen.getByLabelText('Front of the surge'));
      await user.click(await screen.findByText('Slow, switching'));
      await type(/^Mean of the stress/, '700');
      await type(/^Deviation of the stress/, '80');
      await type(/^50 % flashover voltage/, '1000');
      await type(/^Gaps in parallel/, '200');
    },
    ask: () => user.click(screen.getByText('Work out the risk')),
  };
}

describe('the risk of flashover', () => {
  it('is asked for by the shared schema and told with formula, clause, status, cautions and working', async () => {
    const asked = server();
    const page = await open();
    expect(screen.getByText('No risk has been worked out on this page')).toBeInTheDocument();
    expect(screen.getByText('blank: 6 % for slow, 3 % for fast fronts')).toBeInTheDocument();
    await page.fill();
    expect(screen.getByText('blank: 6 %, usual for slow fronts')).toBeInTheDocument();
    await page.ask();

    const rate = (await screen.findByText('Switching-surge flashover rate')).closest('section')!;
    expect(rate).toHaveTextContent('25 % apart');
    expect(rate).toHaveTextContent('Gaussian tails0.02001 in 50');
    expect(within(rate).getAllByText('IEC 60071-2:1996, risk of failure · from memory, not verified')).toHaveLength(2);
    expect(screen.getByText("Brown's estimate of that rate").closest('section')).toHaveTextContent('0.0120');
    const cautions = [...document.querySelectorAll('.caution')].map(({ textContent }) => textContent);
    expect(cautions).toEqual([
      expect.stringContaining('The tails lie 25 % apart'),
      expect.stringContaining('The usual 6 % is taken'),
    ]);
    expect(screen.getByText('7 steps')).toBeInTheDocument();
    expect(asked.requestsTo(contract.flashoverRisk).map(({ body }) => body)).toEqual([
      {
        front: 'slow',
        stressMeanKvPeak: 700,
        stressDeviationKvPeak: 80,
        fiftyPercentKvPeak: 1000,
        deviationPercent: null,
        gapCount: 200,
      },
    ]);

    await page.type(/^Gaps in parallel/, '300');
    expect(screen.getByText('The figures were changed since: this answer is for those before.')).toBeInTheDocument();
  });

  it('draws stress, strength and their product to one scale, and says the same in words', async () => {
    server();
    const page = await open();
    await page.fill();
    await page.ask();
    const chart = await screen.findByRole('img', { name: /Stress about 700 kV peak with a deviation of 80 kV/ });
    expect(chart).toHaveAccessibleName(/meet the most near 850 kV peak/);
    const path = (name: string) => chart.querySelector(`.stress-strength-${name}`)?.getAttribute('d');
    expect(path('stress')).toBe('M0.00 100.00L37.50 10.00L56.25 82.00L75.00 100.00L100.00 100.00');
    expect(path('one')).toBe('M0.00 100.00L37.50 100.00L56.25 99.00L75.00 50.00L100.00 0.00');
    expect(path('gaps')).toBe('M0.00 100.00L37.50 99.00L56.25 50.00L75.00 0.00L100.00 0.00');
    // 0.0005 of 0.005 per kV is 9 % of the height, drawn five times larger.
    expect(path('product')).toBe('M0.00 100.00L37.50 95.50L56.25 55.00L75.00 100.00L100.00 100.00L100 100L0 100Z');
    expect(
      screen.getByText('stress times probability, whose area is the risk; drawn 5 times larger'),
    ).toBeInTheDocument();
  });

  it('says beside the field what is missing, and asks nothing until then', async () => {
    const asked = server();
    const page = await open();
    await page.ask();
    expect(await screen.findAllByText('Is needed')).toHaveLength(5);
    await page.fill();
    await page.type(/^Gaps in parallel/, '0');
    await page.ask();
    expect(await screen.findByText('Must be at least 1')).toBeInTheDocument();
    expect(asked.requestsTo(contract.flashoverRisk)).toEqual([]);
  });

  it('shows what the server refuses beside the field, and what failed at the foot of the form', async () => {
    const message = 'Deviation of the stress: must be at most 5000';
    const asked = server().on(
      contract.flashoverRisk,
      () => new Refusal('validation', 'Invalid.', [{ path: 'stressDeviationKvPeak', message }]),
    );
    const page = await open();
    await page.fill();
    await page.ask();
    expect(await screen.findByText('Must be at most 5000')).toBeInTheDocument();
    asked.on(contract.flashoverRisk, () => new Refusal('unexpected', 'The risk could not be worked out.'));
    await page.ask();
    expect(await screen.findByText('The risk could not be worked out.')).toBeInTheDocument();
    expect(screen.getByText('No risk has been worked out on this page')).toBeInTheDocument();
  });
});
