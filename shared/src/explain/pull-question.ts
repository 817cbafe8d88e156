import { checkContext } from '../checks/check-context';
import type { PullAnalysis } from '../contracts/run-analysis';
import type { CompanySettings } from '../contracts/settings';
import { analyzePull } from '../pull/analyze-pulls';
import { plannedPulls } from '../pull/planned-pulls';
import { pullChain } from '../pull/pull-chain';
import type { DirectionInput } from '../pull/pull-direction';
import { expandRun } from '../run/expand-run';
import type { ExpandedRun } from '../run/expanded-run';
import type { PullConditions, RunDocument } from '../run/run-document';
import { plain } from './explanation';
import type { ExplanationInput } from './explanation';

export type Way = 'forward' | 'reverse';
export type Level = 'low' | 'likely' | 'high';

/** What an explanation of a pull is asked about. */
export interface PullQuestion {
  document: RunDocument;
  settings: CompanySettings;
  pull: PullAnalysis;
  way: Way;
  level: Level;
}

/** Where the head is: it has left this element, or so many points of the profile after the feed. */
export type Until = string | number;

/** What the pull is reckoned from; null where it has no figures. */
export function inputOf({ document, settings, pull, way, level }: PullQuestion) {
  const context = checkContext(document, expandRun(document, settings), settings);
  const span = plannedPulls(document, context.expanded).find((each) => each.pull.id === pull.id);
  const inputs = span && analyzePull(context, span).inputs;
  return inputs
    ? { expanded: context.expanded, input: inputs[way], friction: pull.friction[level] }
    : null;
}

/** A pull up to where the head leaves an element; to the puller where none is named. */
export function walkOf(question: PullQuestion, until?: Until) {
  const asked = inputOf(question);
  if (!asked) return null;
  const { input, friction } = asked;
  const { feed, tensions } = pullChain(input.pieces, input.sets, friction, input.feed);
  const all = input.pieces.length;
  const count = typeof until === 'string' ? piecesUntil(question, asked, until) : (until ?? all);
  const pieces = input.pieces.slice(0, count);
  return { input, friction, feed, tensions, pieces, tension: tensions[count - 1] ?? feed };
}

/** How many pieces the head has left behind at an element. A box pulled straight through is no piece: its place counts. */
function piecesUntil(
  { pull, way }: PullQuestion,
  { expanded, input }: { expanded: ExpandedRun; input: DirectionInput },
  until: string,
): number {
  const { profile, feedAt, pullAt } = pull[way];
  if (until === feedAt) return 0;
  if (until === pullAt) return input.pieces.length;
  const last = profile.map(({ elementId }) => elementId).lastIndexOf(until);
  if (last >= 0) return last;
  const at = expanded.elements.find(({ element }) => element.id === until)?.from;
  const place = profile.findIndex(({ station }) => station === at);
  return place < 0 ? input.pieces.length : place;
}

const GIVEN = 'given on the run';

export const givenOr = (
  { document: { conditions = {} } }: PullQuestion,
  key: keyof PullConditions,
  otherwise: string,
): string => (conditions[key] === undefined ? otherwise : GIVEN);

/** What every figure of a pull rests on. */
export function inputsOf(question: PullQuestion): ExplanationInput[] {
  const { pull, way, level } = question;
  const given = (key: keyof PullConditions, otherwise: string) => givenOr(question, key, otherwise);
  return [
    {
      what: 'weight',
      value: `${plain(pull.weight ?? 0)} lb/ft`,
      source: 'published weights of building wire, added up',
    },
    {
      what: 'weightCorrection',
      value: plain(pull.weightCorrection ?? 1),
      source:
        pull.configuration === 'complex'
          ? 'a convention for sets that cannot be derived'
          : 'from D and d, NEC Chapter 9 Tables 4 and 5',
    },
    {
      what: 'friction',
      value: plain(pull.friction[level]),
      source: given('friction', 'judgement from published ranges'),
    },
    {
      what: 'feed',
      value: `${plain(pull[way].feed, 2)} lbf`,
      source: given('feedTension', 'judgement, no source'),
    },
  ];
}
