import { isReady } from "@/data/cycles/sheet/missing-calibrations";
import type { CycleBench } from "@/data/cycles/sheet/types";
import { formatRecordDayOf } from "@/format/format-date";
import { StatusMark } from "@/ui/feedback/status-mark";

/** Each bench in a line: whether it can be used now, and until when. */
export function BenchesNow({ benches, zone }: { benches: CycleBench[]; zone: string }) {
  const shown = benches.filter(({ retired }) => !retired);
  if (shown.length === 0)
    return <p className="text-ink-2">No bench is set up yet: the lab manager adds one under Calibration.</p>;
  return (
    <ul className="flex flex-wrap gap-x-8 gap-y-1.5">
      {shown.map((bench) => (
        <li key={bench.benchId} className="flex flex-wrap items-baseline gap-x-2">
          <span className="font-semibold">{bench.code}</span>
          <BenchState bench={bench} zone={zone} />
        </li>
      ))}
    </ul>
  );
}

function BenchState({ bench, zone }: { bench: CycleBench; zone: string }) {
  if (bench.holdReason !== null) return <StatusMark kind="held">on hold: {bench.holdReason}</StatusMark>;
  if (!isReady(bench)) return <StatusMark kind="fail">not in calibration</StatusMark>;
  const ends = [...bench.channels.map((channel) => channel.instrument), ...bench.instruments]
    .flatMap((instrument) => (instrument?.calibration ? [instrument.calibration.validUntil] : []))
    .sort();
  return <StatusMark kind="pass">in calibration to {formatRecordDayOf(ends[0], zone)}</StatusMark>;
}
