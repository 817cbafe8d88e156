import { describe, expect, it } from 'vitest';
import { breakPull, feedPullAt, joinPulls } from './plan-pulls';

const alone = [
  { id: 'a', from: 'a', to: 'b', through: [] },
  { id: 'b', from: 'b', to: 'c', through: [] },
  { id: 'c', from: 'c', to: 'd', through: [] },
];
const joined = [{ id: 'a', from: 'a', to: 'd', through: ['b', 'c'] }];
const plan = [{ id: 'a', from: 'a', to: 'd' }];

describe('a plan of pulls', () => {
  it('joins a pull with the next one', () => {
    expect(joinPulls([], alone, 'a')).toEqual([{ id: 'a', from: 'a', to: 'c' }]);
    const now = [{ id: 'a', from: 'a', to: 'c', through: ['b'] }, alone[2]!];
    expect(joinPulls([{ id: 'a', from: 'a', to: 'c', feedAt: 'to' }], now, 'a')).toEqual(plan);
  });

  it('has nothing to join the last one with', () => {
    expect(joinPulls(plan, alone, 'c')).toEqual(plan);
    expect(joinPulls(plan, alone, 'z')).toEqual(plan);
  });

  it('breaks a pull, and drops the parts that are one section', () => {
    expect(breakPull(plan, joined, 'a', 'b')).toEqual([{ id: 'b', from: 'b', to: 'd' }]);
    expect(breakPull(plan, joined, 'a', 'c')).toEqual([{ id: 'a', from: 'a', to: 'c' }]);
    const two = [{ id: 'a', from: 'a', to: 'c', through: ['b'] }];
    expect(breakPull([{ id: 'a', from: 'a', to: 'c' }], two, 'a', 'b')).toEqual([]);
    expect(breakPull(plan, joined, 'a', 'z')).toEqual(plan);
  });

  it('asks for an end to feed at, and no longer', () => {
    expect(feedPullAt([], alone, 'b', 'to')).toEqual([
      { id: 'b', from: 'b', to: 'c', feedAt: 'to' },
    ]);
    expect(feedPullAt([{ id: 'b', from: 'b', to: 'c', feedAt: 'to' }], alone, 'b', null)).toEqual(
      [],
    );
    expect(feedPullAt(plan, joined, 'a', 'from')).toEqual([{ ...plan[0], feedAt: 'from' }]);
    expect(feedPullAt([{ ...plan[0]!, feedAt: 'from' }], joined, 'a', null)).toEqual(plan);
  });
});
