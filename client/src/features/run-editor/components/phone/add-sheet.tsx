import { useWords } from '../../../../hooks/use-words';
import { useCommands } from '../commands/commands-context';
import { ADD_KEYS } from '../model/new-pieces';
import { PhoneSheet } from './phone-sheet';
import classes from './phone.module.css';
import { TickIcon } from './tick-icon';

interface Props {
  title: string;
  onClose: () => void;
}

/** Large keys, each drawn as the tick it adds. It stays open, so that a run is added tap by tap. */
export function AddSheet({ title, onClose }: Props) {
  const { say } = useWords();
  const { doCommand } = useCommands();
  return (
    <PhoneSheet title={title} onClose={onClose}>
      <div className={classes.addKeys}>
        {ADD_KEYS.map((key) => (
          <button
            key={key}
            type="button"
            className={classes.addKey}
            aria-label={say('workbench.add.named', { piece: say(`workbench.add.long.${key}`) })}
            onClick={() => doCommand(`add-${key}`)}
          >
            <TickIcon addKey={key} />
            {say(`workbench.add.long.${key}`)}
          </button>
        ))}
      </div>
    </PhoneSheet>
  );
}
