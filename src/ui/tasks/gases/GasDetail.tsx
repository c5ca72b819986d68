import type { GasCard, GasFigure, GasLabel } from '../../../blending/index.ts';
import { celsius, formatNumber, formatSignificant, fromPascal, type Kelvin } from '../../../units/index.ts';
import { CompressibilitySection } from './CompressibilitySection.tsx';
import { useGasTools } from './tools.ts';
import { VapourPressureSection } from './VapourPressureSection.tsx';

const EQUATIONS: Readonly<Record<GasCard['equation']['kind'], string>> = {
  'GERG-2008': 'GERG-2008, short equation of the gas',
  Helmholtz: 'Helmholtz equation of its own',
  'Peng–Robinson': 'Peng–Robinson: no better equation was found, trust its densities less',
};

/** What is known of one gas, and what its equation says. */
export function GasDetail({ gas }: { readonly gas: GasLabel }) {
  const card = useGasTools().gasCard(gas.id);
  return (
    <article className="gas-detail" aria-label={gas.name}>
      <h3>{gas.formula} <small>{gas.name}</small></h3>
      <Identity card={card} />
      <Hazards card={card} />
      <CompressibilitySection gas={gas} />
      <VapourPressureSection gas={gas} />
      <section>
        <h3>Sources</h3>
        <ul className="source">{card.sources.map((source) => <li key={source}>{source}</li>)}</ul>
      </section>
    </article>
  );
}

function Identity({ card: { record, equation } }: { readonly card: GasCard }) {
  const { molarMass, normalBoilingPoint } = record;
  const rows: readonly (readonly [string, string])[] = [
    ['formula', record.formula],
    ['CAS number', record.cas],
    ['also called', record.synonyms.length === 0 ? '—' : record.synonyms.join(', ')],
    ['molar mass', `${formatSignificant(molarMass.value * 1e3, 7)} g/mol, u = ${formatSignificant(molarMass.standardUncertainty * 1e3, 2)} g/mol`],
    ['critical point', `${temperature(record.criticalTemperature)}, ${formatSignificant(fromPascal(record.criticalPressure, 'bar'), 4)} bar absolute`],
    ['triple point', record.triplePoint === undefined ? 'not found' : temperature(record.triplePoint)],
    ['boiling point at 101.325 kPa absolute', normalBoilingPoint === undefined ? 'none' : temperature(normalBoilingPoint)],
    ['acentric factor', formatSignificant(record.acentricFactor, 3)],
    ['equation', `${EQUATIONS[equation.kind]} (${equation.source})`],
    ['range of the equation', equation.range === null ? 'none stated' : rangeText(equation.range)],
  ];
  return (
    <table className="rows identity">
      <tbody>{rows.map(([name, value]) => <tr key={name}><th scope="row">{name}</th><td>{value}</td></tr>)}</tbody>
    </table>
  );
}

function Hazards({ card: { facts } }: { readonly card: GasCard }) {
  const roles = facts.roles.includes('unclassified')
    ? 'No table here says whether it burns, oxidises or neither; a plan with it is held.'
    : `Counts as ${facts.roles.join(' and ')}.`;
  const harm = facts.lacksLc50 ? ' Harmful to people, by hazard statements from memory; no LC50 was found.' : '';
  return (
    <section>
      <h3>Hazard figures</h3>
      <p>{roles}{harm} What is not listed was not found; that never means zero or harmless.</p>
      {facts.figures.length > 0 && (
        <div className="scroll" tabIndex={0} role="group" aria-label="hazard figures">
          <table className="rows">
            <thead><tr><th scope="col">figure</th><th scope="col" className="number">value</th><th scope="col">source</th><th scope="col">trust</th></tr></thead>
            <tbody>{facts.figures.map((figure) => <FigureRow key={figure.name} figure={figure} />)}</tbody>
          </table>
        </div>
      )}
    </section>
  );
}

function FigureRow({ figure: { name, value, unit, source, trust } }: { readonly figure: GasFigure }) {
  return (
    <tr>
      <th scope="row">{name}</th>
      <td className="number">{String(value)}{unit === '' ? '' : ` ${unit}`}</td>
      <td>{source}</td>
      <td className={trust === 'seen' ? undefined : 'unsure'}>{trust}</td>
    </tr>
  );
}

function rangeText({ lowest, highest, highestPressure, fromMemory }: NonNullable<GasCard['equation']['range']>): string {
  const pressure = formatSignificant(fromPascal(highestPressure, 'bar'), 3);
  return `${temperature(lowest)} to ${temperature(highest)}, up to ${pressure} bar absolute${fromMemory ? ' (from memory)' : ''}`;
}

function temperature(value: Kelvin): string {
  return `${formatNumber(celsius(value), 2)} °C (${formatNumber(value, 2)} K)`;
}
