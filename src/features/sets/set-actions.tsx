"use client";
import type { SetDetail } from "@/data/sets";
import { holdSetInput } from "@/data/sets/inputs";
import { isOpenStage } from "@/db/vocabulary";
import { ReasonDialog } from "@/ui/form/reason-dialog";
import { ButtonLink } from "@/ui/layout/button-link";
import { clearSetHoldAction, holdSetAction, returnSetUncleanedAction } from "./actions";
import { LabelsMenu } from "./labels-menu";

type Props = {
  set: Pick<SetDetail, "setId" | "number" | "stage" | "hold">;
  /** The roles of who looks at it: shown is what they may do. The server decides all the same. */
  roles: readonly string[];
};

const leaving: SetDetail["stage"][] = ["certified", "returned uncleaned"];

/** What the counter and the bench may do with a set as a whole. */
export function SetActions({ set, roles }: Props) {
  const { setId, number, stage, hold } = set;
  const isOpen = isOpenStage(stage);
  const atCounter = roles.includes("counter") || roles.includes("manager");
  const editable = isOpen && (roles.includes("manager") || (atCounter && stage === "checked in"));
  return (
    <>
      <LabelsMenu setId={setId} />
      {editable ? <ButtonLink href={`/sets/${setId}/intake`}>Edit intake</ButtonLink> : null}
      {isOpen ? (
        <ReasonDialog
          trigger="Return uncleaned"
          title={`Return set ${number} uncleaned`}
          description="Work on the set ends here and no certificate is issued. The set then waits to be handed over."
          action={returnSetUncleanedAction}
          schema={holdSetInput}
          fields={{ setId }}
          submitLabel="Return uncleaned"
          submitKind="danger"
          reasonHint="Stays on the record; the customer reads it too."
        />
      ) : null}
      {isOpen && !hold ? (
        <ReasonDialog
          trigger="Put on hold"
          title={`Put set ${number} on hold`}
          description="Work on the set rests until somebody takes it off hold."
          action={holdSetAction}
          schema={holdSetInput}
          fields={{ setId }}
          submitLabel="Put on hold"
          reasonHint="Stays on the record; the customer reads it too."
        />
      ) : null}
      {hold ? (
        <ReasonDialog
          trigger="Take off hold"
          triggerKind="primary"
          title={`Take set ${number} off hold`}
          description={`On hold: ${hold.reason}`}
          action={clearSetHoldAction}
          schema={holdSetInput}
          fields={{ setId }}
          submitLabel="Take off hold"
          reasonLabel="What has changed"
        />
      ) : null}
      {atCounter && leaving.includes(stage) ? (
        <ButtonLink kind="primary" href={`/sets/${setId}/hand-over`}>
          Hand over
        </ButtonLink>
      ) : null}
    </>
  );
}
