import "server-only";
import { quietWords, words } from "../../drawing/cells";
import type { Pen } from "../../drawing/pen";
import { styles } from "../../drawing/print-style";
import type { Section } from "../../drawing/sheet";
import { tableSections } from "../../drawing/table-sections";
import type { Cell } from "../../drawing/table-spec";
import type { CertificateContent, CertifiedInjector } from "../content";

/** What was tested: every item unmistakable, in the condition it came in. */
export function itemsTable(pen: Pen, content: CertificateContent, width: number): Section[] {
  return tableSections(
    pen,
    { title: "Items", note: "as received; markings as the customer or the maker made them" },
    {
      columns: [
        { title: ["Tag"], align: "left" },
        { title: ["Serial"], align: "left", flex: 1 },
        { title: ["Marking"], align: "left", flex: 1 },
        { title: ["Condition on receipt"], align: "left", flex: 2 },
        { title: ["In this set"], align: "left", flex: 2 },
      ],
      rows: content.injectors.map((injector) => ({
        cells: [
          [{ text: injector.tag, style: styles.bodyStrong }],
          words(injector.serial ?? "none"),
          injector.marking === "" ? quietWords("none") : words(injector.marking),
          conditionCell(injector),
          stateCell(injector),
        ],
      })),
    },
    width,
  );
}

function conditionCell({ condition, conditionNote }: CertifiedInjector): Cell {
  return conditionNote === "" ? words(condition) : [...words(condition), ...quietWords(conditionNote)];
}

function stateCell({ state, stateReason, replacesTag }: CertifiedInjector): Cell {
  const first = replacesTag ? `${state}, in place of ${replacesTag}` : state;
  return stateReason ? [...words(first), ...quietWords(stateReason)] : words(first);
}
