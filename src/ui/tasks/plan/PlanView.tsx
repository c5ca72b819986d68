import { lazy, memo, Suspense, useDeferredValue, useLayoutEffect, useRef, useState } from 'react';
import type { RefObject } from 'react';
import type { Plan, PlanAnswer } from '../../../blending/index.ts';
import type { View } from '../../Header.tsx';
import { ModelLine } from './ModelLine.tsx';
import { FillLadder } from './FillLadder.tsx';
import { NotPlanned } from './NotPlanned.tsx';
import { StepTable } from './StepTable.tsx';

/** Width of the column of row names, as in the style sheet. */
const ROW_NAMES = 116;
/** Six of them fit into the middle of a 1280 px window. */
const NARROWEST_COLUMN = 84;
const WIDEST_COLUMN = 210;

const Ladder = memo(FillLadder);
// Below the figures, and drawn when there is time.
const Curve = memo(lazy(async () => ({ default: (await import('./FillCurve.tsx')).FillCurve })));

/** The plan in picture and numbers, or what stands in its way. */
export function PlanView({ answer, onView }: { readonly answer: PlanAnswer; readonly onView: (view: View) => void }) {
  return answer.ok ? <Planned plan={answer.value} /> : <NotPlanned problems={answer.reason.problems} onView={onView} />;
}

function Planned({ plan }: { readonly plan: Plan }) {
  const frame = useRef<HTMLDivElement>(null);
  const width = useWidth(frame);
  // Drawing takes longer than planning: the figures follow each key at once, the pictures when there is time.
  const drawn = useDeferredValue(plan);
  const hasStart = plan.job.cylinder.contents.state === 'residual';
  const columns = plan.steps.length + (hasStart ? 1 : 0);
  const columnWidth = Math.min(WIDEST_COLUMN, Math.max(NARROWEST_COLUMN, Math.floor((width - ROW_NAMES) / columns)));
  return (
    <section aria-labelledby="ladder-title">
      <h2 id="ladder-title">Fill ladder</h2>
      <div ref={frame} className="ladder" tabIndex={0} role="group" aria-labelledby="ladder-title">
        <Ladder plan={drawn} columnWidth={columnWidth} hasStart={hasStart} />
        <StepTable plan={plan} columnWidth={columnWidth} hasStart={hasStart} />
      </div>
      <ModelLine plan={plan} />
      <Suspense fallback={null}><Curve plan={drawn} /></Suspense>
    </section>
  );
}

/** Inner width of an element, followed as the window changes. */
function useWidth(element: RefObject<HTMLElement | null>): number {
  const [width, setWidth] = useState(640);
  useLayoutEffect(() => {
    const target = element.current;
    if (target === null) return undefined;
    const observer = new ResizeObserver(() => { setWidth(target.clientWidth); });
    observer.observe(target);
    return () => { observer.disconnect(); };
  }, [element]);
  return width;
}
