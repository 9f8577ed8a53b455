import "server-only";
import type { CycleFigures } from "../../metrology/cycle/types";
import type { LoadedRevision } from "./load-revisions";
import type { SetBasis } from "./load-set-basis";
import { evaluateRun } from "./sheet/evaluate-run";
import { runOfRevision } from "./sheet/run-of-revision";

type Beside = {
  basis: SetBasis;
  tagOf: (setInjectorId: string) => string;
  earlier: CycleFigures | null;
  only?: Set<string>;
};

/** Figures and doubtful readings of a recorded revision: the same functions as while it was typed. */
export function evaluateRevision(revision: LoadedRevision, { basis, tagOf, earlier, only }: Beside) {
  const { reference, model } = basis;
  return evaluateRun(runOfRevision(revision, only), { reference, model, tagOf, earlier });
}
