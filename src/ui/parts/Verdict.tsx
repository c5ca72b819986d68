import type { Verdict } from '../../blending/index.ts';

const SHAPES: Readonly<Record<Verdict, string>> = { note: '●', caution: '▲', hold: '■' };

/** A verdict by word, shape and colour, so that none of the three is needed alone. */
export function VerdictMark({ verdict }: { readonly verdict: Verdict }) {
  return <span className={`verdict ${verdict}`}><span aria-hidden="true">{SHAPES[verdict]}</span> {verdict}</span>;
}
