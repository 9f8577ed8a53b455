import type { CertifiedInjector } from "@/data/certificates";

type Props = { injector: Pick<CertifiedInjector, "tag" | "serial" | "marking" | "state"> };

/** How an injector is named wherever its figures stand: place, then serial or marking. */
export function InjectorName({ injector }: Props) {
  const { tag, serial, marking, state } = injector;
  return (
    <span className="inline-flex items-baseline gap-1.5">
      <span>{placeOf(tag)}</span>
      <span className="text-small font-normal text-ink-2">{serial ?? (marking || tag)}</span>
      {state === "in set" ? null : <span className="text-key font-normal text-out">{state}</span>}
    </span>
  );
}

/** The part of a tag behind the set's number: 26-0147/3B is place 3B. */
export function placeOf(tag: string): string {
  return tag.slice(tag.lastIndexOf("/") + 1);
}
