import { readFileSync } from 'node:fs';
import { expect, type Page, test } from '@playwright/test';
import Papa from 'papaparse';
import { expectAccessible, type Person, signedIn } from './person';

/*
 * The whole path as its people walk it: floors in, a proven roster out, published and mailed, confirmed
 * on a phone, hours exported. Every sheet is scanned for accessibility in both themes on the way, and
 * nothing may be logged as an error in the browser.
 */
test.describe.configure({ mode: 'serial' });

const draftPeriod = '1–28 February 2027';
let supervisor: Person;

test.beforeAll(async ({ browser }) => {
  supervisor = await signedIn(browser, 'ingrid.solane@ravelmere.example');
});

test('the sign-in page is accessible and refuses a wrong password in words', async ({ page }) => {
  await page.goto('/sign-in');
  await expectAccessible(page);
  await page.getByLabel('E-mail').fill('ingrid.solane@ravelmere.example');
  await page.getByLabel('Password').fill('not the password');
  await page.keyboard.press('Enter');
  await expect(page.getByRole('alert').filter({ hasText: 'password' })).toBeVisible();
  await expect(page.getByLabel('E-mail')).toHaveValue('ingrid.solane@ravelmere.example');
});

test('a supervisor changes a floor by keyboard and takes it back', async () => {
  const { page } = supervisor;
  await open(page, 'Floors');
  await expectAccessible(page);
  const cell = (people: number) =>
    page.getByRole('gridcell', { name: new RegExp(`^Vet, Early.*Monday, ${people}$`) });
  await cell(1).focus();
  await page.keyboard.type('12');
  const saved = page.waitForResponse((response) => response.url().includes('floor-needs'));
  await page.keyboard.press('Enter');
  expect((await saved).status()).toBe(200);
  await expect(cell(12)).toBeVisible();
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(cell(1)).toBeVisible();
});

test('a supervisor adds a shift kind, is told what is wrong with it, and retires it', async () => {
  const { page } = supervisor;
  await open(page, 'Shift kinds');
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Add a shift kind…' }).first().click();
  const form = page.getByRole('dialog');
  await form.getByLabel('Name').fill('Clinic');
  await form.getByLabel('Letter on the brick').fill('E');
  await form.getByLabel('From').fill('10:00');
  await form.getByLabel('To', { exact: true }).fill('14:00');
  await form.getByRole('button', { name: 'Add shift kind' }).click();
  await expect(form).toContainText('Early');
  await expect(form.getByLabel('Name')).toHaveValue('Clinic');
  // The browser itself logs the refusal; it is the one that is meant.
  expect(supervisor.faults.splice(0)).toEqual([expect.stringContaining('400')]);
  await form.getByLabel('Letter on the brick').fill('C');
  await form.getByRole('button', { name: 'Add shift kind' }).click();
  await expect(form).toBeHidden();
  await page.getByRole('button', { name: 'Retire Clinic' }).click();
  await page.getByRole('alertdialog').getByRole('button', { name: 'Retire' }).click();
  await expect(page.getByRole('button', { name: 'Retire Clinic' })).toBeHidden();
});

test('a run holds every floor, with its cost, bound and gap on screen, and is re-checked', async () => {
  const { page } = supervisor;
  await openDraft(page);
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Run again' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('is making the roster');
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(
    'Run 1, 1–28 February: every floor holds',
    {
      timeout: 90_000,
    },
  );
  await expect(page.getByText('Re-checked by separate code: 0 problems.').first()).toBeVisible();
  await expect(page.getByText('Proven: no roster can cost less than')).toBeVisible();
  await expect(page.getByText('Most that waiting can still save')).toBeVisible();
  await expectAccessible(page);
  await open(page, 'Runs');
  await expect(page.getByRole('row', { name: /Run 1/ })).toContainText('floor holds');
  await expectAccessible(page);
});

test('sizing tells how many people the floors take, with bound and prices', async () => {
  const { page } = supervisor;
  await open(page, 'Sizing');
  await page.getByRole('button', { name: 'Size', exact: true }).click();
  await expect(page.getByText('Linear bound: cannot be less than')).toBeVisible({
    timeout: 60_000,
  });
  await expectAccessible(page);
});

test('the team calendar shows the same as a table', async () => {
  const { page } = supervisor;
  await open(page, 'Calendar');
  await expect(page.getByText('Early').first()).toBeVisible();
  for (const view of ['Month', 'Week', 'Day', 'Agenda']) {
    await page.getByRole('button', { name: view, exact: true }).click();
    await expectAccessible(page);
  }
  await page.getByRole('button', { name: 'Show as table' }).click();
  await expect(page.getByRole('table').first()).toContainText('Ione Baptisto');
  await expectAccessible(page);
});

test('publishing asks once, makes version 1 and mails each person their own shifts', async () => {
  const { page } = supervisor;
  await openDraft(page);
  await page.getByRole('button', { name: 'Publish…' }).click();
  const dialog = page.getByRole('alertdialog');
  await expect(dialog).toContainText('24 people get a mail');
  await expectAccessible(page);
  await dialog.getByRole('button', { name: 'Publish' }).click();
  await expect(page.getByText(/^Version 1, published/)).toBeVisible();
  await open(page, 'Mail');
  await expect(async () => {
    await page.reload();
    await expect(page.getByRole('table').first().getByRole('row')).toHaveCount(25);
  }).toPass({ timeout: 60_000 });
  await page
    .getByRole('button', { name: /sunniva/i })
    .first()
    .click();
  await expect(page.getByText(/\.ics/).first()).toBeVisible();
  await expectAccessible(page);
});

test('a member of staff confirms the roster on a phone', async ({ browser }) => {
  const staff = await signedIn(browser, 'sunniva.adeyo@ravelmere.example', {
    width: 390,
    height: 844,
  });
  const { page } = staff;
  await expect(page).toHaveURL(/\/shifts$/);
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.getByRole('button', { name: /^Confirm \d+ shifts$/ }).click();
  await expect(page.getByText(/^Confirmed/).last()).toBeVisible();
  await expect(page.getByRole('button', { name: /^Confirm \d+ shifts$/ })).toBeHidden();
  await page.goto('/month');
  await expect(page.getByRole('heading', { level: 1 })).toContainText('January 2027');
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
  await page.goto('/floors');
  await expect(page).toHaveURL(/\/not-allowed$/);
  await expectAccessible(page);
  const refused = await page.request.get('/api/v1/members');
  expect(refused.status()).toBe(403);
  expect(refused.headers()['content-type']).toBe('application/problem+json');
  expect(staff.faults).toEqual([]);
});

test('HR reads hours and downloads the CSV', async ({ browser }) => {
  const hr = await signedIn(browser, 'marcus.tealby@ravelmere.example');
  const { page } = hr;
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Hours, 4–31 January');
  await expectAccessible(page);
  const downloading = page.waitForEvent('download');
  await page.getByRole('link', { name: /^Download CSV/ }).click();
  const file = await (await downloading).path();
  const { data, errors } = Papa.parse<Record<string, string>>(readFileSync(file, 'utf8'), {
    header: true,
    skipEmptyLines: true,
  });
  expect(errors).toEqual([]);
  expect(data).toHaveLength(424);
  expect(hr.faults).toEqual([]);
});

test('an account that the owner disables is out at once', async ({ browser }) => {
  const owner = await signedIn(browser, 'rowan.keele@ravelmere.example');
  const zuri = await signedIn(browser, 'zuri.hallam@ravelmere.example');
  await owner.page.goto('/members');
  await expectAccessible(owner.page);
  await owner.page.getByRole('button', { name: 'Disable Zuri Hallam' }).click();
  await owner.page
    .getByRole('alertdialog')
    .getByRole('button', { name: /^Disable/ })
    .click();
  await expect(owner.page.getByRole('button', { name: 'Enable Zuri Hallam' })).toBeVisible();
  await zuri.page.reload();
  await expect(zuri.page).toHaveURL(/\/sign-in/);
  expect(owner.faults).toEqual([]);
});

test('everything stays reachable at 390 px and 720 px', async () => {
  const { page } = supervisor;
  for (const width of [390, 720]) {
    await page.setViewportSize({ width, height: 844 });
    for (const path of [
      '/floors',
      '/shift-kinds',
      '/roster',
      '/runs',
      '/sizing',
      '/calendar',
      '/help',
    ]) {
      await page.goto(path);
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
      await expectNoSidewaysScroll(page);
    }
    await openDraft(page);
    await expectNoSidewaysScroll(page);
    await expectAccessible(page);
  }
});

test('signing out kills the session, and nothing was logged as an error', async () => {
  const { page, faults } = supervisor;
  await page.setViewportSize({ width: 1440, height: 900 });
  await page.goto('/help');
  await expectAccessible(page);
  await page.goto('/roster');
  const cookies = await page.context().cookies();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await expect(page).toHaveURL(/\/sign-in/);
  await page.context().addCookies(cookies);
  await page.goto('/roster');
  await expect(page).toHaveURL(/\/sign-in/);
  expect(faults).toEqual([]);
});

async function open(page: Page, sheet: string): Promise<void> {
  await page
    .getByRole('navigation')
    .first()
    .getByRole('link', { name: sheet, exact: true })
    .click();
  await page.waitForURL((url) => url.pathname === `/${sheet.toLowerCase().replace(' ', '-')}`);
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
}

async function openDraft(page: Page): Promise<void> {
  await page.goto('/roster');
  await page.getByRole('link', { name: draftPeriod }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(`Roster, ${draftPeriod}`);
}

async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const extra = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(extra, `sideways scroll of ${page.url()}`).toBeLessThanOrEqual(0);
}
