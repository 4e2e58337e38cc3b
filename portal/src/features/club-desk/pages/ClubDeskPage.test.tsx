import { screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { beforeEach, describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import { server } from '../../../testing/server';
import type { Licence } from '../api/licences';
import ClubDeskPage from './ClubDeskPage';

const GRETA = { id: 'g', name: 'Greta Sorley', roles: ['member', 'mentor', 'organiser'] };
const NOOR = { id: 'n', name: 'Noor Ashby', roles: ['member'] };
const OF_NOOR: Licence = {
  ...{ buildId: 'b-1', builder: { id: 'n', name: 'Noor Ashby' }, planName: 'Larkmoor Twenty', serial: 11 },
  ...{ seenAt: null, seenBy: null },
};

const HOURS = [{ weekday: 6, opensMinute: 600, closesMinute: 1200 }];

function open(at = '/') {
  const licences = [{ ...OF_NOOR }];
  const people = { items: [GRETA, NOOR], total: 2, page: 1, perPage: 200 };
  server.use(
    http.get('*/api/people', () => HttpResponse.json(people)),
    http.get('*/api/club', () =>
      HttpResponse.json({
        name: 'Larkmoor',
        timeZone: 'Europe/London',
        ruleSet: 'IARU-R1',
        openingHours: HOURS,
      }),
    ),
    http.get('*/api/licences', () => HttpResponse.json(licences)),
    http.post('*/api/builds/b-1/licence', () => {
      licences[0] = {
        ...OF_NOOR,
        seenAt: '2026-10-15T19:00:00Z',
        seenBy: { id: 'g', name: 'Greta Sorley' },
      };
      return new HttpResponse(null, { status: 204 });
    }),
  );
  return renderPage(<ClubDeskPage />, { at });
}

describe('the club desk', () => {
  it('lists people with every role they hold, and says whose role is the last', async () => {
    open();
    const row = await screen.findByRole('row', { name: /Greta Sorley/ });
    expect(row).toHaveTextContent('Member, Mentor, Organiser');
    expect(screen.getByText(/Greta Sorley is the only organiser/)).toBeVisible();
  });

  it('shows by a word above the table, which counts, and keeps it in the address', async () => {
    const { user, router } = open();
    await user.click(await screen.findByRole('button', { name: 'Mentors, 1' }));
    expect(screen.queryByText('Noor Ashby')).not.toBeInTheDocument();
    expect(router.state.location.search).toBe('?shown=mentor');
  });

  it('says when nobody has the name in the address', async () => {
    open('/?name=zz');
    expect(await screen.findByText('Nobody of that name here')).toBeVisible();
  });

  it('lets an organiser choose the rules the calculators go by, with the caution beside them', async () => {
    const chosen: unknown[] = [];
    const { user } = open();
    server.use(
      http.put('*/api/club/rules', async ({ request }) => {
        chosen.push(await request.json());
        return new HttpResponse(null, { status: 204 });
      }),
    );
    await user.click(await screen.findByRole('button', { name: /United States/ }));
    await waitFor(() => expect(chosen).toEqual([{ ruleSet: 'US-97' }]));
    expect(screen.getByText(/your licence decide/i)).toBeVisible();
  });

  describe('opening hours', () => {
    const day = async (name: string) => within(await screen.findByRole('group', { name }));
    const save = () => screen.getByRole('button', { name: 'Save the hours' });
    let sent: unknown[];
    beforeEach(() => {
      sent = [];
      server.use(
        http.put('*/api/club/opening-hours', async ({ request }) => {
          sent.push(await request.json());
          return new HttpResponse(null, { status: 204 });
        }),
      );
    });

    it('are shown as they are, and sent as a whole week when one day is changed', async () => {
      const { user } = open();
      await waitFor(async () => expect((await day('Saturday')).getByLabelText('From')).toHaveValue('10:00'));
      await user.type((await day('Thursday')).getByLabelText('From'), '19:00');
      await user.type((await day('Thursday')).getByLabelText('To'), '22.30');
      await user.click(save());
      const thursday = { weekday: 4, opensMinute: 1140, closesMinute: 1350 };
      await waitFor(() => expect(sent).toEqual([{ days: [thursday, ...HOURS] }]));
      expect(await screen.findByText('Opening hours saved.')).toBeVisible();
    });

    it('get words on the field for what cannot be meant, and nothing is sent', async () => {
      const { user } = open();
      const monday = await day('Monday');
      await user.type(monday.getByLabelText('From'), '20:00');
      await user.type(monday.getByLabelText('To'), '8:00');
      await user.type((await day('Tuesday')).getByLabelText('From'), 'noon');
      await user.click(save());
      expect(await monday.findByText('It closes when it opens, or before.')).toBeVisible();
      expect((await day('Tuesday')).getByText('A time of day, such as 19:00.')).toBeVisible();
      expect((await day('Tuesday')).getByText('Until when? Leave both empty when closed.')).toBeVisible();
      expect(sent).toEqual([]);
    });

    it('are kept on the device while they are not saved', async () => {
      const { user, unmount } = open();
      await user.type((await day('Sunday')).getByLabelText('From'), '11:');
      unmount();
      open();
      expect((await day('Sunday')).getByLabelText('From')).toHaveValue('11:');
    });
  });

  it('asks before it says a licence was seen, and then names who saw it', async () => {
    const { user } = open();
    await user.click(await screen.findByRole('button', { name: 'Licence of Noor Ashby seen' }));
    const dialog = await screen.findByRole('dialog');
    await user.click(within(dialog).getByRole('button', { name: 'Licence seen' }));
    await waitFor(() =>
      expect(screen.getByRole('row', { name: /Noor Ashby/ })).toHaveTextContent(
        'Thu 15 Oct, by Greta Sorley',
      ),
    );
    expect(screen.getByText('Licence of Noor Ashby seen.')).toBeVisible();
  });
});
