import { bend, buildRun, pullPoint, straight, wires } from '@fairlead/shared';
import type { PathElement, RunDocument } from '@fairlead/shared';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { PULL_RUNS } from '../shared/test/pull-runs';
import { makeJob, makeRun, makeShop, PASSWORD } from './harness/api';
import { PHONE, THEMES, useBrowser } from './harness/browser';
import { signIn } from './harness/sign-in';

const { open } = useBrowser();

const nineties = (count: number): PathElement[] =>
  Array.from({ length: count }, () => [straight(), bend()]).flat();
const run = (tag: string, bends: number, conductors: RunDocument['conductors']) =>
  buildRun({
    tag,
    path: [pullPoint(), ...nineties(bends), straight(), pullPoint()],
    raceway: { type: 'EMT', tradeSize: '2' },
    conductors,
  });

const WIRES = [wires({ count: 3, size: '12' })];
const RUNS = [
  run('ok', 2, WIRES),
  run('ok-too', 2, WIRES),
  // Three 250 kcmil in a 2 in EMT with a bend: D/d 2.91, between 2.8 and 3.2.
  run('watch', 2, [wires({ count: 3, size: '250' })]),
  run('over', 5, WIRES),
  run('no-answer', 2, []),
];

/** The share of pixels, 0 to 1, that two PNGs of one size show in clearly different greys. */
function shareThatDiffers(page: Page, one: Buffer, other: Buffer): Promise<number> {
  return page.evaluate(
    async (pictures) => {
      const pixels = await Promise.all(
        pictures.map(async (base64) => {
          const picture = new Image();
          picture.src = `data:image/png;base64,${base64}`;
          await picture.decode();
          const canvas = new OffscreenCanvas(picture.width, picture.height);
          const context = canvas.getContext('2d')!;
          context.drawImage(picture, 0, 0);
          return context.getImageData(0, 0, picture.width, picture.height).data;
        }),
      );
      const [a, b] = pixels as [Uint8ClampedArray, Uint8ClampedArray];
      let different = 0;
      for (let at = 0; at < a.length; at += 4) {
        if (Math.abs(a[at]! - (b[at] ?? 0)) > 48) different += 1;
      }
      return different / (a.length / 4);
    },
    [one.toString('base64'), other.toString('base64')],
  );
}

describe('status without colour', () => {
  it.each(THEMES)('four states stay four in grey: %s', async (theme) => {
    const shop = await makeShop();
    const job = await makeJob(shop);
    for (const document of RUNS) await makeRun(shop, job, document);
    const page = await open({ theme });
    await signIn(page, shop.email, PASSWORD);
    await page.goto(`/jobs/${job.id}`);
    await page.addStyleTag({ content: 'html { filter: grayscale(1); }' });
    const look = async (tag: string, status: string) => {
      const glyph = page.locator(`tr[data-run="${tag}"] [data-status="${status}"] svg`);
      return glyph.screenshot({ animations: 'disabled' });
    };
    const ok = await look('ok', 'ok');
    const looks = [ok, await look('watch', 'watch'), await look('over', 'over')];
    looks.push(await look('no-answer', 'no-answer'));
    expect(await shareThatDiffers(page, ok, await look('ok-too', 'ok'))).toBeLessThan(0.02);
    for (const [index, one] of looks.entries()) {
      for (const other of looks.slice(index + 1)) {
        expect(await shareThatDiffers(page, one, other)).toBeGreaterThan(0.12);
      }
    }
  });
});

describe('figures out of range', () => {
  it('are shown with a status, never as a blank or a broken number', async () => {
    const shop = await makeShop();
    const job = await makeJob(shop);
    const wild = buildRun({
      tag: 'wild',
      path: [
        pullPoint(),
        ...Array.from({ length: 60 }, () => [
          straight({ length: 99_999 }),
          bend({ angle: 150 }),
        ]).flat(),
        straight({ length: 0.015625 }),
        pullPoint(),
      ],
      raceway: { type: 'FMC', tradeSize: '3/8' },
      conductors: [wires({ count: 400, size: '1000' })],
    });
    const made = await makeRun(shop, job, wild);
    const page = await open({ size: PHONE });
    const desk = await open();
    for (const screen of [page, desk]) {
      await signIn(screen, shop.email, PASSWORD);
      for (const path of [`/jobs/${job.id}`, `/jobs/${job.id}/runs/${made.id}`]) {
        await screen.goto(path);
        await screen.getByText('wild').first().waitFor();
        const words = await screen.locator('body').innerText();
        expect(words).not.toMatch(/NaN|Infinity|undefined|null|\[object/);
      }
    }
    const verdicts = await desk.locator('[data-check]').allInnerTexts();
    expect(verdicts.length).toBeGreaterThan(3);
    for (const verdict of verdicts) expect(verdict).toMatch(/\p{L}.*\S/u);
    expect(await desk.locator('[data-check="fill"]').innerText()).toMatch(/of \d/);
  });
});

describe('every computed number opens', () => {
  /** Opens each figure there is, reads what opens, closes it with Esc; the kinds of explanation seen. */
  async function openAll(page: Page): Promise<Set<string>> {
    const figures = page.getByRole('button', { name: /: how it came about$/ });
    const count = await figures.count();
    expect(count).toBeGreaterThan(0);
    const seen = new Set<string>();
    for (let index = 0; index < count; index += 1) {
      const figure = figures.nth(index);
      await figure.click();
      const panel = page.locator('[data-explanation]');
      const words = await panel.innerText();
      expect(words).toMatch(/Exactly .*\d/);
      expect(words).toMatch(/From\s+\S/);
      seen.add((await panel.getAttribute('data-explanation')) ?? '');
      await page.keyboard.press('Escape');
      await panel.waitFor({ state: 'detached' });
    }
    return seen;
  }

  /** Cells of a table with a figure that does not open. */
  const closedCells = (page: Page, table: string) =>
    page
      .locator(`${table} td`)
      .evaluateAll((cells) =>
        cells
          .filter((cell) => /\d/.test(cell.textContent ?? '') && !cell.querySelector('button'))
          .map((cell) => cell.textContent),
      );

  it('of a piece, of the conductors and of a pull', async () => {
    const shop = await makeShop();
    const job = await makeJob(shop);
    const made = await makeRun(shop, job, { ...PULL_RUNS.branchThrough(), tag: 'opens' });
    const page = await open();
    await signIn(page, shop.email, PASSWORD);
    const at = `/jobs/${job.id}/runs/${made.id}`;

    await page.goto(at);
    await page.locator('tr[data-piece]', { hasText: 'Kick 60' }).click();
    const piece = page.locator('[data-selected-piece] dl');
    await piece.waitFor();
    // The same figures as in the row.
    const row = await page.locator('tr[aria-selected="true"]').innerText();
    for (const figure of await piece.locator('dd').allInnerTexts()) expect(row).toContain(figure);
    expect(await openAll(page)).toEqual(new Set(['station', 'degrees', 'tensionHere']));

    await page.goto(`${at}?tab=conductors`);
    await page.locator('tr[data-section]').first().waitFor();
    expect(await openAll(page)).toEqual(new Set(['fill', 'room', 'jam', 'clearance']));
    const withoutSize = (await closedCells(page, 'table:has([data-section])')).filter(
      (text) => !/^1\/2 EMT$/.test(text ?? ''),
    );
    expect(withoutSize).toEqual([]);

    await page.goto(`${at}?tab=pull`);
    await page.getByText('Along the pull').click();
    expect(await openAll(page)).toEqual(
      new Set([
        'method',
        'tension',
        'tensionHere',
        'conductor',
        'sidewall',
        'weight',
        'correction',
        'gauge',
      ]),
    );
  });
});
