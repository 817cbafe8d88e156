import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';

/** Attributes a person reads or hears. */
const SPOKEN = new Set(['aria-label', 'alt', 'title', 'label', 'placeholder', 'description']);

function* sources(folder: string): Generator<string> {
  for (const entry of readdirSync(folder, { withFileTypes: true })) {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) yield* sources(path);
    else if (/\.tsx$/.test(entry.name) && !entry.name.includes('.test.')) yield path;
  }
}

/** Words written into markup instead of being asked from the words. */
function rawWords(name: string, text: string): string[] {
  const file = ts.createSourceFile(name, text, ts.ScriptTarget.Latest, true, ts.ScriptKind.TSX);
  const found: string[] = [];
  const visit = (node: ts.Node): void => {
    if (ts.isJsxText(node) && /\p{L}{2,}/u.test(node.text)) found.push(node.text.trim());
    if (
      ts.isJsxAttribute(node) &&
      SPOKEN.has(node.name.getText(file)) &&
      node.initializer !== undefined &&
      ts.isStringLiteral(node.initializer) &&
      node.initializer.text !== ''
    ) {
      found.push(node.initializer.text);
    }
    ts.forEachChild(node, visit);
  };
  visit(file);
  return found;
}

describe('markup holds no words of its own', () => {
  it.each([...sources(join(process.cwd(), 'src'))])('%s', (path) => {
    expect(rawWords(path, readFileSync(path, 'utf8'))).toEqual([]);
  });

  it('would notice them', () => {
    const found = rawWords('x.tsx', `<p title="Hello">Some words {say('a.b')}</p>`);
    expect(found).toEqual(['Hello', 'Some words']);
  });
});
