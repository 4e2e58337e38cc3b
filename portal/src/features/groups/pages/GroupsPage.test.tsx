import { configure, screen } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { describe, expect, it, vi } from 'vitest';
import { renderPage } from '../../../testing/render';
import { server } from '../../../testing/server';
import GroupsPage from './GroupsPage';

vi.setConfig({ testTimeout: 30_000 });
configure({ asyncUtilTimeout: 8000 });

const group = (name: string, mine: boolean) => ({
  id: name,
  name,
  about: 'Tuesdays',
  members: [{ personId: 'p', name: 'Bea Thistlewood' }],
  mine,
});
const answer = (items: unknown[]) =>
  server.use(
    http.get('*/api/groups', () => HttpResponse.json({ items, total: items.length, page: 1, perPage: 200 })),
  );

describe('Groups', () => {
  it('shows the own group first, with the people in it', async () => {
    answer([group('Attic', false), group('Bench four', true)]);
    renderPage(<GroupsPage />);
    const headings = await screen.findAllByRole('heading', { level: 2 });
    expect(headings.map(({ textContent }) => textContent)).toEqual(['Bench four', 'Attic']);
    expect(screen.getAllByText('Bea Thistlewood')).toHaveLength(2);
  });

  it('says so to somebody who is in none, and when there are none', async () => {
    answer([group('Attic', false)]);
    const { unmount } = renderPage(<GroupsPage />);
    expect(await screen.findByText('You are not in a group yet')).toBeInTheDocument();
    unmount();
    answer([]);
    renderPage(<GroupsPage />);
    expect(await screen.findByText('No groups yet')).toBeInTheDocument();
  });
});
