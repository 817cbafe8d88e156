import { LIMITS } from '../src/contracts/limits';
import { buildRun, pullPoint, straight, wires } from '../src/run/build-run';
import { without, withValue, withValues } from './edit-json';
import { fullRun } from './full-run';

/** A document that must be refused, and every problem it must be refused for. */
export interface MalformedRun {
  title: string;
  input: unknown;
  problems: Record<string, string>;
}

const full = fullRun();
const plain = buildRun();

const many = <T>(count: number, item: (index: number) => T): T[] =>
  Array.from({ length: count }, (_, index) => item(index));

function nested(depth: number): unknown {
  let value: unknown = 1;
  for (let level = 0; level < depth; level += 1) value = { in: value };
  return value;
}

function cyclic(): unknown {
  const environment: Record<string, unknown> = {};
  environment.wet = environment;
  return { ...plain, environment };
}

/** A list that holds itself a thousand times over at every level. */
function explosive(): unknown {
  let list: unknown = [1];
  for (let level = 0; level < 20; level += 1) list = many(300, () => list);
  return { ...plain, path: list };
}

const withGetter = Object.defineProperty({ ...plain }, 'title', {
  enumerable: true,
  get() {
    throw new Error('a getter ran');
  },
});
const trap = new Proxy(
  {},
  {
    ownKeys() {
      throw new Error('a trap ran');
    },
  },
);
const sparse = Object.assign([], plain.path, { length: 6 });
const wireGroup = wires({ id: 'g1' });
const withPath = (...path: unknown[]): unknown => ({ ...plain, path });
const a = pullPoint({ id: 'A' });
const z = pullPoint({ id: 'Z' });
const set = (pointer: string, value: unknown): unknown => withValue(full, pointer, value);

type Row = readonly [title: string, input: unknown, problems: Record<string, string>];

const NOT_DOCUMENTS: Row[] = [
  ['nothing', undefined, { '': 'not-plain-data' }],
  ['null', null, { '': 'wrong-type' }],
  ['text', '{"format":"fairlead.run"}', { '': 'wrong-type' }],
  ['a number', 7, { '': 'wrong-type' }],
  ['NaN', Number.NaN, { '': 'not-finite' }],
  ['a list', [plain], { '': 'wrong-type' }],
  ['a function', () => plain, { '': 'not-plain-data' }],
  ['a symbol', Symbol('run'), { '': 'not-plain-data' }],
  ['a big integer', 1n, { '': 'not-plain-data' }],
  ['a date', new Date(0), { '': 'not-plain-data' }],
  ['a map', new Map([['format', 'fairlead.run']]), { '': 'not-plain-data' }],
  ['an object whose keys cannot be listed', trap, { '': 'not-plain-data' }],
  [
    'an empty object',
    {},
    {
      '/format': 'missing',
      '/version': 'missing',
      '/tag': 'missing',
      '/raceway': 'missing',
      '/path': 'missing',
    },
  ],
];

const UNREADABLE: Row[] = [
  ['a date inside', withValue(plain, '/title', new Date(0)), { '/title': 'not-plain-data' }],
  ['a function inside', { ...plain, title: () => '' }, { '/title': 'not-plain-data' }],
  ['a getter', withGetter, { '/title': 'not-plain-data' }],
  ['a key that is a symbol', { ...plain, [Symbol('k')]: 1 }, { '': 'not-plain-data' }],
  [
    'an object of a class',
    withValue(plain, '/raceway', new URL('a:b')),
    { '/raceway': 'not-plain-data' },
  ],
  [
    'a set for a list',
    withValue(plain, '/path', new Set(plain.path)),
    { '/path': 'not-plain-data' },
  ],
  ['a list with a hole', { ...plain, path: sparse }, { '/path/5': 'missing' }],
  ['a list with undefined in it', withPath(a, undefined, z), { '/path/1': 'missing' }],
  [
    'a document inside itself',
    cyclic(),
    { '/environment/wet': 'wrong-type', [`/environment${'/wet'.repeat(31)}`]: 'too-deep' },
  ],
  ['more values than a document can hold', explosive(), { '': 'too-many-values' }],
  ['a list without end', { ...plain, path: new Array(1e9) }, { '/path': 'too-many' }],
  [
    'nested a hundred thousand deep',
    { ...plain, title: nested(100_000) },
    { '/title': 'wrong-type', [`/title${'/in'.repeat(31)}`]: 'too-deep' },
  ],
  [
    'nested one too deep',
    { ...plain, title: nested(LIMITS.depth) },
    { '/title': 'wrong-type', [`/title${'/in'.repeat(31)}`]: 'too-deep' },
  ],
  [
    'nested as deep as allowed',
    { ...plain, title: nested(LIMITS.depth - 1) },
    { '/title': 'wrong-type' },
  ],
  [
    'a prototype by key',
    JSON.parse(JSON.stringify(plain).replace('"tag"', '"__proto__":{"accessible":true},"tag"')),
    { '/__proto__': 'forbidden-key' },
  ],
  [
    'a constructor',
    withValue(plain, '/raceway/constructor', {}),
    { '/raceway/constructor': 'forbidden-key' },
  ],
  ['a prototype field', withValue(plain, '/prototype', 1), { '/prototype': 'forbidden-key' }],
  ['a key as long as a page', { ...plain, ['k'.repeat(70_000)]: 1 }, { '': 'unknown-key' }],
];

const HEADS: Row[] = [
  ['another format', withValue(plain, '/format', 'other.run'), { '/format': 'not-one-of' }],
  ['version 0', withValue(plain, '/version', 0), { '/version': 'not-one-of' }],
  ['version 1.5', withValue(plain, '/version', 1.5), { '/version': 'not-one-of' }],
  ['version in text', withValue(plain, '/version', '1'), { '/version': 'not-one-of' }],
  [
    'a newer version: its other fields are not judged',
    withValues(plain, { '/version': 2, '/path': 'new' }),
    { '/version': 'version-newer' },
  ],
  ['an unknown key', withValue(plain, '/colour', 'red'), { '/colour': 'unknown-key' }],
  ['a key that a pointer must escape', { ...plain, 'a/b~c': 1 }, { '/a~1b~0c': 'unknown-key' }],
  ['no tag', without(plain, '/tag'), { '/tag': 'missing' }],
  ['an empty tag', withValue(plain, '/tag', ''), { '/tag': 'too-short' }],
  ['a tag with a space before it', withValue(plain, '/tag', ' F-1'), { '/tag': 'untrimmed-text' }],
  ['a tag over the limit', withValue(plain, '/tag', 'x'.repeat(41)), { '/tag': 'too-long' }],
  ['a tag with a line break', withValue(plain, '/tag', 'F\n1'), { '/tag': 'unclean-text' }],
  [
    'a title with half a character',
    withValue(plain, '/title', 'F\ud800'),
    { '/title': 'unclean-text' },
  ],
  [
    'a title that turns the line round',
    withValue(plain, '/title', 'a\u202eb'),
    { '/title': 'unclean-text' },
  ],
  ['a title that is null', withValue(plain, '/title', null), { '/title': 'wrong-type' }],
];

const RULES: Row[] = [
  ['an unknown edition', set('/rules/code', 'NEC-2011'), { '/rules/code': 'not-one-of' }],
  ['an unknown profile', set('/rules/profile', 'data'), { '/rules/profile': 'not-one-of' }],
  [
    'a limit of 0°',
    set('/rules/overrides/maxDegrees', 0),
    { '/rules/overrides/maxDegrees': 'too-small' },
  ],
  [
    'overrides below zero, two of them',
    withValues(full, {
      '/rules/overrides/maxSectionLength': -1,
      '/rules/overrides/minBendRadius': -4,
    }),
    {
      '/rules/overrides/maxSectionLength': 'too-small',
      '/rules/overrides/minBendRadius': 'too-small',
    },
  ],
  [
    'a fill over 100 %',
    set('/rules/overrides/maxFillPercent', 101),
    { '/rules/overrides/maxFillPercent': 'too-large' },
  ],
  ['a raceway nobody makes', set('/raceway/type', 'PVC'), { '/raceway/type': 'not-one-of' }],
  ['a size nobody makes', set('/raceway/tradeSize', '7/8'), { '/raceway/tradeSize': 'not-one-of' }],
  [
    'a size this type has not',
    set('/raceway', { type: 'EMT', tradeSize: '3/8' }),
    { '/raceway/tradeSize': 'no-such-size' },
  ],
  ['a radius of 0', set('/raceway/bendRadius', 0), { '/raceway/bendRadius': 'too-small' }],
  [
    'a size the raceway after a pull point has not',
    set('/path/4/raceway', { type: 'FMC', tradeSize: '6' }),
    { '/path/4/raceway/tradeSize': 'no-such-size' },
  ],
  [
    'a heading with another name',
    set('/start/heading', 'left'),
    { '/start/heading': 'not-one-of' },
  ],
  [
    'a heading past the circle and past upright',
    set('/start/heading', { azimuth: 361, elevation: -91 }),
    { '/start/heading/azimuth': 'too-large', '/start/heading/elevation': 'too-small' },
  ],
  [
    'half a direction',
    set('/start/heading', { azimuth: 90 }),
    { '/start/heading/elevation': 'missing' },
  ],
  ['a heading that is a number', set('/start/heading', 90), { '/start/heading': 'not-one-of' }],
];

const PATHS: Row[] = [
  ['no path', without(plain, '/path'), { '/path': 'missing' }],
  ['a path of one', withPath(a), { '/path': 'too-few' }],
  ['an empty path', withPath(), { '/path': 'too-few' }],
  [
    'a path of 501',
    withPath(a, ...many(LIMITS.elements - 1, (index) => straight({ id: `s${index}` })), z),
    { '/path': 'too-many' },
  ],
  [
    'a start that is no pull point',
    without(plain, '/path/0'),
    { '/path/0/kind': 'end-not-pull-point' },
  ],
  [
    'ends that are no pull points',
    withPath(straight({ id: 's' }), straight({ id: 't' })),
    { '/path/0/kind': 'end-not-pull-point', '/path/1/kind': 'end-not-pull-point' },
  ],
  [
    'an end nobody can reach',
    set('/path/10/accessible', false),
    { '/path/10/accessible': 'end-not-accessible' },
  ],
  ['an element of no kind', withPath(a, { id: 'x' }, z), { '/path/1/kind': 'missing' }],
  [
    'an element of an unknown kind',
    withPath(a, { kind: 'elbow', id: 'x' }, z),
    { '/path/1/kind': 'not-one-of' },
  ],
  ['an element that is a number', withPath(a, 7, z), { '/path/1': 'wrong-type' }],
  ['an unknown key in an element', set('/path/1/angle', 5), { '/path/1/angle': 'unknown-key' }],
  ['two elements of one id', set('/path/3/id', 'b1'), { '/path/3/id': 'duplicate-id' }],
  ['an element without an id', without(full, '/path/1/id'), { '/path/1/id': 'missing' }],
  ['an empty id', set('/path/1/id', ''), { '/path/1/id': 'id-not-allowed' }],
  [
    'an id every object answers to',
    set('/path/1/id', 'toString'),
    { '/path/1/id': 'id-not-allowed' },
  ],
  ['an id with a slash', set('/path/1/id', 'a/b'), { '/path/1/id': 'id-not-allowed' }],
  ['an id over the limit', set('/path/1/id', 'x'.repeat(65)), { '/path/1/id': 'too-long' }],
  ['a straight of 0', set('/path/1/length', 0), { '/path/1/length': 'too-small' }],
  ['a straight below 0', set('/path/1/length', -3), { '/path/1/length': 'too-small' }],
  ['a straight without end', set('/path/1/length', Infinity), { '/path/1/length': 'not-finite' }],
  ['a straight of NaN', set('/path/1/length', Number.NaN), { '/path/1/length': 'not-finite' }],
  [
    'a straight longer than a county',
    set('/path/1/length', 1e7),
    { '/path/1/length': 'too-large' },
  ],
  ['a straight in text', set('/path/1/length', "10'"), { '/path/1/length': 'wrong-type' }],
  ['a bend of 151°', set('/path/2/angle', 151), { '/path/2/angle': 'too-large' }],
  ['a bend of 0°', set('/path/2/angle', 0), { '/path/2/angle': 'too-small' }],
  ['a bend made by nobody', set('/path/2/made', 'robot'), { '/path/2/made': 'not-one-of' }],
  ['a bend that counts in text', set('/path/2/counts', 'no'), { '/path/2/counts': 'wrong-type' }],
  ['a bend with a radius below 0', set('/path/2/radius', -5), { '/path/2/radius': 'too-small' }],
  ['an offset at 90°', set('/path/3/angle', 90), { '/path/3/angle': 'too-large' }],
  ['an offset without a rise', without(full, '/path/3/rise'), { '/path/3/rise': 'missing' }],
  ['a 3-bend saddle at 61°', set('/path/5/angle', 61), { '/path/5/angle': 'too-large' }],
  [
    'a 4-bend saddle at 90° over nothing',
    withValues(full, { '/path/6/angle': 90, '/path/6/width': 0 }),
    { '/path/6/angle': 'too-large', '/path/6/width': 'too-small' },
  ],
  [
    'a flexible piece without its raceway',
    without(full, '/path/9/raceway'),
    { '/path/9/raceway': 'missing' },
  ],
  ['flexible degrees below 0', set('/path/9/degrees', -1), { '/path/9/degrees': 'too-small' }],
  [
    'a fitting nobody knows',
    set('/path/8/fitting', 'coupling'),
    { '/path/8/fitting': 'not-one-of' },
  ],
  ['a transition to nothing', set('/path/7/raceway', null), { '/path/7/raceway': 'wrong-type' }],
  ['a device nobody knows', set('/path/4/device', 'tee'), { '/path/4/device': 'not-one-of' }],
  ['a body nobody knows', set('/path/4/body', 'LX'), { '/path/4/body': 'not-one-of' }],
  [
    'a turn past a half circle toward nowhere',
    set('/path/4/turn', { angle: 181, toward: 'in' }),
    { '/path/4/turn/angle': 'too-large', '/path/4/turn/toward': 'not-one-of' },
  ],
  [
    'an entry on no wall in row 0',
    set('/path/4/entries/0', { wall: 'lid', row: 0, tradeSize: '3/4' }),
    { '/path/4/entries/0/wall': 'not-one-of', '/path/4/entries/0/row': 'too-small' },
  ],
  ['a row and a half', set('/path/4/entries/0/row', 1.5), { '/path/4/entries/0/row': 'not-whole' }],
  ['make-up below 0', set('/path/0/makeUp', -1), { '/path/0/makeUp': 'too-small' }],
  [
    'a box without depth',
    without(full, '/path/4/boxSize/depth'),
    { '/path/4/boxSize/depth': 'missing' },
  ],
  ['a label with a tab', set('/path/0/label', 'LP\t2'), { '/path/0/label': 'unclean-text' }],
];

const CONDUCTORS: Row[] = [
  ['conductors that are no list', set('/conductors', {}), { '/conductors': 'wrong-type' }],
  ['a group that is text', set('/conductors/0', '3x12'), { '/conductors/0': 'wrong-type' }],
  [
    'more groups than allowed',
    {
      ...plain,
      conductors: many(LIMITS.conductorGroups + 1, (index) => wires({ id: `g${index}` })),
    },
    { '/conductors': 'too-many' },
  ],
  ['no wires in a group', set('/conductors/0/count', 0), { '/conductors/0/count': 'too-small' }],
  ['two and a half wires', set('/conductors/0/count', 2.5), { '/conductors/0/count': 'not-whole' }],
  ['a size nobody draws', set('/conductors/0/size', '5'), { '/conductors/0/size': 'not-one-of' }],
  [
    'a size no table lists for the insulation',
    set('/conductors/0', { ...wireGroup, size: '2000', insulation: 'THHN' }),
    { '/conductors/0/size': 'no-table-row' },
  ],
  [
    'neither a wire nor a cable',
    set('/conductors/0', { id: 'g1', count: 1, use: 'phase' }),
    {
      '/conductors/0/size': 'missing',
      '/conductors/0/insulation': 'missing',
      '/conductors/0/material': 'missing',
      '/conductors/0/stranding': 'missing',
    },
  ],
  [
    'both a wire and a cable',
    set('/conductors/1/size', '12'),
    { '/conductors/1/size': 'unknown-key' },
  ],
  [
    'a cable without size, weight or name',
    withValues(full, {
      '/conductors/1/cable/od': 0,
      '/conductors/1/cable/weight': null,
      '/conductors/1/cable/name': '',
    }),
    {
      '/conductors/1/cable/od': 'too-small',
      '/conductors/1/cable/weight': 'wrong-type',
      '/conductors/1/cable/name': 'too-short',
    },
  ],
  [
    'a colour that is none',
    set('/conductors/0/colour', 'PK'),
    { '/conductors/0/colour': 'not-one-of' },
  ],
  [
    'a group with the id of an element',
    set('/conductors/0/id', 'b1'),
    { '/conductors/0/id': 'duplicate-id' },
  ],
  [
    'a group from nowhere',
    set('/conductors/0/from', 'X'),
    { '/conductors/0/from': 'no-such-pull-point' },
  ],
  [
    'a group to a bend',
    set('/conductors/0/to', 'b1'),
    { '/conductors/0/to': 'no-such-pull-point' },
  ],
  [
    'a group against the path',
    withValues(full, { '/conductors/0/from': 'M', '/conductors/0/to': 'A' }),
    { '/conductors/0/to': 'not-in-order' },
  ],
  [
    'a group from the last pull point',
    set('/conductors/1/from', 'Z'),
    { '/conductors/1/from': 'not-in-order' },
  ],
];

const REST: Row[] = [
  ['no set at all', set('/sets', 0), { '/sets': 'too-small' }],
  [
    'terminations at 80°',
    set('/circuit/terminations', 80),
    { '/circuit/terminations': 'not-one-of' },
  ],
  ['set 4 of 3', set('/parallel/set', 4), { '/parallel/set': 'not-in-order' }],
  ['a rack without room', set('/rack/spacing', 0), { '/rack/spacing': 'too-small' }],
  [
    'a pull against the path',
    set('/pulls/0', { id: 'p', from: 'Z', to: 'A' }),
    { '/pulls/0/to': 'not-in-order' },
  ],
  [
    'a pull to nowhere, fed from nowhere',
    set('/pulls/0', { id: 'p', from: 'A', to: 'X', feedAt: 'middle' }),
    { '/pulls/0/to': 'no-such-pull-point', '/pulls/0/feedAt': 'not-one-of' },
  ],
  [
    'two pulls of one id',
    set('/pulls', [
      { id: 'p', from: 'A', to: 'M' },
      { id: 'p', from: 'M', to: 'Z' },
    ]),
    { '/pulls/1/id': 'duplicate-id' },
  ],
  [
    'friction out of order',
    set('/conditions/friction', { low: 0.5, likely: 0.35, high: 0.2 }),
    { '/conditions/friction/likely': 'not-in-order', '/conditions/friction/high': 'not-in-order' },
  ],
  [
    'friction past 1.2',
    set('/conditions/friction/high', 1.21),
    { '/conditions/friction/high': 'too-large' },
  ],
  [
    'half a person',
    set('/conditions/crew/pulling', 0.5),
    { '/conditions/crew/pulling': 'not-whole' },
  ],
  [
    'a feed tension of one end',
    set('/conditions/feedTension', { from: 5 }),
    { '/conditions/feedTension/to': 'missing' },
  ],
  [
    'a feed tension in text',
    set('/conditions/feedTension', '5'),
    { '/conditions/feedTension': 'not-one-of' },
  ],
  [
    'a sidewall limit of 0',
    set('/conditions/limits/sidewall/stop', 0),
    { '/conditions/limits/sidewall/stop': 'too-small' },
  ],
  [
    'an ambient hotter than an oven',
    set('/environment/ambient', 900),
    { '/environment/ambient': 'too-large' },
  ],
  [
    'wrong in every part at once',
    withValues(full, {
      '/tag': '',
      '/raceway/tradeSize': '3/8',
      '/path/1/length': -1,
      '/path/3/id': 'b1',
      '/path/2/toward': 'sideways',
      '/conductors/0/from': 'X',
      '/conductors/1/cable/od': Infinity,
      '/conditions/friction/low': 0.9,
      '/extra': true,
    }),
    {
      '/tag': 'too-short',
      '/raceway/tradeSize': 'no-such-size',
      '/path/1/length': 'too-small',
      '/path/3/id': 'duplicate-id',
      '/path/2/toward': 'not-one-of',
      '/conductors/0/from': 'no-such-pull-point',
      '/conductors/1/cable/od': 'not-finite',
      '/conditions/friction/likely': 'not-in-order',
      '/extra': 'unknown-key',
    },
  ],
];

export const MALFORMED_RUNS: MalformedRun[] = [
  ...NOT_DOCUMENTS,
  ...UNREADABLE,
  ...HEADS,
  ...RULES,
  ...PATHS,
  ...CONDUCTORS,
  ...REST,
].map(([title, input, problems]) => ({ title, input, problems }));
