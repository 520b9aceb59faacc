import type { Grid } from "./grid";

/**
 * MODD: the mean of absolute differences between values 24 h apart (Molnar
 * 1972, from memory), mg/dL.
 *
 * @returns null without a pair 24 h apart
 */
export function meanOfDailyDifferences(grid: Grid): number | null {
  const differences = differencesApart(grid, 24);
  if (differences.length === 0) return null;
  return differences.reduce((sum, d) => sum + Math.abs(d), 0) / differences.length;
}

/**
 * CONGA(n): the sample SD of differences between values n hours apart
 * (McDonnell 2005, Diabetes Technol Ther 7:253, from memory), mg/dL.
 *
 * @returns null with fewer than two pairs
 */
export function conga(grid: Grid, hours = 24): number | null {
  const differences = differencesApart(grid, hours);
  const n = differences.length;
  if (n < 2) return null;
  const mean = differences.reduce((sum, d) => sum + d, 0) / n;
  return Math.sqrt(differences.reduce((sum, d) => sum + (d - mean) ** 2, 0) / (n - 1));
}

/** Later minus earlier for every pair on the grid, to the nearest step. */
function differencesApart({ values, intervalMinutes }: Grid, hours: number): number[] {
  const steps = Math.round((hours * 60) / intervalMinutes);
  return values.flatMap((later, i) => {
    const earlier = values[i - steps];
    return later === null || earlier === null || earlier === undefined ? [] : [later - earlier];
  });
}
