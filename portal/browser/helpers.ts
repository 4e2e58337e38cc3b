import { expect, type Page } from '@playwright/test';

const DEMO_PASSWORD = 'larkmoor-demo';

/** The phone the design is drawn for. */
export const PHONE = { width: 390, height: 844 };

/** Signs in through the page, as a person does. `who` is the part before the @: 'member', 'mentor'. */
export async function signIn(page: Page, who: string, next = '/'): Promise<void> {
  await page.goto(`/sign-in?next=${encodeURIComponent(next)}`);
  await page.getByLabel('Email address').fill(who.includes('@') ? who : `${who}@larkmoor.example`);
  await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page).not.toHaveURL(/sign-in/);
  await page.getByRole('navigation', { name: 'Pages' }).waitFor();
}

export async function signOut(page: Page): Promise<void> {
  await page.getByRole('button', { name: /Member|Mentor|Steward|Treasurer|Organiser/ }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page).toHaveURL(/sign-in/);
}
