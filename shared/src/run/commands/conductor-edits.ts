import { LIMITS } from '../../contracts/limits';
import { numberGroups } from '../element-ids';
import type { ConductorGroup, RunDocument } from '../run-document';
import { CommandError } from './command-error';
import { replacedAt, sparse, withField } from './sparse';

export function addConductors(document: RunDocument, group: ConductorGroup): RunDocument {
  const groups = document.conductors ?? [];
  if (groups.length >= LIMITS.conductorGroups) throw new CommandError('too-many-groups');
  const named = numberGroups(document, [group])[0] as ConductorGroup;
  const isTaken = [...document.path, ...groups].some(({ id }) => id === named.id);
  if (isTaken) throw new CommandError('id-taken', named.id);
  return { ...document, conductors: [...groups, sparse(named)] };
}

export function setConductors(document: RunDocument, group: ConductorGroup): RunDocument {
  const groups = document.conductors ?? [];
  return {
    ...document,
    conductors: replacedAt(groups, indexOfGroup(groups, group.id), sparse(group)),
  };
}

/** A run without wires says nothing about wires: the last group takes the list with it. */
export function removeConductors(document: RunDocument, groupId: string): RunDocument {
  const groups = document.conductors ?? [];
  const index = indexOfGroup(groups, groupId);
  const rest = groups.filter((_, place) => place !== index);
  return withField(document, 'conductors', rest.length > 0 ? rest : undefined);
}

function indexOfGroup(groups: readonly ConductorGroup[], groupId: string): number {
  const index = groups.findIndex(({ id }) => id === groupId);
  if (index < 0) throw new CommandError('group-missing', groupId);
  return index;
}
