import { useState } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { PanelBoundary } from '../panel-boundary';
import classes from './conductors.module.css';
import { FillAnswers } from './fill-answers';
import { GroupRow } from './group-row';
import { QuickAdd } from './quick-add';

/** What is in the pipe, and whether it fits. */
export function ConductorsTab() {
  const { say } = useWords();
  const groups = useRunEditor((state) => state.document.conductors) ?? [];
  const canEdit = useRunEditor((state) => state.canEdit);
  const [openId, setOpenId] = useState<string | null>(null);
  return (
    <div className={classes.tab}>
      <section className={classes.card} aria-labelledby="wires-title">
        <h2 id="wires-title" className={classes.title}>
          {say('workbench.conductors.title')}
        </h2>
        {groups.length === 0 && (
          <p className={classes.quiet}>{say('workbench.conductors.empty')}</p>
        )}
        <ul className={classes.groups}>
          {groups.map((group) => (
            <GroupRow
              key={group.id}
              group={group}
              isOpen={group.id === openId}
              onToggle={() => setOpenId(group.id === openId ? null : group.id)}
            />
          ))}
        </ul>
      </section>
      {canEdit && (
        <PanelBoundary>
          <QuickAdd onAdded={setOpenId} />
        </PanelBoundary>
      )}
      <PanelBoundary>
        <FillAnswers />
      </PanelBoundary>
    </div>
  );
}
