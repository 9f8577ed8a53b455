import type { SetDetail } from "@/data/sets";
import { formatQuantity } from "@/format/format-number";

/** The class in a few words: ±1.5 % from 2 ms. */
export function classLimits({ spreadLimits, staticSpreadPercent }: SetDetail["toleranceClass"]): string {
  const [first] = spreadLimits;
  if (first)
    return `spread ${formatQuantity(first.spreadPercent, "tolerance")} from ${formatQuantity(first.fromPulseWidthMs, "pulseWidth")}`;
  if (staticSpreadPercent !== null)
    return `static spread ${formatQuantity(staticSpreadPercent, "tolerance")}`;
  return "no limit on the spread";
}
