import type { ProofGroupHead, ProofResult } from '../../../blending/index.ts';
import { computedText, differenceText, publishedText, sharedText, sourceText, toleranceText } from './figures.ts';

/** The cases of each group under its name; the same on screen and on paper. */
export function ProofGroups({ groups, results }: { readonly groups: readonly ProofGroupHead[]; readonly results: readonly ProofResult[] }) {
  return groups.map(({ id, title }) => {
    const own = results.filter(({ group }) => group === id);
    return own.length === 0 ? null : <section key={id}><h3>{title}</h3><ProofTable results={own} /></section>;
  });
}

/** Published, computed, difference, tolerance and verdict. What all cases share is said once, above them. */
function ProofTable({ results }: { readonly results: readonly ProofResult[] }) {
  const source = sharedText(results, sourceText);
  const unit = sharedText(results, (result) => result.unit);
  const inUnit = unit === null || unit === '' ? '' : `, ${unit}`;
  return (
    <>
      {source !== null && <p className="source">{source}</p>}
      <table className="rows proof-table">
        <thead>
          <tr>
            <th scope="col">case</th>
            <th scope="col" className="number">published{inUnit}</th>
            <th scope="col" className="number">computed{inUnit}</th>
            <th scope="col" className="number">difference, tolerance</th>
            <th scope="col">verdict</th>
          </tr>
        </thead>
        <tbody>{results.map((result) => <ProofRow key={result.id} result={result} withSource={source === null} withUnit={unit === null} />)}</tbody>
      </table>
    </>
  );
}

interface ProofRowProps {
  readonly result: ProofResult;
  readonly withSource: boolean;
  readonly withUnit: boolean;
}

function ProofRow({ result, withSource, withUnit }: ProofRowProps) {
  return (
    <tr className={result.within ? undefined : 'outside'}>
      <th scope="row">
        {result.title}
        {withSource && <span className="source">{sourceText(result)}</span>}
        {result.remark !== '' && <span className="source">{result.remark}</span>}
      </th>
      <td className="number">{publishedText(result)}{withUnit && result.unit !== '' && <span className="unit">{result.unit}</span>}</td>
      <td className="number">{computedText(result)}</td>
      <td className="number">{differenceText(result)}<span className="unit">{toleranceText(result)}</span></td>
      <td className="proof-verdict">{result.within ? '● within' : '■ outside'}</td>
    </tr>
  );
}
