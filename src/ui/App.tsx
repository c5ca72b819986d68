import { useState } from 'react';
import { useWorkspaceState } from './bindings/workspace.tsx';
import { ProblemsProvider } from './bindings/problems.tsx';
import { GasNames } from './parts/GasNames.tsx';
import { Header } from './Header.tsx';
import type { View } from './Header.tsx';
import { NoticeBar } from './NoticeBar.tsx';
import { OfflineNotice } from './offline/OfflineNotice.tsx';
import { ChecksPanel } from './tasks/checks/ChecksPanel.tsx';
import { CylinderSection } from './tasks/cylinder/CylinderSection.tsx';
import { FinishedView } from './tasks/finished/FinishedView.tsx';
import { InstrumentsSection } from './tasks/instruments/InstrumentsSection.tsx';
import { MixingView } from './tasks/mixing/MixingView.tsx';
import { FillSection } from './tasks/order/FillSection.tsx';
import { OrderSection } from './tasks/order/OrderSection.tsx';
import { ParentsSection } from './tasks/parents/ParentsSection.tsx';
import { PlanView } from './tasks/plan/PlanView.tsx';
import { RecipesView } from './tasks/recipes/RecipesView.tsx';
import { FillSheet } from './tasks/sheet/FillSheet.tsx';
import { useUndoKeys } from './undo-keys.ts';

/** The workspace: slip at the left, the view in the middle, checks at the right. */
export function App({ program }: { readonly program: string }) {
  const [view, setView] = useState<View>('plan');
  const answer = useWorkspaceState((state) => state.answer);
  const openId = useWorkspaceState((state) => state.openId);
  useUndoKeys();
  return (
    <ProblemsProvider answer={answer}>
      <GasNames />
      <div className="screen">
        <Header view={view} onView={setView} />
        <OfflineNotice />
        <NoticeBar />
        <div className="workspace">
          <div className="slip" key={openId}>
            <OrderSection plan={answer.ok ? answer.value : null} />
            <FillSection />
            <ParentsSection />
            <CylinderSection />
            <InstrumentsSection />
          </div>
          <main className="middle" id="main">
            {view === 'plan' && <PlanView answer={answer} />}
            {view === 'finished' && <FinishedView answer={answer} />}
            {view === 'mixing' && <MixingView answer={answer} />}
            {view === 'recipes' && <RecipesView onOpened={() => { setView('plan'); }} />}
          </main>
          <aside className="checks" aria-label="Checks"><ChecksPanel answer={answer} /></aside>
        </div>
      </div>
      <FillSheet program={program} />
    </ProblemsProvider>
  );
}
