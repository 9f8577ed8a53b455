import type { Metadata } from "next";
import Link from "next/link";
import { currentContext } from "@/auth/current-actor";
import { authorize } from "@/data/access/authorize";
import { getBench } from "@/data/benches";
import { answerPage } from "@/data/edge/answer-page";
import { RecordCalibrationsForm } from "@/features/calibrations/record-form";
import { isoDayAfter } from "@/format/calendar";
import { PageHeader } from "@/ui/layout/page-header";
import { Sheet } from "@/ui/layout/sheet";
import { labClock } from "../../../lab-clock";

export const metadata: Metadata = { title: "Record calibrations" };

export default async function RecordCalibrationsPage({ params }: PageProps<"/calibration/[benchId]/record">) {
  const context = await currentContext();
  await answerPage(authorize(context, "recordCalibrations"));
  const { benchId, code, detail } = await answerPage(getBench(context, await params));
  const clock = await labClock(context);
  return (
    <>
      <PageHeader
        title={`Calibrations of bench ${code}`}
        subtitle="true = gain · indicated + offset; u are standard uncertainties"
        back={<Link href={`/calibration/${benchId}`}>Bench {code}</Link>}
      />
      <Sheet>
        <RecordCalibrationsForm
          benchId={benchId}
          places={detail?.places ?? []}
          validFrom={isoDayAfter(clock, 0)}
          validUntil={isoDayAfter(clock, 364)}
        />
      </Sheet>
    </>
  );
}
