import { CartesianGrid, Line, LineChart, ReferenceDot, ReferenceLine, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import { tickText } from './tick.ts';

export interface CondensationChartPoint {
  /** °C. */
  readonly x: number;
  readonly y: number;
}

interface CondensationChartProps {
  readonly points: readonly CondensationChartPoint[];
  readonly unit: string;
  /** The planned fill pressure. */
  readonly fill: number;
  /** °C at which the planned fill begins to condense; null where it does not. */
  readonly lowest: number | null;
  /** Coldest storage temperature stated, °C. */
  readonly coldest: number | null;
}

/** Fill pressure against the temperature at which the cooled cylinder begins to condense; to the left of the line it has. */
export default function CondensationChart({ points, unit, fill, lowest, coldest }: CondensationChartProps) {
  const shown = [...points.map(({ x }) => x), ...(coldest === null ? [] : [coldest]), ...(lowest === null ? [] : [lowest])];
  const from = 5 * Math.floor((Math.min(...shown) - 1) / 5);
  const to = 5 * Math.ceil((Math.max(...shown) + 4) / 5);
  return (
    <ResponsiveContainer width="100%" height={230}>
      <LineChart data={[...points]} margin={{ top: 16, right: 12, bottom: 18, left: 4 }} accessibilityLayer={false}>
        <CartesianGrid stroke="#d6dbdf" strokeDasharray="2 3" />
        <XAxis
          dataKey="x" type="number" domain={[from, to]} tickCount={9} tick={{ fontSize: 12 }} tickFormatter={tickText}
          label={{ value: 'temperature, °C', position: 'insideBottom', offset: -10, fontSize: 12 }}
        />
        <YAxis
          domain={[0, Math.ceil((1.5 * fill) / 10) * 10]} allowDataOverflow tick={{ fontSize: 12 }} tickFormatter={tickText} width={62}
          label={{ value: unit, angle: -90, position: 'insideLeft', fontSize: 12, dy: 30 }}
        />
        <ReferenceLine y={fill} stroke="#7f8c99" strokeDasharray="2 3" label={{ value: 'this fill', position: 'insideTopLeft', fontSize: 12 }} />
        {coldest !== null && (
          <ReferenceLine x={coldest} stroke="#a3201b" strokeDasharray="5 3" label={{ value: 'coldest storage', position: 'top', fontSize: 12, fill: '#a3201b' }} />
        )}
        <Line dataKey="y" stroke="#0b4f5c" strokeWidth={2} dot={false} isAnimationActive={false} />
        {lowest !== null && <ReferenceDot x={lowest} y={fill} r={5} fill="#0b4f5c" stroke="#fff" />}
      </LineChart>
    </ResponsiveContainer>
  );
}
