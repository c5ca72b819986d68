import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { demoRecipes, loadRest, loadStockTools, planRecipe } from './blending/index.ts';
import type { Arrangement, Calculator, ProofRunner, Recipe } from './blending/index.ts';
import { createWorkspace, loadStockroom, localRecipeStorage } from './state/index.ts';
import { App, CalculatorProvider, printedNow, StockroomProvider, WorkspaceProvider } from './ui/index.ts';

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

const storage = localRecipeStorage(openStorage, window);
const clock = () => Date.now();

function schedule(delay: number, run: () => void): () => void {
  const timer = window.setTimeout(run, delay);
  return () => { window.clearTimeout(timer); };
}

/** Orders of addition that the worker found, by all that they depend on. */
const bestOrders = new Map<string, Arrangement>();
/** More than anybody goes back and forth between; the oldest are forgotten together. */
const MOST_ORDERS = 50;

/** Everything of a recipe that an order can depend on; who renames it need not wait for another search. */
function orderKey(recipe: Recipe): string {
  return JSON.stringify({ ...recipe, name: '', note: '', overrides: [] });
}

const workspace = createWorkspace({
  planner: (recipe) => planRecipe(recipe, { arrangement: recipe.route.sequence === 'best' ? bestOrders.get(orderKey(recipe)) : undefined }),
  storage,
  clock,
  newId: () => Array.from(crypto.getRandomValues(new Uint8Array(8)), (byte) => byte.toString(16).padStart(2, '0')).join(''),
  schedule,
  program,
  starters: demoRecipes,
});

/* What the first plan can do without comes after the page; until then a plan says what it was made without. */
void loadRest().then(() => { workspace.actions.replan(); });

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

let asker: Promise<Calculator> | undefined;

/** The thread for longer calculations, fetched with the first of them. */
const calculator: Calculator = {
  ask: (name, input, report) => {
    let forget = () => { forgotten = true; };
    let forgotten = false;
    asker ??= import('./worker/index.ts').then((worker) => worker.calculator());
    asker.catch(() => { asker = undefined; });
    asker.then(
      (worker) => { if (!forgotten) forget = worker.ask(name, input, report); },
      (error: unknown) => { if (!forgotten) report({ kind: 'failed', message: error instanceof Error ? error.message : String(error) }); },
    );
    return () => { forget(); };
  },
};

let searched: string | undefined;

/* A recipe with too many parents to search while one types: its best order comes from the worker. */
workspace.store.subscribe(({ recipe, answer }) => {
  if (!answer.ok || answer.value.sequence !== 'not searched yet') return;
  const key = orderKey(recipe);
  if (searched === key) return;
  searched = key;
  calculator.ask('study', recipe, (result) => {
    if (result.kind !== 'answer' || !result.answer.ok) return;
    if (bestOrders.size >= MOST_ORDERS) bestOrders.clear();
    bestOrders.set(key, result.answer.value.study.chosen.arrangement);
    if (orderKey(workspace.store.getState().recipe) === key) workspace.actions.replan();
  });
});

/** The stock, opened when somebody first looks at it. */
async function makeStock() {
  const [commands, tools] = await Promise.all([loadStockroom(), loadStockTools()]);
  const room = await commands.openStockroom({ storage, clock, schedule, program, starter: tools.demoStock });
  window.addEventListener('pagehide', () => { room.actions.flush(); });
  return { room, commands, tools };
}
let stock: ReturnType<typeof makeStock> | undefined;
const openStock = () => (stock ??= makeStock().catch((error: unknown) => {
  // A part that could not be fetched may come the next time.
  stock = undefined;
  throw error;
}));

const root = document.getElementById('root');
if (root === null) throw new Error('index.html has no element with the id "root".');
createRoot(root).render(
  <StrictMode>
    <WorkspaceProvider workspace={workspace}>
      <CalculatorProvider calculator={calculator}>
        <StockroomProvider open={openStock}>
          <App program={program} prover={prover} />
        </StockroomProvider>
      </CalculatorProvider>
    </WorkspaceProvider>
  </StrictMode>,
);
