import { Link } from 'react-router-dom';
import { Mark } from '../../../../components/mark';
import { ThemeSwitch } from '../../../../components/theme-switch';
import { useWords } from '../../../../hooks/use-words';
import { paths } from '../../../../lib/paths';
import { useRunEditor } from '../../state/use-run-editor';
import { useEnds } from '../hooks/use-ends';
import type { DialogName } from '../dialogs/dialog-name';
import classes from './header.module.css';
import { SavingLine } from './saving-line';
import { RedoButton, UndoButton } from './undo-buttons';

/** Where the run belongs, what it is called, whether it is saved, and the way back. */
export function WorkbenchHeader({ onOpen }: { onOpen: (dialog: DialogName) => void }) {
  const { say } = useWords();
  const job = useRunEditor((state) => state.server.job);
  const jobId = useRunEditor((state) => state.server.jobId);
  const revision = useRunEditor((state) => state.server.revision);
  const tag = useRunEditor((state) => state.document.tag);
  const canEdit = useRunEditor((state) => state.canEdit);
  const ends = useEnds();
  return (
    <header className={classes.header}>
      <Link to={paths.jobs} className={classes.mark} aria-label={say('workbench.home')}>
        <Mark />
      </Link>
      <nav className={classes.crumbs} aria-label={say('workbench.breadcrumb')}>
        <Link to={paths.job(jobId)} className={classes.job}>
          {job.name}
        </Link>
        <span aria-hidden>/</span>
      </nav>
      <h1 className={classes.heading}>
        <button
          type="button"
          className={classes.tag}
          aria-label={say('workbench.rename.open', { tag })}
          disabled={!canEdit}
          onClick={() => onOpen('identity')}
        >
          <span>{tag}</span>
        </button>
      </h1>
      <span className={classes.fromTo}>{say('workbench.fromTo', ends)}</span>
      <span className={classes.pill}>
        {say('workbench.revision', {
          letter: revision.letter,
          state: say(`workbench.state.${revision.state}`),
        })}
      </span>
      {!canEdit && <span className={classes.pill}>{say('workbench.readOnly')}</span>}
      <span className={classes.grow} />
      <SavingLine onNeedsYou={() => onOpen('saving')} />
      <UndoButton />
      <RedoButton />
      <button type="button" className={classes.link} onClick={() => onOpen('keys')}>
        {say('workbench.keys')}
      </button>
      <ThemeSwitch />
    </header>
  );
}
