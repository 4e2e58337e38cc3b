import { expect, test, type Browser, type Page } from '@playwright/test';
import { PHONE, signIn } from './helpers';

/** A picture of one pixel, whole and valid. */
const PICTURE = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
  'base64',
);

interface Check {
  id: string;
  kind: string;
  method: string | null;
  title: string;
  target: number | null;
  windowHigh: number | null;
  windowLow: number | null;
  isSettled: boolean;
}

interface Build {
  id: string;
  currentStageId: string;
  stages: {
    id: string;
    position: number;
    name: string;
    state: string;
    cautions: string[];
    checks: Check[];
  }[];
}

const myBuild = async (page: Page): Promise<Build> => {
  const [build] = (await (await page.request.get('/api/builds/mine')).json()) as Build[];
  if (!build) throw new Error('The demo club gives everybody a build.');
  return build;
};

const currentOf = (build: Build) => {
  const stage = build.stages.find(({ id }) => id === build.currentStageId);
  if (!stage) throw new Error('The build has a stage it is on.');
  return stage;
};

/** Volts per division and divisions at which a scope behind a ×10 probe across 50 ohm shows a level. */
function scopeEntry(dbm: number): { setting: string; divisions: string } {
  const volts = Math.sqrt(8 * 50 * 10 ** (dbm / 10) * 1e-3) / 10;
  const settings = [0.002, 0.005, 0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2];
  const setting = settings.find((candidate) => volts / candidate <= 7.9) ?? 2;
  return { setting: String(setting), divisions: (volts / setting).toFixed(2) };
}

/** What the form's fields are to say for a value in the middle of the check's window. */
function typedFor(check: Check): Record<string, string> {
  const { windowLow: low, windowHigh: high } = check;
  const middle = check.target ?? (low !== null && high !== null ? (low + high) / 2 : (high ?? low ?? 0));
  switch (check.method) {
    case 'oscilloscope':
    case 'two-tone-envelope':
    case 'dummy-load': {
      const level = check.method === 'dummy-load' ? 10 * Math.log10(middle * 1000) : middle;
      const { setting, divisions } = scopeEntry(level);
      return { 'Volts per division': setting, 'Divisions, peak to peak': divisions };
    }
    case 'analyzer':
      return { 'Divisions down': (-middle / 10).toFixed(2) };
    case 'harmonic':
      return {
        'Carrier, divisions down': '0.5',
        'The other, divisions down': ((12 - (high ?? 0)) / 10 + 0.5).toFixed(2),
      };
    case 'counter':
      return { Frequency: (middle / 1e6).toFixed(6) };
    case 'dummy-load-tap':
      return { 'Divisions down': ((40 - 10 * Math.log10(middle * 1000)) / 2).toFixed(2) };
    case 'intermodulation':
      return {
        'Tones, divisions down': '0.6',
        'Product, divisions down': (0.6 + (6 - (high ?? 0)) / 10).toFixed(2),
      };
    case 'log-detector':
      return { 'Voltage shown': ((middle + 85) * 0.025).toFixed(3) };
    case 'diode-probe':
      return { 'Direct voltage shown': (Math.sqrt(2 * 50 * 10 ** (middle / 10) * 1e-3) - 0.3).toFixed(2) };
    case 'time-base':
      return {
        'Time per division': '50 ns',
        'Whole cycles': '4',
        'Divisions they take': (4 / (middle * 50e-9)).toFixed(2),
      };
    default:
      return { Shown: String(low !== null && high === null ? low + 4 : middle), 'Read to within': '0.1' };
  }
}

/** On a phone the unit stands beside the number, and what the form filled in may stand in another than is typed here. */
async function fillIn(page: Page, label: string, text: string): Promise<void> {
  const unit = page.getByRole('combobox', { name: `Unit of ${label}` });
  if (label === 'Volts per division' && (await unit.count()) > 0) await unit.selectOption('V/div');
  await page.getByRole('textbox', { name: label, exact: true }).fill(text);
}

async function settle(page: Page, build: Build, stageId: string, check: Check): Promise<void> {
  await page.goto(`/build/${build.id}/stages/${stageId}?check=${check.id}`);
  const open = page.getByRole('region', { name: new RegExp(`^Check \\d+, ${check.title.slice(0, 12)}`) });
  await expect(open).toBeVisible();
  if (check.kind === 'photo') {
    await page
      .locator('input[type=file]')
      .setInputFiles({ name: 'board.png', mimeType: 'image/png', buffer: PICTURE });
    await expect(page.getByAltText('The picture you chose')).toBeVisible();
    await page.getByRole('button', { name: 'Keep this photo' }).click();
    await expect(page.getByText('Photo kept.')).toBeVisible();
    return;
  }
  if (check.kind === 'measure') {
    for (const [label, text] of Object.entries(typedFor(check))) await fillIn(page, label, text);
    for (const tick of await open.getByRole('checkbox').all()) await tick.check();
    await expect(page.getByRole('region', { name: 'Result' }).getByText('Pass')).toBeVisible();
    await page.getByRole('button', { name: 'Keep this reading' }).click();
    await expect(page.getByText(/^Reading kept,/)).toBeVisible();
    return;
  }
  const marked = page.waitForResponse(
    (answer) => answer.url().endsWith('/marks') && answer.request().method() === 'POST',
  );
  await page.getByRole('button', { name: /^(Done|Acknowledge as)/ }).click();
  expect((await marked).status()).toBe(201);
}

const onAPhone = async (browser: Browser): Promise<Page> => {
  const context = await browser.newContext({ viewport: PHONE });
  return context.newPage();
};

test('a member completes a stage on a phone, a mentor signs it off, the next one opens', async ({
  browser,
  page,
}) => {
  test.setTimeout(180_000);
  const phone = await onAPhone(browser);
  await signIn(phone, 'member2', '/build');
  await expect(phone.getByRole('tablist')).toBeVisible();
  const build = await myBuild(phone);
  const stage = currentOf(build);
  const own = stage.checks.filter(
    ({ kind, method, isSettled }) =>
      kind !== "mentor's eyes" && method !== 'gain' && method !== 'carried' && !isSettled,
  );
  for (const check of own) await settle(phone, build, stage.id, check);

  await phone.goto(`/build/${build.id}/stages/${stage.id}`);
  await phone.getByRole('button', { name: 'Send to mentor', exact: true }).click();
  const dialog = phone.getByRole('dialog');
  await dialog.getByLabel(/A word for the mentor/).fill('Stable with the load on and off.');
  await dialog.getByRole('button', { name: 'Send to mentor' }).click();
  await expect(phone.getByText(`Stage ${stage.position} sent to a mentor.`)).toBeVisible();

  await signIn(page, 'mentor', `/review?stage=${build.id}:${stage.id}`);
  await expect(page.getByText('“Stable with the load on and off.”')).toBeVisible();
  // Stages are signed off in order, so whatever of hers was waiting before goes first.
  for (const earlier of build.stages.filter(({ state }) => state === 'with mentor')) {
    await page.goto(`/review?stage=${build.id}:${earlier.id}`);
    await signOff(page, earlier.position);
  }
  await page.goto(`/review?stage=${build.id}:${stage.id}`);
  await signOff(page, stage.position);

  await phone.goto('/build');
  const after = await myBuild(phone);
  expect(after.stages.find(({ id }) => id === stage.id)?.state).toBe('signed off');
  const next = after.stages.find(({ position }) => position === stage.position + 1);
  await expect(
    phone.getByRole('tab', { name: new RegExp(`^Stage ${stage.position}, .*signed off`) }),
  ).toBeVisible();
  await expect(phone.getByRole('tab', { selected: true })).toHaveAccessibleName(
    new RegExp(`^Stage ${next?.position ?? 0}, .*not started`),
  );
});

async function signOff(page: Page, position: number): Promise<void> {
  const decision = page.getByRole('region', { name: 'Your decision' });
  await expect(decision).toBeVisible();
  for (const tick of await decision.getByRole('checkbox').all()) await tick.check();
  await decision
    .getByRole('button', { name: `Sign off stage ${position}` })
    .and(page.locator(':not([aria-disabled])'))
    .click();
  await page.getByRole('dialog').getByRole('button', { name: 'Sign off' }).click();
  await expect(page.getByText(new RegExp(`^Stage ${position} of .* signed off`))).toBeVisible();
}

test('a member at a new check finds it filled in, sees from where, and opens it on the level bench', async ({
  page,
}) => {
  await signIn(page, 'jonty.peverell', '/build');
  const build = await myBuild(page);
  const filter = build.stages.find(({ name }) => name === 'Crystal filter');
  const check = filter?.checks.find(({ method }) => method === 'log-detector');
  await page.goto(`/build/${build.id}/stages/${filter?.id}?check=${check?.id}`);
  const slope = page.getByRole('textbox', { name: 'Slope, each decibel' });
  await expect(slope).toHaveValue('0.025');
  await expect(slope).toHaveAccessibleDescription(/from FR-041/);
  await expect(page.getByText(/From FR-041: .*never above \+15 dBm at its input/)).toBeVisible();
  await expect(page.getByRole('textbox', { name: 'Read to within' })).toHaveAccessibleDescription(
    /from (the plan|your reading of)/,
  );
  // 25 mV each decibel over −85 dBm: 1.5 V is −25 dBm.
  await fillIn(page, 'Voltage shown', '1.5');
  await expect(page.getByText('−25.00').first()).toBeVisible();
  await page.getByRole('link', { name: 'Open in Level bench' }).click();
  await expect(page).toHaveURL(/\/level-bench\/readings\?way=log-detector/);
  await expect(page.getByRole('textbox', { name: 'Voltage shown' })).toHaveValue('1.5');
  await expect(page.getByText('−25.00').first()).toBeVisible();
});

test('what was typed at the bench comes back after the tab was closed', async ({ browser }) => {
  const phone = await onAPhone(browser);
  await signIn(phone, 'member', '/build');
  await fillIn(phone, 'Volts per division', '20');
  await fillIn(phone, 'Divisions, peak to peak', '3.3');
  const address = phone.url();
  await phone.reload();
  await expect(phone.getByRole('textbox', { name: 'Divisions, peak to peak' })).toHaveValue('3.3');
  await expect(phone.getByText(/^Kept from/)).toBeVisible();
  expect(phone.url()).toBe(address);
});
