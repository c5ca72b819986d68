import { Bar, BarChart, ReferenceLine, XAxis, YAxis } from 'recharts';
import type { GasId } from '../../blending/index.ts';
import { GasPatterns } from '../parts/GasPattern.tsx';
import { patternId } from '../parts/gas-look.ts';

/** One bar of the ladder: partial pressures by gas, in the unit of the axis. */
export interface LadderBar {
  readonly column: string;
  readonly parts: Readonly<Partial<Record<GasId, number>>>;
}

export interface LadderLimit {
  readonly name: string;
  readonly value: number;
}

interface FillLadderChartProps {
  readonly picture: string;
  readonly gases: readonly GasId[];
  readonly bars: readonly LadderBar[];
  readonly limits: readonly LadderLimit[];
  readonly top: number;
  readonly width: number;
  readonly height: number;
}

/** Stacked bars that share their columns with the step table below them. */
export default function FillLadderChart({ picture, gases, bars, limits, top, width, height }: FillLadderChartProps) {
  return (
    <BarChart
      width={width} height={height} data={[...bars]} barCategoryGap="18%"
      margin={{ top: 0, right: 0, bottom: 0, left: 0 }} accessibilityLayer={false}
    >
      <defs><GasPatterns picture={picture} gases={gases} /></defs>
      <XAxis dataKey="column" hide />
      <YAxis hide domain={[0, top]} allowDataOverflow />
      {limits.map((limit) => (
        <ReferenceLine key={limit.name} y={limit.value} stroke="#a3201b" strokeDasharray="5 3" />
      ))}
      {gases.map((gas) => (
        <Bar
          key={gas} name={gas} stackId="pressure" isAnimationActive={false}
          dataKey={(bar: LadderBar) => bar.parts[gas] ?? 0}
          fill={`url(#${patternId(picture, gas)})`} stroke="#33414d" strokeWidth={0.6}
        />
      ))}
    </BarChart>
  );
}
