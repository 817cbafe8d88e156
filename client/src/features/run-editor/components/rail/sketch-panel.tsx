import { Sketch } from '../../../../components/drawing/sketch';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useSelectedPiece } from '../hooks/use-piece';
import { useWidth } from '../hooks/use-width';
import classes from './rail.module.css';

const HEIGHT = 220;

/** The run in space, seen from above one corner. */
export function SketchPanel({ height = HEIGHT }: { height?: number }) {
  const { say } = useWords();
  const expanded = useRunEditor((state) => state.expanded);
  const analysis = useRunEditor((state) => state.analysis);
  const selected = useSelectedPiece();
  const cursor = useRunEditor((state) => state.cursor?.station ?? null);
  const { ref, width } = useWidth();
  const missing = expanded.centreLine
    ? null
    : expanded.directions === 'assumed-level'
      ? say('workbench.sketch.level')
      : expanded.directions === 'partial'
        ? say('workbench.sketch.partial')
        : say('workbench.sketch.none');
  return (
    <section className={classes.card} aria-labelledby="sketch-title">
      <div className={classes.head}>
        <h2 id="sketch-title" className={classes.title}>
          {say('workbench.sketch.title')}
        </h2>
        <span className={classes.aside}>{say('workbench.sketch.scale')}</span>
      </div>
      <div ref={ref} style={{ minHeight: missing ? undefined : height }}>
        {missing !== null && <p className={classes.quiet}>{missing}</p>}
        {missing === null && width > 0 && (
          <Sketch
            expanded={expanded}
            analysis={analysis}
            width={width}
            height={height}
            selectedId={selected?.id ?? null}
            cursor={cursor}
          />
        )}
      </div>
    </section>
  );
}
