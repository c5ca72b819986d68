import { useState } from 'react';
import { searchGases } from '../../../blending/index.ts';
import type { GasId } from '../../../blending/index.ts';
import { GasDetail } from './GasDetail.tsx';

/** The catalogue: every gas the program can compute, found by whatever it is called. */
export default function GasesView() {
  const [text, setText] = useState('');
  const [chosen, setChosen] = useState<GasId | null>(null);
  const matches = searchGases(text);
  // While one types, the best match is shown; a press on another keeps it as long as it still fits.
  const shown = matches.find(({ gas }) => gas.id === chosen) ?? matches[0];
  return (
    <section aria-labelledby="gases-title">
      <h2 id="gases-title">Gases</h2>
      <div className="gases">
        <div className="gas-list">
          <label htmlFor="gas-search" className="visually-hidden">Search the gases</label>
          <input
            id="gas-search" className="input search" type="search" autoComplete="off" spellCheck={false} value={text}
            placeholder="name, formula, CAS number" onChange={(event) => { setText(event.currentTarget.value); setChosen(null); }}
          />
          <p className="hint" role="status">{matches.length === 1 ? '1 gas' : `${String(matches.length)} gases`}</p>
          <ul aria-label="gases found">
            {matches.map(({ gas }) => (
              <li key={gas.id}>
                <button type="button" className="gas-choice" aria-pressed={gas.id === shown?.gas.id} onClick={() => { setChosen(gas.id); }}>
                  <span>{gas.formula}</span> <small>{gas.name}</small>
                </button>
              </li>
            ))}
          </ul>
          {matches.length === 0 && <p className="hint">No gas of this program is called so. A gas without an equation here cannot be planned.</p>}
        </div>
        {shown !== undefined && <GasDetail key={shown.gas.id} gas={shown.gas} />}
      </div>
    </section>
  );
}
