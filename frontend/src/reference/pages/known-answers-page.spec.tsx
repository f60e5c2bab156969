import { contract, type KnownAnswers } from '@bellgap/common/api';
import { screen } from '@testing-library/react';
import { aPerson } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

const RUN: KnownAnswers = {
  methodEdition: '2026.2',
  items: [
    {
      id: 'density',
      topic: 'Altitude',
      title: 'Relative air density',
      source: 'High Voltage Engineering, example 7.3',
      status: 'seen',
      why: 'printed to 0.0001',
      verdict: 'met',
      figures: [
        {
          name: 'density',
          label: 'Density',
          unit: '',
          expected: 0.9327,
          obtained: 0.93270812,
          tolerance: 0.0001,
          met: true,
        },
      ],
    },
    {
      id: 'units',
      topic: 'String',
      title: 'Units of a string',
      source: 'Common practice, clean sites',
      status: 'practice',
      why: 'a count is whole',
      verdict: 'missed',
      figures: [
        { name: 'units', label: 'Units', unit: 'units', expected: 14, obtained: null, tolerance: 0, met: false },
      ],
    },
  ],
  leftOut: [{ title: 'Pollution severity map', source: 'Elsewhere, figure 2', why: 'no class is derived here' }],
};

describe('known answers', () => {
  it('run when asked, and say what was printed, obtained, accepted and why', async () => {
    const server = new FakeServer()
      .install()
      .on(contract.currentSession, () => ({ user: aPerson() }))
      .on(contract.runKnownAnswers, () => RUN);
    const { user } = openPage('/known-answers');
    const run = await screen.findByRole('button', { name: 'Run the examples' });
    expect(server.requestsTo(contract.runKnownAnswers)).toEqual([]);

    await user.click(run);
    const rows = (await screen.findAllByRole('row')).map((row) =>
      [...row.querySelectorAll('td')].map((cell) => cell.textContent),
    );
    expect(rows).toContainEqual([
      'Relative air density',
      'Density',
      '0.9327',
      '0.9327081',
      '±0.0001',
      'met',
      'printed to 0.0001',
      'High Voltage Engineering, example 7.3',
      'seen',
    ]);
    expect(rows).toContainEqual([
      'Units of a string',
      'Units, units',
      '14',
      '—',
      '±0',
      'missed, no figure obtained',
      'a count is whole',
      'Common practice, clean sites',
      'common practice, no published source',
    ]);
    expect(rows).toContainEqual(['Pollution severity map', 'Elsewhere, figure 2', 'no class is derived here']);
    expect(screen.getByText('1 of 2 examples missed; 1 lies outside the method.')).toBeInTheDocument();
  });

  it('say what went wrong and let it be run again', async () => {
    new FakeServer()
      .install()
      .on(contract.currentSession, () => ({ user: aPerson() }))
      .on(contract.runKnownAnswers, () => new Refusal('unexpected', 'The examples could not be run.'));
    const { user } = openPage('/known-answers');
    await user.click(await screen.findByRole('button', { name: 'Run the examples' }));
    expect(await screen.findByText('The examples could not be run.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Run the examples' })).toBeInTheDocument();
  });
});
