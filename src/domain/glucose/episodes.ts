import type { Grid } from "./grid";

export type Episodes = { low: number; veryLow: number; high: number; veryHigh: number; extendedLow: number };

/** An episode starts with this long beyond the threshold and ends with this long back. */
const EPISODE_MINUTES = 15;
const EXTENDED_MINUTES = 120;

/**
 * How often glucose went beyond a threshold and stayed: low < 70, very low
 * < 54, high > 180, very high > 250 mg/dL, each for at least 15 minutes; an
 * extended low is below 70 for at least 120 minutes without a break. A low
 * episode that goes on to very low counts in both. A gap in the readings ends
 * an episode. (Battelino 2023, Lancet Diabetes Endocrinol 11:42, from memory;
 * Danne 2017.)
 *
 * @param grid even steps; on five-minute steps 15 minutes are three points
 */
export function countEpisodes(grid: Grid): Episodes {
  const count = (isBeyond: (mgDl: number) => boolean, startMinutes = EPISODE_MINUTES) =>
    countRuns(grid.values, isBeyond, stepsFor(startMinutes, grid), stepsFor(EPISODE_MINUTES, grid));
  return {
    low: count((v) => v < 70),
    veryLow: count((v) => v < 54),
    high: count((v) => v > 180),
    veryHigh: count((v) => v > 250),
    extendedLow: count((v) => v < 70, EXTENDED_MINUTES),
  };
}

/** Each point stands for one interval. */
function stepsFor(minutes: number, grid: Grid): number {
  return Math.max(1, Math.ceil(minutes / grid.intervalMinutes));
}

function countRuns(values: Grid["values"], isBeyond: (mgDl: number) => boolean, startSteps: number, endSteps: number): number {
  let episodes = 0;
  let isOpen = false;
  let beyond = 0;
  let back = 0;
  for (const value of values) {
    if (value === null) {
      isOpen = false;
      beyond = back = 0;
    } else if (isBeyond(value)) {
      beyond += 1;
      back = 0;
      if (!isOpen && beyond >= startSteps) {
        isOpen = true;
        episodes += 1;
      }
    } else {
      back += 1;
      beyond = 0;
      if (back >= endSteps) isOpen = false;
    }
  }
  return episodes;
}
