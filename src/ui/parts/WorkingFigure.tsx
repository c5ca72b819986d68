import { useState } from 'react';
import type { ReactNode } from 'react';
import { loadWorkings } from '../../blending/index.ts';
import type { Working, Workings } from '../../blending/index.ts';
import { Dialog } from './Dialog.tsx';

/** A number that opens its working: formula, values, source. The working is made only when asked for. */
export function WorkingFigure(props: { readonly explain: (workings: Workings) => Working; readonly children: ReactNode; readonly className?: string }) {
  const [working, setWorking] = useState<Working | null>(null);
  return (
    <>
      <button
        type="button"
        className={`figure ${props.className ?? ''}`}
        title="Show the working"
        onClick={() => { void loadWorkings().then((workings) => { setWorking(props.explain(workings)); }); }}
      >
        {props.children}
      </button>
      {working !== null && (
        <Dialog title={working.title} onClose={() => { setWorking(null); }}>
          <p className="formula">{working.formula}</p>
          <table className="rows">
            <tbody>
              {working.lines.map((line) => (
                <tr key={line.symbol}>
                  <th scope="row">{line.symbol}</th>
                  <td>{line.meaning}</td>
                  <td className="number">{line.value}</td>
                </tr>
              ))}
            </tbody>
          </table>
          <p className="result">{working.result}</p>
          <p className="source">{working.source}</p>
        </Dialog>
      )}
    </>
  );
}
