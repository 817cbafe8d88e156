import { analyzeRun, bend, buildRun, expandRun, pullPoint, straight } from '@fairlead/shared';
import type { RunDocument } from '@fairlead/shared';
import { describe, expect, it } from 'vitest';
import { PULL_RUNS } from '../../../../../../shared/test/pull-runs';
import { IDS, threeNineties } from '../testing/sample-runs';
import { listRows, pieceOf } from './list-rows';

const rowsOf = (document: RunDocument) =>
  listRows(document, analyzeRun(document), expandRun(document));

describe('listRows', () => {
  it('counts up since the pull point and marks what lies past the limit', () => {
    const [section] = rowsOf(threeNineties(45));
    expect(section?.rows.map(({ number, since, isOver }) => [number, since, isOver])).toEqual([
      [null, 0, false],
      [1, 90, false],
      [2, 180, false],
      [3, 270, false],
      [4, 360, false],
      [5, 380, true],
      [null, 380, true],
    ]);
  });

  it('puts the straights into the leg of the piece they lead to', () => {
    const document = buildRun({
      path: [pullPoint(), straight({ length: 48 }), straight({ length: 72 }), bend(), pullPoint()],
    });
    const [section] = rowsOf(document);
    expect(section?.rows.map(({ leg }) => leg)).toEqual([null, 120, null]);
  });

  it('names each pull point once', () => {
    const document = buildRun({
      path: [pullPoint(), bend(), pullPoint({ label: 'JB-1' }), bend(), pullPoint()],
    });
    const sections = rowsOf(document);
    const ids = sections.flatMap(({ rows }) => rows.map(({ id }) => id));
    expect(ids).toEqual(['e1', 'e2', 'e3', 'e4', 'e5']);
    expect(sections).toHaveLength(2);
    expect(sections[1]?.rows.map(({ since }) => since)).toEqual([90, 90]);
  });

  it('has no stations without lengths', () => {
    const document = buildRun({ path: [pullPoint(), bend(), pullPoint()] });
    expect(rowsOf(document)[0]?.rows.every(({ station }) => station === null)).toBe(true);
  });
});

describe('pieceOf', () => {
  it('takes a straight for the piece it leads to', () => {
    expect(pieceOf(threeNineties(), 'e2')?.id).toBe(IDS.first90);
    expect(pieceOf(threeNineties(), IDS.offset)?.id).toBe(IDS.offset);
    expect(pieceOf(threeNineties(), 'gone')).toBeNull();
    expect(pieceOf(threeNineties(), null)).toBeNull();
  });
});

describe('the typical pull of a row', () => {
  it('is what the head feels leaving the piece, in the planned direction', () => {
    const rows = rowsOf(PULL_RUNS.feeder()).flatMap((section) => section.rows);
    const pulls = new Map(rows.map(({ id, pull }) => [id, Math.round(pull ?? -1)]));
    // Fed at B: nothing there, and the most at A.
    expect(pulls.get('b')).toBe(0);
    expect(pulls.get('a')).toBe(1110);
    expect(pulls.get('bend3')!).toBeLessThan(pulls.get('bend2')!);
    expect(pulls.get('bend2')!).toBeLessThan(pulls.get('bend1')!);
  });

  it('runs on through a box that is pulled straight through', () => {
    const rows = rowsOf(PULL_RUNS.branchThrough()).flatMap((section) => section.rows);
    expect(rows.find(({ id }) => id === 'box')?.pull).toBeCloseTo(14, 0);
  });

  it('is nothing where the pull has no answer', () => {
    const rows = rowsOf(buildRun()).flatMap((section) => section.rows);
    expect(rows.every(({ pull }) => pull === null)).toBe(true);
  });
});
