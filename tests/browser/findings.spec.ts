import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Browser, type Page } from '@playwright/test';
import { z } from 'zod';
import { DEMO, signIn } from './support/office';

/** The pumping station has a finding of each kind; everything these journeys do to it they take back. */
const PROJECT = 'Upper Tarnbeck pumping station';

async function openFindings(page: Page): Promise<string> {
  const answer = await page.request.get(`/api/offices/${DEMO}/projects`);
  const { items } = projects.parse(await answer.json());
  const submission = items.find(({ name }) => name === PROJECT)?.latest?.id ?? '';
  await page.goto(`/${DEMO}/submissions/${submission}`);
  await expect(page.getByRole('row', { selected: true })).toBeVisible();
  return submission;
}

const projects = z.object({
  items: z.array(z.object({ name: z.string(), latest: z.object({ id: z.string() }).nullable() })),
});

const bench = (page: Page) => page.getByRole('complementary');
const selectedRow = (page: Page) => page.getByRole('row', { selected: true });

async function as(browser: Browser, who: string): Promise<Page> {
  const page = await (await browser.newContext()).newPage();
  await signIn(page, who);
  return page;
}

test('an analyst goes through the findings by key, adopts one and takes it back', async ({ page }) => {
  await signIn(page, 'analyst');
  await openFindings(page);
  await expect(page.getByText(/rows read = .* activities/)).toBeVisible();
  await expect(page.getByText(/cannot be computed: .* stand in the way/)).toBeVisible();
  await expect(page.getByText('Not adopted.')).toBeVisible();

  const first = await bench(page).getByRole('heading', { level: 2 }).innerText();
  await page.keyboard.press('j');
  await expect(bench(page).getByRole('heading', { level: 2 })).not.toHaveText(first);
  await page.keyboard.press('k');
  await expect(bench(page).getByRole('heading', { level: 2 })).toHaveText(first);

  await page.keyboard.press('a');
  await expect(selectedRow(page)).toContainText('corrected');
  await expect(bench(page).getByText(/^Corrected by/)).toBeVisible();
  await expect(page.getByRole('link', { name: 'Corrected workbook' })).toBeVisible();
  await page.keyboard.press('z');
  await expect(selectedRow(page)).toContainText('open');
  await expect(page.getByText('Nothing is corrected yet.')).toBeVisible();
});

test('a fix adopted twice in one breath is sent once', async ({ page }) => {
  await signIn(page, 'analyst');
  await openFindings(page);
  let sent = 0;
  page.on('request', (request) => {
    if (request.method() === 'POST' && request.url().endsWith('/corrections')) sent += 1;
  });
  await bench(page).getByRole('button', { name: 'Adopt', exact: true }).dblclick();
  await expect(bench(page).getByText(/^Corrected by/)).toBeVisible();
  expect(sent).toBe(1);
  await bench(page).getByRole('button', { name: 'Undo' }).click();
  await expect(selectedRow(page)).toContainText('open');
});

test('letters typed into a comment do nothing else, and what was begun is kept', async ({ page }) => {
  await signIn(page, 'reviewer');
  await openFindings(page);
  await expect(bench(page).getByText('Your role reads the fixes')).toBeVisible();
  await page.keyboard.press('c');
  const field = bench(page).getByLabel('Write a comment');
  await expect(field).toBeFocused();
  await page.keyboard.type('a daj z');
  await expect(selectedRow(page)).toContainText('open');
  await page.keyboard.press('Escape');
  await page.keyboard.press('j');
  await expect(field).toHaveValue('');
  await page.keyboard.press('k');
  await expect(field).toHaveValue('a daj z');
});

test('a comment and a correction show to the other side without a reload', async ({ page, browser }) => {
  await signIn(page, 'analyst');
  const submission = await openFindings(page);
  await page.getByRole('combobox', { name: 'Rule' }).selectOption('self-link');
  await expect(bench(page)).toContainText('waits for itself');
  const finding = await selectedRow(page).getAttribute('row-id');

  const scheduler = await as(browser, 'scheduler');
  await scheduler.goto(`/${DEMO}/submissions/${submission}?finding=${finding ?? ''}`);
  await expect(bench(scheduler)).toContainText('waits for itself');

  const question = `Which link was meant (${String(Date.now())})?`;
  await bench(page).getByLabel('Write a comment').fill(question);
  await bench(page).getByRole('radio', { name: 'Shared with the contractor' }).check();
  await bench(page).getByRole('button', { name: 'Add the comment' }).click();
  await expect(bench(scheduler).getByText(question)).toBeVisible();

  await page.locator('h1').click();
  await page.keyboard.press('a');
  await expect(selectedRow(page)).toContainText('corrected');
  await expect(scheduler.getByText(/adopted one fix .* What you see is new\./)).toBeVisible();
  await expect(selectedRow(scheduler)).toContainText('corrected');
  await page.keyboard.press('z');
  await expect(selectedRow(page)).toContainText('open');
});

for (const [width, scheme] of [
  [1440, 'light'],
  [320, 'dark'],
] as const) {
  test(`nothing stands in anyone’s way at ${String(width)} px, ${scheme}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme: scheme });
    await page.setViewportSize({ width, height: 860 });
    await signIn(page, 'analyst');
    const submission = await openFindings(page);
    await selectedRow(page).click();
    await expect(bench(page)).toBeVisible();
    for (const place of ['', '/record', '/compare']) {
      if (place) await page.goto(`/${DEMO}/submissions/${submission}${place}`);
      await expect(page.getByRole('navigation', { name: 'Places of this submission' })).toBeVisible();
      await expect(page.getByRole('status').filter({ hasText: '…' })).toHaveCount(0);
      const { violations } = await new AxeBuilder({ page }).analyze();
      expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html ?? ''}`)).toEqual([]);
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
      expect(overflow).toBeLessThanOrEqual(0);
    }
  });
}
