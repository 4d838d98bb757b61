import { expect, type Page } from '@playwright/test';

/** The slug of the demo office. */
export const DEMO = 'demo';

/** Signs in as one of the demo office's people: analyst, reviewer, scheduler, administrator … */
export async function signIn(page: Page, who: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill(`${who}@demo.example`);
  await page.getByLabel('Password').fill(process.env.PLUMBROW_TEST_PASSWORD ?? '');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(new RegExp(`/${DEMO}$`));
}
