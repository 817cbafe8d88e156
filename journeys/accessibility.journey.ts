import { bend, buildRun, offset, pullPoint, straight, wires } from '@fairlead/shared';
import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { makeJob, makeRun, makeShop, PASSWORD } from './harness/api';
import type { Shop } from './harness/api';
import { expectNoViolations } from './harness/axe';
import { DESK, PHONE, THEMES, useBrowser } from './harness/browser';
import { signIn } from './harness/sign-in';

const { open } = useBrowser();

const LONG = 'A very long name that goes on and on, as they do';
const over = () =>
  buildRun({
    tag: 'F-1',
    title: LONG,
    path: [
      pullPoint({ id: 'start', label: 'Panel LP-2 north corridor level 2' }),
      ...Array.from({ length: 4 }, () => [straight(), bend()]).flat(),
      straight(),
      offset({ id: 'offset1', angle: 45 }),
      straight(),
      pullPoint({ id: 'end', label: 'AHU-4' }),
    ],
    conductors: [wires({ count: 3, size: '12' }), wires({ count: 1, size: '12', use: 'ground' })],
  });

describe.each(THEMES)('in the %s theme', (theme) => {
  let shop: Shop;
  let empty: Shop;
  let jobPath: string;
  let runPath: string;
  let emptyRunPath: string;

  beforeAll(async () => {
    [shop, empty] = await Promise.all([makeShop(), makeShop()]);
    const job = await makeJob(shop, LONG);
    const run = await makeRun(shop, job, over());
    const bare = buildRun({ tag: 'F-2', path: [pullPoint(), pullPoint()] });
    const bareRun = await makeRun(shop, job, bare);
    jobPath = `/jobs/${job.id}`;
    runPath = `${jobPath}/runs/${run.id}`;
    emptyRunPath = `${jobPath}/runs/${bareRun.id}`;
  });

  const settled = async (page: Page) => {
    await page.waitForLoadState('networkidle');
    await page.evaluate(() => document.fonts.ready);
  };

  it.each([
    ['desk', DESK],
    ['phone', PHONE],
  ] as const)('no page breaks a rule at the %s', { timeout: 180_000 }, async (name, size) => {
    const page = await open({ theme, size, touch: name === 'phone' });
    const visit = async (path: string) => {
      await page.goto(path);
      await settled(page);
      await expectNoViolations(page, `${path} ${theme} ${name}`);
      expect(await page.title()).toContain('Fairlead');
      const wide = await page.evaluate(() => document.documentElement.scrollWidth > innerWidth);
      expect(wide, `${path} scrolls sideways`).toBe(false);
    };
    await visit('/sign-in');
    await visit('/sign-up');
    await visit('/nowhere');
    await signIn(page, shop.email, PASSWORD);
    await visit('/jobs');
    await visit('/jobs?search=nothing-like-it');
    await visit(jobPath);
    await visit('/me');
    await visit('/company');
    await visit(runPath);
    await visit(`${runPath}?tab=conductors`);
    await visit(`${runPath}?tab=pull`);
    await visit(`${runPath}?piece=offset1`);
    await visit(emptyRunPath);
  });

  it('no empty shop, dialog or menu breaks a rule', { timeout: 120_000 }, async () => {
    const page = await open({ theme });
    await signIn(page, empty.email, PASSWORD);
    await settled(page);
    await expectNoViolations(page, 'an empty shop');
    await page.getByRole('button', { name: 'New job' }).first().click();
    await page.getByRole('button', { name: 'Create job' }).click();
    await page.getByText('Fill this in.').first().waitFor();
    await expectNoViolations(page, 'a new job');
  });
});
