import { useId } from 'react';

interface ChoiceOfProps {
  readonly label: string;
  readonly value: string;
  readonly choices: readonly { readonly value: string; readonly text: string }[];
  readonly onChange: (value: string) => void;
}

/** A choice that belongs to the view, not to the recipe. */
export function ChoiceOf({ label, value, choices, onChange }: ChoiceOfProps) {
  const id = useId();
  return (
    <p className="choice-of">
      <label htmlFor={id}>{label}</label>
      <select id={id} className="input" value={value} onChange={(event) => { onChange(event.currentTarget.value); }}>
        {choices.map((choice) => <option key={choice.value} value={choice.value}>{choice.text}</option>)}
      </select>
    </p>
  );
}
