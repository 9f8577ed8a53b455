import { formatNumber, formatSigned } from "../../format/format-number";
import type { FuelErrorSeries } from "./fuel-error-series";
import { Readout } from "./readout";

type Props = {
  widthMs: number;
  widthsMs: readonly number[];
  series: readonly FuelErrorSeries[];
  chosen: string | null;
};

export function FuelErrorReadout({ widthMs, widthsMs, series, chosen }: Props) {
  const index = widthsMs.indexOf(widthMs);
  if (index < 0) return null;
  const shown = chosen === null ? series : series.filter(({ key }) => key === chosen);
  return (
    <Readout
      title={`${formatNumber(widthMs, "pulseWidth")} ms, %`}
      withFound={series.some(({ found }) => found)}
      rows={shown.map(({ key, label, left, found }) => ({
        key,
        label,
        left: formatSigned(left[index], "deviation"),
        found: found ? formatSigned(found[index], "deviation") : undefined,
      }))}
    />
  );
}
