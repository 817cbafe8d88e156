import { DEFAULT_SETTINGS, buildRun } from '@fairlead/shared';
import type { RunDocument } from '@fairlead/shared';
import { vi } from 'vitest';
import type { LocalRunStorage } from '../local-run';
import { createMemoryRunStorage } from '../memory-run-storage';
import { openRunEditor } from '../open-run-editor';
import type { RunEditor } from '../run-editor-state';
import { FakeChannels } from './fake-channel';
import { FakePage } from './fake-page';
import { FakeServer } from './fake-server';

/** A device, a browser on it and a server, on fake time. Call it with fake timers in force. */
export class EditorWorld {
  readonly server: FakeServer;
  readonly page = new FakePage();
  readonly channels = new FakeChannels();
  /** Outlives every tab. */
  readonly storage: LocalRunStorage = { ...createMemoryRunStorage(), durable: true };
  private ids = 0;

  constructor(document: RunDocument = buildRun()) {
    this.server = new FakeServer(document);
  }

  /** Opens the run in a new tab, as the server has it, or as an earlier answer had it. */
  async open(run = structuredClone(this.server.run)): Promise<RunEditor> {
    let editor: RunEditor | undefined;
    const opening = openRunEditor({
      run,
      settings: DEFAULT_SETTINGS,
      scope: { companyId: 'company-1', userId: 'user-1' },
      transport: this.server,
      storage: this.storage,
      channel: this.channels.tab(),
      page: this.page,
      now: Date.now,
      newId: () => `id-${(this.ids += 1)}`,
    }).then((made) => {
      editor = made;
    });
    while (!editor) await vi.advanceTimersByTimeAsync(1);
    await opening;
    return editor;
  }

  /** Every tab dies between two instants: no timer, no event, no answer reaches it any more. */
  kill(): void {
    vi.clearAllTimers();
    this.channels.closeAll();
    this.page.forgetAll();
    this.server.inFlight = 0;
  }

  wait(ms: number): Promise<unknown> {
    return vi.advanceTimersByTimeAsync(ms);
  }
}
