import { useState } from 'react';
import { gasFromText } from '../../../blending/index.ts';
import type { LaboratoryValue, ListedValue } from '../../../blending/index.ts';
import { useFieldProblem } from '../../bindings/problems.tsx';
import { OwnValueDialog } from './OwnValueDialog.tsx';
import { groupedValues, valueText } from './found.ts';

/** What a list of own values lets one do with them. */
export interface OwnValues {
  readonly own: readonly LaboratoryValue[];
  readonly onSet: (value: LaboratoryValue) => void;
  readonly onPutBack: (id: string) => void;
}

/** Published values of one section under their quantities, with the laboratory's own beside them. */
export function ValueTable({ section, values, ...owned }: OwnValues & { readonly section: string; readonly values: readonly ListedValue[] }) {
  return (
    <div className="scroll" tabIndex={0} role="group" aria-label={section}>
      <table className="rows">
        <thead>
          <tr>
            <th scope="col">quantity, gas</th><th scope="col" className="number">published</th><th scope="col">source</th><th scope="col">trust</th>
            <th scope="col">laboratory’s own</th><th scope="col"><span className="visually-hidden">change</span></th>
          </tr>
        </thead>
        {groupedValues(values).map(({ quantity, values: group }) => (
          <tbody key={quantity}>
            {group[0]?.gas === null
              ? group.map((value) => <ValueRow key={value.id} value={value} name={quantity} {...owned} />)
              : (
                <>
                  <tr><th scope="rowgroup" colSpan={6}>{quantity}</th></tr>
                  {group.map((value) => <ValueRow key={value.id} value={value} name={gasName(value.gas)} {...owned} />)}
                </>
              )}
          </tbody>
        ))}
      </table>
    </div>
  );
}

function gasName(gas: string | null): string {
  const known = gas === null ? null : gasFromText(gas);
  return known === null ? gas ?? '' : `${known.formula} ${known.name}`;
}

function ValueRow({ value, name, own, onSet, onPutBack }: OwnValues & { readonly value: ListedValue; readonly name: string }) {
  const [asking, setAsking] = useState(false);
  const mine = own.find(({ id }) => id === value.id);
  return (
    <tr>
      <th scope="row">{name}</th>
      <td className="number">{value.value === null ? 'none found' : valueText(shortened(value.value), value.unit)}</td>
      <td>{value.source}</td>
      <td className={value.trust === 'seen' ? undefined : 'unsure'}>{value.trust}</td>
      <td>{mine !== undefined && <OwnFigure own={mine} unit={value.unit} />}</td>
      <td>
        <button type="button" className="plain" aria-label={`${mine === undefined ? 'Replace' : 'Change'} ${value.quantity} ${value.gas ?? ''}`} onClick={() => { setAsking(true); }}>
          {mine === undefined ? 'Replace…' : 'Change…'}
        </button>{' '}
        {mine !== undefined && (
          <button type="button" className="plain" aria-label={`Put back ${value.quantity} ${value.gas ?? ''}`} onClick={() => { onPutBack(value.id); }}>Put back</button>
        )}
        {asking && <OwnValueDialog published={value} own={mine} onSet={onSet} onClose={() => { setAsking(false); }} />}
      </td>
    </tr>
  );
}

/** The figure in use, marked by word, with what is wrong with it in a recipe that came from elsewhere. */
function OwnFigure({ own, unit }: { readonly own: LaboratoryValue; readonly unit: string }) {
  const value = useFieldProblem(`values.${own.id}.value`);
  const source = useFieldProblem(`values.${own.id}.source`);
  const date = useFieldProblem(`values.${own.id}.date`);
  const problem = value ?? source ?? date;
  return (
    <>
      <strong>own value {valueText(own.value, unit)}</strong>
      <span className="source"> {own.source}, {own.date}</span>
      {problem !== null && <span className="problem"> {problem.sentence}</span>}
    </>
  );
}

/** 2/3 is shown as 0.6667; what was published with fewer digits stays as it is. */
function shortened(value: number): number {
  return Number(value.toPrecision(4));
}
