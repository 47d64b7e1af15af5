/** @import { Reading } from "../dist/index.js" */

/**
 * The value that was read; a fault ends the benchmark.
 * @template T
 * @param {Reading<T>} reading
 * @returns {T}
 */
export function accept(reading) {
  if (!reading.ok) throw new Error(reading.fault.message);
  return reading.value;
}
