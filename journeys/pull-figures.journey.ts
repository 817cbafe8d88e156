import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { PULL_RUNS } from '../shared/test/pull-runs';
import { makeJob, makeRun, makeShop, PASSWORD } from './harness/api';
import type { Shop } from './harness/api';
import { useBrowser } from './harness/browser';
import { signIn } from './harness/sign-in';
import { verdictOf } from './harness/workbench';

const { open } = useBrowser();

type Name = keyof typeof PULL_RUNS;
type Way = 'forward' | 'reverse';

/** Opens the figure and reads it exactly: "1866.52 lbf, shown to 50 lb" is 1866.52. */
async function exactly(page: Page, figure: string): Promise<number> {
  await page.locator(figure).getByRole('button').click();
  const exact = page.getByText(/^Exactly /);
  const words = (await exact.textContent()) ?? '';
  await page.keyboard.press('Escape');
  await exact.waitFor({ state: 'detached' });
  return Number(/([\d.]+) (lbf|lb\/ft)(?:,|$)/.exec(words)?.[1]);
}

const cell = (way: Way, level: string, pull = 0) =>
  `:nth-match([data-pull], ${pull + 1}) td[data-way="${way}"] [data-level="${level}"]`;

async function bandOf(page: Page, way: Way, pull = 0): Promise<number[]> {
  const band: number[] = [];
  for (const level of ['low', 'likely', 'high']) {
    band.push(await exactly(page, cell(way, level, pull)));
  }
  return band;
}

const expectWithin = (given: number[], wanted: number[]) => {
  expect(given).toHaveLength(wanted.length);
  given.forEach((lbf, index) => expect(Math.abs(lbf / wanted[index]! - 1)).toBeLessThan(5e-4));
};

// The same figures come from the engine (shared/test/pull-must-hold.test.ts) and through the API.
describe('the pull as it stands on the screen', () => {
  let shop: Shop;
  const paths = new Map<Name, string>();

  beforeAll(async () => {
    shop = await makeShop();
    const job = await makeJob(shop);
    for (const name of Object.keys(PULL_RUNS) as Name[]) {
      const run = await makeRun(shop, job, { ...PULL_RUNS[name](), tag: name });
      paths.set(name, `/jobs/${job.id}/runs/${run.id}?tab=pull`);
    }
  });

  it('reads each run', { timeout: 180_000 }, async () => {
    const page = await open();
    await signIn(page, shop.email, PASSWORD);
    const show = async (name: Name) => {
      await page.goto(paths.get(name) ?? '');
      await page.locator('[data-pull]').first().waitFor();
    };

    await show('feeder');
    expectWithin(await bandOf(page, 'forward'), [601.3, 1866.4, 4790.4]);
    expectWithin(await bandOf(page, 'reverse'), [442.4, 1110.4, 2381.0]);
    expect(await page.locator('th[data-planned]').innerText()).toMatch(/^Feed at B\s*Recommended$/);
    const gives = page.locator('tr', { hasText: 'Gives first' }).locator('td[data-planned]');
    expect(await gives.innerText()).toContain('Basket grip: 1,100 of 1,000 lb');
    const sidewall = await exactly(page, 'td[data-way="reverse"] [data-sidewall]');
    expect(Math.abs(sidewall - 624)).toBeLessThan(5);
    expect(await verdictOf(page, 'tension')).toBe(
      'Over limit typical 1,100 of 1,000 lb, basket grip',
    );
    expect(await verdictOf(page, 'sidewall')).toMatch(
      /^Watch 620: past the 500 caution, stop 1,000/,
    );

    await show('feeder50');
    expectWithin([await exactly(page, cell('forward', 'likely'))], [2231.4]);
    await show('feederInTwo');
    expectWithin([await exactly(page, cell('forward', 'likely', 0))], [260.3]);
    expectWithin([await exactly(page, cell('forward', 'likely', 1))], [884.7]);

    await show('drop');
    const held: number[] = [];
    for (const level of ['low', 'likely', 'high']) {
      held.push(await exactly(page, `td[data-way="forward"] [data-hold-back="${level}"]`));
    }
    expect(held.map(Math.round)).toEqual([343, 245, 169]);
    expect(await page.locator('th[data-planned]').innerText()).toMatch(/^Feed at Foot/);

    // Common practice, no source.
    await show('branch');
    const apart = [await bandOf(page, 'forward', 0), await bandOf(page, 'forward', 1)];
    expect(apart.map((band) => band.map(Math.round))).toEqual([
      [5, 14, 38],
      [5, 12, 32],
    ]);
    expect(await page.locator('[data-method="easy"]').count()).toBe(2);
    expect(await page.locator('[data-method]').first().innerText()).toContain(
      'If dry: one person.',
    );

    await show('branchThrough');
    const through = await bandOf(page, 'forward');
    expect(through.map(Math.round)).toEqual([18, 116, 751]);
    expect(await verdictOf(page, 'tension')).toBe('Watch pull it in two');
    const body = (await page.locator('body').innerText()).replace(/\s+/g, ' ');
    expect(body).toContain('Pull it in two at JB-1');
    expect(body).toContain('of 157 lb, conductors');
    expect(body).toContain('Before opening or fishing: de-energise, lock out, verify.');
    expect(body).toContain("Estimate. Measured tension and the cable maker's limits rule.");

    await show('branchAlone');
    expect(Math.abs((await exactly(page, cell('forward', 'likely'))) - 403)).toBeLessThan(3);
    expect(await page.locator('[data-method="not-as-drawn"]').count()).toBe(1);
  });

  it('breaks a pull at its box by the offered fix, and joins it again', async () => {
    const page = await open();
    await signIn(page, shop.email, PASSWORD);
    await page.goto(paths.get('branchThrough') ?? '');
    await page
      .getByRole('button', { name: /^Pull it in two at JB-1.*14 and 12 lb/ })
      .first()
      .click();
    await page.locator('[data-method="easy"]').nth(1).waitFor();
    expect(await verdictOf(page, 'tension')).toMatch(/^OK typical 14, dry 40 of 157 lb/);
    await page.getByRole('button', { name: 'Pull straight through JB-1' }).click();
    expect(await verdictOf(page, 'tension')).toBe('Watch pull it in two');
    await page.getByText(/^Saved \d\d:\d\d$/).waitFor();
  });

  it('reckons anew with other conditions, and goes back to the usual ones', async () => {
    const page = await open();
    await signIn(page, shop.email, PASSWORD);
    await page.goto(paths.get('branch') ?? '');
    const typical = page.locator(cell('forward', 'likely'));
    expect(await typical.innerText()).toBe('14 lb');
    await page.getByLabel('Feeding').fill('0');
    await page.getByLabel('Feeding').press('Enter');
    await page.getByText('50 lb', { exact: true }).first().waitFor();
    await page.getByLabel('Feeding').fill('');
    await page.getByLabel('Feeding').press('Enter');
    await page.getByText('14 lb', { exact: true }).first().waitFor();
  });
});
