import { useCallback, useEffect, useRef } from 'react';
import { useSearchParams } from 'react-router-dom';
import { PLACES } from '../commands/commands';
import type { Place } from '../commands/commands';

/**
 * Which part of the run is shown; it stands in the URL, so that Back and a link work. The function stays the same while
 * the URL changes: the selection stands there too, and a step through the pieces must not draw the whole page again.
 */
export function usePlace(): [Place, (place: Place) => void] {
  const [params, setParams] = useSearchParams();
  const place = PLACES.find((known) => known === params.get('tab')) ?? 'layout';
  const latest = useRef({ place, setParams });
  useEffect(() => {
    latest.current = { place, setParams };
  });
  const goTo = useCallback((next: Place) => {
    if (next === latest.current.place) return;
    latest.current.setParams(
      (before) => {
        const after = new URLSearchParams(before);
        if (next === 'layout') after.delete('tab');
        else after.set('tab', next);
        return after;
      },
      { preventScrollReset: true },
    );
  }, []);
  return [place, goTo];
}
