/** Every finding the engine can make: `check-outcome`. The words stand in `words/en/findings.json` under the same key. */
export const FINDING_CODES = [
  // degrees
  'degrees-over',
  'degrees-over-own-limit',
  'degrees-past-270',
  'degrees-strict-over',
  'degrees-flex-decides',
  'degrees-sweep-decides',
  'degrees-mixed-raceways',
  'degrees-edition-not-read',
  // access
  'access-not-allowed',
  // fill
  'fill-over',
  'fill-by-rounding',
  'fill-nipple',
  'fill-seal-over',
  // jam and clearance
  'jam-possible',
  'clearance-tight',
  'clearance-negative',
  // pulls
  'tension-over',
  'tension-over-if-dry',
  'sidewall-over',
  'sidewall-past-caution',
  'pull-in-two',
  'pull-set-changes',
  'pull-turns-without-sheave',
  'pull-no-reach',
  'pull-hold-back',
  'pull-level-assumed',
  'rope-too-weak',
  'weight-estimated',
  // radius and legs
  'radius-too-tight',
  'radius-unknown',
  'leg-too-short',
  'saddle-too-low',
  // length
  'length-over',
  // directions
  'direction-missing',
  'direction-parallel',
] as const;
export type FindingCode = (typeof FINDING_CODES)[number];
