import type { PageSignal, PageSignals } from '../page-signals';

/** A page whose connection and visibility a test decides. */
export class FakePage implements PageSignals {
  online = true;
  private listeners = new Map<PageSignal, Set<() => void>>();

  isOnline(): boolean {
    return this.online;
  }

  on(signal: PageSignal, listener: () => void): () => void {
    const listening = this.listeners.get(signal) ?? new Set();
    this.listeners.set(signal, listening.add(listener));
    return () => void listening.delete(listener);
  }

  forgetAll(): void {
    this.listeners.clear();
  }

  tell(signal: PageSignal): void {
    for (const listener of this.listeners.get(signal) ?? []) listener();
  }
}
