/**
 * Between how many misses a count of `trials` lies that each miss with `chance`: fewer or more happen once in 10 000 times
 * each, by the binomial distribution summed term by term.
 */
export function expectedMisses(trials: number, chance: number): { least: number; most: number } {
  const risk = 1e-4;
  let probability = (1 - chance) ** trials;
  let below = 0;
  let least = 0;
  for (let misses = 0; misses < trials; misses++) {
    if (below + probability < risk) least = misses + 1;
    below += probability;
    if (1 - below < risk) return { least, most: misses };
    probability *= ((trials - misses) * chance) / ((misses + 1) * (1 - chance));
  }
  return { least, most: trials };
}
