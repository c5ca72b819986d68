import { createContext, useContext, useEffect, useState } from 'react';
import type { ReactNode } from 'react';
import type { Calculated, CalculationName, Calculations, Calculator } from '../../blending/index.ts';

const CalculatorContext = createContext<Calculator | null>(null);

/** Hands the calculator to every view below. */
export function CalculatorProvider({ calculator, children }: { readonly calculator: Calculator; readonly children: ReactNode }) {
  return <CalculatorContext value={calculator}>{children}</CalculatorContext>;
}

/** A calculation as a view sees it; `of`: the input that `result` answers. */
export interface Calculation<Name extends CalculationName> {
  /** null: none has come yet. */
  readonly result: Calculated<Name> | null;
  /** Whether `result` is of the input asked for, and not of one before. */
  readonly current: boolean;
}

/** Asks again whenever the input is another object. The last answer stays until the next one comes. */
export function useCalculation<Name extends CalculationName>(name: Name, input: Calculations[Name]['input']): Calculation<Name> {
  const calculator = useContext(CalculatorContext);
  if (calculator === null) throw new Error('A view was drawn outside the CalculatorProvider.');
  const [told, setTold] = useState<{ readonly of: unknown; readonly result: Calculated<Name> } | null>(null);
  useEffect(() => calculator.ask(name, input, (result) => { setTold({ of: input, result }); }), [calculator, name, input]);
  return { result: told?.result ?? null, current: told?.of === input };
}
