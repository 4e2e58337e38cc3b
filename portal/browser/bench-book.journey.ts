import { expect, test, type Page } from '@playwright/test';
import { signIn } from './helpers';

/**
 * A Wednesday, on which the workshop is open, far enough ahead that nothing else is booked there, and near enough that
 * the analyzer is still calibrated.
 */
const DAY = wednesdayAfter(new Date(Date.now() + 54 * 24 * 3_600_000));

function wednesdayAfter(day: Date): string {
  const ahead = (3 - day.getUTCDay() + 7) % 7;
  return new Date(day.getTime() + ahead * 24 * 3_600_000).toISOString().slice(0, 10);
}

async function fill(page: Page, from: string, to: string): Promise<void> {
  await page.getByRole('button', { name: 'Book a bench' }).click();
  await page.getByRole('combobox', { name: 'Bench' }).click();
  await page.getByRole('option', { name: 'Bench 3' }).click();
  await page.getByLabel('Day', { exact: true }).fill(DAY);
  await page.getByLabel('From', { exact: true }).fill(from);
  await page.getByLabel('To', { exact: true }).fill(to);
  const analyzer = page.getByRole('checkbox', { name: /FR-032/ });
  if (!(await analyzer.isVisible())) await page.getByRole('button', { name: /more instrument/ }).click();
  await analyzer.check();
}

test('a member books bench and analyzer; the next one is told who has them, takes a free time, and cancels', async ({
  browser,
}) => {
  const first = await (await browser.newContext()).newPage();
  await signIn(first, 'member', `/bench-book?day=${DAY}&show=Bench%203,FR-032`);
  await fill(first, '14:00', '16:30');
  await first.getByRole('button', { name: 'Book 14:00 to 16:30' }).click();
  await expect(first.getByText(/^Booked Bench 3 and FR-032/)).toBeVisible();
  await expect(first.getByTitle('You, 14:00 to 16:30')).toHaveCount(2);
  await first.getByRole('button', { name: 'Table' }).click();
  await expect(first.getByRole('row', { name: /14:00 to 16:30.*You.*Bench 3/ })).toBeVisible();

  const second = await (await browser.newContext()).newPage();
  await signIn(second, 'member2', `/bench-book?day=${DAY}&show=Bench%203,FR-032`);
  await expect(second.getByTitle('Tamsin Ardley, 14:00 to 16:30')).toHaveCount(2);
  await fill(second, '15:00', '17:00');
  await second.getByRole('button', { name: 'Book 15:00 to 17:00' }).click();
  const refusal = second.getByRole('alert');
  await expect(refusal).toContainText('The booking was not made.');
  await expect(refusal).toContainText('Bench 3 went to Tamsin Ardley');
  await expect(second.getByLabel('From', { exact: true })).toHaveValue('15:00');
  await refusal.getByRole('button', { name: /16:30 to 18:30/ }).click();
  await expect(second.getByText(/^Booked Bench 3 and FR-032.*16:30 to 18:30/)).toBeVisible();

  await second.getByRole('button', { name: 'Table' }).click();
  await second.getByRole('button', { name: /16:30 to 18:30/ }).click();
  await second.getByRole('button', { name: 'Cancel the booking' }).click();
  await expect(second.getByText(/^Cancelled/)).toBeVisible();
  await expect(second.getByRole('button', { name: /16:30 to 18:30/ })).toHaveCount(0);

  await first.getByRole('button', { name: /14:00 to 16:30/ }).click();
  await first.getByRole('button', { name: 'Cancel the booking' }).click();
  await expect(first.getByText(/^Cancelled/)).toBeVisible();
});
