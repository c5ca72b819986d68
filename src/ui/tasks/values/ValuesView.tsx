import { useEffect, useState } from 'react';
import { loadPublishedValues } from '../../../blending/index.ts';
import type { LaboratoryValue, ListedValue } from '../../../blending/index.ts';
import { putBackValue, setLaboratoryValue, takeValues } from '../../../state/index.ts';
import { useStock, useStockroom } from '../../bindings/stockroom.tsx';
import { useActions, useWorkspaceState } from '../../bindings/workspace.tsx';
import { foundValues } from './found.ts';
import { ValueTable } from './ValueTable.tsx';
import type { OwnValues } from './ValueTable.tsx';

/** Every coefficient, limit and threshold behind a check, and the laboratory's own in the open recipe. */
export default function ValuesView() {
  const own = useWorkspaceState((state) => state.recipe.values);
  const kept = useStock((state) => state.stock.values);
  const { room, commands } = useStockroom();
  const actions = useActions();
  const set = (value: LaboratoryValue) => {
    actions.run(setLaboratoryValue(value));
    room.actions.run(commands.setStockValue(value));
  };
  const putBack = (id: string) => {
    actions.run(putBackValue(id));
    room.actions.run(commands.putBackStockValue(id));
  };
  return (
    <section aria-labelledby="values-title">
      <h2 id="values-title">Values behind the checks</h2>
      <p>
        Each figure says where it comes from and whether that was seen. A laboratory can put its own in its place, from its copy of the standard, with
        source and date. Own values are kept with the stock and copied into the recipe, are marked in its checks and on its sheet, and can be put back.
      </p>
      {!sameValues(own, kept) && (
        <p className="problem" role="status">
          This recipe judges by {own.length} own value{own.length === 1 ? '' : 's'}, the laboratory has {kept.length}, and they are not the same.{' '}
          <button type="button" className="plain" onClick={() => { actions.run(takeValues(kept)); }}>Judge this recipe by the laboratory’s</button>
        </p>
      )}
      <ValueList own={own} onSet={set} onPutBack={putBack} />
    </section>
  );
}

/** Whether two lists replace the same published values by the same figures from the same place, in whatever order. */
function sameValues(own: readonly LaboratoryValue[], kept: readonly LaboratoryValue[]): boolean {
  return own.length === kept.length && own.every((value) => kept.some((other) => other.id === value.id && other.value === value.value && other.source === value.source && other.date === value.date));
}

type Loaded = readonly ListedValue[] | 'loading' | 'failed';

/** The list with its search; whose own values they are, the caller decides. */
export function ValueList({ own, onSet, onPutBack }: OwnValues) {
  const [list, setList] = useState<Loaded>('loading');
  const [text, setText] = useState('');
  const [onlyOwn, setOnlyOwn] = useState(false);
  useEffect(() => {
    let wanted = true;
    loadPublishedValues().then(
      (values) => { if (wanted) setList(values); },
      () => { if (wanted) setList('failed'); },
    );
    return () => { wanted = false; };
  }, []);
  if (list === 'loading') return <p className="hint" role="status">The list is being loaded.</p>;
  if (list === 'failed') return <p className="problem" role="status">The list could not be loaded. Load the page again.</p>;
  const found = foundValues(list, text, own, onlyOwn);
  return (
    <>
      <p className="choice-of">
        <label htmlFor="value-search">Search</label>
        <input
          id="value-search" className="input search" type="search" autoComplete="off" spellCheck={false} value={text}
          placeholder="gas or quantity" onChange={(event) => { setText(event.currentTarget.value); }}
        />
        <label><input type="checkbox" checked={onlyOwn} onChange={(event) => { setOnlyOwn(event.currentTarget.checked); }} /> only the laboratory’s own</label>
      </p>
      <p className="hint" role="status">{found.length} of {list.length} values; {own.length} replaced</p>
      <Unknown own={own.filter(({ id }) => list.every((value) => value.id !== id))} onPutBack={onPutBack} />
      {[...new Set(found.map(({ section }) => section))].map((section) => (
        <section key={section}>
          <h3>{section}</h3>
          <ValueTable section={section} values={found.filter((value) => value.section === section)} own={own} onSet={onSet} onPutBack={onPutBack} />
        </section>
      ))}
    </>
  );
}

/** Own values that stand for nothing that is judged with. */
function Unknown({ own, onPutBack }: { readonly own: readonly LaboratoryValue[]; readonly onPutBack: OwnValues['onPutBack'] }) {
  if (own.length === 0) return null;
  return (
    <ul>
      {own.map(({ id, value, source, date }) => (
        <li key={id} className="problem">
          No check knows “{id}” ({value}; {source}, {date}).{' '}
          <button type="button" className="plain" onClick={() => { onPutBack(id); }}>Put back</button>
        </li>
      ))}
    </ul>
  );
}
