/** The only door into the shared workspace. */
export * from './contracts/auth';
export * from './contracts/errors';
export * from './contracts/finding-codes';
export * from './contracts/jobs';
export * from './contracts/limits';
export * from './contracts/page';
export * from './contracts/roles';
export * from './contracts/run-analysis';
export * from './contracts/runs';
export * from './contracts/settings';
export * from './geometry/vector';
export * from './run/expanded-run';
export * from './run/run-command';
export * from './run/run-document';
