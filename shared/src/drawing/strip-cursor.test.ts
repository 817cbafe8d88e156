import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../analyze-run';
import { bend, buildRun, pullPoint, straight, wires } from '../run/build-run';
import { expandRun } from '../run/expand-run';
import { createWords } from '../words/create-words';
import { drawStrip } from './strip';
import { readCursor } from './strip-cursor';

const { say } = createWords('en');
/** 10 ft, 90, 20 ft, a box, 5 ft, 45, 5 ft, with three 12 AWG. */
const run = buildRun({
  path: [
    pullPoint({ id: 'a' }),
    straight({ id: 's1', length: 120 }),
    bend({ id: 'b1', angle: 90 }),
    straight({ id: 's2', length: 240 }),
    pullPoint({ id: 'b' }),
    straight({ id: 's3', length: 60 }),
    bend({ id: 'b2', angle: 45 }),
    straight({ id: 's4', length: 60 }),
    pullPoint({ id: 'c' }),
  ],
  conductors: [wires({ count: 3, size: '12' })],
});
const view = { analysis: analyzeRun(run), expanded: expandRun(run) };
const drawn = () =>
  drawStrip({ ...view, width: 1000, variant: 'desk', sun: false, selectedId: null, say });
const at = (x: number) => {
  const place = drawn().cursorAt(x);
  if (!place) throw new Error(`no place at ${x}`);
  return place;
};
const placeOf = (id: string) => drawn().places.find(({ elementId }) => elementId === id)!;
const stationOf = (id: string) =>
  view.expanded.elements.find(({ element }) => element.id === id)!.from;

describe('the cursor of a strip', () => {
  it.each(['a', 'b1', 'b', 'b2', 'c'])('stands exactly on the piece %s', (id) => {
    const { from } = placeOf(id);
    for (const x of [from - 5, from, from + 5]) {
      expect(at(x)).toMatchObject({ elementId: id, isOnPiece: true, station: stationOf(id) });
    }
  });

  it('stands on the nearest foot of a leg, which belongs to the piece it leads to', () => {
    const middle = (placeOf('b1').to + placeOf('b').from) / 2;
    const place = at(middle);
    expect(place).toMatchObject({ elementId: 'b', isOnPiece: false });
    expect(place.station % 12).toBe(0);
    expect(place.station).toBeGreaterThan(stationOf('b1'));
    expect(place.station).toBeLessThan(stationOf('b'));
    expect(Math.abs(place.x - middle)).toBeLessThan(20);
  });

  it('grows along the run and stays within it', () => {
    const all = Array.from({ length: 1001 }, (_, x) => at(x).station);
    expect(all[0]).toBe(0);
    expect(all[1000]).toBe(view.expanded.length);
    all.slice(1).forEach((station, index) => expect(station).toBeGreaterThanOrEqual(all[index]!));
  });

  it('knows no place without lengths', () => {
    const bare = buildRun({ path: [pullPoint(), bend(), pullPoint()] });
    const strip = drawStrip({
      expanded: expandRun(bare),
      analysis: analyzeRun(bare),
      width: 1000,
      variant: 'desk',
      sun: false,
      selectedId: null,
      say,
    });
    expect(strip.cursorAt(500)).toBeNull();
  });
});

describe('what a run says at a place', () => {
  const readAt = (x: number) => readCursor(view, at(x));
  const [first, second] = view.analysis.pulls.map((pull) => pull[pull.planned]);

  it('on a bend: with the bend, from the pull point before it', () => {
    expect(readAt(placeOf('b1').from)).toMatchObject({ degrees: 90, fromId: 'a' });
    expect(readAt(placeOf('b2').from)).toMatchObject({ degrees: 45, fromId: 'b' });
    const leaving = first!.profile.find(({ elementId }) => elementId === 'b1')!;
    expect(readAt(placeOf('b1').from).pull).toBe(leaving.tension.likely);
  });

  it('on a leg: what has been bent before it, and the pull between its ends', () => {
    const early = readAt((placeOf('a').to + placeOf('b1').from) / 2);
    expect(early).toMatchObject({ degrees: 0, fromId: 'a' });
    const late = at((placeOf('b1').to + placeOf('b').from) / 2);
    const reading = readCursor(view, late);
    expect(reading).toMatchObject({ degrees: 90, fromId: 'a' });
    const ends = first!.profile.filter(({ elementId }) => ['b1', 's2'].includes(elementId));
    const [one, other] = ends.map(({ tension }) => tension.likely) as [number, number];
    expect(reading.pull).toBeGreaterThan(Math.min(one, other));
    expect(reading.pull).toBeLessThan(Math.max(one, other));
  });

  it('on a pull point: no degrees, and the pull that ends there', () => {
    const reading = readAt(placeOf('c').from);
    expect(reading).toMatchObject({ degrees: null, fromId: null });
    const { feedAt, feed, tension } = second!;
    expect(reading.pull).toBe(feedAt === 'c' ? feed : tension!.likely);
  });
});
