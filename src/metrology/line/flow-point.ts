/** `u`: standard uncertainty of the volume per pulse, given for all points or for none. */
export type FlowPoint = { pulseWidthMs: number; volumePerPulseUl: number; u?: number };

export function asPoint({ pulseWidthMs: x, volumePerPulseUl: y, u }: FlowPoint) {
  return u === undefined ? { x, y } : { x, y, u };
}
