import type { EarlierBenchHold, EarlierInstrument } from "@/data/benches";
import { formatRecordDayOf, formatRecordInstant } from "@/format/format-date";
import { Sheet } from "@/ui/layout/sheet";

type Props = { holds: EarlierBenchHold[]; instruments: EarlierInstrument[]; zone: string };

/** What a bench went through: holds that are over, and instruments that stood on it. */
export function EarlierHolds({ holds, instruments, zone }: Props) {
  if (holds.length === 0 && instruments.length === 0) return null;
  return (
    <Sheet title="Before">
      <ul className="flex flex-col gap-1.5">
        {holds.map((hold) => (
          <li key={hold.at.toISOString()}>
            On hold from {formatRecordInstant(hold.at, zone)} ({hold.by}: {hold.reason}) to{" "}
            {formatRecordInstant(hold.clearedAt, zone)} ({hold.clearedBy}: {hold.clearedReason})
          </li>
        ))}
        {instruments.map(({ instrumentId, code, channelNumber, since, until }) => (
          <li key={instrumentId}>
            {code}
            {channelNumber === null ? "" : `, channel ${channelNumber}`}, {formatRecordDayOf(since, zone)} to{" "}
            {formatRecordDayOf(until, zone)}
          </li>
        ))}
      </ul>
    </Sheet>
  );
}
