/** A LIKE pattern for what contains the text; `%`, `_` and the escape itself stand for themselves. E.g. `5%` → `%5!%%`. */
export function containing(text: string): string {
  return `%${text.replace(/[!%_]/g, '!$&')}%`;
}
