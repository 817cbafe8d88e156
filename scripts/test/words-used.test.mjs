// Every word of the catalogue is said somewhere: by its own key, or by a key built from its parent.
import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { ROOT } from '../lib/paths.mjs';

function textOf(folder, ending) {
  return readdirSync(join(ROOT, folder), { recursive: true })
    .filter((name) => ending.test(name))
    .map((name) => ({ name, text: readFileSync(join(ROOT, folder, name), 'utf8') }));
}

const keysUnder = (words, prefix) =>
  Object.entries(words).flatMap(([key, value]) =>
    typeof value === 'string' ? [`${prefix}.${key}`] : keysUnder(value, `${prefix}.${key}`),
  );

/** The keys no source names, neither whole ('jobs.title') nor from a parent on (`jobs.status.${status}`). */
function unsaid(keys, source) {
  const isSaid = (key) => {
    const parts = key.split('.');
    const fromParent = (_, end) =>
      end > 0 && source.includes(`\`${parts.slice(0, end).join('.')}.\${`);
    return source.includes(`'${key}'`) || parts.some(fromParent);
  };
  return keys.map((key) => key.replace(/_(one|other)$/, '')).filter((key) => !isSaid(key));
}

it('no word of the catalogue is left over', () => {
  const source = ['shared/src', 'client/src']
    .flatMap((folder) => textOf(folder, /\.tsx?$/))
    .map(({ text }) => text)
    .join('\n');
  const keys = textOf('shared/src/words/en', /\.json$/).flatMap(({ name, text }) =>
    keysUnder(JSON.parse(text), name.replace('.json', '')),
  );
  expect(keys.length).toBeGreaterThan(300);
  expect(unsaid(keys, source)).toEqual([]);
});

it('a word nothing says is found', () => {
  const source = "say('a.said'); say(`a.status.${status}`);";
  expect(unsaid(['a.said', 'a.status.ok', 'a.left_one'], source)).toEqual(['a.left']);
});
