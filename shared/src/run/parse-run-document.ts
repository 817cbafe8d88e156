import type { Problem } from '../contracts/errors';
import { RUN_FORMAT, RUN_VERSION } from './run-document';
import type { ConductorGroup, RunDocument } from './run-document';
import { groupSchema } from './schema/conductors';
import { runDocumentShape } from './schema/document';
import { documentRules } from './schema/document-rules';
import { asObject } from './schema/loose';
import { readPlainData } from './schema/read-plain-data';
import { schemaProblems } from './schema/schema-problems';

export type ParsedRun = { ok: true; document: RunDocument } | { ok: false; problems: Problem[] };

/**
 * Reads anything as a run document. It never throws; what it accepts is a fresh deep copy without a default added, and
 * what it refuses comes with every problem there is: the JSON pointer of the value, what was found, what is allowed.
 */
export function parseRunDocument(input: unknown): ParsedRun {
  const plain = readPlainData(input);
  const newer = newerVersion(plain.value);
  if (newer) return { ok: false, problems: [newer] };

  const shape = runDocumentShape.safeParse(plain.value);
  const groups = parseGroups(plain.value);
  // What could not be read at all is said once, not again by the schema.
  const unread = new Set(plain.problems.map(({ pointer }) => pointer));
  const read = [
    ...schemaProblems(shape.error?.issues ?? [], plain.value, []),
    ...groups.problems,
    ...documentRules(plain.value),
  ].filter(({ pointer }) => !unread.has(pointer));
  const problems = [...plain.problems, ...read];
  if (problems.length > 0 || !shape.success) return { ok: false, problems: listed(problems) };
  const { conductors, ...rest } = shape.data;
  return { ok: true, document: { ...rest, ...(conductors && { conductors: groups.read }) } };
}

/** A later format has fields this one cannot judge: only its version is reported. */
function newerVersion(value: unknown): Problem | null {
  const { format, version } = asObject(value);
  if (format !== RUN_FORMAT || typeof version !== 'number') return null;
  if (!Number.isInteger(version) || version <= RUN_VERSION) return null;
  return { pointer: '/version', code: 'version-newer', found: version, allowed: [RUN_VERSION] };
}

function parseGroups(value: unknown): { read: ConductorGroup[]; problems: Problem[] } {
  const { conductors } = asObject(value);
  const read: ConductorGroup[] = [];
  const problems: Problem[] = [];
  (Array.isArray(conductors) ? conductors : []).forEach((group: unknown, index) => {
    const parsed = groupSchema(group).safeParse(group);
    if (parsed.success) read.push(parsed.data);
    else problems.push(...schemaProblems(parsed.error.issues, value, ['conductors', index]));
  });
  return { read, problems };
}

/** A refused document may be wrong in every key it has; past this many the answer says only how many more there are. */
const MOST_PROBLEMS = 2_000;

function listed(problems: Problem[]): Problem[] {
  const more = problems.length - MOST_PROBLEMS;
  if (more <= 0) return problems;
  const rest = { pointer: '', code: 'more-problems', found: more, allowed: null };
  return [...problems.slice(0, MOST_PROBLEMS), rest];
}
