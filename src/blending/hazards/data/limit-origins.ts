import type { Trust } from '../finding.ts';

/** Where a flammable limit comes from, and how far that was checked. */
export interface LimitOrigin {
  readonly source: string;
  readonly trust: Trust;
}

const LISTS: LimitOrigin = { source: 'IEC 60079-20-1:2010 and NFPA 497 (2008), in air at atmospheric pressure', trust: 'seen' };

/** Limits that are in neither of the two lists: lower, upper. */
const ELSEWHERE: Readonly<Partial<Record<string, readonly [LimitOrigin, LimitOrigin]>>> = {
  deuterium: both({ source: 'limits of hydrogen stand in', trust: 'common practice, no source' }),
  phosphine: [{ source: 'NIOSH; may light by itself', trust: 'seen' }, { source: 'no limit known, 100 % stands in', trust: 'common practice, no source' }],
  arsine: [{ source: 'NIOSH', trust: 'seen' }, { source: 'a general reference', trust: 'seen' }],
  silane: both({ source: 'may light by itself; counted as flammable from 0.5 %', trust: 'common practice, no source' }),
};

/** Where the flammable limits of a gas come from: the lower and the upper one. */
export function limitOrigins(gas: string): readonly [LimitOrigin, LimitOrigin] {
  return ELSEWHERE[gas] ?? both(LISTS);
}

function both(origin: LimitOrigin): readonly [LimitOrigin, LimitOrigin] {
  return [origin, origin];
}
