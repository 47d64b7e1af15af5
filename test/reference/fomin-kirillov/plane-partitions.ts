/**
 * For w = 1, …, m, m+k, …, m+1 the number of reduced pipe dreams is that of the plane partitions in a
 * staircase with parts at most m, Π_{1≤i<j≤k} (2m+i+j−1)/(i+j−1).
 * @source Fomin, Kirillov, *Reduced words and plane partitions*, J. Algebraic Combin. 6 (1997) (from memory).
 */
export function staircasePlanePartitions(m: number, k: number): bigint {
  let [numerator, denominator] = [1n, 1n];
  for (let j = 2; j <= k; j++) {
    for (let i = 1; i < j; i++) {
      numerator *= BigInt(2 * m + i + j - 1);
      denominator *= BigInt(i + j - 1);
    }
  }
  return numerator / denominator;
}
