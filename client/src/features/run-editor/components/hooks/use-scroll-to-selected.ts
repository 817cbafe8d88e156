import { useEffect } from 'react';
import type { RefObject } from 'react';

/** Keeps the selected row in sight, and the focus on it where the focus was on a row already. */
export function useScrollToSelected(
  list: RefObject<HTMLElement | null>,
  selectedId: string | null,
) {
  useEffect(() => {
    if (selectedId === null) return;
    const row = list.current?.querySelector<HTMLElement>(
      `[data-piece="${CSS.escape(selectedId)}"]`,
    );
    if (!row) return;
    row.scrollIntoView({ block: 'nearest' });
    const focused = document.activeElement;
    const isOnRow = focused instanceof HTMLElement && focused.closest('[data-piece]') !== null;
    if (isOnRow && focused !== row && list.current?.contains(focused)) row.focus();
  }, [list, selectedId]);
}
