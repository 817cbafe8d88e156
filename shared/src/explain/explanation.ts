/** A value that went into a figure, where it comes from, and whether somebody gave it. */
export interface ExplanationInput {
  /** Under `explain.input` in the words. */
  what: string;
  value: string;
  /** A table row and its edition, a named source, or that somebody gave it on the run. */
  source: string;
}

/** How a figure came about: what a person opens behind a number. Mathematics reads the same in every language. */
export interface Explanation {
  /** Under `explain.title` in the words. */
  title: string;
  /** The figure, unrounded as far as anybody reads. */
  exact: string;
  /** To what the screen rounds it, "1″"; null: it shows it whole. */
  shownTo: string | null;
  formula: string;
  /** The formula with its numbers in it, a line for each step. */
  worked: string[];
  inputs: ExplanationInput[];
}

/** A number with at most `places` decimals and no zeros after them. */
export function plain(value: number, places = 4): string {
  return String(Number(value.toFixed(places))).replace('-', '−');
}
