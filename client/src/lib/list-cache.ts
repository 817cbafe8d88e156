import type { Page } from '@fairlead/shared';
import type { InfiniteData, QueryClient, QueryKey } from '@tanstack/react-query';

type Pages<T> = InfiniteData<Page<T>, unknown>;

/** Takes one item out of every cached list under a key, and hands back the way to put all of them as they were. */
export function takeFromLists<T extends { id: string }>(
  client: QueryClient,
  listsKey: QueryKey,
  id: string,
): () => void {
  const before = client.getQueriesData<Pages<T>>({ queryKey: listsKey });
  client.setQueriesData<Pages<T>>({ queryKey: listsKey }, (lists) => {
    if (!lists?.pages.some((page) => page.items.some((item) => item.id === id))) return lists;
    return {
      ...lists,
      pages: lists.pages.map((page) => ({
        ...page,
        total: page.total - 1,
        items: page.items.filter((item) => item.id !== id),
      })),
    };
  });
  return () => before.forEach(([key, lists]) => client.setQueryData(key, lists));
}
