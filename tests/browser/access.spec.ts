import { expect, test } from '@playwright/test';
import { openSubmission, person, signIn } from './people';

test('without a session every page leads to signing in, and back to where one wanted to go', async ({
  page,
}) => {
  await page.goto('/demo/projects');
  await expect(page).toHaveURL(/\/sign-in/);
});

test('a wrong password gets one sentence and keeps the address', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill('analyst@demo.example');
  await page.getByLabel('Password').fill('not the password');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('alert').filter({ hasText: /\w/ })).toBeVisible();
  await expect(page).toHaveURL(/\/sign-in/);
  await expect(page.getByLabel('E-mail address')).toHaveValue('analyst@demo.example');
});

test('a scheduler sees nothing of another contractor, by page or by call', async ({ browser }) => {
  const analyst = await person(browser, 'analyst');
  await openSubmission(analyst.page, /Millrace intake screens, Rev 0/);
  const foreign = new URL(analyst.page.url());
  const scheduler = await person(browser, 'scheduler');
  await expect(scheduler.page.getByText('Millrace')).toHaveCount(0);
  await expect(scheduler.page.getByText('Oriel Pumpworks')).toHaveCount(0);

  await scheduler.page.goto(foreign.pathname);
  await expect(
    scheduler.page.getByText(/There is no such submission|not found|not open to you/i).first(),
  ).toBeVisible();
  for (const part of [
    '',
    '/findings',
    '/activities',
    '/analysis',
    '/workbook?state=received',
    '/comments',
    '/record',
  ]) {
    const answer = await scheduler.page.request.get(`/api/offices${foreign.pathname}${part}`);
    expect(answer.status(), part).toBe(404);
    expect(answer.headers()['content-type']).toContain('application/problem+json');
  }
  await analyst.context.close();
  await scheduler.context.close();
});

test('an administrator adds a person, whose link sets a password once', async ({ browser }) => {
  const administrator = await person(browser, 'administrator');
  const { page } = administrator;
  await page.getByRole('link', { name: 'People' }).click();
  const email = `new.${Date.now()}@demo.example`;
  await page.getByLabel('Name', { exact: true }).fill('Odile Marrs');
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Role').selectOption('reviewer');
  await page.getByRole('button', { name: 'Add and make the link' }).click();
  const link =
    (
      await page
        .getByRole('dialog')
        .getByText(/\/invitation\//)
        .textContent()
    )?.trim() ?? '';
  await page.getByRole('button', { name: 'Done' }).click();

  const context = await browser.newContext();
  const theirs = await context.newPage();
  await theirs.goto(link);
  await theirs.getByLabel('Password', { exact: true }).fill('plumb lines hang straight');
  await theirs.keyboard.press('Enter');
  await theirs.waitForURL(/\/(demo|sign-in)/);
  if (theirs.url().includes('/sign-in')) {
    await theirs.getByLabel('E-mail address').fill(email);
    await theirs.getByLabel('Password').fill('plumb lines hang straight');
    await theirs.keyboard.press('Enter');
  }
  await expect(theirs.getByRole('heading', { level: 1, name: 'Desk' })).toBeVisible();

  const again = await context.newPage();
  await again.goto(link);
  await expect(again.getByText(/used|no longer|not hold|new one/i).first()).toBeVisible();
  await context.close();
  await administrator.context.close();
});

test('signing out ends it', async ({ page }) => {
  await signIn(page, 'reviewer');
  await page.getByRole('button', { name: /account of/ }).click();
  await page.getByRole('menuitem', { name: /Sign out/ }).click();
  await expect(page).toHaveURL(/\/sign-in/);
  await page.goto('/demo');
  await expect(page).toHaveURL(/\/sign-in/);
});
