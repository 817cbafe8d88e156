import { describe, expect, it } from 'vitest';
import { TRADE_SIZES } from '../run/run-document';
import type { RacewayType } from '../run/run-document';
import { CONDUIT_OUTSIDE_DIAMETERS, conduitOutsideDiameter } from './conduit-outside-diameters';
import { racewayDimensions } from './raceway-dimensions';

/** Wall of EMT, in, as the Steel Tube Institute publishes it. */
const EMT_WALLS = {
  '1/2': 0.042,
  '3/4': 0.049,
  '1': 0.057,
  '1-1/4': 0.065,
  '1-1/2': 0.065,
  '2': 0.065,
  '2-1/2': 0.072,
  '3': 0.072,
  '3-1/2': 0.083,
  '4': 0.083,
} as const;

describe.each(Object.keys(CONDUIT_OUTSIDE_DIAMETERS) as RacewayType[])('%s', (type) => {
  const sizes = TRADE_SIZES.filter((size) => conduitOutsideDiameter(type, size) !== null);

  it('is wider outside than inside and grows with the trade size', () => {
    let last = 0;
    for (const size of sizes) {
      const outside = conduitOutsideDiameter(type, size) ?? 0;
      expect(outside).toBeGreaterThan(racewayDimensions(type, size)?.bore ?? Infinity);
      expect(outside).toBeGreaterThan(last);
      last = outside;
    }
  });
});

it.each(Object.entries(EMT_WALLS))('%s EMT less twice its wall is its bore', (size, wall) => {
  const tradeSize = size as keyof typeof EMT_WALLS;
  const outside = conduitOutsideDiameter('EMT', tradeSize) ?? 0;
  expect(outside - 2 * wall).toBeCloseTo(racewayDimensions('EMT', tradeSize)?.bore ?? 0, 9);
});
