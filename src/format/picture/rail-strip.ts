import { type Percents, railStripHalfScale } from "./rail-strip-scale";

/** One bar from the mean to its deviation; y runs downwards. */
export type RailStripBar = {
  x: number;
  y: number;
  width: number;
  height: number;
  percent: number;
  /** Which way the bar was cut because it is longer than the strip; its true length is `percent`. */
  clipped: "high" | "low" | null;
  outside: boolean;
};

export type RailStripInjector = {
  label: string;
  x: number;
  stem: { y1: number; y2: number };
  found: RailStripBar | null;
  left: RailStripBar | null;
};

export type RailStripPicture = {
  width: number;
  height: number;
  rail: { x: number; y: number; width: number; height: number };
  meanY: number;
  /** Hairlines of the tolerance; null without a limit. */
  limits: { highY: number; lowY: number } | null;
  /** The deviation that reaches the edge of the strip. */
  halfScalePercent: number;
  injectors: RailStripInjector[];
  /** Baseline of the injector numbers; null when the strip is too low for them. */
  labelY: number | null;
};

export type RailStripInput = {
  /** Deviation from the set's mean in percent, null where there is no figure. */
  found?: Percents;
  left?: Percents;
  labels?: readonly string[];
  /** Half of the allowed spread: the hairlines stand at plus and minus this. */
  halfLimitPercent: number | null;
  width: number;
  height: number;
  railHeight?: number;
  showLabels?: boolean;
};

const shortestBar = 1.5;
/** Where a bar is cut its length is written at its end. */
const lengthRoom = 12;
/** A pair of bars is drawn as wide as those of a set of six, not as two walls. */
const fewest = 6;

/** Where everything of a rail strip stands; the page and the certificate both draw from this. */
export function railStrip(input: RailStripInput): RailStripPicture {
  const { found = [], left = [], halfLimitPercent, width, height, railHeight = 4, showLabels = true } = input;
  const count = Math.max(found.length, left.length, input.labels?.length ?? 0);
  const halfScalePercent = railStripHalfScale(found, left, halfLimitPercent);
  const cut = [...found, ...left].some((percent) => Math.abs(percent ?? 0) > halfScalePercent);
  const room = showLabels && cut ? lengthRoom : 0;
  const top = railHeight + Math.min(10, height * 0.06) + room;
  const bottom = height - (showLabels ? 18 : 1) - room;
  const meanY = (top + bottom) / 2;
  const perPercent = (bottom - top) / 2 / halfScalePercent;
  const pitch = count > 0 ? width / count : width;

  function bar(percent: number | null | undefined, x: number, share: number): RailStripBar | null {
    if (percent === null || percent === undefined || !Number.isFinite(percent)) return null;
    const shown = Math.max(-halfScalePercent, Math.min(halfScalePercent, percent));
    const barHeight = Math.max(Math.abs(shown) * perPercent, shortestBar);
    const centred = Math.abs(shown) * perPercent < shortestBar;
    const y = centred ? meanY - shortestBar / 2 : shown > 0 ? meanY - barHeight : meanY;
    const barWidth = Math.min(pitch, width / fewest) * share;
    return {
      x: x - barWidth / 2,
      y,
      width: barWidth,
      height: barHeight,
      percent,
      clipped: shown === percent ? null : percent > 0 ? "high" : "low",
      outside: halfLimitPercent !== null && Math.abs(percent) > halfLimitPercent,
    };
  }

  return {
    width,
    height,
    rail: { x: 0, y: 0, width, height: railHeight },
    meanY,
    limits:
      halfLimitPercent === null
        ? null
        : { highY: meanY - halfLimitPercent * perPercent, lowY: meanY + halfLimitPercent * perPercent },
    halfScalePercent,
    injectors: Array.from({ length: count }, (_, index) => {
      const x = pitch * (index + 0.5);
      const bars = { found: bar(found[index], x, 0.46), left: bar(left[index], x, 0.2) };
      const y2 = Math.min(meanY, bars.found?.y ?? meanY, bars.left?.y ?? meanY);
      return { label: input.labels?.[index] ?? String(index + 1), x, stem: { y1: railHeight, y2 }, ...bars };
    }),
    labelY: showLabels ? height - 2 : null,
  };
}
