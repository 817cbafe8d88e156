import { useWords } from '../../../../hooks/use-words';
import { PLACES } from '../commands/commands';
import type { Place } from '../commands/commands';
import { useCommands } from '../commands/commands-context';
import classes from './phone.module.css';

export function PhoneTabs({ place }: { place: Place }) {
  const { say } = useWords();
  const { goTo } = useCommands();
  return (
    <div className={classes.tabs} role="tablist" aria-label={say('workbench.tab.label')}>
      {PLACES.map((option) => (
        <button
          key={option}
          type="button"
          role="tab"
          id={`tab-${option}`}
          className={classes.tab}
          aria-selected={option === place}
          aria-controls="workbench-panel"
          onClick={() => goTo(option)}
        >
          {say(option === 'conductors' ? 'workbench.tab.wires' : `workbench.tab.${option}`)}
        </button>
      ))}
    </div>
  );
}
