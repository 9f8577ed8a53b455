/** Multiplier and modulus of each of the four generators. */
const parts = [
  [11600, 2147483579],
  [47003, 2147483543],
  [23000, 2147483423],
  [33000, 2147483123],
] as const;

/**
 * Pseudo-random numbers between 0 and 1, the same for the same seed on every machine: the sum of four congruential
 * generators, less its whole part.
 *
 * Source: B. A. Wichmann and I. D. Hill, Comput. Stat. Data Anal. 51 (2006) 1614-1622, as JCGM 101:2008, C.3, recommends.
 * The four starts are spread from one seed by the finalizer of MurmurHash3 (A. Appleby, public domain).
 */
export function uniformGenerator(seed: number): () => number {
  const states = parts.map(([, modulus], index) => 1 + (scramble(seed + index * 0x9e3779b9) % (modulus - 1)));
  return () => {
    let sum = 0;
    for (let k = 0; k < 4; k++) {
      const [multiplier, modulus] = parts[k]!;
      states[k] = (multiplier * states[k]!) % modulus;
      sum += states[k]! / modulus;
    }
    return sum % 1;
  };
}

function scramble(value: number): number {
  let bits = value >>> 0;
  bits = Math.imul(bits ^ (bits >>> 16), 0x85ebca6b);
  bits = Math.imul(bits ^ (bits >>> 13), 0xc2b2ae35);
  return (bits ^ (bits >>> 16)) >>> 0;
}
