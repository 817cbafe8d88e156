import { useWords } from '../../../../hooks/use-words';
import type { Say } from '../../../../hooks/use-words';
import { commandOf } from '../commands/commands';
import type { CommandId } from '../commands/commands';
import { SwitchField } from '../fields/switch-field';
import { setLettersAct, useLetters } from '../hooks/use-letters';
import type { AddKey } from '../model/new-pieces';
import { SHORTCUTS, isSingleLetter } from '../shortcuts';
import type { Shortcut } from '../shortcuts';
import classes from './dialogs.module.css';

const GROUPS = ['edit', 'move', 'add'] as const;
const NAMED_KEYS = [
  'ArrowUp',
  'ArrowDown',
  'ArrowLeft',
  'ArrowRight',
  'Delete',
  'Enter',
  'Escape',
] as const;

function wordCommand(id: CommandId, say: Say): string {
  if (id.startsWith('add-')) {
    const key = id.slice('add-'.length) as AddKey;
    return say('workbench.add.named', { piece: say(`workbench.add.long.${key}`) });
  }
  return say(`workbench.shortcut.command.${id as Exclude<CommandId, `add-${AddKey}`>}`);
}

function keysOf(shortcut: Shortcut, say: Say): string[] {
  const named = NAMED_KEYS.find((key) => key === shortcut.key);
  return [
    ...(shortcut.mod ? [say('workbench.shortcut.key.mod')] : []),
    ...(shortcut.alt ? [say('workbench.shortcut.key.alt')] : []),
    ...(shortcut.shift ? [say('workbench.shortcut.key.shift')] : []),
    named ? say(`workbench.shortcut.key.${named}`) : shortcut.key.toUpperCase(),
  ];
}

/** Every key of the run editor, from the registry that listens for them. */
export function ShortcutsList() {
  const { say } = useWords();
  const lettersAct = useLetters((letters) => letters.lettersAct);
  return (
    <div className={classes.form}>
      <SwitchField
        label={say('workbench.shortcut.letters')}
        hint={say('workbench.shortcut.lettersHint')}
        checked={lettersAct}
        onChange={setLettersAct}
      />
      <div className={classes.keyGroups}>
        {GROUPS.map((group) => (
          <section key={group}>
            <h3 className={classes.keyGroup}>{say(`workbench.shortcut.group.${group}`)}</h3>
            <dl className={classes.keys}>
              {SHORTCUTS.filter(({ command }) => commandOf(command).group === group).map(
                (shortcut) => (
                  <div
                    key={`${shortcut.command} ${shortcut.key}`}
                    className={classes.keyLine}
                    data-off={(!lettersAct && isSingleLetter(shortcut)) || undefined}
                  >
                    <dt>{wordCommand(shortcut.command, say)}</dt>
                    <dd>
                      {keysOf(shortcut, say).map((key) => (
                        <kbd key={key}>{key}</kbd>
                      ))}
                    </dd>
                  </div>
                ),
              )}
            </dl>
          </section>
        ))}
      </div>
    </div>
  );
}
