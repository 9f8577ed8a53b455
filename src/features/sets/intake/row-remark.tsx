import type { KnownInjector } from "@/data/sets";
import { StatusMark } from "@/ui/feedback/status-mark";

type Props = {
  /** Number of an earlier row with the same serial. */
  sameAs: number | null;
  known: KnownInjector | undefined;
  /** The set that is being edited: its own injectors are here of course. */
  ownNumber?: string;
  errors?: string[];
};

/** What is to be said of a serial while it is typed. */
export function RowRemark({ sameAs, known, ownNumber, errors }: Props) {
  if (sameAs !== null) return <StatusMark kind="fail">same serial as injector {sameAs}</StatusMark>;
  if (known?.openSet && known.openSet !== ownNumber)
    return <StatusMark kind="fail">still here in set {known.openSet}</StatusMark>;
  if (errors?.length) return <StatusMark kind="fail">{errors.join(" ")}</StatusMark>;
  const visits = known?.visits.filter(({ number }) => number !== ownNumber) ?? [];
  const [latest] = visits;
  if (!latest) return null;
  return (
    <StatusMark kind="pass">
      was here: {latest.number}
      {visits.length > 1 ? ` and ${visits.length - 1} more` : ""}
    </StatusMark>
  );
}
