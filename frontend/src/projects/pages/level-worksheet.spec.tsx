import { contract, type StandingBasis, type WorksheetInput } from '@bellgap/common/api';
import { aWorksheet, insulationLevelsFor, insulationLevelWorksheet } from '@bellgap/common/testing';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { aStandingBasis, aPerson, aProject } from '../../testing/builders';
import { FakeServer, Refusal } from '../../testing/fake-server';
import { openPage } from '../../testing/open-page';

interface History {
  current: StandingBasis | null;
  earlier: StandingBasis[];
}

/** The server answers the worksheet by the engine itself, so that the page shows the figures of the method. */
function serverWith(kept: History): FakeServer {
  return new FakeServer()
    .install()
    .on(contract.currentSession, () => ({ user: aPerson() }))
    .on(contract.project, () => aProject())
    .on(contract.designBasis, () => ({ ...kept }))
    .on(contract.insulationLevels, () => insulationLevelsFor(245, 'iec'))
    .on(contract.insulationLevelWorksheet, ({ body }) => insulationLevelWorksheet(body as WorksheetInput));
}

/** By id: looking through the accessibility tree of so long a form takes a second each time. */
const fieldAt = (path: string): HTMLInputElement | null =>
  document.querySelector<HTMLInputElement>(`#field-worksheet-${path}`);
const typeAt = (path: string, value: string) => fireEvent.change(fieldAt(path)!, { target: { value } });
const frameOf = (path: string): HTMLElement => document.querySelector(`[data-field="field-worksheet-${path}"]`)!;
/** Texts of the cells of a row of the requirements. */
const requirement = (words: string): string[] =>
  [...document.querySelectorAll('.worksheet-table tbody tr')]
    .map((row) => [...row.querySelectorAll('th, td:nth-child(2), .bg-num')].map((cell) => cell.textContent))
    .find((cells) => cells.slice(0, 2).join(' ').startsWith(words))!;

describe('the insulation level worksheet on the design basis', () => {
  /** IEC 60071-2:1996, annex H.1 (from memory, not verified): 395/950 kV, and 2.35 m at the line entrance. */
  it('shows the 245 kV example as it was kept, with every step', async () => {
    serverWith({ current: aStandingBasis({ worksheet: aWorksheet() }), earlier: [] });
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Insulation level worksheet'));
    expect(await screen.findByText('power frequency 395 kV rms, lightning 950 kV peak')).toBeInTheDocument();
    expect(screen.getByText('2,350')).toBeInTheDocument();
    for (const [row, figures] of [
      ['Temporary, to earth external', ['212.2', '1.063', '236.9']],
      ['Slow front, line entrance, to earth', ['410.0', '451.0', '1.122', '531.4', '352.1', '605.1']],
      ['Slow front, line entrance, between phases', ['820.0', '1.131', '973.4', '658.6', '1,127.3']],
      ['Slow front, other equipment, to earth internal', ['422.3', '485.6', '242.8', '534.2']],
      ['Fast front, to earth external', ['745.5', '884.9']],
      ['Fast front, to earth internal', ['622.7', '716.1']],
    ] as const) {
      expect(requirement(row)).toEqual(expect.arrayContaining([...figures]));
    }
    const steps = screen.getByLabelText('Steps of the worksheet');
    expect(within(steps).getByText('Uet = (1.25 * 3 - 0.25) * 200.0417')).toBeInTheDocument();
    expect(within(steps).getByText('= 250 m')).toBeInTheDocument();
    expect(within(steps).getAllByText(/IEC 60071-2.*from memory, not verified/).length).toBeGreaterThan(10);
  });

  it('is closed where none is kept, answers while it is filled in, and gives its level to the basis', async () => {
    const kept: History = { current: aStandingBasis(), earlier: [] };
    const server = serverWith(kept).on(contract.saveDesignBasis, () => {
      kept.current = aStandingBasis({ revision: 3 });
      return kept.current;
    });
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Revise'));
    expect(fieldAt('altitudeM')).toBeNull();
    await user.click(screen.getByText('Insulation level worksheet'));
    expect(server.requestsTo(contract.insulationLevelWorksheet)).toHaveLength(0);
    typeAt('altitudeM', '2310');
    expect(await screen.findByText('What external requirements are converted for is not chosen.')).toBeInTheDocument();
    expect(screen.queryByText('Take this level into the basis')).not.toBeInTheDocument();
    await user.click(screen.getByText('Set revision 3'));
    await screen.findByText('DB-KL221 revision 3');
    const [request] = server.requestsTo(contract.saveDesignBasis);
    expect(request?.body).toMatchObject({ worksheet: { highestVoltageKv: 245, altitudeM: 2310, arrester: null } });
  });

  it('takes the level with the altitude up to which it holds', async () => {
    const worksheet = aWorksheet({ altitudeM: 2310 });
    const kept: History = {
      current: aStandingBasis({ worksheet, system: { ...aStandingBasis().system } }),
      earlier: [],
    };
    const server = serverWith(kept).on(contract.saveDesignBasis, () => kept.current);
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Revise'));
    expect(await screen.findByText(/^The basis now has .*lightning 1050 kV peak, up to 1000 m/)).toBeInTheDocument();
    await user.click(await screen.findByText('Take this level into the basis'));
    expect(await screen.findByText(/^The basis has this level: .*up to 2310 m/)).toBeInTheDocument();
    expect(screen.getByLabelText(/^Level holds up to/)).toHaveValue('2310');
    await user.click(screen.getByText('Set revision 3'));
    await waitFor(() => expect(server.requestsTo(contract.saveDesignBasis)).toHaveLength(1));
    expect(server.requestsTo(contract.saveDesignBasis)[0]?.body).toMatchObject({
      system: { insulationLevel: { lightningKv: 1050, powerFrequencyKv: 460, levelHoldsToM: 2310 } },
      worksheet: { highestVoltageKv: 245, altitudeM: 2310, loadRejectionFactor: 1.4 },
    });
  });

  it('says beside the field what cannot be, from the form and from the server, and keeps what was typed', async () => {
    const server = serverWith({ current: aStandingBasis({ worksheet: aWorksheet() }), earlier: [] });
    server.on(contract.insulationLevelWorksheet, ({ body }) =>
      (body as WorksheetInput).altitudeM === 1200
        ? new Refusal('validation', 'refused', [{ path: 'altitudeM', message: 'Altitude: not that one' }])
        : insulationLevelWorksheet(body as WorksheetInput),
    );
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Revise'));
    typeAt('altitudeM', '1200');
    expect(await within(frameOf('altitudeM')).findByText('Not that one')).toBeInTheDocument();
    expect(fieldAt('altitudeM')).toHaveValue('1200');

    typeAt('earthFaultFactor', '2.4');
    await user.click(screen.getByText('Insulation level worksheet'));
    await user.click(screen.getByText('Set revision 3'));
    expect(await screen.findByText('Must be at most 1.9')).toBeInTheDocument();
    expect(fieldAt('earthFaultFactor')).toHaveValue('2.4');
    expect(server.requestsTo(contract.saveDesignBasis)).toHaveLength(0);
  });

  it('shows the answer to the newest question only', async () => {
    const server = serverWith({ current: aStandingBasis({ worksheet: aWorksheet() }), earlier: [] });
    let freeOld = (): void => undefined;
    server.on(contract.insulationLevelWorksheet, async ({ body }) => {
      const input = body as WorksheetInput;
      if (input.altitudeM === 2310) await new Promise<void>((resolve) => (freeOld = resolve));
      return insulationLevelWorksheet(input);
    });
    const { user } = openPage('/projects/KL221/basis');
    await user.click(await screen.findByText('Revise'));
    typeAt('altitudeM', '2310');
    await waitFor(() =>
      expect(server.requestsTo(contract.insulationLevelWorksheet).at(-1)?.body).toMatchObject({ altitudeM: 2310 }),
    );
    typeAt('altitudeM', '1500');
    const level = 'Lowest level that meets every requirement';
    await waitFor(() => expect(screen.getByText('1,500')).toBeInTheDocument());
    freeOld();
    await new Promise((resolve) => setTimeout(resolve, 50));
    expect(screen.getByText('1,500')).toBeInTheDocument();
    expect(screen.getByText(level)).toBeInTheDocument();
    expect(screen.queryByText('2,310')).not.toBeInTheDocument();
  });
});
