import type { ElementKind } from '../run-document';

export const EDIT_KEYS = [
  'tag',
  'title',
  'raceway',
  'rules',
  'heading',
  'sets',
  'environment',
  'circuit',
  'conditions',
  'pulls',
  'add',
  'addSeveral',
  'angle',
  'direction',
  'rise',
  'height',
  'width',
  'length',
  'radius',
  'label',
  'device',
  'accessible',
  'notAccessible',
  'counting',
  'made',
  'flexDegrees',
  'pieceRaceway',
  'turn',
  'change',
  'replace',
  'remove',
  'removeSeveral',
  'move',
  'split',
  'addWires',
  'changeWires',
  'removeWires',
  'fix',
  'takeTheirs',
  'otherTab',
  'restored',
] as const;

/** Names an edit for Undo, as data: `wordEdit` makes "offset 9 angle" of it. */
export interface EditLabel {
  key: `edits.did.${(typeof EDIT_KEYS)[number]}`;
  values: EditValues;
}

export interface EditValues {
  /** The piece it is about; a leg is named after the piece it leads to. */
  piece?: ElementKind;
  /** As the list numbers it; absent for the two ends and for legs. */
  number?: number;
  /** What a person called it, e.g. a pull point's label. */
  name?: string;
  /** True: the leg before the piece. */
  leg?: boolean;
  count?: number;
  /** Of conductors, e.g. `12`. */
  size?: string;
}
