import { afterAll, describe, expect, it } from 'vitest';
import { FACTORY_ELBOWS } from './factory-elbows';
import { RACEWAY_TYPES, TRADE_SIZES, WIRE_SIZES } from '../run/run-document';
import type { TradeSize, WireSize } from '../run/run-document';
import { BARE_TABLE, bareConductor } from './bare-conductors';
import { ARTICLES, BEND_SECTIONS } from './bend-limits';
import { BEND_RADIUS_TABLE, HDPE_RADIUS_TABLE } from './bend-radius';
import { COMPACT_TABLE } from './compact-conductors';
import { FILL_PERCENT, JAM_BAND, NIPPLE, ROUNDING } from './fill-limits';
import { INSULATED_TABLE, insulatedConductor } from './insulated-conductors';
import type { InsulatedType } from './insulated-conductors';
import { METRIC_DESIGNATORS } from './metric-designators';
import { METRIC_QUIRKS, RACEWAY_TABLE, racewayDimensions } from './raceway-dimensions';
import { THREE_EIGHTHS_TABLE } from './three-eighths-flex';

// The tables hold what the code prints; here each printed figure is held against the others that it must agree with.
let checks = 0;
const circle = (diameter: number) => (Math.PI / 4) * diameter * diameter;
const MM = 25.4;

function holds(condition: boolean, what: string): void {
  checks += 1;
  if (!condition) expect.fail(what);
}

function near(value: number, wanted: number, tolerance: number, what: string): void {
  holds(
    Math.abs(value - wanted) <= tolerance + 1e-9,
    `${what}: ${value}, not ${wanted} ± ${tolerance}`,
  );
}

function rises(values: readonly number[], what: string): void {
  values.slice(1).forEach((value, index) => {
    const before = values[index] ?? 0;
    holds(value > before, `${what}: ${before} then ${value}`);
  });
}

/** Half of the last printed digit of a diameter, carried into its area. */
const areaSlack = (diameter: number) => (Math.PI / 2) * diameter * 0.0005;

afterAll(() => console.warn(`figure: the tables agree with themselves in ${checks} checks`));

describe('Table 4, raceways', () => {
  it('prints areas that follow from the bores, and percent columns that follow from the areas', () => {
    for (const type of RACEWAY_TYPES) {
      for (const [size, bore, area, a60, a53, a31, a40] of RACEWAY_TABLE[type]) {
        const name = `${type} ${size}`;
        // IMC 5 and 6 are printed to two decimals.
        const last = type === 'IMC' && (size === '5' || size === '6') ? 0.006 : 0.00051;
        near(area, circle(bore), areaSlack(bore) + last, `${name} area`);
        for (const [column, share] of [
          [a60, 0.6],
          [a53, 0.53],
          [a31, 0.31],
          [a40, 0.4],
        ] as const) {
          near(column, share * area, share * 0.0005 + last, `${name} ${share}`);
        }
        holds(a31 < a40 && a40 < a53 && a53 < a60 && a60 < area, `${name} columns in order`);
      }
    }
  });

  it('prints metric columns that convert, but for the rows named as quirks', () => {
    for (const type of RACEWAY_TYPES) {
      for (const [size, bore, area, , , , , boreMm, areaMm2] of RACEWAY_TABLE[type]) {
        const name = `${type} ${size}`;
        const quirk = METRIC_QUIRKS.some((row) => row.type === type && row.tradeSize === size);
        const apart = Math.abs(boreMm - bore * MM);
        holds(quirk ? apart > 0.065 && apart < 0.7 : apart <= 0.065, `${name} mm: ${apart}`);
        near(areaMm2, circle(boreMm), (Math.PI / 2) * boreMm * 0.05 + 0.6, `${name} mm²`);
        near(areaMm2 / 645.16, area, 0.012 * area, `${name} mm² to in²`);
      }
    }
  });

  it('grows with the trade size, and from heavy wall to thin', () => {
    for (const type of RACEWAY_TYPES) {
      const rows = RACEWAY_TABLE[type];
      rises(
        rows.map(([size]) => TRADE_SIZES.indexOf(size)),
        `${type} sizes`,
      );
      rises(
        rows.map(([, bore]) => bore),
        `${type} bores`,
      );
    }
    const wider = [
      ['PVC-40', 'PVC-80'],
      ['IMC', 'RMC'],
      ['PVC-A', 'PVC-40'],
    ] as const;
    for (const size of TRADE_SIZES) {
      for (const [thin, thick] of wider) {
        const a = racewayDimensions(thin, size);
        const b = racewayDimensions(thick, size);
        if (a && b) holds(a.bore > b.bore, `${thin} wider than ${thick} at ${size}`);
      }
      const hdpe = racewayDimensions('HDPE-40', size);
      const pvc = racewayDimensions('PVC-40', size);
      if (hdpe && pvc) holds(hdpe.bore === pvc.bore, `HDPE-40 has the bore of PVC-40 at ${size}`);
    }
  });
});

describe('Tables 5, 5A and 8, conductors', () => {
  const types = Object.keys(INSULATED_TABLE) as InsulatedType[];

  it('print areas that follow from the diameters, in inches and millimetres', () => {
    for (const type of types) {
      for (const [size, diameter, area, diameterMm, areaMm2] of INSULATED_TABLE[type]) {
        const name = `${type} ${size}`;
        near(area, circle(diameter), areaSlack(diameter) + 0.00006, `${name} area`);
        near(diameterMm, diameter * MM, Math.max(0.006, diameter * MM * 0.0004), `${name} mm`);
        near(areaMm2, area * 645.16, Math.max(0.04, area * 645.16 * 0.0025), `${name} mm²`);
      }
      rises(
        INSULATED_TABLE[type].map(([size]) => WIRE_SIZES.indexOf(size)),
        `${type} sizes`,
      );
      rises(
        INSULATED_TABLE[type].map(([, diameter]) => diameter),
        `${type} diameters`,
      );
    }
  });

  it('put thinner insulation on thinner conductors', () => {
    const area = (type: InsulatedType, size: WireSize) => insulatedConductor(type, size)?.area;
    for (const size of WIRE_SIZES) {
      const [thhn, thw, xhhw] = [area('THHN', size), area('THW', size), area('XHHW-2', size)];
      const [covered, plain] = [area('RHW-2-covered', size), area('RHW-2', size)];
      if (thhn && thw) holds(thhn < thw, `THHN under THW at ${size}`);
      if (xhhw && thw) holds(xhhw <= thw, `XHHW-2 not over THW at ${size}`);
      if (covered && plain) holds(covered > plain, `a covering adds at ${size}`);
      // From 6 AWG up the table prints RHW-2 without covering and THW in one row.
      if (plain && thw && WIRE_SIZES.indexOf(size) >= WIRE_SIZES.indexOf('6')) {
        holds(plain === thw, `RHW-2 is THW at ${size}`);
      }
      const bare = bareConductor(size, false);
      if (thhn) holds(thhn > bare.area, `insulated over bare at ${size}`);
    }
  });

  it('print compact conductors smaller than concentric ones', () => {
    rises(
      COMPACT_TABLE.map(([, bare]) => bare),
      'compact bare',
    );
    for (const [size, bare, ...columns] of COMPACT_TABLE) {
      holds(bare < bareConductor(size, false).diameter, `compact under concentric at ${size}`);
      for (let column = 0; column < columns.length; column += 2) {
        const [diameter, area] = [columns[column], columns[column + 1]];
        holds((diameter === null) === (area === null), `${size}: both or neither`);
        if (!diameter || !area) continue;
        near(area, circle(diameter), areaSlack(diameter) + 0.00006, `compact ${size} area`);
        holds(diameter > bare, `compact ${size} insulated over bare`);
      }
    }
  });

  it('print bare conductors that follow from their strands, and sizes from the AWG formula', () => {
    const LAY_UP: Record<number, number> = { 1: 1, 7: 3, 19: 5, 37: 7, 61: 9, 91: 11, 127: 13 };
    for (const [size, strands, cmil, strandDiameter, diameter, area, areaMm2] of BARE_TABLE) {
      const name = `${size}/${strands}`;
      const strand = strandDiameter ?? diameter;
      near(area, circle(diameter), areaSlack(diameter) + 0.0006, `${name} area`);
      const slack = 0.0005 / strand + 0.012;
      near((strands * strand * strand * 1e6) / cmil, 1, 2 * slack, `${name} cmil`);
      near(diameter / ((LAY_UP[strands] ?? 0) * strand), 1, slack, `${name} lay-up`);
      // 1 cmil is π/4 × 10⁻⁶ in².
      near(areaMm2, cmil * 5.067075e-4, Math.max(0.6, cmil * 1.0134e-6), `${name} mm²`);
      if (WIRE_SIZES.indexOf(size) > WIRE_SIZES.indexOf('4/0')) {
        holds(cmil === Number(size) * 1000, `${name} is its kcmil`);
        continue;
      }
      // AWG: d = 5 mil × 92^((36 − n)/39).
      const gauge = size.endsWith('/0') ? 1 - Number(size[0]) : Number(size);
      near(cmil / (5 * 92 ** ((36 - gauge) / 39)) ** 2, 1, 0.004, `${name} AWG`);
    }
  });
});

describe('Table 2 and its companions, radii', () => {
  it('grow with the trade size; other bends are never tighter', () => {
    rises(
      BEND_RADIUS_TABLE.map(([, oneShot]) => oneShot),
      'one-shot',
    );
    rises(
      BEND_RADIUS_TABLE.map(([, , other]) => other),
      'other bends',
    );
    rises(
      HDPE_RADIUS_TABLE.map(([, radius]) => radius),
      'HDPE',
    );
    for (const [size, oneShot, other, oneShotMm, otherMm] of BEND_RADIUS_TABLE) {
      holds(other >= oneShot, `other bends at ${size}`);
      near(oneShotMm, oneShot * MM, 0.3, `one-shot mm at ${size}`);
      near(otherMm, other * MM, 0.3, `other mm at ${size}`);
    }
  });

  it('are those of factory elbows', () => {
    for (const [size, radius] of FACTORY_ELBOWS) {
      const row = BEND_RADIUS_TABLE.find(([rowSize]) => rowSize === size);
      holds(row?.[1] === radius, `factory elbow ${size}`);
    }
  });
});

describe('the small tables', () => {
  it('hold the figures everything else rests on', () => {
    expect(FILL_PERCENT).toEqual({ one: 53, two: 31, overTwo: 40 });
    expect([NIPPLE.percent, NIPPLE.maxLength, ROUNDING.from]).toEqual([60, 24, 0.8]);
    expect([JAM_BAND.from, JAM_BAND.to]).toEqual([2.8, 3.2]);
  });

  it('give every raceway type an article, and every edition a section', () => {
    for (const type of RACEWAY_TYPES) holds(/^3\d\d$/.test(ARTICLES[type]), `article of ${type}`);
    expect(BEND_SECTIONS['NEC-2020'].section).toBe('26');
    expect(BEND_SECTIONS['NEC-2023'].section).toBe('24(B)');
  });

  it('number metric designators upward, near their trade sizes', () => {
    const sizeOf = (size: TradeSize) =>
      size.split('-').reduce((sum, part) => {
        const [top = 0, bottom = 1] = part.split('/').map(Number);
        return sum + top / bottom;
      }, 0);
    rises(
      TRADE_SIZES.map((size) => METRIC_DESIGNATORS[size]),
      'designators',
    );
    for (const size of TRADE_SIZES) near(METRIC_DESIGNATORS[size], sizeOf(size) * MM, 6, size);
  });

  it('allow no fewer in 3/8 flex with the fittings outside', () => {
    for (const [size, thickIn, thickOut, thinIn, thinOut] of THREE_EIGHTHS_TABLE) {
      holds(thickIn <= thickOut && thinIn <= thinOut, `3/8 at ${size}`);
    }
  });
});
