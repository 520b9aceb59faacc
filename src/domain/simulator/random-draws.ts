import { AppError } from "@/domain/errors";
import type { RandomSource } from "./random";

/**
 * A draw from the normal distribution, by the method of Box and Muller. Always
 * takes two numbers from the source, so that a changed parameter never shifts the
 * draws that follow.
 *
 * @param sd standard deviation, 0 or more
 */
export function normalDraw(random: RandomSource, mean: number, sd: number): number {
  const radius = Math.sqrt(-2 * Math.log(1 - random()));
  return mean + sd * radius * Math.cos(2 * Math.PI * random());
}

/**
 * A draw whose logarithm is normal: "median times a factor".
 *
 * @param median above 0
 * @param logSd standard deviation of the natural logarithm; .2 is about 20 % either way
 */
export function lognormalDraw(random: RandomSource, median: number, logSd: number): number {
  return median * Math.exp(normalDraw(random, 0, logSd));
}

/**
 * A draw from the gamma distribution with mean `shape * scale`.
 *
 * @param shape 1 or more
 * @throws {AppError} INVALID_RANGE for a shape below 1, which this method does not cover
 * @see Marsaglia and Tsang, "A simple method for generating gamma variables",
 *   ACM Trans Math Softw 2000;26:363 (from memory)
 */
export function gammaDraw(random: RandomSource, shape: number, scale: number): number {
  if (!(shape >= 1)) throw new AppError("INVALID_RANGE", `a gamma draw of shape ${shape}`);
  const d = shape - 1 / 3;
  const c = 1 / Math.sqrt(9 * d);
  for (;;) {
    const x = normalDraw(random, 0, 1);
    const v = (1 + c * x) ** 3;
    const u = random();
    if (v > 0 && Math.log(1 - u) < 0.5 * x * x + d - d * v + d * Math.log(v)) return d * v * scale;
  }
}
