// Pictures of pages, to lay beside the design.
// node portal/browser/pictures.mjs member@larkmoor.example /tmp/pictures / /build /dues
// FERRITE_BASE_URL is where the portal runs, FERRITE_CHROMIUM the browser.
import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import { chromium } from '@playwright/test';

const [who, folder, ...routes] = process.argv.slice(2);
if (!who || !folder || routes.length === 0) {
  console.error('Usage: node portal/browser/pictures.mjs <email> <folder> <route> [<route> …]');
  process.exit(2);
}

const base = process.env.FERRITE_BASE_URL ?? 'http://127.0.0.1:4780';
const SIZES = [
  { name: '1440', width: 1440, height: 900 },
  { name: '390', width: 390, height: 844 },
];

const nameOf = (route) => route.replace(/\W+/g, '-').replace(/^-|-$/g, '') || 'tonight';

async function signIn(context) {
  const answer = await context.request.post(`${base}/api/auth/sign-in`, {
    headers: { origin: base },
    data: { email: who, password: process.env.FERRITE_PASSWORD ?? 'larkmoor-demo' },
  });
  if (!answer.ok()) throw new Error(`Sign-in of ${who} answered ${answer.status()}: ${await answer.text()}`);
}

async function take(browser, size, colorScheme) {
  const context = await browser.newContext({
    viewport: { width: size.width, height: size.height },
    colorScheme,
    locale: 'en-GB',
    timezoneId: 'Europe/London',
  });
  await signIn(context);
  const page = await context.newPage();
  page.on('pageerror', (error) => console.error(`  page error: ${error.message}`));
  page.on('console', (line) => line.type() === 'error' && console.error(`  console: ${line.text()}`));
  for (const route of routes) {
    await page.goto(base + route, { waitUntil: 'networkidle' });
    const file = path.join(folder, `${nameOf(route)}-${size.name}-${colorScheme}.png`);
    await page.screenshot({ path: file, fullPage: true });
    const wide = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    console.log(wide > 0 ? `${file}  ${wide} px too wide` : file);
  }
  await context.close();
}

await mkdir(folder, { recursive: true });
const browser = await chromium.launch({
  executablePath: process.env.FERRITE_CHROMIUM ?? '/usr/bin/chromium',
});
for (const size of SIZES) for (const scheme of ['light', 'dark']) await take(browser, size, scheme);
await browser.close();
