import { CartesianGrid, Line, LineChart, ReferenceDot, ReferenceLine, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import { tickText } from './tick.ts';

export interface GasCurvePoint {
  readonly x: number;
  readonly y: number;
}

interface GasCurveChartProps {
  readonly points: readonly GasCurvePoint[];
  readonly xLabel: string;
  readonly yLabel: string;
  /** A dashed line across, such as Z = 1. */
  readonly across?: number;
  readonly mark?: GasCurvePoint;
  readonly logarithmic?: boolean;
}

/** One curve of a pure gas. */
export default function GasCurveChart({ points, xLabel, yLabel, across, mark, logarithmic = false }: GasCurveChartProps) {
  return (
    <ResponsiveContainer width="100%" height={230}>
      <LineChart data={[...points]} margin={{ top: 8, right: 14, bottom: 18, left: 4 }} accessibilityLayer={false}>
        <CartesianGrid stroke="#d6dbdf" strokeDasharray="2 3" />
        <XAxis
          dataKey="x" type="number" domain={['auto', 'auto']} tickCount={7} tick={{ fontSize: 12 }} tickFormatter={tickText}
          label={{ value: xLabel, position: 'insideBottom', offset: -10, fontSize: 12 }}
        />
        <YAxis
          scale={logarithmic ? 'log' : 'linear'} domain={['auto', 'auto']} allowDataOverflow={logarithmic}
          {...(logarithmic ? { ticks: decades(points) } : {})}
          tick={{ fontSize: 12 }} tickFormatter={tickText} width={66} label={{ value: yLabel, angle: -90, position: 'insideLeft', fontSize: 12, dy: 40 }}
        />
        {across !== undefined && <ReferenceLine y={across} stroke="#7f8c99" strokeDasharray="5 3" />}
        <Line dataKey="y" stroke="#0b4f5c" strokeWidth={2} dot={false} isAnimationActive={false} />
        {mark !== undefined && <ReferenceDot x={mark.x} y={mark.y} r={4} fill="#0b4f5c" stroke="#fff" />}
      </LineChart>
    </ResponsiveContainer>
  );
}

/** The powers of ten that the points reach over. */
function decades(points: readonly GasCurvePoint[]): number[] {
  const values = points.map(({ y }) => Math.log10(y));
  const low = Math.floor(Math.min(...values));
  const high = Math.ceil(Math.max(...values));
  return Array.from({ length: high - low + 1 }, (_, index) => 10 ** (low + index));
}
