import { formatForce } from '@fairlead/shared';
import type { PullAnalysis } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useLabelOf } from '../hooks/use-labels';
import { listLength } from '../model/list-length';
import { lowestAllowed } from './pull-words';
import classes from './pull.module.css';

/** The tension along the planned way, piece by piece, and what a gauge at the puller would read. */
export function PullProfile({ pull }: { pull: PullAnalysis }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const allowed = lowestAllowed(pull);
  const { profile } = pull[pull.planned];
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
                <td>{formatForce(tension.low, allowed)}</td>
                <td>{formatForce(tension.likely, allowed)}</td>
                <td>{formatForce(tension.high, allowed)}</td>
                <td>{sidewall ? formatForce(sidewall.likely) : say('workbench.list.none')}</td>
                <td>{formatForce(tension.likely * ropeFactor)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </details>
  );
}
