import type { Grid } from "./grid";
import { LONG_POINTS, turningPoints } from "./turning-points";

/** A longer gap divides the trace; both sides are worked out on their own. */
const LONGEST_GAP_MINUTES = 180;

/**
 * MAGE: the mean height of swings greater than one SD (Service 1970). Several
 * algorithms exist and disagree. Ours takes the turning points between
 * crossings of a 5-point and a 32-point moving mean on the grid, and averages
 * the mean upward and the mean downward swing (after Fernandes, Jun, Irizarry
 * and Gaynanova 2022, J Diabetes Sci Technol, from memory). Stretches divided
 * by a long gap are weighed by their length.
 *
 * @returns mg/dL, or null when no stretch holds 32 steps and one such swing
 */
export function meanAmplitude(grid: Grid): number | null {
  let sum = 0;
  let weight = 0;
  for (const stretch of stretchesOf(grid)) {
    const amplitude = stretch.length < LONG_POINTS ? null : amplitudeOf(stretch);
    if (amplitude === null) continue;
    sum += amplitude * stretch.length;
    weight += stretch.length;
  }
  return weight === 0 ? null : sum / weight;
}

/** Parts of the grid without a long gap, each beginning and ending with a value. */
function stretchesOf({ values, intervalMinutes }: Grid): (number | null)[][] {
  const stretches: (number | null)[][] = [[]];
  let missing = 0;
  for (const value of values) {
    if (value === null) {
      missing += 1;
      continue;
    }
    const current = stretches.at(-1) ?? [];
    if (current.length === 0) current.push(value);
    else if (missing * intervalMinutes > LONGEST_GAP_MINUTES) stretches.push([value]);
    else {
      for (let i = 0; i < missing; i += 1) current.push(null);
      current.push(value);
    }
    missing = 0;
  }
  return stretches;
}

function amplitudeOf(stretch: ReadonlyArray<number | null>): number | null {
  const known = stretch.filter((v) => v !== null);
  const mean = average(known) ?? 0;
  const sdMgDl = Math.sqrt(known.reduce((sum, v) => sum + (v - mean) ** 2, 0) / (known.length - 1));
  const { up, down } = swings(turningPoints(stretch), sdMgDl);
  return average([average(up), average(down)].filter((side) => side !== null));
}

function average(values: ReadonlyArray<number>): number | null {
  return values.length === 0 ? null : values.reduce((sum, v) => sum + v, 0) / values.length;
}

/** Heights of swings that pass the threshold; smaller ones on the way are passed over. */
function swings(points: ReadonlyArray<number>, thresholdMgDl: number): { up: number[]; down: number[] } {
  const up: number[] = [];
  const down: number[] = [];
  let lowest = points[0] ?? 0;
  let highest = lowest;
  let direction: "up" | "down" | null = null;
  for (const point of points) {
    if (direction !== "down" && highest - point > thresholdMgDl) {
      if (direction === "up") up.push(highest - lowest);
      direction = "down";
      lowest = point;
    } else if (direction !== "up" && point - lowest > thresholdMgDl) {
      if (direction === "down") down.push(highest - lowest);
      direction = "up";
      highest = point;
    }
    if (direction !== "up") lowest = Math.min(lowest, point);
    if (direction !== "down") highest = Math.max(highest, point);
  }
  if (direction === "up") up.push(highest - lowest);
  if (direction === "down") down.push(highest - lowest);
  return { up, down };
}
