import { readFile } from 'node:fs/promises';
import { expect, test } from '@playwright/test';
import { complaints, person, signIn } from './people';
import { slipwayFile } from './files';

test('a workbook goes in; findings, the recomputed path and a corrected workbook come out', async ({
  page,
  browser,
}) => {
  const heard = complaints(page);
  await signIn(page, 'analyst');

  await test.step('a project is made', async () => {
    await page.getByRole('link', { name: 'New project' }).click();
    await page.getByLabel('Contractor').selectOption({ label: 'Hollin & Pike Civils' });
    await page.getByLabel('Code').fill(`SLIP-${Date.now()}`);
    await page.getByLabel('Name', { exact: true }).fill('Slipway renewal');
    await page.getByLabel('Start', { exact: true }).fill('2027-04-05');
    await page.getByLabel(/^Target finish/).fill('2027-06-04');
    await page.getByRole('button', { name: 'Make the project' }).click();
    await expect(page.getByRole('heading', { name: /Slipway renewal/ }).first()).toBeVisible();
  });

  await test.step('the workbook is dropped, and what was sure goes straight through', async () => {
    await page.locator('input[type=file]').setInputFiles(await slipwayFile());
    await page.waitForURL(/\/submissions\//);
    await expect(page.getByText('11 rows read = 9 activities + 2 headings + 0 refused')).toBeVisible();
  });

  await test.step('the loop is said to block, with the figures that the fixes would give', async () => {
    await expect(page.getByText(/cannot be computed/).first()).toBeVisible();
    await expect(page.getByText('Not adopted.')).toBeVisible();
    await expect(page.getByText('K3 waits for K5, K5 for K4, and K4 for K3.').first()).toBeVisible();
  });

  await test.step('each fix is adopted by keyboard, and the head is computed anew', async () => {
    for (
      let left = 6;
      left > 0 &&
      (await page
        .getByRole('button', { name: /^Adopt/ })
        .first()
        .isVisible());
      left -= 1
    ) {
      const adopted = page.waitForResponse(
        (answer) => answer.url().endsWith('/corrections') && answer.request().method() === 'POST',
      );
      await page.keyboard.press('a');
      expect((await adopted).status()).toBe(201);
      await page.keyboard.press('j');
    }
    await expect(page.getByText('Expected finish').first()).toBeVisible();
    await expect(page.getByText(/cannot be computed: /)).toHaveCount(0);
  });

  await test.step('undo brings the last one back', async () => {
    const undone = page.waitForResponse((answer) => answer.request().method() === 'DELETE');
    await page.keyboard.press('z');
    expect((await undone).ok()).toBe(true);
    const again = page.waitForResponse(
      (answer) => answer.url().endsWith('/corrections') && answer.request().method() === 'POST',
    );
    await page
      .getByRole('button', { name: /^Adopt/ })
      .first()
      .click();
    expect((await again).status()).toBe(201);
  });

  await test.step('the path is shown as a chain, over time and as a table', async () => {
    await page.getByRole('link', { name: /^Path/ }).click();
    await expect(page.getByRole('heading', { name: /activities set the finish/ })).toBeVisible();
    await expect(page.getByRole('region', { name: 'Time chart' })).toBeVisible();
    await page.getByRole('button', { name: 'Table' }).click();
    await expect(page.getByRole('columnheader', { name: 'Free float' })).toBeVisible();
  });

  await test.step('the chance is answered with its worked lines', async () => {
    await page.getByRole('link', { name: /^Confidence/ }).click();
    await expect(page.getByText('z = (x − expected) / deviation')).toBeVisible();
    await page.getByRole('button', { name: 'for a confidence' }).click();
    await page.getByLabel(/kept with a confidence/).fill('80');
    await page.keyboard.press('Enter');
    await expect(page.getByText('x = expected + z × deviation, with Φ(z) = confidence')).toBeVisible();
  });

  const corrected = await test.step('the contractor’s scheduler takes the corrected workbook', async () => {
    const { page: theirs, context } = await person(browser, 'scheduler');
    await theirs.goto(page.url().replace(/\/confidence.*/, ''));
    const download = theirs.waitForEvent('download');
    await theirs.getByRole('link', { name: 'Corrected workbook' }).click();
    const file = await readFile(await (await download).path());
    await context.close();
    return file;
  });

  await test.step('handed in again, it has none of the corrected findings', async () => {
    await page.goto(page.url().replace(/\/submissions\/.*/, '/projects'));
    await page
      .getByRole('link', { name: /Slipway renewal/ })
      .first()
      .click();
    await page
      .locator('input[type=file]')
      .setInputFiles({ ...(await slipwayFile('slipway-rev-1.xlsx')), buffer: corrected });
    await page.waitForURL(/\/submissions\//);
    await expect(page.getByRole('heading', { level: 1, name: /Slipway renewal, Rev 1/ })).toBeVisible();
    await expect(page.getByText(/waits for K5/)).toHaveCount(0);
    await expect(page.getByRole('button', { name: /blocks/ })).toHaveCount(0);
    await expect(page.getByRole('button', { name: /distorts/ })).toHaveCount(0);
  });

  expect(heard).toEqual([]);
});
