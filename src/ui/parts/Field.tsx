import type { ReactNode } from 'react';
import type { PressureReference, PressureText } from '../../blending/index.ts';
import { fieldId, useFieldProblem } from '../bindings/problems.tsx';

interface FieldProps {
  /** Path of the field in the recipe; its problem is looked up under it. */
  readonly field: string;
  readonly label: string;
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly placeholder?: string;
  /** Hides the label from the eye where a table heading says it already. */
  readonly bare?: boolean;
  readonly align?: 'left' | 'right';
}

/** One line of text with its label and, when it cannot be read, the sentence that says why. */
export function TextField({ field, label, value, onChange, placeholder, bare = false, align = 'left' }: FieldProps) {
  return (
    <FieldFrame field={field} label={label} bare={bare}>
      {(aria) => (
        <input
          {...aria}
          className={align === 'right' ? 'input number' : 'input'}
          type="text"
          autoComplete="off"
          spellCheck={false}
          value={value}
          placeholder={placeholder}
          onChange={(event) => { onChange(event.currentTarget.value); }}
        />
      )}
    </FieldFrame>
  );
}

interface PressureFieldProps extends Omit<FieldProps, 'value' | 'onChange'> {
  readonly value: PressureText;
  readonly onChange: (value: PressureText) => void;
}

/** A pressure with its reference beside it; a text that says `(g)` or `abs` itself overrules the choice. */
export function PressureField({ field, label, value, onChange, placeholder, bare = false }: PressureFieldProps) {
  const stated = statedReference(value.typed);
  return (
    <FieldFrame field={field} label={label} bare={bare}>
      {(aria) => (
        <span className="pressure-entry">
          <input
            {...aria}
            className="input"
            type="text"
            autoComplete="off"
            spellCheck={false}
            value={value.typed}
            placeholder={placeholder}
            onChange={(event) => { onChange({ ...value, typed: event.currentTarget.value }); }}
          />
          <select
            aria-label={`${label}: gauge or absolute`}
            className="input reference"
            value={stated ?? value.reference}
            disabled={stated !== null}
            onChange={(event) => { onChange({ ...value, reference: event.currentTarget.value as PressureReference }); }}
          >
            <option value="gauge">gauge</option>
            <option value="absolute">absolute</option>
          </select>
        </span>
      )}
    </FieldFrame>
  );
}

/** Mirrors how a pressure text names its own reference, so that the select never contradicts it. */
function statedReference(typed: string): PressureReference | null {
  const word = /(?:\(\s*(g|a|gauge|abs\.?|absolute)\s*\)|\b(gauge|abs\.?|absolute)|(?:bar|psi)\s*(g|a))\s*$/i.exec(typed.trim());
  if (word === null) return null;
  return /^g/i.test(word[1] ?? word[2] ?? word[3] ?? '') ? 'gauge' : 'absolute';
}

interface ChoiceProps<Choice extends string> {
  readonly field: string;
  readonly label: string;
  readonly value: Choice;
  readonly choices: readonly (Choice | { readonly value: Choice; readonly text: string })[];
  readonly onChange: (value: Choice) => void;
  readonly bare?: boolean;
}

/** A choice among few. */
export function ChoiceField<Choice extends string>({ field, label, value, choices, onChange, bare = false }: ChoiceProps<Choice>) {
  return (
    <FieldFrame field={field} label={label} bare={bare}>
      {(aria) => (
        <select {...aria} className="input" value={value} onChange={(event) => { onChange(event.currentTarget.value as Choice); }}>
          {choices.map((choice) => {
            const option = typeof choice === 'string' ? { value: choice, text: choice } : choice;
            return <option key={option.value} value={option.value}>{option.text}</option>;
          })}
        </select>
      )}
    </FieldFrame>
  );
}

export interface FrameAria {
  readonly id: string;
  readonly 'aria-invalid': boolean;
  readonly 'aria-describedby': string | undefined;
}

/** Label, field and problem of one field of the recipe. */
export function FieldFrame(props: {
  readonly field: string;
  readonly label: string;
  readonly bare: boolean;
  readonly children: (aria: FrameAria) => ReactNode;
}) {
  const { field, label, bare, children } = props;
  const problem = useFieldProblem(field);
  const id = fieldId(field);
  const problemId = `${id}-problem`;
  return (
    <div className={bare ? 'field bare' : 'field'}>
      <label htmlFor={id} className={bare ? 'visually-hidden' : 'label'}>{label}</label>
      {children({ id, 'aria-invalid': problem !== null && !problem.waiting, 'aria-describedby': problem === null ? undefined : problemId })}
      {problem !== null && <p id={problemId} className={problem.waiting ? 'problem waiting' : 'problem'}>{problem.sentence}</p>}
    </div>
  );
}
