// The engine on a run of 60 pieces, beside copying the same document as JSON.
import { createRequire } from 'node:module';
import { report, timed } from './figures.mjs';
import { longRun } from './long-run.mjs';

export async function benchAnalysis() {
  const { analyzeRun } = createRequire(import.meta.url)('@fairlead/shared');
  const document = longRun('B-1');
  const analysis = await timed(500, () => analyzeRun(document));
  const copy = await timed(500, () => JSON.parse(JSON.stringify(document)));
  report(
    `analysis of a run of ${document.path.length} pieces (wanted: 2 ms at most)`,
    analysis,
    copy,
    'a JSON copy of it',
  );
}
