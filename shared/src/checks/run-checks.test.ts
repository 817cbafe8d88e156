import { describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS } from '../contracts/settings';
import { bend, buildRun, flex, offset, pullPoint, straight } from '../run/build-run';
import { expandRun } from '../run/expand-run';
import type { CodeEdition, Device, PathElement, Rules } from '../run/run-document';
import { checkAccess } from './access';
import { checkContext } from './check-context';
import { checkDirections } from './directions';
import { checkSectionLength } from './section-length';

function contextOf(middle: PathElement[], rules?: Rules) {
  const path = [pullPoint({ id: 'A' }), ...middle, pullPoint({ id: 'Z' })];
  const document = buildRun({ path, ...(rules && { rules }) });
  return checkContext(document, expandRun(document), DEFAULT_SETTINGS);
}

// NEC 314.29: boxes, conduit bodies and handholes stay accessible.
describe('access', () => {
  const hidden = (device: Device) => pullPoint({ id: 'M', device, accessible: false });

  it.each(['box', 'pull-box', 'conduit-body', 'handhole', 'manhole', 'cabinet'] as const)(
    'a %s nobody can reach is not allowed, whatever the degrees',
    (device) => {
      expect(checkAccess(contextOf([straight(), hidden(device), straight()]))).toEqual([
        {
          code: 'access-not-allowed',
          severity: 'stop',
          at: { elementId: 'M', sectionId: 'A' },
          values: { device, body: null },
          rule: { cite: '314.29', edition: 'NEC-2023', source: 'NEC' },
        },
      ]);
    },
  );

  it('an open end, and anything that can be reached, is allowed', () => {
    expect(
      checkAccess(contextOf([hidden('open-end'), pullPoint(), pullPoint({ accessible: true })])),
    ).toEqual([]);
  });

  it.each<[CodeEdition, CodeEdition]>([
    ['NEC-2017', 'NEC-2020'],
    ['NEC-2020', 'NEC-2020'],
    ['NEC-2026', 'NEC-2023'],
  ])('%s cites the text that was read: %s', (code, edition) => {
    const [finding] = checkAccess(contextOf([hidden('box')], { code }));
    expect(finding?.rule?.edition).toBe(edition);
  });
});

describe('length of a section', () => {
  const over = (feet: number, rules?: Rules) => {
    const context = contextOf([straight({ length: feet * 12 })], rules);
    return context.expanded.sections.flatMap((span) => checkSectionLength(context, span));
  };

  it('220 ft under power rules alone passes: the NEC sets no length', () => {
    expect(over(220)).toEqual([]);
  });

  it('220 ft under a specification of 150 ft is 70 ft over, and no rule of the code is cited', () => {
    const overrides = { maxSectionLength: 1800, source: 'Spec 26 05 33' };
    expect(over(150, { overrides })).toEqual([]);
    expect(over(220, { overrides })).toEqual([
      {
        code: 'length-over',
        severity: 'stop',
        at: { sectionId: 'A' },
        values: { length: 2640, limit: 1800, over: 840, limitFrom: 'job', source: 'Spec 26 05 33' },
        rule: null,
      },
    ]);
  });

  it('telecom: 100 ft passes, 101 ft does not; a tighter specification wins', () => {
    // ANSI/TIA-569 practice, confirmed by Washington State University section 27 05 00.
    expect(over(100, { profile: 'telecom' })).toEqual([]);
    expect(over(101, { profile: 'telecom' })[0]?.values).toMatchObject({
      limit: 1200,
      limitFrom: 'telecom',
    });
    const tighter = { profile: 'telecom', overrides: { maxSectionLength: 600 } } as const;
    expect(over(60, tighter)[0]?.values).toMatchObject({
      limit: 600,
      limitFrom: 'job',
      source: null,
    });
  });

  it('is the developed length: corners shorten it', () => {
    const bent = [straight({ length: 900 }), bend(), straight({ length: 900 })];
    const context = contextOf(bent, { overrides: { maxSectionLength: 1799 } });
    expect(context.expanded.sections.flatMap((span) => checkSectionLength(context, span))).toEqual(
      [],
    );
  });

  it('without lengths there is none to hold against', () => {
    const context = contextOf([bend()], { profile: 'telecom' });
    expect(context.expanded.sections.flatMap((span) => checkSectionLength(context, span))).toEqual(
      [],
    );
  });
});

describe('directions', () => {
  const of = (middle: PathElement[]) =>
    checkDirections(contextOf(middle)).map(({ code, severity, at }) => [code, severity, at]);

  it('given everywhere, or nowhere on a level run: nothing to say', () => {
    expect(of([bend({ toward: 'up' }), offset({ toward: 'north' })])).toEqual([]);
    expect(of([bend(), offset(), flex()])).toEqual([]);
  });

  it('missing on some: a note at each', () => {
    expect(
      of([bend({ toward: 'up' }), bend({ id: 'b' }), pullPoint({ id: 'M' }), offset({ id: 'o' })]),
    ).toEqual([
      ['direction-missing', 'note', { elementId: 'b', sectionId: 'A' }],
      ['direction-missing', 'note', { elementId: 'o', sectionId: 'M' }],
    ]);
  });

  it('parallel to the pipe: a stop there', () => {
    expect(of([straight(), bend({ id: 'b', toward: 'east' })])).toEqual([
      ['direction-parallel', 'stop', { elementId: 'b', sectionId: 'A' }],
    ]);
  });
});
