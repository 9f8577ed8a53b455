"use client";
import { formatTime } from "../../../format/format-date";
import { plural } from "../../../format/plural";
import { Notice } from "../../../ui/feedback/notice";
import { SaveState, type SaveStateValue } from "../../../ui/feedback/save-state";
import type { DraftSnapshot } from "./draft-store";

/** Whether what was typed has reached the server, in a few words. */
export function SaveLine({ snapshot, zone }: { snapshot: DraftSnapshot; zone: string }) {
  return <SaveState value={stateOf(snapshot, zone)} />;
}

function stateOf({ status, state, savedAt }: DraftSnapshot, zone: string): SaveStateValue {
  const waiting = Object.keys(state.typed).length + (state.inFlight?.changes.length ?? 0);
  if (status === "saved") return { state: "saved", at: formatTime(savedAt, zone) };
  if (status === "waiting" || status === "saving") return { state: "saving" };
  return status === "unreachable" ? { state: "offline", waiting } : { state: "not saved", waiting };
}

/** What the technician has to know or do about saving. */
export function SaveNotices({ snapshot }: { snapshot: DraftSnapshot }) {
  const { status, message, restored, keptHere, state } = snapshot;
  const unsaved = Object.keys({ ...state.typed, ...state.conflicts }).length;
  return (
    <>
      {status === "sign in" ? (
        <Notice
          kind="refusal"
          live
          title="Your sign-in has ended."
          action={
            <a className="font-medium underline" href="/sign-in" target="_blank" rel="noreferrer">
              Sign in again in a new tab
            </a>
          }
        >
          What you typed is kept on this device. Sign in, come back to this page and go on: it is saved by
          itself.
        </Notice>
      ) : null}
      {status === "closed" ? (
        <Notice kind="refusal" live title={message ?? "This sheet takes nothing more."}>
          {unsaved > 0
            ? `${plural(unsaved, "value")} typed here did not get into it. They stay on this device.`
            : null}
        </Notice>
      ) : null}
      {status === "refused" ? (
        <Notice kind="refusal" live title="The server did not take what was typed.">
          {message}
        </Notice>
      ) : null}
      {restored > 0 ? (
        <Notice live>
          {plural(restored, "value")} typed on this device had not reached the server and{" "}
          {restored === 1 ? "was" : "were"} restored.
        </Notice>
      ) : null}
      {keptHere ? null : (
        <Notice kind="caution" live>
          This browser keeps nothing on the device. Stay on this page until everything is saved.
        </Notice>
      )}
    </>
  );
}
