import { contract, type StandingBasis, type InsulationLevelRow } from '@bellgap/common/api';
import { screen } from '@testing-library/react';
import { aStandingBasis, aPerson, aProject } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

const aLevel = (highestVoltageKv: number, lightningKv: number, powerFrequencyKv: number): InsulationLevelRow => ({
  highestVoltageKv,
  lightningKv,
  powerFrequencyKv,
  switchingKv: null,
  switchingPhaseRatio: null,
  bracketed: false,
  reason: null,
  source: { document: 'IEC 60071-1', edition: '2019', clause: 'Table 2', status: 'seen' },
});

// Rows of IEC 60071-1, Table 2 (range I).
const LEVELS = [aLevel(145, 650, 275), aLevel(245, 950, 395), aLevel(245, 1050, 460)];

interface History {
  current: StandingBasis | null;
  earlier: StandingBasis[];
}

/** A server whose design basis is the one that stands in `kept`. */
function serverWith(kept: History): FakeServer {
  return new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson() }))
    .on(contract.project, () => aProject())
    .on(contract.designBasis, () => ({ ...kept }))
    .on(contract.insulationLevels, () => LEVELS);
}

async function chooseFrom(user: ReturnType<typeof openPage>['user'], label: string, choice: string) {
  await user.click(screen.getByLabelText(label));
  await user.click(await screen.findByText(choice, { selector: '.ant-select-item *' }));
}

describe('design basis', () => {
  it('begins with nothing chosen and sends the level as one row', async () => {
    const kept: History = { current: null, earlier: [] };
    const server = serverWith(kept).on(contract.saveDesignBasis, () => {
      kept.current = aStandingBasis({ revision: 1 });
      return kept.current;
    });
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Set the design basis'));
    expect(screen.getByText(/rows to choose from appear/)).toBeInTheDocument();

    await chooseFrom(user, 'Basis', 'IEC');
    await user.type(screen.getByLabelText(/^Nominal voltage/), '220');
    await user.type(screen.getByLabelText(/^Highest voltage/), '245');
    expect(await screen.findByText('One row of 245 kV')).toBeInTheDocument();
    expect(screen.queryByText('650')).not.toBeInTheDocument();
    for (const radio of screen.getAllByLabelText(/^Lightning/)) expect(radio).not.toBeChecked();
    await user.click(screen.getByLabelText('Lightning 1050 kV peak, power frequency 460 kV'));
    await user.click(screen.getByText('Set revision 1'));

    expect(await screen.findByText('DB-KL221 revision 1')).toBeInTheDocument();
    const [request] = server.requestsTo(contract.saveDesignBasis);
    expect(request?.headers['If-Match']).toBe('"0"');
    expect(request?.body).toMatchObject({
      number: 'DB-KL221',
      basis: 'iec',
      system: {
        nominalVoltageKv: 220,
        highestVoltageKv: 245,
        neutralEarthing: null,
        insulationLevel: { lightningKv: 1050, powerFrequencyKv: 460, switchingKv: null, levelHoldsToM: null },
        overvoltages: null,
      },
    });
  });

  it('refuses a highest voltage below the nominal one beside the field', async () => {
    const server = serverWith({ current: aStandingBasis(), earlier: [] });
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Revise'));
    await user.clear(screen.getByLabelText(/^Highest voltage/));
    await user.type(screen.getByLabelText(/^Highest voltage/), '132');
    await user.click(screen.getByText('Set revision 3'));
    expect(await screen.findByText(/must not be below the nominal voltage/)).toBeInTheDocument();
    expect(server.requestsTo(contract.saveDesignBasis)).toHaveLength(0);
  });

  it('keeps what was typed where somebody saved meanwhile, and saves from the newer revision next', async () => {
    const kept: History = { current: aStandingBasis(), earlier: [] };
    serverWith(kept).on(contract.saveDesignBasis, ({ headers }) => {
      if (headers['If-Match'] === '"3"') {
        kept.current = aStandingBasis({ id: 'basis-4', revision: 4, note: 'mine' });
        return kept.current;
      }
      kept.current = aStandingBasis({ id: 'basis-3', revision: 3, note: 'theirs' });
      return new Refusal('newer-version', 'newer', [], { changedBy: 'Jorin Bakkarash' });
    });
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Revise'));
    await user.type(screen.getByLabelText('What changed and why'), 'mine');
    await user.click(screen.getByText('Set revision 3'));
    expect(await screen.findByText(/Jorin Bakkarash saved a newer version meanwhile/)).toBeInTheDocument();
    expect(screen.getByLabelText('What changed and why')).toHaveValue('mine');
    await user.click(await screen.findByText('Set revision 4'));
    expect(await screen.findByText('DB-KL221 revision 4')).toBeInTheDocument();
  });
});
