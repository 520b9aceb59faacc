import { AppError } from "@/domain/errors";

/** A source of chance: each call gives the next number from 0 (included) to 1 (excluded). */
export type RandomSource = () => number;

/** One step of SplitMix32: a counter that is stirred until its bits look unrelated. */
function splitMix32(counter: number): number {
  let z = counter;
  z = Math.imul(z ^ (z >>> 16), 0x21f0aaad);
  z = Math.imul(z ^ (z >>> 15), 0x735a2d97);
  return (z ^ (z >>> 15)) >>> 0;
}

/** The four words SplitMix32 gives from a counter; never all zero. */
export function seedWords(counter: number): [number, number, number, number] {
  const word = (step: number) => splitMix32((counter + Math.imul(step, 0x9e3779b9)) | 0);
  return [word(1), word(2), word(3), word(4)];
}

/**
 * The generator xoshiro128**: 128 bits of state, period 2^128 - 1, 32 bits a call.
 *
 * @param words the state to start from, four 32-bit words that are not all zero
 * @returns a function whose calls give whole numbers from 0 to 2^32 - 1
 * @see Blackman and Vigna, "Scrambled linear pseudorandom number generators",
 *   ACM Trans Math Softw 2021;47(4):36, version 1.1 of the generator
 */
export function xoshiro128StarStar(words: readonly [number, number, number, number]): () => number {
  let [a, b, c, d] = words;
  return () => {
    const five = Math.imul(b, 5);
    const result = Math.imul((five << 7) | (five >>> 25), 9) >>> 0;
    const shifted = b << 9;
    c ^= a;
    d ^= b;
    b ^= c;
    a ^= d;
    c ^= shifted;
    d = (d << 11) | (d >>> 21);
    return result;
  };
}

/**
 * A repeatable source of chance: the same seed and stream always give the same numbers.
 *
 * @param seed whole number from 0 to 2^32 - 1
 * @param stream whole number from 0 to 2^32 - 1; streams of one seed are unrelated,
 *   so that person 7 is the same person however many people are drawn
 * @throws {AppError} INVALID_INPUT for anything else
 */
export function seededRandom(seed: number, stream = 0): RandomSource {
  for (const value of [seed, stream]) {
    if (!Number.isInteger(value) || value < 0 || value > 0xffffffff) {
      throw new AppError("INVALID_INPUT", `a seed is a whole number from 0 to 4294967295, not ${value}`);
    }
  }
  const next = xoshiro128StarStar(seedWords(splitMix32(seed ^ 0x5bd1e995) ^ splitMix32(stream)));
  return () => ((next() >>> 5) * 67108864 + (next() >>> 6)) / 9007199254740992;
}
