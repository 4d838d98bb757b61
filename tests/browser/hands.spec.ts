import { expect, test, type Page } from '@playwright/test';
import { z } from 'zod';
import { DEMO, signIn } from './support/office';

const projects = z.object({
  items: z.array(z.object({ name: z.string(), latest: z.object({ id: z.string() }).nullable() })),
});

async function openPumpingStation(page: Page): Promise<void> {
  const { items } = projects.parse(await (await page.request.get(`/api/offices/${DEMO}/projects`)).json());
  const submission = items.find(({ name }) => name === 'Upper Tarnbeck pumping station')?.latest?.id ?? '';
  await page.goto(`/${DEMO}/submissions/${submission}`);
  await expect(page.getByRole('row', { selected: true })).toBeVisible();
}

test('a dialog that a key opened gives the focus back to where it was', async ({ page }) => {
  await signIn(page, 'analyst');
  const link = page.getByRole('link', { name: 'Projects', exact: true });
  for (const key of ['?', 'f']) {
    await link.focus();
    await page.keyboard.press(key);
    await expect(page.getByRole('dialog')).toBeVisible();
    await page.keyboard.press('Escape');
    await expect(page.getByRole('dialog')).toHaveCount(0);
    await expect(link).toBeFocused();
  }
});

test('without a connection it is said that nothing was sent, and what was typed stays', async ({
  page,
  context,
}) => {
  await signIn(page, 'analyst');
  await openPumpingStation(page);
  await context.setOffline(true);
  await page.getByRole('button', { name: 'Adopt', exact: true }).click();
  await expect(page.getByRole('alert').filter({ hasText: /could not be reached/ })).toBeVisible();

  await page.getByLabel(/Write a comment/).fill('Typed on a train');
  await page.getByRole('button', { name: 'Add the comment' }).click();
  await expect(page.getByRole('alert').filter({ hasText: /What you wrote is still here/ })).toBeVisible();
  await expect(page.getByLabel(/Write a comment/)).toHaveValue('Typed on a train');

  await context.setOffline(false);
  await page.reload();
  await expect(page.getByText('Nothing is corrected yet.')).toBeVisible();
});
