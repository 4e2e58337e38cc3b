import { screen } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import { server } from '../../../testing/server';
import YouPage from './YouPage';

const CLEARANCE = {
  id: 'c',
  kindId: 'k',
  kindName: 'Spectrum analyzer',
  grantedOn: '2026-09-01',
  grantedBy: 'Oona Reyes',
};
const mine = (...clearances: object[]) =>
  server.use(http.get('*/api/clearances/mine', () => HttpResponse.json(clearances)));

it('says what the person is cleared on, and until when', async () => {
  mine({ ...CLEARANCE, until: '2027-03-09', holds: true });
  renderPage(<YouPage />);
  expect(await screen.findByText('Until 9 Mar 2027')).toBeVisible();
});

it('sends somebody whose clearance has run out to a steward', async () => {
  mine({ ...CLEARANCE, until: '2026-09-09', holds: false });
  renderPage(<YouPage />);
  expect(await screen.findByText('Has run out. Ask a steward.')).toBeVisible();
});

it('says where clearances come from when there is none', async () => {
  mine();
  renderPage(<YouPage />);
  expect(await screen.findByText('No clearances yet')).toBeVisible();
});
