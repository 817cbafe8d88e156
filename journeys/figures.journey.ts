import {
  bend,
  buildRun,
  offset,
  pullPoint,
  saddle3,
  saddle4,
  straight,
  wires,
} from '@fairlead/shared';
import type { PathElement, Raceway, RunDocument } from '@fairlead/shared';
import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { makeJob, makeRun, makeShop, PASSWORD } from './harness/api';
import type { Shop } from './harness/api';
import { useBrowser } from './harness/browser';
import { signIn } from './harness/sign-in';
import { verdictOf } from './harness/workbench';

const { open } = useBrowser();

const leg = (length = 120) => straight({ length });
/** Pieces with ten feet of pipe between them, from a box to a box. */
const between = (...pieces: PathElement[]): PathElement[] => [
  pullPoint({ label: 'JB-1' }),
  ...pieces.flatMap((piece) => [leg(), piece]),
  leg(),
  pullPoint({ label: 'JB-2' }),
];
const nineties = (count: number) => Array.from({ length: count }, () => bend());
const lb = (accessible: boolean) =>
  pullPoint({ device: 'conduit-body', body: 'LB', accessible, label: 'LB-1' });
const boxOffset = () => offset({ rise: 0.5, angle: 10 });

const degreesRun = (angle: number) => between(...nineties(3), offset({ angle }), boxOffset());
const filled = (raceway: Raceway, length: number, ...groups: Parameters<typeof wires>[0][]) =>
  buildRun({
    raceway,
    path: [pullPoint({ label: 'JB-1' }), leg(length), pullPoint({ label: 'JB-2' })],
    conductors: groups.map((group) => wires(group)),
  });
const fiveHundreds = (raceway: Raceway) =>
  filled(raceway, 600, { count: 4, size: '500' }, { count: 1, size: '3', use: 'ground' });
const twelves = (count: number, length: number) =>
  filled({ type: 'EMT', tradeSize: '3/4' }, length, { count, size: '12' });

interface Read {
  name: string;
  document: RunDocument;
  /** What the verdict row says, by check. */
  says: Record<string, string>;
  /** What else stands on the page. */
  shows?: string[];
}

// Each figure is also asserted through the engine (shared/test/must-hold.test.ts) and through the API.
const READ: Read[] = [
  {
    name: '90, 90, 90, offset 30, box offset 10',
    document: buildRun({ path: degreesRun(30) }),
    says: { degrees: 'OK 350 of 360, 10 left' },
    shows: ['450° since JB-1 if any offset counts as a 90'],
  },
  {
    name: 'the offset at 45',
    document: buildRun({ path: degreesRun(45) }),
    says: { degrees: 'Over limit 380 of 360, 20 over' },
    shows: ['380°, 20° over'],
  },
  {
    name: 'the offset at 22½',
    document: buildRun({ path: degreesRun(22.5) }),
    says: { degrees: 'OK 335 of 360, 25 left' },
  },
  {
    name: '90, 90, 90, LB that can be reached, 90, 90',
    document: buildRun({ path: between(...nineties(3), lb(true), ...nineties(2)) }),
    says: { degrees: 'OK 270 of 360, 90 left', access: 'OK reachable' },
    shows: ['JB-1 → LB-1', '270° of 360°', 'LB-1 → JB-2', '180° of 360°'],
  },
  {
    name: 'the same LB that cannot be reached',
    document: buildRun({ path: between(...nineties(3), lb(false), ...nineties(2)) }),
    says: {
      degrees: 'Over limit 540 of 360, 180 over',
      access: 'Over limit Not allowed: LB-1',
    },
  },
  {
    name: 'a 3-bend saddle',
    document: buildRun({ path: between(saddle3({ height: 4, angle: 22.5 })) }),
    says: { degrees: 'OK 90 of 360, 270 left' },
  },
  {
    name: 'a 4-bend saddle',
    document: buildRun({ path: between(saddle4({ height: 6, width: 12, angle: 30 })) }),
    says: { degrees: 'OK 120 of 360, 240 left' },
  },
  {
    name: '4×500 and a 3 in 3 EMT',
    document: fiveHundreds({ type: 'EMT', tradeSize: '3' }),
    says: { fill: 'OK 33.1 of 40 %' },
  },
  {
    name: '4×500 and a 3 in 3 PVC-40',
    document: fiveHundreds({ type: 'PVC-40', tradeSize: '3' }),
    says: { fill: 'Over limit 40.3 of 40 %' },
  },
  {
    name: '4×500 and a 3 in 3-1/2 PVC-40',
    document: fiveHundreds({ type: 'PVC-40', tradeSize: '3-1/2' }),
    says: { fill: 'OK 30.1 of 40 %' },
  },
  { name: '16×12 in 3/4 EMT', document: twelves(16, 600), says: { fill: 'OK 39.9 of 40 %' } },
  {
    name: '17×12 in 3/4 EMT',
    document: twelves(17, 600),
    says: { fill: 'Over limit 42.4 of 40 %' },
  },
  {
    name: '24×12 in a 24 in nipple',
    document: twelves(24, 24),
    says: { fill: 'OK 59.9 of 60 %' },
  },
  {
    name: '25×12 in a 24 in nipple',
    document: twelves(25, 24),
    says: { fill: 'Over limit 62.4 of 60 %' },
  },
  { name: '16×12 at 24.5 in', document: twelves(16, 24.5), says: { fill: 'OK 39.9 of 40 %' } },
  {
    name: '17×12 at 24.5 in',
    document: twelves(17, 24.5),
    says: { fill: 'Over limit 42.4 of 40 %' },
  },
  {
    name: '3×250 in 2 EMT round a bend',
    document: buildRun({
      raceway: { type: 'EMT', tradeSize: '2' },
      path: between(bend()),
      conductors: [wires({ count: 3, size: '250' })],
    }),
    says: { fill: 'OK 35.5 of 40 %', jam: 'Watch 2.91 (3.05)' },
    shows: ['2.91 (3.05 with bend ovality): three can wedge between 2.8 and 3.2.'],
  },
];

describe('the figures stand on the screen', () => {
  let shop: Shop;
  const runs = new Map<string, string>();

  beforeAll(async () => {
    shop = await makeShop();
    const job = await makeJob(shop);
    for (const [index, { name, document }] of READ.entries()) {
      const run = await makeRun(shop, job, { ...document, tag: `F-${index + 1}` });
      runs.set(name, `/jobs/${job.id}/runs/${run.id}`);
    }
  });

  let page: Page | null = null;
  it('reads each run', { timeout: 120_000 }, async () => {
    page = await open();
    await signIn(page, shop.email, PASSWORD);
    for (const { name, says, shows = [] } of READ) {
      await page.goto(runs.get(name) ?? '');
      for (const [check, words] of Object.entries(says)) {
        expect(await verdictOf(page, check), name).toBe(words);
      }
      const notes = page.getByText(/^\d+ notes?$/);
      if (shows.length > 0 && (await notes.count()) > 0) await notes.click();
      const text = (await page.locator('body').innerText()).replace(/\s+/g, ' ');
      for (const words of shows) expect(text, name).toContain(words);
    }
  });
});
