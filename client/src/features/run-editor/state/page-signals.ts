export type PageSignal = 'online' | 'hide';

/** What the store listens to of the page it lives in. */
export interface PageSignals {
  isOnline(): boolean;
  /** Returns the way to stop listening. */
  on(signal: PageSignal, listener: () => void): () => void;
}

/** `hide` comes when the tab is left, put in the background or closed: the last moment that is sure to be told. */
export function browserPage(): PageSignals {
  return {
    isOnline: () => navigator.onLine,
    on: (signal, listener) => {
      if (signal === 'online') return listen(window, 'online', listener);
      const stopPage = listen(window, 'pagehide', listener);
      const stopDocument = listen(document, 'visibilitychange', () => {
        if (document.visibilityState === 'hidden') listener();
      });
      return () => {
        stopPage();
        stopDocument();
      };
    },
  };
}

function listen(target: EventTarget, type: string, listener: () => void): () => void {
  target.addEventListener(type, listener);
  return () => target.removeEventListener(type, listener);
}
