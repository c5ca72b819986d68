import { CartesianGrid, Line, LineChart, ReferenceLine, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import { tickText } from './tick.ts';

export interface FillChartPoint {
  /** mol. */
  readonly amount: number;
  readonly real: number | null;
  readonly ideal: number | null;
}

interface FillCurveChartProps {
  readonly points: readonly FillChartPoint[];
  /** Amounts at the stops, mol, with the step's number. */
  readonly stops: readonly { readonly amount: number; readonly step: number }[];
}

/** Real and ideal pressure against the amount put in. */
export default function FillCurveChart({ points, stops }: FillCurveChartProps) {
  return (
    <ResponsiveContainer width="100%" height={230}>
      <LineChart data={[...points]} margin={{ top: 16, right: 12, bottom: 18, left: 4 }} accessibilityLayer={false}>
        <CartesianGrid stroke="#d6dbdf" strokeDasharray="2 3" />
        <XAxis
          dataKey="amount" type="number" domain={[0, 'dataMax']} tick={{ fontSize: 12 }} tickFormatter={(value: number) => String(Math.round(value))}
          label={{ value: 'amount in the cylinder, mol', position: 'insideBottom', offset: -10, fontSize: 12 }}
        />
        <YAxis tick={{ fontSize: 12 }} tickFormatter={tickText} width={62} label={{ value: 'bar absolute', angle: -90, position: 'insideLeft', fontSize: 12, dy: 34 }} />
        {stops.map(({ amount, step }) => (
          <ReferenceLine key={step} x={amount} stroke="#7f8c99" strokeDasharray="2 3" label={{ value: String(step), position: 'top', fontSize: 12 }} />
        ))}
        <Line dataKey="ideal" stroke="#a3601b" strokeDasharray="6 4" strokeWidth={1.6} dot={false} isAnimationActive={false} />
        <Line dataKey="real" stroke="#0b4f5c" strokeWidth={2} dot={false} isAnimationActive={false} />
      </LineChart>
    </ResponsiveContainer>
  );
}
