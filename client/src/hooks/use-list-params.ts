import { useCallback } from 'react';
import { useSearchParams } from 'react-router-dom';

export interface ListParams {
  search: string;
  sort: string;
  status: string;
}

interface ListOptions {
  /** Columns, each also with a leading minus. */
  sorts: readonly string[];
  defaultSort: string;
  statuses: readonly string[];
}

/**
 * Search, sort and filter of a list, kept in the URL so that Back, a reload and a link find the same list.
 * A value the URL should not have counts as absent.
 */
export function useListParams({ sorts, defaultSort, statuses }: ListOptions) {
  const [params, setParams] = useSearchParams();
  const sort = params.get('sort') ?? defaultSort;
  const status = params.get('status') ?? '';
  const values: ListParams = {
    search: params.get('search') ?? '',
    sort: sorts.includes(sort.replace(/^-/, '')) ? sort : defaultSort,
    status: statuses.includes(status) ? status : '',
  };

  const set = useCallback(
    (change: Partial<ListParams>) =>
      setParams(
        (old) => {
          const next = new URLSearchParams(old);
          for (const [name, value] of Object.entries(change)) {
            if (value === '' || (name === 'sort' && value === defaultSort)) next.delete(name);
            else next.set(name, value);
          }
          return next;
        },
        { replace: true, preventScrollReset: true },
      ),
    [setParams, defaultSort],
  );
  return { values, set };
}
