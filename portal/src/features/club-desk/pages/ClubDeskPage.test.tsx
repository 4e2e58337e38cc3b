import { screen } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import { server } from '../../../testing/server';
import ClubDeskPage from './ClubDeskPage';

const GRETA = { id: 'g', name: 'Greta Sorley', roles: ['member', 'mentor', 'organiser'] };

it('lists people with every role they hold', async () => {
  server.use(
    http.get('*/api/people', () => HttpResponse.json({ items: [GRETA], total: 1, page: 1, perPage: 200 })),
  );
  renderPage(<ClubDeskPage />);
  expect(await screen.findByText('Member, mentor and organiser')).toBeVisible();
});

it('asks the server for the name in the address, and says when nobody has it', async () => {
  const asked: (string | null)[] = [];
  server.use(
    http.get('*/api/people', ({ request }) => {
      asked.push(new URL(request.url).searchParams.get('name'));
      return HttpResponse.json({ items: [], total: 0, page: 1, perPage: 200 });
    }),
  );
  renderPage(<ClubDeskPage />, { at: '/?name=zz' });
  expect(await screen.findByText('Nobody of that name')).toBeVisible();
  expect(asked).toContain('zz');
});
