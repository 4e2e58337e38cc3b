import { expect, test, type Page } from '@playwright/test';
import { signIn } from './helpers';

/** Published test number of the card service. */
const PAYS = '4242 4242 4242 4242';

/** '£1,234.50' or '−£6.50' as minor units. */
const minorOf = (text: string): number => Number(text.replaceAll(/[£,.]/g, '').replace('−', '-'));
const decimal = (minor: number): string => (minor / 100).toFixed(2);

async function figure(page: Page, name: string): Promise<number> {
  const text = await page.getByRole('group', { name, exact: true }).textContent();
  return minorOf((text ?? '').replace(name, ''));
}

test('a member pays by card and sees it paid, with the receipt', async ({ page }) => {
  await signIn(page, 'member', '/dues');
  const mine = await page.request.get('/api/invoices/mine');
  const owed = ((await mine.json()) as { id: string; openMinor: number }[]).find(
    ({ openMinor }) => openMinor > 0,
  );
  await page.goto(`/dues?invoice=${owed?.id ?? ''}`);
  const pay = page.getByRole('button', { name: /^Pay £[\d,.]+ by card$/ });
  const amount = /£([\d,.]+)/.exec((await pay.textContent()) ?? '')?.[1] ?? '';
  await pay.click();
  await page.getByLabel('Card number').fill(PAYS);
  await page.getByRole('button', { name: 'Pay', exact: true }).click();
  await expect(page).toHaveURL(/\/dues\?/);
  await expect(page.getByText('Paid by card.')).toBeVisible();
  await page.getByRole('button', { name: 'See the receipt' }).click();
  await expect(page.getByRole('heading', { name: /^Receipt R-\d{4}$/ })).toBeVisible();
  await expect(page.getByText('By card, on the club’s payment page')).toBeVisible();
  await expect(page.getByRole('table', { name: 'Paid' }).getByRole('row').nth(1)).toContainText(amount);
});

test('a treasurer takes cash, imports a statement, and settles it to nothing', async ({ page }) => {
  await signIn(page, 'treasurer', '/treasury');
  await test.step('takes a payment in cash', async () => {
    const open = page.getByRole('table', { name: 'Open dues' }).getByRole('row').nth(1);
    const number = (await open.getByText(/^[A-Z]-\d{4}$/).textContent()) ?? '';
    await open.getByRole('button', { name: `Take a payment for ${number}` }).click();
    const drawer = page.getByRole('complementary', { name: 'Take a payment' });
    await expect(drawer.getByRole('checkbox', { name: new RegExp(number) })).toBeChecked();
    await drawer.getByRole('button', { name: 'Take the payment' }).click();
    await expect(page.getByText(/taken, R-\d{4}\./)).toBeVisible();
    await expect(page.getByRole('button', { name: `Take a payment for ${number}` })).toHaveCount(0);
  });

  await settleEarlier(page);
  const [invoice] = await openInvoices(page);
  const last = await lastStatement(page);
  const today = new Date().toISOString().slice(0, 10);
  const opening = last?.closingMinor ?? 100_000;
  const csv = [
    'date,description,amount,balance',
    `${today},FPI ${invoice.referencePrinted},${decimal(invoice.openMinor)},${decimal(opening + invoice.openMinor)}`,
    `${today},ACCOUNT CHARGE,-6.50,${decimal(opening + invoice.openMinor - 650)}`,
  ].join('\n');

  await test.step('imports a statement whose reference matches by itself', async () => {
    await page.getByRole('button', { name: 'Import a statement' }).click();
    await page
      .getByLabel('Statement file')
      .setInputFiles({ name: 'journey.csv', mimeType: 'text/csv', buffer: Buffer.from(csv) });
    await expect(page).toHaveURL(/\/treasury\/reconcile\//);
    await expect(page.getByText('1 of 2 matched')).toBeVisible();
  });

  await test.step('settles the other line by hand, and the difference moves by it', async () => {
    const before = await figure(page, 'Difference');
    const charge = page
      .getByRole('list', { name: 'Lines of the statement' })
      .getByRole('button', { name: /ACCOUNT CHARGE/ });
    await charge.click();
    await page.getByLabel('Or it pays no invoice: settle it against').click();
    await page.getByRole('option', { name: /5000/ }).click();
    await page.getByRole('button', { name: 'Accept match', exact: true }).click();
    await expect(page.getByText('2 of 2 matched')).toBeVisible();
    expect(before).toBe(-650);
    await expect(page.getByRole('group', { name: 'Difference' })).toContainText('£0.00');
  });
});

interface OpenInvoice {
  referencePrinted: string;
  openMinor: number;
}

async function openInvoices(page: Page): Promise<[OpenInvoice, ...OpenInvoice[]]> {
  const answer = await page.request.get('/api/invoices?state=open');
  return ((await answer.json()) as { items: [OpenInvoice, ...OpenInvoice[]] }).items;
}

async function lastStatement(page: Page): Promise<{ closingMinor: number } | undefined> {
  const answer = await page.request.get('/api/reconciliation/statements?perPage=1');
  return ((await answer.json()) as { items: { closingMinor: number }[] }).items[0];
}

/** Whatever earlier statements have left, so that this one ends at nothing. */
async function settleEarlier(page: Page): Promise<void> {
  const answer = await page.request.get('/api/reconciliation/statements?perPage=200');
  const { items } = (await answer.json()) as { items: { id: string }[] };
  for (const { id } of items) {
    const detail = await page.request.get(`/api/reconciliation/statements/${id}`);
    const { lines } = (await detail.json()) as { lines: { id: string; state: string }[] };
    for (const line of lines.filter(({ state }) => state === 'no match')) {
      const data = { accountCode: '5900', note: 'Settled by the journey' };
      expect((await page.request.post(`/api/reconciliation/lines/${line.id}/match`, { data })).status()).toBe(
        200,
      );
    }
  }
}
