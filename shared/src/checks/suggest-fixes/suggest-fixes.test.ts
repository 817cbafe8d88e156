import { describe, expect, it } from 'vitest';
import { analyzeRun } from '../../analyze-run';
import type { Finding, Fix } from '../../contracts/run-analysis';
import { DEFAULT_SETTINGS } from '../../contracts/settings';
import {
  bend,
  buildRun,
  flex,
  offset,
  pullPoint,
  saddle3,
  straight,
  transition,
  wires,
} from '../../run/build-run';
import { applyCommands } from '../../run/commands/apply-command';
import type { PathElement, RunDocument } from '../../run/run-document';
import { suggestFixes } from './suggest-fixes';

const settings = DEFAULT_SETTINGS;

function fixesOf(document: RunDocument, code: string, with_ = settings): Fix[] {
  const findings = suggestFixes(document, analyzeRun(document, with_), with_);
  const finding = findings.find((other) => other.code === code);
  expect(finding, `no finding ${code} among ${findings.map((f) => f.code).join()}`).toBeDefined();
  return finding?.fixes ?? [];
}

/** A run of the pieces given, 10 ft apart, between two boxes. */
function runOf(pieces: PathElement[], overrides: Partial<RunDocument> = {}): RunDocument {
  const path = pieces.flatMap((piece) => [straight(), piece]);
  return buildRun({ path: [pullPoint(), ...path, straight(), pullPoint()], ...overrides });
}

const COILED = (angle: number) => [
  bend(),
  bend(),
  bend(),
  offset({ angle }),
  offset({ rise: 0.5, angle: 10 }),
];

const OVER = runOf(COILED(45), { raceway: { type: 'EMT', tradeSize: '1/2' } });

/** Each fix, carried out, does what it says: the finding is gone and no stop is left that was not there. */
function expectHonest(document: RunDocument, code: string, with_ = settings): void {
  const stops = (findings: readonly Finding[]) =>
    findings.filter(({ severity }) => severity === 'stop').length;
  const before = analyzeRun(document, with_);
  for (const fix of fixesOf(document, code, with_)) {
    const after = analyzeRun(applyCommands(document, fix.commands), with_);
    expect(after.findings.filter((finding) => finding.code === code).length).toBeLessThan(
      before.findings.filter((finding) => finding.code === code).length,
    );
    expect(stops(after.findings)).toBeLessThanOrEqual(stops(before.findings));
  }
}

describe('too many degrees', () => {
  it('offers the flatter offset: 22½ gives 335, 30 gives 350, as the second analysis counts', () => {
    const [first, second] = fixesOf(OVER, 'degrees-over');
    expect(first).toMatchObject({
      kind: 'change-angle',
      values: { piece: 'offset', number: 4, angle: 22.5, degrees: 335, limit: 360, remaining: 25 },
      delta: { degrees: -45, lbf: null },
    });
    expect(second).toMatchObject({
      kind: 'change-angle',
      values: { number: 4, angle: 30, degrees: 350, remaining: 10 },
      delta: { degrees: -30 },
    });
    expectHonest(OVER, 'degrees-over');
  });

  it('offers a box where both sides pass, in a leg, clear of the bends', () => {
    const fix = fixesOf(OVER, 'degrees-over').find(({ kind }) => kind === 'add-pull-point');
    expect(fix).toBeDefined();
    const { from, to, station, degreesBefore, degreesAfter } = fix?.values ?? {};
    expect(Number(from)).toBeLessThan(Number(station));
    expect(Number(station)).toBeLessThan(Number(to));
    expect(Number(degreesBefore) + Number(degreesAfter)).toBe(380);
    expect(Math.max(Number(degreesBefore), Number(degreesAfter))).toBeLessThanOrEqual(360);
    expect(fix?.commands[0]?.command).toBe('split-straight');
    const after = analyzeRun(applyCommands(OVER, fix?.commands ?? []));
    expect(after.sections.map(({ degrees }) => degrees)).toEqual([degreesBefore, degreesAfter]);
    expect(after.findings.map(({ code }) => code)).not.toContain('leg-too-short');
    expect(after.sections[0]?.length).toBeCloseTo(Number(station), 6);
  });

  it('puts the box between two pieces where no lengths were given', () => {
    const run = buildRun({ path: [pullPoint(), ...COILED(45), pullPoint()] });
    const fix = fixesOf(run, 'degrees-over').find(({ kind }) => kind === 'add-pull-point');
    expect(fix?.commands[0]?.command).toBe('insert-elements');
    expect(fix?.values).toMatchObject({ lengths: false });
    expectHonest(run, 'degrees-over');
  });

  it('puts making the body in between reachable first: it answers two findings at once', () => {
    const body = pullPoint({ device: 'conduit-body', body: 'LB', accessible: false });
    const run = runOf([bend(), bend(), bend(), body, bend(), bend()]);
    const [first] = fixesOf(run, 'degrees-over');
    expect(first).toMatchObject({
      kind: 'make-accessible',
      values: { number: 4, degreesBefore: 270, degreesAfter: 180, onlyIfReachable: true },
    });
    expect(fixesOf(run, 'access-not-allowed')).toMatchObject([{ kind: 'make-accessible' }]);
    expectHonest(run, 'degrees-over');
  });

  it('offers nothing for eleven 90s without a place that leaves 360 on both sides', () => {
    expect(fixesOf(runOf(Array.from({ length: 11 }, () => bend())), 'degrees-over')).toEqual([]);
  });

  it('goes by the shop’s own limit where that is the one broken', () => {
    const own = { ...settings, maxDegrees: 270 };
    const run = runOf([bend(), bend(), bend(), offset({ angle: 30 })]);
    const fixes = fixesOf(run, 'degrees-over-own-limit', own);
    expect(fixes.map(({ kind }) => kind)).toContain('add-pull-point');
    expect(fixes.map(({ kind }) => kind)).not.toContain('change-angle');
    expectHonest(run, 'degrees-over-own-limit', own);
  });

  it('offers the box although the wires, too many before, are too many on both sides of it', () => {
    const run = { ...OVER, conductors: [{ ...wires({ count: 40 }), id: 'w1' }] };
    expect(fixesOf(run, 'degrees-over').map(({ kind }) => kind)).toContain('add-pull-point');
  });
});

describe('conductors that do not fit', () => {
  /** NEC Chapter 9 Tables 1, 4 and 5: 4 × 500 and 1 × 3 THHN are 40.3 % of 3 PVC-40, 33.1 % of 3 EMT. */
  const feeder = runOf([bend()], {
    raceway: { type: 'PVC-40', tradeSize: '3' },
    conductors: [wires({ count: 4, size: '500' }), wires({ count: 1, size: '3', use: 'ground' })],
  });

  it('offers the next size and the same size of another type, with the fill each gives', () => {
    const fixes = fixesOf(feeder, 'fill-over');
    const percentOf = (type: string, tradeSize: string) =>
      Number(
        fixes.find(({ values }) => values.type === type && values.tradeSize === tradeSize)?.values
          .percent,
      );
    expect(fixes[0]?.values).toMatchObject({
      type: 'PVC-40',
      tradeSize: '3-1/2',
      fromTradeSize: '3',
    });
    expect(percentOf('PVC-40', '3-1/2')).toBeCloseTo(30.1, 1);
    expectHonest(feeder, 'fill-over');
  });

  it('offers 3 EMT for the 3 PVC-40 that is over', () => {
    const types = fixesOf(feeder, 'fill-over').map(
      ({ values }) => `${values.type} ${values.tradeSize}`,
    );
    expect(types).toContain('EMT 3');
  });

  it('changes the raceway where it is written: at the pull point it changes at', () => {
    const run = buildRun({
      path: [
        pullPoint(),
        straight(),
        pullPoint({ raceway: { type: 'EMT', tradeSize: '1/2' } }),
        straight(),
        bend(),
        straight(),
        pullPoint(),
      ],
      raceway: { type: 'EMT', tradeSize: '2' },
      conductors: [wires({ count: 20 })],
    });
    const [first] = fixesOf(run, 'fill-over');
    expect(first?.commands).toEqual([
      {
        command: 'set-element',
        args: { elementId: 'e3', patch: { raceway: { type: 'EMT', tradeSize: '1' } } },
      },
    ]);
    expectHonest(run, 'fill-over');
  });

  it('changes a flexible tail and a transition that are the smallest bore', () => {
    const tail = runOf([bend(), flex({ raceway: { type: 'FMC', tradeSize: '1/2' } })], {
      raceway: { type: 'EMT', tradeSize: '2' },
      conductors: [wires({ count: 20 })],
    });
    expect(fixesOf(tail, 'fill-over')[0]?.values).toMatchObject({
      type: 'FMC',
      fromTradeSize: '1/2',
    });
    const changed = runOf([bend(), transition({ raceway: { type: 'PVC-80', tradeSize: '1/2' } })], {
      raceway: { type: 'EMT', tradeSize: '2' },
      conductors: [wires({ count: 10 })],
    });
    expect(fixesOf(changed, 'fill-over')[0]?.commands[0]).toMatchObject({ command: 'set-element' });
    expectHonest(changed, 'fill-over');
  });

  it('gets three equal conductors out of the jam band by the next size', () => {
    /** NEC Chapter 9 Table 1 Informational Note 2: 3 × 250 THHN in 2 EMT read 2.91. */
    const run = runOf([bend()], {
      raceway: { type: 'EMT', tradeSize: '2' },
      conductors: [wires({ count: 3, size: '250' })],
    });
    const fixes = fixesOf(run, 'jam-possible');
    expect(fixes[0]?.values).toMatchObject({ type: 'EMT', tradeSize: '2-1/2' });
    expect(Number(fixes[0]?.values.jamRatio)).toBeGreaterThan(3.2);
    expectHonest(run, 'jam-possible');
  });
});

describe('bends that cannot be made', () => {
  it('lengthens a short leg by what it lacks, up to the next sixteenth', () => {
    const run = buildRun({
      path: [
        pullPoint(),
        straight(),
        bend(),
        straight({ length: 6 }),
        bend(),
        straight(),
        pullPoint(),
      ],
      raceway: { type: 'EMT', tradeSize: '3/4', bendRadius: 5.46 },
    });
    const [fix, ...others] = fixesOf(run, 'leg-too-short');
    expect(others).toEqual([]);
    // Two tangents of 5.46 need 10.92 in: 4.92 more, 4 15/16 on a tape.
    expect(fix?.values).toMatchObject({ number: 2, added: 4.9375, length: 10.9375 });
    // The arcs took all of the short leg: only what is past them makes the run longer.
    expect(fix?.delta.inches).toBeCloseTo(10.9375 - 10.92, 9);
    expectHonest(run, 'leg-too-short');
  });

  it('puts in the leg that is missing between two bends', () => {
    const run = buildRun({
      path: [pullPoint(), straight(), bend(), bend(), straight(), pullPoint()],
    });
    const [fix] = fixesOf(run, 'leg-too-short');
    expect(fix?.commands[0]?.command).toBe('insert-elements');
    expectHonest(run, 'leg-too-short');
  });

  it('flattens an offset whose own bends overlap', () => {
    const run = runOf([offset({ rise: 1.5, angle: 45 })]);
    const fixes = fixesOf(run, 'leg-too-short');
    expect(fixes[0]).toMatchObject({ kind: 'change-angle', values: { angle: 22.5 } });
    expectHonest(run, 'leg-too-short');
  });

  it('flattens a saddle that is too low', () => {
    const run = runOf([saddle3({ height: 1, angle: 45 })]);
    expect(fixesOf(run, 'saddle-too-low')[0]).toMatchObject({ kind: 'change-angle' });
    expectHonest(run, 'saddle-too-low');
  });

  it('takes back a radius that is too tight, or raises it to the least allowed', () => {
    const run = runOf([bend({ radius: 3 })]);
    expect(fixesOf(run, 'radius-too-tight')).toMatchObject([
      { kind: 'larger-radius', values: { tables: true, radius: 4.5 } },
      { kind: 'larger-radius', values: { tables: false, radius: 4.5 } },
    ]);
    expectHonest(run, 'radius-too-tight');
    const raceway = runOf([bend()], { raceway: { type: 'EMT', tradeSize: '3/4', bendRadius: 3 } });
    expect(fixesOf(raceway, 'radius-too-tight')[0]?.commands).toEqual([
      { command: 'set-raceway', args: { raceway: { type: 'EMT', tradeSize: '3/4' } } },
    ]);
    expectHonest(raceway, 'radius-too-tight');
  });
});

it('cuts a section that is longer than the specification allows', () => {
  const rules = { overrides: { maxSectionLength: 150, source: 'Spec 26 05 33' } };
  const run = runOf([bend()], { rules });
  expect(fixesOf(run, 'length-over')).toMatchObject([{ kind: 'add-pull-point' }]);
  expectHonest(run, 'length-over');
});

it('leaves the analysis as it was', () => {
  const analysis = analyzeRun(OVER);
  const copy = structuredClone(analysis);
  suggestFixes(OVER, analysis);
  expect(analysis).toEqual(copy);
});
