import type { ReactNode } from 'react';
import type { CompositionLine } from '../../blending/index.ts';
import { TextField } from './Field.tsx';
import { GasField } from './GasField.tsx';
import { SectionProblem } from './SectionProblem.tsx';

interface CompositionEditorProps<Line extends CompositionLine> {
  /** Path of the list in the recipe. */
  readonly path: string;
  readonly legend: string;
  readonly lines: readonly Line[];
  /** A line of nothing, to add. */
  readonly blank: Line;
  readonly onChange: (lines: readonly Line[]) => void;
  /** Fields of a line beyond gas and amount. */
  readonly more?: (line: Line, which: string, field: string, edit: (patch: Partial<Line>) => void) => ReactNode;
}

/** A short table of gas and amount, for residuals and purity tables. */
export function CompositionEditor<Line extends CompositionLine>({ path, legend, lines, blank, onChange, more }: CompositionEditorProps<Line>) {
  const edit = (index: number, patch: Partial<Line>) => {
    onChange(lines.map((line, place) => (place === index ? { ...line, ...patch } : line)));
  };
  return (
    <fieldset className="composition">
      <legend>{legend}</legend>
      {lines.map((line, index) => {
        const field = `${path}.${String(index)}`;
        const which = `line ${String(index + 1)} of ${legend}`;
        return (
          <div className={more === undefined ? 'composition-line' : 'composition-line purity-line'} key={index}>
            <GasField field={`${field}.gas`} label={`gas, ${which}`} value={line.gas} placeholder="gas" onChange={(gas) => { edit(index, { gas } as Partial<Line>); }} />
            <TextField bare field={`${field}.amount`} label={`amount, ${which}`} value={line.amount} placeholder="amount" onChange={(amount) => { edit(index, { amount } as Partial<Line>); }} />
            {more?.(line, which, field, (patch) => { edit(index, patch); })}
            <button type="button" className="plain remove" aria-label={`Remove ${which}`} onClick={() => { onChange(lines.filter((_, place) => place !== index)); }}>×</button>
          </div>
        );
      })}
      <SectionProblem field={path} />
      <button
        type="button" className="plain"
        onClick={() => { onChange([...lines, { ...blank, amount: lines.length === 0 ? 'balance' : '' }]); }}
      >
        Add a line
      </button>
    </fieldset>
  );
}
