/** Every table of `data/` as it was loaded, so that a digest can be taken of what the program really counts with. */
import { gasIdentity } from './data/gas-identity.ts';
import { gasIds } from './data/gases.ts';
import { helmholtzGases } from './data/helmholtz/gases.ts';
import { departures } from './data/kunz-wagner-2012/departures.ts';
import { kunzWagnerGases } from './data/kunz-wagner-2012/gases.ts';
import { idealGasParts } from './data/kunz-wagner-2012/ideal.ts';
import { pairRows } from './data/kunz-wagner-2012/pairs.ts';
import { pureEquation } from './data/kunz-wagner-2012/pure.ts';
import { pengRobinsonGases } from './data/peng-robinson/gases.ts';
import { vapourPressureRows } from './data/vapour-pressure.ts';
import { equationsBeyondGerg, loadAllGases } from './model/library.ts';

/**
 * All tables, plain data of texts, numbers, lists and records. It loads the equations
 * that are not there yet, and rejects as `import()` does.
 */
export async function publishedData(): Promise<Readonly<Record<string, unknown>>> {
  await loadAllGases();
  return {
    identity: gasIdentity,
    gases: gasIds,
    vapourPressures: vapourPressureRows,
    kunzWagner: { gases: kunzWagnerGases, departures, ideal: idealGasParts, pairs: pairRows, pure: kunzWagnerGases.map(pureEquation) },
    helmholtz: { gases: helmholtzGases },
    pengRobinson: { gases: pengRobinsonGases },
    beyondGerg: equationsBeyondGerg(),
  };
}
