'use client';

import { createContext, useContext } from 'react';
import { useStore } from 'zustand';
import type { Project } from '@/lib/contracts/project';
import type { Editor, EditorState } from '@/lib/editor/editor-store';
import type { FontBook } from '@/lib/outline/fonts';
import type { Planning } from './use-planning';

/** Pages of the inspector's side; `selected` follows what is selected. */
export type PanelName = 'selected' | 'outlines' | 'board' | 'programs' | 'findings' | 'comments' | 'people';

/** What every part of the bench may count on. */
export interface Bench {
  readonly project: Project;
  readonly editor: Editor;
  readonly fonts: FontBook;
  /** A reviewer looks and comments; nothing they do changes the document. */
  readonly readOnly: boolean;
  readonly planning: Planning;
  readonly panel: PanelName | null;
  readonly openPanel: (panel: PanelName | null) => void;
  /** Says in one line why something was not done. */
  readonly say: (sentence: string) => void;
}

const BenchContext = createContext<Bench | null>(null);
export const BenchProvider = BenchContext.Provider;

export function useBench(): Bench {
  const bench = useContext(BenchContext);
  if (!bench) throw new Error('useBench needs a bench around it');
  return bench;
}

/** A part of the editor's state; the component follows it. */
export function useEditorState<T>(select: (state: EditorState) => T): T {
  return useStore(useBench().editor.store, select);
}
