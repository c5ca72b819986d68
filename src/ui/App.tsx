import { lazy, Suspense, useState } from 'react';
import type { ProofRunner } from '../blending/index.ts';
import { useWorkspaceState } from './bindings/workspace.tsx';
import { ProblemsProvider } from './bindings/problems.tsx';
import { Header } from './Header.tsx';
import type { View } from './Header.tsx';
import { NoticeBar } from './NoticeBar.tsx';
import { OfflineNotice } from './offline/OfflineNotice.tsx';
import { ChecksPanel } from './tasks/checks/ChecksPanel.tsx';
import { CylinderSection } from './tasks/cylinder/CylinderSection.tsx';
import { InstrumentsSection } from './tasks/instruments/InstrumentsSection.tsx';
import { FillSection } from './tasks/order/FillSection.tsx';
import { OrderSection } from './tasks/order/OrderSection.tsx';
import { ParentsSection } from './tasks/parents/ParentsSection.tsx';
import { PlanView } from './tasks/plan/PlanView.tsx';
import { useProofRun } from './tasks/proof/use-proof-run.ts';
import { ErrorBoundary } from './parts/ErrorBoundary.tsx';
import { useUndoKeys } from './undo-keys.ts';

// Nobody needs these for the first plan.
const FinishedView = lazy(async () => ({ default: (await import('./tasks/finished/FinishedView.tsx')).FinishedView }));
const MixingView = lazy(async () => ({ default: (await import('./tasks/mixing/MixingView.tsx')).MixingView }));
const RecipesView = lazy(async () => ({ default: (await import('./tasks/recipes/RecipesView.tsx')).RecipesView }));
const RouteView = lazy(() => import('./tasks/route/RouteView.tsx'));
const StockView = lazy(() => import('./tasks/stock/StockView.tsx'));
const ValuesView = lazy(() => import('./tasks/values/ValuesView.tsx'));
const GasesView = lazy(() => import('./tasks/gases/GasesView.tsx'));
const ProofView = lazy(() => import('./tasks/proof/ProofView.tsx'));
// The sheet is fetched right after the first plan, long before anybody can print it.
const FillSheet = lazy(async () => ({ default: (await import('./tasks/sheet/FillSheet.tsx')).FillSheet }));
const ProofReport = lazy(() => import('./tasks/proof/ProofReport.tsx'));

/** The workspace: slip at the left, the view in the middle, checks at the right. */
export function App({ program, prover }: { readonly program: string; readonly prover: ProofRunner }) {
  const [view, setView] = useState<View>('plan');
  const answer = useWorkspaceState((state) => state.answer);
  const openId = useWorkspaceState((state) => state.openId);
  const proof = useProofRun(prover);
  // Their tables need the room of the checks, which are of the plan.
  const isWide = view === 'stock' || view === 'values';
  useUndoKeys();
  return (
    <ProblemsProvider answer={answer}>
      <div className="screen">
        <Header view={view} onView={setView} />
        <OfflineNotice />
        <NoticeBar />
        <div className={view === 'plan' ? 'workspace' : isWide ? 'workspace beside wide' : 'workspace beside'}>
          <div className="slip" key={openId}>
            <OrderSection plan={answer.ok ? answer.value : null} />
            <FillSection />
            <ParentsSection />
            <CylinderSection />
            <InstrumentsSection />
          </div>
          <main className="middle" id="main">
            {view === 'plan' && <PlanView answer={answer} onView={setView} />}
            <ErrorBoundary key={view}>
              <Suspense fallback={null}>
                {view === 'route' && <RouteView answer={answer} />}
                {view === 'finished' && <FinishedView answer={answer} />}
                {view === 'mixing' && <MixingView answer={answer} />}
                {view === 'recipes' && <RecipesView onOpened={() => { setView('plan'); }} />}
                {view === 'stock' && <StockView onTaken={() => { setView('plan'); }} />}
                {view === 'gases' && <GasesView />}
                {view === 'values' && <ValuesView />}
                {view === 'proof' && <ProofView proof={proof} />}
              </Suspense>
            </ErrorBoundary>
          </main>
          {!isWide && <aside className="checks" aria-label="Checks"><ChecksPanel answer={answer} /></aside>}
        </div>
      </div>
      <Suspense fallback={null}><FillSheet program={program} /></Suspense>
      {view === 'proof' && <Suspense fallback={null}><ProofReport state={proof.state} program={program} /></Suspense>}
    </ProblemsProvider>
  );
}
