import { useEffect, useReducer, useRef } from 'react';
import type { ProofGroupHead, ProofResult, ProofRunner, ProofUpdate } from '../../../blending/index.ts';

/** Where a run of the proof stands. Times are of this machine's clock. */
export interface ProofRunState {
  readonly phase: 'idle' | 'running' | 'finished' | 'stopped' | 'failed';
  readonly startedAt: Date | null;
  readonly endedAt: Date | null;
  readonly total: number;
  readonly digest: string;
  readonly groups: readonly ProofGroupHead[];
  readonly results: readonly ProofResult[];
  /** Why it failed; empty otherwise. */
  readonly message: string;
}

export interface ProofRun {
  readonly state: ProofRunState;
  start(): void;
  stop(): void;
}

const IDLE: ProofRunState = { phase: 'idle', startedAt: null, endedAt: null, total: 0, digest: '', groups: [], results: [], message: '' };

type Action = ProofUpdate | { readonly kind: 'begin' } | { readonly kind: 'stop' };

function next(state: ProofRunState, { action, at }: { readonly action: Action; readonly at: Date }): ProofRunState {
  switch (action.kind) {
    case 'begin':
      return { ...IDLE, phase: 'running', startedAt: at };
    case 'started':
      return { ...state, total: action.total, digest: action.digest, groups: action.groups };
    case 'results':
      return { ...state, results: [...state.results, ...action.results] };
    case 'finished':
      return { ...state, phase: 'finished', endedAt: at };
    case 'failed':
      return { ...state, phase: 'failed', endedAt: at, message: action.message };
    case 'stop':
      return { ...state, phase: 'stopped', endedAt: at };
  }
}

/** One run at a time; it goes on while another view is open, and ends with the page. */
export function useProofRun(runner: ProofRunner): ProofRun {
  const [state, dispatch] = useReducer(next, IDLE);
  const stopper = useRef<(() => void) | null>(null);
  const tell = (action: Action) => { dispatch({ action, at: new Date() }); };
  useEffect(() => () => { stopper.current?.(); }, []);
  return {
    state,
    start: () => {
      stopper.current?.();
      tell({ kind: 'begin' });
      stopper.current = runner.start(tell);
    },
    stop: () => {
      stopper.current?.();
      stopper.current = null;
      tell({ kind: 'stop' });
    },
  };
}
