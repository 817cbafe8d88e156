/**
 * Title: percent of a raceway that conductors may fill, and the notes that go with it.
 * Source: NEC Chapter 9 Table 1; Note 4 (nipples), Note 7 (rounding), Informational Note 2 (jamming).
 * Edition: 2026 and 2023; the percentages are unchanged since at least 2005.
 * Cross-checked: four transcriptions; the rounding also by reproducing Annex C Table C.1.
 * Units: percent of the internal area; in.
 * Confidence: high.
 */
export const FILL_PERCENT = { one: 53, two: 31, overTwo: 40 } as const;

/** Note 4: a nipple of at most 24 in between enclosures may be filled to 60 %. */
export const NIPPLE = { percent: 60, maxLength: 24, cite: 'Chapter 9 Note 4' } as const;

/** Note 7: with conductors all of one size, a decimal of 0.8 or more rounds up. */
export const ROUNDING = { from: 0.8, cite: 'Chapter 9 Note 7' } as const;

/** Informational Note 2: three conductors can jam where bore over diameter lies between these. Not a requirement. */
export const JAM_BAND = {
  from: 2.8,
  to: 3.2,
  cite: 'Chapter 9 Table 1 Informational Note 2',
} as const;

/** 501.15(C)(6), section number from memory: fill of a sealing fitting, unless it is listed for more. */
export const SEAL = { percent: 25, cite: '501.15(C)(6)' } as const;
