type Flow = { pulseWidthMs: number; volumePerPulseUl: number };

/** Mean volume per pulse at each distinct pulse width, in rising order of width. */
export function meansByWidth(points: readonly Flow[]): Flow[] {
  const groups = new Map<number, number[]>();
  for (const { pulseWidthMs, volumePerPulseUl } of points)
    groups.set(pulseWidthMs, [...(groups.get(pulseWidthMs) ?? []), volumePerPulseUl]);
  return [...groups]
    .sort(([a], [b]) => a - b)
    .map(([pulseWidthMs, volumes]) => ({
      pulseWidthMs,
      volumePerPulseUl: volumes.reduce((mean, volume) => mean + volume / volumes.length, 0),
    }));
}
