/** Moves the focus to the first field of the selected piece. */
export function focusFirstField(): void {
  const fields = document.querySelector('[data-selected-piece]');
  const first = fields?.querySelector<HTMLElement>(
    'input:not(:disabled),select:not(:disabled),[data-length-field],[role="radio"]:not(:disabled)',
  );
  first?.focus();
  if (first instanceof HTMLInputElement && first.type !== 'checkbox') first.select();
}
