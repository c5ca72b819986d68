/**
 * Time and gas that an addition takes beside its own. All figures are our own choice, from usual
 * bench practice without a source; they only rank orders that nothing graver tells apart.
 */

/** Closing one parent, purging the line and opening the next, minutes. */
const LINE_CHANGE_MINUTES = 5;
/** Shutting one gauge off and opening another, minutes. */
const GAUGE_CHANGE_MINUTES = 3;
/** Waiting until a small rise has settled, minutes. */
const SHORTEST_WAIT_MINUTES = 5;
/** What the heat of a large rise adds to the wait at most, minutes. */
const LONGEST_EXTRA_MINUTES = 15;
/** Rise at which half of that is reached, Pa. */
const HALF_EXTRA_RISE = 20e5;

/** Line between parent, gauge and cylinder, m³. */
const LINE_VOLUME = 20e-6;
/** Purges of the line when a parent is connected, and the absolute pressure of each, Pa. */
const LINE_PURGES = 3;
const PURGE_PRESSURE = 5e5;

/** Minutes of one addition with a pressure rise (Pa); a wait grows with the rise and levels off. */
export function additionMinutes(rise: number, gaugeChanges: boolean): number {
  const extra = rise > 0 ? (LONGEST_EXTRA_MINUTES * rise) / (rise + HALF_EXTRA_RISE) : 0;
  return LINE_CHANGE_MINUTES + SHORTEST_WAIT_MINUTES + extra + (gaugeChanges ? GAUGE_CHANGE_MINUTES : 0);
}

/**
 * mol lost by one addition: the purges of the line, and what it holds at the stop (Pa absolute) when
 * it is let off. Ideal gas at the room's temperature, K: ample for a figure that only ranks.
 */
export function lineLoss(stop: number, roomTemperature: number, gasConstant: number): number {
  return (LINE_VOLUME * (LINE_PURGES * PURGE_PRESSURE + stop)) / (gasConstant * roomTemperature);
}
