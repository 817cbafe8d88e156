// The direction rules of the house really fire: each sample is linted as if it stood at the given path.
import { join } from 'node:path';
import { ESLint } from 'eslint';
import { beforeAll, describe, expect, it } from 'vitest';
import { ROOT } from '../lib/paths.mjs';

let eslint;
beforeAll(() => {
  eslint = new ESLint({ cwd: ROOT });
});

async function restricted(path, code) {
  const [result] = await eslint.lintText(code, { filePath: join(ROOT, path) });
  return result.messages.filter(({ ruleId }) => ruleId === 'no-restricted-imports').length;
}

describe('imports run one way', () => {
  it.each([
    ['shared/src/checks/x.ts', `import { readFileSync } from 'node:fs';`],
    ['shared/src/checks/x.ts', `import { useState } from 'react';`],
    ['shared/src/checks/x.ts', `import '../../../server/src/main';`],
    ['server/src/runs/x.ts', `import '@fairlead/shared/dist/run/build-run';`],
    ['server/src/runs/x.ts', `import '../../../client/src/main';`],
    ['client/src/lib/x.ts', `import '../features/jobs/api/job-queries';`],
    ['client/src/components/x.tsx', `import '../pages/jobs-page';`],
    ['client/src/hooks/x.ts', `import '../app/router';`],
    ['client/src/features/auth/api/x.ts', `import '../../features/jobs/api/job-queries';`],
    ['client/src/features/auth/api/x.ts', `import '../../jobs/api/job-queries';`],
    ['client/src/features/auth/api/x.ts', `import '../../../pages/jobs-page';`],
    ['client/src/pages/x.tsx', `import '../app/router';`],
    ['client/src/pages/x.tsx', `import '@fairlead/shared/src/run/build-run';`],
  ])('%s may not: %s', async (path, code) => {
    expect(await restricted(path, code)).toBe(1);
  });

  it.each([
    ['client/src/features/auth/api/x.ts', `import '../../../lib/api-client';`],
    ['client/src/features/auth/components/x.tsx', `import '../api/session-requests';`],
    ['client/src/features/run-editor/components/rail/x.tsx', `import '../fields/leg-field';`],
    [
      'client/src/features/run-editor/components/rail/x.tsx',
      `import '../../state/use-run-editor';`,
    ],
    ['client/src/pages/x.tsx', `import '../features/jobs/api/job-queries';`],
    ['client/src/app/x.tsx', `import '../pages/jobs-page';`],
    ['server/src/runs/x.ts', `import '@fairlead/shared';`],
  ])('%s may: %s', async (path, code) => {
    expect(await restricted(path, code)).toBe(0);
  });
});
