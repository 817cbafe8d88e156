import { randomUUID } from 'node:crypto';
import { bend, buildRun, offset, pullPoint, straight } from '@fairlead/shared';
import type { Run } from '@fairlead/shared';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { makeJob, makeRun, makeShop, PASSWORD, readRun, saveRun } from './harness/api';
import type { Shop } from './harness/api';
import { useBrowser } from './harness/browser';
import { signIn } from './harness/sign-in';
import { addPieces, verdictOf } from './harness/workbench';

const { open, expectErrors } = useBrowser();

const SAVED = /^Saved \d\d:\d\d$/;

const oneOffset = () =>
  buildRun({
    tag: `S-${randomUUID().slice(0, 8)}`,
    path: [
      pullPoint({ id: 'start', label: 'LP-2' }),
      straight({ id: 'leg1', length: 120 }),
      bend({ id: 'bend1' }),
      straight({ id: 'leg2', length: 96 }),
      offset({ id: 'offset1' }),
      straight({ id: 'leg3', length: 60 }),
      pullPoint({ id: 'end', label: 'AHU-4' }),
    ],
  });

interface Opened {
  shop: Shop;
  run: Run;
  page: Page;
  url: string;
}

async function openRun(): Promise<Opened> {
  const shop = await makeShop();
  const job = await makeJob(shop);
  const run = await makeRun(shop, job, oneOffset());
  const page = await open();
  await signIn(page, shop.email, PASSWORD);
  const url = `/jobs/${job.id}/runs/${run.id}`;
  await page.goto(url);
  await page.locator('[data-check="degrees"]').waitFor();
  return { shop, run, page, url };
}

describe('what was typed is kept', () => {
  it('keeps a bad length, says what would be right, also after a reload', async () => {
    const { page } = await openRun();
    await page.locator('tr[data-piece="offset1"]').click();
    const rise = page.getByLabel('Rise');
    await rise.fill(`3' 13"`);
    await rise.blur();
    expect(await rise.inputValue()).toBe(`3' 13"`);
    await page.getByText('inches stay under 12').waitFor();
    await page.waitForTimeout(600);
    await page.reload();
    await page.locator('tr[data-piece="offset1"]').click();
    expect(await page.getByLabel('Rise').inputValue()).toBe(`3' 13"`);
    await page.getByLabel('Rise').fill('10 5/8');
    await page.getByLabel('Rise').blur();
    expect(await page.getByLabel('Rise').inputValue()).toBe('10 5⁄8″');
    await page.getByText(SAVED).waitFor();
  });

  it('loses nothing to a lost connection, and says so', async () => {
    const { page, shop, run } = await openRun();
    expectErrors((text) => text.includes('ERR_INTERNET_DISCONNECTED'));
    await page.context().setOffline(true);
    await addPieces(page, ['90']);
    await page.getByText('On this phone, 1 to send').waitFor();
    expect(await verdictOf(page, 'degrees')).toBe('OK 240 of 360, 120 left');
    expect((await readRun(shop, run.id)).revision.version).toBe(run.revision.version);

    await page.context().setOffline(false);
    await page.getByText(SAVED).waitFor();
    expect((await readRun(shop, run.id)).analysis.totals.degrees).toBe(240);
  });

  it('brings back the last keystroke of a tab that was killed', async () => {
    const { page, url, shop, run } = await openRun();
    expectErrors((text) => text.includes('ERR_FAILED'));
    const context = page.context();
    // No save gets through: what comes back can only come from this device.
    let isCut = true;
    await context.route('**/api/runs/*/document', (route) =>
      isCut ? route.abort() : route.continue(),
    );
    await addPieces(page, ['90']);
    await page.waitForTimeout(600);
    const session = await context.newCDPSession(page);
    session.send('Page.crash').catch(() => undefined);
    await page.waitForEvent('crash');

    isCut = false;
    const again = await context.newPage();
    await again.goto(url);
    expect(await verdictOf(again, 'degrees')).toBe('OK 240 of 360, 120 left');
    await again.getByText(SAVED).waitFor();
    expect((await readRun(shop, run.id)).analysis.totals.degrees).toBe(240);
  });
});

describe('two people save one run', () => {
  async function conflicted() {
    const opened = await openRun();
    const { page, shop, run } = opened;
    expectErrors((text) => text.includes('409'));
    // The other person: the offset at 22½.
    const { document } = run.revision;
    const theirs = {
      ...document,
      path: document.path.map((element) =>
        element.id === 'offset1' ? { ...element, angle: 22.5 } : element,
      ),
    };
    await saveRun(shop, run, theirs as typeof document);
    // Me: one more 90.
    await addPieces(page, ['90']);
    const dialog = page.getByRole('dialog', { name: 'Two versions of this run' });
    await dialog.waitFor();
    return { ...opened, dialog };
  }

  it('shows both, and keeps mine when I say so', async () => {
    const { dialog, page, shop, run } = await conflicted();
    const text = await dialog.innerText();
    expect(text).toContain('Robin Ortega saved this run');
    expect(text).toContain('22½°');
    expect(text).toContain('30°');
    await page.getByText('Needs you').first().waitFor();
    await dialog.getByRole('button', { name: 'Keep mine' }).click();
    await page.getByText(SAVED).waitFor();
    expect((await readRun(shop, run.id)).analysis.totals.degrees).toBe(240);
  });

  it('takes theirs, with mine one Undo away', async () => {
    const { dialog, page, shop, run } = await conflicted();
    await dialog.getByRole('button', { name: 'Take theirs' }).click();
    expect(await verdictOf(page, 'degrees')).toBe('OK 135 of 360, 225 left');
    expect((await readRun(shop, run.id)).analysis.totals.degrees).toBe(135);
    await page.getByRole('button', { name: 'Undo take theirs' }).click();
    expect(await verdictOf(page, 'degrees')).toBe('OK 240 of 360, 120 left');
    await page.getByText(SAVED).waitFor();
    expect((await readRun(shop, run.id)).analysis.totals.degrees).toBe(240);
  });
});
