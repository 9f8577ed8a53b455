import "server-only";
import { formatQuantity } from "../../format/format-number";
import type { CertificateContent } from "./content";

type Recorded = Pick<CertificateContent, "asFound" | "asLeft" | "reference">;

/** How the figures were made, in paragraphs: what a reader needs to repeat the work. */
export function describeMethod({ asFound, asLeft, reference }: Recorded): string[] {
  const collecting = new Set([asFound.collects, asLeft.collects]);
  const density = formatQuantity(reference.densityGPerMl, "density");
  const pressure = formatQuantity(reference.pressureKpa, "pressure");
  return [
    `Flow. Each injector is pulsed at the widths stated, and what it delivers is ${collectedIn(collecting)}. The amount is corrected by the calibration of the channel and divided by the number of pulses. Flows are stated for a fluid of ${density} (${reference.fluid}): a volume flow times the square root of the density ratio.`,
    `Pressure. Static flow is brought to ${pressure} across the injector by the square root of the pressure ratio. A flow per pulse is brought to it only when it was measured within 3 % of it; otherwise it stands at its own pressure. Dead time is never scaled.`,
    "Flow line. Least squares of flow per pulse on pulse width over the linear range, which is the run of pulse widths with the largest ratio whose own line predicts every point within 5 %. Static flow is the slope times 60. Dead time is the pulse width at which the line meets zero flow; its interval is Fieller's at 95 % confidence, with Student's t at the degrees of freedom stated (points less two). Closure compares the static flow of the line with the flow held open.",
    "Spread. 100 · (max − min) / mean of the set, in percent; for dead time and resistance the plain range. The uncertainty of a spread is simulated (JCGM 101) from what differs between the injectors of one run. What they share, such as pressure and fluid temperature, cancels in a spread.",
    "Uncertainty. An uncertainty behind ± is expanded: the standard uncertainty (JCGM 100) times the coverage factor k for a coverage probability of about 95 %.",
    "Winding. Resistance at 20 °C as of copper, with the constant 234.5: R20 = R · (234.5 + 20) / (234.5 + T), lead resistance taken off. Leakage is what passes the closed injector at the pressure and in the time stated. Spray is graded by eye.",
  ];
}

function collectedIn(ways: ReadonlySet<"volume" | "mass">): string {
  if (ways.size > 1) return "read in the graduated cylinder or on the balance of its channel";
  return ways.has("mass")
    ? "weighed on the balance of its channel and divided by the density of the fluid"
    : "read in the graduated cylinder of its channel";
}

export function standingStatements({ reference }: Recorded): string[] {
  return [
    "The results relate only to the items named in this certificate, in the state in which they were tested.",
    `The certificate states what was measured on the bench at ${formatQuantity(reference.pressureKpa, "pressure")} and the conditions given. It does not say how an engine is to be set up.`,
    "What is marked as supplied by the customer is the customer's statement and was not verified by the laboratory.",
    "This certificate is to be reproduced in full only, unless the laboratory has agreed to an extract in writing.",
  ];
}

export function standingCautions(): string[] {
  return [
    "Test fluids and fuels burn, and their mist harms eyes and lungs: ventilate, keep ignition sources away, protect eyes and skin.",
    "Relieve the pressure before a rail is opened. Use insulated leads and never pierce insulation: the kick of a winding stings.",
    "Follow the safety data sheet of the fluid and local codes, and leave the work to qualified people.",
  ];
}
