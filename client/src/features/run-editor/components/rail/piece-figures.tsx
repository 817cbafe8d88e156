import {
  explainDegrees,
  explainStation,
  explainTension,
  formatAngle,
  formatForce,
  typicalPulls,
} from '@fairlead/shared';
import type { Explanation } from '@fairlead/shared';
import { useDeferredValue, useMemo } from 'react';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { Explained } from '../explain/explained';
import { useEdition } from '../hooks/use-edition';
import { useSettings } from '../hooks/use-settings';
import { listLength } from '../model/list-length';
import type { Piece } from '../model/list-rows';
import { pullHolding } from '../model/pull-holding';
import classes from './rail.module.css';

/** The computed figures of a piece, as its row in the list has them; each opens. */
export function PieceFigures({ piece }: { piece: Piece }) {
  const { say } = useWords();
  const document = useDeferredValue(useRunEditor((state) => state.document));
  const analysis = useDeferredValue(useRunEditor((state) => state.analysis));
  const expanded = useDeferredValue(useRunEditor((state) => state.expanded));
  const settings = useSettings();
  const edition = useEdition();
  const typical = useMemo(() => typicalPulls(analysis, expanded), [analysis, expanded]);
  const placed = expanded.elements.find(({ element }) => element.id === piece.id);
  const section =
    analysis.sections.find(({ to }) => to === piece.id) ??
    analysis.sections.find(({ bends }) => bends.some(({ elementId }) => elementId === piece.id));
  const pull = pullHolding(analysis, expanded, piece.id);
  const pounds = typical.get(piece.id);
  const figures: { name: string; text: string; explain: () => Explanation | null }[] = [];
  if (placed && expanded.length !== null) {
    figures.push({
      name: say('workbench.list.along'),
      text: listLength(placed.from),
      explain: () => explainStation(expanded, piece.id),
    });
  }
  if (section) {
    const until = { path: document.path, elementId: piece.id };
    const bend = section.bends.find(({ elementId }) => elementId === piece.id);
    figures.push({
      name: say('workbench.list.since'),
      text: formatAngle(section.to === piece.id ? section.degrees : (bend?.cumulative ?? 0)),
      explain: () => explainDegrees(section, edition, until),
    });
  }
  if (pull && pounds !== undefined) {
    const question = { document, settings, pull, way: pull.planned, level: 'likely' } as const;
    figures.push({
      name: say('workbench.list.pull'),
      text: say('workbench.list.pounds', { pounds: formatForce(pounds) }),
      explain: () => explainTension(question, piece.id),
    });
  }
  if (figures.length === 0) return null;
  return (
    <dl className={classes.figures}>
      {figures.map(({ name, text, explain }) => (
        <div key={name}>
          <dt>{name}</dt>
          <dd>
            <Explained name={`${name} ${text}`} explain={explain}>
              {text}
            </Explained>
          </dd>
        </div>
      ))}
    </dl>
  );
}
