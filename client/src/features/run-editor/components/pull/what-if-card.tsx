import { BOUNDS, analyzeRun, explainTension, formatForce } from '@fairlead/shared';
import type { PullAnalysis, PullConditions, RunDocument } from '@fairlead/shared';
import { useMemo, useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { Explained } from '../explain/explained';
import { useEdit } from '../hooks/use-edit';
import { useLabelOf } from '../hooks/use-labels';
import { useSettings } from '../hooks/use-settings';
import { lowestAllowed } from './pull-words';
import { WhatIfFields } from './what-if-fields';
import classes from './pull.module.css';

/** What a person tries; the run is not changed until they say so. */
export interface WhatIf {
  friction: number | null;
  feedTension: number | null;
  attachment: PullConditions['attachment'] | null;
  puller: number | null;
}

const NOTHING: WhatIf = { friction: null, feedTension: null, attachment: null, puller: null };

/** The conditions of a run with what is tried in their place; a friction tried stands for the whole band. */
function conditionsWith(conditions: PullConditions, tried: WhatIf): PullConditions {
  const { friction, feedTension, attachment, puller } = tried;
  return {
    ...conditions,
    ...(friction !== null && { friction: { low: friction, likely: friction, high: friction } }),
    ...(feedTension !== null && { feedTension }),
    ...(attachment !== null && { attachment }),
    ...(puller !== null && { limits: { ...conditions.limits, puller } }),
  };
}

/** Other conditions tried beside the planned ones: what each pull would then be. */
export function WhatIfCard() {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  const planned = useRunEditor((state) => state.analysis.pulls);
  const canEdit = useRunEditor((state) => state.canEdit);
  const settings = useSettings();
  const edit = useEdit();
  const [tried, setTried] = useState<WhatIf>(NOTHING);
  const isTrying = Object.values(tried).some((value) => value !== null);
  const conditions = useMemo(
    () => conditionsWith(document.conditions ?? {}, tried),
    [document, tried],
  );
  const then = useMemo(
    () => (isTrying ? analyzeRun({ ...document, conditions }, settings).pulls : []),
    [isTrying, document, conditions, settings],
  );
  if (planned.every((pull) => pull[pull.planned].status !== 'ok')) return null;
  const bounded = (value: number | null, most: number) =>
    value === null ? null : Math.min(value, most);
  return (
    <section className={classes.card} aria-labelledby="what-if-title">
      <h2 id="what-if-title" className={classes.title}>
        {say('workbench.pull.whatIf')}
      </h2>
      <WhatIfFields
        tried={tried}
        onTry={(next) =>
          setTried({
            ...next,
            friction: bounded(next.friction, BOUNDS.friction),
            feedTension: bounded(next.feedTension, BOUNDS.force),
            // A puller of nothing is no puller.
            puller: bounded(next.puller, BOUNDS.force) || null,
          })
        }
      />
      {!isTrying && <p className={classes.quiet}>{say('workbench.pull.whatIfHint')}</p>}
      {isTrying && (
        <>
          <ul className={classes.outcomes}>
            {then.map((pull, index) => (
              <Outcome
                key={pull.id}
                now={planned[index] ?? null}
                then={pull}
                document={{ ...document, conditions }}
              />
            ))}
          </ul>
          <div className={classes.acts}>
            <button type="button" className={classes.act} onClick={() => setTried(NOTHING)}>
              {say('workbench.pull.whatIfClear')}
            </button>
            {canEdit && (
              <button
                type="button"
                className={classes.act}
                onClick={() => {
                  const refusal = edit([{ command: 'set-conditions', args: { conditions } }]);
                  if (refusal === null) setTried(NOTHING);
                }}
              >
                {say('workbench.pull.whatIfUse')}
              </button>
            )}
          </div>
        </>
      )}
    </section>
  );
}

/** "Feed at B: two people, 85 lb; now puller, 120 lb." */
interface OutcomeProps {
  now: PullAnalysis | null;
  then: PullAnalysis;
  /** The run as tried. */
  document: RunDocument;
}

function Outcome({ now, then, document }: OutcomeProps) {
  const { say } = useWords();
  const settings = useSettings();
  const labelOf = useLabelOf();
  const told = (pull: PullAnalysis | null): string => {
    const direction = pull?.[pull.planned];
    if (!pull?.method || !direction?.tension) return say('workbench.list.none');
    return say('workbench.pull.whatIfTold', {
      method: say(`workbench.pull.method.${pull.method.likely}`),
      pounds: formatForce(direction.tension.likely, lowestAllowed(pull)),
    });
  };
  const outcome = say('workbench.pull.whatIfOutcome', {
    feed: labelOf(then[then.planned].feedAt),
    then: told(then),
    now: told(now),
  });
  const question = { document, settings, pull: then, way: then.planned, level: 'likely' } as const;
  return (
    <li data-what-if={then.id}>
      <Explained name={outcome} explain={() => explainTension(question)}>
        {outcome}
      </Explained>
    </li>
  );
}
