import type { GasId, Incipient, ThermoModel } from '../../thermo/index.ts';

/** What forms first out of a gas that does not stay one. */
export interface Forming {
  /** The gas that most of it is. */
  readonly gas: GasId;
  /** Ice rather than a liquid. */
  readonly ice: boolean;
}

/** The gas that a new phase mostly consists of. */
export function formingOf({ gases }: Pick<ThermoModel, 'gases'>, { composition, phase }: Incipient): Forming {
  const most = composition.reduce((best, w, i) => (w > composition[best]! ? i : best), 0);
  return { gas: gases[most]!, ice: phase === 'ice' };
}
