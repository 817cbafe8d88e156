import { degreesStatus, explainDegrees, formatAngle } from '@fairlead/shared';
import type { SectionAnalysis } from '@fairlead/shared';
import { StatusGlyph } from '../../../../components/drawing/status-glyph';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { Explained } from '../explain/explained';
import { useEdition } from '../hooks/use-edition';
import { useLabelOf } from '../hooks/use-labels';
import { wordRemaining } from '../model/word-remaining';
import classes from './list.module.css';

/** "JB-4 → AHU-4, 380° of 360°, 20° over". */
export function SectionLine({ section }: { section: SectionAnalysis }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const remaining = wordRemaining(section, say);
  const edition = useEdition();
  const status = useRunEditor(({ analysis }) => degreesStatus(analysis, section.id));
  const degrees = say('workbench.list.sectionDegrees', {
    degrees: formatAngle(section.degrees),
    limit: formatAngle(section.limitDegrees),
  });
  return (
    <span className={classes.sectionLine}>
      <span>
        {say('workbench.list.section', { from: labelOf(section.from), to: labelOf(section.to) })}
      </span>
      <span className={classes.sectionAnswer}>
        {remaining.isOver && <StatusGlyph status={status} size={18} />}
        <span>
          <Explained name={degrees} explain={() => explainDegrees(section, edition)}>
            {degrees}
          </Explained>
          {`, ${remaining.words}`}
        </span>
      </span>
    </span>
  );
}
