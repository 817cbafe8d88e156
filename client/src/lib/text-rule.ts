import type { Say } from '../hooks/use-words';

/** Says what is wrong with a line of text: missing when it is required, or longer than its column. */
export function textRule(say: Say, max: number, required: boolean) {
  return (text: string): string | null => {
    if (required && text.trim() === '') return say('app.problem.required');
    return text.trim().length > max ? say('app.problem.long', { max }) : null;
  };
}
