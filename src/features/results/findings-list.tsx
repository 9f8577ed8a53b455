import type { Finding } from "@/data/cycles/results";
import { StatusMark } from "@/ui/feedback/status-mark";

/** Readings in doubt with the reason, and which of them the technician recorded as read. */
export function FindingsList({ findings }: { findings: { phase: string; finding: Finding }[] }) {
  if (findings.length === 0) return <p className="text-ink-2">No reading stands out.</p>;
  return (
    <ul className="flex flex-col gap-1.5">
      {findings.map(({ phase, finding }) => (
        <li key={`${phase} ${finding.key}`} className="flex flex-wrap gap-x-3">
          <StatusMark kind="due">{phase}</StatusMark>
          <span className="min-w-0 flex-1 basis-64">{finding.sentence}</span>
          <span className="text-small text-ink-2">
            {finding.acknowledged ? "recorded as read" : "seen since"}
          </span>
        </li>
      ))}
    </ul>
  );
}
