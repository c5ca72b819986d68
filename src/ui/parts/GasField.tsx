import { useEffect, useRef, useState } from 'react';
import type { KeyboardEvent } from 'react';
import { gasFromText, gasText, searchGases } from '../../blending/index.ts';
import type { GasMatch } from '../../blending/index.ts';
import { fieldId } from '../bindings/problems.tsx';
import { FieldFrame } from './Field.tsx';

interface GasFieldProps {
  readonly field: string;
  /** Read by screen readers; the eye has the table's heading. */
  readonly label: string;
  readonly value: string;
  readonly placeholder?: string;
  readonly onChange: (value: string) => void;
}

/**
 * A field for a gas with suggestions (combobox of ARIA 1.2). What is typed stays as it
 * is typed; only a suggestion that is chosen replaces it. A text that names a gas
 * needs no suggestions, so the list stays away then until it is asked for.
 */
export function GasField({ field, label, value, placeholder, onChange }: GasFieldProps) {
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(-1);
  const listId = `${fieldId(field)}-gases`;
  const matches = open ? matchesOf(value) : [];
  const shown = matches.length > 0;
  const close = () => { setOpen(false); setActive(-1); };
  const type = (text: string) => {
    onChange(text);
    setOpen(text.trim() !== '' && gasFromText(text) === null);
    setActive(-1);
  };
  const choose = ({ gas }: GasMatch) => { onChange(gasText(gas)); close(); };
  const move = (to: number) => {
    if (!shown) setOpen(true);
    setActive(shown ? (to + matches.length) % matches.length : 0);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const chosen = matches[active];
    if (event.key === 'ArrowDown') move(active + 1);
    else if (event.key === 'ArrowUp' && shown) move(active < 0 ? matches.length - 1 : active - 1);
    else if (event.key === 'Enter' && chosen !== undefined) choose(chosen);
    // A dialog around the field stays open.
    else if (event.key === 'Escape' && shown) close();
    else return;
    event.preventDefault();
    event.stopPropagation();
  };
  return (
    <FieldFrame field={field} label={label} bare>
      {(aria) => (
        <span className="gas-field">
          <input
            {...aria}
            className="input" type="text" role="combobox" aria-autocomplete="list" aria-haspopup="listbox"
            aria-expanded={shown} aria-controls={shown ? listId : undefined}
            aria-activedescendant={matches[active] === undefined ? undefined : optionId(listId, active)}
            autoComplete="off" spellCheck={false} value={value} placeholder={placeholder}
            onChange={(event) => { type(event.currentTarget.value); }}
            onKeyDown={onKeyDown} onBlur={close}
          />
          {shown && <Suggestions id={listId} matches={matches} active={active} onChoose={choose} />}
        </span>
      )}
    </FieldFrame>
  );
}

/** Every gas when the text is one already: who opens the list then looks for another. */
function matchesOf(text: string): readonly GasMatch[] {
  return searchGases(gasFromText(text) === null ? text : '');
}

function optionId(listId: string, index: number): string {
  return `${listId}-${String(index)}`;
}

interface SuggestionsProps {
  readonly id: string;
  readonly matches: readonly GasMatch[];
  readonly active: number;
  readonly onChoose: (match: GasMatch) => void;
}

function Suggestions({ id, matches, active, onChoose }: SuggestionsProps) {
  const list = useRef<HTMLUListElement>(null);
  useEffect(() => { list.current?.children[active]?.scrollIntoView({ block: 'nearest' }); }, [active]);
  return (
    <ul ref={list} id={id} role="listbox" aria-label="gases" className="gas-suggestions">
      {matches.map((match, index) => (
        <li
          key={match.gas.id} id={optionId(id, index)} role="option" aria-selected={index === active}
          // The press must not take the focus out of the field, which would close the list first.
          onPointerDown={(event) => { event.preventDefault(); }}
          onClick={() => { onChoose(match); }}
        >
          <span>{match.gas.formula}</span> <small>{match.gas.name}{isOther(match) && `, ${match.matched}`}</small>
        </li>
      ))}
    </ul>
  );
}

/** Whether what fits is neither the name nor the formula, so that it must be said. */
function isOther({ gas, matched }: GasMatch): boolean {
  return ![gas.name.toLowerCase(), gas.formula.toLowerCase(), gas.id].includes(matched.toLowerCase());
}
