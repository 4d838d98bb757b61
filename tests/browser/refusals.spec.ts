import { expect, test } from '@playwright/test';
import { text } from './files';
import { signIn } from './people';

const OLD_WORKBOOK = Buffer.from([
  0xd0,
  0xcf,
  0x11,
  0xe0,
  0xa1,
  0xb1,
  0x1a,
  0xe1,
  ...new Array<number>(2048).fill(0),
]);

const REFUSED = [
  ['an empty file', text('empty.xlsx', ''), /empty/i],
  [
    'a picture',
    text('photo.xlsx', Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 0, 0, 0, 13])),
    /spreadsheet|workbook/i,
  ],
  ['an old binary workbook', text('old.xls', OLD_WORKBOOK), /\.xls|old/i],
  ['a broken zip', text('torn.xlsx', Buffer.from('PK\u0003\u0004and no more of it')), /save it anew/i],
] as const;

test.describe('refused with a sentence, and nothing kept', () => {
  for (const [what, file, sentence] of REFUSED) {
    test(what, async ({ page }) => {
      await signIn(page, 'analyst');
      await page.goto('/demo/projects');
      await page
        .getByRole('link', { name: /Millrace intake screens/ })
        .first()
        .click();
      const answered = page.waitForResponse((answer) => answer.request().method() === 'POST');
      await page.locator('input[type=file]').setInputFiles(file);
      expect((await answered).status()).toBeGreaterThanOrEqual(400);
      await expect(page.getByRole('alert').filter({ hasText: sentence }).first()).toBeVisible();
      await page.goto('/demo/projects');
      await page
        .getByRole('link', { name: /Millrace intake screens/ })
        .first()
        .click();
      await expect(page.getByRole('link', { name: /^Rev 0/ }).first()).toBeVisible();
      await expect(page.getByRole('link', { name: /^Rev 1/ })).toHaveCount(0);
    });
  }
});

test('a list whose columns cannot be told is shown, matched by hand, and goes through', async ({ page }) => {
  await signIn(page, 'analyst');
  await page.goto('/demo/projects');
  await page
    .getByRole('link', { name: /Telemetry changeover/ })
    .first()
    .click();
  const list = 'Alpha;Beta;Gamma\nX1;4;\nX2;6;X1\nX3;5;X2\n';
  await page.locator('input[type=file]').setInputFiles(text('odd.csv', list));
  await expect(page.getByLabel(/^Column A/)).toBeVisible();
  await page.getByLabel(/^Column A/).selectOption('id');
  await page.getByLabel(/^Column B/).selectOption('duration');
  await page.getByLabel(/^Column C/).selectOption('predecessors');
  await page.getByRole('button', { name: 'Hand it in' }).first().click();
  await page.waitForURL(/\/submissions\//);
  await expect(page.getByText('3 rows read = 3 activities + 0 refused')).toBeVisible();
});
