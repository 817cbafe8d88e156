import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { PanelBoundary } from '../panel-boundary';
import { PullCard } from './pull-card';
import { PullConditionsCard } from './pull-conditions-card';
import { WhatIfCard } from './what-if-card';
import classes from './pull.module.css';

/** How hard each pull is, from both ends, and what that rests on. */
export function PullTab() {
  const { say } = useWords();
  const pulls = useRunEditor((state) => state.analysis.pulls);
  return (
    <div className={classes.tab}>
      <p className={classes.caution}>{say('workbench.pull.caution')}</p>
      {pulls.map((pull, index) => (
        <PanelBoundary key={pull.id}>
          <PullCard pull={pull} next={pulls[index + 1] ?? null} />
        </PanelBoundary>
      ))}
      <PanelBoundary>
        <WhatIfCard />
      </PanelBoundary>
      <PanelBoundary>
        <PullConditionsCard />
      </PanelBoundary>
    </div>
  );
}
