import { createWords } from '@fairlead/shared';

const words = createWords('en');

export type Say = typeof words.say;

/** The words of every screen: `say('jobs.newJob')`. */
export function useWords(): typeof words {
  return words;
}
