import { screen } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { keepDraft } from '../../../lib/drafts';
import { asPhone } from '../../../testing/as-phone';
import { renderPage, TAMSIN } from '../../../testing/render';
import { server } from '../../../testing/server';
import { readingPlace } from '../logic/reading-draft';
import { aBuild, aReading, aStage, aCheck } from '../testing/build.fixture';
import LevelPage from './LevelPage';
import StagePage from './StagePage';

const HALF = { voltsPerDivision: '10m', divisionsPeakToPeak: '', readToDivisions: '0.1' };
const WHOLE = { ...HALF, divisionsPeakToPeak: '6.7' };
const REST = { probeRatio: '10', loadOhms: '50' };

describe('the page of levels on a phone', () => {
  beforeEach(() => {
    asPhone();
    return () => vi.unstubAllGlobals();
  });
  const kept = aStage({ checks: [aCheck({ readings: [aReading()] })] });
  const open = () => {
    server.use(
      http.get('*/api/builds/build', () => HttpResponse.json(aBuild(kept))),
      http.get('*/api/builds/build/checks/:checkId/instruments', () => HttpResponse.json([])),
    );
    return renderPage(<LevelPage />, { at: '/build/build/levels', path: '/build/:buildId/levels' });
  };
  const type = (entry: object, person = TAMSIN.id) =>
    keepDraft(person, readingPlace('build', 'output'), { entry: { ...entry, ...REST }, instrumentId: '' });

  it('shows the level that is being typed on the stage page, with its verdict', async () => {
    type(WHOLE);
    open();
    const row = await screen.findByRole('button', { name: /Pre-driver.*Being entered \+0.5.*0.4.*Pass/ });
    expect(row).toHaveAttribute('aria-current', 'true');
  });

  it('leads back to the check it is typed in', async () => {
    type(WHOLE);
    const { user, router } = open();
    await user.click(await screen.findByRole('button', { name: /Pre-driver/ }));
    expect(router.state.location.search).toBe('?check=output');
  });

  it('shows the last reading while what is typed cannot be read, and never another person’s typing', async () => {
    type(HALF);
    type(WHOLE, 'somebody else');
    open();
    expect(await screen.findByRole('button', { name: /Pre-driver.*Measured \+0.4/ })).toBeVisible();
  });
});

describe('a link into a build', () => {
  it('says plainly that a link leads to no build, with a way back', async () => {
    server.use(
      http.get('*/api/builds/nowhere', () =>
        HttpResponse.json({ status: 404, title: 'Not there', detail: 'x' }, { status: 404 }),
      ),
    );
    renderPage(<StagePage />, {
      at: '/build/nowhere/stages/stage-9',
      path: '/build/:buildId/stages/:stageId',
    });
    expect(await screen.findByText('There is no such build here')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Open my build' })).toHaveAttribute('href', '/build');
    expect(screen.queryByRole('button', { name: 'Try again' })).toBeNull();
  });

  it('says that a link leads to no stage of the build, and opens the current one', async () => {
    server.use(http.get('*/api/builds/build', () => HttpResponse.json(aBuild())));
    renderPage(<StagePage />, { at: '/build/build/stages/gone', path: '/build/:buildId/stages/:stageId' });
    const link = await screen.findByRole('link', { name: 'Open the current stage' });
    expect(link).toHaveAttribute('href', '/build/build/stages/stage-9');
  });
});
