import type { ChannelMessage, RunChannel } from '../run-channel';

/** Tabs of one browser: each `tab()` hears what the others post, a moment later. */
export class FakeChannels {
  private tabs = new Set<Set<(message: ChannelMessage) => void>>();

  closeAll(): void {
    this.tabs.clear();
  }

  tab(): RunChannel {
    const own = new Set<(message: ChannelMessage) => void>();
    this.tabs.add(own);
    return {
      post: (message) => {
        for (const other of this.tabs) {
          if (other !== own)
            setTimeout(() => other.forEach((hear) => hear(structuredClone(message))), 1);
        }
      },
      listen: (listener) => {
        own.add(listener);
        return () => void own.delete(listener);
      },
      close: () => void this.tabs.delete(own),
    };
  }
}
