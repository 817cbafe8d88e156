import { Strip } from '../../../../components/drawing/strip';
import { useTheme } from '../../../../hooks/use-theme';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useCommands } from '../commands/commands-context';
import { useSelectedPiece } from '../hooks/use-piece';
import { useWidth } from '../hooks/use-width';
import { isEmptyRun } from '../model/empty-run';
import { PanelBoundary } from '../panel-boundary';
import { GhostStrip } from './ghost-strip';
import classes from './strip.module.css';

export type StripVariant = 'desk' | 'phone' | 'compact-height';

interface Props {
  variant: StripVariant;
  isPhone?: boolean;
  hasPulls?: boolean;
}

/** The run unrolled. One tab stop: the arrows walk the pieces, Enter goes to the fields of the one they stand on. */
export function StripPanel({ variant, isPhone = false, hasPulls = true }: Props) {
  const { say } = useWords();
  const { ref, width } = useWidth();
  const document = useRunEditor((state) => state.document);
  return (
    <section
      ref={ref}
      className={isPhone ? `${classes.panel} ${classes.phone}` : classes.panel}
      aria-label={say('workbench.strip.title')}
      data-variant={variant}
    >
      <PanelBoundary words={say('workbench.strip.broken')}>
        {isEmptyRun(document) ? (
          <GhostStrip variant={variant} />
        ) : (
          width > 0 && <DrawnStrip variant={variant} width={width} hasPulls={hasPulls} />
        )}
      </PanelBoundary>
    </section>
  );
}

function DrawnStrip({
  variant,
  width,
  hasPulls,
}: {
  variant: StripVariant;
  width: number;
  hasPulls: boolean;
}) {
  const document = useRunEditor((state) => state.document);
  const analysis = useRunEditor((state) => state.analysis);
  const expanded = useRunEditor((state) => state.expanded);
  const select = useRunEditor((state) => state.select);
  const pointAt = useRunEditor((state) => state.pointAt);
  const selected = useSelectedPiece();
  const { editSelected } = useCommands();
  const { sun } = useTheme();
  return (
    <Strip
      document={document}
      analysis={analysis}
      expanded={expanded}
      width={width}
      variant={variant}
      sun={sun}
      selectedId={selected?.id ?? null}
      hasPulls={hasPulls}
      onSelect={select}
      onPoint={pointAt}
      onEnter={editSelected}
    />
  );
}
