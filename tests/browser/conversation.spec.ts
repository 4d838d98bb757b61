import { expect, test } from '@playwright/test';
import { openSubmission, person } from './people';

test('reviewer and scheduler talk about a row, each seeing the other without a reload', async ({
  browser,
}) => {
  const reviewer = await person(browser, 'reviewer');
  const scheduler = await person(browser, 'scheduler');
  await openSubmission(reviewer.page, /Upper Tarnbeck pumping station, Rev 0/);
  const address = reviewer.page.url();
  await scheduler.page.goto(address);
  await expect(scheduler.page.getByLabel(/Write a comment/)).toBeVisible();
  const question = `Which link falls away? ${Date.now()}`;
  const secret = `Ask the site first. ${Date.now()}`;
  const answer = `The wait for the falsework. ${Date.now()}`;

  await reviewer.page.getByLabel(/Write a comment/).fill(secret);
  await reviewer.page.getByRole('radio', { name: /Inside/ }).check();
  await reviewer.page.getByRole('button', { name: 'Add the comment' }).click();
  await expect(reviewer.page.getByRole('paragraph').filter({ hasText: secret })).toBeVisible();

  await reviewer.page.getByLabel(/Write a comment/).fill(question);
  await reviewer.page.getByRole('radio', { name: /Shared/ }).check();
  await reviewer.page.getByRole('button', { name: 'Add the comment' }).click();
  await expect(scheduler.page.getByText(question)).toBeVisible({ timeout: 5000 });
  await expect(scheduler.page.getByText(secret)).toHaveCount(0);

  await scheduler.page.getByLabel(/Write a comment/).fill(answer);
  await scheduler.page.getByRole('button', { name: 'Add the comment' }).click();
  await expect(reviewer.page.getByText(answer)).toBeVisible({ timeout: 5000 });
  await scheduler.page.reload();
  await expect(scheduler.page.getByRole('paragraph').filter({ hasText: answer })).toBeVisible();
  await expect(scheduler.page.getByText(secret)).toHaveCount(0);
  await reviewer.context.close();
  await scheduler.context.close();
});

test('a reviewer is offered no adopting', async ({ browser }) => {
  const { page, context } = await person(browser, 'reviewer');
  await openSubmission(page, /Upper Tarnbeck pumping station, Rev 0/);
  await expect(page.getByText(/Your role reads the fixes and comments on them/)).toBeVisible();
  await expect(page.getByRole('button', { name: /^Adopt/ })).toHaveCount(0);
  await context.close();
});
