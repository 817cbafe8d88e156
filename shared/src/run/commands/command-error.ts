/** Why a command was refused; the words stand in `words/en/edits.json` under `refused`. */
export const COMMAND_ERROR_CODES = [
  'element-missing',
  'group-missing',
  'id-taken',
  'kind-fixed',
  'end-pull-point',
  'ends-need-pull-points',
  'past-the-end',
  'not-a-straight',
  'outside-the-straight',
  'nothing-given',
  'too-many-elements',
  'too-many-groups',
] as const;
export type CommandErrorCode = (typeof COMMAND_ERROR_CODES)[number];

/** A command that cannot be carried out on this document. */
export class CommandError extends Error {
  constructor(
    readonly code: CommandErrorCode,
    /** The piece or conductor group it is about. */
    readonly subjectId: string | null = null,
  ) {
    super(subjectId === null ? code : `${code}: "${subjectId}"`);
    this.name = 'CommandError';
  }
}
