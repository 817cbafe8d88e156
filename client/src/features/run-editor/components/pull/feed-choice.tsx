import type { PullAnalysis } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useLabelOf } from '../hooks/use-labels';
import { usePlan } from './use-plan';
import classes from './pull.module.css';

/** Feeds the pull at its other end, or at the recommended one again. */
export function FeedChoice({ pull }: { pull: PullAnalysis }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const plan = usePlan();
  const canEdit = useRunEditor((state) => state.canEdit);
  const isAsked = useRunEditor((state) =>
    state.document.pulls?.some(({ id, feedAt }) => id === pull.id && feedAt !== undefined),
  );
  if (!canEdit) return null;
  const other = pull.planned === 'forward' ? 'reverse' : 'forward';
  return (
    <div className={classes.acts}>
      <button
        type="button"
        className={classes.act}
        onClick={() => plan.feedAt(pull.id, other === 'forward' ? 'from' : 'to')}
      >
        {say('workbench.pull.feedAt', { place: labelOf(pull[other].feedAt) })}
      </button>
      {isAsked && (
        <button type="button" className={classes.act} onClick={() => plan.feedAt(pull.id, null)}>
          {say('workbench.pull.feedRecommended')}
        </button>
      )}
    </div>
  );
}
