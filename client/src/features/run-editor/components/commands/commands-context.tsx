import { createContext, useContext, useMemo } from 'react';
import type { ReactNode } from 'react';
import { useRunEditor } from '../../state/use-run-editor';
import { commandOf } from './commands';
import type { Around, CommandId } from './commands';
import { useCommand, useShortcuts } from './use-commands';

interface Commands extends Around {
  /** False where the command has nothing to act on. */
  doCommand: (id: CommandId) => boolean;
}

const CommandsContext = createContext<Commands | null>(null);

/** Hands the registry to the buttons and the keys of everything inside. */
export function CommandsProvider({ around, children }: { around: Around; children: ReactNode }) {
  const doCommand = useCommand(around);
  useShortcuts(doCommand);
  const commands = useMemo(() => ({ ...around, doCommand }), [around, doCommand]);
  return <CommandsContext.Provider value={commands}>{children}</CommandsContext.Provider>;
}

export function useCommands(): Commands {
  const commands = useContext(CommandsContext);
  if (!commands) throw new Error('useCommands stands outside a CommandsProvider.');
  return commands;
}

export function useIsEnabled(id: CommandId): boolean {
  return useRunEditor(commandOf(id).isEnabled);
}
