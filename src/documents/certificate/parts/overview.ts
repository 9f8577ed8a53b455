import "server-only";
import { formatRecordDayOf } from "../../../format/format-date";
import { formatQuantity, formatRange } from "../../../format/format-number";
import { joinWords } from "../../../format/join-words";
import { plural } from "../../../format/plural";
import type { Block } from "../../drawing/block";
import { type Fact, titleBlock } from "../../drawing/facts";
import type { Pen } from "../../drawing/pen";
import type { CertificateContent } from "../content";
import { verdictLines } from "../verdict-lines";
import { markOf, overallWords } from "../verdict-words";

const mostNamed = 3;

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

/** Names what did not simply pass, as far as a cell holds it. */
function verdictFact(content: CertificateContent): Fact {
  const { verdict } = content.asLeft;
  const lines = verdictLines(content);
  const others = lines.filter(({ left }) => left.verdict !== "pass");
  const named = others
    .slice(0, mostNamed)
    .map(({ name, left }) => `${name}: ${left.verdict ?? "not judged"}`);
  const more = others.length > mostNamed ? [`and ${others.length - mostNamed} more`] : [];
  const passed = lines.length > 0 ? `${lines.length - others.length} of ${lines.length} criteria passed` : "";
  return {
    key: "Verdict as left",
    value: overallWords(verdict),
    notes: [passed, ...named, ...more],
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
