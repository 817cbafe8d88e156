import type { RunCommand } from '../run-command';
import type { RunDocument } from '../run-document';
import { addConductors, removeConductors, setConductors } from './conductor-edits';
import {
  insertElements,
  moveElement,
  removeElements,
  replaceElement,
  setElement,
  splitStraight,
} from './path-edits';
import { sparse, withField } from './sparse';

/**
 * Carries out one edit: document in, document out. What did not change is shared with the old document; the old one is
 * never touched. Throws a `CommandError` where the command cannot be carried out. Values are not judged here: that is
 * the parser's part, so a command may make a document the parser refuses.
 */
export function applyCommand(document: RunDocument, command: RunCommand): RunDocument {
  switch (command.command) {
    case 'set-identity':
      return setIdentity(document, command.args);
    case 'set-raceway':
      return { ...document, raceway: sparse(command.args.raceway) };
    case 'set-rules':
      return { ...document, rules: sparse(command.args.rules) };
    case 'set-start':
      return { ...document, start: sparse(command.args.start) };
    case 'set-sets':
      return { ...document, sets: command.args.sets };
    case 'set-environment':
      return { ...document, environment: sparse(command.args.environment) };
    case 'set-circuit':
      return { ...document, circuit: sparse(command.args.circuit) };
    case 'set-conditions':
      return withField(document, 'conditions', someOf(sparse(command.args.conditions)));
    case 'set-pulls':
      return withField(document, 'pulls', someOf(command.args.pulls));
    case 'insert-elements':
      return insertElements(document, command.args.afterId, command.args.elements);
    case 'set-element':
      return setElement(document, command.args.elementId, command.args.patch);
    case 'replace-element':
      return replaceElement(document, command.args.elementId, command.args.element);
    case 'remove-elements':
      return removeElements(document, command.args.elementIds);
    case 'move-element':
      return moveElement(document, command.args.elementId, command.args.by);
    case 'split-straight':
      return splitStraight(document, command.args);
    case 'add-conductors':
      return addConductors(document, command.args.group);
    case 'set-conductors':
      return setConductors(document, command.args.group);
    case 'remove-conductors':
      return removeConductors(document, command.args.groupId);
  }
}

/** Nothing in it is nothing given. */
function someOf<T extends object>(value: T): T | undefined {
  return Object.keys(value).length === 0 ? undefined : value;
}

/** Carries out several edits in order; all or, where one is refused, none. */
export function applyCommands(document: RunDocument, commands: readonly RunCommand[]): RunDocument {
  return commands.reduce(applyCommand, document);
}

/** An emptied title is taken out; a tag is never emptied away, the parser says that it is missing. */
function setIdentity(
  document: RunDocument,
  { tag, title }: { tag?: string; title?: string },
): RunDocument {
  const tagged = tag === undefined ? document : { ...document, tag };
  return title === undefined
    ? tagged
    : withField(tagged, 'title', title === '' ? undefined : title);
}
