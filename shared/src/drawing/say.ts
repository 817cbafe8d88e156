import type { RacewayType } from '../run/run-document';

/** The words inside drawings, by their keys. */
export type DrawingWord =
  | `strip.${'toScale' | 'drawnLonger' | 'equalSteps' | 'run' | 'degrees' | 'since' | 'height'}`
  | `strip.${'over' | 'bends' | 'twice' | 'three' | 'four' | 'planned' | 'limit' | 'heightOf'}`
  | `strip.${'up' | 'down' | 'north' | 'east' | 'racewayFrom' | 'racewayThen' | 'racewayMore'}`
  | `workbench.raceway.type.${RacewayType}`
  | 'workbench.raceway.named';

/** Whatever turns a key and its values into words. */
export type DrawingSay = (key: DrawingWord, values?: Record<string, string | number>) => string;
