import type { GasId } from '../../blending/index.ts';
import { gasLook, patternId } from './gas-look.ts';
import type { Hatch } from './gas-look.ts';

const STROKE = 'rgb(20 30 40 / 55%)';

const HATCHES: Readonly<Record<Hatch, string>> = {
  solid: '',
  rising: 'M-2 2 L2 -2 M0 8 L8 0 M6 10 L10 6',
  falling: 'M-2 6 L2 10 M0 0 L8 8 M6 -2 L10 2',
  upright: 'M2 0 V8 M6 0 V8',
  level: 'M0 2 H8 M0 6 H8',
  cross: 'M0 0 L8 8 M8 0 L0 8',
  dots: 'M1.2 2 h1.6 M5.2 6 h1.6',
};

/** SVG patterns of the gases of one picture; goes inside its `<defs>`. */
export function GasPatterns({ picture, gases }: { readonly picture: string; readonly gases: readonly GasId[] }) {
  return (
    <>
      {gases.map((gas) => {
        const { colour, hatch } = gasLook(gas);
        return (
          <pattern key={gas} id={patternId(picture, gas)} width="8" height="8" patternUnits="userSpaceOnUse">
            <rect width="8" height="8" fill={colour} />
            <path d={HATCHES[hatch]} stroke={STROKE} strokeWidth={hatch === 'dots' ? 2 : 1.2} fill="none" />
          </pattern>
        );
      })}
    </>
  );
}

/** A small square in the look of a gas, beside its name. */
export function GasSwatch({ gas, picture }: { readonly gas: GasId; readonly picture: string }) {
  return (
    <svg className="swatch" width="14" height="14" aria-hidden="true">
      <defs><GasPatterns picture={picture} gases={[gas]} /></defs>
      <rect width="14" height="14" fill={`url(#${patternId(picture, gas)})`} />
    </svg>
  );
}
