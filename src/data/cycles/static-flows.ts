import "server-only";
import { evaluateRevision } from "./evaluate-revision";
import type { LoadedRevision } from "./load-revisions";
import type { SetBasis } from "./load-set-basis";

type Flows = Map<string, number | null>;

const most = 2000;
const worked = new Map<string, Flows>();

/**
 * Static flows of a revision. A revision never changes, so what was worked out of it is remembered, and forgotten again
 * oldest first: a list of sets asks for the same ones over and over.
 */
export function staticFlowsOf(revision: LoadedRevision, basis: SetBasis): Flows {
  const { pressureKpa, densityGPerMl } = basis.reference;
  const key = `${revision.cycleRevisionId}/${pressureKpa}/${densityGPerMl}`;
  const known = worked.get(key);
  if (known) return known;
  const { figures } = evaluateRevision(revision, { basis, tagOf: (id) => id, earlier: null });
  const flows = new Map(
    figures.injectors.map((injector) => [injector.injectorId, injector.staticFlow?.value ?? null]),
  );
  worked.set(key, flows);
  if (worked.size > most) worked.delete(worked.keys().next().value!);
  return flows;
}
