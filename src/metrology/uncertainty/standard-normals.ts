import { uniformGenerator } from "./uniform-generator";

let kept = { seed: Number.NaN, values: new Float64Array(0) };

/**
 * At least `count` draws from the standard normal distribution, the same ones for the same seed. The last list is kept:
 * a page asks for the same one at every keystroke.
 *
 * Source: G. E. P. Box and M. E. Muller, Ann. Math. Stat. 29 (1958) 610-611, as in JCGM 101:2008, C.4.
 */
export function standardNormals(seed: number, count: number): Float64Array {
  if (kept.seed === seed && kept.values.length >= count) return kept.values;
  const uniform = uniformGenerator(seed);
  const values = new Float64Array(count + (count % 2));
  for (let i = 0; i < values.length; i += 2) {
    const radius = Math.sqrt(-2 * Math.log(1 - uniform()));
    const angle = 2 * Math.PI * uniform();
    values[i] = radius * Math.cos(angle);
    values[i + 1] = radius * Math.sin(angle);
  }
  kept = { seed, values };
  return values;
}
