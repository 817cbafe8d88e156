import { createContext, useContext } from 'react';
import type { ReactNode } from 'react';
import { useStore } from 'zustand';
import type { RunEditor, RunEditorState } from './run-editor-state';

const RunEditorContext = createContext<RunEditor | null>(null);

export function RunEditorProvider({
  editor,
  children,
}: {
  editor: RunEditor;
  children: ReactNode;
}) {
  return <RunEditorContext.Provider value={editor}>{children}</RunEditorContext.Provider>;
}

/** Reads a part of the open run's state; the component renders again only when that part changes. */
export function useRunEditor<T>(select: (state: RunEditorState) => T): T {
  const editor = useContext(RunEditorContext);
  if (!editor) throw new Error('useRunEditor stands outside a RunEditorProvider.');
  return useStore(editor, select);
}
