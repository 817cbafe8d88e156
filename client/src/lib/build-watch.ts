import { create } from 'zustand';

/** Each answer carries the server's build id; another one than the first seen means a newer version can be offered. */
export const useBuild = create<{ seen: string | null; newer: boolean }>(() => ({
  seen: null,
  newer: false,
}));

export function noticeBuild(build: string | null): void {
  const { seen, newer } = useBuild.getState();
  if (build === null || newer) return;
  if (seen === null) useBuild.setState({ seen: build });
  else if (seen !== build) useBuild.setState({ newer: true });
}
