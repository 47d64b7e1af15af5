/** Products of residues in doubles. */

/** a·b modulo p < 2³¹: one factor is split at 16 bits, so that both parts stay below 2⁴⁸. */
export function residueProduct(a: number, b: number, p: number): number {
  const high = Math.floor(b / 65_536);
  const low = b - high * 65_536;
  const x = high * a;
  const y = (x - Math.floor(x / p) * p) * 65_536 + low * a;
  return y - Math.floor(y / p) * p;
}
