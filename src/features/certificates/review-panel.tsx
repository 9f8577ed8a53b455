import type { PaperSize } from "@/db/vocabulary";
import { joinWords } from "@/format/join-words";
import { Notice } from "@/ui/feedback/notice";
import { Facts } from "@/ui/layout/facts";
import { Sheet } from "@/ui/layout/sheet";
import { ReleaseDialog } from "./release-dialog";
import { SendBackDialog } from "./send-back-dialog";
import type { Signing } from "./signing-statement";

type Props = {
  set: { setId: string; number: string; version: number };
  seen: string;
  paperSize: PaperSize;
  signing: Signing;
  /** Why this person cannot release it; null when nothing stands against it. */
  obstacle: { title: string; parts: string[] } | null;
};

/** The manager's decision on a set in review. */
export function ReviewPanel({ set, seen, paperSize, signing, obstacle }: Props) {
  return (
    <Sheet
      title="Review"
      note="look at the results below, then send back with a reason or release"
      actions={
        <>
          <SendBackDialog set={set} seen={seen} />
          {obstacle ? null : <ReleaseDialog set={set} seen={seen} paperSize={paperSize} signing={signing} />}
        </>
      }
    >
      {obstacle ? (
        <Notice kind="caution" title={obstacle.title}>
          {obstacle.parts.map((part) => (
            <p key={part}>{part}</p>
          ))}
        </Notice>
      ) : (
        <Facts
          align="left"
          facts={signing.recorders.map(({ name, parts }) => ({
            label: name,
            value: `recorded ${joinWords(parts)}`,
          }))}
        />
      )}
    </Sheet>
  );
}
