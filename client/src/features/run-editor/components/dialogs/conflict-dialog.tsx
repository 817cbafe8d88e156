import { Button } from '@mantine/core';
import { useWords } from '../../../../hooks/use-words';
import { formatMoment } from '../../../../lib/format-date';
import { useRunEditor } from '../../state/use-run-editor';
import { labelOf } from '../model/word-piece';
import { wordConflictField, wordConflictValue } from '../model/word-conflict';
import { DialogFrame } from '../../../../components/dialog-frame';
import { ConflictStrips } from './conflict-strips';
import classes from './dialogs.module.css';

/** So many differences stand in the list; the rest is told as a number. */
const SHOWN = 24;

/** Two people changed one run: who and when, what differs, both drawn, and the choice. */
export function ConflictDialog() {
  const { say } = useWords();
  const conflict = useRunEditor((state) => state.conflict);
  const resolve = useRunEditor((state) => state.resolveConflict);
  if (!conflict) return null;
  const { savedBy, savedAt } = conflict.theirs.revision;
  const theirDocument = conflict.theirs.revision.document;
  const place = (id: string) => labelOf(conflict.mine, id, say) || labelOf(theirDocument, id, say);
  const shown = conflict.fields.slice(0, SHOWN);
  return (
    <DialogFrame isOpen size="xl" title={say('workbench.conflict.title')}>
      <div className={classes.form}>
        <p className={classes.words}>
          {say('workbench.conflict.who', { name: savedBy, when: formatMoment(savedAt) })}{' '}
          {say('workbench.conflict.lead')}
        </p>
        <ConflictStrips conflict={conflict} />
        <div
          className={classes.tableBox}
          tabIndex={0}
          role="group"
          aria-label={say('workbench.conflict.field')}
        >
          <table className={classes.differences}>
            <thead>
              <tr>
                <th scope="col">{say('workbench.conflict.field')}</th>
                <th scope="col">{say('workbench.conflict.mine')}</th>
                <th scope="col">{say('workbench.conflict.theirsOf', { name: savedBy })}</th>
              </tr>
            </thead>
            <tbody>
              {shown.map((field) => (
                <tr key={field.pointer}>
                  <th scope="row">{wordConflictField(field, place, say)}</th>
                  <td data-changed={field.changedBy !== 'them' || undefined}>
                    {wordConflictValue(field, field.mine, say)}
                  </td>
                  <td data-changed={field.changedBy !== 'me' || undefined}>
                    {wordConflictValue(field, field.theirs, say)}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
          {conflict.fields.length > SHOWN && (
            <p className={classes.lead}>
              {say('workbench.conflict.more', { count: conflict.fields.length - SHOWN })}
            </p>
          )}
        </div>
        <div className={classes.acts}>
          <Button onClick={() => resolve('take-theirs')}>
            {say('workbench.conflict.takeTheirs')}
          </Button>
          <Button variant="filled" onClick={() => resolve('keep-mine')}>
            {say('workbench.conflict.keepMine')}
          </Button>
        </div>
      </div>
    </DialogFrame>
  );
}
