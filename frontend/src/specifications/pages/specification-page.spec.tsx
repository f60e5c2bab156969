import type { SpecificationInput } from '@bellgap/common/api';
import { QueryClientProvider } from '@tanstack/react-query';
import { act, cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter, Route, Routes } from 'react-router-dom';
import { makeQueryClient } from '../../api/queries';
import { aRevision, anEvaluation, FakeServer, problem } from '../testing/fake-server';
import { SpecificationPage } from './specification-page';

const user = userEvent.setup({ delay: null, pointerEventsCheck: 0 });
let server: FakeServer;

beforeEach(() => {
  server = new FakeServer();
  globalThis.fetch = server.fetch as unknown as typeof fetch;
  localStorage.clear();
});

async function openPage() {
  render(
    <QueryClientProvider client={makeQueryClient()}>
      <MemoryRouter initialEntries={['/projects/KL221/specifications/INS-221-003']}>
        <Routes>
          <Route path="/projects/:code/specifications/:number" element={<SpecificationPage />} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
  await screen.findByTestId('answer');
  // The catalogue and the levels are there.
  await screen.findByText('2 units in the catalogue');
}

const answer = () => screen.getByTestId('answer');
const altitude = () => screen.getByLabelText(/^Altitude/) as HTMLInputElement;
const askedInput = (index: number) => (server.evaluations()[index]?.body as { input: SpecificationInput }).input;
const byAltitude = ({ input }: { input: SpecificationInput }) =>
  anEvaluation((input.site?.altitudeM ?? 0) > 1000 ? 18 : 17);

/** Sets a field as a paste over its text does; the keys one by one are pressed where they matter. */
async function type(field: HTMLElement, text: string) {
  await user.click(field);
  fireEvent.change(field, { target: { value: text } });
}

describe('the answer follows the keys', () => {
  it('shows the stored answer, then the one of what is typed, asked without its working', async () => {
    server.evaluate = byAltitude;
    await openPage();
    expect(answer()).toHaveTextContent('17 units G160-S');
    expect(server.evaluations()).toHaveLength(0);
    await user.clear(altitude());
    await user.type(altitude(), '2310');
    await waitFor(() => expect(answer()).toHaveTextContent('18 units G160-S'));
    expect(server.evaluations().at(-1)?.body).toMatchObject({ trace: false, input: { site: { altitudeM: 2310 } } });
    expect(altitude()).toHaveFocus();
  });

  it('never lets an older answer take the place of a newer one', async () => {
    const waiting: (() => void)[] = [];
    server.evaluate = ({ input }) =>
      new Promise((done) => waiting.push(() => done(anEvaluation(input.site?.altitudeM === 2000 ? 40 : 18))));
    await openPage();
    fireEvent.change(altitude(), { target: { value: '2000' } });
    await waitFor(() => expect(waiting).toHaveLength(1));
    fireEvent.change(altitude(), { target: { value: '2310' } });
    await waitFor(() => expect(waiting).toHaveLength(2));
    await act(async () => waiting[1]?.());
    await waitFor(() => expect(answer()).toHaveTextContent('18 units'));
    await act(async () => waiting[0]?.());
    expect(answer()).toHaveTextContent('18 units');
    expect(answer()).toHaveAttribute('data-state', 'current');
  });

  it('keeps the last answer, marked, while a field cannot be read, and keeps its text', async () => {
    await openPage();
    await type(altitude(), '1,234');
    await user.tab();
    expect(altitude()).toHaveValue('1,234');
    expect(screen.getByText(/can mean 1234 or 1\.234/)).toBeInTheDocument();
    expect(answer()).toHaveAttribute('data-state', 'faulty');
    expect(answer()).toHaveTextContent('17 units G160-S');
    expect(screen.getByText(/not saved: a field cannot be read, kept in this browser/)).toBeInTheDocument();
  });

  it('takes a conversion only when it is accepted, and nothing from the wheel', async () => {
    await openPage();
    await type(altitude(), '4659 ft');
    expect(server.evaluations().every((_, index) => askedInput(index).site?.altitudeM !== 4659)).toBe(true);
    await user.click(await screen.findByText('Use 1420.0632 m'));
    await waitFor(() =>
      expect(server.evaluations().at(-1)?.body).toMatchObject({ input: { site: { altitudeM: 1420.0632 } } }),
    );
    fireEvent.wheel(altitude(), { deltaY: 120 });
    expect(altitude()).toHaveValue('1420.0632');
  });

  it('shows what the server refuses beside the field', async () => {
    server.evaluate = () =>
      problem(422, 'validation', {
        errors: [{ path: 'input.system.insulationLevel', message: 'No row of the table has this level' }],
      });
    await openPage();
    await type(altitude(), '1200');
    const fault = await screen.findByText('No row of the table has this level');
    expect(fault.closest('[data-field]')).toHaveAttribute('data-field', 'field-system-insulationLevel');
    expect(answer()).toHaveAttribute('data-state', 'faulty');
  });

  it('refuses by the shared schema before asking', async () => {
    await openPage();
    await type(screen.getByLabelText(/^Highest voltage/), '100');
    expect(await screen.findByText('The highest voltage must not be below the nominal voltage')).toBeInTheDocument();
    expect(server.evaluations().some((_, index) => askedInput(index).system?.highestVoltageKv === 100)).toBe(false);
  });

  it('asks for the working when a figure is opened', async () => {
    const line = {
      id: 'pollution.creepage',
      heading: 'Creepage required',
      formula: 'L = USCD * U * Kad * Ka',
      substitution: 'L = 43.3 * 141.4508 * 1 * 1',
      result: 6124.820331,
      unit: 'mm',
      source: { document: 'IEC TS 60815-2', edition: '2008', clause: 'required creepage', status: 'derived' as const },
    };
    server.evaluate = ({ trace }) => anEvaluation(17, { trace: trace ? [line] : [] });
    await openPage();
    await user.click(screen.getAllByText('Pollution, needed:')[0]!);
    expect(await screen.findByText('L = 43.3 * 141.4508 * 1 * 1')).toBeInTheDocument();
    expect(screen.getByText('= 6124.820331 mm')).toBeInTheDocument();
    expect(screen.getByText(/IEC TS 60815-2:2008, required creepage · derived/)).toBeInTheDocument();
    expect(server.evaluations().at(-1)?.body).toMatchObject({ trace: true });
  });
});

describe('fields that apply', () => {
  it('asks for the gap only with devices, and for angles only with a V', async () => {
    await openPage();
    expect(screen.queryByLabelText(/^Gap between devices/)).not.toBeInTheDocument();
    await user.click(screen.getByLabelText('Arcing devices'));
    await user.click(screen.getByText('Horns'));
    expect(screen.getByLabelText(/^Gap between devices/)).toBeInTheDocument();
    expect(screen.getByText('Horns need the gap between them')).toBeInTheDocument();
    expect(screen.queryByLabelText(/^V leg angle/)).not.toBeInTheDocument();
  });

  it('marks a departure from the basis, keeps its reason and leads back', async () => {
    await openPage();
    const voltage = screen.getByLabelText(/^Nominal voltage/);
    await type(voltage, '230');
    const field = voltage.closest('[data-field]') as HTMLElement;
    expect(field).toHaveClass('is-overridden');
    expect(field).toHaveTextContent('differs from the basis (220 kV rms)');
    await type(within(field).getByPlaceholderText(/^reason/), 'as built');
    await waitFor(() =>
      expect(server.saves().at(-1)?.body).toMatchObject({
        overrides: [{ path: 'system.nominalVoltageKv', reason: 'as built' }],
      }),
    );
    await user.click(within(field).getByText('back to basis'));
    expect(voltage).toHaveValue('220');
    expect(field).not.toHaveClass('is-overridden');
  });
});

describe('mechanical loads', () => {
  it('show a fault of the server beside its row', async () => {
    server.evaluate = () =>
      problem(422, 'validation', {
        errors: [{ path: 'input.mechanical.cases[0].kind', message: 'This kind is not one of the basis' }],
      });
    await openPage();
    await user.click(screen.getByText('Add loads'));
    const fault = await screen.findByText('This kind is not one of the basis');
    expect(fault.closest('[data-field]')).toHaveAttribute('data-field', 'field-mechanical-cases-0-kind');
  });
});

describe('a draft saves itself', () => {
  it('after a pause, passively, from the version it began with, and says when', async () => {
    await openPage();
    await type(altitude(), '1200');
    expect(screen.getByText(/not saved yet, kept in this browser/)).toBeInTheDocument();
    await waitFor(() => expect(server.saves()).toHaveLength(1));
    expect(server.saves()[0]?.headers).toMatchObject({ 'If-Match': '"4"', 'X-Bellgap-Passive': '1' });
    expect(await screen.findByText(/^saved .*\d\d:02:31$/)).toBeInTheDocument();
    expect(localStorage).toHaveLength(0);
    await type(altitude(), '1300');
    await user.tab();
    await waitFor(() => expect(server.saves()).toHaveLength(2));
    expect(server.saves()[1]?.headers).toMatchObject({ 'If-Match': '"5"' });
  });

  it('keeps what a lost connection could not take, and offers it back after a reload', async () => {
    await openPage();
    server.isCutOff = true;
    await type(altitude(), '1234.5');
    expect(await screen.findByText(/not saved: no connection, kept in this browser/)).toBeInTheDocument();
    cleanup();
    server.isCutOff = false;
    await openPage();
    expect(altitude()).toHaveValue('900');
    await user.click(screen.getByText('Take it back'));
    expect(altitude()).toHaveValue('1234.5');
    await waitFor(() => expect(server.saves().at(-1)?.body).toMatchObject({ input: { site: { altitudeM: 1234.5 } } }));
  });

  it('says that the session has ended and saves when it is back', async () => {
    await openPage();
    server.refuseSave = () => problem(401, 'not-signed-in');
    await type(altitude(), '1250');
    expect(await screen.findByText(/not saved: signed out, kept in this browser/)).toBeInTheDocument();
    expect(altitude()).toHaveValue('1250');
  });

  it('shows both versions of a draft that somebody else saved, and loses neither', async () => {
    await openPage();
    const input = server.revision.input;
    const theirs = aRevision({
      lockVersion: 9,
      title: 'All strings, Z3 and Z4',
      input: { ...input, site: { altitudeM: 1500, pollution: input.site!.pollution } },
    });
    server.refuseSave = () =>
      problem(409, 'newer-version', {
        current: theirs,
        changedBy: 'Jorin Bakkarash',
        changedAt: '2026-03-12T10:05:00Z',
      });
    await type(altitude(), '1200');
    const dialog = await screen.findByText('This draft was saved meanwhile');
    expect(dialog).toBeInTheDocument();
    expect(screen.getByText(/Jorin Bakkarash saved it/)).toBeInTheDocument();
    // Only they changed the title; the altitude both did, so it must be chosen.
    expect(screen.getByText('1 field was changed by both: choose.')).toBeInTheDocument();
    server.refuseSave = null;
    server.revision = theirs;
    await user.click(screen.getByText('1200 m'));
    await user.click(screen.getByText('Go on with these'));
    await waitFor(() => expect(server.saves().at(-1)?.headers).toMatchObject({ 'If-Match': '"9"' }));
    expect(server.saves().at(-1)?.body).toMatchObject({
      title: 'All strings, Z3 and Z4',
      input: { site: { altitudeM: 1200 } },
    });
    expect(altitude()).toHaveValue('1200');
  });

  it('opens read-only for those who may not edit', async () => {
    server.revision = aRevision({ mayEdit: false });
    await openPage();
    expect(altitude()).toHaveAttribute('readonly');
    expect(screen.getByText(/read only/)).toBeInTheDocument();
  });

  it('takes over a newer basis', async () => {
    server.revision = aRevision({ newerBasisRevision: 3 });
    await openPage();
    expect(screen.getByText(/The basis has revision 3; this draft rests on 2/)).toBeInTheDocument();
    await user.click(screen.getByText('Take over'));
    await waitFor(() => expect(screen.getByText('from basis DB-KL221 rev 3')).toBeInTheDocument());
    expect(server.asked.find(({ path }) => path.endsWith('/basis'))?.headers).toMatchObject({ 'If-Match': '"4"' });
  });
});
