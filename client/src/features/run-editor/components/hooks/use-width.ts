import { useElementSize } from '@mantine/hooks';

/** How wide an element is, in whole px; 0 until it has been measured. */
export function useWidth() {
  const { ref, width } = useElementSize<HTMLDivElement>();
  return { ref, width: Math.floor(width) };
}
