import type { PresentedResults } from "@/data/certificates";
import { formatQuantity } from "@/format/format-number";
import { RailStrip } from "@/ui/chart/rail-strip";
import { Sheet } from "@/ui/layout/sheet";
import { halfLimitOf, resultRows } from "./result-rows";

/** One bar per place: as found behind, as left in front, the class's limit as hairlines. */
export function RailStripSheet({ results }: { results: PresentedResults }) {
  const halfLimit = halfLimitOf(results);
  const { labels, found, left } = barsByPlace(results);
  const hairlines = halfLimit === null ? "" : `, hairlines ±${formatQuantity(halfLimit, "tolerance")}`;
  const states = results.asLeft ? "as found behind, as left in front" : "as found";
  return (
    <Sheet title="Rail strip" note={`static flow against the set’s mean, ${states}${hairlines}`}>
      <RailStrip left={left} found={found} labels={labels} halfLimitPercent={halfLimit} />
    </Sheet>
  );
}

/** Where an injector took another's place, each phase shows the one that was measured then. */
function barsByPlace(results: PresentedResults) {
  const rows = resultRows(results);
  const places = [...new Set(rows.map(({ injector }) => injector.position))];
  const bar = (phase: "found" | "left") => (place: number) =>
    rows.findLast(({ injector, [phase]: result }) => injector.position === place && result)?.[phase]
      ?.deviationPercent ?? null;
  return {
    labels: places.map(String),
    found: results.asFound ? places.map(bar("found")) : [],
    left: results.asLeft ? places.map(bar("left")) : [],
  };
}
