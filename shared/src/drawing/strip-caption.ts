import type { ExpandedRun } from '../run/expanded-run';
import type { Raceway } from '../run/run-document';
import { axisLabel } from './axis';
import type { Say } from '../words/create-words';

const FOOT = 12;
/** More raceways than this are counted, not listed. */
const MOST_LISTED = 3;

/** "To scale", or which legs are drawn longer than they are. `stretchedUnder` in inches. */
export function wordScale(
  expanded: Pick<ExpandedRun, 'length'>,
  stretchedUnder: number | null,
  say: Say,
): string {
  if (expanded.length === null) return say('strip.equalSteps');
  if (stretchedUnder === null) return say('strip.toScale');
  // Under a whole number of feet, or of inches where all of them are shorter than a foot.
  const unit = stretchedUnder < FOOT - 1 ? 1 : FOOT;
  const under = (Math.floor(stretchedUnder / unit) + 1) * unit;
  const length = axisLabel(under);
  return say('strip.drawnLonger', { length });
}

/** "3/4 EMT to 84′, then 3/4 FMC"; null for a run of one raceway. */
export function wordRaceways(expanded: ExpandedRun, say: Say): string | null {
  const changes: { raceway: Raceway; until: number }[] = [];
  for (const { element, raceway, to } of expanded.elements) {
    if (element.kind === 'pull-point' || element.kind === 'transition') continue;
    const last = changes[changes.length - 1];
    const isSame =
      last?.raceway.type === raceway.type && last.raceway.tradeSize === raceway.tradeSize;
    if (last && isSame) last.until = to;
    else changes.push({ raceway, until: to });
  }
  if (changes.length < 2) return null;
  const named = changes.slice(0, MOST_LISTED).map(({ raceway, until }, index) => {
    const type = say(`workbench.raceway.type.${raceway.type}`);
    const name = say('workbench.raceway.named', { size: raceway.tradeSize, type });
    const isLast = index === changes.length - 1;
    if (isLast || expanded.length === null) return name;
    return say('strip.racewayFrom', { raceway: name, station: axisLabel(until) });
  });
  const list = named.reduce((before, raceway) => say('strip.racewayThen', { before, raceway }));
  const more = changes.length - MOST_LISTED;
  return more > 0 ? say('strip.racewayMore', { list, count: more }) : list;
}
