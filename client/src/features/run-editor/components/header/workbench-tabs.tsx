import { useWords } from '../../../../hooks/use-words';
import { useRunEditor } from '../../state/use-run-editor';
import { useCommands } from '../commands/commands-context';
import { PLACES } from '../commands/commands';
import type { Place } from '../commands/commands';
import type { DialogName } from '../dialogs/dialog-name';
import { wordRaceway } from '../model/word-piece';
import { wordRules } from '../model/word-rules';
import { wordWires } from '../model/word-wires';
import classes from './header.module.css';

interface Props {
  place: Place;
  onOpen: (dialog: DialogName) => void;
}

/** The parts of the run, and at the right what every answer rests on. */
export function WorkbenchTabs({ place, onOpen }: Props) {
  const { say } = useWords();
  const { goTo } = useCommands();
  const document = useRunEditor((state) => state.document);
  const assumed = useRunEditor((state) => state.analysis.assumed);
  const raceway = wordRaceway(document.raceway, say);
  const wires = wordWires(document.conductors ?? [], say);
  return (
    <div className={classes.tabs}>
      <div role="tablist" aria-label={say('workbench.tab.label')} style={{ display: 'contents' }}>
        {PLACES.map((option, index) => (
          <button
            key={option}
            type="button"
            role="tab"
            id={`tab-${option}`}
            className={classes.tab}
            aria-selected={option === place}
            aria-controls="workbench-panel"
            tabIndex={option === place ? 0 : -1}
            onClick={() => goTo(option)}
            onKeyDown={(event) => {
              const by = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0;
              const next = PLACES[index + by];
              if (by === 0 || !next) return;
              goTo(next);
              window.document.getElementById(`tab-${next}`)?.focus();
            }}
          >
            {say(`workbench.tab.${option}`)}
          </button>
        ))}
      </div>
      <span className={classes.grow} />
      <button type="button" className={classes.link} onClick={() => onOpen('raceway')}>
        {say('workbench.raceway.buttonWires', { raceway, wires })}
      </button>
      <button type="button" className={classes.link} onClick={() => onOpen('rules')}>
        {wordRules(document, assumed, say)}
      </button>
    </div>
  );
}
