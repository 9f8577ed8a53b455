import { formatNumber, formatQuantity, formatSigned } from "../../../format/format-number";
import type { Doubt } from "../../../metrology/cycle/doubt";
import { findingKey, type NewFinding } from "./findings-of-run";

type Names = {
  /** The width that was set, by the true one that the arithmetic uses. */
  asSet: Map<number, number>;
  tagOf: (setInjectorId: string) => string;
};

/** A doubt of the arithmetic as the technician reads it: which injector, where, and the numbers that make it doubtful. */
export function describeDoubt(doubt: Doubt, names: Names): NewFinding {
  const { kind, injectorId } = doubt;
  const pulseWidthMs = setWidth(doubt.pulseWidthMs, names);
  const other = "otherInjectorId" in doubt ? `-${doubt.otherInjectorId.slice(0, 8)}` : "";
  const repeat = "repeat" in doubt && doubt.repeat > 1 ? `-run-${doubt.repeat}` : "";
  return {
    key: findingKey(`${wordsOnly(kind)}${other}${repeat}`, injectorId, pulseWidthMs),
    kind,
    setInjectorId: injectorId,
    ...("otherInjectorId" in doubt ? { otherSetInjectorId: doubt.otherInjectorId } : {}),
    pulseWidthMs,
    sentence: sentenceOf(doubt, names),
  };
}

function setWidth(trueWidthMs: number | null, { asSet }: Names): number | null {
  return trueWidthMs === null ? null : (asSet.get(trueWidthMs) ?? trueWidthMs);
}

function wordsOnly(kind: string): string {
  return kind
    .toLowerCase()
    .replace(/[^a-z]+/g, "-")
    .replace(/^-|-$/g, "");
}

function sentenceOf(doubt: Doubt, names: Names): string {
  const at = (widthMs: number | null) =>
    widthMs === null ? "held open" : `at ${formatQuantity(setWidth(widthMs, names), "pulseWidth")}`;
  const tag = doubt.injectorId ? names.tagOf(doubt.injectorId) : "";
  const percent = (value: number) => `${formatSigned(value, "deviation")} %`;
  const flow = (value: number) => formatQuantity(value, "flowPerPulse");
  switch (doubt.kind) {
    case "off the line":
      return `${tag} ${at(doubt.pulseWidthMs)}${run(doubt.repeat)}: ${flow(doubt.volumePerPulseUl)}, while its other widths predict ${flow(doubt.predictedUl)} (${percent(doubt.deviationPercent)}; ±${formatNumber(doubt.explainedPercent, "deviation")} % would be explained).`;
    case "not rising":
      return `${tag} ${at(doubt.pulseWidthMs)}: ${flow(doubt.volumePerPulseUl)} is not more than the ${flow(doubt.shorterVolumePerPulseUl)} ${at(doubt.shorterPulseWidthMs)}.`;
    case "duty over 100 %":
      return `${tag} ${at(doubt.pulseWidthMs)}: the pulse fills the period of ${formatQuantity(doubt.periodMs, "period")}, so the injector is held open. It stays out of the line.`;
    case "outside the model's band":
      return `${tag}: ${formatQuantity(doubt.mlPerMin, "staticFlow")} static, ${percent(doubt.deviationPercent)} from the rated ${formatQuantity(doubt.ratedMlPerMin, "staticFlow")}; the model allows ±${formatNumber(doubt.bandPercent, "tolerance")} %.`;
    case "outlier at a width":
      return `${tag} ${at(doubt.pulseWidthMs)}: ${flow(doubt.volumePerPulseUl)}, ${percent(doubt.deviationPercent)} from the others, stands out of the ${doubt.count} (Grubbs ${formatNumber(doubt.statistic, "ratio")} over ${formatNumber(doubt.critical, "ratio")})${doubt.weak ? "; on so few values the test sees little" : ""}.`;
    case "closure over 5 %":
      return `${tag}: the line's static flow is ${percent(doubt.closurePercent)} from what was measured held open. Usual causes: it does not close fully in a short off-time, driver current, air in the rail.`;
    case "two injectors exchanged in a column":
      return `${tag} and ${names.tagOf(doubt.otherInjectorId)} ${at(doubt.pulseWidthMs)} look exchanged: ${pair(doubt.deviationsPercent)} off their lines as read, ${pair(doubt.exchangedPercent)} if exchanged.`;
    case "column shifted by an injector":
      return `The column ${at(doubt.pulseWidthMs)} looks shifted ${doubt.shift === 1 ? "down" : "up"} by one injector: ${formatNumber(doubt.deviationPercent, "deviation")} % off the lines as read, ${formatNumber(doubt.shiftedPercent, "deviation")} % if shifted back.`;
    case "column of another pulse width":
      return `The column ${at(doubt.pulseWidthMs)} looks like readings ${at(doubt.likelyPulseWidthMs)}: ${percent(doubt.deviationPercent)} off the lines as named, ${percent(doubt.likelyPercent)} at the other width.`;
    case "two injectors exchanged in the cycle":
      return `${tag} and ${names.tagOf(doubt.otherInjectorId)} look exchanged in the whole cycle: against the cycle before they changed by ${pair(doubt.changesPercent)}, if exchanged by ${pair(doubt.exchangedPercent)}.`;
  }
}

function run(repeat: number): string {
  return repeat > 1 ? `, run ${repeat}` : "";
}

function pair([first, second]: [number, number]): string {
  return `${formatSigned(first, "deviation")} and ${formatSigned(second, "deviation")} %`;
}
