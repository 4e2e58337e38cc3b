import { screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import { server } from '../../../testing/server';
import type { Build, BuildStage } from '../api/builds';
import { aBuild, aCheck, aReading, aStage } from '../testing/build.fixture';
import StagePage from './StagePage';

const open = (stage: BuildStage = aStage(), build: Build = aBuild(stage)) => {
  server.use(
    http.get('*/api/builds/build', () => HttpResponse.json(build)),
    http.get('*/api/builds/build/checks/:checkId/instruments', () => HttpResponse.json([])),
  );
  return renderPage(<StagePage />, {
    at: `/build/build/stages/${stage.id}`,
    path: '/build/:buildId/stages/:stageId',
  });
};
const field = (label: string) => screen.findByRole('textbox', { name: label });
/** Over what the form filled in by itself. */
const retype = async (user: ReturnType<typeof open>['user'], label: string, text: string) => {
  await user.clear(await field(label));
  await user.type(await field(label), text);
};

describe('the stage page', () => {
  it('shows level, uncertainty and verdict while typing, and keeps the reading as typed', async () => {
    const sent: unknown[] = [];
    const { user } = open();
    server.use(
      http.post('*/api/builds/build/checks/output/readings', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json(aReading({ value: 0.5, expandedUncertainty: 0.39, verdict: 'pass' }), {
          status: 201,
        });
      }),
    );
    await retype(user, 'Volts per division', '10m');
    await user.type(await field('Divisions, peak to peak'), '6.7');
    expect(screen.getByText('+0.50')).toBeVisible();
    expect(screen.getByText('± 0.39 dB at 95 %')).toBeVisible();
    expect(screen.getAllByText('Pass').length).toBeGreaterThan(0);
    await user.click(screen.getByRole('button', { name: 'Keep this reading' }));
    expect(await screen.findByText('Reading kept, +0.50 ± 0.39 dBm.')).toBeVisible();
    expect(sent).toEqual([
      {
        method: 'oscilloscope',
        entry: {
          ...{ voltsPerDivision: '10m', divisionsPeakToPeak: '6.7', readToDivisions: '0.1' },
          ...{ probeRatio: '10', loadOhms: '50' },
        },
      },
    ]);
  });

  it('offers a better scale when it is too close to call, and says why', async () => {
    const { user } = open();
    await retype(user, 'Volts per division', '20m');
    await user.type(await field('Divisions, peak to peak'), '3.3');
    expect(screen.getByText(/The low end of your reading is −0.10 dBm/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Take it again at 10 mV/div' }));
    expect(await field('Volts per division')).toHaveValue('10m');
    expect(await field('Divisions, peak to peak')).toHaveValue('');
  });

  it('keeps what was typed on this device when sending fails', async () => {
    const { user, unmount } = open();
    server.use(http.post('*/api/builds/build/checks/output/readings', () => HttpResponse.error()));
    await retype(user, 'Volts per division', '10m');
    await user.type(await field('Divisions, peak to peak'), '6.7');
    await user.click(screen.getByRole('button', { name: 'Keep this reading' }));
    expect(await screen.findByText(/Not sent yet. Kept on this device./)).toBeVisible();
    unmount();
    open();
    expect(await field('Divisions, peak to peak')).toHaveValue('6.7');
    expect(screen.getByText(/^Kept from/)).toBeVisible();
  });

  it('puts the server’s words on the field they are about', async () => {
    const { user } = open();
    const errors = [{ pointer: '#/entry/loadOhms', detail: 'The load is another one.' }];
    server.use(
      http.post('*/api/builds/build/checks/output/readings', () =>
        HttpResponse.json(
          { type: '/problems/invalid-input', title: 'x', status: 422, detail: 'x', errors },
          { status: 422 },
        ),
      ),
    );
    await retype(user, 'Volts per division', '10m');
    await user.type(await field('Divisions, peak to peak'), '6.7');
    await user.click(screen.getByRole('button', { name: 'Keep this reading' }));
    expect(await screen.findByText('The load is another one.')).toBeVisible();
    expect(screen.queryByText(/Not sent yet/)).toBeNull();
  });

  it('says on leaving a field what cannot be, not while it is half typed', async () => {
    const { user } = open();
    await retype(user, 'Volts per division', '10m');
    await user.type(await field('Divisions, peak to peak'), '33');
    expect(screen.queryByText(/Did you mean 3.3/)).toBeNull();
    await user.tab();
    expect(await screen.findByText(/Did you mean 3.3/)).toBeVisible();
  });

  it('lets an error go while its field is typed in again', async () => {
    const { user } = open();
    await user.clear(await field('Volts per division'));
    await user.type(await field('Volts per division'), '10m');
    await user.type(await field('Divisions, peak to peak'), '33');
    await user.tab();
    expect(await screen.findByText(/Did you mean 3.3/)).toBeVisible();
    await user.type(await field('Divisions, peak to peak'), '3');
    expect(screen.queryByText(/Did you mean/)).toBeNull();
  });

  it('shows the last good result pale while what is typed cannot be read, its verdict too', async () => {
    const { user } = open();
    await user.clear(await field('Volts per division'));
    await user.type(await field('Volts per division'), '10m');
    await user.type(await field('Divisions, peak to peak'), '6.7');
    const chips = () => screen.getAllByText('Pass').map(({ parentElement }) => parentElement);
    const isPale = (chip: HTMLElement | null) =>
      chip !== null && getComputedStyle(chip).color === 'var(--fr-palette-token-ink3)';
    expect(chips().some(isPale)).toBe(false);
    await user.clear(await field('Divisions, peak to peak'));
    expect(chips().some(isPale)).toBe(true);
    expect(isPale(screen.getByText('± 0.39 dB at 95 %'))).toBe(true);
  });

  it('asks for the tick beside a grave caution before it offers Keep', async () => {
    const { user } = open(aStage({ cautions: ['rf power'] }));
    await retype(user, 'Volts per division', '10m');
    await user.type(await field('Divisions, peak to peak'), '6.7');
    expect(screen.queryByRole('button', { name: 'Keep this reading' })).toBeNull();
    await user.click(screen.getByRole('checkbox', { name: /The dummy load is connected/ }));
    expect(screen.getByRole('button', { name: 'Keep this reading' })).toBeEnabled();
  });

  describe('where the check names a kind of instrument', () => {
    const scope = (reason: string | null) => ({
      ...{ id: 'scope', tag: 'FR-021', name: 'Two channels', kind: 'Oscilloscope', reason },
      ...{ calibrationDueOn: '2027-01-31', damageLevelDbm: null, figures: {} },
    });
    const typed = async (answer: () => Response | Promise<Response>) => {
      const { user } = open(aStage({ checks: [aCheck({ instrumentKindId: 'scopes' })] }));
      server.use(http.get('*/api/builds/build/checks/:checkId/instruments', answer));
      await retype(user, 'Volts per division', '10m');
      await user.type(await field('Divisions, peak to peak'), '6.7');
      return user;
    };

    it('offers Keep once the instruments have come, and names the one that is chosen', async () => {
      let arrive = (): void => undefined;
      const arrived = new Promise<void>((resolve) => {
        arrive = resolve;
      });
      const sent: unknown[] = [];
      const user = await typed(async () => {
        await arrived;
        return HttpResponse.json([scope(null)]);
      });
      server.use(
        http.post('*/api/builds/build/checks/output/readings', async ({ request }) => {
          sent.push(await request.json());
          return HttpResponse.json(aReading(), { status: 201 });
        }),
      );
      const waiting = screen.getByRole('button', { name: 'Keep, instruments are loading' });
      await user.click(waiting);
      await user.type(await field('Divisions, peak to peak'), '{Enter}');
      expect(sent).toEqual([]);
      arrive();
      await user.click(await screen.findByRole('button', { name: 'Keep this reading' }));
      await waitFor(() => expect(sent).toMatchObject([{ instrumentId: 'scope' }]));
    });

    it('says where each value came from, takes the next instrument’s own, and leaves what was typed', async () => {
      const check = aCheck({
        method: 'log-detector',
        instrumentKindId: 'detectors',
        defaults: { readToVolts: 0.005 },
      });
      const line = (tag: string, interceptDbm: number) => ({
        ...{ ...scope(null), id: tag, tag, damageLevelDbm: 15 },
        figures: { voltsPerDb: 0.025, interceptDbm, validFromDbm: -70, validToDbm: 5, conformityDb: 0.5 },
      });
      const { user } = open(aStage({ checks: [check] }));
      server.use(
        http.get('*/api/builds/build/checks/:checkId/instruments', () =>
          HttpResponse.json([line('FR-041', -85), line('FR-042', -80)]),
        ),
      );
      await waitFor(async () => expect(await field('Intercept')).toHaveValue('-85'));
      expect(await field('Intercept')).toHaveAccessibleDescription('from FR-041');
      expect(screen.getByText(/From FR-041: fit of its line ± 0.5 dB, never above \+15 dBm/)).toBeVisible();
      await retype(user, 'Slope, each decibel', '24m');
      expect(await field('Slope, each decibel')).toHaveAccessibleDescription('Read as 24 mV');
      await user.click(screen.getByRole('combobox', { name: 'Instrument' }));
      await user.click(await screen.findByRole('option', { name: 'FR-042' }));
      expect(await field('Intercept')).toHaveValue('-80');
      expect(await field('Slope, each decibel')).toHaveValue('24m');
      await user.type(await field('Voltage shown'), '1.9');
      const link = screen.getByRole('link', { name: 'Open in Level bench' });
      expect(link.getAttribute('href')).toMatch(/way=log-detector.*volts=1\.9/);
    });

    it('says that none can be used, instead of keeping a reading without one', async () => {
      await typed(() => HttpResponse.json([scope('FR-021 is in repair.')]));
      const button = await screen.findByRole('button', { name: 'Keep, choose an instrument first' });
      expect(button).toHaveAccessibleDescription(/None of the instruments can be used just now/);
    });

    it('offers another try when the list does not load', async () => {
      const user = await typed(() => HttpResponse.error());
      expect(await screen.findByRole('button', { name: 'Keep, the instruments did not load' })).toBeVisible();
      server.use(
        http.get('*/api/builds/build/checks/:checkId/instruments', () => HttpResponse.json([scope(null)])),
      );
      await user.click(screen.getByRole('button', { name: /Try again/ }));
      expect(await screen.findByRole('button', { name: 'Keep this reading' })).toBeVisible();
    });
  });

  it('says in the button how many checks are left before a mentor can look', async () => {
    open();
    const button = await screen.findByRole('button', { name: /Send to mentor, 1 check left/ });
    expect(button).toHaveAccessibleDescription('Still missing: Output level at TP9.');
  });

  it('sends a settled stage with a word for the mentor', async () => {
    const notes: unknown[] = [];
    const check = aCheck({ isSettled: true, readings: [aReading({ verdict: 'pass' })] });
    const { user } = open(aStage({ checks: [check], missingToSend: 0, settled: 1 }));
    server.use(
      http.post('*/api/builds/build/stages/stage-9/submit', async ({ request }) => {
        notes.push(await request.json());
        return HttpResponse.json(aStage({ state: 'with mentor' }));
      }),
    );
    await user.click(await screen.findByRole('button', { name: 'Send to mentor' }));
    const dialog = await screen.findByRole('dialog');
    await user.type(within(dialog).getByLabelText(/A word for the mentor/), 'Stable now.');
    await user.click(within(dialog).getByRole('button', { name: 'Send to mentor' }));
    await waitFor(() => expect(notes).toEqual([{ note: 'Stable now.' }]));
  });

  it('says what opens a locked stage, and offers nothing to type', async () => {
    open(aStage({ state: 'locked', lockedBecause: 'It opens when stage 8 is with a mentor.' }));
    expect(await screen.findByText('It opens when stage 8 is with a mentor.')).toBeVisible();
    expect(screen.queryByRole('textbox')).toBeNull();
    expect(screen.queryByRole('button', { name: /Send to mentor/ })).toBeNull();
  });

  it('shows the mentor’s word when a stage was sent back, and lets it be mended', async () => {
    const event = {
      kind: 'sent back' as const,
      by: { id: 'm', name: 'Hollis Brandreth' },
      at: '2026-10-15T20:00:00Z',
      note: 'R3 is dry.',
    };
    open(aStage({ state: 'sent back', events: [event] }));
    expect(await screen.findByText('“R3 is dry.”')).toBeVisible();
    expect(screen.getByText(/Sent back by Hollis Brandreth/)).toBeVisible();
    expect(await field('Volts per division')).toBeVisible();
  });

  it('shows a signed-off stage as a record with every try and name', async () => {
    const tries = [aReading({ isSuperseded: true }), aReading({ id: 'b', value: 0.5, verdict: 'pass' })];
    const event = {
      kind: 'signed off' as const,
      by: { id: 'm', name: 'Hollis Brandreth' },
      at: '2026-10-15T20:00:00Z',
      note: 'Nice windings.',
    };
    open(
      aStage({
        state: 'signed off',
        events: [event],
        checks: [aCheck({ isSettled: true, readings: tries })],
      }),
    );
    expect(await screen.findByText('“Nice windings.”')).toBeVisible();
    expect(screen.getByText('Both tries stay in the build record.')).toBeVisible();
    expect(screen.queryByRole('textbox')).toBeNull();
  });

  it('lets a mentor look at somebody’s stage and touch nothing', async () => {
    const build = aBuild(aStage(), { builder: { id: 'noor', name: 'Noor Ashby' } });
    open(aStage(), build);
    expect(await screen.findByText('Noor Ashby', { exact: false })).toBeVisible();
    expect(screen.queryByRole('textbox')).toBeNull();
    expect(screen.queryByRole('button', { name: /Send to mentor/ })).toBeNull();
  });

  it('says so when the build is not there or not theirs to see, with a way to try again', async () => {
    server.use(
      http.get('*/api/builds/build', () =>
        HttpResponse.json(
          { type: '/problems/not-found', title: 'Not found', status: 404, detail: 'There is no such build.' },
          { status: 404 },
        ),
      ),
    );
    renderPage(<StagePage />, { at: '/build/build/stages/x', path: '/build/:buildId/stages/:stageId' });
    expect(await screen.findByText(/There is no such build/)).toBeVisible();
  });
});
