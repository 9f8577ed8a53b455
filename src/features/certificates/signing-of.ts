import type { RecordedPart } from "@/data/certificates";
import type { Verdict } from "@/metrology/uncertainty/decide";
import type { Signing } from "./signing-statement";

type Person = { personId: string; name: string };
type Asked = { person: Person; recorded: RecordedPart[]; verdict: Verdict | null; meaning: string };

/** What the manager is about to sign. */
export function signingOf({ person, recorded, verdict, meaning }: Asked): Signing {
  return {
    name: person.name,
    role: "lab manager",
    meaning,
    verdict,
    recorders: recorded.map(({ recorder, parts }) => ({ name: recorder.name, parts })),
    onePerson: recorded.some(({ recorder }) => recorder.personId === person.personId),
  };
}

/** Why this person may not release these results; null when nothing stands against it. */
export function obstacleFor(person: Person, recorded: RecordedPart[], releaserIsAnother: boolean) {
  const own = recorded.find(({ recorder }) => recorder.personId === person.personId);
  if (!own || !releaserIsAnother) return null;
  return {
    title: "You recorded part of these results: somebody else releases them.",
    parts: [`Recorded by you: ${own.parts.join(", ")}.`],
  };
}
