import fc from 'fast-check';
import { racewayDimensions } from '../src/tables/raceway-dimensions';
import { conductorDimensions } from '../src/run/conductor-dimensions';
import {
  CODE_EDITIONS,
  COMPASS,
  CONDUCTOR_USES,
  CONDUIT_BODIES,
  DEVICES,
  FITTINGS,
  INSULATIONS,
  MATERIALS,
  RACEWAY_TYPES,
  STRANDINGS,
  TRADE_SIZES,
  WIRE_COLOURS,
  WIRE_SIZES,
} from '../src/run/run-document';
import type {
  ConductorGroup,
  Direction,
  PathElement,
  PullPoint,
  Raceway,
  RunDocument,
  WireGroup,
} from '../src/run/run-document';
import { buildRun } from '../src/run/build-run';

export interface RunShape {
  /** Whether pieces say where they turn: none do, all do, or some. */
  directions?: 'none' | 'all' | 'some';
  /** Most pieces between the two ends. */
  most?: number;
}

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** Lengths from a hair to a mile, most of them such as a tape shows. */
const inches = fc.oneof(
  { weight: 4, arbitrary: fc.integer({ min: 1, max: 64 * 1_200 }).map((parts) => parts / 64) },
  { weight: 1, arbitrary: number(1e-3, 63_360) },
);
const angleUpTo = (most: number) =>
  fc.oneof(
    {
      weight: 3,
      arbitrary: fc.constantFrom(
        ...[5, 10, 15, 22.5, 30, 45, 60, 90].filter((angle) => angle <= most),
      ),
    },
    { weight: 1, arbitrary: number(1e-3, most) },
  );
const maybe = <T>(value: fc.Arbitrary<T>): fc.Arbitrary<T | undefined> =>
  fc.option(value, { nil: undefined });

const RACEWAYS: Raceway[] = RACEWAY_TYPES.flatMap((type) =>
  TRADE_SIZES.filter((tradeSize) => racewayDimensions(type, tradeSize)).map((tradeSize) => ({
    type,
    tradeSize,
  })),
);
const raceway: fc.Arbitrary<Raceway> = fc
  .record({
    size: fc.constantFrom(...RACEWAYS),
    bendRadius: maybe(fc.constantFrom(null, 4.5, 6, 18)),
  })
  .map(({ size, bendRadius }) => ({ ...size, ...(bendRadius !== undefined && { bendRadius }) }));

const direction: fc.Arbitrary<Direction> = fc.oneof(
  { weight: 3, arbitrary: fc.constantFrom(...COMPASS) },
  { weight: 1, arbitrary: fc.record({ azimuth: number(0, 360), elevation: number(-90, 90) }) },
);

function towardOf(directions: RunShape['directions']): fc.Arbitrary<Direction | undefined> {
  if (directions === 'none') return fc.constant(undefined);
  return directions === 'all' ? direction : maybe(direction);
}

type Parts<T> = { [K in keyof T]: fc.Arbitrary<T[K]> };
/** A record of one kind of element, without the fields that came out undefined: documents are sparse. */
function piece<T extends PathElement>(
  kind: T['kind'],
  parts: Parts<Omit<T, 'kind' | 'id'>>,
): fc.Arbitrary<T> {
  return fc.record(parts).map((fields) => sparse({ kind, id: '', ...fields }) as unknown as T);
}

function sparse<T extends object>(fields: T): T {
  return Object.fromEntries(Object.entries(fields).filter(([, value]) => value !== undefined)) as T;
}

function pullPoints(
  shape: RunShape,
  accessible: fc.Arbitrary<boolean | undefined>,
): fc.Arbitrary<PullPoint> {
  const turn = fc
    .record({ angle: angleUpTo(180), toward: towardOf(shape.directions) })
    .map((fields) => sparse(fields));
  // A body that turns by itself would say no direction where all must.
  const bodies = CONDUIT_BODIES.filter(
    (body) => shape.directions !== 'all' || !/^L[BLR]$/.test(body),
  );
  return piece<PullPoint>('pull-point', {
    device: fc.constantFrom(...DEVICES),
    label: maybe(fc.constantFrom('LP-2', 'JB-4', 'AHU-4')),
    accessible,
    body: maybe(fc.constantFrom(...bodies)),
    turn: maybe(turn),
    raceway: fc.oneof(
      { weight: 4, arbitrary: fc.constant(undefined) },
      { weight: 1, arbitrary: raceway },
    ),
  });
}

function middlePieces(shape: RunShape): fc.Arbitrary<PathElement> {
  const toward = towardOf(shape.directions);
  const radius = maybe(number(1, 60));
  const made = maybe(fc.constantFrom('field' as const, 'factory' as const));
  return fc.oneof(
    { weight: 5, arbitrary: piece('straight', { length: inches }) },
    {
      weight: 3,
      arbitrary: piece('bend', {
        angle: angleUpTo(150),
        toward,
        radius,
        made,
        counts: maybe(fc.boolean()),
        why: fc.constant(undefined),
      }),
    },
    {
      weight: 2,
      arbitrary: piece('offset', {
        rise: number(0.1, 48),
        angle: angleUpTo(89),
        toward,
        radius,
        made,
      }),
    },
    {
      weight: 1,
      arbitrary: piece('saddle-3', {
        height: number(0.1, 24),
        angle: angleUpTo(60),
        toward,
        radius,
      }),
    },
    {
      weight: 1,
      arbitrary: piece('saddle-4', {
        height: number(0.1, 24),
        width: number(0.1, 60),
        angle: angleUpTo(89),
        toward,
        radius,
      }),
    },
    {
      weight: 1,
      arbitrary: piece('flex', { length: inches, degrees: maybe(number(0, 360)), raceway }),
    },
    {
      weight: 1,
      arbitrary: piece('fitting', {
        fitting: fc.constantFrom(...FITTINGS),
        angle: maybe(angleUpTo(90)),
      }),
    },
    { weight: 1, arbitrary: piece('transition', { raceway }) },
    { weight: 2, arbitrary: pullPoints(shape, maybe(fc.boolean())) },
  );
}

const WIRES: WireGroup[] = INSULATIONS.flatMap((insulation) =>
  WIRE_SIZES.flatMap((size) =>
    MATERIALS.flatMap((material) =>
      STRANDINGS.map((stranding): WireGroup => ({
        id: '',
        count: 1,
        use: 'phase',
        size,
        insulation,
        material,
        stranding,
      })),
    ),
  ),
).filter((group) => conductorDimensions(group));

const group: fc.Arbitrary<ConductorGroup> = fc
  .record({
    wire: fc.oneof(
      { weight: 4, arbitrary: fc.constantFrom(...WIRES) },
      {
        weight: 1,
        arbitrary: fc
          .record({ od: number(0.05, 4), weight: number(0.01, 20), maxTension: number(1, 1e4) })
          .map((figures) => ({ cable: { name: 'Cable', ...figures } })),
      },
    ),
    count: fc.integer({ min: 1, max: 12 }),
    use: fc.constantFrom(...CONDUCTOR_USES),
    colour: maybe(fc.constantFrom(...WIRE_COLOURS)),
  })
  .map(({ wire, ...fields }) => sparse({ ...wire, ...fields, id: '' }) as ConductorGroup);

/** Gives groups a stretch between two pull points, in order, where the dice say so. */
function stretched(
  path: readonly PathElement[],
  groups: readonly ConductorGroup[],
  dice: readonly number[],
): ConductorGroup[] {
  const points = path.filter(({ kind }) => kind === 'pull-point').map(({ id }) => id);
  return groups.map((each, index) => {
    const from = Math.floor((dice[2 * index] ?? 0) * (points.length - 1));
    const to = from + 1 + Math.floor((dice[2 * index + 1] ?? 0) * (points.length - 1 - from));
    const isWhole = from === 0 && to === points.length - 1;
    return isWhole ? each : { ...each, from: points[from], to: points[to] };
  });
}

/** Any valid run document: every kind of piece, raceway and conductor, with or without directions and lengths. */
export function arbitraryRun(shape: RunShape = {}): fc.Arbitrary<RunDocument> {
  const most = shape.most ?? 14;
  const middle = fc.oneof(
    { weight: 4, arbitrary: fc.array(middlePieces(shape), { maxLength: most }) },
    {
      weight: 1,
      arbitrary: fc
        .array(middlePieces(shape), { maxLength: most })
        .map((pieces) => pieces.filter(({ kind }) => kind !== 'straight' && kind !== 'flex')),
    },
  );
  const end = pullPoints(shape, fc.constantFrom(undefined, true));
  const overrides = fc
    .record({
      maxDegrees: maybe(fc.constantFrom(null, 180, 270, 300)),
      maxSectionLength: maybe(fc.constantFrom(null, 1_200, 1_800)),
      maxFillPercent: maybe(fc.constantFrom(null, 30, 40)),
      minBendRadius: maybe(fc.constantFrom(null, 12, 36)),
      source: maybe(fc.constant('Spec 26 05 33')),
    })
    .map(sparse);
  const rules = fc
    .record({
      code: maybe(fc.constantFrom(...CODE_EDITIONS)),
      profile: maybe(fc.constantFrom('power' as const, 'telecom' as const)),
      overrides: maybe(overrides),
    })
    .map(sparse);
  return fc
    .record({
      first: end,
      middle,
      last: end,
      raceway,
      rules: maybe(rules),
      heading: shape.directions === 'none' ? fc.constant(undefined) : maybe(direction),
      groups: maybe(fc.array(group, { maxLength: 5 })),
      dice: fc.array(number(0, 0.999), { minLength: 10, maxLength: 10 }),
    })
    .map(({ first, middle: pieces, last, raceway: pipe, rules: read, heading, groups, dice }) => {
      const document = buildRun({
        raceway: pipe,
        ...(read && { rules: read }),
        ...(heading && { start: { heading } }),
        path: [first, ...pieces, last],
        ...(groups && { conductors: groups }),
      });
      const { conductors, path } = document;
      return conductors ? { ...document, conductors: stretched(path, conductors, dice) } : document;
    });
}
