import {
  INSULATIONS,
  STRANDINGS,
  WIRE_SIZES,
  applyCommands,
  analyzeRun,
  buildRun,
  conductorDimensions,
  wires,
} from '@fairlead/shared';
import { describe, expect, it } from 'vitest';
import { listedWire } from './listed-wire';
import { QUICK_SETS, quickWires } from './quick-wires';

describe('listedWire', () => {
  it('keeps what the tables list', () => {
    expect(listedWire(wires(), { size: '10' })).toEqual(wires({ size: '10' }));
  });

  it('always ends on a wire the tables list', () => {
    for (const insulation of INSULATIONS) {
      for (const size of WIRE_SIZES) {
        for (const stranding of STRANDINGS) {
          for (const change of [{ insulation }, { size }, { stranding }]) {
            const wire = listedWire(wires({ size, stranding }), change);
            expect(conductorDimensions(wire), JSON.stringify(wire)).not.toBeNull();
          }
        }
      }
    }
  });
});

describe('quickWires', () => {
  it('adds three hots, a white neutral and a green ground of one size', () => {
    const document = buildRun();
    const commands = quickWires(document, QUICK_SETS[0], {
      size: '12',
      insulation: 'THHN',
      material: 'Cu',
    });
    const after = applyCommands(document, commands);
    expect(after.conductors?.map(({ count, use, colour }) => [count, use, colour])).toEqual([
      [3, 'phase', undefined],
      [1, 'neutral', 'WH'],
      [1, 'ground', 'GN'],
    ]);
    expect(analyzeRun(after).sections[0]?.fill?.conductors).toBe(5);
  });
});
