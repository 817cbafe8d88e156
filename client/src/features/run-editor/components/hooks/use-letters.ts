import { create } from 'zustand';

const KEY = 'fairlead.single-letters';

function kept(): boolean {
  try {
    return localStorage.getItem(KEY) !== 'off';
  } catch {
    return true;
  }
}

/** Whether single letters act, on this device (WCAG 2.1.4). */
export const useLetters = create<{ lettersAct: boolean }>(() => ({ lettersAct: kept() }));

export function setLettersAct(lettersAct: boolean): void {
  try {
    localStorage.setItem(KEY, lettersAct ? 'on' : 'off');
  } catch {
    // Without storage the choice holds until the page closes.
  }
  useLetters.setState({ lettersAct });
}
