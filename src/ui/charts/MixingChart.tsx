import { CartesianGrid, Line, LineChart, ReferenceDot, ReferenceLine, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import { tickText } from './tick.ts';

export interface MixingChartPoint {
  readonly x: number;
  readonly ideal: number;
  readonly real: number | null;
}

interface MixingChartProps {
  readonly points: readonly MixingChartPoint[];
  /** Formula of the gas whose fraction runs along the axis. */
  readonly gas: string;
  readonly unit: string;
  /** Fraction of the first gas in this blend, of the two, and the value there. */
  readonly mark: { readonly x: number; readonly y: number };
}

/** A quantity of mixing over the composition of two gases, this blend marked. */
export default function MixingChart({ points, gas, unit, mark }: MixingChartProps) {
  return (
    <ResponsiveContainer width="100%" height={230}>
      <LineChart data={[...points]} margin={{ top: 8, right: 16, bottom: 18, left: 4 }} accessibilityLayer={false}>
        <CartesianGrid stroke="#d6dbdf" strokeDasharray="2 3" />
        <XAxis
          dataKey="x" type="number" domain={[0, 1]} ticks={[0, 0.25, 0.5, 0.75, 1]} tick={{ fontSize: 12 }}
          label={{ value: `amount fraction of ${gas}, of the two`, position: 'insideBottom', offset: -10, fontSize: 12 }}
        />
        <YAxis tick={{ fontSize: 12 }} tickFormatter={tickText} width={70} label={{ value: unit, angle: -90, position: 'insideLeft', fontSize: 12, dy: 34 }} />
        <Line dataKey="ideal" stroke="#a3601b" strokeDasharray="6 4" strokeWidth={1.6} dot={false} isAnimationActive={false} />
        <Line dataKey="real" stroke="#0b4f5c" strokeWidth={2} dot={false} isAnimationActive={false} />
        <ReferenceLine x={mark.x} stroke="#7f8c99" strokeDasharray="2 3" />
        <ReferenceDot x={mark.x} y={mark.y} r={5} fill="#0b4f5c" stroke="#fff" />
      </LineChart>
    </ResponsiveContainer>
  );
}
