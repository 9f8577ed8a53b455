"use client";
import type { ReactNode } from "react";
import type { CycleDraft } from "../../data/cycles";
import { problemsOf } from "../../data/cycles/sheet/problems-of";
import { assumedConditions } from "../../data/cycles/sheet/run-of-sheet";
import { CycleGrid } from "./cycle-grid";
import { SaveLine, SaveNotices } from "./draft/save-line";
import { useDraftStore } from "./draft/use-draft-store";
import { ReadingFileDialog } from "./reading-file-dialog";
import { RecordPanel } from "./record-panel";
import { BenchCautions } from "./sheet/cautions";
import { ConditionsPanel } from "./sheet/conditions-panel";
import { FindingsPanel } from "./sheet/findings-panel";
import { GridConflicts } from "./sheet/grid-conflicts";
import { LiveFigures } from "./sheet/live-figures";
import { marksOf } from "./sheet/marks-of";
import { SheetContext } from "./sheet/sheet-context";
import { useEvaluation } from "./use-evaluation";
import { useUndo } from "./use-undo";

/** The bench page: conditions, grid, live lines and doubts on one screen, saved as they are typed. */
export function CycleSheet({ draft, photos }: { draft: CycleDraft; photos: ReactNode }) {
  const { store, snapshot } = useDraftStore(draft);
  const { fields, status, state } = snapshot;
  const evaluation = useEvaluation(draft, fields);
  const { edit, undo } = useUndo(store);
  const { sheet, bench, figures, findings, problem } = evaluation;
  const readOnly = status === "closed";
  const problems = problemsOf(fields, sheet, bench);
  const halfLimit = draft.toleranceClass.staticSpreadPercent;
  const assumed = assumedConditions(sheet);
  const hands = {
    fields,
    conflicts: state.conflicts,
    readOnly,
    edit: (edits: { field: string; value: string }[]) => store.type(edits),
    choose: (field: string, whose: "theirs" | "yours") => store.choose(field, whose),
  };

  return (
    <SheetContext value={hands}>
      <div className="flex flex-col gap-3">
        <div className="sticky top-0 z-10 flex min-h-8 items-center justify-end bg-ground/90 py-1">
          <SaveLine snapshot={snapshot} zone={draft.zone} />
        </div>
        <SaveNotices snapshot={snapshot} />
        <ConditionsPanel {...draft} missing={{}} anyBench={draft.corrects !== null} />
        <GridConflicts sheet={sheet} />
        <div className="grid grid-cols-[minmax(0,1fr)] gap-3 desk:grid-cols-[minmax(0,1fr)_22rem]">
          <div className="flex min-w-0 flex-col gap-3">
            <CycleGrid
              draft={draft}
              evaluation={evaluation}
              fields={fields}
              marks={marksOf(sheet, fields, findings, state.conflicts)}
              readOnly={readOnly}
              onEdit={edit}
              onUndo={undo}
            />
            <FindingsPanel findings={findings} sheet={sheet} />
            {photos}
          </div>
          <LiveFigures
            injectors={draft.injectors}
            figures={figures}
            earlier={draft.earlier}
            problem={problem}
            assumed={
              assumed.length === 0
                ? null
                : `The figures assume the rated ${assumed.join(" and 20 °C ")} until the conditions are typed.`
            }
            halfLimitPercent={halfLimit === null ? null : halfLimit / 2}
          />
        </div>
        <div>
          <ReadingFileDialog draft={draft} store={store} />
        </div>
        <RecordPanel draft={draft} store={store} evaluation={evaluation} problems={problems} />
        <BenchCautions />
      </div>
    </SheetContext>
  );
}
