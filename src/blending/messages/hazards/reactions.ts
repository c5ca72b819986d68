import type { Words } from './words.ts';

/** Sentences about gases that react with each other or by themselves. */

const first = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** What a pair of gases does, where they meet. `level` as in the table of pairs. */
export const pair = (
  level: 'forbid' | 'restrict' | 'caution', a: string, b: string, where: string, reason: string, condition: string | null, contents: string,
): Words => {
  const under = condition === null ? '' : ` Filled at most under this condition: ${condition}.`;
  return {
    title: `${first(a)} and ${b} ${where}`,
    detail: `${first(reason)}. ${first(contents)}; where the gas streams in, the two meet at higher contents.${under}`,
    remedy: level === 'forbid'
      ? 'Do not fill them into one cylinder; order two cylinders, or have a tested recipe reviewed by someone licensed to fill it.'
      : level === 'restrict'
        ? 'Review the mixture with someone who has made it; check dryness, cylinder treatment and shelf life.'
        : '',
  };
};

export const impurity = (
  gas: string, amount: string, partner: string, partnerAmount: string, share: string, reason: string, belowLimit: boolean,
): Words => ({
  title: `An impurity that reacts: ${gas} up to ${amount} beside ${partner} ${partnerAmount}`,
  detail: `It can consume up to ${share} of the ${partner}: ${reason}. It was not ordered and comes with the parents or the residual${belowLimit ? '; its purity line gives only a limit, counted in full here' : ''}.`,
  remedy: 'Take a purer parent, remove the impurity, or analyse the finished gas before it is certified.',
});

export const acetyleneAbove = (figure: string, worst: string, limit: string): Words => ({
  title: `Partial pressure of acetylene ${figure}`,
  detail: `Highest within the tolerance ${worst}. Acetylene decomposes without any air; as a free gas it is kept at or below ${limit} and never compressed neat.`,
  remedy: 'Lower the acetylene content or the fill pressure; acetylene at higher pressure belongs into porous mass and solvent.',
});

export const acetyleneBelow = (figure: string, worst: string, limit: string): Words => ({
  title: `Partial pressure of acetylene ${figure}`,
  detail: `Highest within the tolerance ${worst}; not above ${limit}, up to which it is handled as a free gas. It never may be compressed neat on its way into the cylinder.`,
  remedy: '',
});
