import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { rolesOf } from "@/data/access/actor";
import { getBench } from "@/data/benches";
import { answerPage } from "@/data/edge/answer-page";
import { BenchStateMark } from "@/features/benches/bench-state";
import { BenchSteps } from "@/features/benches/bench-steps";
import { EarlierHolds } from "@/features/benches/earlier-holds";
import { PlacesTable } from "@/features/benches/places-table";
import { CalibrationHistory } from "@/features/calibrations/calibration-history";
import { formatInstant, formatRecordDayOf } from "@/format/format-date";
import { formatQuantity } from "@/format/format-number";
import { Notice } from "@/ui/feedback/notice";
import { Facts } from "@/ui/layout/facts";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";
import { labClock } from "../../lab-clock";

type Props = PageProps<"/calibration/[benchId]">;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: `Bench ${(await answerPage(getBench(await currentContext(), await params))).code}` };
}

/** A bench: how it stands, what is on it, and every calibration of it. */
export default async function BenchPage({ params }: Props) {
  const context = await currentContext();
  const bench = await answerPage(getBench(context, await params));
  const clock = await labClock(context);
  const { code, location, state, calibratedUntil, detail } = bench;
  const roles = rolesOf(context.actor);
  return (
    <>
      <PageHeader
        title={`Bench ${code}`}
        subtitle={location}
        back={<Link href="/calibration">Calibration</Link>}
        actions={detail ? <BenchSteps bench={{ ...bench, hold: detail.hold }} roles={roles} /> : null}
      />
      <div className="flex flex-col gap-3.5">
        {detail?.hold ? (
          <Notice
            kind="caution"
            title={`On hold since ${formatInstant(detail.hold.at, clock)}, ${detail.hold.by}`}
          >
            {detail.hold.reason}
          </Notice>
        ) : null}
        <Sheet>
          <Facts
            align="left"
            facts={[
              {
                label: "State",
                value: (
                  <BenchStateMark
                    state={state}
                    until={calibratedUntil && formatRecordDayOf(calibratedUntil, clock.zone)}
                  />
                ),
              },
              ...(detail
                ? [
                    { label: "Collects", value: detail.collects },
                    {
                      label: "Repeatability",
                      value: formatQuantity(
                        detail.repeatability,
                        detail.collects === "mass" ? "collectedMass" : "collectedVolume",
                      ),
                    },
                    { label: "Fluid", value: detail.fluidName },
                    {
                      label: "Drive",
                      value: `${formatQuantity(detail.driveVolts, "voltage")}, ${detail.driverKind}, period ${formatQuantity(detail.periodMs, "period")}`,
                    },
                  ]
                : []),
            ]}
          />
        </Sheet>
        {detail ? (
          <>
            <Sheet title="In force now" note="true = gain · indicated + offset" padding="none">
              <PlacesTable places={detail.places} zone={clock.zone} />
            </Sheet>
            <CalibrationHistory
              places={detail.places}
              zone={clock.zone}
              mayChange={roles.includes("manager")}
            />
            <EarlierHolds
              holds={detail.earlierHolds}
              instruments={detail.earlierInstruments}
              zone={clock.zone}
            />
          </>
        ) : null}
      </div>
    </>
  );
}
