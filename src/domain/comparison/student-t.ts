import tCdf from "@stdlib/stats-base-dists-t-cdf";
import tQuantile from "@stdlib/stats-base-dists-t-quantile";
import { AppError } from "@/domain/errors";

/**
 * Student's t, cumulative probability, at degrees of freedom that need not be whole.
 *
 * @throws {AppError} INVALID_RANGE for degrees of freedom that are not positive
 * @see the maintained package @stdlib/stats-base-dists-t-cdf
 */
export function studentTCdf(x: number, degreesOfFreedom: number): number {
  assertPositive(degreesOfFreedom);
  return tCdf(x, degreesOfFreedom);
}

/**
 * Student's t, quantile: the package's value, then two Newton steps on its
 * cumulative probability, since quantile routines are commonly good to 1e-8 only.
 *
 * @param p probability, 0 < p < 1
 */
export function studentTQuantile(p: number, degreesOfFreedom: number): number {
  assertPositive(degreesOfFreedom);
  let x = tQuantile(p, degreesOfFreedom);
  for (let step = 0; step < 2; step += 1) {
    x -= (tCdf(x, degreesOfFreedom) - p) / density(x, degreesOfFreedom);
  }
  return x;
}

function assertPositive(degreesOfFreedom: number): void {
  if (!(degreesOfFreedom > 0)) throw new AppError("INVALID_RANGE", `${degreesOfFreedom} degrees of freedom`);
}

/** The density, by a central difference of the cumulative probability: exact enough to steer Newton. */
function density(x: number, degreesOfFreedom: number): number {
  const h = 1e-5;
  return (tCdf(x + h, degreesOfFreedom) - tCdf(x - h, degreesOfFreedom)) / (2 * h);
}
