import { requireProbability } from "../limits";
import { tQuantile } from "./quantiles";

/** Student's t that the central share `confidence` lies within; infinite degrees of freedom give the normal factor. */
export function tFactor(confidence: number, degreesOfFreedom: number): number {
  requireProbability("confidence", confidence);
  return -tQuantile((1 - confidence) / 2, degreesOfFreedom);
}
