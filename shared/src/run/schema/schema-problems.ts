import type * as z from 'zod/mini';
import type { Problem } from '../../contracts/errors';
import { pointerOf, pointerStep, shownFound } from './problem-text';

type Issue = z.core.$ZodIssue;
type Path = readonly PropertyKey[];

/** A schema's complaints as problems: where, what was found, what is allowed. */
export function schemaProblems(issues: readonly Issue[], root: unknown, base: Path): Problem[] {
  return issues.flatMap((issue) => problemsOf(issue, root, base));
}

function problemsOf(issue: Issue, root: unknown, base: Path): Problem[] {
  const path = [...base, ...issue.path];
  const value = valueAt(root, path);
  const problem = (code: string, allowed: unknown): Problem[] => [
    { pointer: pointerOf(path), code, found: shownFound(value), allowed },
  ];
  switch (issue.code) {
    case 'invalid_type':
      if (value === undefined) return problem('missing', issue.expected);
      return issue.expected === 'int' && typeof value === 'number'
        ? problem('not-whole', 'whole number')
        : problem('wrong-type', issue.expected);
    case 'invalid_value':
      return problem(value === undefined ? 'missing' : 'not-one-of', [...issue.values]);
    case 'too_small':
      return typeof value === 'number'
        ? problem(
            'too-small',
            issue.inclusive ? { atLeast: issue.minimum } : { above: issue.minimum },
          )
        : problem(Array.isArray(value) ? 'too-few' : 'too-short', { atLeast: issue.minimum });
    case 'too_big':
      return typeof value === 'number'
        ? problem(
            'too-large',
            issue.inclusive ? { atMost: issue.maximum } : { below: issue.maximum },
          )
        : problem(Array.isArray(value) ? 'too-many' : 'too-long', { atMost: issue.maximum });
    case 'unrecognized_keys':
      return issue.keys.map((key) => ({
        pointer: pointerOf(path) + pointerStep(key),
        code: 'unknown-key',
        found: shownFound(valueAt(value, [key])),
        allowed: null,
      }));
    case 'invalid_union':
      return unionProblems(issue, root, path);
    case 'custom':
      return problem(String(issue.params?.code ?? 'not-allowed'), issue.params?.allowed ?? null);
    default:
      return problem('not-allowed', null);
  }
}

function unionProblems(
  issue: Extract<Issue, { code: 'invalid_union' }>,
  root: unknown,
  path: Path,
): Problem[] {
  const value = valueAt(root, path);
  const pointer = pointerOf(path);
  if ('options' in issue && Array.isArray(issue.options)) {
    const code = value === undefined ? 'missing' : 'not-one-of';
    return [{ pointer, code, found: shownFound(value), allowed: issue.options }];
  }
  // The branch that accepts this kind of value, if any, says what is wrong inside it.
  const inside = issue.errors.find((errors) => !errors.some(refusesKind));
  if (inside) return schemaProblems(inside, root, path);
  const allowed = issue.errors.flatMap((errors) => errors.flatMap(allowedKinds));
  return [{ pointer, code: 'not-one-of', found: shownFound(value), allowed }];
}

function refusesKind(issue: Issue): boolean {
  return issue.path.length === 0 && ['invalid_type', 'invalid_value'].includes(issue.code);
}

function allowedKinds(issue: Issue): unknown[] {
  if (issue.code === 'invalid_value') return [...issue.values];
  return issue.code === 'invalid_type' ? [issue.expected] : [];
}

function valueAt(root: unknown, path: Path): unknown {
  let value = root;
  for (const key of path) {
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, key)) return undefined;
    value = (value as Record<PropertyKey, unknown>)[key];
  }
  return value;
}
