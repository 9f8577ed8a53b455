import { joinWords } from "@/format/join-words";
import type { Verdict } from "@/metrology/uncertainty/decide";
import { Notice } from "@/ui/feedback/notice";
import { StatusMark } from "@/ui/feedback/status-mark";
import { Facts } from "@/ui/layout/facts";

export type Signing = {
  /** What the signature will say: "Mara Quill, lab manager: reviewed …". */
  name: string;
  role: string;
  meaning: string;
  verdict: Verdict | null;
  /** Who recorded which part of the results. */
  recorders: { name: string; parts: string[] }[];
  /** The lab lets one person test and release, and this person did. */
  onePerson: boolean;
};

/** What is signed, whose work it is, and what the verdict says. */
export function SigningStatement({ signing }: { signing: Signing }) {
  const { name, role, meaning, verdict, recorders, onePerson } = signing;
  return (
    <div className="flex flex-col gap-2.5">
      <p>
        You sign as <strong className="font-semibold text-ink">{name}</strong>, {role}: “{meaning}”. The
        certificate is then fixed: it can be superseded or revoked, not changed.
      </p>
      <Facts
        align="left"
        facts={[
          { label: "Verdict as left", value: <StatusMark kind={verdict ?? "neutral"} /> },
          ...recorders.map((recorder) => ({
            label: recorder.name,
            value: `recorded: ${joinWords(recorder.parts)}`,
          })),
        ]}
      />
      {onePerson ? (
        <Notice kind="caution">The certificate will say that one person tested and released.</Notice>
      ) : null}
    </div>
  );
}
