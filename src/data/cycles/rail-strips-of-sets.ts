import "server-only";
import { asc, inArray } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { setInjectors } from "../../db/schema/injectors";
import type { Phase } from "../../db/vocabulary";
import { spread } from "../../metrology/line/spread";
import { type LoadedRevision, loadRevisions } from "./load-revisions";
import { loadSetBasis, type SetBasis } from "./load-set-basis";
import type { RailStripValues } from "./results";
import { staticFlowsOf } from "./static-flows";

/** The rail strips of many sets: one bar per place, as found and as left, and the class's hairlines. */
export async function railStripsOfSets(
  connection: Connection,
  setIds: string[],
): Promise<Map<string, RailStripValues>> {
  if (setIds.length === 0) return new Map();
  const [basisOf, revisions, placed] = await Promise.all([
    loadSetBasis(connection, setIds),
    loadRevisions(connection, setIds, "that count"),
    selectPlaced(connection, setIds),
  ]);
  const strips = new Map<string, RailStripValues>();
  for (const [setId, basis] of basisOf) {
    const injectors = placed.filter((injector) => injector.setId === setId);
    const bars = (phase: Phase) =>
      barsOf(
        revisions.find(({ cycle }) => cycle.setId === setId && cycle.phase === phase),
        basis,
        phase === "as left" ? injectors.filter((injector) => injector.state === "in set") : injectors,
      );
    const { staticSpreadPercent } = basis.toleranceClass;
    strips.set(setId, {
      found: bars("as found"),
      left: bars("as left"),
      halfLimitPercent: staticSpreadPercent === null ? null : staticSpreadPercent / 2,
    });
  }
  return strips;
}

type Placed = Awaited<ReturnType<typeof selectPlaced>>;

function selectPlaced(connection: Connection, setIds: string[]) {
  return connection
    .select({
      setId: setInjectors.setId,
      setInjectorId: setInjectors.id,
      position: setInjectors.position,
      state: setInjectors.state,
    })
    .from(setInjectors)
    .where(inArray(setInjectors.setId, setIds))
    .orderBy(asc(setInjectors.position), asc(setInjectors.tag));
}

/** Deviations by place; where an injector took another's place, the one that was measured in this cycle. */
function barsOf(revision: LoadedRevision | undefined, basis: SetBasis, injectors: Placed): (number | null)[] {
  if (!revision) return [];
  const flows = staticFlowsOf(revision, basis);
  const byPlace = new Map<number, number | null>();
  for (const { position, setInjectorId } of injectors)
    byPlace.set(position, flows.get(setInjectorId) ?? byPlace.get(position) ?? null);
  const places = [...byPlace.values()];
  const known = places.filter((flow) => flow !== null);
  if (known.length < 2) return places.map(() => null);
  const { mean } = spread(known);
  return places.map((flow) => (flow === null ? null : (100 * (flow - mean)) / mean));
}
