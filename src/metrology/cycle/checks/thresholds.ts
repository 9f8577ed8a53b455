/**
 * What a reading must exceed to be in doubt. Common practice, no source: chosen so that clean synthetic sets at realistic
 * noise raise hardly a finding (tests/metrology holds them to it) while slips of a digit and exchanged rows do.
 */
export const thresholds = {
  /** Deviations that sound injectors show from each other's curve, as a share: standard uncertainty. */
  character: 0.003,
  /** Multiple of the standard uncertainty that resolution and repeatability still explain. */
  coverage: 4,
  /** Least deviation worth a word, against the curve of the set and against an injector's own straight line. */
  floorBySet: 0.02,
  floorByLine: 0.05,
  /** Others that must be complete for their median to stand as the curve of the set. */
  othersForCurve: 3,
  /** Two exchanged: least deviation of both, and the share of it that may be left after exchanging back. */
  exchange: { least: 0.01, coverage: 3, left: 0.35 },
  /** A column shifted by an injector: least root mean square, and the share that may be left. */
  shift: { least: 0.015, coverage: 3, left: 0.35 },
  /** A column of another width: how far off its own width, how near to the other one, for how many of the injectors. */
  otherWidth: { least: 0.12, left: 0.03, share: 0.75 },
  /** Exchanged since an earlier cycle: least change of both, multiple of the other injectors' scatter, share left. */
  cycle: { least: 0.025, scatter: 4, left: 0.35 },
  outlier: { alpha: 0.01, least: 0.03, weakUpTo: 4 },
  closurePercent: 5,
} as const;
