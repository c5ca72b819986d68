import { proofCounts } from '../../../blending/index.ts';
import type { ProofRunState } from './use-proof-run.ts';

/** How many cases of each group are within, and why the tolerances are what they are. */
export function GroupCounts({ state: { groups, results } }: { readonly state: ProofRunState }) {
  return (
    <table className="rows proof-counts">
      <thead>
        <tr><th scope="col">group</th><th scope="col" className="number">cases</th><th scope="col" className="number">within</th><th scope="col" className="number">outside</th><th scope="col">why this tolerance</th></tr>
      </thead>
      <tbody>
        {groups.map(({ id, title, why }) => {
          const { total, within, outside } = proofCounts(results.filter(({ group }) => group === id));
          return (
            <tr key={id} className={outside > 0 ? 'outside' : undefined}>
              <th scope="row">{title}</th><td className="number">{total}</td><td className="number">{within}</td><td className="number">{outside}</td><td className="source">{why}</td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
