const setNativeValue = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set;

/** Puts a text where the caret stands, as a keyboard would; null erases what stands before it or is marked. */
export function typeInto(input: HTMLInputElement, text: string | null): void {
  const { value } = input;
  const end = input.selectionEnd ?? value.length;
  const marked = input.selectionStart ?? value.length;
  const start = text === null && marked === end ? Math.max(0, marked - 1) : marked;
  const head = value.slice(0, start) + (text ?? '');
  // React listens to the native setter, not to the property it has replaced on the element.
  setNativeValue?.call(input, head + value.slice(end));
  input.dispatchEvent(new Event('input', { bubbles: true }));
  input.setSelectionRange(head.length, head.length);
}
