import type { Pascal } from '../../units/index.ts';
import type { CondensableParent } from '../phase/liquefied.ts';

/**
 * What a parent has to stand above to fill up to a stop; pressures absolute. A booster draws
 * from its inlet pressure on, but it carries no gas past its vapour pressure: there it would
 * condense on the way. `inlet` null: there is no booster.
 */
export function neededPressure(condensable: CondensableParent | null, stop: Pascal, inlet: Pascal | null): Pascal {
  const carries = inlet !== null && inlet < stop && !(condensable !== null && stop > condensable.vapourPressure);
  return carries ? inlet : stop;
}
