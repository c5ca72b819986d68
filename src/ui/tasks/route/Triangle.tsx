import type { TrianglePicture, TrianglePoint } from '../../../blending/index.ts';
import { formatSignificant } from '../../../units/index.ts';

const WIDTH = 400;
const MARGIN = 26;
const SIDE = WIDTH - 2 * MARGIN;
const HEIGHT = (SIDE * Math.sqrt(3)) / 2;

/** Oxygen in air; mixtures of fuel and air lie on the line from there to pure fuel. */
const AIR = 0.209;

interface TriangleProps {
  readonly picture: TrianglePicture;
  /** Share of the whole triangle that is drawn, at the inert corner; 1: all of it. */
  readonly extent: number;
}

/**
 * The path of the fill in the triangle of fuel (top), oxidiser (right) and
 * inert gas (left), with the limits it is judged by. What lies outside the
 * magnified corner is cut off at its edge.
 */
export function Triangle({ picture, extent }: TriangleProps) {
  const at = ({ fuel, oxygen }: TrianglePoint): string => {
    const x = MARGIN + SIDE * ((oxygen + fuel / 2) / extent);
    const y = MARGIN + HEIGHT * (1 - fuel / extent);
    return `${x.toFixed(1)},${y.toFixed(1)}`;
  };
  const corners = [{ fuel: 0, oxygen: 0 }, { fuel: 0, oxygen: extent }, { fuel: extent, oxygen: 0 }].map(at).join(' ');
  const clip = `corner-${String(Math.round(1000 * extent))}`;
  const { held, lowerLimit, upperLimit, limitingOxygen } = picture;
  return (
    <svg className="triangle" viewBox={`0 0 ${String(WIDTH)} ${String(HEIGHT + 2 * MARGIN + 16)}`} role="img" aria-label={label(extent)}>
      <defs>
        <clipPath id={clip}><polygon points={corners} /></clipPath>
        <pattern id="held-region" width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <rect width="7" height="7" fill="#f6dedc" /><line x1="0" y1="0" x2="0" y2="7" stroke="#a3201b" strokeWidth="1.4" />
        </pattern>
      </defs>
      <g clipPath={`url(#${clip})`}>
        <polygon points={[held, { fuel: held.fuel, oxygen: 1 - held.fuel }, { fuel: 1 - held.oxygen, oxygen: held.oxygen }].map(at).join(' ')} fill="url(#held-region)" />
        <Line className="limit-line" points={[{ fuel: lowerLimit, oxygen: 0 }, { fuel: lowerLimit, oxygen: 1 - lowerLimit }].map(at)} />
        <Line className="limit-line" points={[{ fuel: 0, oxygen: limitingOxygen }, { fuel: 1 - limitingOxygen, oxygen: limitingOxygen }].map(at)} />
        <Line className="air-line" points={[{ fuel: 0, oxygen: AIR }, { fuel: 1, oxygen: 0 }].map(at)} />
        {[lowerLimit, ...(upperLimit === null ? [] : [upperLimit])].map((limit) => <Mark key={limit} place={at({ fuel: limit, oxygen: AIR * (1 - limit) })} />)}
        {picture.legs.map((leg) => <Line key={`in ${String(leg.step)}`} className="inlet-line" points={[at(leg.from ?? leg.to), at(leg.parent)]} />)}
        {picture.legs.map((leg) => <Line key={leg.step} className="path-line" points={[at(leg.from ?? leg.to), at(leg.to)]} />)}
      </g>
      <polygon points={corners} className="triangle-edge" />
      {picture.legs.filter(({ to }) => to.fuel + to.oxygen <= extent * 1.0001).map(({ step, to }) => <Dot key={step} place={at(to)} step={step} />)}
      <text x={MARGIN - 20} y={HEIGHT + 2 * MARGIN + 2}>inert</text>
      <text x={WIDTH - 4} y={HEIGHT + 2 * MARGIN + 2} textAnchor="end">oxidiser{edge(extent)}</text>
      <text x={WIDTH / 2 - 12} y={MARGIN - 6} textAnchor="end">fuel{edge(extent)}</text>
    </svg>
  );
}

function label(extent: number): string {
  return extent === 1 ? 'Path of the fill through fuel, oxidiser and inert gas' : `The same, magnified at the inert corner to ${percent(extent)}`;
}

function edge(extent: number): string {
  return extent === 1 ? '' : ` ${percent(extent)}`;
}

function percent(share: number): string {
  return `${formatSignificant(100 * share, 2)} %`;
}

function Line({ className, points }: { readonly className: string; readonly points: readonly string[] }) {
  return <polyline className={className} points={points.join(' ')} />;
}

function Mark({ place }: { readonly place: string }) {
  const [x, y] = place.split(',').map(Number);
  return <rect className="limit-mark" x={x! - 3} y={y! - 3} width="6" height="6" />;
}

function Dot({ place, step }: { readonly place: string; readonly step: number }) {
  const [x, y] = place.split(',').map(Number);
  return (
    <g>
      <circle className="state-dot" cx={x} cy={y} r="4" />
      <text className="state-number" x={x! + 6} y={y! - 5}>{step}</text>
    </g>
  );
}
