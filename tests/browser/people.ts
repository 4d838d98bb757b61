import { expect, type Browser, type BrowserContext, type Page } from '@playwright/test';

export type Account = 'administrator' | 'analyst' | 'reviewer' | 'scheduler' | 'scheduler2' | 'scheduler3';

function password(): string {
  const given = process.env.PLUMBROW_TEST_PASSWORD;
  if (!given) throw new Error('PLUMBROW_TEST_PASSWORD says with what the demo accounts sign in.');
  return given;
}

/** Goes through the sign-in page as a person would. */
export async function signIn(page: Page, account: Account): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill(`${account}@demo.example`);
  await page.getByLabel('Password').fill(password());
  await page.keyboard.press('Enter');
  await page.waitForURL(/\/demo\b/);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
}

/** A person with a browser of their own. */
export async function person(
  browser: Browser,
  account: Account,
): Promise<{ page: Page; context: BrowserContext }> {
  const context = await browser.newContext();
  const page = await context.newPage();
  await signIn(page, account);
  return { page, context };
}

/** Opens a submission of the demo office from the desk. */
export async function openSubmission(page: Page, name: RegExp): Promise<void> {
  await page.goto('/demo');
  await page.getByRole('link', { name }).first().click();
  await expect(page.getByRole('navigation', { name: 'Places of this submission' })).toBeVisible();
}

/** Complaints of the browser itself: errors of scripts, and what the content security policy held back. */
export function complaints(page: Page): string[] {
  const heard: string[] = [];
  page.on('pageerror', (error) => heard.push(error.message));
  page.on('console', (message) => {
    if (message.type() === 'error' && !/Failed to load resource/.test(message.text()))
      heard.push(message.text());
  });
  return heard;
}
