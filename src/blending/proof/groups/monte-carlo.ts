import type { ProofCase, ProofGroup } from '../case.ts';
import { propagate } from '../../uncertainty/monte-carlo.ts';
import type { InputDistribution, MonteCarloRequest } from '../../uncertainty/monte-carlo.ts';
import { absolute, figure, once } from '../making.ts';

/** A rectangular quantity of mean 0 and this standard uncertainty. */
function rectangular(standardUncertainty: number): InputDistribution {
  const half = standardUncertainty * Math.sqrt(3);
  return { kind: 'rectangular', low: -half, high: half };
}

const sum = (inputs: Float64Array): number => inputs.reduce((total, value) => total + value, 0);

/** Mass calibration, clause 9.3: mg, kg/m³. */
const massCalibration: MonteCarloRequest = {
  inputs: [
    { kind: 'normal', mean: 100_000, standardUncertainty: 0.05 },
    { kind: 'normal', mean: 1.234, standardUncertainty: 0.02 },
    { kind: 'rectangular', low: 1.1, high: 1.3 },
    { kind: 'rectangular', low: 7000, high: 9000 },
    { kind: 'rectangular', low: 7950, high: 8050 },
  ],
  model: (inputs) => {
    const [reference = NaN, added = NaN, air = NaN, weight = NaN, standard = NaN] = inputs;
    return (reference + added) * (1 + (air - 1.2) * (1 / weight - 1 / standard)) - 100_000;
  },
  seed: 931, interval: 'shortest', digits: 2,
};

type Figure = 'estimate' | 'standardUncertainty' | 'low' | 'high' | 'width';
type Figures = Readonly<Partial<Record<Figure, number>>>;

interface Example {
  readonly id: string;
  readonly title: string;
  readonly unit: string;
  readonly request: MonteCarloRequest;
  readonly published: Figures;
  /** Of estimate and standard uncertainty, then of the ends, in the unit of the figures. */
  readonly tolerance: readonly [figures: number, ends: number];
  readonly remark?: string;
}

const examples: readonly Example[] = [
  {
    id: 'U1', title: 'Clause 9.3, mass calibration', unit: 'mg', request: massCalibration, tolerance: [0.001, 0.003],
    remark: 'the shortest interval lies at a flat minimum: with other seeds its ends move by 0.0007, its width by 0.0003',
    published: { estimate: 1.2341, standardUncertainty: 0.0754, low: 1.0834, high: 1.3825, width: 0.2991 },
  },
  {
    id: 'U2', title: 'Clause 9.2.3, sum of four equal rectangular quantities', unit: '', tolerance: [0.055, 0.055],
    request: { inputs: [1, 1, 1, 1].map(rectangular), model: sum, seed: 923, digits: 2 },
    published: { standardUncertainty: 2, low: -3.88, high: 3.88 },
  },
  {
    id: 'U2 unequal', title: 'Clause 9.2.4, one of the four ten times wider', unit: '', tolerance: [0.1, 0.1],
    request: { inputs: [1, 1, 1, 10].map(rectangular), model: sum, seed: 924, digits: 3 },
    published: { standardUncertainty: 10.1, low: -17, high: 17 },
  },
];

const names: Readonly<Record<Figure, string>> = {
  estimate: 'estimate', standardUncertainty: 'standard uncertainty', low: 'lower end, 95 %', high: 'upper end, 95 %', width: 'width of the interval, 95 %',
};

/** Propagation of distributions: the published examples that a supplement to the guide prints for such programs. */
export function monteCarlo(): ProofGroup {
  return {
    id: 'monte-carlo', title: 'Propagation of distributions, JCGM 101',
    why: 'The printed figures and these both come from random draws, each stable to the numerical tolerance δ of clause 7.9; the two may differ by twice that. The ends of a shortest interval are less stable than its width; their tolerance is three times the scatter seen between seeds.',
    cases: examples.flatMap(({ id, title, unit, request, published, tolerance: [figures, ends], remark = '' }) => {
      const answer = once(() => propagate(request));
      return (Object.entries(published) as [Figure, number][]).map(([key, value]): ProofCase => {
        const isEnd = key === 'low' || key === 'high';
        return {
          id: `monte-carlo:${id}:${key}`, group: 'monte-carlo', title: `${id}: ${title}: ${names[key]}`, source: 'JCGM 101:2008, clause 9, adaptive Monte Carlo',
          trust: 'from memory', published: value, unit, tolerance: absolute(isEnd ? ends : figures), remark: isEnd ? remark : '',
          compute: () => figure(answer(), (found) => (key === 'width' ? found.high - found.low : found[key])),
        };
      });
    }),
  };
}
