import "server-only";
import { formatRecordDayOf } from "../../../format/format-date";
import { formatQuantity, formatRange } from "../../../format/format-number";
import { joinWords } from "../../../format/join-words";
import { plural } from "../../../format/plural";
import type { Block } from "../../drawing/block";
import { type Fact, titleBlock } from "../../drawing/facts";
import type { Pen } from "../../drawing/pen";
import type { CertificateContent } from "../content";
import { markOf, overallWords } from "../verdict-words";

/** Customer, item, dates and verdict, as on a drawing's title block. */
export function overviewOf(pen: Pen, content: CertificateContent, width: number): Block {
  const { lab, set, asFound, asLeft, model } = content;
  const day = (instant: string) => formatRecordDayOf(instant, lab.timeZone);
  const resistance = formatRange(model.resistanceLowOhm, model.resistanceHighOhm, "resistance");
  const rated = `${formatQuantity(model.ratedFlowMlPerMin, "staticFlow")} ± ${formatQuantity(model.ratedFlowBandPercent, "tolerance")} at ${formatQuantity(model.ratedPressureKpa, "pressure")}`;
  return titleBlock(
    pen,
    [
      [
        { fact: customerFact(content), share: 1.7 },
        { fact: { key: "Set", value: set.number, notes: [injectorCounts(content)] }, share: 0.9 },
        { fact: verdictFact(content), share: 1.5 },
      ],
      [
        {
          fact: {
            key: "Injector model",
            value: `${model.make} ${model.partNumber}`,
            notes: [`${model.impedanceBand}, ${resistance}; ${model.sprayType}`, `rated ${rated}`],
          },
          share: 1.7,
        },
        { fact: { key: "Work asked for", value: joinWords(set.workAsked) || "none named" }, share: 0.9 },
        { fact: classFact(content), share: 1.5 },
      ],
      [
        { fact: { key: "Received", value: day(set.receivedAt) }, share: 1 },
        { fact: { key: "Tested as found", value: day(asFound.measuredAt) }, share: 1 },
        { fact: { key: "Tested as left", value: day(asLeft.measuredAt) }, share: 1 },
        { fact: { key: "Issued", value: day(content.certificate.issuedAt) }, share: 1 },
        { fact: { key: "Where the work was done", value: lab.placeOfWork }, share: 1.9 },
      ],
    ],
    width,
  );
}

function customerFact({ customer }: CertificateContent): Fact {
  return { key: "Customer", value: customer.name, notes: [customer.contactName, customer.address] };
}

function injectorCounts({ injectors }: CertificateContent): string {
  const count = (state: string) => injectors.filter((injector) => injector.state === state).length;
  const rejected = count("rejected") + count("replaced");
  return [plural(count("in set"), "injector"), rejected > 0 ? `${rejected} rejected` : ""]
    .filter((part) => part !== "")
    .join(", ");
}

function verdictFact({ asLeft: { verdict } }: CertificateContent): Fact {
  const passed = verdict.criteria.filter((criterion) => criterion.verdict === "pass").length;
  return {
    key: "Verdict as left",
    value: overallWords(verdict),
    notes: [
      `${passed} of ${plural(verdict.criteria.length, "criterion", "criteria")} passed`,
      "decision rule with guard band w = U: see the verdict",
    ],
    mark: markOf(verdict.verdict),
  };
}

function classFact({ toleranceClass: { name, revision, spreadLimits } }: CertificateContent): Fact {
  const limits = spreadLimits.map(
    ({ fromPulseWidthMs, spreadPercent }) =>
      `${formatQuantity(spreadPercent, "tolerance")} from ${formatQuantity(fromPulseWidthMs, "pulseWidth")}`,
  );
  return {
    key: "Tolerance class",
    value: `${name}, revision ${revision}`,
    notes: limits.length > 0 ? [`spread at most ${limits.join(", ")}`] : [],
  };
}
