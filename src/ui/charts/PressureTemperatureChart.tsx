import { CartesianGrid, Line, LineChart, ReferenceLine, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import { tickText } from './tick.ts';

export interface ChartPoint {
  readonly x: number;
  readonly y: number | null;
}

export interface LimitLine {
  readonly name: string;
  readonly value: number;
}

interface PressureTemperatureChartProps {
  readonly points: readonly ChartPoint[];
  readonly limits: readonly LimitLine[];
  readonly unit: string;
}

/** Pressure of the closed cylinder against temperature, with the cylinder's limits across. */
export default function PressureTemperatureChart({ points, limits, unit }: PressureTemperatureChartProps) {
  const values = [...points.flatMap(({ y }) => (y === null ? [] : [y])), ...limits.map(({ value }) => value)];
  const top = Math.ceil((1.05 * Math.max(...values)) / 10) * 10;
  return (
    <ResponsiveContainer width="100%" height={230}>
      <LineChart data={[...points]} margin={{ top: 8, right: 12, bottom: 18, left: 4 }} accessibilityLayer={false}>
        <CartesianGrid stroke="#d6dbdf" strokeDasharray="2 3" />
        <XAxis
          dataKey="x" type="number" domain={['dataMin', 'dataMax']} tickCount={10} tick={{ fontSize: 12 }} tickFormatter={tickText}
          label={{ value: 'temperature, °C', position: 'insideBottom', offset: -10, fontSize: 12 }}
        />
        <YAxis domain={[0, top]} tick={{ fontSize: 12 }} tickFormatter={tickText} width={62} label={{ value: unit, angle: -90, position: 'insideLeft', fontSize: 12, dy: 30 }} />
        {limits.map(({ name, value }) => (
          <ReferenceLine
            key={name} y={value} stroke="#a3201b" strokeDasharray="5 3"
            label={{ value: name, position: 'insideTopLeft', fontSize: 12, fill: '#a3201b' }}
          />
        ))}
        <Line dataKey="y" stroke="#0b4f5c" strokeWidth={2} dot={false} isAnimationActive={false} />
      </LineChart>
    </ResponsiveContainer>
  );
}
