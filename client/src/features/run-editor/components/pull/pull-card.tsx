import { explainCorrection, explainMethod, explainWeight, formatForce } from '@fairlead/shared';
import type { PullAnalysis } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useCommands } from '../commands/commands-context';
import fieldClasses from '../fields/fields.module.css';
import { Explained } from '../explain/explained';
import { useLabelOf } from '../hooks/use-labels';
import { useSettings } from '../hooks/use-settings';
import { usePlan } from './use-plan';
import { FeedEnds } from './feed-ends';
import { PullProfile } from './pull-profile';
import { lowestAllowed } from './pull-words';
import classes from './pull.module.css';

interface Props {
  pull: PullAnalysis;
  /** The pull after it, which it could be joined with. */
  next: PullAnalysis | null;
}

/** One pull: who pulls it, both feed ends side by side, the boxes it goes through, and the way along it. */
export function PullCard({ pull, next }: Props) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const { goTo } = useCommands();
  const plan = usePlan();
  const canEdit = useRunEditor((state) => state.canEdit);
  const direction = pull[pull.planned];
  const titleId = `pull-${pull.id}`;
  const { peak, reason } = direction;
  return (
    <section className={classes.card} aria-labelledby={titleId} data-pull={pull.id}>
      <h2 id={titleId} className={classes.title}>
        {say('workbench.pull.heading', {
          feed: labelOf(direction.feedAt),
          pull: labelOf(direction.pullAt),
        })}
        {pull.through.length > 0 && (
          <span className={classes.aside}>
            {say('workbench.pull.through', {
              count: pull.through.length,
              places: pull.through.map(labelOf).join(', '),
            })}
          </span>
        )}
      </h2>
      {peak === null ? (
        <p className={classes.quiet}>
          {say('workbench.pull.none', { reason: say(`findings.verdict.no-pull.${reason!}`) })}{' '}
          {reason === 'no-conductors' && canEdit && (
            <button
              type="button"
              className={fieldClasses.textButton}
              onClick={() => goTo('conductors')}
            >
              {say('workbench.pull.addWires')}
            </button>
          )}
        </p>
      ) : (
        <>
          <Method pull={pull} likely={formatForce(peak.likely, lowestAllowed(pull))} />
          <FeedEnds pull={pull} />
        </>
      )}
      {pull.weight !== null && pull.configuration !== null && (
        <SetLine
          pull={pull}
          weight={pull.weight}
          configuration={say(`workbench.pull.configuration.${pull.configuration}`)}
        />
      )}
      {canEdit && (
        <div className={classes.acts}>
          {pull.through.map((place) => (
            <button
              key={place}
              type="button"
              className={classes.act}
              onClick={() => plan.breakAt(pull.id, place)}
            >
              {say('workbench.pull.break', { place: labelOf(place) })}
            </button>
          ))}
          {next && (
            <button type="button" className={classes.act} onClick={() => plan.join(pull.id)}>
              {say('workbench.pull.join', { place: labelOf(pull.to) })}
            </button>
          )}
        </div>
      )}
      {plan.refusal && (
        <p role="alert" className={classes.quiet}>
          {plan.refusal}
        </p>
      )}
      {peak !== null && <PullProfile pull={pull} />}
      <p className={classes.small}>{say('workbench.pull.estimate')}</p>
    </section>
  );
}

interface SetLineProps {
  pull: PullAnalysis;
  /** lb/ft. */
  weight: number;
  configuration: string;
}

/** "5.149 lb/ft, three in a cradle, weight correction 1.2073". */
function SetLine({ pull, weight, configuration }: SetLineProps) {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  const expanded = useRunEditor((state) => state.expanded);
  const weighs = say('workbench.pull.weight', { weight: weight.toFixed(3) });
  const correction = say('workbench.pull.correction', {
    correction: (pull.weightCorrection ?? 1).toFixed(4),
  });
  return (
    <p className={classes.small}>
      <Explained name={weighs} explain={() => explainWeight(document, expanded, pull)}>
        {weighs}
      </Explained>
      {`, ${configuration}, `}
      <Explained name={correction} explain={() => explainCorrection(document, expanded, pull)}>
        {correction}
      </Explained>
    </p>
  );
}

/** "Two people. Puller above friction 0.39. Typical 85 lb."; where the feed must be held, that and the most it carries. */
function Method({ pull, likely }: { pull: PullAnalysis; likely: string }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const document = useRunEditor((state) => state.document);
  const settings = useSettings();
  const { method, planned } = pull;
  if (!method) return null;
  const { holdBack, feedAt } = pull[planned];
  const explain = () => explainMethod({ document, settings, pull, way: planned, level: 'likely' });
  if (holdBack && holdBack.likely > 0) {
    const carries = say('workbench.pull.carries', { pounds: likely });
    return (
      <p className={classes.method} data-method={method.likely}>
        <b>
          {say('workbench.pull.held', {
            pounds: formatForce(holdBack.likely),
            place: labelOf(feedAt),
          })}
        </b>{' '}
        <Explained name={carries} explain={explain}>
          {carries}
        </Explained>
      </p>
    );
  }
  const typical = say('workbench.pull.typical', { likely });
  const name = (of: typeof method.likely) => say(`workbench.pull.method.${of}`);
  return (
    <p className={classes.method} data-method={method.likely}>
      <b>{`${name(method.likely)}.`}</b>{' '}
      {method.flipsAt !== null && method.flipsTo !== null && (
        <span>
          {say('workbench.pull.flips', {
            method: name(method.flipsTo),
            friction: method.flipsAt.toFixed(2),
          })}
        </span>
      )}{' '}
      <span>
        <Explained name={typical} explain={explain}>
          {typical}
        </Explained>
        .
      </span>{' '}
      {method.high !== method.likely && (
        <span>{say('workbench.pull.dryMethod', { method: name(method.high).toLowerCase() })}</span>
      )}
    </p>
  );
}
