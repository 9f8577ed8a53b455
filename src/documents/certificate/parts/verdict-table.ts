import "server-only";
import { formatQuantity, formatWithUncertainty, noFigure } from "../../../format/format-number";
import { figure, marked, quietWords, words } from "../../drawing/cells";
import type { Pen } from "../../drawing/pen";
import { styles } from "../../drawing/print-style";
import type { Section } from "../../drawing/sheet";
import { tableSections } from "../../drawing/table-sections";
import type { Row } from "../../drawing/table-spec";
import type { CertificateContent } from "../content";
import { type VerdictLine, verdictLines } from "../verdict-lines";
import { criterionQuantity, markOf } from "../verdict-words";
import { textSection } from "./text-section";

/** Each criterion of the class with its figure before and after, its limit, and what follows by the decision rule. */
export function verdictSections(pen: Pen, content: CertificateContent, width: number): Section[] {
  const { asLeft, toleranceClass } = content;
  const note = `against tolerance class ${toleranceClass.name}, revision ${toleranceClass.revision}`;
  return [
    ...tableSections(
      pen,
      { title: "Verdict", note },
      {
        columns: [
          { title: ["Criterion"], align: "left" },
          { title: ["Limit"], align: "right" },
          { title: ["As found"], align: "right" },
          { title: ["Verdict"], align: "left" },
          { title: ["As left"], align: "right" },
          { title: ["Verdict"], align: "left" },
        ],
        rows: verdictLines(content).map(rowOf),
      },
      width,
    ),
    textSection(pen, [`Decision rule. ${asLeft.verdict.decisionRule}`], width, styles.note),
  ];
}

function rowOf({ name, unit, limit, found, left }: VerdictLine): Row {
  const quantity = criterionQuantity[unit];
  const write = ({ value, expandedUncertainty }: VerdictLine["left"]) =>
    formatWithUncertainty(value, expandedUncertainty > 0 ? expandedUncertainty : null, quantity);
  const verdict = ({ verdict }: VerdictLine["left"]) => marked(verdict ?? "not judged", markOf(verdict));
  return {
    cells: [
      words(name),
      words(formatQuantity(limit, unit === "%" ? "tolerance" : quantity)),
      quietWords(found ? write(found) : noFigure),
      found ? verdict(found) : quietWords(noFigure),
      figure(write(left)),
      verdict(left),
    ],
  };
}
