import { DEFAULT_SETTINGS } from '@fairlead/shared';
import type { RunDocument } from '@fairlead/shared';
import { MantineProvider } from '@mantine/core';
import { render } from '@testing-library/react';
import type { ReactNode } from 'react';
import { MemoryRouter } from 'react-router-dom';
import { createMemoryRunStorage } from '../../state/memory-run-storage';
import { createRunEditor } from '../../state/create-run-editor';
import type { RunEditor } from '../../state/run-editor-state';
import { FakePage } from '../../state/testing/fake-page';
import { FakeServer } from '../../state/testing/fake-server';
import { RunEditorProvider } from '../../state/use-run-editor';
import { CommandsProvider } from '../commands/commands-context';
import { usePlace } from '../hooks/use-place';
import { Workbench } from '../workbench';

export interface EditorUnderTest {
  editor: RunEditor;
  server: FakeServer;
  page: FakePage;
  /** The run as it stands. */
  document: () => RunDocument;
}

/** A real store over a server of our own. */
export function makeEditor(document: RunDocument): EditorUnderTest {
  const server = new FakeServer(document);
  server.delay = 0;
  const page = new FakePage();
  let ids = 0;
  const editor = createRunEditor({
    run: structuredClone(server.run),
    settings: DEFAULT_SETTINGS,
    transport: server,
    storage: createMemoryRunStorage(),
    now: Date.now,
    newId: () => `id-${(ids += 1)}`,
    page,
  });
  return { editor, server, page, document: () => editor.getState().document };
}

const around = { goTo: () => undefined, editSelected: () => undefined, showKeys: () => undefined };

/** Shows one part of the run editor on a real store. */
export function renderPart(document: RunDocument, part: ReactNode): EditorUnderTest {
  const world = makeEditor(document);
  renderOn(world, <CommandsProvider around={around}>{part}</CommandsProvider>);
  return world;
}

export function renderOn({ editor }: EditorUnderTest, part: ReactNode) {
  return render(
    <MantineProvider env="test">
      <MemoryRouter>
        <RunEditorProvider editor={editor}>{part}</RunEditorProvider>
      </MemoryRouter>
    </MantineProvider>,
  );
}

function WholeWorkbench() {
  const [place, goTo] = usePlace();
  return <Workbench place={place} goTo={goTo} />;
}

/** Shows the whole run editor on a real store. */
export function renderWorkbench(document: RunDocument): EditorUnderTest {
  const world = makeEditor(document);
  renderOn(world, <WholeWorkbench />);
  return world;
}
