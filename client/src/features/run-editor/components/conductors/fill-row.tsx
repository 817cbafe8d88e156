import {
  explainClearance,
  explainFill,
  explainJam,
  explainRoom,
  formatPercent,
} from '@fairlead/shared';
import type { SectionAnalysis, Status } from '@fairlead/shared';
import { StatusGlyph } from '../../../../components/drawing/status-glyph';
import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { Explained } from '../explain/explained';
import { useLabelOf } from '../hooks/use-labels';
import { wordRaceway } from '../model/word-piece';
import { areaText, clearanceText, ratioText, roomLeft } from '../model/fill-text';
import classes from './conductors.module.css';

/** Which fill findings turn a section over its limit. */
const OVER: ReadonlySet<string> = new Set(['fill-over', 'fill-seal-over']);

export function FillRow({ section }: { section: SectionAnalysis }) {
  const { say } = useWords();
  const labelOf = useLabelOf();
  const findings = useRunEditor((state) => state.findings);
  const document = useRunEditor((state) => state.document);
  const expanded = useRunEditor((state) => state.expanded);
  const { fill, noFill, jam, clearance } = section;
  const here = findings.filter(({ at }) => at.sectionId === section.id);
  const status: Status = here.some(({ code }) => OVER.has(code)) ? 'over' : 'ok';
  const name = say('workbench.list.section', {
    from: labelOf(section.from),
    to: labelOf(section.to),
  });
  const cell = (column: 'in' | 'fill' | 'room' | 'jam' | 'clearance') => ({
    'data-label': say(`workbench.conductors.${column}`),
  });
  if (!fill) {
    return (
      <tr>
        <th scope="row">{name}</th>
        <td colSpan={5}>
          <span className={classes.fillLine}>
            <StatusGlyph status="no-answer" size={18} />
            {noFill && say(`workbench.conductors.noFill.${noFill}`)}
          </span>
        </td>
      </tr>
    );
  }
  const room = roomLeft(fill);
  const jamWords =
    jam?.risk === 'possible'
      ? say('workbench.conductors.jamPossible', {
          ratio: ratioText(jam.ratio),
          oval: ratioText(jam.ratioWithOvality),
        })
      : say('workbench.conductors.jamClear');
  const roomWords =
    room.length === 0
      ? say('workbench.conductors.roomNone')
      : room
          .map(({ size, count }) => say('workbench.conductors.roomSize', { count, size }))
          .join(', ');
  const clearanceWords = say('workbench.conductors.clearanceValue', {
    clearance: clearanceText(clearance ?? 0),
  });
  const percent = say('workbench.conductors.percentOf', {
    percent: formatPercent(fill.percent).replace(/\s*%$/, ''),
    limit: formatPercent(fill.limitPercent),
  });
  return (
    <tr data-section={section.id}>
      <th scope="row">{name}</th>
      <td {...cell('in')}>{wordRaceway(fill.raceway, say)}</td>
      <td {...cell('fill')}>
        <span className={classes.fillLine}>
          <StatusGlyph status={status} size={18} />
          <Explained name={percent} explain={() => explainFill(document, expanded, section)}>
            {percent}
          </Explained>
          {status === 'over' && ` ${say('workbench.conductors.percentOver')}`}
        </span>
        <small>
          {say('workbench.conductors.detail', {
            conductors: areaText(fill.conductorArea),
            raceway: areaText(fill.racewayArea),
          })}
          {fill.nipple && ` · ${say('workbench.conductors.nipple')}`}
          {fill.byRounding && ` · ${say('workbench.conductors.byRounding')}`}
        </small>
      </td>
      <td {...cell('room')}>
        <Explained name={roomWords} explain={() => explainRoom(document, expanded, section)}>
          {roomWords}
        </Explained>
      </td>
      <td {...cell('jam')}>
        {jam === null ? (
          say('workbench.conductors.jamNone')
        ) : (
          <Explained name={jamWords} explain={() => explainJam(section)}>
            {jamWords}
          </Explained>
        )}
      </td>
      <td {...cell('clearance')}>
        {clearance === null ? (
          say('workbench.list.none')
        ) : (
          <Explained
            name={clearanceWords}
            explain={() => explainClearance(document, expanded, section)}
          >
            {clearanceWords}
          </Explained>
        )}
      </td>
    </tr>
  );
}
