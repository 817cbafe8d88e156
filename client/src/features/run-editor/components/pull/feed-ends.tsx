import { formatForce, formatLimit } from '@fairlead/shared';
import type { Band, PullAnalysis, PullDirection } from '@fairlead/shared';
import type { ReactNode } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useLabelOf } from '../hooks/use-labels';
import { lowestAllowed } from './pull-words';
import { usePlan } from './use-plan';
import classes from './pull.module.css';

const LEVELS = ['low', 'likely', 'high'] as const;
const WAYS = ['forward', 'reverse'] as const;

/** The same pull from both ends, column beside column, so that the easier one is seen. */
export function FeedEnds({ pull }: { pull: PullAnalysis }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const plan = usePlan();
  const canEdit = useRunEditor((state) => state.canEdit);
  const asked = useRunEditor((state) =>
    state.document.pulls?.some(({ id, feedAt }) => id === pull.id && feedAt !== undefined),
  );
  const allowed = lowestAllowed(pull);
  const row = (label: string, cell: (way: PullDirection) => ReactNode, key = label) => (
    <tr key={key}>
      <th scope="row">{label}</th>
      {WAYS.map((name) => (
        <td key={name} data-way={name} data-planned={name === pull.planned || undefined}>
          {cell(pull[name])}
        </td>
      ))}
    </tr>
  );
  const pounds = (band: Band | null, level: (typeof LEVELS)[number]) =>
    band === null ? '' : `${formatForce(band[level], allowed)} ${say('workbench.pull.pounds')}`;
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
            {WAYS.map((name) => (
              <th key={name} scope="col" data-planned={name === pull.planned || undefined}>
                {say('workbench.pull.feedAt', { place: labelOf(pull[name].feedAt) })}
                {name === pull.recommended && (
                  <span className={classes.tag}>{say('workbench.pull.recommended')}</span>
                )}
                {name === pull.planned && name !== pull.recommended && (
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
              ({ tension }) => (
                <span data-level={level} className="num">
                  {pounds(tension, level)}
                </span>
              ),
              level,
            ),
          )}
          {row(say('workbench.pull.holdBack'), ({ holdBack }) =>
            holdBack && holdBack.low > 0
              ? LEVELS.map((level) => formatForce(holdBack[level])).join(' / ') +
                ` ${say('workbench.pull.pounds')}`
              : say('workbench.pull.noHoldBack'),
          )}
          {row(say('workbench.pull.first'), (way) => (
            <GivesFirst way={way} />
          ))}
          {row(say('workbench.pull.sidewall'), ({ peakSidewall, peakSidewallAt }) =>
            peakSidewall && peakSidewallAt !== null
              ? say('workbench.pull.sidewallAt', {
                  value: formatForce(peakSidewall.likely, pull.limits?.sidewall.stop ?? null),
                  place: labelOf(peakSidewallAt),
                })
              : say('workbench.pull.noSidewall'),
          )}
        </tbody>
      </table>
      {canEdit && (
        <div className={classes.acts}>
          {WAYS.filter((name) => name !== pull.planned).map((name) => (
            <button
              key={name}
              type="button"
              className={classes.act}
              onClick={() => plan.feedAt(pull.id, name === 'forward' ? 'from' : 'to')}
            >
              {say('workbench.pull.feedAt', { place: labelOf(pull[name].feedAt) })}
            </button>
          ))}
          {asked && (
            <button
              type="button"
              className={classes.act}
              onClick={() => plan.feedAt(pull.id, null)}
            >
              {say('workbench.pull.feedRecommended')}
            </button>
          )}
        </div>
      )}
    </>
  );
}

/** "Basket grip: 1,100 of 1,000 lb, above friction 0.33". */
function GivesFirst({ way: { governing } }: { way: PullDirection }) {
  const { say } = useWords();
  if (!governing) return null;
  const { limit, value, allowed, reachedAt } = governing;
  const unit = limit === 'sidewall' ? 'poundsPerFoot' : 'pounds';
  return (
    <>
      {say('workbench.pull.firstOf', {
        limit: say(`workbench.pull.limit.${limit}`),
        value: formatForce(value, allowed),
        allowed: formatLimit(allowed),
        unit: say(`workbench.pull.${unit}`),
      })}
      {reachedAt !== null && (
        <small>{say('workbench.pull.firstAt', { friction: reachedAt.toFixed(2) })}</small>
      )}
    </>
  );
}
