import { createContext, useContext } from 'react';
import type { ReactNode } from 'react';
import { useStore } from 'zustand';
import type { PlanAnswer } from '../../blending/index.ts';
import type { Workspace, WorkspaceActions, WorkspaceState } from '../../state/index.ts';

export type AppWorkspace = Workspace<PlanAnswer>;
export type AppState = WorkspaceState<PlanAnswer>;

const WorkspaceContext = createContext<AppWorkspace | null>(null);

/** Hands the workspace to every view below. */
export function WorkspaceProvider({ workspace, children }: { readonly workspace: AppWorkspace; readonly children: ReactNode }) {
  return <WorkspaceContext value={workspace}>{children}</WorkspaceContext>;
}

function useWorkspace(): AppWorkspace {
  const workspace = useContext(WorkspaceContext);
  if (workspace === null) throw new Error('A view was drawn outside the WorkspaceProvider.');
  return workspace;
}

/** Reads a part of the state; the selector must answer a stored part, not a fresh object. */
export function useWorkspaceState<Part>(selector: (state: AppState) => Part): Part {
  return useStore(useWorkspace().store, selector);
}

/** What a view may do. */
export function useActions(): WorkspaceActions {
  return useWorkspace().actions;
}
