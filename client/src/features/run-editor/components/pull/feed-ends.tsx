import { explainHoldBack, explainLimit, explainSidewall, explainTension } from '@fairlead/shared';
import { formatForce, formatLimit } from '@fairlead/shared';
import type { PullAnalysis, PullQuestion } from '@fairlead/shared';
import type { ReactNode } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { Explained } from '../explain/explained';
import { useLabelOf } from '../hooks/use-labels';
import { useSettings } from '../hooks/use-settings';
import { FeedChoice } from './feed-choice';
import { lowestAllowed } from './pull-words';
import classes from './pull.module.css';

const LEVELS = ['low', 'likely', 'high'] as const;
type Way = PullQuestion['way'];
const WAYS: readonly Way[] = ['forward', 'reverse'];

/** The same pull from both ends, column beside column, so that the easier one is seen. */
export function FeedEnds({ pull }: { pull: PullAnalysis }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const document = useRunEditor((state) => state.document);
  const settings = useSettings();
  const allowed = lowestAllowed(pull);
  const asking = (way: Way, level: PullQuestion['level'] = 'likely'): PullQuestion => ({
    document,
    settings,
    pull,
    way,
    level,
  });
  const pounds = (text: string) => `${text} ${say('workbench.pull.pounds')}`;
  const row = (label: string, cell: (way: Way) => ReactNode, key = label) => (
    <tr key={key}>
      <th scope="row">{label}</th>
      {WAYS.map((way) => (
        <td key={way} data-way={way} data-planned={way === pull.planned || undefined}>
          {cell(way)}
        </td>
      ))}
    </tr>
  );
  return (
    <>
      {pull.noneBecause && pull.noneBecause !== 'no-answer' && (
        <p className={classes.quiet}>{say(`workbench.pull.neither.${pull.noneBecause}`)}</p>
      )}
      <table className={classes.ends}>
        <caption className="visually-hidden">{say('workbench.pull.ends')}</caption>
        <thead>
          <tr>
            <td />
            {WAYS.map((way) => (
              <th key={way} scope="col" data-planned={way === pull.planned || undefined}>
                {say('workbench.pull.feedAt', { place: labelOf(pull[way].feedAt) })}{' '}
                {way === pull.recommended && (
                  <span className={classes.tag}>{say('workbench.pull.recommended')}</span>
                )}
                {way === pull.planned && way !== pull.recommended && (
                  <span className={classes.tag}>{say('workbench.pull.planned')}</span>
                )}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {LEVELS.map((level) =>
            row(
              say(`workbench.pull.${level}`),
              (way) => {
                const figure = pounds(formatForce(pull[way].tension?.[level] ?? 0, allowed));
                return (
                  <span data-level={level}>
                    <Explained name={figure} explain={() => explainTension(asking(way, level))}>
                      {figure}
                    </Explained>
                  </span>
                );
              },
              level,
            ),
          )}
          {row(say('workbench.pull.holdBack'), (way) => {
            const { holdBack } = pull[way];
            if (!holdBack || holdBack.low <= 0) return say('workbench.pull.noHoldBack');
            return LEVELS.map((level) => (
              <span key={level} data-hold-back={level} className={classes.hold}>
                <Explained
                  name={pounds(formatForce(holdBack[level]))}
                  explain={() => explainHoldBack(asking(way, level))}
                >
                  {formatForce(holdBack[level])}
                </Explained>
              </span>
            ));
          })}
          {row(say('workbench.pull.first'), (way) => (
            <GivesFirst pull={pull} way={way} />
          ))}
          {row(say('workbench.pull.sidewall'), (way) => {
            const { peakSidewall, peakSidewallAt } = pull[way];
            if (!peakSidewall || peakSidewallAt === null) return say('workbench.pull.noSidewall');
            const figure = say('workbench.pull.sidewallAt', {
              value: formatForce(peakSidewall.likely, pull.limits?.sidewall.stop ?? null),
              place: labelOf(peakSidewallAt),
            });
            return (
              <span data-sidewall>
                <Explained name={figure} explain={() => explainSidewall(asking(way))}>
                  {figure}
                </Explained>
              </span>
            );
          })}
        </tbody>
      </table>
      <FeedChoice pull={pull} />
    </>
  );
}

/** "Basket grip: 1,100 of 1,000 lb, above friction 0.33". */
function GivesFirst({ pull, way }: { pull: PullAnalysis; way: Way }) {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  const expanded = useRunEditor((state) => state.expanded);
  const { governing } = pull[way];
  if (!governing) return null;
  const { limit, value, allowed, reachedAt } = governing;
  const unit = limit === 'sidewall' ? 'poundsPerFoot' : 'pounds';
  const figure = say('workbench.pull.firstOf', {
    limit: say(`workbench.pull.limit.${limit}`),
    value: formatForce(value, allowed),
    allowed: formatLimit(allowed),
    unit: say(`workbench.pull.${unit}`),
  });
  return (
    <>
      <Explained name={figure} explain={() => explainLimit(document, expanded, pull, limit)}>
        {figure}
      </Explained>
      {reachedAt !== null && (
        <small>{say('workbench.pull.firstAt', { friction: reachedAt.toFixed(2) })}</small>
      )}
    </>
  );
}
