import type { RunDocument } from '@fairlead/shared';

/** A run of the demo and where it hangs. */
export interface DemoRun {
  area: string;
  system: string;
  document: RunDocument;
}
