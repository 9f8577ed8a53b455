import type { BenchPlace } from "@/data/benches";
import { instrumentUnits } from "@/data/benches/inputs";
import { formatRecordDayOf } from "@/format/format-date";
import { StatusMark } from "@/ui/feedback/status-mark";
import { DataTable } from "@/ui/layout/data-table";
import type { DataColumn } from "@/ui/layout/data-table-column";

/** Every place on the bench with the calibration that is in force there. */
export function PlacesTable({ places, zone }: { places: BenchPlace[]; zone: string }) {
  return (
    <DataTable
      caption="Places and calibrations in force"
      dense
      rows={places.filter(({ instrument, channelId }) => instrument || channelId)}
      rowKey={({ channelId, kind }) => `${channelId} ${kind}`}
      columns={columnsIn(zone)}
    />
  );
}

function columnsIn(zone: string): DataColumn<BenchPlace>[] {
  return [
    {
      key: "place",
      head: "Place",
      cell: ({ channelNumber, kind }) => (channelNumber === null ? kind : `channel ${channelNumber}`),
    },
    { key: "code", head: "Instrument", cell: ({ instrument }) => instrument?.code ?? "empty" },
    {
      key: "division",
      head: "Division",
      align: "right",
      cell: ({ instrument, kind }) => (instrument ? `${instrument.division} ${instrumentUnits[kind]}` : null),
    },
    { key: "gain", head: "Gain", align: "right", cell: (place) => inForce(place)?.gain },
    { key: "gainU", head: "u(gain)", align: "right", cell: (place) => inForce(place)?.gainU },
    { key: "offset", head: "Offset", align: "right", cell: (place) => inForce(place)?.offset },
    { key: "offsetU", head: "u(offset)", align: "right", cell: (place) => inForce(place)?.offsetU },
    { key: "reference", head: "Calibration", cell: (place) => inForce(place)?.reference },
    {
      key: "until",
      head: "Valid until",
      cell: (place) => {
        const until = inForce(place)?.validUntil;
        return until ? (
          formatRecordDayOf(until, zone)
        ) : (
          <StatusMark kind="fail">not in calibration</StatusMark>
        );
      },
    },
  ];
}

function inForce({ instrument }: BenchPlace) {
  return instrument?.calibrations.find((calibration) => calibration.inForce);
}
