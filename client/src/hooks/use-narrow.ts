import { useMediaQuery } from '@mantine/hooks';

/** A phone's width: cards instead of tables, actions at the foot. */
export function useNarrow(): boolean {
  return useMediaQuery('(max-width: 767px)', false, { getInitialValueInEffect: false });
}
