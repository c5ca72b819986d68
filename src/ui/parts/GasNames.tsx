import { knownGases } from '../../blending/index.ts';

/** Suggestions for every field that takes a gas: formula, with the name beside it. */
export function GasNames() {
  return (
    <datalist id="gases">
      {knownGases().map(({ id, name, formula }) => <option key={id} value={formula}>{name}</option>)}
    </datalist>
  );
}
