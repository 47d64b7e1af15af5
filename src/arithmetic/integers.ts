/** Elementary functions of big integers, on the platform's own BigInt. */

/** The greatest common divisor, never negative; gcd(0, 0) = 0. */
export function gcd(a: bigint, b: bigint): bigint {
  return interruptibleGcd(a, b, undefined);
}

/**
 * The greatest common divisor of integers that may have a million bits, so that it takes half a million
 * divisions; `spend` is called at every one and may throw.
 */
export function interruptibleGcd(a: bigint, b: bigint, spend: (() => void) | undefined): bigint {
  let x = a < 0n ? -a : a;
  let y = b < 0n ? -b : b;
  while (y !== 0n) {
    spend?.();
    [x, y] = [y, x % y];
  }
  return x;
}

/** The least non-negative residue of a modulo m > 0. */
export function residue(a: bigint, m: bigint): bigint {
  const r = a % m;
  return r < 0n ? r + m : r;
}

/** The absolute value. */
export function absolute(a: bigint): bigint {
  return a < 0n ? -a : a;
}
