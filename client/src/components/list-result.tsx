import { Button } from '@mantine/core';
import type { ReactNode } from 'react';
import { useWords } from '../hooks/use-words';
import { EmptyPanel } from './empty-panel';
import { ListSkeleton } from './list-skeleton';
import { LoadFailure } from './load-failure';

/** What a list shows of a query that comes page by page. */
interface PagedQuery<Row> {
  data?: { pages: { items: Row[] }[] };
  error: unknown;
  isPending: boolean;
  isError: boolean;
  isSuccess: boolean;
  hasNextPage: boolean;
  isFetchingNextPage: boolean;
  refetch: () => unknown;
  fetchNextPage: () => unknown;
}

interface ListResultProps<Row> {
  list: PagedQuery<Row>;
  failure: string;
  /** What the empty place says. */
  empty: string;
  /** Given while a search or filter narrows the list. */
  onShowAll: (() => void) | null;
  children: (rows: Row[]) => ReactNode;
}

/** A list in each of its states: coming, failed, empty, there, and with more to load. */
export function ListResult<Row>({
  list,
  failure,
  empty,
  onShowAll,
  children,
}: ListResultProps<Row>) {
  const { say } = useWords();
  const rows = list.data?.pages.flatMap(({ items }) => items) ?? [];
  return (
    <>
      {list.isPending && <ListSkeleton rows={6} rowHeight="3.25rem" />}
      {list.isError && (
        <LoadFailure message={failure} error={list.error} onRetry={() => void list.refetch()} />
      )}
      {list.isSuccess && rows.length === 0 && (
        <EmptyPanel words={empty}>
          {onShowAll && (
            <Button variant="default" onClick={onShowAll}>
              {say('app.showAll')}
            </Button>
          )}
        </EmptyPanel>
      )}
      {rows.length > 0 && children(rows)}
      {list.hasNextPage && (
        <Button
          variant="default"
          loading={list.isFetchingNextPage}
          onClick={() => void list.fetchNextPage()}
        >
          {say('app.loadMore')}
        </Button>
      )}
    </>
  );
}
