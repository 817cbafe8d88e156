import { degreesStatus, formatAngle, formatForce } from '@fairlead/shared';
import { StatusGlyph } from '../../../../components/drawing/status-glyph';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useLabelOf } from '../hooks/use-labels';
import { sectionOf } from '../model/section-of';
import { wordRemaining } from '../model/word-remaining';
import classes from './phone.module.css';

/** "Since JB-4: 380°, 20° over", of the section that is being looked at. */
export function Ledger() {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const analysis = useRunEditor((state) => state.analysis);
  const expanded = useRunEditor((state) => state.expanded);
  const selectedId = useRunEditor((state) => state.selectedId);
  const section = sectionOf(analysis, expanded, selectedId) ?? analysis.sections.at(-1);
  if (!section) return null;
  const pull = analysis.pulls.find(({ sectionIds }) => sectionIds.includes(section.id));
  const typical = pull?.[pull.planned].tension?.likely ?? null;
  const remaining = wordRemaining(section, say);
  return (
    <div className={classes.ledger} role="status">
      {remaining.isOver && <StatusGlyph status={degreesStatus(analysis, section.id)} size={22} />}
      <span>
        {say('workbench.ledger.since', {
          from: labelOf(section.from),
          degrees: formatAngle(section.degrees),
        })}
        {', '}
        {remaining.words}
        {typical !== null &&
          ` · ${say('workbench.ledger.typical', { pounds: formatForce(typical) })}`}
      </span>
    </div>
  );
}
