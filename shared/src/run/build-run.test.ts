import { describe, expect, it } from 'vitest';
import {
  bend,
  buildRun,
  cable,
  fitting,
  flex,
  offset,
  pullPoint,
  saddle3,
  saddle4,
  straight,
  transition,
  wires,
} from './build-run';
import { elementIdAfter, groupIdAfter, numberElements, numberGroups } from './element-ids';
import { parseRunDocument } from './parse-run-document';

describe('builders', () => {
  it('make a valid run out of nothing', () => {
    const document = buildRun();
    expect(parseRunDocument(document)).toEqual({ ok: true, document });
  });

  it('make every kind of piece valid', () => {
    const middle = [
      straight(),
      bend(),
      offset(),
      saddle3(),
      saddle4(),
      flex(),
      fitting(),
      transition(),
    ];
    const document = buildRun({
      path: [pullPoint(), ...middle, pullPoint()],
      conductors: [wires(), cable()],
    });
    expect(parseRunDocument(document)).toEqual({ ok: true, document });
  });

  it('name parts in order, the same each time, round those that have a name', () => {
    const make = () =>
      buildRun({
        path: [pullPoint(), bend({ id: 'e2' }), straight(), pullPoint({ id: 'Z' })],
        conductors: [wires(), wires()],
      });
    expect(make().path.map(({ id }) => id)).toEqual(['e3', 'e2', 'e4', 'Z']);
    expect(make().conductors?.map(({ id }) => id)).toEqual(['w1', 'w2']);
    expect(make()).toEqual(make());
  });

  it('leave a nameless part nameless until a document takes it in', () => {
    const document = buildRun();
    const bare = {
      ...document,
      path: [...document.path.slice(0, -1), bend(), pullPoint({ id: 'Z' })],
    };
    expect(parseRunDocument(bare).ok).toBe(false);
    expect(parseRunDocument({ ...bare, path: numberElements(bare, bare.path) }).ok).toBe(true);
  });
});

describe('ids', () => {
  it('follow the highest in the document, whatever its order', () => {
    const document = buildRun({ path: [pullPoint({ id: 'e7' }), pullPoint({ id: 'e3' })] });
    expect(elementIdAfter(document)).toBe('e8');
    expect(groupIdAfter(document)).toBe('w1');
    expect(
      numberElements(document, [bend(), bend(), bend({ id: 'x' })]).map(({ id }) => id),
    ).toEqual(['e8', 'e9', 'x']);
    expect(numberGroups(document, [wires(), wires()]).map(({ id }) => id)).toEqual(['w1', 'w2']);
  });

  it('are not led astray by names that only look like numbers', () => {
    const ids = ['e', 'e1x', 'e99999999999999999999', 'ee5'];
    const document = buildRun({ path: ids.map((id) => pullPoint({ id })) });
    expect(elementIdAfter(document)).toBe('e1');
  });
});
