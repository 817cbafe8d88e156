import type { Device } from '@fairlead/shared';
import { Button } from '@mantine/core';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useEdit } from '../hooks/use-edit';
import { hasStart } from '../model/empty-run';
import classes from './strip.module.css';
import type { StripVariant } from './strip-panel';

const HEIGHTS: Record<StripVariant, number> = { desk: 230, phone: 220, 'compact-height': 96 };

/** A run without pieces: the drawing as it will be, and the first question. */
export function GhostStrip({ variant }: { variant: StripVariant }) {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  const canEdit = useRunEditor((state) => state.canEdit);
  const select = useRunEditor((state) => state.select);
  const edit = useEdit();
  const start = document.path[0];
  const leaveFrom = (device: Device) => {
    if (!start) return;
    edit([{ command: 'set-element', args: { elementId: start.id, patch: { device } } }]);
    select(start.id);
  };
  const isAsked = !hasStart(document);
  return (
    <div className={classes.ghost} style={{ height: HEIGHTS[variant] }}>
      {variant !== 'compact-height' && (
        <svg className={classes.ghostLine} viewBox="0 0 400 40" aria-hidden="true">
          <g fill="none" stroke="var(--edge)" strokeWidth="1.5" strokeDasharray="5 4">
            <rect x="2" y="12" width="16" height="16" />
            <path d="M18 17H382M18 23H382" />
            <rect x="382" y="12" width="16" height="16" />
          </g>
        </svg>
      )}
      <p>{say(isAsked ? 'workbench.empty.where' : 'workbench.empty.first')}</p>
      {isAsked && canEdit && variant !== 'compact-height' && (
        <div className={classes.ghostActs}>
          <Button onClick={() => leaveFrom('cabinet')}>{say('workbench.empty.panel')}</Button>
          <Button onClick={() => leaveFrom('box')}>{say('workbench.empty.box')}</Button>
        </div>
      )}
    </div>
  );
}
