import AxeBuilder from '@axe-core/playwright';
import { type Browser, expect, type Page } from '@playwright/test';
import { demoPassword } from '@/db/demo/accounts.mjs';
import { knownFindings } from './known-findings';

/** WCAG 2.2 level A and AA, as axe names them. */
const wcag = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** A browser window of one person: signed in, with everything that goes wrong in it written down. */
export interface Person {
  readonly page: Page;
  /** Console errors, page errors and answers of 500 and above, so far. */
  readonly faults: string[];
}

/** Opens a window and signs in through the form, by keyboard. */
export async function signedIn(
  browser: Browser,
  email: string,
  viewport = { width: 1440, height: 900 },
): Promise<Person> {
  const context = await browser.newContext({ viewport });
  const page = await context.newPage();
  const faults: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error') faults.push(`console: ${message.text()}`);
  });
  page.on('pageerror', (error) => faults.push(`page: ${error.message}`));
  page.on('response', (response) => {
    if (response.status() >= 500) faults.push(`${response.status()} ${response.url()}`);
  });
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(demoPassword);
  await page.keyboard.press('Enter');
  await page.waitForURL((url) => url.pathname !== '/sign-in');
  return { page, faults };
}

/**
 * Fails on any accessibility finding of the page, but for the listed ones of a library. The second theme
 * changes colours only, so only contrast is measured again.
 */
export async function expectAccessible(page: Page): Promise<void> {
  await setTheme(page, 'paper');
  const paper = await axe(page).withTags(wcag).analyze();
  await setTheme(page, 'blueprint');
  const blueprint = await axe(page).withRules(['color-contrast']).analyze();
  await setTheme(page, 'paper');
  const findings = [...paper.violations, ...blueprint.violations].flatMap(({ id, nodes }) =>
    nodes
      .filter(({ target }) => !isKnown(id, target.join(' ')))
      .map(({ target, failureSummary }) => `${id} at ${target.join(' ')}: ${failureSummary}`),
  );
  expect(findings, `accessibility of ${page.url()}`).toEqual([]);
}

/** The page itself: the frame with a mail's own HTML runs no scripts and belongs to the mail's template. */
const axe = (page: Page): AxeBuilder => new AxeBuilder({ page }).exclude('iframe').setLegacyMode();

const setTheme = (page: Page, theme: 'paper' | 'blueprint'): Promise<void> =>
  page.evaluate((name) => {
    document.documentElement.dataset.theme = name;
  }, theme);

const isKnown = (rule: string, target: string): boolean =>
  knownFindings.some((known) => known.rule === rule && target.includes(known.selector));
