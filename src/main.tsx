import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { demoRecipes, loadAllGases, planRecipe } from './blending/index.ts';
import type { ProofRunner } from './blending/index.ts';
import { createWorkspace, localRecipeStorage } from './state/index.ts';
import { App, printedNow, WorkspaceProvider } from './ui/index.ts';

/* Composition root: the only file that knows every layer. */

const program = `Fillwright ${__PROGRAM_VERSION__}`;

/** A browser may refuse storage altogether, and does so by throwing at the first touch. */
function openStorage(): Storage | null {
  try {
    return window.localStorage;
  } catch (error) {
    if (error instanceof DOMException) return null;
    throw error;
  }
}

const workspace = createWorkspace({
  planner: (recipe) => planRecipe(recipe),
  storage: localRecipeStorage(openStorage, window),
  clock: () => Date.now(),
  newId: () => Array.from(crypto.getRandomValues(new Uint8Array(8)), (byte) => byte.toString(16).padStart(2, '0')).join(''),
  schedule: (delay, run) => {
    const timer = window.setTimeout(run, delay);
    return () => { window.clearTimeout(timer); };
  },
  program,
  starters: demoRecipes,
});

/* The equations outside GERG-2008 come after the page; until then a recipe that needs one says so. */
void loadAllGases().then(() => { workspace.actions.replan(); });

window.addEventListener('pagehide', () => { workspace.actions.flush(); });
window.addEventListener('afterprint', () => { if (printedNow() === 'sheet') workspace.actions.markIssued(); });

/** The thread for the proof, fetched when somebody starts one. */
const prover: ProofRunner = {
  start: (report) => {
    let stopped = false;
    let stop = () => { stopped = true; };
    import('./worker/index.ts').then(
      ({ proofRunner }) => { if (!stopped) stop = proofRunner().start(report); },
      (error: unknown) => { report({ kind: 'failed', message: error instanceof Error ? error.message : String(error) }); },
    );
    return () => { stop(); };
  },
};

const root = document.getElementById('root');
if (root === null) throw new Error('index.html has no element with the id "root".');
createRoot(root).render(
  <StrictMode>
    <WorkspaceProvider workspace={workspace}>
      <App program={program} prover={prover} />
    </WorkspaceProvider>
  </StrictMode>,
);
