import AxeBuilder from '@axe-core/playwright';
import { expect, test } from '@playwright/test';
import { PHONE, signIn, signOut } from './helpers';

test('a wrong password says so and keeps the email', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel('Email address').fill('member@larkmoor.example');
  await page.getByLabel('Password', { exact: true }).fill('not the password');
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page.getByRole('alert')).toContainText('do not match');
  await expect(page.getByLabel('Email address')).toHaveValue('member@larkmoor.example');
});

test('signing in leads to the page that asked for it, and signing out ends it', async ({ page }) => {
  await page.goto('/instruments');
  await expect(page).toHaveURL(/sign-in\?next=%2Finstruments/);
  await signIn(page, 'member', '/instruments');
  await expect(page).toHaveURL(/\/instruments$/);
  await signOut(page);
  await page.goto('/instruments');
  await expect(page).toHaveURL(/sign-in/);
});

test('a member is told kindly who the treasury is for', async ({ page }) => {
  await signIn(page, 'member', '/treasury');
  await expect(page.getByText('Treasury is for treasurers.')).toBeVisible();
});

test('G then B leads to My build, and a phone has its five', async ({ page }) => {
  await signIn(page, 'member');
  await page.keyboard.press('g');
  await page.keyboard.press('b');
  await expect(page).toHaveURL(/\/build/);
  await page.setViewportSize(PHONE);
  await page.getByRole('button', { name: 'More' }).click();
  await expect(page.getByRole('link', { name: 'Dues' })).toBeVisible();
});

test('the sign-in page passes the accessibility rules, light and dark', async ({ page }) => {
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme });
    await page.goto('/sign-in');
    await page.getByRole('button', { name: 'Sign in', exact: true }).waitFor();
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations).toEqual([]);
  }
});
