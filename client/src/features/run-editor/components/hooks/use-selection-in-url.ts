import { useEffect, useRef } from 'react';
import { useSearchParams } from 'react-router-dom';
import { useRunEditor } from '../../state/use-run-editor';

/** The selected piece stands in the URL: a reload or a link finds it again. */
export function useSelectionInUrl(): void {
  const [params, setParams] = useSearchParams();
  const selectedId = useRunEditor((state) => state.selectedId);
  const path = useRunEditor((state) => state.document.path);
  const select = useRunEditor((state) => state.select);
  const wanted = useRef(params.get('piece'));

  useEffect(() => {
    const id = wanted.current;
    wanted.current = null;
    if (id !== null && path.some((element) => element.id === id)) select(id);
    // eslint-disable-next-line react-hooks/exhaustive-deps -- only what the URL said when the run was opened
  }, []);

  useEffect(() => {
    if (wanted.current !== null || params.get('piece') === selectedId) return;
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        if (selectedId === null) after.delete('piece');
        else after.set('piece', selectedId);
        return after;
      },
      { replace: true, preventScrollReset: true },
    );
  }, [selectedId, params, setParams]);
}
