import { AppError } from "@/domain/errors";

/**
 * An exact quotient of two integers, in lowest terms, denominator above zero.
 *
 * Doses are divided, averaged and rounded to a device step. In binary floating
 * point 0.4 x 33 / 24 is a hair under 0.55, and rounding down would lose a
 * whole step; exact quotients cannot drift.
 */
export type Fraction = Readonly<{ numerator: bigint; denominator: bigint }>;

function gcd(a: bigint, b: bigint): bigint {
  let [x, y] = [a < 0n ? -a : a, b];
  while (y !== 0n) [x, y] = [y, x % y];
  return x;
}

/** @throws {AppError} INVALID_INPUT for a denominator of zero */
export function fraction(numerator: bigint, denominator: bigint): Fraction {
  if (denominator === 0n) throw new AppError("INVALID_INPUT", "division by zero");
  const sign = denominator < 0n ? -1n : 1n;
  const shared = gcd(numerator, sign * denominator) || 1n;
  return { numerator: (sign * numerator) / shared, denominator: (sign * denominator) / shared };
}

const DECIMAL = /^(-?\d+)(?:\.(\d+))?(?:e([+-]\d+))?$/;

/**
 * The decimal number that was typed: 0.4 becomes 4/10, not its binary neighbour.
 *
 * @throws {AppError} INVALID_INPUT for a value that is not finite
 */
export function fractionOf(value: number): Fraction {
  const [, whole, decimals = "", exponent = "0"] = DECIMAL.exec(String(value)) ?? [];
  if (whole === undefined) throw new AppError("INVALID_INPUT", `${value} is not a finite number`);
  const shift = Number(exponent) - decimals.length;
  const digits = BigInt(whole + decimals);
  return shift >= 0 ? fraction(digits * 10n ** BigInt(shift), 1n) : fraction(digits, 10n ** BigInt(-shift));
}

export function plus(a: Fraction, b: Fraction): Fraction {
  return fraction(a.numerator * b.denominator + b.numerator * a.denominator, a.denominator * b.denominator);
}

export function minus(a: Fraction, b: Fraction): Fraction {
  return fraction(a.numerator * b.denominator - b.numerator * a.denominator, a.denominator * b.denominator);
}

export function times(a: Fraction, b: Fraction): Fraction {
  return fraction(a.numerator * b.numerator, a.denominator * b.denominator);
}

/** @throws {AppError} INVALID_INPUT when `b` is zero */
export function over(a: Fraction, b: Fraction): Fraction {
  return fraction(a.numerator * b.denominator, a.denominator * b.numerator);
}

/** Below zero when a < b, zero when equal, above zero when a > b. */
export function compare(a: Fraction, b: Fraction): number {
  const difference = a.numerator * b.denominator - b.numerator * a.denominator;
  return difference < 0n ? -1 : difference > 0n ? 1 : 0;
}

export function smaller(a: Fraction, b: Fraction): Fraction {
  return compare(a, b) <= 0 ? a : b;
}

/** The nearest binary number; for display and JSON, never for a further step of arithmetic. */
export function toNumber({ numerator, denominator }: Fraction): number {
  return Number(numerator) / Number(denominator);
}
