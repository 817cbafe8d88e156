import { describe, expect, it } from 'vitest';
import { placeBendLabels } from './bend-labels';
import type { BendLabelWish, LabelBox } from './bend-labels';

const PHONE: LabelBox = {
  rows: 1,
  size: 14,
  gap: 6,
  left: 4,
  right: 386,
  countText: (bends) => `${bends} bends`,
};
const DESK: LabelBox = { ...PHONE, rows: 2 };
const wish = (x: number, fields: Partial<BendLabelWish> = {}): BendLabelWish => ({
  x,
  text: '90°',
  bends: 1,
  section: 0,
  priority: 'rest',
  ...fields,
});
const texts = (wishes: BendLabelWish[], box: LabelBox) =>
  placeBendLabels(wishes, box)
    .sort((a, b) => a.x - b.x)
    .map(({ text, row }) => `${text}/${row}`);

describe('placeBendLabels', () => {
  it('writes each over its ticks where there is room', () => {
    expect(texts([wish(60), wish(160), wish(260)], PHONE)).toEqual(['90°/0', '90°/0', '90°/0']);
  });

  it('takes the upper row on a desk before it counts', () => {
    expect(texts([wish(100), wish(124), wish(148)], DESK)).toEqual(['90°/0', '90°/1', '90°/0']);
  });

  it('counts what stands too close on a phone, and leaves the far one alone', () => {
    const close = [wish(60), wish(240), wish(262), wish(284)];
    expect(texts(close, PHONE)).toEqual(['90°/0', '3 bends/0']);
  });

  it('counts the bends of a piece, never its degrees', () => {
    expect(texts([wish(100, { text: '2×30°', bends: 2 }), wish(120)], PHONE)).toEqual([
      '3 bends/0',
    ]);
  });

  it('never counts across a pull point', () => {
    const shown = texts([wish(100), wish(110, { section: 1 })], PHONE);
    expect(shown).toEqual(['90°/0']);
  });

  it('writes the selected piece first, then the one that crosses the limit', () => {
    const crossing = wish(100, { text: '45°', priority: 'crosses-limit' });
    const selected = wish(110, { text: '30°', priority: 'selected' });
    expect(texts([wish(92), crossing, selected], PHONE)).toEqual(['30°/0']);
    expect(texts([wish(92), crossing], PHONE)).toEqual(['45°/0']);
  });

  it('stays inside the box at both ends', () => {
    const [first, last] = placeBendLabels([wish(0), wish(390)], PHONE);
    expect(first!.x).toBeGreaterThan(PHONE.left + 10);
    expect(last!.x).toBeLessThan(PHONE.right - 10);
  });
});
