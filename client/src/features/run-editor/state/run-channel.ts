import type { Run } from '@fairlead/shared';
import { scopeKey } from './local-run';
import type { LocalScope } from './local-run';

/** What tabs with the same run open tell each other. */
export type ChannelMessage =
  /** Whose copies in storage belong to a living tab? */
  | { type: 'who' }
  | { type: 'here'; slot: string }
  /** Copies of closed tabs that another tab has taken over: whoever still writes them stops. */
  | { type: 'adopted'; slots: string[] }
  /** A tab's save was confirmed. */
  | { type: 'saved'; slot: string; run: Run };

export interface RunChannel {
  post(message: ChannelMessage): void;
  /** Returns the way to stop listening. */
  listen(listener: (message: ChannelMessage) => void): () => void;
  close(): void;
}

/** A channel nobody else is on: where the browser has none. Two tabs are then told apart by the server's 409. */
export const SILENT_CHANNEL: RunChannel = {
  post: () => undefined,
  listen: () => () => undefined,
  close: () => undefined,
};

export function openRunChannel(scope: LocalScope, runId: string): RunChannel {
  if (typeof BroadcastChannel === 'undefined') return SILENT_CHANNEL;
  const channel = new BroadcastChannel(`fairlead|${scopeKey(scope)}|${runId}`);
  return {
    post: (message) => channel.postMessage(message),
    listen: (listener) => {
      const heard = (event: MessageEvent) => listener(event.data as ChannelMessage);
      channel.addEventListener('message', heard);
      return () => channel.removeEventListener('message', heard);
    },
    close: () => channel.close(),
  };
}
