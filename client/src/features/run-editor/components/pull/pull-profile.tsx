import { explainGauge, explainSidewall, explainTension, formatForce } from '@fairlead/shared';
import type { Explanation, PullAnalysis, PullQuestion } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { Explained } from '../explain/explained';
import { useLabelOf } from '../hooks/use-labels';
import { useSettings } from '../hooks/use-settings';
import { listLength } from '../model/list-length';
import { lowestAllowed } from './pull-words';
import classes from './pull.module.css';

const LEVELS = ['low', 'likely', 'high'] as const;

/** The tension along the planned way, piece by piece, and what a gauge at the puller would read. */
export function PullProfile({ pull }: { pull: PullAnalysis }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const allowed = lowestAllowed(pull);
  const document = useRunEditor((state) => state.document);
  const settings = useSettings();
  const { profile } = pull[pull.planned];
  const asking = (level: PullQuestion['level']): PullQuestion => ({
    document,
    settings,
    pull,
    way: pull.planned,
    level,
  });
  const opened = (force: number, limit: number | null, explain: () => Explanation | null) => (
    <Explained
      name={say('workbench.list.pounds', { pounds: formatForce(force, limit) })}
      explain={explain}
    >
      {formatForce(force, limit)}
    </Explained>
  );
  return (
    <details className={classes.profile}>
      <summary>{say('workbench.pull.profile')}</summary>
      <div className={classes.scroll}>
        <table className={classes.ends}>
          <thead>
            <tr>
              <th scope="col">{say('workbench.pull.profilePiece')}</th>
              <th scope="col">{say('workbench.pull.profileStation')}</th>
              <th scope="col">{say('workbench.pull.low')}</th>
              <th scope="col">{say('workbench.pull.likely')}</th>
              <th scope="col">{say('workbench.pull.high')}</th>
              <th scope="col">{say('workbench.pull.profileSidewall')}</th>
              <th scope="col">{say('workbench.pull.profileGauge')}</th>
            </tr>
          </thead>
          <tbody className="num">
            {profile.map(({ elementId, station, tension, sidewall, ropeFactor }, index) => (
              <tr key={index}>
                <th scope="row">
                  {labelOf(elementId)}
                  {index === 0 && <small>{say('workbench.pull.start')}</small>}
                </th>
                <td>{listLength(station)}</td>
                {LEVELS.map((level) => (
                  <td key={level}>
                    {opened(tension[level], allowed, () => explainTension(asking(level), index))}
                  </td>
                ))}
                <td>
                  {sidewall
                    ? opened(sidewall.likely, null, () => explainSidewall(asking('likely'), index))
                    : say('workbench.list.none')}
                </td>
                <td>
                  {opened(tension.likely * ropeFactor, null, () =>
                    explainGauge(asking('likely'), index),
                  )}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </details>
  );
}
