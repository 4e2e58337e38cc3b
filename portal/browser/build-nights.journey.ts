import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Browser, type Page } from '@playwright/test';
import { signIn } from './helpers';

const DAY_MS = 86_400_000;
const MAIL = process.env.FERRITE_MAIL_URL;

/** A Tuesday about ten weeks ahead, clear of everything the demo club has planned. */
function distantTuesday(): string {
  const day = new Date(Date.now() + 70 * DAY_MS);
  while (day.getUTCDay() !== 2) day.setUTCDate(day.getUTCDate() + 1);
  return day.toISOString().slice(0, 10);
}

const weeksLater = (day: string, weeks: number): string =>
  new Date(Date.parse(`${day}T00:00:00Z`) + weeks * 7 * DAY_MS).toISOString().slice(0, 10);

async function as(browser: Browser, who: string, next: string): Promise<Page> {
  const page = await (await browser.newContext()).newPage();
  await signIn(page, who, next);
  return page;
}

async function choose(page: Page, field: string, options: string[]): Promise<void> {
  await page.getByLabel(field).click();
  for (const name of options) await page.getByRole('option', { name, exact: true }).click();
  await page.keyboard.press('Escape');
}

interface Typed {
  name: string;
  first: string;
  places: string;
  bench: string;
}

async function typePlan(page: Page, { name, first, places, bench }: Typed): Promise<void> {
  await page.getByLabel('Name').fill(name);
  await page.getByLabel(/^(First|Day)$/).fill(first);
  await page.getByLabel('From').fill('19:30');
  await page.getByLabel('To', { exact: true }).fill('21:30');
  await page.getByLabel('Places').fill(places);
  await choose(page, 'Benches', [bench]);
}

test('a mentor plans a series around a clash; members come, wait, move up and hear of it', async ({
  browser,
}) => {
  test.setTimeout(120_000);
  const first = distantTuesday();
  const stamp = Date.now().toString(36).slice(-5);
  const [taken, series] = [`Valve talk ${stamp}`, `Winding ${stamp}`];
  const mentor = await as(browser, 'mentor', `/build-nights?month=${first.slice(0, 7)}`);

  await test.step('one evening is taken by a single night', async () => {
    await mentor.getByRole('button', { name: 'Schedule a night' }).click();
    await typePlan(mentor, { name: taken, first: weeksLater(first, 2), places: '4', bench: 'Bench 2' });
    await mentor.getByRole('button', { name: 'Schedule the night', exact: true }).click();
    await expect(mentor.getByRole('status').filter({ hasText: 'is scheduled' })).toBeVisible();
  });

  await test.step('the series shows its clash while it is typed, and what was typed survives a reload', async () => {
    await mentor.getByRole('button', { name: 'Plan a series' }).click();
    await typePlan(mentor, { name: series, first, places: '1', bench: 'Bench 2' });
    const dates = mentor.getByRole('region', { name: 'Dates' });
    await expect(dates.getByText('Clash', { exact: true })).toHaveCount(1);
    await expect(dates.getByText(`Bench 2 is taken by ${taken}, 19:30 to 21:30.`)).toBeVisible();
    await mentor.reload();
    await expect(mentor.getByLabel('Name')).toHaveValue(series);
    await expect(dates.getByText('Clear', { exact: true })).toHaveCount(5);
    await expect(mentor.getByRole('button', { name: 'Schedule six, one clashes' })).toBeVisible();
    const { violations } = await new AxeBuilder({ page: mentor }).analyze();
    expect(violations.map(({ id, nodes }) => [id, nodes.map(({ html }) => html)])).toEqual([]);
  });

  await test.step('the possible five are scheduled with one press', async () => {
    await mentor.getByRole('button', { name: 'Schedule five' }).click();
    await expect(mentor.getByRole('status').filter({ hasText: 'Five nights scheduled' })).toBeVisible();
    await expect(mentor.getByText(`${series}, night 1 of 5`)).toBeVisible();
  });

  const night = new URL(mentor.url()).searchParams.get('night');
  const place = `/build-nights?month=${first.slice(0, 7)}&night=${night}`;
  const member = await as(browser, 'member', place);
  const second = await as(browser, 'member2', place);

  await test.step('a member comes, the next one waits', async () => {
    await member.getByRole('button', { name: 'I am coming' }).click();
    await expect(member.getByText('1 of 1 place')).toBeVisible();
    await second.reload();
    await second.getByRole('button', { name: 'Full, wait for a place' }).click();
    await expect(second.getByText('You are first in line.')).toBeVisible();
  });

  await test.step('who waits moves up when somebody cannot come', async () => {
    await member.getByRole('button', { name: 'I cannot come' }).click();
    await expect(member.getByRole('button', { name: 'Full, wait for a place' })).toBeVisible();
    await second.reload();
    await expect(second.getByText('Coming', { exact: true }).first()).toBeVisible();
    await expect(second.getByRole('button', { name: 'I cannot come' })).toBeVisible();
  });

  await test.step('and hears of it by mail', async () => {
    expect(MAIL, 'FERRITE_MAIL_URL says where the mail arrives').toBeTruthy();
    await expect
      .poll(
        async () => {
          const messages = (await (await fetch(`${MAIL}/messages`)).json()) as {
            to: string[];
            subject: string;
          }[];
          const own = messages.filter(({ to }) => to.includes('member2@larkmoor.example'));
          return own.filter(({ subject }) => subject === `You have a place: ${series}, night 1`).length;
        },
        { timeout: 15_000 },
      )
      .toBe(1);
  });

  await test.step('a night is cancelled with a word, and the others with it, so that the story can be told again', async () => {
    await mentor.goto(place);
    await mentor.getByRole('button', { name: 'Cancel the night' }).click();
    await mentor.getByLabel('Why, in a word to everybody').fill('The hall is let.');
    const cancelled = mentor.waitForResponse((answer) => answer.url().endsWith('/cancel') && answer.ok());
    await mentor.getByRole('dialog').getByRole('button', { name: 'Cancel the night' }).click();
    await cancelled;
    await expect(mentor.getByText('Cancelled. The hall is let.')).toBeVisible();
    const span = { from: `${first}T00:00:00Z`, to: `${weeksLater(first, 7)}T00:00:00Z` };
    const { items } = (await (await mentor.request.get('/api/build-nights', { params: span })).json()) as {
      items: { id: string; title: string; cancelledAt: string | null }[];
    };
    const left = items.filter((one) => [taken, series].includes(one.title) && one.cancelledAt === null);
    expect(left).toHaveLength(5);
    for (const { id } of left) {
      await mentor.request.post(`/api/build-nights/${id}/cancel`, { data: { reason: 'The hall is let.' } });
    }
  });
});
