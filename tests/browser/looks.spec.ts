import AxeBuilder from '@axe-core/playwright';
import { expect, test, type Page } from '@playwright/test';
import { complaints, openSubmission, signIn } from './people';

const OFFICE_PAGES = [
  '/demo',
  '/demo/projects',
  '/demo/projects/new',
  '/demo/contractors',
  '/demo/rules',
  '/demo/rules/loop',
];
const PLACES = ['', '/path', '/path?view=table', '/confidence', '/compare', '/record'];
const WIDTHS = [320, 1440];

async function settle(page: Page, path: string): Promise<void> {
  await page.goto(path);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await expect(page.getByRole('status').filter({ hasText: '…' })).toHaveCount(0);
}

/** Axe finds nothing, and nothing but a table of its own scrolls sideways. */
async function expectSound(page: Page, what: string): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(
    violations.map(
      ({ id, nodes }) =>
        `${id}: ${nodes
          .map((node) => node.html)
          .join(' ')
          .slice(0, 300)}`,
    ),
    what,
  ).toEqual([]);
  const over = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(over, `${what} is wider than the window`).toBeLessThanOrEqual(0);
}

for (const scheme of ['light', 'dark'] as const) {
  test(`the pages are sound in ${scheme}, from narrow to wide`, async ({ page }) => {
    test.setTimeout(300_000);
    const heard = complaints(page);
    await page.emulateMedia({ colorScheme: scheme, reducedMotion: 'reduce' });
    await page.goto('/sign-in');
    await expectSound(page, 'sign-in');
    await signIn(page, 'analyst');
    await openSubmission(page, /Telemetry changeover, Rev 1/);
    const submission = new URL(page.url()).pathname;
    await openSubmission(page, /Upper Tarnbeck pumping station, Rev 0/);
    const blocked = new URL(page.url()).pathname;
    const paths = [
      ...OFFICE_PAGES,
      ...PLACES.map((place) => submission + place),
      blocked,
      `${blocked}/path`,
      `${blocked}/path?state=proposed`,
    ];
    for (const path of paths) {
      for (const width of WIDTHS) {
        await page.setViewportSize({ width, height: 900 });
        await settle(page, path);
        await expectSound(page, `${path} at ${width} in ${scheme}`);
      }
    }
    expect(heard).toEqual([]);
  });
}
