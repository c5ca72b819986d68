import type { PlanAnswer } from '../../../blending/index.ts';
import { ConditioningSection } from './ConditioningSection.tsx';
import { OrderOfAddition } from './OrderOfAddition.tsx';
import { SupplySection } from './SupplySection.tsx';
import { TriangleSection } from './TriangleSection.tsx';

/** How the fill is gone about: order of addition, path through the flammable limits, conditioning, supply. */
export default function RouteView({ answer }: { readonly answer: PlanAnswer }) {
  return (
    <>
      {answer.ok
        ? <OrderOfAddition plan={answer.value} />
        : <section><h2>Order of addition</h2><p className="hint">There is no plan to order yet; what stands in its way is listed under Plan.</p></section>}
      {answer.ok && <TriangleSection plan={answer.value} />}
      <ConditioningSection answer={answer} />
      <SupplySection plan={answer.ok ? answer.value : null} />
    </>
  );
}
