import type { CompanySettings, Run } from '@fairlead/shared';
import type { LocalRunStorage } from './local-run';
import type { PageSignals } from './page-signals';
import type { StartingPoint } from './recover-run';
import type { RunChannel } from './run-channel';
import type { RunTransport } from './run-transport';

export interface RunEditorOptions {
  run: Run;
  settings: CompanySettings;
  transport: RunTransport;
  storage: LocalRunStorage;
  /** ms. */
  now: () => number;
  /** UUIDs, for idempotency keys. */
  newId: () => string;
  /** From `openRunEditor`; by default what the server has. */
  start?: StartingPoint;
  channel?: RunChannel;
  page?: PageSignals;
}
