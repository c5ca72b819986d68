import type { PlanAnswer } from '../../../blending/index.ts';
import { editRoute } from '../../../state/index.ts';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { TextField } from '../../parts/Field.tsx';
import { ConditioningSection } from './ConditioningSection.tsx';
import { OrderOfAddition } from './OrderOfAddition.tsx';
import { SupplySection } from './SupplySection.tsx';
import { TriangleSection } from './TriangleSection.tsx';

/** The share of a split addition, while what is typed for it has no plan. */
function SplitShare() {
  const split = useWorkspaceState((state) => state.recipe.route.split);
  const actions = useActions();
  if (split.parent === '') return null;
  return <TextField field="route.split.share" label="share that goes in early" value={split.share} onChange={(share) => { actions.run(editRoute({ split: { ...split, share } })); }} />;
}

/** How the fill is gone about: order of addition, path through the flammable limits, conditioning, supply. */
export default function RouteView({ answer }: { readonly answer: PlanAnswer }) {
  return (
    <>
      {answer.ok
        ? <OrderOfAddition plan={answer.value} />
        : <section><h2>Order of addition</h2><p className="hint">There is no plan to order yet; what stands in its way is listed under Plan.</p><SplitShare /></section>}
      {answer.ok && <TriangleSection plan={answer.value} />}
      <ConditioningSection answer={answer} />
      <SupplySection plan={answer.ok ? answer.value : null} />
    </>
  );
}
