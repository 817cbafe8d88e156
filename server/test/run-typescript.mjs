/** Runs the sources in a child process of a test: `node -C @fairlead/source run-typescript.mjs src/main.ts`. */
import { readFileSync } from 'node:fs';
import Module, { createRequire } from 'node:module';
import { resolve } from 'node:path';
import { transformSync } from '@swc/core';

const options = {
  jsc: {
    target: 'es2022',
    parser: { syntax: 'typescript', decorators: true },
    transform: { legacyDecorator: true, decoratorMetadata: true, useDefineForClassFields: false },
    keepClassNames: true,
  },
  module: { type: 'commonjs' },
};

Module._extensions['.ts'] = (module, filename) => {
  const { code } = transformSync(readFileSync(filename, 'utf8'), { ...options, filename });
  module._compile(code, filename);
};

const [, , program] = process.argv;
createRequire(import.meta.url)(resolve(program));
